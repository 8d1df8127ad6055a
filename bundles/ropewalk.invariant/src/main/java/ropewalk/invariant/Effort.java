package ropewalk.invariant;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import org.osgi.annotation.versioning.ProviderType;

/**
 * The processor time that one cell may use, on the thread that measures it. One object serves one thread; only
 * {@link #cancel} may be called from another.
 */
@ProviderType
public final class Effort {

    private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();

    private final long limitNanos;
    private final Effort whole;
    private long spentBefore;
    private boolean running;
    private volatile boolean cancelled;

    private Effort(long limitNanos, Effort whole) {
        this.limitNanos = limitNanos;
        this.whole = whole;
    }

    /**
     * An effort of so many processor seconds for each cell.
     *
     * @param seconds above 0
     * @return a new effort
     */
    public static Effort ofSeconds(double seconds) {
        if (!(seconds > 0)) {
            throw new IllegalArgumentException("an effort of " + seconds + " seconds; it must be above 0");
        }
        return new Effort((long) Math.min(seconds * 1e9, 9e18), null);
    }

    /**
     * A part of this effort for one of several attempts: it ends when the part is used up, or the whole. Whoever catches
     * its {@link SpentException} calls {@link #checkpoint} on the whole, to learn which of the two it was.
     *
     * @param share of the whole limit, above 0 and at most 1
     * @return an effort for the same thread
     */
    public Effort part(double share) {
        if (!(share > 0 && share <= 1)) {
            throw new IllegalArgumentException("a share of " + share + "; it must be above 0 and at most 1");
        }
        return new Effort((long) (limitNanos * share), this);
    }

    /** Begins the next cell: from here the time is counted anew. */
    public void restart() {
        running = false;
    }

    /**
     * Stops the work when the effort is used up. Cheap enough for every millisecond; the clock of a cell starts at its
     * first checkpoint, so that small cells pay nothing for it.
     *
     * @throws SpentException if the effort is used up or the work was cancelled; let it through
     */
    public void checkpoint() {
        if (whole != null) {
            whole.checkpoint();
        }
        if (cancelled) {
            throw new SpentException("cancelled");
        }
        long now = THREADS.getCurrentThreadCpuTime();
        if (!running) {
            running = true;
            spentBefore = now;
        } else if (now - spentBefore > limitNanos) {
            throw new SpentException(limitNanos / 1e9 + " s of processor time used up; --effort sets the limit");
        }
    }

    /**
     * The limit.
     *
     * @return processor time a cell may use, in seconds
     */
    public double seconds() {
        return limitNanos / 1e9;
    }

    /** Makes the next checkpoint throw. May be called from any thread. */
    public void cancel() {
        cancelled = true;
    }

    /** The effort of a cell is used up. */
    public static final class SpentException extends RuntimeException {

        private static final long serialVersionUID = 1L;

        SpentException(String message) {
            super(message, null, false, false);
        }
    }
}
