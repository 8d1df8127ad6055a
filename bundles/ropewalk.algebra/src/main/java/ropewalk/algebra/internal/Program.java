package ropewalk.algebra.internal;

/**
 * A straight-line program: an elimination with fixed pivots, to be run modulo many primes. Immutable.
 *
 * <p>The pivots are sorted into groups, called levels; those of a level neither read nor change each other's rows and columns, so that one
 * inversion serves all of them. A level is: the number of its pivots, loads, then per pivot kind and slots of the pivot (one,
 * or three for a block), then per pivot loads, m, for {@link Recording#GENERAL} l, and the slots of the step. Loads are
 * their number and pairs of slot and place. Places below {@code initial.length} start with that value, others with 0.
 */
final class Program {
    final int[] code;
    final int levels;
    final int widest;
    final int slots;
    final long[] initial;
    /** Loads of what is left at the end, as above, then its slots, as many as {@link #rest}. */
    final int[] restCode;
    final int rest;

    Program(int[] code, int levels, int widest, int slots, long[] initial, int[] restCode, int rest) {
        this.code = code;
        this.levels = levels;
        this.widest = widest;
        this.slots = slots;
        this.initial = initial;
        this.restCode = restCode;
        this.rest = rest;
    }
}
