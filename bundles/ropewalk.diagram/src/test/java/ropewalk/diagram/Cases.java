package ropewalk.diagram;

import java.util.Random;

/** Runs a check on many random cases; a failure names the seed of its case. */
public final class Cases {

    /** A check on one random case. */
    public interface Check {
        void run(Random random, int size) throws Exception;
    }

    private Cases() {
    }

    /** Sizes grow from 1 to the largest; case i has the seed seed + i. */
    public static void run(long seed, int cases, int largest, Check check) {
        for (int i = 0; i < cases; i++) {
            int size = 1 + (int) ((long) i * largest / cases);
            try {
                check.run(new Random(seed + i), size);
            } catch (Exception | AssertionError e) {
                throw new AssertionError("seed " + (seed + i) + ", size " + size + ": " + e.getMessage(), e);
            }
        }
    }
}
