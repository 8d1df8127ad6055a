package ropewalk.algebra;

import java.math.BigInteger;
import ropewalk.algebra.internal.ModularDeterminant;

/**
 * Determinants of integer matrices.
 *
 * <p><b>Method.</b> Up to 24 rows {@link SmallMatrix#determinant}, where it can prove its arithmetic. Else one sparse
 * elimination modulo a prime of 50 bits in an order of small fill, replayed modulo as many more primes as an upper bound for
 * the determinant demands, and the Chinese remainder theorem. The bound is the smaller of Hadamard's (1893) for rows and for
 * columns; for a symmetric matrix also the weighted number of spanning trees of its graph (Chaiken 1982), computed with
 * positive numbers only (Grassmann, Taksar and Heyman 1985).
 *
 * <p><b>Cost.</b> For planar graphs with n vertices about n<sup>1.5</sup> operations a prime, with n/30 primes or so;
 * memory of the order of the fill, never n².
 *
 * @since 1.0
 */
public final class Determinant {
    private static final int SMALL = 24;

    private Determinant() {
    }

    /**
     * The determinant, exact and proved.
     *
     * @param square a square matrix; without rows its determinant is 1
     * @param checkpoint run about every millisecond; what it throws is let through
     * @return the determinant
     * @throws IllegalArgumentException if the matrix is not square
     * @throws MatrixTooLargeException if the elimination does not fit into memory
     */
    public static BigInteger of(IntegerMatrix square, Runnable checkpoint) {
        int n = square.rows();
        if (n != square.columns()) {
            throw new IllegalArgumentException("a " + n + " x " + square.columns()
                + " matrix has no determinant; strike out rows or columns until it is square");
        }
        if (n <= SMALL) {
            long value = SmallMatrix.determinant(square.toDense(), n);
            if (value != SmallMatrix.TOO_LARGE) {
                return BigInteger.valueOf(value);
            }
        }
        return ModularDeterminant.of(square, checkpoint);
    }
}
