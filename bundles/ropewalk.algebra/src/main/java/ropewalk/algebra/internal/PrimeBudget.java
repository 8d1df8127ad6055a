package ropewalk.algebra.internal;

import java.util.Arrays;
import ropewalk.algebra.MatrixTooLargeException;

/** Runs a recorded elimination modulo as many primes as a bound demands. */
final class PrimeBudget {
    private static final int LANES = 32;
    /** A processor's vector holds eight doubles at most: other numbers of lanes waste the end. */
    private static final int STEP = 8;
    /** Every prime used is at least this, checked where it is used: more than 10^11 primes are. */
    private static final long LEAST_PRIME = (1L << 50) - (1L << 42);
    /** Below log2 of the least prime, 50 + log2(1 - 2^-8) &gt; 49.994, by far more than the rounding of the count. */
    private static final double BITS_A_PRIME = 49.99;

    private final Elimination elimination;
    private final Runnable checkpoint;
    private final long[] primes;
    private final long[] products;
    private int good;

    PrimeBudget(Elimination elimination, int needed, Runnable checkpoint) {
        this.elimination = elimination;
        this.checkpoint = checkpoint;
        this.primes = new long[needed];
        this.products = new long[needed];
    }

    /**
     * How many primes have a product above twice every number of that many bits: so many bits and one more for the sign.
     *
     * @param bits the binary logarithm of the bound, at least 0
     */
    static int forBits(double bits) {
        double count = Math.floor((bits + 1) / BITS_A_PRIME) + 1;
        if (!(count < 1 << 26)) {
            throw new MatrixTooLargeException("a determinant of up to " + bits
                + " bits was asked for, which does not fit into memory; split the matrix into blocks or scale it down");
        }
        return (int) count;
    }

    /**
     * Runs.
     *
     * @return -1 if all primes are done; else a prime modulo which the rank is larger than the number of pivots
     */
    long run() {
        int laneCount = lanes();
        ProgramRun run = new ProgramRun(elimination.program(), laneCount, checkpoint);
        boolean checkRest = elimination.program().rest > 0;
        // A pivot is 0 modulo a prime only if that divides one of the r leading minors. A row of less than 2^31 numbers of 64 bits is
        // shorter than 2^79, so by Hadamard a minor of order k has fewer than 2k prime divisors of this size: r(r + 1) in all.
        long mostSkipped = (elimination.rank() + 1L) * (elimination.rank() + 1L);
        for (int next = 0; good < primes.length; next += laneCount) {
            if (next - good > mostSkipped) {
                throw new IllegalStateException("of " + next + " primes only " + good + " left all pivots standing");
            }
            Lanes lanes = new Lanes(Primes.range(next, next + laneCount));
            run.run(lanes);
            boolean[] zero = checkRest ? run.restIsZero() : null;
            for (int k = 0; k < laneCount && good < primes.length; k++) {
                long product = run.product(k);
                if (product < 0) {
                    continue;
                }
                if (checkRest && !zero[k]) {
                    return lanes.prime(k);
                }
                if (lanes.prime(k) < LEAST_PRIME) {
                    throw new IllegalStateException("prime " + lanes.prime(k) + " is shorter than the count of primes assumes");
                }
                primes[good] = lanes.prime(k);
                products[good++] = product;
            }
        }
        return -1;
    }

    /** As many lanes as are of use, fewer where memory is short. */
    private int lanes() {
        int batches = (primes.length + LANES - 1) / LANES;
        int lanes = (primes.length + batches - 1) / batches;
        lanes = (lanes + STEP - 1) / STEP * STEP;
        long memory = Runtime.getRuntime().maxMemory();
        long arrays = elimination.program().slots + 2L * elimination.program().widest;
        while (lanes > STEP && arrays * (8L * lanes + 24) > memory / 4) {
            lanes -= STEP;
        }
        if (arrays * (8L * lanes + 24) > memory / 4 * 3) {
            throw new MatrixTooLargeException("an elimination needs " + arrays + " numbers at a time modulo " + lanes
                + " primes, more than the memory of " + memory + " bytes; start the virtual machine with a larger -Xmx");
        }
        return lanes;
    }

    long[] primes() {
        return Arrays.copyOf(primes, good);
    }

    /** The products of the pivots modulo the primes. */
    long[] products() {
        return Arrays.copyOf(products, good);
    }
}
