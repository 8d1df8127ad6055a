package ropewalk.algebra.internal;

import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;

/** Values modulo a prime: every residue but 0 can be a pivot. */
final class PrimeValues implements PlaceValues {
    private final PrimeField field;
    private long[] value;
    private long inverse;
    private long factor;

    PrimeValues(IntegerMatrix matrix, PrimeField field) {
        this.field = field;
        int entries = matrix.entries();
        value = new long[entries + entries / 2 + 16];
        for (int k = 0; k < entries; k++) {
            value[k] = field.of(matrix.value(k));
        }
    }

    long get(int place) {
        return value[place];
    }

    @Override
    public boolean isPivot(int place) {
        return value[place] != 0;
    }

    @Override
    public void room(int places) {
        if (places > value.length) {
            value = Arrays.copyOf(value, Math.max(places, value.length + (value.length >> 1)));
        }
    }

    @Override
    public void startStep(int pivot) {
        inverse = field.inverse(value[pivot]);
    }

    @Override
    public void startRow(int below) {
        factor = field.negate(field.multiply(value[below], inverse));
    }

    @Override
    public void add(int target, int beside) {
        long sum = value[target] + field.multiply(factor, value[beside]);
        value[target] = sum >= field.p ? sum - field.p : sum;
    }
}
