package ropewalk.algebra;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.util.Locale;
import java.util.Random;

/** Times the cases that matter, warm, in processor time of one thread, and prints a table. Not a test: run it by hand. */
public final class Timings {
    private static final Runnable NONE = () -> { };
    private static final ThreadMXBean PROCESSOR = ManagementFactory.getThreadMXBean();
    private static long sink;

    private Timings() {
    }

    /**
     * Runs all cases, or those whose name contains the first argument.
     *
     * @param arguments optionally a part of a name
     */
    public static void main(String[] arguments) {
        String only = arguments.length == 0 ? "" : arguments[0];
        small(only);
        for (int side : new int[] {10, 23, 39, 71, 100}) {
            IntegerMatrix signs = Samples.planarLaplacian(side, new Random(1), false);
            IntegerMatrix alternating = Samples.planarLaplacian(side, new Random(1), true);
            IntegerMatrix colouring = Samples.colouring(side, new Random(1));
            int n = signs.rows();
            time(only, "determinant, random signs, " + n, () -> sink += Determinant.of(signs, NONE).bitLength());
            time(only, "determinant, alternating, " + n, () -> sink += Determinant.of(alternating, NONE).bitLength());
            time(only, "determinant, colouring, " + n, () -> sink += Determinant.of(colouring, NONE).bitLength());
            time(only, "inertia, random signs, " + n, () -> sink += Inertia.of(signs, NONE).positive());
            time(only, "rank, colouring, " + n, () -> sink += Rank.of(colouring, NONE));
            time(only, "kernel modulo 3, colouring, " + n, () -> sink += Kernel.modulo(colouring, 3, NONE).length);
            if (n < 2000) {
                time(only, "factors, random signs, " + n, () -> sink += InvariantFactors.of(signs, NONE).size());
                time(only, "factors, alternating, " + n, () -> sink += InvariantFactors.of(alternating, NONE).size());
                time(only, "factors, colouring, " + n, () -> sink += InvariantFactors.of(colouring, NONE).size());
            }
        }
        System.out.println("(" + sink % 10 + ")");
    }

    private static void small(String only) {
        Random random = new Random(7);
        long[][] symmetric = new long[256][];
        long[][] general = new long[256][];
        for (int k = 0; k < 256; k++) {
            symmetric[k] = Samples.planarLaplacian(3, random, false).without(7, 7).toDense();
            general[k] = Samples.colouring(4, random).without(14, 14).toDense();
        }
        long[] scratch = new long[256];
        long[] out = new long[32];
        time(only, "small symmetric, 7, x 256", () -> {
            for (long[] a : symmetric) {
                System.arraycopy(a, 0, scratch, 0, 49);
                SmallMatrix.symmetric(scratch, 7, out);
                sink += out[0];
            }
        });
        time(only, "small factors, 7, x 256", () -> {
            for (long[] a : symmetric) {
                System.arraycopy(a, 0, scratch, 0, 49);
                sink += SmallMatrix.invariantFactors(scratch, 7, 7, out);
            }
        });
        for (int p : new int[] {2, 3, 5}) {
            time(only, "small rank modulo " + p + ", 14, x 256", () -> {
                for (long[] a : general) {
                    System.arraycopy(a, 0, scratch, 0, 196);
                    sink += SmallMatrix.rankModulo(scratch, 14, 14, p);
                }
            });
        }
        time(only, "small determinant, 14, x 256", () -> {
            for (long[] a : general) {
                System.arraycopy(a, 0, scratch, 0, 196);
                sink += SmallMatrix.determinant(scratch, 14);
            }
        });
    }

    /** The least of several blocks of at least a tenth of a second, after a second to warm up. */
    private static void time(String only, String name, Runnable job) {
        if (!name.contains(only)) {
            return;
        }
        long start = System.nanoTime();
        int runs = 0;
        while (System.nanoTime() - start < 1_000_000_000L || runs < 2) {
            job.run();
            runs++;
        }
        double least = Double.MAX_VALUE;
        for (int block = 0; block < 5; block++) {
            long from = PROCESSOR.getCurrentThreadCpuTime();
            int inBlock = 0;
            do {
                job.run();
                inBlock++;
            } while (PROCESSOR.getCurrentThreadCpuTime() - from < 100_000_000L);
            least = Math.min(least, (PROCESSOR.getCurrentThreadCpuTime() - from) / (double) inBlock);
        }
        System.out.printf(Locale.ROOT, "%-48s %12.3f us%n", name, least / 1000);
    }
}
