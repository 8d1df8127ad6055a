package ropewalk.survey.internal;

import java.io.IOException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import ropewalk.collection.Rejection;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.split.SplitDetection;
import ropewalk.survey.SurveyListener;
import ropewalk.survey.SurveyRequest;

/** One way through all files: reads them, has the blocks measured, and hands over what is finished in input order. */
final class Pass {

    /** Takes what a pass brings, in input order, on one thread. */
    interface Sink {

        void take(FinishedBlock block) throws IOException;

        void take(Rejection unreadableFile) throws IOException;
    }

    private static final long PROGRESS_NANOS = 200_000_000;

    private final SurveyRequest request;
    private final SurveyListener listener;
    private final Intake intake;
    private volatile boolean stopped;
    private long links;
    private long bytesRead;
    private long lastProgress;

    Pass(SurveyRequest request, SurveyListener listener) {
        this.request = request;
        this.listener = listener;
        this.intake = new Intake(request.files(), request.jobs());
    }

    Header header(Columns columns) {
        return Header.of(columns, intake.headers());
    }

    /** Makes {@link #run} return after the rows that are ready. */
    void stop() {
        stopped = true;
        intake.stop();
    }

    /**
     * Goes through the files.
     *
     * @return false if it was stopped before the end
     */
    boolean run(Columns columns, RowShape shape, MethodCatalogue catalogue, SplitDetection detection, Sink sink)
            throws IOException {
        Workers workers = new Workers(request, columns, shape, catalogue, detection, listener);
        try {
            intake.start(shape.header(), workers.jobs());
            return hand(sink);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return false;
        } finally {
            workers.close();
        }
    }

    private boolean hand(Sink sink) throws IOException, InterruptedException {
        long all = Intake.bytesInAll(request.files());
        while (true) {
            Intake.Item item = intake.next();
            if (item == Intake.Item.END) {
                return !stopped;
            }
            if (item.broken() != null) {
                throw new IllegalStateException("reading broke off: " + item.broken(), item.broken());
            }
            if (item.unreadable() != null) {
                sink.take(item.unreadable());
                continue;
            }
            FinishedBlock block = await(item);
            if (block == null) {
                return false;
            }
            sink.take(block);
            intake.written(block.block());
            progress(block, all);
        }
    }

    /** The block, or null if the pass is stopped before it is ready. */
    private FinishedBlock await(Intake.Item item) throws InterruptedException {
        while (true) {
            try {
                return item.block().get(100, TimeUnit.MILLISECONDS);
            } catch (TimeoutException e) {
                if (stopped) {
                    return null;
                }
            } catch (ExecutionException e) {
                throw new IllegalStateException("measuring broke off: " + e.getCause(), e.getCause());
            }
        }
    }

    private void progress(FinishedBlock block, long all) {
        links += block.links();
        bytesRead += block.block().bytes().length;
        long now = System.nanoTime();
        if (now - lastProgress > PROGRESS_NANOS) {
            lastProgress = now;
            listener.progress(links, Math.min(bytesRead, all), all);
        }
    }
}
