package ropewalk.algebra.internal;

import java.math.BigInteger;
import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;

/** Values modulo any number from 2 to 2^50 - 1; the pivots are the residues prime to it. */
final class UnitValues implements ResidueValues {
    private final PrimeField ring;
    private long[] value;
    private long inverse;
    private long factor;

    UnitValues(IntegerMatrix matrix, long modulus) {
        ring = new PrimeField(modulus);
        int entries = matrix.entries();
        value = new long[entries + entries / 2 + 16];
        for (int k = 0; k < entries; k++) {
            value[k] = ring.of(matrix.value(k));
        }
    }

    @Override
    public BigInteger get(int place) {
        return BigInteger.valueOf(value[place]);
    }

    @Override
    public boolean isPivot(int place) {
        long a = value[place];
        long b = ring.p;
        while (a != 0) {
            long r = b % a;
            b = a;
            a = r;
        }
        return b == 1;
    }

    @Override
    public void room(int places) {
        if (places > value.length) {
            value = Arrays.copyOf(value, Math.max(places, value.length + (value.length >> 1)));
        }
    }

    @Override
    public void startStep(int pivot) {
        inverse = ring.inverse(value[pivot]);
    }

    @Override
    public void startRow(int below) {
        factor = ring.negate(ring.multiply(value[below], inverse));
    }

    @Override
    public void add(int target, int beside) {
        long sum = value[target] + ring.multiply(factor, value[beside]);
        value[target] = sum >= ring.p ? sum - ring.p : sum;
    }
}
