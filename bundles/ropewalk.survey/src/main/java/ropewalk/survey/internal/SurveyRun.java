package ropewalk.survey.internal;

import java.io.IOException;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.split.SplitDetection;
import ropewalk.survey.Survey.RequestException;
import ropewalk.survey.SurveyListener;
import ropewalk.survey.SurveyReport;
import ropewalk.survey.SurveyRequest;

/**
 * One survey from its first byte to its last; the thread that runs it writes the results. Its columns are fixed at the
 * start; what arrives meanwhile is measured in a further pass after the last row.
 */
final class SurveyRun {

    private static final long CLOSE_SECONDS = 5;

    private final SurveyRequest request;
    private final MethodCatalogue catalogue;
    private final SplitDetection detection;
    private final SurveyListener listener;
    private final CountDownLatch closed = new CountDownLatch(1);
    private volatile boolean stopped;
    private volatile Pass pass;

    SurveyRun(SurveyRequest request, MethodCatalogue catalogue, SplitDetection detection, SurveyListener listener) {
        this.request = request;
        this.catalogue = catalogue;
        this.detection = detection;
        this.listener = listener;
    }

    /** Stops after the rows that are ready, and waits until the files are closed. */
    void stop() {
        stopped = true;
        Pass running = pass;
        if (running != null) {
            running.stop();
        }
        try {
            if (!closed.await(CLOSE_SECONDS, TimeUnit.SECONDS)) {
                listener.message("the results could not be closed within " + CLOSE_SECONDS + " s; the last row of "
                        + OutputFolder.RESULTS + " may be cut off");
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    SurveyReport run() throws RequestException, IOException {
        try {
            Columns columns = Columns.of(request, catalogue.entries(), detection != null);
            OutputFolder folder = OutputFolder.of(request);
            long firstByte = System.nanoTime();
            Pass first = begin();
            Header header = first.header(columns);
            folder.prepare();
            ResultsWriter writer = new ResultsWriter(folder, header, columns.hasVerdict(),
                    columns.measured().stream().anyMatch(c -> !c.rivals().isEmpty()), listener);
            boolean complete;
            try (writer) {
                complete = first.run(columns, new RowShape.Whole(header), catalogue, detection, writer);
            }
            long failedCells = writer.failedCells();
            if (complete) {
                failedCells += arrivals(columns, header, folder);
            }
            return new SurveyReport(folder.path(), writer.links(), writer.rejections(), failedCells, firstByte,
                    System.nanoTime(), complete && !stopped);
        } finally {
            closed.countDown();
        }
    }

    private Pass begin() {
        Pass next = new Pass(request, listener);
        pass = next;
        if (stopped) {
            next.stop();
        }
        return next;
    }

    /** Measures what arrived during the survey; gives the number of failed cells. */
    private long arrivals(Columns columns, Header header, OutputFolder folder) throws IOException {
        List<CatalogueEntry> entries = catalogue.entries();
        Columns added = Columns.ofArrivals(request, entries).without(columns);
        if (added.measured().isEmpty()) {
            return 0;
        }
        listener.message(String.join(", ", added.measured().stream().map(Column::id).toList())
                + " arrived during the survey; measuring it in a further pass");
        Pass further = begin();
        Header now = further.header(columns.with(added, entries));
        try (FurtherPass join = new FurtherPass(folder.path().resolve(OutputFolder.RESULTS), header, now, added)) {
            if (further.run(added, new RowShape.CellsAlone(now), catalogue, null, join)) {
                join.finish();
            }
            return join.failedCells();
        }
    }
}
