package ropewalk.algebra.internal;

import java.math.BigInteger;
import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;

/** Values modulo a big number; the pivots are the residues prime to it. What was found out about a value is kept. */
final class BigUnitValues implements ResidueValues {
    private static final byte UNKNOWN = 0;
    private static final byte UNIT = 1;
    private static final byte NO_UNIT = 2;

    private final BigInteger modulus;
    private BigInteger[] value;
    private byte[] known;
    private BigInteger inverse;
    private BigInteger factor;

    BigUnitValues(IntegerMatrix matrix, BigInteger modulus) {
        this.modulus = modulus;
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

    @Override
    public boolean isPivot(int place) {
        if (known[place] == UNKNOWN) {
            BigInteger v = value[place];
            known[place] = v.signum() != 0 && v.gcd(modulus).equals(BigInteger.ONE) ? UNIT : NO_UNIT;
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
