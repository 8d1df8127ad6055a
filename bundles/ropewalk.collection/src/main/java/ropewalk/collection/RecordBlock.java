package ropewalk.collection;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import ropewalk.collection.internal.Utf8;

/**
 * A few hundred rows of one collection and the rejections that fell between them. Immutable and thread-safe; holds its own
 * bytes and nothing else of the file.
 *
 * <p><b>Conventions.</b> Record i is 0 … size()-1, field f is the column f of the {@link CollectionHeader}; every record has
 * all fields. Bounds are indices into {@link #bytes()}, which is valid UTF-8 in every field and must not be written to. Those
 * of a quoted field leave its quotes out, and its inside may contain doubled quotes, see {@link #hasDoubledQuotes}.
 */
public final class RecordBlock {

    private final String file;
    private final CollectionHeader header;
    private final int size;
    private final byte[] bytes;
    private final long[] lines;
    private final int[] rowStarts;
    private final int[] bounds;
    private final List<Rejection> rejections;
    private final int[] recordsBefore;

    RecordBlock(String file, CollectionHeader header, byte[] bytes, long[] lines, int[] rowStarts, int[] bounds,
            List<Rejection> rejections, int[] recordsBefore) {
        this.file = file;
        this.header = header;
        this.size = lines.length;
        this.bytes = bytes;
        this.lines = lines;
        this.rowStarts = rowStarts;
        this.bounds = bounds;
        this.rejections = List.copyOf(rejections);
        this.recordsBefore = recordsBefore;
    }

    /** {@return the file as the user named it} */
    public String file() {
        return file;
    }

    /** {@return the columns of the file} */
    public CollectionHeader header() {
        return header;
    }

    /** {@return the number of records; may be 0 in a block that has rejections} */
    public int size() {
        return size;
    }

    /** {@return the number of fields of every record} */
    public int fieldCount() {
        return header.size();
    }

    /** {@return the bytes that the bounds refer to; not to be written to} */
    public byte[] bytes() {
        return bytes;
    }

    /**
     * {@return the physical line where the record begins; the first line of the file is 1}
     *
     * @param i the record
     */
    public long line(int i) {
        return lines[i];
    }

    /**
     * {@return the index of the first byte of the record's row}
     *
     * @param i the record
     */
    public int rowStart(int i) {
        return rowStarts[i];
    }

    /**
     * {@return the index of the first byte of the field, after the opening quote if it has one}
     *
     * @param i the record
     * @param f the field
     */
    public int start(int i, int f) {
        return bounds[index(i, f)];
    }

    /**
     * {@return the index after the last byte of the field, before the closing quote if it has one}
     *
     * @param i the record
     * @param f the field
     */
    public int end(int i, int f) {
        int end = bounds[index(i, f) + 1];
        return end < 0 ? ~end : end;
    }

    /**
     * {@return whether the field is quoted and contains doubled quotes, each of which stands for one}
     *
     * @param i the record
     * @param f the field
     */
    public boolean hasDoubledQuotes(int i, int f) {
        return bounds[index(i, f) + 1] < 0;
    }

    /**
     * {@return whether the field stands in quotes}
     *
     * @param i the record
     * @param f the field
     */
    public boolean isQuoted(int i, int f) {
        int start = start(i, f);
        // Inside a row the byte before an unquoted field is a comma.
        return start > rowStarts[i] && bytes[start - 1] == '"';
    }

    /**
     * {@return the value of the field as bytes, doubled quotes resolved; a copy only where there are some}
     *
     * @param i the record
     * @param f the field
     */
    public Slice value(int i, int f) {
        int start = start(i, f);
        int end = end(i, f);
        if (!hasDoubledQuotes(i, f)) {
            return new Slice(bytes, start, end);
        }
        byte[] value = new byte[end - start];
        int n = 0;
        for (int p = start; p < end; p++) {
            value[n++] = bytes[p];
            p += bytes[p] == '"' ? 1 : 0;
        }
        return new Slice(value, 0, n);
    }

    /**
     * {@return the value of the field as text, doubled quotes resolved}
     *
     * @param i the record
     * @param f the field
     */
    public String text(int i, int f) {
        Slice value = value(i, f);
        return new String(value.bytes(), value.from(), value.length(), StandardCharsets.UTF_8);
    }

    /**
     * {@return the name of the link} Not empty, and not blanks only.
     *
     * @param i the record
     */
    public String name(int i) {
        return text(i, header.name());
    }

    /**
     * {@return the notation of the code}
     *
     * @param i the record
     */
    public Slice notation(int i) {
        return value(i, header.notation());
    }

    /**
     * {@return the code of the diagram}
     *
     * @param i the record
     */
    public Slice code(int i) {
        return value(i, header.code());
    }

    /**
     * {@return the column of a byte of the record: the number of characters (code points) from the beginning of the row to it, the
     * first being column 1} Linear in the result.
     *
     * @param i the record
     * @param at an index into {@link #bytes()} that is not before the row
     */
    public int columnAt(int i, int at) {
        Objects.checkFromToIndex(rowStarts[i], at, bytes.length);
        return 1 + Utf8.characters(bytes, rowStarts[i], at);
    }

    /**
     * {@return the column of the byte at an offset into {@link #value value(i, f)}, its doubled quotes counted as they stand}
     *
     * @param i the record
     * @param f the field
     * @param offset a number of bytes into the value
     */
    public int columnInValue(int i, int f, int offset) {
        int at = start(i, f);
        if (!hasDoubledQuotes(i, f)) {
            return columnAt(i, at + offset);
        }
        for (int n = 0; n < offset; n++) {
            at += bytes[at] == '"' ? 2 : 1;
        }
        return columnAt(i, at);
    }

    /**
     * Rejects a record for its code. {@code offset} is the place of the fault in {@link #code code(i)}.
     *
     * @param i the record
     * @param offset a number of bytes into the value
     * @param reason what was found and what would be right
     * @return the rejection, with its line and column
     */
    public Rejection rejectCode(int i, int offset, String reason) {
        return new Rejection(file, line(i), columnInValue(i, header.code(), offset), nameInRejection(i), reason);
    }

    /**
     * Rejects a record for its notation.
     *
     * @param i the record
     * @param reason what was found and what would be right
     * @return the rejection, with its line and column
     */
    public Rejection rejectNotation(int i, String reason) {
        return new Rejection(file, line(i), columnInValue(i, header.notation(), 0), nameInRejection(i), reason);
    }

    /** {@return the rows between the records of this block that were rejected, in the order of the file} */
    public List<Rejection> rejections() {
        return rejections;
    }

    /**
     * {@return the number of records of this block that stand before the k-th rejection in the file} Does not decrease with k.
     *
     * @param k which, from 0
     */
    public int recordsBefore(int k) {
        return recordsBefore[k];
    }

    private String nameInRejection(int i) {
        return RowContent.nameText(bytes, bounds, i * header.size() + header.name());
    }

    private int index(int i, int f) {
        Objects.checkIndex(i, size);
        return 2 * (i * header.size() + Objects.checkIndex(f, header.size()));
    }
}
