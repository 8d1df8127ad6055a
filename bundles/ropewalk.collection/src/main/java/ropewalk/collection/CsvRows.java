package ropewalk.collection;

import java.io.IOException;
import java.io.OutputStream;
import java.util.Arrays;

/**
 * A growing buffer of rows of RFC 4180 in UTF-8. Not thread-safe; each thread fills its own and hands it over whole.
 *
 * <p>A field stands in quotes only if it contains a comma, a quote or a line break; blanks, formula signs and control
 * characters stay as they are. Rows end with CR LF. A row of one empty field is written as {@code ""}, since an empty line is
 * no row. Surrogates without a partner, which UTF-8 cannot write, become U+FFFD.
 */
public final class CsvRows {

    private byte[] bytes = new byte[1 << 12];
    private int size;
    private int rowStart;
    private boolean rowBegun;

    /**
     * Appends a field.
     *
     * @param text the text
     * @return this
     */
    public CsvRows field(CharSequence text) {
        begin();
        int length = text.length();
        boolean quotes = false;
        for (int i = 0; i < length && !quotes; i++) {
            quotes = isSpecial(text.charAt(i));
        }
        reserve(2 + (length < 1 << 12 ? 3L * length : exactBytes(text)));
        if (quotes) {
            bytes[size++] = '"';
        }
        for (int i = 0; i < length; i++) {
            char c = text.charAt(i);
            if (c == '"') {
                bytes[size++] = '"';
            }
            if (c < 0x80) {
                bytes[size++] = (byte) c;
            } else {
                i += appendCharacter(text, i, c);
            }
        }
        if (quotes) {
            bytes[size++] = '"';
        }
        return this;
    }

    /**
     * Appends a field whose value is given in UTF-8, which is not checked.
     *
     * @param value the value
     * @param from first index
     * @param to index after the last
     * @return this
     */
    public CsvRows field(byte[] value, int from, int to) {
        begin();
        boolean quotes = false;
        for (int i = from; i < to && !quotes; i++) {
            quotes = isSpecial(value[i]);
        }
        if (!quotes) {
            append(value, from, to);
            return this;
        }
        reserve(2L * (to - from) + 2);
        bytes[size++] = '"';
        for (int i = from; i < to; i++) {
            if (value[i] == '"') {
                bytes[size++] = '"';
            }
            bytes[size++] = value[i];
        }
        bytes[size++] = '"';
        return this;
    }

    /**
     * Appends a field whose value is given in UTF-8.
     *
     * @param value the value
     * @return this
     */
    public CsvRows field(Slice value) {
        return field(value.bytes(), value.from(), value.to());
    }

    /**
     * Appends a field of a collection as it stands there, quotes and all.
     *
     * @param block the block
     * @param i the record
     * @param f the field
     * @return this
     */
    public CsvRows field(RecordBlock block, int i, int f) {
        begin();
        int quote = block.isQuoted(i, f) ? 1 : 0;
        append(block.bytes(), block.start(i, f) - quote, block.end(i, f) + quote);
        return this;
    }

    /**
     * Appends an integer.
     *
     * @param value the value
     * @return this
     */
    public CsvRows field(long value) {
        begin();
        digits(value, 0);
        return this;
    }

    /**
     * Appends {@code unscaled} · 10^(-decimals), all decimals written: {@code decimal(1250, 3)} is 1.250.
     *
     * @param unscaled the value without its point
     * @param decimals the digits after the point
     * @return this
     * @throws IllegalArgumentException if decimals is not 1 to 18
     */
    public CsvRows decimal(long unscaled, int decimals) {
        if (decimals < 1 || decimals > 18) {
            throw new IllegalArgumentException("decimals " + decimals + "; must be 1 to 18");
        }
        begin();
        digits(unscaled, decimals);
        return this;
    }

    /**
     * Appends an empty field.
     *
     * @return this
     */
    public CsvRows empty() {
        begin();
        return this;
    }

    /**
     * Ends the row.
     *
     * @return this
     */
    public CsvRows endRow() {
        reserve(4);
        if (size == rowStart) {
            bytes[size++] = '"';
            bytes[size++] = '"';
        }
        bytes[size++] = '\r';
        bytes[size++] = '\n';
        rowStart = size;
        rowBegun = false;
        return this;
    }

    /** {@return the number of bytes so far} */
    public int size() {
        return size;
    }

    /** Forgets all rows; keeps the memory. */
    public void clear() {
        size = 0;
        rowStart = 0;
        rowBegun = false;
    }

    /**
     * Writes all rows to a stream. They stay here until {@link #clear()}.
     *
     * @param out the stream
     * @throws IOException if writing fails
     */
    public void writeTo(OutputStream out) throws IOException {
        out.write(bytes, 0, size);
    }

    private void begin() {
        if (rowBegun) {
            reserve(1);
            bytes[size++] = ',';
        }
        rowBegun = true;
    }

    private static boolean isSpecial(int c) {
        return c == ',' || c == '"' || c == '\n' || c == '\r';
    }

    /** At least the bytes of the text with its quotes doubled; three for each char would be wasteful where there are many. */
    private static long exactBytes(CharSequence text) {
        long bytes = 0;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            bytes += c == '"' ? 2 : c < 0x80 ? 1 : c < 0x800 ? 2 : 3;
        }
        return bytes;
    }

    /** Appends the character that begins at index i, not ASCII; returns how many chars it takes beyond the first. */
    private int appendCharacter(CharSequence text, int i, char c) {
        if (c < 0x800) {
            bytes[size++] = (byte) (0xc0 | c >> 6);
            bytes[size++] = (byte) (0x80 | c & 0x3f);
            return 0;
        }
        if (Character.isHighSurrogate(c) && i + 1 < text.length() && Character.isLowSurrogate(text.charAt(i + 1))) {
            int point = Character.toCodePoint(c, text.charAt(i + 1));
            bytes[size++] = (byte) (0xf0 | point >> 18);
            bytes[size++] = (byte) (0x80 | point >> 12 & 0x3f);
            bytes[size++] = (byte) (0x80 | point >> 6 & 0x3f);
            bytes[size++] = (byte) (0x80 | point & 0x3f);
            return 1;
        }
        char written = Character.isSurrogate(c) ? '\ufffd' : c;
        bytes[size++] = (byte) (0xe0 | written >> 12);
        bytes[size++] = (byte) (0x80 | written >> 6 & 0x3f);
        bytes[size++] = (byte) (0x80 | written & 0x3f);
        return 0;
    }

    private void digits(long value, int decimals) {
        // 19 digits, a zero before the point, the point, the sign.
        reserve(22);
        // Negative remainders throughout, since Long.MIN_VALUE has no positive twin.
        long rest = value < 0 ? value : -value;
        int from = size + 22;
        int p = from;
        int written = 0;
        while (rest != 0 || written <= decimals) {
            if (written == decimals && decimals > 0) {
                bytes[--p] = '.';
            }
            bytes[--p] = (byte) ('0' - rest % 10);
            rest /= 10;
            written++;
        }
        if (value < 0) {
            bytes[--p] = '-';
        }
        System.arraycopy(bytes, p, bytes, size, from - p);
        size += from - p;
    }

    private void append(byte[] source, int from, int to) {
        reserve(to - from);
        System.arraycopy(source, from, bytes, size, to - from);
        size += to - from;
    }

    private void reserve(long more) {
        long needed = size + more;
        if (needed > bytes.length) {
            if (needed > Integer.MAX_VALUE - 8) {
                throw new IllegalStateException("rows of " + needed + " bytes in one buffer; write them out and clear it before");
            }
            bytes = Arrays.copyOf(bytes, (int) Math.min(Integer.MAX_VALUE - 8L, Math.max(needed, 2L * bytes.length)));
        }
    }
}
