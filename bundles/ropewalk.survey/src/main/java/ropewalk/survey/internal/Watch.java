package ropewalk.survey.internal;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.util.HashMap;
import java.util.Map;

/**
 * Looks at each worker a few times a second. A method that goes on 2 s after its effort is used up, in processor time or
 * waiting without using any, hangs.
 */
final class Watch {

    private static final double GRACE_SECONDS = 2;
    private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();

    private final double limitSeconds;
    private final Map<Worker, Seen> seen = new HashMap<>();

    /**
     * What was seen of a cell: the clocks when it was first seen, and when its thread last used processor time.
     */
    private record Seen(long cell, long processorNanos, long wallNanos, long lastProcessorNanos, long lastWallNanos) { }

    Watch(double effortSeconds) {
        this.limitSeconds = effortSeconds + GRACE_SECONDS;
    }

    /** The task that hangs in this worker, or null. */
    String hanging(Worker worker) {
        String task = worker.activity().task();
        Thread thread = worker.thread();
        if (task == null || thread == null) {
            seen.remove(worker);
            return null;
        }
        long cell = worker.activity().cell();
        long processor = THREADS.getThreadCpuTime(thread.getId());
        long wall = System.nanoTime();
        Seen before = seen.get(worker);
        if (before == null || before.cell() != cell) {
            seen.put(worker, new Seen(cell, processor, wall, processor, wall));
            return null;
        }
        boolean worked = (processor - before.processorNanos()) / 1e9 > limitSeconds;
        boolean idle = 10 * (processor - before.processorNanos()) < wall - before.wallNanos();
        boolean waited = idle && (wall - before.wallNanos()) / 1e9 > limitSeconds
                && thread.getState() != Thread.State.RUNNABLE;
        // A thread that waits in the operating system, for a pipe or another program, counts as running.
        boolean still = processor == before.lastProcessorNanos();
        boolean blocked = still && (wall - before.lastWallNanos()) / 1e9 > limitSeconds;
        if (!still) {
            seen.put(worker, new Seen(cell, before.processorNanos(), before.wallNanos(), processor, wall));
        }
        return worked || waited || blocked ? task : null;
    }

    void forget(Worker worker) {
        seen.remove(worker);
    }
}
