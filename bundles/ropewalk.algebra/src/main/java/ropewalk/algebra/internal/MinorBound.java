package ropewalk.algebra.internal;

import ropewalk.algebra.IntegerMatrix;

/**
 * Upper bounds, as binary logarithms, for determinants and minors.
 *
 * <p>Hadamard (1893): |det A| is at most the product of the lengths of the rows, or of the columns. Lengths are summed in
 * floating point from positive numbers, so each square is off by at most a factor (1 + 2^-53)^(n + 3), and each logarithm, below
 * 2^8, by less than 2^-40; for up to 2^31 entries a line this is below 2^-21 a line. No logarithm is negative, so the
 * partial sums ascend, also as computed; where they reach 2^32 {@link PrimeBudget#forBits} refuses the number, else an addition
 * is off by at most 2^-53 2^32 = 2^-21. Together 2^-20 a line, which is added. (A line without entries has the logarithm
 * negative infinity: the determinant is 0.)
 */
final class MinorBound {
    private static final double LINE_MARGIN = 0x1p-20;

    private MinorBound() {
    }

    /**
     * A bound for the determinant of a square matrix.
     *
     * @return a number at least log2 |det|; negative infinity if the determinant is proved to be 0
     */
    static double ofDeterminant(IntegerMatrix matrix, boolean symmetric, Runnable checkpoint) {
        double[] rows = rowLengths(matrix);
        if (symmetric) {
            TreeBound trees = new TreeBound(matrix);
            ShiftedBound shifted = new ShiftedBound(matrix);
            MinimumDegree.run(matrix, checkpoint, trees, shifted);
            return Math.min(sum(rows), Math.min(trees.bits(), shifted.bits()));
        }
        return Math.min(sum(rows), sum(rowLengths(matrix.transposed())));
    }

    /** A bound for all minors made of the pivots' minor and one more row and column: log2. */
    static double ofBordered(IntegerMatrix matrix, Elimination elimination) {
        return Math.min(bordered(rowLengths(matrix), elimination.rows()),
            bordered(rowLengths(matrix.transposed()), elimination.columns()));
    }

    private static double bordered(double[] lengths, int[] pivots) {
        double inside = 0;
        for (int k : pivots) {
            inside += lengths[k] + LINE_MARGIN;
            lengths[k] = Double.NEGATIVE_INFINITY;
        }
        double longest = 0;
        for (double length : lengths) {
            longest = Math.max(longest, length + LINE_MARGIN);
        }
        return inside + longest;
    }

    private static double sum(double[] lengths) {
        double sum = 0;
        for (double length : lengths) {
            sum += length + LINE_MARGIN;
        }
        return sum;
    }

    /** log2 of the Euclidean lengths of the rows. */
    private static double[] rowLengths(IntegerMatrix matrix) {
        double[] lengths = new double[matrix.rows()];
        for (int i = 0; i < lengths.length; i++) {
            double squares = 0;
            for (int k = matrix.rowStart(i); k < matrix.rowStart(i + 1); k++) {
                double v = matrix.value(k);
                squares += v * v;
            }
            lengths[i] = log2(squares) / 2;
        }
        return lengths;
    }

    /**
     * What rounding can take from a sum of n logarithms between -2^10 and 2^10: each is off by less than 2^-40, and each partial
     * sum by less than 2^-53 n 2^10.
     */
    static double logarithmMargin(int n) {
        return n * 0x1p-40 + (double) n * n * 0x1p-42;
    }

    static double log2(double v) {
        return Math.log(v) * (1 / Math.log(2));
    }
}
