package ropewalk.algebra.internal;

import java.math.BigInteger;
import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;

/**
 * Values modulo a big number; the pivots are the residues prime to it. A residue may be a pivot if it has no factor in common
 * with the small prime divisors of the modulus, which is quickly seen and nearly always enough; a pivot that is chosen is
 * confirmed by its inverse. What was found out about a value is kept until it changes.
 */
final class BigUnitValues implements ResidueValues {
    private static final byte UNKNOWN = 0;
    private static final byte UNIT = 1;
    private static final byte NO_UNIT = 2;
    private static final byte HOPEFUL = 3;

    private static final int LARGEST_SMALL_PRIME = 1000;

    private final BigInteger modulus;
    private final long smallDivisors;
    private BigInteger[] value;
    private byte[] known;
    private BigInteger inverse;
    private BigInteger factor;

    BigUnitValues(IntegerMatrix matrix, BigInteger modulus) {
        this.modulus = modulus;
        this.smallDivisors = smallDivisors(modulus);
        int entries = matrix.entries();
        value = new BigInteger[entries + entries / 2 + 16];
        known = new byte[value.length];
        Arrays.fill(value, BigInteger.ZERO);
        for (int k = 0; k < entries; k++) {
            value[k] = BigInteger.valueOf(matrix.value(k)).mod(modulus);
            known[k] = Math.abs(matrix.value(k)) == 1 ? UNIT : UNKNOWN;
        }
    }

    @Override
    public BigInteger get(int place) {
        return value[place];
    }

    /** The product of the small primes that divide a number, or of as many of them as fit into a long. */
    private static long smallDivisors(BigInteger number) {
        long product = 1;
        for (int q = 2; q < LARGEST_SMALL_PRIME && product < Long.MAX_VALUE / LARGEST_SMALL_PRIME; q++) {
            if (Primes.isPrime(q) && number.mod(BigInteger.valueOf(q)).signum() == 0) {
                product *= q;
            }
        }
        return product;
    }

    @Override
    public boolean isPivot(int place) {
        if (known[place] == UNKNOWN) {
            known[place] = hasSmallDivisor(value[place]) ? NO_UNIT : HOPEFUL;
        }
        return known[place] != NO_UNIT;
    }

    private boolean hasSmallDivisor(BigInteger v) {
        if (v.signum() == 0 || smallDivisors == 1) {
            return v.signum() == 0;
        }
        long a = v.mod(BigInteger.valueOf(smallDivisors)).longValue();
        long b = smallDivisors;
        while (a != 0) {
            long r = b % a;
            b = a;
            a = r;
        }
        return b != 1;
    }

    @Override
    public boolean confirm(int place) {
        if (known[place] != UNIT) {
            known[place] = value[place].gcd(modulus).equals(BigInteger.ONE) ? UNIT : NO_UNIT;
        }
        return known[place] == UNIT;
    }

    @Override
    public void room(int places) {
        int old = value.length;
        if (places > old) {
            value = Arrays.copyOf(value, Math.max(places, old + (old >> 1)));
            known = Arrays.copyOf(known, value.length);
            Arrays.fill(value, old, value.length, BigInteger.ZERO);
        }
    }

    @Override
    public void startStep(int pivot) {
        inverse = value[pivot].modInverse(modulus).negate();
    }

    @Override
    public void startRow(int below) {
        factor = value[below].multiply(inverse).mod(modulus);
    }

    @Override
    public void add(int target, int beside) {
        BigInteger by = value[beside];
        if (by.signum() != 0 && factor.signum() != 0) {
            value[target] = value[target].add(factor.multiply(by)).mod(modulus);
            known[target] = UNKNOWN;
        }
    }
}
