package ropewalk.survey.internal;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.split.SplitDetection;
import ropewalk.survey.Survey.RequestException;
import ropewalk.survey.SurveyListener;
import ropewalk.survey.SurveyReport;
import ropewalk.survey.SurveyRequest;

/** One survey from its first byte to its last; the thread that runs it writes the results. */
final class SurveyRun {

    private static final long PROGRESS_NANOS = 200_000_000;
    private static final long CLOSE_SECONDS = 5;

    private final SurveyRequest request;
    private final MethodCatalogue catalogue;
    private final SplitDetection detection;
    private final SurveyListener listener;
    private final CountDownLatch closed = new CountDownLatch(1);
    private volatile boolean stopped;
    private volatile Intake intake;
    private long bytesRead;
    private long lastProgress;

    SurveyRun(SurveyRequest request, MethodCatalogue catalogue, SplitDetection detection, SurveyListener listener) {
        this.request = request;
        this.catalogue = catalogue;
        this.detection = detection;
        this.listener = listener;
    }

    /** Stops after the rows that are ready, and waits until the files are closed. */
    void stop() {
        stopped = true;
        Intake reading = intake;
        if (reading != null) {
            reading.stop();
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
            intake = new Intake(request.files(), request.jobs());
            Header header = Header.of(columns, intake.headers());
            folder.prepare();
            Workers workers = new Workers(request, columns, catalogue, detection, listener);
            ResultsWriter writer = new ResultsWriter(folder, header, columns.hasVerdict(),
                    columns.measured().stream().anyMatch(c -> !c.rivals().isEmpty()), listener);
            boolean complete;
            try (writer) {
                intake.start(header, workers.jobs());
                complete = write(writer);
            } finally {
                workers.close();
            }
            return new SurveyReport(folder.path(), writer.links(), writer.rejections(), writer.failedCells(), firstByte,
                    System.nanoTime(), complete);
        } finally {
            closed.countDown();
        }
    }

    private boolean write(ResultsWriter writer) throws IOException {
        long all = Intake.bytesInAll(request.files());
        try {
            while (true) {
                Intake.Item item = intake.next();
                if (item == Intake.Item.END) {
                    return !stopped;
                }
                if (item.broken() != null) {
                    throw new IllegalStateException("reading broke off: " + item.broken(), item.broken());
                }
                if (item.unreadable() != null) {
                    writer.reject(item.unreadable());
                    continue;
                }
                FinishedBlock block = await(item);
                if (block == null) {
                    return false;
                }
                writer.write(block);
                intake.written(block.block());
                progress(writer, block, all);
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return false;
        }
    }

    /** The block, or null if the survey is stopped before it is ready. */
    private FinishedBlock await(Intake.Item item) throws InterruptedException {
        while (true) {
            try {
                return item.block().get(100, TimeUnit.MILLISECONDS);
            } catch (TimeoutException e) {
                if (stopped) {
                    return null;
                }
            } catch (ExecutionException e) {
                if (e.getCause() instanceof UncheckedIOException io) {
                    throw io;
                }
                throw new IllegalStateException("measuring broke off: " + e.getCause(), e.getCause());
            }
        }
    }

    private void progress(ResultsWriter writer, FinishedBlock block, long all) {
        bytesRead += block.block().bytes().length;
        long now = System.nanoTime();
        if (now - lastProgress > PROGRESS_NANOS) {
            lastProgress = now;
            listener.progress(writer.links(), Math.min(bytesRead, all), all);
        }
    }
}
