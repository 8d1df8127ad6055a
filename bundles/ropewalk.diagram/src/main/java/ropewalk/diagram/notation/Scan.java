package ropewalk.diagram.notation;

import java.nio.charset.StandardCharsets;

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
     * A whole number without sign; stands at a digit. Anything above the limit is refused, however long the number
     * goes on, so that no remainder of it can pass for a small one.
     */
    long number(long limit, String what) throws CodeException {
        int from = at;
        long value = numberOrMore(limit, what);
        if (value > limit) {
            throw new CodeException(from, what + " above " + limit + "; the largest that is let pass is " + limit);
        }
        return value;
    }

    /**
     * A whole number without sign; stands at a digit, which with all that follow it is read. Whatever is above the
     * limit (at most 2^59) comes back as limit + 1.
     */
    long numberOrMore(long limit, String what) throws CodeException {
        int from = at;
        long value = 0;
        while (at < end && isDigit(text[at])) {
            value = Math.min(limit + 1, 10 * value + (text[at] - '0'));
            at++;
        }
        if (text[from] == '0' && at > from + 1) {
            throw new CodeException(from, what + " with a leading 0; write it without");
        }
        return value;
    }

    /** What was read since an offset, cut after a score of bytes; digits and signs only. */
    String since(int from) {
        int to = Math.min(at, from + 20);
        String read = new String(text, from, to - from, StandardCharsets.US_ASCII);
        return to < at ? read + "…" : read;
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
