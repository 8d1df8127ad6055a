package ropewalk.survey.internal;

/** What a worker is doing, for the watch; written by the worker, read by the watch. */
final class Activity {

    /** The method, or {@code verdict}; null while nothing of anybody else's runs. */
    private volatile String task;
    private volatile long cell;

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
}
