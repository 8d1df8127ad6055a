package ropewalk.collection;

import java.io.IOException;
import java.io.OutputStream;

/** Writes rejected.csv. Not thread-safe. */
public final class RejectedFile implements AutoCloseable {

    private static final int FLUSH_AT = 1 << 16;

    private final OutputStream out;
    private final CsvRows rows = new CsvRows();
    private long count;

    /**
     * Begins the file with its header. The stream is closed with this.
     *
     * @param out the stream
     */
    public RejectedFile(OutputStream out) {
        this.out = out;
        rows.field("file").field("line").field("column").field("name").field("reason").endRow();
    }

    /**
     * Adds a row. A line or column that is unknown is an empty field.
     *
     * @param rejection the row
     * @throws IOException if writing fails
     */
    public void add(Rejection rejection) throws IOException {
        rows.field(rejection.file());
        place(rejection.line());
        place(rejection.column());
        rows.field(rejection.name()).field(rejection.reason()).endRow();
        count++;
        if (rows.size() >= FLUSH_AT) {
            flush();
        }
    }

    /** {@return the number of rejections so far} */
    public long count() {
        return count;
    }

    /**
     * Hands everything to the stream, so that a crash loses nothing that was added before.
     *
     * @throws IOException if writing fails
     */
    public void flush() throws IOException {
        rows.writeTo(out);
        rows.clear();
        out.flush();
    }

    /** Writes what is left and closes the stream. */
    @Override
    public void close() throws IOException {
        try (OutputStream closing = out) {
            rows.writeTo(closing);
            rows.clear();
        }
    }

    private void place(long number) {
        if (number > 0) {
            rows.field(number);
        } else {
            rows.empty();
        }
    }
}
