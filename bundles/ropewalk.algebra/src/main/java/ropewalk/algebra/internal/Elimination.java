package ropewalk.algebra.internal;

import ropewalk.algebra.IntegerMatrix;

/** A recorded elimination: pivot rows and columns, their rank, and the program. */
final class Elimination {
    private final int[] rows;
    private final int[] columns;
    private final Program program;

    private Elimination(int[] rows, int[] columns, Program program) {
        this.rows = rows;
        this.columns = columns;
        this.program = program;
    }

    static Elimination record(IntegerMatrix matrix, boolean symmetric, long prime, Runnable checkpoint) {
        Recording recording = new Recording(matrix.entries());
        PrimeField field = new PrimeField(prime);
        if (symmetric) {
            SymmetricElimination run = new SymmetricElimination(matrix, field, recording, checkpoint);
            run.run();
            int[] used = run.used();
            return new Elimination(used, used, Compiler.compile(recording, run.places(), run.initial(), run.rest()));
        }
        GeneralElimination run = new GeneralElimination(matrix, new PrimeValues(matrix, field), recording, checkpoint);
        run.run();
        int[] rows = new int[run.pivots()];
        int[] columns = new int[run.pivots()];
        for (int k = 0; k < rows.length; k++) {
            rows[k] = run.pivotRow(k);
            columns[k] = run.pivotColumn(k);
        }
        long[] initial = new long[matrix.entries()];
        for (int k = 0; k < initial.length; k++) {
            initial[k] = matrix.value(k);
        }
        return new Elimination(rows, columns, Compiler.compile(recording, run.places(), initial, run.rest()));
    }

    /** The number of pivots. */
    int rank() {
        return rows.length;
    }

    int[] rows() {
        return rows;
    }

    int[] columns() {
        return columns;
    }

    Program program() {
        return program;
    }

    /** Whether the pivots of a square, non-singular elimination lie on an odd permutation. */
    boolean oddPermutation() {
        int[] image = new int[rows.length];
        for (int k = 0; k < rows.length; k++) {
            image[rows[k]] = columns[k];
        }
        boolean odd = false;
        for (int start = 0; start < image.length; start++) {
            // Every exchange puts one element in its place.
            while (image[start] != start) {
                int there = image[start];
                image[start] = image[there];
                image[there] = there;
                odd = !odd;
            }
        }
        return odd;
    }
}
