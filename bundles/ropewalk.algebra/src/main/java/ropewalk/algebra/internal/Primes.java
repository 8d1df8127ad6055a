package ropewalk.algebra.internal;

import java.util.Arrays;

/**
 * The primes below 2^50 and above 2^49, descending; found on demand and kept. Thread-safe.
 *
 * <p>Each is proved prime: a number below 3,317,044,064,679,887,385,961,981 that is a strong probable prime to the bases 2,
 * 3, …, 41 is prime (J. Sorenson and J. Webster, Math. Comp. 86 (2017) 985–1003).
 */
final class Primes {
    private static final int[] BASES = {2, 3, 5, 7, 11, 13, 17, 19, 23, 29, 31, 37, 41};
    private static final Primes SHARED = new Primes();

    private long[] found = new long[64];
    private int count;
    private long next = (1L << 50) - 1;

    private Primes() {
    }

    /** The primes number {@code from} to {@code to} - 1, counted from 0. */
    static long[] range(int from, int to) {
        return SHARED.find(from, to);
    }

    private synchronized long[] find(int from, int to) {
        if (to > found.length) {
            found = Arrays.copyOf(found, Math.max(to, 2 * found.length));
        }
        while (count < to) {
            if (isPrime(next)) {
                found[count++] = next;
            }
            next -= 2;
            // There are more than 10^13 primes above 2^49: this is a guard against a wrong loop, not a limit.
            if (next < 1L << 49) {
                throw new IllegalStateException("no prime above 2^49 is left after " + count);
            }
        }
        return Arrays.copyOfRange(found, from, to);
    }

    /** Whether a number from 2 to 2^50 - 1 is prime. */
    static boolean isPrime(long n) {
        for (int q : BASES) {
            if (n % q == 0) {
                return n == q;
            }
        }
        PrimeField ring = new PrimeField(n);
        int twos = Long.numberOfTrailingZeros(n - 1);
        for (int base : BASES) {
            if (!strongProbablePrime(ring, base, twos)) {
                return false;
            }
        }
        return true;
    }

    private static boolean strongProbablePrime(PrimeField ring, long base, int twos) {
        long power = 1;
        long square = base;
        for (long e = ring.p - 1 >> twos; e != 0; e >>= 1) {
            power = (e & 1) == 0 ? power : ring.multiply(power, square);
            square = ring.multiply(square, square);
        }
        if (power == 1 || power == ring.p - 1) {
            return true;
        }
        for (int k = 1; k < twos; k++) {
            power = ring.multiply(power, power);
            if (power == ring.p - 1) {
                return true;
            }
        }
        return false;
    }
}
