package ropewalk.algebra.internal;

import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;

/**
 * Sparse symmetric elimination modulo a prime in minimum-degree order (W. F. Tinney and J. W. Walker, Proc. IEEE 55 (1967)
 * 1801–1809), the pivots chosen as it goes: a diagonal value that is not 0 modulo the prime, or a block of two rows and
 * columns ((0, b), (b, d)) with b not 0, whose determinant -b² is not 0 either (J. R. Bunch and B. N. Parlett, SIAM J. Numer.
 * Anal. 8 (1971) 639–655, use such blocks for stability; here they only avoid the zeros).
 *
 * <p>Places are those of {@link FillGraph}. As in {@link GeneralElimination} a place stays also where its value cancels, and
 * at the end all values left are 0 modulo the prime.
 */
final class SymmetricElimination {
    /** Is told every step. The arrays are valid during the call and longer than their content. */
    interface Listener {
        /** A diagonal pivot; targets (i, j) with i &lt;= j, row by row. */
        void diagonal(int pivot, int[] beside, int m, int[] targets);

        /** A block pivot ((a, b), (b, d)). */
        void block(int a, int b, int d, int[] besideA, int[] besideD, int m, int[] targets);
    }

    private final PrimeField field;
    private final Listener listener;
    private final Runnable checkpoint;
    private final FillGraph graph;
    private final Queue queue;
    private final long[] initial;
    private long[] value;
    private int eliminated;
    private final IntList used;

    private int[] others = new int[16];
    private int[] first = new int[16];
    private int[] second = new int[16];
    private int[] targets = new int[256];

    SymmetricElimination(IntegerMatrix matrix, PrimeField field, Listener listener, Runnable checkpoint) {
        this.field = field;
        this.listener = listener;
        this.checkpoint = checkpoint;
        long[] values = new long[matrix.rows() + matrix.entries() / 2 + 1];
        graph = new FillGraph(matrix, values);
        initial = Arrays.copyOf(values, graph.places());
        queue = new Queue(graph.n);
        used = new IntList(graph.n);
        value = new long[2 * graph.places() + 16];
        for (int k = 0; k < initial.length; k++) {
            value[k] = field.of(initial[k]);
        }
    }

    /** The values of the first places; all others begin as 0. */
    long[] initial() {
        return initial;
    }

    int places() {
        return graph.places();
    }

    /** The number of rows and columns that were used up, the rank modulo the prime. */
    int eliminated() {
        return eliminated;
    }

    /** The rows that were used up, in order. */
    int[] used() {
        return used.toArray();
    }

    /** The places left that may differ from 0 modulo another prime. */
    int[] rest() {
        return graph.rest();
    }

    void run() {
        for (int v = 0; v < graph.n; v++) {
            queue.put(v, graph.degree(v));
        }
        while (true) {
            int key = queue.leastKey();
            int v = queue.first(key);
            if (v < 0) {
                return;
            }
            checkpoint.run();
            queue.remove(v);
            if (value[v] != 0) {
                eliminate(v);
            } else {
                tryBlock(v, key);
            }
        }
    }

    /** A vertex with diagonal 0: goes with its best neighbour if that costs no more than the key, else waits for its turn. */
    private void tryBlock(int v, int key) {
        int partner = -1;
        int partnerPlace = -1;
        int[] near = graph.near(v);
        int[] nearPlace = graph.nearPlace(v);
        for (int k = 0; k < graph.degree(v); k++) {
            if (value[nearPlace[k]] != 0 && (partner < 0 || graph.degree(near[k]) < graph.degree(partner))) {
                partner = near[k];
                partnerPlace = nearPlace[k];
            }
        }
        if (partner < 0) {
            // Nothing to eliminate with: sleeps until a neighbour's elimination changes it.
            return;
        }
        int cost = graph.union(v, partner);
        if (cost > key) {
            queue.put(v, cost);
        } else {
            eliminate(v, partner, partnerPlace);
        }
    }

    private void eliminate(int v) {
        int m = graph.degree(v);
        room(m);
        System.arraycopy(graph.near(v), 0, others, 0, m);
        System.arraycopy(graph.nearPlace(v), 0, first, 0, m);
        take(v);
        joinOthers(m);
        long minusInverse = m == 0 ? 0 : field.negate(field.inverse(value[v]));
        for (int i = 0, t = 0; i < m; i++) {
            pause(i);
            long factor = field.multiply(value[first[i]], minusInverse);
            for (int j = i; j < m; j++) {
                add(targets[t++], field.multiply(factor, value[first[j]]));
            }
        }
        listener.diagonal(v, first, m, targets);
    }

    private void eliminate(int v, int w, int b) {
        room(graph.degree(v) + graph.degree(w));
        int m = graph.neighbours(v, w, others, first, second);
        take(v);
        take(w);
        joinOthers(m);
        // ((0, b), (b, d)) has the inverse ((-d/b², 1/b), (1/b, 0)).
        long reciprocal = field.inverse(value[b]);
        long corner = field.multiply(value[w], field.multiply(reciprocal, reciprocal));
        for (int i = 0, t = 0; i < m; i++) {
            pause(i);
            long x = value[first[i]];
            long y = value[second[i]];
            long factor = field.subtract(field.multiply(corner, x), field.multiply(reciprocal, y));
            long factor2 = field.negate(field.multiply(reciprocal, x));
            for (int j = i; j < m; j++) {
                add(targets[t], field.multiply(factor, value[first[j]]));
                add(targets[t++], field.multiply(factor2, value[second[j]]));
            }
        }
        listener.block(v, b, w, first, second, m, targets);
    }

    /** A step with many rows takes longer than a millisecond. */
    private void pause(int row) {
        if ((row & 15) == 15) {
            checkpoint.run();
        }
    }

    private void add(int place, long v) {
        long sum = value[place] + v;
        value[place] = sum >= field.p ? sum - field.p : sum;
    }

    private void take(int v) {
        queue.remove(v);
        graph.remove(v);
        used.add(v);
        eliminated++;
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
        }
        long pairs = (long) m * (m + 1) / 2;
        if (pairs > targets.length) {
            targets = new int[Math.toIntExact(Math.min(2 * pairs, Integer.MAX_VALUE - 8))];
        }
    }
}
