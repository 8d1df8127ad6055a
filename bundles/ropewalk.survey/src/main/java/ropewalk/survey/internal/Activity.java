package ropewalk.survey.internal;

/** What a worker is doing, for the watch; written by the worker, read by the watch. */
final class Activity {

    /** The method, or {@code verdict}; null while nothing of anybody else's runs. */
    private volatile String task;
    private volatile long cell;
    private volatile boolean abandoned;

    void begin(String newTask) {
        cell++;
        task = newTask;
    }

    @SuppressWarnings("NonAtomicOperationOnVolatileField")
    void nextCell() {
        cell++;         // one writer
    }

    void end() {
        task = null;
    }

    String task() {
        return task;
    }

    long cell() {
        return cell;
    }

    /** Nobody waits for this worker any more. */
    void abandon() {
        abandoned = true;
    }

    boolean isAbandoned() {
        return abandoned;
    }

    /** Ends the work of a worker that nobody waits for, before what it found with a cancelled effort is kept. */
    void requireWanted() {
        if (abandoned) {
            throw new AbandonedException();
        }
    }

    /** Thrown inside an abandoned worker. */
    static final class AbandonedException extends RuntimeException {

        private static final long serialVersionUID = 1L;

        AbandonedException() {
            super("abandoned", null, false, false);
        }
    }
}
