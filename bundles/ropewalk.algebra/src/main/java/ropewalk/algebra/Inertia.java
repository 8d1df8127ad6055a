package ropewalk.algebra;

import ropewalk.algebra.internal.CertifiedInertia;

/**
 * The inertia of a symmetric matrix: how many eigenvalues are positive, negative and zero, with multiplicity. An invariant of
 * congruence over the real numbers (J. J. Sylvester, 1852).
 *
 * <p><b>Method.</b> Up to 24 rows {@link SmallMatrix#symmetric}, where it can prove its arithmetic. Else two sparse
 * factorisations in floating point with a proved bound for all their rounding, of the matrix shifted a little to either side,
 * whose counts must add up to the exact rank (N. J. Higham 2002, chapter 11; H. Weyl 1912); where they do not, elimination with
 * big integers for up to 1000 rows.
 *
 * @param positive the number of positive eigenvalues
 * @param negative the number of negative eigenvalues
 * @param zero the nullity
 * @since 1.0
 */
public record Inertia(int positive, int negative, int zero) {
    private static final int SMALL = 24;

    /**
     * The inertia of a matrix, exact and proved.
     *
     * @param symmetric a symmetric matrix
     * @param checkpoint run about every millisecond; what it throws is let through
     * @return its inertia
     * @throws IllegalArgumentException if the matrix is not symmetric
     * @throws MatrixTooLargeException if the value cannot be certified within memory
     */
    public static Inertia of(IntegerMatrix symmetric, Runnable checkpoint) {
        if (!symmetric.isSymmetric()) {
            throw new IllegalArgumentException("a " + symmetric.rows() + " x " + symmetric.columns()
                + " matrix that is not symmetric has no inertia; symmetrise the form first");
        }
        int n = symmetric.rows();
        if (n <= SMALL) {
            long[] result = new long[4];
            if (SmallMatrix.symmetric(symmetric.toDense(), n, result)) {
                return new Inertia((int) result[2], (int) result[3], (int) result[1]);
            }
        }
        int[] counts = CertifiedInertia.of(symmetric, checkpoint);
        return new Inertia(counts[0], counts[1], counts[2]);
    }

    /**
     * The signature, positive minus negative.
     *
     * @return the signature of the form
     */
    public int signature() {
        return positive - negative;
    }
}
