package ropewalk.bench.internal;

import java.io.IOException;
import java.nio.file.Path;

/**
 * One thing that is timed.
 *
 * @param name how to ask for it
 * @param summary what it does
 * @param work does it in a scratch folder and gives the figure
 */
record Trial(String name, String summary, Work work) {

    interface Work {
        Figure in(Path folder) throws IOException;
    }

    /**
     * What came out.
     *
     * @param seconds wall time, the best of several runs where the trial says so
     * @param rate links a second, or 0 where the trial is a single link
     * @param value what shows that the work was done
     */
    record Figure(double seconds, double rate, String value) { }
}
