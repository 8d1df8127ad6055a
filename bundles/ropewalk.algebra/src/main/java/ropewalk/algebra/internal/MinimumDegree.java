package ropewalk.algebra.internal;

import ropewalk.algebra.IntegerMatrix;

/**
 * Eliminates the vertices of a symmetric matrix one by one, always one of least degree, whatever the values are, and tells
 * sweeps of positive or of dissipative arithmetic, which need no pivot search, what to do.
 */
final class MinimumDegree {
    /** Arithmetic that follows the elimination. */
    interface Sweep {
        /**
         * Eliminates a vertex.
         *
         * @param v the vertex, and the place of its diagonal value
         * @param others its neighbours, m of them
         * @param places the places beside it
         * @param targets the places (i, j), i &lt;= j, of the neighbours, row by row
         * @param used the number of places so far; those never seen before are 0
         */
        void eliminate(int v, int[] others, int[] places, int m, int[] targets, int used);
    }

    private MinimumDegree() {
    }

    static void run(IntegerMatrix matrix, Runnable checkpoint, Sweep... sweeps) {
        FillGraph graph = new FillGraph(matrix, new long[matrix.rows() + matrix.entries() / 2 + 1]);
        Queue queue = new Queue(graph.n);
        int[] others = new int[16];
        int[] places = new int[16];
        int[] targets = new int[256];
        for (int v = 0; v < graph.n; v++) {
            queue.put(v, graph.degree(v));
        }
        for (int step = 0; step < graph.n; step++) {
            checkpoint.run();
            int v = queue.first(queue.leastKey());
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
            for (int i = 0; i < m; i++) {
                queue.put(others[i], graph.degree(others[i]));
            }
            for (Sweep sweep : sweeps) {
                sweep.eliminate(v, others, places, m, targets, graph.places());
            }
        }
    }
}
