package ropewalk.survey.internal;

import java.io.IOException;
import java.io.OutputStream;
import ropewalk.collection.CsvRows;
import ropewalk.collection.NameRegister;
import ropewalk.collection.RecordBlock;
import ropewalk.collection.RejectedFile;
import ropewalk.collection.Rejection;
import ropewalk.survey.SurveyListener;

/** Writes the files of one survey, block by block in input order. */
final class ResultsWriter implements Pass.Sink, AutoCloseable {

    private final OutputStream results;
    private final OutputStream evidence;
    private final OutputStream rivals;
    private final RejectedFile rejected;
    private final SurveyListener listener;
    private final NameRegister names = new NameRegister();
    private long links;
    private long failedCells;
    private long repeatedNames;

    ResultsWriter(OutputFolder folder, Header header, boolean withEvidence, boolean withRivals,
            SurveyListener listener) throws IOException {
        this.listener = listener;
        results = folder.open(OutputFolder.RESULTS);
        rejected = new RejectedFile(folder.open(OutputFolder.REJECTED));
        evidence = withEvidence ? folder.open(OutputFolder.EVIDENCE) : null;
        rivals = withRivals ? folder.open(OutputFolder.RIVALS) : null;
        CsvRows first = new CsvRows();
        header.names().forEach(first::field);
        first.endRow().writeTo(results);
        if (rivals != null) {
            CsvRows columns = new CsvRows();
            columns.field("link").field("invariant").field("method").field("bundle").field("value").field("seconds")
                    .field("agrees").endRow().writeTo(rivals);
        }
    }

    @Override
    public void take(FinishedBlock block) throws IOException {
        block.results().writeTo(results);
        if (evidence != null) {
            evidence.write(block.evidence());
        }
        if (rivals != null) {
            block.rivals().writeTo(rivals);
        }
        for (Rejection rejection : block.rejections()) {
            take(rejection);
        }
        repeated(block.block());
        links += block.links();
        failedCells += block.failedCells();
    }

    @Override
    public void take(Rejection rejection) throws IOException {
        rejected.add(rejection);
    }

    private void repeated(RecordBlock block) {
        for (int i = 0; i < block.size(); i++) {
            if (names.occurred(block, i) && repeatedNames++ == 0) {
                listener.message("line " + block.line(i) + " of " + block.file() + ": this name occurred before; both "
                        + "rows are measured, give each link a name of its own to tell them apart");
            }
        }
    }

    long links() {
        return links;
    }

    long rejections() {
        return rejected.count();
    }

    long failedCells() {
        return failedCells;
    }

    long repeatedNames() {
        return repeatedNames;
    }

    @Override
    public void close() throws IOException {
        try (results; evidence; rivals; rejected) {
            if (repeatedNames > 1) {
                listener.message(repeatedNames + " rows have a name that occurred before");
            }
        }
    }
}
