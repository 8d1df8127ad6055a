package ropewalk.algebra.internal;

import java.math.BigInteger;
import ropewalk.algebra.IntegerMatrix;
import ropewalk.algebra.MatrixTooLargeException;

/**
 * Fraction-free elimination of dense matrices of big integers (E. H. Bareiss, Math. Comp. 22 (1968) 565–578): the slow, plain
 * route, for what the sparse ones cannot certify. O(n³) products of numbers of up to the length of the determinant.
 */
public final class DenseBareiss {
    /** The largest dimension that is accepted: about 10^6 numbers. */
    public static final int LARGEST = 1000;

    private final int n;
    private final BigInteger[][] a;
    private final Runnable checkpoint;

    private DenseBareiss(IntegerMatrix matrix, Runnable checkpoint) {
        this.n = matrix.rows();
        this.checkpoint = checkpoint;
        this.a = new BigInteger[n][n];
        for (int i = 0; i < n; i++) {
            java.util.Arrays.fill(a[i], BigInteger.ZERO);
            for (int k = matrix.rowStart(i); k < matrix.rowStart(i + 1); k++) {
                a[i][matrix.column(k)] = BigInteger.valueOf(matrix.value(k));
            }
        }
    }

    /**
     * The inertia of a symmetric matrix.
     *
     * @param matrix a symmetric matrix
     * @param checkpoint run after every row operation
     * @return the numbers of positive, negative and zero eigenvalues
     * @throws MatrixTooLargeException above {@link #LARGEST} rows
     */
    public static int[] inertia(IntegerMatrix matrix, Runnable checkpoint) {
        if (matrix.rows() > LARGEST) {
            throw new MatrixTooLargeException("the inertia of a symmetric matrix with " + matrix.rows() + " rows was not certified"
                + " in floating point, and exact elimination is limited to " + LARGEST
                + " rows; split the matrix into blocks or scale down its entries");
        }
        return new DenseBareiss(matrix, checkpoint).inertia();
    }

    private int[] inertia() {
        BigInteger previous = BigInteger.ONE;
        int positive = 0;
        int k = 0;
        while (k < n) {
            int s = k;
            while (s < n && a[s][s].signum() == 0) {
                s++;
            }
            if (s == n && !fillDiagonal(k)) {
                break;
            }
            if (s < n) {
                exchange(k, s);
            }
            BigInteger pivot = a[k][k];
            for (int i = k + 1; i < n; i++) {
                eliminate(i, k, previous);
            }
            positive += pivot.signum() == previous.signum() ? 1 : 0;
            previous = pivot;
            k++;
        }
        return new int[] {positive, k - positive, n - k};
    }

    /**
     * With an empty diagonal: adds row and column j to row and column k for an entry (i, j) that is not 0, after bringing i to k;
     * a congruence, after which (k, k) is twice that entry.
     */
    private boolean fillDiagonal(int k) {
        for (int i = k; i < n; i++) {
            for (int j = i + 1; j < n; j++) {
                if (a[i][j].signum() != 0) {
                    exchange(k, i);
                    for (int c = k; c < n; c++) {
                        a[k][c] = a[k][c].add(a[j][c]);
                    }
                    for (int r = k; r < n; r++) {
                        a[r][k] = a[r][k].add(a[r][j]);
                    }
                    return true;
                }
            }
        }
        return false;
    }

    private void exchange(int k, int s) {
        if (k != s) {
            BigInteger[] row = a[k];
            a[k] = a[s];
            a[s] = row;
            for (BigInteger[] r : a) {
                BigInteger v = r[k];
                r[k] = r[s];
                r[s] = v;
            }
        }
    }

    private void eliminate(int i, int k, BigInteger previous) {
        checkpoint.run();
        BigInteger pivot = a[k][k];
        BigInteger factor = a[i][k];
        for (int j = k + 1; j < n; j++) {
            BigInteger v = a[i][j].signum() == 0 ? BigInteger.ZERO : a[i][j].multiply(pivot);
            if (factor.signum() != 0 && a[k][j].signum() != 0) {
                v = v.subtract(factor.multiply(a[k][j]));
            }
            a[i][j] = v.signum() == 0 ? v : v.divide(previous);
        }
    }
}
