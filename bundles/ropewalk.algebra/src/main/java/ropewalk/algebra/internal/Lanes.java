package ropewalk.algebra.internal;

/**
 * Arithmetic modulo several primes at once, one prime a lane, residues in doubles.
 *
 * <p><b>Why it is exact.</b> Let 2^49 &lt; p &lt; 2^50, u = 2^-53, all residues whole and at most p in absolute value. h = fl(ab)
 * and l = fma(a, b, -h) give ab = h + l exactly, and |l| is at most half a unit in the last place of p²: at most 2^45 &lt; 0.07 p
 * for p² &lt; 2^99, else at most 2^46 &lt; 0.09 p. The quotient q, rounded to a whole number by adding and taking away 3·2^51 (the
 * sum lies between 2^52 and 2^53, where doubles are the whole numbers), comes from fl(fl(h - t)·fl(1/p)), three roundings, whose
 * error is at most 3.01 u (p + 1) &lt; 0.38; so |q - (h - t)/p| &lt; 0.88. h is whole, for doubles above 2^53 are and smaller products
 * are exact. Then fma(q, p, -h) is a whole number below 0.88 p + p &lt; 2^51, hence exact, the two additions as well, and the
 * result t - ab + qp is below 0.88 p + 0.09 p &lt; p: again a residue. Zero is 0, p or -p. No exponent comes near its limits.
 * (T. J. Dekker, Numer. Math. 18 (1971) 224–242, for exact products; IEEE 754-2008 for fma.)
 *
 * <p>All loops index every array by the same variable: that is the form which the just-in-time compiler turns into vector
 * instructions. On a processor without a fused instruction {@link Math#fma(double, double, double)} is exact but slow;
 * there the same steps run on long arithmetic. Which of the two is taken is a matter of time only: both give the same residue
 * classes, possibly by other representatives, and nothing but the class leaves by {@link #canonical} and {@link #isZero}.
 */
final class Lanes {
    private static final double ROUND = 0x1.8p52;

    /** Two exact ways to the same residue classes. */
    enum Arithmetic {
        /** Doubles with a fused multiplication and addition. */
        FUSED,
        /** Longs that wrap around, with a quotient from doubles. */
        LONG;

        /** The one that was faster when the class was loaded; no value depends on it. */
        static final Arithmetic FASTER = fusedInHardware() ? FUSED : LONG;

        /** Without the instruction the method takes a microsecond or more by way of decimal numbers. */
        private static boolean fusedInHardware() {
            double x = 1;
            long start = System.nanoTime();
            for (int k = 0; k < 2000; k++) {
                x = Math.fma(x, 0.999, 0.001);
            }
            return System.nanoTime() - start < 1_000_000 && x > 0;
        }
    }

    private final boolean fused;
    private final long[] primes;
    private final double[] p;
    private final double[] reciprocal;
    private final double[][] exponentBits;
    private final double[] base;

    Lanes(long[] primes) {
        this(primes, Arithmetic.FASTER);
    }

    /**
     * Lanes with a given arithmetic.
     *
     * @param primes odd numbers between 2^49 and 2^50
     * @throws IllegalArgumentException if one is not, for which nothing would be proved
     */
    Lanes(long[] primes, Arithmetic arithmetic) {
        this.fused = arithmetic == Arithmetic.FUSED;
        this.primes = primes;
        for (long prime : primes) {
            if (prime <= 1L << 49 || prime >= 1L << 50) {
                throw new IllegalArgumentException("prime " + prime + " is not between 2^49 and 2^50, where the arithmetic is proved");
            }
        }
        int lanes = primes.length;
        p = new double[lanes];
        reciprocal = new double[lanes];
        base = new double[lanes];
        exponentBits = new double[50][lanes];
        for (int k = 0; k < lanes; k++) {
            p[k] = primes[k];
            reciprocal[k] = 1.0 / primes[k];
            for (int bit = 0; bit < 50; bit++) {
                exponentBits[bit][k] = primes[k] - 2 >> bit & 1;
            }
        }
    }

    int count() {
        return primes.length;
    }

    long prime(int lane) {
        return primes[lane];
    }

    /** t becomes t - a b. */
    void subtractProduct(double[] t, double[] a, double[] b) {
        if (fused) {
            subtractProduct(t, a, b, p, reciprocal);
        } else {
            for (int k = 0; k < t.length; k++) {
                t[k] = slow(a[k], b[k], t[k], k);
            }
        }
    }

    private static void subtractProduct(double[] t, double[] a, double[] b, double[] p, double[] reciprocal) {
        for (int k = 0; k < t.length; k++) {
            double h = a[k] * b[k];
            double l = Math.fma(a[k], b[k], -h);
            double q = (h - t[k]) * reciprocal[k] + ROUND - ROUND;
            t[k] = Math.fma(q, p[k], -h) - l + t[k];
        }
    }

    /** t becomes a b; t may be a or b. */
    void multiply(double[] t, double[] a, double[] b) {
        if (fused) {
            multiply(t, a, b, p, reciprocal);
        } else {
            for (int k = 0; k < t.length; k++) {
                t[k] = -slow(a[k], b[k], 0, k);
            }
        }
    }

    private static void multiply(double[] t, double[] a, double[] b, double[] p, double[] reciprocal) {
        for (int k = 0; k < t.length; k++) {
            double h = a[k] * b[k];
            double l = Math.fma(a[k], b[k], -h);
            double q = h * reciprocal[k] + ROUND - ROUND;
            t[k] = Math.fma(-q, p[k], h) + l;
        }
    }

    /** t - ab with a quotient off by less than 1.4 (three roundings as above, then truncation): all but ab and qp fits, and those wrap. */
    private double slow(double a, double b, double t, int k) {
        long q = (long) (a * b * reciprocal[k]);
        return ((long) t - ((long) a * (long) b - q * primes[k])) % primes[k];
    }

    /** t becomes 1 / a, and 0 where a is 0; by a^(p-2) (Fermat), the same steps in all lanes. t is not a. */
    void invert(double[] t, double[] a) {
        java.util.Arrays.fill(t, 1);
        for (int bit = 49; bit >= 0; bit--) {
            multiply(t, t, t);
            select(base, a, exponentBits[bit]);
            multiply(t, t, base);
        }
    }

    private static void select(double[] t, double[] a, double[] bits) {
        for (int k = 0; k < t.length; k++) {
            t[k] = 1 + bits[k] * (a[k] - 1);
        }
    }

    /** t becomes v in all lanes. */
    void load(double[] t, long v) {
        if (Math.abs(v) >= 0 && Math.abs(v) <= 1L << 49) {
            java.util.Arrays.fill(t, v);
        } else {
            for (int k = 0; k < t.length; k++) {
                t[k] = v % primes[k];
            }
        }
    }

    /** The residue from 0 to p - 1. */
    long canonical(double v, int lane) {
        long r = (long) v % primes[lane];
        return r < 0 ? r + primes[lane] : r;
    }

    /** Whether a residue is 0. */
    boolean isZero(double v, int lane) {
        return v == 0 || Math.abs(v) == p[lane];
    }
}
