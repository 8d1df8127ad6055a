package ropewalk.algebra.internal;

import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;

/**
 * Bounds the determinant of a symmetric matrix by a number of weighted trees.
 *
 * <p><b>Theorem</b> (matrix-tree theorem; S. Chaiken, SIAM J. Alg. Disc. Meth. 3 (1982) 319–329, for all minors). A symmetric
 * matrix A is the Laplacian, without the row and column of one more vertex, the ground, of the graph with an edge (i, j) of
 * weight -A(i, j) for i &ne; j and an edge from i to the ground with weight the sum of row i. det A is the sum over the spanning
 * trees of the products of their weights. So |det A| is at most the same sum for the absolute values of the weights.
 *
 * The weights may have any signs and the diagonal any values: the first sentence defines them from A, which must be symmetric.
 *
 * <p><b>Rounding.</b> That sum T is the product of the pivots when the vertices are eliminated one by one, where a pivot is the
 * sum of the weights at the vertex, never a difference (W. K. Grassmann, M. I. Taksar and D. P. Heyman, Oper. Res. 33 (1985)
 * 1107–1116). Let F be the product of the pivots so far, as computed, times the tree sum, taken exactly, of the graph that is
 * left with the weights as computed; at the start F is T, at the end the product of the computed pivots. Only positive numbers are
 * added, multiplied and divided. So a step at a vertex with m neighbours has its pivot right to m factors 1 + ε, |ε| &lt;= u = 2^-53,
 * and each new weight to m + 3 more; the tree sum of n' vertices is homogeneous of degree n' in the weights with positive
 * coefficients, so F changes by at most m + (m + 3) n' factors, n' &lt; n: fewer than n·3m(m + 2), and none for m = 0. The weights at
 * the start are right to one factor each, which makes n. N = n (n + entries + Σ 3m(m + 2)) factors in all take at most N u / ln 2 (1 + 2^-50) from
 * the logarithm, and N 2^-52 is added. (Where N exceeds 2^56 the bound is refused.) A weight that would fall below 2^-900 is
 * raised to that, which can only enlarge F and keeps clear of underflow; above 2^900 the bound is refused. For the
 * logarithms see {@link MinorBound#logarithmMargin}.
 */
final class TreeBound implements MinimumDegree.Sweep {
    private static final double LEAST = 0x1p-900;
    private static final double LARGEST = 0x1p900;

    private final int n;
    private final double[] ground;
    private double[] weight;
    private double operations;
    private double bits;
    private double extreme;
    private boolean refused;

    TreeBound(IntegerMatrix matrix) {
        n = matrix.rows();
        ground = new double[n];
        weight = new double[2 * (n + matrix.entries() / 2) + 16];
        operations = n + matrix.entries();
        int place = n;
        for (int i = 0; i < n; i++) {
            long sum = 0;
            for (int k = matrix.rowStart(i); k < matrix.rowStart(i + 1); k++) {
                long v = matrix.value(k);
                long before = sum;
                sum += v;
                refused |= ((before ^ sum) & (v ^ sum)) < 0;
                if (matrix.column(k) > i) {
                    weight[place++] = Math.abs((double) v);
                }
            }
            ground[i] = Math.abs((double) sum);
        }
    }

    @Override
    public void eliminate(int v, int[] others, int[] places, int m, int[] targets, int used) {
        if (used > weight.length) {
            weight = Arrays.copyOf(weight, Math.max(used, weight.length + (weight.length >> 1)));
        }
        double pivot = ground[v];
        for (int i = 0; i < m; i++) {
            pivot += weight[places[i]];
        }
        // A pivot 0 is an isolated vertex: no tree, and the logarithm is negative infinity. Its weights are all 0.
        extreme = Math.max(extreme, pivot);
        bits += MinorBound.log2(pivot);
        for (int i = 0, t = 0; i < m && pivot > 0; i++) {
            double factor = Math.max(weight[places[i]] / pivot, LEAST);
            int w = others[i];
            ground[w] += ground[v] == 0 ? 0 : Math.max(factor * ground[v], LEAST);
            t++;
            for (int j = i + 1; j < m; j++) {
                weight[targets[t++]] += Math.max(factor * weight[places[j]], LEAST);
            }
        }
        operations += 3.0 * m * (m + 2);
    }

    /** At least log2 |det|; negative infinity if there is no tree; positive infinity if no bound was found. */
    double bits() {
        double steps = n * operations;
        if (refused || steps > 0x1p56 || extreme > LARGEST || Double.isNaN(bits)) {
            return Double.POSITIVE_INFINITY;
        }
        return bits + steps * 0x1p-52 + MinorBound.logarithmMargin(n);
    }
}
