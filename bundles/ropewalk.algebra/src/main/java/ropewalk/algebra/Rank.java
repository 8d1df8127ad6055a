package ropewalk.algebra;

import ropewalk.algebra.internal.ModularRank;
import ropewalk.algebra.internal.PrimeKernel;

/**
 * Ranks of integer matrices.
 *
 * <p><b>Cost.</b> One sparse elimination modulo a prime where the rank is full or nothing is left after the pivots; else as
 * many as a bound for the minors demands, see {@link Determinant}. Memory of the order of the fill.
 *
 * @since 1.0
 */
public final class Rank {
    private static final int SMALL = 1024;

    private Rank() {
    }

    /**
     * The rank over the rational numbers, proved.
     *
     * @param matrix any matrix
     * @param checkpoint run about every millisecond; what it throws is let through
     * @return the rank
     * @throws MatrixTooLargeException if the elimination does not fit into memory
     */
    public static int of(IntegerMatrix matrix, Runnable checkpoint) {
        if ((long) matrix.rows() * matrix.columns() <= SMALL) {
            int rank = SmallMatrix.rank(matrix.toDense(), matrix.rows(), matrix.columns());
            if (rank >= 0) {
                return rank;
            }
        }
        return ModularRank.rank(matrix, checkpoint);
    }

    /**
     * The rank modulo a prime.
     *
     * @param matrix any matrix
     * @param prime a prime from 2 to 2<sup>31</sup> - 1
     * @param checkpoint run about every millisecond; what it throws is let through
     * @return the rank over the field with that many elements
     * @throws IllegalArgumentException if the number is not a prime
     */
    public static int modulo(IntegerMatrix matrix, int prime, Runnable checkpoint) {
        PrimeKernel kernel = new PrimeKernel(matrix, prime, checkpoint);
        if ((long) matrix.rows() * matrix.columns() <= SMALL) {
            return SmallMatrix.rankModulo(matrix.toDense(), matrix.rows(), matrix.columns(), prime);
        }
        return kernel.rank();
    }
}
