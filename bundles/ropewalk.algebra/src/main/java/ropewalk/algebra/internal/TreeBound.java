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
 * <p><b>Rounding.</b> That sum is the product of the pivots when the vertices are eliminated one by one, where a pivot is the
 * sum of the weights at the vertex, never a difference (W. K. Grassmann, M. I. Taksar and D. P. Heyman, Oper. Res. 33 (1985)
 * 1107–1116). Only positive numbers are added, multiplied and divided, so after N operations in all every number is right
 * to a factor (1 - u)^-N, u = 2^-53, and the product of n pivots to (1 - u)^-nN; n N 2^-52 is added to the logarithm, which
 * is twice n N u / ln 2 and more. (Where n N exceeds 2^56 the bound is refused.) A weight that would fall below 2^-900 is
 * raised to that, which can only enlarge the sum and keeps clear of underflow; above 2^900 the bound is refused. The n
 * logarithms lie between -2^10 and 2^10: each is off by less than 2^-40, and their partial sums by less than 2^-12 in all
 * for n up to 2^17, 2^-52 · n² · 2^10 in general; this is added as well.
 */
final class TreeBound {
    private static final double LEAST = 0x1p-900;
    private static final double LARGEST = 0x1p900;

    private final FillGraph graph;
    private final double[] ground;
    private final Queue queue;
    private double[] weight;
    private int[] others = new int[16];
    private int[] places = new int[16];
    private int[] targets = new int[256];
    private double operations;
    private double bits;
    private double extreme;

    private TreeBound(IntegerMatrix matrix, double[] ground) {
        this.ground = ground;
        long[] initial = new long[matrix.rows() + matrix.entries() / 2 + 1];
        graph = new FillGraph(matrix, initial);
        queue = new Queue(graph.n);
        operations = graph.places();
        weight = new double[2 * graph.places() + 16];
        for (int k = graph.n; k < graph.places(); k++) {
            weight[k] = Math.abs((double) initial[k]);
        }
    }

    /**
     * The bound.
     *
     * @param matrix a symmetric matrix
     * @return at least log2 |det|; negative infinity if there is no tree; positive infinity if no bound was found
     */
    static double of(IntegerMatrix matrix, Runnable checkpoint) {
        int n = matrix.rows();
        double[] ground = new double[n];
        for (int i = 0; i < n; i++) {
            long sum = 0;
            for (int k = matrix.rowStart(i); k < matrix.rowStart(i + 1); k++) {
                long before = sum;
                sum += matrix.value(k);
                if (((before ^ sum) & (matrix.value(k) ^ sum)) < 0) {
                    return Double.POSITIVE_INFINITY;
                }
            }
            ground[i] = Math.abs((double) sum);
        }
        return new TreeBound(matrix, ground).run(checkpoint);
    }

    private double run(Runnable checkpoint) {
        int n = graph.n;
        for (int v = 0; v < n; v++) {
            queue.put(v, graph.degree(v));
        }
        for (int k = 0; k < n; k++) {
            checkpoint.run();
            int v = queue.first(queue.leastKey());
            if (!eliminate(v)) {
                return Double.NEGATIVE_INFINITY;
            }
        }
        double steps = n * operations;
        if (steps > 0x1p56 || extreme > LARGEST || Double.isNaN(bits)) {
            return Double.POSITIVE_INFINITY;
        }
        return bits + steps * 0x1p-52 + n * 0x1p-40 + (double) n * n * 0x1p-42;
    }

    /** False if nothing joins the vertex to the rest: then there is no spanning tree. */
    private boolean eliminate(int v) {
        int m = graph.degree(v);
        if (m > others.length) {
            others = new int[2 * m];
            places = new int[2 * m];
        }
        if (m * (m + 1L) / 2 > targets.length) {
            targets = new int[Math.toIntExact(m * (m + 1L))];
        }
        System.arraycopy(graph.near(v), 0, others, 0, m);
        System.arraycopy(graph.nearPlace(v), 0, places, 0, m);
        queue.remove(v);
        graph.remove(v);
        graph.join(others, m, targets);
        if (graph.places() > weight.length) {
            weight = Arrays.copyOf(weight, Math.max(graph.places(), weight.length + (weight.length >> 1)));
        }
        double pivot = ground[v];
        for (int i = 0; i < m; i++) {
            pivot += weight[places[i]];
        }
        if (pivot == 0) {
            return false;
        }
        extreme = Math.max(extreme, pivot);
        bits += MinorBound.log2(pivot);
        for (int i = 0, t = 0; i < m; i++) {
            double factor = Math.max(weight[places[i]] / pivot, LEAST);
            ground[others[i]] += ground[v] == 0 ? 0 : Math.max(factor * ground[v], LEAST);
            t++;
            for (int j = i + 1; j < m; j++) {
                weight[targets[t++]] += Math.max(factor * weight[places[j]], LEAST);
            }
            queue.put(others[i], graph.degree(others[i]));
        }
        operations += 3.0 * m * (m + 2);
        return true;
    }
}
