package ropewalk.diagram.notation;

/** Reads blanks and whole numbers out of the bytes of a code. */
final class Scan {

    private final byte[] text;
    private final int end;
    private int at;

    Scan(byte[] text, int from, int to) {
        this.text = text;
        this.at = from;
        this.end = to;
    }

    int at() {
        return at;
    }

    boolean atEnd() {
        return at >= end;
    }

    /** The byte here, or -1 at the end. */
    int peek() {
        return at < end ? text[at] : -1;
    }

    void step() {
        at++;
    }

    void skipBlanks() {
        while (at < end && isBlank(text[at])) {
            at++;
        }
    }

    static boolean isBlank(int b) {
        return b == ' ' || b == '\t' || b == '\n' || b == '\r';
    }

    static boolean isDigit(int b) {
        return b >= '0' && b <= '9';
    }

    /**
     * A whole number without sign; stands at a digit. Anything above the limit stops the reading there, however long
     * the number goes on, so that no remainder of it can pass for a small one.
     */
    long number(long limit, String what) throws CodeException {
        int from = at;
        long value = 0;
        while (at < end && isDigit(text[at])) {
            value = 10 * value + (text[at] - '0');
            if (value > limit) {
                throw new CodeException(from, what + " above " + limit + "; the largest that is let pass is " + limit);
            }
            at++;
        }
        if (text[from] == '0' && at > from + 1) {
            throw new CodeException(from, what + " with a leading 0; write it without");
        }
        return value;
    }

    /** What stands here, for a message. */
    String found() {
        if (at >= end) {
            return "the end of the code";
        }
        int b = text[at];
        if (b >= ' ' && b < 127) {
            return "'" + (char) b + "'";
        }
        return "byte " + (b & 0xff);
    }
}
