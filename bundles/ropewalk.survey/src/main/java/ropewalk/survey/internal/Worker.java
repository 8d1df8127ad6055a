package ropewalk.survey.internal;

import java.util.concurrent.BlockingQueue;
import ropewalk.invariant.Effort;

/** A thread that measures blocks until it is told to end, or abandoned because something in it hangs. */
final class Worker implements Runnable {

    /** Ends the worker that takes it. */
    static final Job END = new Job(null, null);

    private final BlockingQueue<Job> jobs;
    private final BlockMeasurer blocks;
    private final ColumnMeasurer columns;
    private final VerdictMeasurer verdicts;
    private final Activity activity;
    private final Effort effort;
    private volatile Job job;
    private volatile Thread thread;

    Worker(BlockingQueue<Job> jobs, BlockMeasurer blocks, ColumnMeasurer columns,
            VerdictMeasurer verdicts, Activity activity, Effort effort) {
        this.jobs = jobs;
        this.blocks = blocks;
        this.columns = columns;
        this.verdicts = verdicts;
        this.activity = activity;
        this.effort = effort;
    }

    @Override
    public void run() {
        thread = Thread.currentThread();
        try {
            while (!activity.isAbandoned()) {
                Job next = jobs.take();
                if (next == END) {
                    return;
                }
                job = next;
                FinishedBlock finished = blocks.measure(next);
                activity.requireWanted();
                next.finished.complete(finished);
                job = null;
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        } catch (Activity.AbandonedException e) {
            // Another worker has the job.
        } catch (Throwable e) {
            // Ours, not a method's: let the survey end with it.
            Job broken = job;
            if (broken != null && !activity.isAbandoned()) {
                broken.finished.completeExceptionally(e);
            }
        }
    }

    /** Takes the job away from this worker for good, with what the hanging method has said so far. */
    Job abandon(String task) {
        activity.abandon();
        effort.cancel();
        Job orphan = job;
        if (orphan == null) {
            return null;
        }
        if (task.equals(VerdictMeasurer.TASK)) {
            orphan.hungVerdicts.add(verdicts.current());
        } else if (columns.current() != null) {
            orphan.salvaged.put(task, columns.current().clone());
        }
        return orphan;
    }

    Activity activity() {
        return activity;
    }

    Thread thread() {
        return thread;
    }

    Effort effort() {
        return effort;
    }
}
