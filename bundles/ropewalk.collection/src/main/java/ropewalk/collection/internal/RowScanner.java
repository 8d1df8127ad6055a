package ropewalk.collection.internal;

import java.util.Arrays;

/**
 * Finds one row of RFC 4180 text in a range of bytes. Keeps nothing from one call to the next, so a row that the range cuts
 * off is simply scanned again when more bytes are there.
 *
 * <p><b>Where a bad row ends.</b> Bytes that are not UTF-8 and NULs do not disturb the structure: the row ends where it would
 * end without them. After a quote inside an unquoted field the row ends at the next line break. A quoted field that is not
 * closed, or whose closing quote is followed by text, ends its row at the first line break after its opening quote; the lines
 * from there on are rows of their own.
 *
 * <p><b>Cost</b> linear in the bytes looked at, and over a whole file linear in its length: let the scan of a row fail at a
 * quote opened in line k after having looked up to line m. Every line between begins and ends inside the quotes, so holds an
 * even number of them. Read anew from its beginning, such a line either is malformed before its end or, quotes being even,
 * ends outside the quotes: its row ends in that very line. So each byte is looked at as part of at most one such look-ahead
 * and of one row.
 */
public final class RowScanner {

    /** A row without a fault. */
    public static final int ROW = 0;
    /** A line with nothing but blanks and tabs. */
    public static final int BLANK = 1;
    /** A row with a {@link #fault()}. */
    public static final int FAULTY = 2;
    /** The range ends before the row does. */
    public static final int UNFINISHED = 3;

    private static final int MORE = -1;
    private static final int UNCLOSED = -2;

    private static final byte[] IN_PLAIN = new byte[256];
    private static final byte[] IN_QUOTES = new byte[256];

    static {
        Arrays.fill(IN_PLAIN, 0x80, 0x100, (byte) 1);
        Arrays.fill(IN_QUOTES, 0x80, 0x100, (byte) 1);
        for (char c : new char[] {'\0', '\r', '\n', '"'}) {
            IN_PLAIN[c] = 1;
            IN_QUOTES[c] = 1;
        }
        IN_PLAIN[','] = 1;
    }

    private final int mostStored;
    private int[] bounds;
    private int fields;
    private int breaks;
    private int contentEnd;
    private int next;
    private Fault fault;
    private int faultAt;
    private int openQuote;
    private int breaksAtQuote;
    private int resume;

    /**
     * A scanner that counts all fields and keeps the bounds of the first {@code mostStored}.
     *
     * @param mostStored fields whose bounds are kept
     */
    public RowScanner(int mostStored) {
        this.mostStored = mostStored;
        this.bounds = new int[2 * Math.min(mostStored, 16)];
    }

    /**
     * Entry 2f is the start of field f inside its quotes; 2f+1 its end, complemented (~) if it contains doubled quotes.
     *
     * @return the bounds, valid until the next scan
     */
    public int[] bounds() {
        return bounds;
    }

    /** {@return the number of fields; of a faulty row, of those complete before the fault was certain} */
    public int fields() {
        return fields;
    }

    /** {@return the number of bounds kept} */
    public int stored() {
        return Math.min(fields, mostStored);
    }

    /** {@return the number of line breaks from the start of the row to {@link #next()}} */
    public int breaks() {
        return breaks;
    }

    /** {@return the index after the last byte of the row, its line break left out} Not for faulty rows. */
    public int contentEnd() {
        return contentEnd;
    }

    /** {@return the index where the next row begins} */
    public int next() {
        return next;
    }

    /** {@return the first thing that is wrong with the row} */
    public Fault fault() {
        return fault;
    }

    /** {@return the index of the fault} */
    public int faultAt() {
        return faultAt;
    }

    /**
     * Looks at b[from..to); {@code last} says that the text ends there. Needs from &lt; to for a row.
     *
     * @param b the bytes
     * @param from first index
     * @param to index after the last
     * @param last whether the text ends with the range
     * @return one of {@link #ROW}, {@link #BLANK}, {@link #FAULTY}, {@link #UNFINISHED}
     */
    public int scan(byte[] b, int from, int to, boolean last) {
        fields = 0;
        breaks = 0;
        fault = null;
        int p = from;
        while (true) {
            openQuote = -1;
            resume = -1;
            int end;
            if (p < to && b[p] == '"') {
                end = quotedField(b, p, to, last);
                if (end == MORE) {
                    return UNFINISHED;
                }
                if (end == UNCLOSED) {
                    settle(Fault.UNCLOSED_QUOTE, openQuote);
                    return endAtBreakAfterQuote(b, to, to, true);
                }
                if (end < to && b[end] != ',' && b[end] != '\n' && b[end] != '\r') {
                    settle(resume < 0 ? Fault.TEXT_AFTER_QUOTE : Fault.UNCLOSED_QUOTE, resume < 0 ? end : openQuote);
                    fields--;
                    return endAtBreakAfterQuote(b, end, to, last);
                }
                openQuote = -1;
            } else {
                end = plainField(b, p, to, last);
                if (end == MORE) {
                    return UNFINISHED;
                }
                if (end < to && b[end] == '"') {
                    note(Fault.STRAY_QUOTE, end);
                    return endAtBreak(b, end, to, last);
                }
                store(p, end);
            }
            if (end == to) {
                if (!last) {
                    return UNFINISHED;
                }
                contentEnd = to;
                next = to;
                return kind(b, from);
            }
            if (b[end] != ',') {
                contentEnd = end;
                next = afterBreak(b, end, to, last);
                if (next == MORE) {
                    return UNFINISHED;
                }
                breaks++;
                return kind(b, from);
            }
            p = end + 1;
        }
    }

    /**
     * Ends a row that {@link #scan} left unfinished because it is longer than a row may be. If {@link #next()}
     * is not known then, the row ends at the first line break from the last byte of the range on.
     *
     * @param limit the index that goes into the fault
     * @return whether the next row is known
     */
    public boolean giveUp(int limit) {
        if (openQuote >= 0) {
            settle(Fault.UNCLOSED_WITHIN_LIMIT, openQuote);
            if (resume >= 0) {
                next = resume;
                breaks = breaksAtQuote + 1;
                return true;
            }
        } else if (fault == null) {
            note(Fault.TOO_LONG, limit);
        }
        return false;
    }

    /** Returns the index after the closing quote, UNCLOSED or MORE. */
    private int quotedField(byte[] b, int quote, int to, boolean last) {
        openQuote = quote;
        breaksAtQuote = breaks;
        boolean doubled = false;
        int p = quote + 1;
        while (true) {
            while (p < to && IN_QUOTES[b[p] & 0xff] == 0) {
                p++;
            }
            if (p == to) {
                return last ? UNCLOSED : MORE;
            }
            switch (b[p]) {
                case '"' -> {
                    if (p + 1 == to && !last) {
                        return MORE;
                    }
                    if (p + 1 == to || b[p + 1] != '"') {
                        store(quote + 1, doubled ? ~p : p);
                        return p + 1;
                    }
                    doubled = true;
                    p += 2;
                }
                case '\n', '\r' -> {
                    p = afterBreak(b, p, to, last);
                    if (p == MORE) {
                        return MORE;
                    }
                    breaks++;
                    resume = resume < 0 ? p : resume;
                }
                default -> {
                    p = special(b, p, to, last);
                    if (p == MORE) {
                        return MORE;
                    }
                }
            }
        }
    }

    /** Returns the index of the comma, line break or quote that ends the field, {@code to}, or MORE. */
    private int plainField(byte[] b, int from, int to, boolean last) {
        int p = from;
        while (true) {
            while (p < to && IN_PLAIN[b[p] & 0xff] == 0) {
                p++;
            }
            if (p == to || b[p] > 0) {
                return p;
            }
            p = special(b, p, to, last);
            if (p == MORE) {
                return MORE;
            }
        }
    }

    /** Steps over a character of several bytes, a wrong byte or a NUL; or MORE. */
    private int special(byte[] b, int p, int to, boolean last) {
        if (b[p] == 0) {
            note(Fault.NUL, p);
            return p + 1;
        }
        int length = Utf8.length(b, p, to);
        if (length > 0) {
            return p + length;
        }
        if (length == Utf8.CUT && !last) {
            return MORE;
        }
        note(Fault.NOT_UTF8, p);
        return p + 1;
    }

    private int endAtBreakAfterQuote(byte[] b, int p, int to, boolean last) {
        if (resume < 0) {
            return endAtBreak(b, p, to, last);
        }
        next = resume;
        breaks = breaksAtQuote + 1;
        return FAULTY;
    }

    private int endAtBreak(byte[] b, int from, int to, boolean last) {
        openQuote = -1;
        int p = from;
        while (p < to && b[p] != '\n' && b[p] != '\r') {
            p++;
        }
        if (p == to) {
            next = to;
            return last ? FAULTY : UNFINISHED;
        }
        next = afterBreak(b, p, to, last);
        if (next == MORE) {
            return UNFINISHED;
        }
        breaks++;
        return FAULTY;
    }

    /** The index after the line break at p, or MORE if a line feed may follow outside the range. */
    private static int afterBreak(byte[] b, int p, int to, boolean last) {
        if (b[p] == '\n') {
            return p + 1;
        }
        if (p + 1 == to) {
            return last ? to : MORE;
        }
        return b[p + 1] == '\n' ? p + 2 : p + 1;
    }

    private int kind(byte[] b, int from) {
        if (fault != null) {
            return FAULTY;
        }
        if (fields > 1) {
            return ROW;
        }
        for (int i = from; i < contentEnd; i++) {
            if (b[i] != ' ' && b[i] != '\t') {
                return ROW;
            }
        }
        return BLANK;
    }

    private void store(int start, int end) {
        if (fields < mostStored) {
            if (2 * fields == bounds.length) {
                bounds = Arrays.copyOf(bounds, (int) Math.min(2L * mostStored, 2L * bounds.length));
            }
            bounds[2 * fields] = start;
            bounds[2 * fields + 1] = end;
        }
        fields++;
    }

    /** Notes a fault unless an earlier one is known; faults are found in the order of the text. */
    private void note(Fault kind, int at) {
        if (fault == null) {
            fault = kind;
            faultAt = at;
        }
    }

    /** Notes a fault that goes back to an earlier place: what was noted after that place may belong to a later row. */
    private void settle(Fault kind, int at) {
        if (fault == null || faultAt > at) {
            fault = kind;
            faultAt = at;
        }
    }
}
