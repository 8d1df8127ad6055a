package ropewalk.survey.internal;

/** Adds up the time of each link of a batch, in nanoseconds, over the methods that measure it one after another. */
final class Clock {

    private final long[] nanos;
    private final int[] places;
    private long last;

    Clock(int links) {
        this(new long[links], null);
    }

    private Clock(long[] nanos, int[] places) {
        this.nanos = nanos;
        this.places = places;
    }

    /** The same clock for some of the links. */
    Clock at(int[] some) {
        return new Clock(nanos, some);
    }

    void begin() {
        last = System.nanoTime();
    }

    void tick(int link) {
        long now = System.nanoTime();
        nanos[places == null ? link : places[link]] += now - last;
        last = now;
    }

    /** Adds what another clock of the same batch has counted. */
    void add(Clock other) {
        for (int i = 0; i < nanos.length; i++) {
            nanos[i] += other.nanos[i];
        }
    }

    long micros(int link) {
        return (nanos[link] + 500) / 1000;
    }
}
