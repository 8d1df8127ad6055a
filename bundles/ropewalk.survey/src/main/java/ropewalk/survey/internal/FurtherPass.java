package ropewalk.survey.internal;

import java.io.BufferedInputStream;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import ropewalk.collection.CsvRows;
import ropewalk.collection.Rejection;
import ropewalk.collection.ReplacedFile;

/**
 * Joins the cells of columns that arrived during a survey to the rows it wrote, in a new file that then takes the place
 * of the old one in one step.
 */
final class FurtherPass implements Pass.Sink, AutoCloseable {

    private final ReplacedFile file;
    private final InputStream before;
    private final RawRows rowsBefore;
    private final OutputStream out;

    /** For each column of the new table: a column of the old one, or the complement of a new cell's place. */
    private final int[] places;
    private long failedCells;

    FurtherPass(Path results, Header old, Header now, Columns added) throws IOException {
        List<String> oldNames = old.names();
        List<String> newCells = added.measured().stream().map(Column::id).toList();
        int firstKept = now.results().size();
        places = new int[firstKept + now.kept().size()];
        for (int i = 0; i < places.length; i++) {
            if (i >= firstKept) {
                places[i] = old.results().size() + i - firstKept;
            } else {
                int cell = newCells.indexOf(now.results().get(i));
                places[i] = cell >= 0 ? ~cell : oldNames.indexOf(now.results().get(i));
            }
        }
        file = ReplacedFile.begin(results);
        before = new BufferedInputStream(Files.newInputStream(results), 1 << 16);
        rowsBefore = new RawRows(before);
        out = file.output();
        rowsBefore.next();
        CsvRows header = new CsvRows();
        now.names().forEach(header::field);
        header.endRow().writeTo(out);
    }

    @Override
    public void take(FinishedBlock block) throws IOException {
        ByteArrayOutputStream cells = new ByteArrayOutputStream(block.results().size());
        block.results().writeTo(cells);
        RawRows added = new RawRows(new ByteArrayInputStream(cells.toByteArray()));
        for (int i = 0; i < block.links(); i++) {
            List<byte[]> old = rowsBefore.next();
            List<byte[]> cell = added.next();
            if (old == null) {
                throw new IOException("the collection has more rows now than when the survey read it first");
            }
            for (int p = 0; p < places.length; p++) {
                if (p > 0) {
                    out.write(',');
                }
                out.write(places[p] < 0 ? cell.get(~places[p]) : old.get(places[p]));
            }
            out.write("\r\n".getBytes(StandardCharsets.US_ASCII));
        }
        failedCells += block.failedCells();
    }

    @Override
    public void take(Rejection unreadableFile) {
        // Told in the first pass.
    }

    long failedCells() {
        return failedCells;
    }

    void finish() throws IOException {
        if (rowsBefore.next() != null) {
            throw new IOException("the collection has fewer rows now than when the survey read it first");
        }
        file.finish();
    }

    @Override
    public void close() throws IOException {
        before.close();
        file.close();
    }
}
