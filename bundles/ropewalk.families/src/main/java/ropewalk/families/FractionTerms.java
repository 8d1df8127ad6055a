package ropewalk.families;

import java.util.Arrays;

/** Regular continued fractions. */
final class FractionTerms {

    private FractionTerms() {
    }

    /** The terms of sign·a/b, all of that sign; a ≥ 0, b ≥ 1. */
    static int[] of(long a, long b, int sign) {
        int[] terms = new int[96];
        int n = 0;
        long x = a;
        long y = b;
        while (y != 0) {
            terms[n++] = sign * Math.toIntExact(x / y);
            long rest = x % y;
            x = y;
            y = rest;
        }
        return Arrays.copyOf(terms, n);
    }
}
