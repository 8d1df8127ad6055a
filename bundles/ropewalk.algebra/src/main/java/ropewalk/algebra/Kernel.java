package ropewalk.algebra;

import ropewalk.algebra.internal.PrimeKernel;

/**
 * Right kernels of integer matrices modulo primes: for a colouring matrix, the colourings (R. H. Fox, 1962).
 *
 * <p><b>Cost.</b> One sparse elimination and one back substitution a basis vector.
 *
 * @since 1.0
 */
public final class Kernel {
    private Kernel() {
    }

    /**
     * A basis of the vectors x with A x = 0 modulo a prime.
     *
     * @param matrix the matrix A
     * @param prime a prime from 2 to 2<sup>31</sup> - 1
     * @param checkpoint run about every millisecond; what it throws is let through
     * @return columns - rank vectors of residues from 0 to p - 1, each as long as a row; new arrays. Each has a 1 at one
     *     column at which all the others have 0
     * @throws IllegalArgumentException if the number is not a prime
     * @throws MatrixTooLargeException if the basis does not fit into memory
     */
    public static int[][] modulo(IntegerMatrix matrix, int prime, Runnable checkpoint) {
        return new PrimeKernel(matrix, prime, checkpoint).basis();
    }
}
