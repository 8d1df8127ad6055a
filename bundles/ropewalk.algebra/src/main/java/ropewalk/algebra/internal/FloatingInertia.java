package ropewalk.algebra.internal;

import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;

/**
 * Sparse factorisation A + shift·I + E = L D Lᵀ in floating point, D of blocks of order 1 and 2, with a bound for E.
 *
 * <p><b>Proof of the bound</b> (running error analysis in the standard model, fl(x op y) = (x op y)(1 + δ), |δ| &lt;= u = 2^-53;
 * N. J. Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed. 2002, 2.2, 3.3 and chapter 11). L and D consist of the
 * numbers that were computed, and E is whatever makes the equation exact.
 * <ul>
 * <li>Pivot d, column x beside it, l = fl(x / d): E(i, d) = l_i d - x_i, at most u |x_i|. The update
 * t' = fl(t - fl(l_i x_j)) leaves E(i, j) = t' + l_i d l_j - t = (rounding of t' and of the product) + l_i (d l_j - x_j), at most
 * u |t'| + 2 u |l_i x_j| up to a factor 1 + 4u.
 * <li>Block P, two columns x, y beside it, w_i computed somehow: E(i, P) = P w_i - (x_i, y_i), bounded by e_i, the computed
 * residual plus 4u times the sum of the absolute values of its terms. The update with the computed inner product w_i·(x_j, y_j)
 * leaves at most u |t'| + 3u (|w_i0 x_j| + |w_i1 y_j|) + |w_i|·e_j.
 * <li>Entries are converted and shifted with an error of at most u times the result each.
 * </ul>
 * These bounds are added up for every row; the largest row sum bounds the spectral norm of the symmetric matrix E. The sums
 * themselves are of at most 2^40 positive numbers: 1 + 2^-10 covers their rounding and the factors 1 + 4u.
 *
 * <p><b>Underflow.</b> A bound of 2^60 or more certifies nothing here, and no more does a pivot d below 2^-200 or a block with
 * |b| below 2^-150. So all values stay below 2^114, as u times each of them is in the bound, the factors l below 2^315 and
 * the factors w below 2^550. An underflow is off by 2^-1074 at most. In l it is multiplied by d and a factor, in w it is part of
 * the residual, in a residual it is multiplied by a factor w, in products and sums it stays: below 2^-520 each time, and 2^-400
 * is added for fewer than 2^100 of them. Overflow makes the bound infinite or NaN, which certifies nothing either.
 *
 * <p>The blocks taken have |a d| &lt;= b²/2, so one eigenvalue is positive and one negative. By Sylvester's law A + shift·I + E
 * has the inertia of D, and by H. Weyl (1912) no eigenvalue of A + shift·I differs by more than the norm of E from its own.
 */
final class FloatingInertia {
    private static final double U = 0x1p-53;
    private static final double FIRST_THRESHOLD = 0.1;
    private static final double LARGEST = 0x1p60;
    private static final double LEAST_PIVOT = 0x1p-200;
    private static final double LEAST_SQUARE = 0x1p-300;
    /** For all underflows together; see above. */
    static final double UNDERFLOW = 0x1p-400;
    /** A vertex that waited until its threshold fell below has no pivot worth having. */
    private static final double LEAST_THRESHOLD = 0x1p-60;

    private final FillGraph graph;
    private final Queue queue;
    private final Runnable checkpoint;
    private final double[] error;
    private final double[] threshold;
    private double[] value;
    private int positive;
    private int negative;
    private double residue;
    private boolean hopeless;

    private int[] others = new int[16];
    private int[] first = new int[16];
    private int[] second = new int[16];
    private int[] targets = new int[256];
    private double[] e0 = new double[16];
    private double[] e1 = new double[16];
    private double[] w0 = new double[16];
    private double[] w1 = new double[16];

    FloatingInertia(IntegerMatrix matrix, double shift, Runnable checkpoint) {
        this.checkpoint = checkpoint;
        long[] initial = new long[matrix.rows() + matrix.entries() / 2 + 1];
        graph = new FillGraph(matrix, initial);
        queue = new Queue(graph.n);
        error = new double[graph.n];
        threshold = new double[graph.n];
        Arrays.fill(threshold, FIRST_THRESHOLD);
        value = new double[2 * graph.places() + 16];
        for (int k = 0; k < graph.places(); k++) {
            value[k] = initial[k];
        }
        for (int v = 0; v < graph.n; v++) {
            error[v] = U * Math.abs(value[v]);
            value[v] += shift;
            error[v] += U * Math.abs(value[v]);
            for (int k = 0; k < graph.degree(v); k++) {
                error[v] += U * Math.abs(value[graph.nearPlace(v)[k]]);
            }
        }
    }

    void run() {
        for (int v = 0; v < graph.n; v++) {
            queue.put(v, graph.degree(v));
        }
        for (int key = queue.leastKey(), v = queue.first(key); v >= 0; key = queue.leastKey(), v = queue.first(key)) {
            checkpoint.run();
            if (hopeless) {
                residue = Double.POSITIVE_INFINITY;
                return;
            }
            queue.remove(v);
            step(v, key);
        }
        for (double rowError : error) {
            // Math.max keeps NaN, which then compares as not below any limit.
            residue = Math.max(residue, rowError);
        }
        residue = residue < LARGEST ? residue * (1 + 0x1p-10) + UNDERFLOW : Double.POSITIVE_INFINITY;
    }

    int positive() {
        return positive;
    }

    int negative() {
        return negative;
    }

    /** At least the spectral norm of E; infinite if nothing is known. */
    double residue() {
        return residue;
    }

    private void step(int v, int key) {
        double d = value[v];
        double largest = largestBeside(v, -1);
        if (Math.abs(d) >= threshold[v] * largest) {
            if (d != 0) {
                eliminate(v);
                return;
            }
            if (largest == 0) {
                // A zero row: no pivot, no update, nothing to count.
                return;
            }
        }
        if (!tryBlock(v)) {
            // Waits for its neighbours, and is less choosy the next time, so that its turn comes.
            threshold[v] /= 2;
            if (!(threshold[v] >= LEAST_THRESHOLD)) {
                hopeless = true;
            }
            queue.put(v, Math.min(key + key / 2 + 1, 2 * graph.n));
        }
    }

    private double largestBeside(int v, int except) {
        double largest = 0;
        for (int k = 0; k < graph.degree(v); k++) {
            if (graph.near(v)[k] != except) {
                largest = Math.max(largest, Math.abs(value[graph.nearPlace(v)[k]]));
            }
        }
        return largest;
    }

    private boolean tryBlock(int v) {
        int partner = -1;
        int partnerPlace = -1;
        for (int k = 0; k < graph.degree(v); k++) {
            int w = graph.near(v)[k];
            int place = graph.nearPlace(v)[k];
            if ((partner < 0 || graph.degree(w) < graph.degree(partner)) && isStable(v, w, value[place])) {
                partner = w;
                partnerPlace = place;
            }
        }
        if (partner < 0) {
            return false;
        }
        eliminate(v, partner, partnerPlace);
        return true;
    }

    /** Whether the factors stay below the inverse of the threshold. */
    private boolean isStable(int v, int w, double b) {
        double a = value[v];
        double d = value[w];
        double square = b * b;
        if (!(square >= LEAST_SQUARE) || Math.abs(a * d) > square / 4) {
            return false;
        }
        double besideV = largestBeside(v, w);
        double besideW = largestBeside(w, v);
        double limit = square / (2 * threshold[v]);
        return Math.abs(d) * besideV + Math.abs(b) * besideW <= limit && Math.abs(b) * besideV + Math.abs(a) * besideW <= limit;
    }

    private void eliminate(int v) {
        int m = graph.degree(v);
        room(m);
        System.arraycopy(graph.near(v), 0, others, 0, m);
        System.arraycopy(graph.nearPlace(v), 0, first, 0, m);
        graph.remove(v);
        joinOthers(m);
        double d = value[v];
        if (!(Math.abs(d) >= LEAST_PIVOT)) {
            residue = Double.POSITIVE_INFINITY;
        }
        positive += d > 0 ? 1 : 0;
        negative += d < 0 ? 1 : 0;
        for (int i = 0, t = 0; i < m; i++) {
            pause(i);
            double x = value[first[i]];
            double l = x / d;
            count(v, others[i], U * Math.abs(x));
            for (int j = i; j < m; j++) {
                double product = l * value[first[j]];
                int place = targets[t++];
                double sum = value[place] - product;
                value[place] = sum;
                count(others[i], others[j], U * (Math.abs(sum) + 2 * Math.abs(product)));
            }
        }
    }

    private void eliminate(int v, int w, int bPlace) {
        room(graph.degree(v) + graph.degree(w));
        int m = graph.neighbours(v, w, others, first, second);
        queue.remove(w);
        graph.remove(v);
        graph.remove(w);
        joinOthers(m);
        double a = value[v];
        double b = value[bPlace];
        double d = value[w];
        double determinant = a * d - b * b;
        positive++;
        negative++;
        for (int i = 0; i < m; i++) {
            double x = value[first[i]];
            double y = value[second[i]];
            w0[i] = (d * x - b * y) / determinant;
            w1[i] = (a * y - b * x) / determinant;
            e0[i] = residual(a, w0[i], b, w1[i], x);
            e1[i] = residual(b, w0[i], d, w1[i], y);
            count(v, others[i], e0[i]);
            count(w, others[i], e1[i]);
        }
        for (int i = 0, t = 0; i < m; i++) {
            pause(i);
            for (int j = i; j < m; j++) {
                double p = w0[i] * value[first[j]];
                double q = w1[i] * value[second[j]];
                int place = targets[t++];
                double sum = value[place] - (p + q);
                value[place] = sum;
                count(others[i], others[j], U * (Math.abs(sum) + 3 * (Math.abs(p) + Math.abs(q)))
                    + Math.abs(w0[i]) * e0[j] + Math.abs(w1[i]) * e1[j]);
            }
        }
    }

    /** A step with many rows takes longer than a millisecond. */
    private void pause(int row) {
        if ((row & 15) == 15) {
            checkpoint.run();
        }
    }

    private static double residual(double a, double x, double b, double y, double c) {
        double p = a * x;
        double q = b * y;
        return Math.abs(p + q - c) + 4 * U * (Math.abs(p) + Math.abs(q) + Math.abs(c));
    }

    private void count(int i, int j, double bound) {
        error[i] += bound;
        if (j != i) {
            error[j] += bound;
        }
    }

    private void joinOthers(int m) {
        graph.join(others, m, targets);
        if (graph.places() > value.length) {
            value = Arrays.copyOf(value, Math.max(graph.places(), value.length + (value.length >> 1)));
        }
        for (int i = 0; i < m; i++) {
            queue.put(others[i], graph.degree(others[i]));
        }
    }

    private void room(int m) {
        if (m > others.length) {
            int size = 2 * m;
            others = new int[size];
            first = new int[size];
            second = new int[size];
            e0 = new double[size];
            e1 = new double[size];
            w0 = new double[size];
            w1 = new double[size];
        }
        long pairs = (long) m * (m + 1) / 2;
        if (pairs > targets.length) {
            targets = new int[Math.toIntExact(Math.min(2 * pairs, Integer.MAX_VALUE - 8))];
        }
    }
}
