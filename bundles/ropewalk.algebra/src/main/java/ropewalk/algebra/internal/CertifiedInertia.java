package ropewalk.algebra.internal;

import ropewalk.algebra.IntegerMatrix;

/**
 * The exact inertia of a symmetric matrix from two floating-point factorisations and the exact rank.
 *
 * <p>If A - τI factors with π positive squares and an error whose norm is at most τ, then at least π eigenvalues of A are
 * positive; likewise from A + τI for the negative ones. Where these two lower bounds add up to the rank, which is exact, both
 * are exact, since the rank is the number of eigenvalues that are not 0. See {@link FloatingInertia} for the error. If the
 * certificate fails for every τ tried, elimination with big integers decides.
 */
public final class CertifiedInertia {
    private static final double FIRST_SHIFT = 0x1p-26;
    private static final int TRIALS = 4;

    private CertifiedInertia() {
    }

    /**
     * The inertia.
     *
     * @param matrix a symmetric matrix
     * @param checkpoint run after every pivot
     * @return the numbers of positive, negative and zero eigenvalues
     * @throws ropewalk.algebra.MatrixTooLargeException if the certificate fails and the matrix is too large for big integers
     */
    public static int[] of(IntegerMatrix matrix, Runnable checkpoint) {
        int rank = ModularRank.rank(matrix, checkpoint);
        int[] certified = certify(matrix, rank, checkpoint);
        return certified != null ? certified : DenseBareiss.inertia(matrix, checkpoint);
    }

    /** The inertia, or null if no shift tried certifies it. */
    static int[] certify(IntegerMatrix matrix, int rank, Runnable checkpoint) {
        double shift = FIRST_SHIFT;
        for (int trial = 0; trial < TRIALS; trial++) {
            FloatingInertia above = new FloatingInertia(matrix, -shift, checkpoint);
            above.run();
            FloatingInertia below = new FloatingInertia(matrix, shift, checkpoint);
            below.run();
            double residue = Math.max(above.residue(), below.residue());
            if (residue <= shift && above.positive() + below.negative() == rank) {
                return new int[] {above.positive(), below.negative(), matrix.rows() - rank};
            }
            double better = Math.scalb(1.0, Math.getExponent(residue) + 3);
            if (!(better < 0x1p59) || better == shift) {
                return null;
            }
            shift = better;
        }
        return null;
    }
}
