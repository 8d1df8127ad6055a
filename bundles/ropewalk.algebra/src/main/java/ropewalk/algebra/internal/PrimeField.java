package ropewalk.algebra.internal;

/**
 * Arithmetic modulo one prime below 2^50; residues are longs from 0 to p - 1.
 *
 * <p>A product is reduced with a quotient from floating point: with u = 2^-53, the computed a·b·(1/p) differs from the true
 * one, which is below 2^50, by less than 3.01 u 2^50 &lt; 0.4. Truncated it is off by -1.4 to 0.4, so the remainder, which
 * wraps modulo 2^64 to its true value, lies between -p and 2p and one correction suffices.
 */
final class PrimeField {
    final long p;
    private final double reciprocal;

    PrimeField(long p) {
        if (p < 2 || p >= 1L << 50) {
            throw new IllegalArgumentException("modulus " + p + "; it must be a prime from 2 to 2^50 - 1");
        }
        this.p = p;
        this.reciprocal = 1.0 / p;
    }

    long of(long v) {
        long r = v % p;
        return r < 0 ? r + p : r;
    }

    long multiply(long a, long b) {
        long q = (long) ((double) a * (double) b * reciprocal);
        long r = a * b - q * p;
        return r < 0 ? r + p : r >= p ? r - p : r;
    }

    long subtract(long a, long b) {
        long r = a - b;
        return r < 0 ? r + p : r;
    }

    long negate(long a) {
        return a == 0 ? 0 : p - a;
    }

    long inverse(long a) {
        return SmallModular.inverse(a, p);
    }
}
