package ropewalk.algebra.internal;

import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;

/**
 * The rank over the rationals by elimination modulo primes.
 *
 * <p>r pivots modulo one prime prove that the rank is at least r. What is left after them is, at each place, a minor of order
 * r + 1 that borders the pivots' minor, divided by that one. Where it is 0 modulo primes, none of which divides a pivot, whose
 * product exceeds every minor of order r + 1, all those minors are 0, and the rank is r (J. J. Sylvester 1851; the bordered
 * minors suffice: L. Kronecker).
 */
public final class ModularRank {
    private ModularRank() {
    }

    /**
     * The rank over the rationals.
     *
     * @param matrix any matrix
     * @param checkpoint run after every pivot
     * @return its rank
     */
    public static int rank(IntegerMatrix matrix, Runnable checkpoint) {
        return of(matrix, checkpoint).rank();
    }

    /** An elimination with as many pivots as the rank, proved. */
    static Elimination of(IntegerMatrix matrix, Runnable checkpoint) {
        boolean symmetric = matrix.isSymmetric();
        long chosen = Primes.range(0, 1)[0];
        while (true) {
            Elimination elimination = Elimination.record(matrix, symmetric, chosen, checkpoint);
            int rank = elimination.rank();
            if (rank == Math.min(matrix.rows(), matrix.columns()) || elimination.isComplete()) {
                return elimination;
            }
            double bits = Math.max(0, MinorBound.ofBordered(matrix, elimination));
            long better = new PrimeBudget(elimination, PrimeBudget.forBits(bits), checkpoint).run();
            if (better < 0) {
                return elimination;
            }
            chosen = better;
        }
    }

    /** The part of a matrix with the pivot rows and columns of an elimination, in ascending order. */
    static IntegerMatrix pivotPart(IntegerMatrix matrix, Elimination elimination) {
        int[] newRow = positions(matrix.rows(), elimination.rows());
        int[] newColumn = positions(matrix.columns(), elimination.columns());
        IntegerMatrix.Builder builder = IntegerMatrix.builder(elimination.rank(), elimination.rank());
        for (int i = 0; i < matrix.rows(); i++) {
            for (int k = matrix.rowStart(i); k < matrix.rowStart(i + 1) && newRow[i] >= 0; k++) {
                if (newColumn[matrix.column(k)] >= 0) {
                    builder.add(newRow[i], newColumn[matrix.column(k)], matrix.value(k));
                }
            }
        }
        return builder.build();
    }

    private static int[] positions(int size, int[] chosen) {
        int[] position = new int[size];
        Arrays.fill(position, -1);
        for (int k : chosen) {
            position[k] = 0;
        }
        int next = 0;
        for (int k = 0; k < size; k++) {
            position[k] = position[k] < 0 ? -1 : next++;
        }
        return position;
    }
}
