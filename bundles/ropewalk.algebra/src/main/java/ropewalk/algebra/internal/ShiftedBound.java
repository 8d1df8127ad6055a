package ropewalk.algebra.internal;

import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;

/**
 * Bounds the determinant of a symmetric matrix A by that of M = A + iδ, δ &gt; 0, from a factorisation in floating point.
 *
 * <p><b>Theorem.</b> The eigenvalues of A are real, so |det A| = &Pi; |λ| &lt;= &Pi; |λ + iδ| = |det M|, and M, being normal, has the
 * singular values |λ + iδ|, all at least δ. If M + E = L D Lᵀ exactly, L unit triangular and D diagonal, as computed, and the
 * norm of E is at most η &lt;= δ/2, then by Weyl's inequality for singular values (R. A. Horn and C. R. Johnson, Topics in Matrix
 * Analysis, 1991, 3.3.16) |det D| = &Pi; σ(M + E) &gt;= &Pi; (σ(M) - η) &gt;= |det M| (1 - η/δ)^n, and -log2(1 - x) &lt;= 2x up to x = 1/2.
 *
 * <p><b>Error.</b> Running error analysis (N. J. Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed. 2002, 3.3 and
 * 3.6): complex sums are right to a factor 1 + ε, |ε| &lt;= u = 2^-53, products to 3u. The inverse r of a pivot d is right to 5u,
 * so l = fl(x r) has |l d - x| &lt;= 9u |x|, and the update t' = fl(t - fl(l x_j)) adds at most u |t'| + 3u |l x_j| + |l| 9u |x_j|
 * to E(i, j); 13u |l| |x_j| covers the second-order terms. Moduli are replaced by sums of absolute values, which are larger.
 * The sums are of at most 2^40 positive numbers: 1 + 2^-10 covers their rounding.
 *
 * <p><b>Underflow and overflow.</b> η is at most δ/2 &lt;= 2^51, and u times every value is in it: values stay below 2^105. Pivots are
 * refused below 2^-150, so r is below 2^151 and l below 2^257. An underflow, 2^-1074 at most, is multiplied by two values and a
 * factor at most: 2^-400 is more than all of them together. Where a value overflows or is NaN, so does η.
 *
 * <p>No pivoting: the imaginary
 * part of every Schur complement of M is at least δ, so no pivot of the exact elimination is below δ; if the computed ones lose
 * too much by growth, η says so, and the bound is refused.
 */
final class ShiftedBound implements MinimumDegree.Sweep {
    private static final double U = 0x1p-53;
    private static final double LEAST_SQUARE = 0x1p-300;

    private final int n;
    private final double delta;
    private final double[] error;
    private double[] re;
    private double[] im;
    private double bits;
    private boolean refused;

    ShiftedBound(IntegerMatrix matrix) {
        n = matrix.rows();
        error = new double[n];
        re = new double[2 * (n + matrix.entries() / 2) + 16];
        im = new double[re.length];
        double largest = 8;
        int place = n;
        for (int i = 0; i < n; i++) {
            for (int k = matrix.rowStart(i); k < matrix.rowStart(i + 1); k++) {
                double v = matrix.value(k);
                largest = Math.max(largest, Math.abs(v));
                error[i] += U * Math.abs(v);
                if (matrix.column(k) == i) {
                    re[i] = v;
                } else if (matrix.column(k) > i) {
                    re[place++] = v;
                }
            }
        }
        // A 256th of the size of the entries: less would need more digits, more would lengthen the bound.
        delta = Math.scalb(1.0, Math.getExponent(largest) - 3 - 8);
        Arrays.fill(im, 0, n, delta);
    }

    @Override
    public void eliminate(int v, int[] others, int[] places, int m, int[] targets, int used) {
        if (used > re.length) {
            int size = Math.max(used, re.length + (re.length >> 1));
            re = Arrays.copyOf(re, size);
            im = Arrays.copyOf(im, size);
        }
        double square = re[v] * re[v] + im[v] * im[v];
        refused |= !(square >= LEAST_SQUARE);
        bits += MinorBound.log2(square) / 2;
        double inverseRe = re[v] / square;
        double inverseIm = -im[v] / square;
        for (int i = 0, t = 0; i < m; i++) {
            double x = re[places[i]];
            double y = im[places[i]];
            double factorRe = x * inverseRe - y * inverseIm;
            double factorIm = x * inverseIm + y * inverseRe;
            double weight = 13 * U * (Math.abs(factorRe) + Math.abs(factorIm));
            count(v, others[i], 9 * U * (Math.abs(x) + Math.abs(y)));
            for (int j = i; j < m; j++) {
                double besideRe = re[places[j]];
                double besideIm = im[places[j]];
                int target = targets[t++];
                double sumRe = re[target] - (factorRe * besideRe - factorIm * besideIm);
                double sumIm = im[target] - (factorRe * besideIm + factorIm * besideRe);
                re[target] = sumRe;
                im[target] = sumIm;
                count(others[i], others[j], weight * (Math.abs(besideRe) + Math.abs(besideIm))
                    + U * (Math.abs(sumRe) + Math.abs(sumIm)));
            }
        }
    }

    private void count(int i, int j, double bound) {
        error[i] += bound;
        if (j != i) {
            error[j] += bound;
        }
    }

    /** At least log2 |det|; positive infinity if no bound was found. */
    double bits() {
        double eta = 0;
        for (double rowError : error) {
            eta = Math.max(eta, rowError);
        }
        eta = eta * (1 + 0x1p-10) + FloatingInertia.UNDERFLOW;
        if (refused || !(eta <= delta / 2) || Double.isNaN(bits)) {
            return Double.POSITIVE_INFINITY;
        }
        return bits + n * 2 * (eta / delta) * (1 + 0x1p-40) + MinorBound.logarithmMargin(n);
    }
}
