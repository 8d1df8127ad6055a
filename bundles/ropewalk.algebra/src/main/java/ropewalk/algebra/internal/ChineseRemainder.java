package ropewalk.algebra.internal;

import java.math.BigInteger;

/**
 * The whole number of least absolute value with given residues, by mixed radix digits (H. L. Garner, IRE Trans. EC-8 (1959)
 * 140–147), which a product tree turns into a number. O(k²) word operations for k primes.
 */
final class ChineseRemainder {
    private ChineseRemainder() {
    }

    /**
     * Reconstructs.
     *
     * @param residues residues from 0 to p - 1, the first {@code count} of them
     * @param primes different primes
     * @param count how many
     * @param checkpoint run once a prime
     * @return the number x with 2 |x| less than the product of the primes
     */
    static BigInteger signed(long[] residues, long[] primes, int count, Runnable checkpoint) {
        long[] digit = new long[count];
        for (int i = 0; i < count; i++) {
            checkpoint.run();
            PrimeField field = new PrimeField(primes[i]);
            long value = 0;
            long radix = 1;
            for (int j = 0; j < i; j++) {
                // Digits and primes differ by less than 2^49 from a residue: one reduction each.
                value += field.multiply(radix, field.of(digit[j]));
                value = value >= field.p ? value - field.p : value;
                radix = field.multiply(radix, field.of(primes[j]));
            }
            digit[i] = field.multiply(field.subtract(residues[i], value), field.inverse(radix));
        }
        BigInteger[] result = tree(digit, primes, 0, count);
        return result[0].shiftLeft(1).compareTo(result[1]) > 0 ? result[0].subtract(result[1]) : result[0];
    }

    /** Value and product of the digits from {@code from} to {@code to}. */
    private static BigInteger[] tree(long[] digit, long[] primes, int from, int to) {
        if (to == from) {
            return new BigInteger[] {BigInteger.ZERO, BigInteger.ONE};
        }
        if (to == from + 1) {
            return new BigInteger[] {BigInteger.valueOf(digit[from]), BigInteger.valueOf(primes[from])};
        }
        int middle = (from + to) >>> 1;
        BigInteger[] low = tree(digit, primes, from, middle);
        BigInteger[] high = tree(digit, primes, middle, to);
        return new BigInteger[] {low[0].add(low[1].multiply(high[0])), low[1].multiply(high[1])};
    }
}
