package ropewalk.collection.internal;

/** The texts of rejections: what was found, and what would be right. */
public final class Reasons {

    private Reasons() {
    }

    /**
     * {@return the reason for a fault at a place of a row that begins at {@code from} in b[..to)}
     *
     * @param fault the fault
     * @param b the bytes
     * @param from where the row begins
     * @param at where the fault is
     * @param to where the bytes end
     * @param limit the most bytes of a row
     */
    public static String of(Fault fault, byte[] b, int from, int at, int to, int limit) {
        return switch (fault) {
            case NOT_UTF8 -> String.format("byte 0x%02X is not UTF-8 here; save the file as UTF-8", b[at]);
            case NUL -> "a NUL byte; a collection is plain text in UTF-8, remove the byte";
            case TEXT_AFTER_QUOTE -> "the quoted field ends before " + Visible.quoted(b, at, lineEnd(b, at, to))
                    + "; after a closing quote only a comma or the end of the row may follow, and a quote inside a field"
                    + " is doubled";
            case STRAY_QUOTE -> strayQuote(b, from, at);
            case UNCLOSED_QUOTE -> "the quote opened here is not closed; close it, and double quotes inside the field";
            case UNCLOSED_WITHIN_LIMIT -> "the quote opened here is not closed within the " + limit
                    + " bytes that one row may have; close it, and double quotes inside the field";
            case TOO_LONG -> "the row has more than the " + limit + " bytes that one row may have; divide it or give more memory";
        };
    }

    private static String strayQuote(byte[] b, int from, int at) {
        int p = at;
        while (p > from && (b[p - 1] == ' ' || b[p - 1] == '\t')) {
            p--;
        }
        if (p < at && (p == from || b[p - 1] == ',')) {
            return "a blank before an opening quote; remove the blank";
        }
        return "a quote inside a field that is not quoted; put the field in quotes and double the quote";
    }

    /**
     * A row with too few fields.
     *
     * @param found fields of the row
     * @param expected fields of the header
     * @return the reason
     */
    public static String tooFew(int found, int expected) {
        return count(found) + " found, the header has " + expected + "; fill in the missing ones, an empty one is just its comma";
    }

    /**
     * A row with too many fields.
     *
     * @param found fields of the row
     * @param expected fields of the header
     * @return the reason
     */
    public static String tooMany(int found, int expected) {
        return count(found) + " found, the header has " + expected
                + "; a field that contains commas, most likely the code, must stand in quotes";
    }

    private static String count(int fields) {
        return fields + (fields == 1 ? " field" : " fields");
    }

    private static int lineEnd(byte[] b, int from, int to) {
        int p = from;
        while (p < to && b[p] != '\n' && b[p] != '\r') {
            p++;
        }
        return p;
    }
}
