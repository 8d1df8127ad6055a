package ropewalk.algebra.internal;

import java.util.function.Supplier;
import ropewalk.algebra.IntegerMatrix;

/** A recorded elimination: pivot rows and columns, their rank, and the program, made when it is first asked for. */
final class Elimination {
    private final int[] rows;
    private final int[] columns;
    private final int[] rest;
    private final Supplier<Program> compiler;
    private Program program;

    private Elimination(int[] rows, int[] columns, int[] rest, Supplier<Program> compiler) {
        this.rows = rows;
        this.columns = columns;
        this.rest = rest;
        this.compiler = compiler;
    }

    static Elimination record(IntegerMatrix matrix, boolean symmetric, long prime, Runnable checkpoint) {
        Recording recording = new Recording(matrix.entries());
        PrimeField field = new PrimeField(prime);
        if (symmetric) {
            SymmetricElimination run = new SymmetricElimination(matrix, field, recording, checkpoint);
            run.run();
            int[] used = run.used();
            int[] rest = run.rest();
            return new Elimination(used, used, rest,
                () -> Compiler.compile(recording, run.places(), run.initial(), rest, checkpoint));
        }
        GeneralElimination run = new GeneralElimination(matrix, new PrimeValues(matrix, field), recording, checkpoint);
        run.run();
        int[] rows = new int[run.pivots()];
        int[] columns = new int[run.pivots()];
        for (int k = 0; k < rows.length; k++) {
            rows[k] = run.pivotRow(k);
            columns[k] = run.pivotColumn(k);
        }
        int[] rest = run.rest();
        return new Elimination(rows, columns, rest,
            () -> Compiler.compile(recording, run.places(), values(matrix), rest, checkpoint));
    }

    private static long[] values(IntegerMatrix matrix) {
        long[] values = new long[matrix.entries()];
        for (int k = 0; k < values.length; k++) {
            values[k] = matrix.value(k);
        }
        return values;
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

    /** Whether nothing at all is left after the pivots, whatever the prime: then the rank is proved. */
    boolean isComplete() {
        return rest.length == 0;
    }

    /** The program; not thread-safe. */
    Program program() {
        if (program == null) {
            program = compiler.get();
        }
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
