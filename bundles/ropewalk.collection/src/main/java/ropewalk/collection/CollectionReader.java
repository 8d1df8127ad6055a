package ropewalk.collection;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import ropewalk.collection.internal.ByteWindow;
import ropewalk.collection.internal.Fault;
import ropewalk.collection.internal.Reasons;
import ropewalk.collection.internal.RowScanner;
import ropewalk.collection.internal.Utf8;

/**
 * Reads a collection from beginning to end. Not thread-safe; the blocks it hands out are.
 *
 * <p><b>Rows.</b> RFC 4180: fields separated by commas, quotes around a field that contains commas, quotes or line breaks,
 * quotes inside doubled. LF, CR LF or a CR alone end a row. Lines of blanks and tabs are passed over but counted. A byte order
 * mark is let pass.
 *
 * <p><b>Bad rows</b> cost themselves only: bytes that are not UTF-8, NULs, misplaced or unclosed quotes, a wrong number of
 * fields, an empty name, the header once more, more bytes than {@link ReadingLimits#rowBytes()}. A quoted field that does not
 * end as it should ends its row at the first line break after its opening quote, and the next line is read anew.
 *
 * <p><b>Cost.</b> Time linear in the length of the file. Memory: one block, and while a long row or a quote that may be unclosed
 * is looked at up to twice {@code rowBytes}; nothing grows with the length of the file.
 */
public final class CollectionReader implements AutoCloseable {

    private static final int HEADER_BYTES = 1 << 20;

    private final String file;
    private final InputStream in;
    private final ReadingLimits limits;
    private final ByteWindow window;
    private RowScanner scanner = new RowScanner(Integer.MAX_VALUE >> 1);
    private CollectionHeader header;
    private long line = 1;
    private boolean done;
    private boolean dropping;

    private CollectionReader(InputStream in, String file, ReadingLimits limits) {
        this.in = Objects.requireNonNull(in, "in");
        this.file = Objects.requireNonNull(file, "file");
        this.limits = limits;
        this.window = new ByteWindow(in, Math.max(8, 2 * limits.blockBytes()));
    }

    /**
     * Opens a file and reads its header.
     *
     * @param path the file
     * @return the reader, to be closed
     * @throws UnreadableCollectionException if the file cannot be read or is no collection
     */
    public static CollectionReader open(Path path) throws UnreadableCollectionException {
        return open(path, ReadingLimits.standard());
    }

    /**
     * Opens a file and reads its header.
     *
     * @param path the file
     * @param limits how much to read at a time
     * @return the reader, to be closed
     * @throws UnreadableCollectionException if the file cannot be read or is no collection
     */
    public static CollectionReader open(Path path, ReadingLimits limits) throws UnreadableCollectionException {
        String file = path.toString();
        try {
            if (Files.isDirectory(path)) {
                throw unopened(file, "is a folder; name the files in it", null);
            }
            return open(Files.newInputStream(path), file, limits);
        } catch (UnreadableCollectionException e) {
            throw e;
        } catch (NoSuchFileException e) {
            throw unopened(file, "does not exist; check the name and the current folder", e);
        } catch (AccessDeniedException e) {
            throw unopened(file, "may not be read; ask for permission to read it", e);
        } catch (IOException e) {
            throw unopened(file, "cannot be opened (" + e.getMessage() + "); check the disk and the name", e);
        }
    }

    /**
     * Reads the header of a stream, which is closed with the reader, or at once if this fails.
     *
     * @param in the stream
     * @param limits how much to read at a time
     * @param file what the stream is called in messages
     * @return the reader, to be closed
     * @throws UnreadableCollectionException if the stream cannot be read or is no collection
     */
    public static CollectionReader open(InputStream in, String file, ReadingLimits limits) throws UnreadableCollectionException {
        CollectionReader reader = new CollectionReader(in, file, limits);
        try {
            reader.readHeader();
            return reader;
        } catch (UnreadableCollectionException e) {
            try {
                in.close();
            } catch (IOException closing) {
                e.addSuppressed(closing);
            }
            throw e;
        }
    }

    /** {@return the file as the user named it} */
    public String file() {
        return file;
    }

    /** {@return the columns} */
    public CollectionHeader header() {
        return header;
    }

    /**
     * {@return the next rows, or null at the end of the file} A block has at least one record or one rejection.
     *
     * @throws UnreadableCollectionException if reading breaks off; all whole rows before that were handed out
     */
    public RecordBlock next() throws UnreadableCollectionException {
        while (!done) {
            if (dropping) {
                line += window.dropLine() ? 1 : 0;
                dropping = false;
            }
            if (window.end() - window.start() < limits.blockBytes()) {
                window.refill();
            }
            BlockBuilder block = new BlockBuilder(file, header);
            int blockStart = window.start();
            while (!done && !dropping && block.rows() < limits.blockRows()
                    && window.start() - blockStart < limits.blockBytes()) {
                if (!readRow(block)) {
                    if (block.rows() > 0) {
                        break;
                    }
                    window.widen(mostBytes(limits.rowBytes()));
                    blockStart = window.start();
                }
            }
            if (block.rows() > 0) {
                return block.build(window.bytes());
            }
        }
        return null;
    }

    /** Closes the stream. */
    @Override
    public void close() throws IOException {
        in.close();
    }

    /** Reads one row; returns false if that needs more bytes, or an end that must wait for the block. */
    private boolean readRow(BlockBuilder block) throws UnreadableCollectionException {
        int start = window.start();
        if (start == window.end() && window.last()) {
            return finish(block);
        }
        int kind = scan(limits.rowBytes());
        if (kind == RowScanner.UNFINISHED) {
            if (window.end() - start < mostBytes(limits.rowBytes())) {
                return window.last() && finish(block);
            }
            giveUp(block);
            return true;
        }
        if (kind == RowScanner.FAULTY) {
            block.add(rejection(scanner.faultAt(), faultReason(limits.rowBytes())));
        } else if (kind == RowScanner.ROW) {
            judge(block, window.bytes(), start);
        }
        window.use(scanner.next());
        line += scanner.breaks();
        return true;
    }

    /** Adds a row that is whole RFC 4180, or the rejection of what it says. */
    private void judge(BlockBuilder block, byte[] b, int start) {
        int[] bounds = scanner.bounds();
        int expected = header.size();
        if (scanner.contentEnd() - start > limits.rowBytes()) {
            int at = start + limits.rowBytes();
            block.add(rejection(at, Reasons.of(Fault.TOO_LONG, b, start, at, at, limits.rowBytes())));
        } else if (RowContent.repeatsHeader(b, bounds, scanner.stored())) {
            block.add(rejection(start, "this row repeats the header, as happens when files are joined; remove it"));
        } else if (scanner.fields() < expected) {
            block.add(rejection(scanner.contentEnd(), Reasons.tooFew(scanner.fields(), expected)));
        } else if (scanner.fields() > expected) {
            block.add(rejection(RowContent.commaAfter(b, bounds, expected - 1), Reasons.tooMany(scanner.fields(), expected)));
        } else if (RowContent.isBlank(b, bounds, header.name())) {
            block.add(rejection(bounds[2 * header.name()], "the name is empty; every link needs one"));
        } else {
            block.add(line, start, scanner.contentEnd(), bounds);
        }
    }

    /** Rejects a row that is too long; what is not in memory of it is dropped before the next block. */
    private void giveUp(BlockBuilder block) {
        int start = window.start();
        boolean known = scanner.giveUp(start + limits.rowBytes());
        block.add(rejection(scanner.faultAt(), faultReason(limits.rowBytes())));
        line += scanner.breaks();
        window.use(known ? scanner.next() : start + mostBytes(limits.rowBytes()) - 1);
        dropping = !known;
    }

    /** At the end of the file: ends reading, or tells that it broke off, but not before the block is handed out. */
    private boolean finish(BlockBuilder block) throws UnreadableCollectionException {
        if (window.failure() != null && block.rows() > 0) {
            return false;
        }
        done = true;
        if (window.failure() != null) {
            throw brokeOff();
        }
        return true;
    }

    /** Scans the row at the start of the window. A range cut at the longest row makes the outcome the same for all windows. */
    private int scan(int limit) {
        int start = window.start();
        int to = (int) Math.min(window.end(), (long) start + mostBytes(limit));
        // After an error of the stream the last row is a fragment: it must not pass for a row.
        boolean last = window.last() && window.failure() == null && to - start < mostBytes(limit);
        return scanner.scan(window.bytes(), start, to, last);
    }

    /** A row and the line break after it. */
    private static int mostBytes(int limit) {
        return limit + 2;
    }

    private void readHeader() throws UnreadableCollectionException {
        window.refill();
        String foreign = HeaderRow.foreignFormat(window.bytes(), window.end());
        if (foreign != null) {
            throw unreadable(1, 1, foreign, null);
        }
        window.use(RowContent.afterByteOrderMark(window.bytes(), 0, window.end()));
        while (header == null) {
            int start = window.start();
            if (start == window.end() && window.last() && window.failure() == null) {
                throw unreadable(0, 0, "the file is empty; " + HeaderRow.EXPECTED, null);
            }
            int kind = scan(HEADER_BYTES);
            if (kind == RowScanner.UNFINISHED && window.end() - start < mostBytes(HEADER_BYTES)) {
                if (window.last()) {
                    throw brokeOff();
                }
                window.widen(mostBytes(HEADER_BYTES));
            } else if (kind == RowScanner.BLANK) {
                window.use(scanner.next());
                line += scanner.breaks();
            } else {
                takeHeader(kind, start);
            }
        }
    }

    private void takeHeader(int kind, int start) throws UnreadableCollectionException {
        if (kind == RowScanner.UNFINISHED) {
            scanner.giveUp(start + HEADER_BYTES);
        }
        if (kind != RowScanner.ROW) {
            String reason = scanner.fault() == Fault.NUL ? HeaderRow.NOT_UTF8 : faultReason(HEADER_BYTES);
            throw unreadable(line, column(scanner.faultAt()), reason, null);
        }
        List<String> columns = new ArrayList<>();
        for (int f = 0; f < scanner.fields(); f++) {
            columns.add(RowContent.text(window.bytes(), scanner.bounds(), f));
        }
        String objection = HeaderRow.objection(columns);
        if (objection != null) {
            throw unreadable(line, column(scanner.bounds()[2 * HeaderRow.repeated(columns)]), objection, null);
        }
        header = new CollectionHeader(columns);
        window.use(scanner.next());
        line += scanner.breaks();
        scanner = new RowScanner(header.size());
    }

    private String faultReason(int limit) {
        int start = window.start();
        // What is quoted must not depend on how much of the file happens to be in memory.
        int to = (int) Math.min(window.end(), (long) start + mostBytes(limit));
        return Reasons.of(scanner.fault(), window.bytes(), start, scanner.faultAt(), to, limit);
    }

    private Rejection rejection(int at, String reason) {
        String name = header.name() < scanner.stored() ? RowContent.nameText(window.bytes(), scanner.bounds(), header.name()) : "";
        return new Rejection(file, line, column(at), name, reason);
    }

    private int column(int at) {
        return 1 + Utf8.characters(window.bytes(), window.start(), at);
    }

    private UnreadableCollectionException brokeOff() {
        IOException cause = window.failure();
        return unreadable(line, 0, "reading broke off in this row (" + cause.getMessage()
                + "); make the file readable and read it again", cause);
    }

    private UnreadableCollectionException unreadable(long atLine, int column, String reason, Throwable cause) {
        return new UnreadableCollectionException(new Rejection(file, atLine, column, "", reason), cause);
    }

    private static UnreadableCollectionException unopened(String file, String reason, Throwable cause) {
        return new UnreadableCollectionException(new Rejection(file, 0, 0, "", reason), cause);
    }
}
