package ropewalk.survey.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingDeque;
import ropewalk.invariant.Effort;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.split.SplitDetection;
import ropewalk.survey.SurveyListener;
import ropewalk.survey.SurveyRequest;

/** The threads of one survey; replaces a worker in which something hangs. */
final class Workers {

    private static final long LOOK_MILLIS = 250;

    private final SurveyRequest request;
    private final Columns columns;
    private final RowShape shape;
    private final MethodCatalogue catalogue;
    private final SplitDetection detection;
    private final SurveyListener listener;
    private final Benches benches = new Benches();
    private final LinkedBlockingDeque<Job> jobs = new LinkedBlockingDeque<>();
    private final List<Worker> workers = new ArrayList<>();
    private final Watch watch;
    private final Thread watcher;
    private volatile boolean closed;

    Workers(SurveyRequest request, Columns columns, RowShape shape, MethodCatalogue catalogue,
            SplitDetection detection, SurveyListener listener) {
        this.request = request;
        this.columns = columns;
        this.shape = shape;
        this.catalogue = catalogue;
        this.detection = detection;
        this.listener = listener;
        this.watch = new Watch(request.effortSeconds());
        for (int i = 0; i < request.jobs(); i++) {
            workers.add(start());
        }
        watcher = new Thread(this::look, "survey watch");
        watcher.setDaemon(true);
        watcher.start();
    }

    BlockingQueue<Job> jobs() {
        return jobs;
    }

    /** Lets every worker end after the jobs that are queued. */
    void finish() {
        for (int i = 0; i < request.jobs(); i++) {
            jobs.add(Worker.END);
        }
    }

    /** Stops work on what is not ready. */
    synchronized void close() {
        closed = true;
        watcher.interrupt();
        for (Worker worker : workers) {
            worker.effort().cancel();
        }
        jobs.clear();
        finish();
    }

    private Worker start() {
        Effort effort = Effort.ofSeconds(request.effortSeconds());
        Activity activity = new Activity();
        ColumnMeasurer measurer = new ColumnMeasurer(catalogue, benches, activity, effort);
        VerdictMeasurer verdicts = columns.hasVerdict()
                ? new VerdictMeasurer(detection, activity, effort) : null;
        Worker worker = new Worker(jobs, new BlockMeasurer(columns, shape, request.strict(), measurer, verdicts, activity), measurer,
                verdicts, activity, effort);
        Thread thread = new Thread(worker, "survey worker");
        thread.setDaemon(true);
        thread.start();
        return worker;
    }

    private void look() {
        try {
            while (!closed) {
                Thread.sleep(LOOK_MILLIS);
                synchronized (this) {
                    for (int i = 0; i < workers.size() && !closed; i++) {
                        String task = watch.hanging(workers.get(i));
                        if (task != null) {
                            replace(i, task);
                        }
                    }
                }
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    private void replace(int i, String task) {
        Worker hanging = workers.get(i);
        watch.forget(hanging);
        Job orphan = hanging.abandon(task);
        if (task.equals(VerdictMeasurer.TASK)) {
            // Anything that is installed may hang in a verdict; the next link's may well be found.
            listener.message("a verdict did not stop at its effort of " + request.effortSeconds() + " s and is left out");
        } else if (benches.add(task)) {
            columns.methods().filter(method -> method.id().equals(task)).forEach(catalogue::setAside);
            listener.message("'" + task + "' did not stop at its effort of " + request.effortSeconds()
                    + " s and is not asked again in this survey; raise --effort or leave it out with --skip " + task);
        }
        if (orphan != null) {
            jobs.addFirst(orphan);
        }
        workers.set(i, start());
    }
}
