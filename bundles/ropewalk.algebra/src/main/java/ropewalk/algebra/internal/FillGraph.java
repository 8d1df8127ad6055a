package ropewalk.algebra.internal;

import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;

/**
 * The graph of a symmetric matrix under elimination: a vertex for each row, an edge for each place off the diagonal that was
 * ever filled. Removing vertices joins their neighbours to a clique (S. Parter, SIAM Rev. 3 (1961) 119–130).
 *
 * <p>Places: number v &lt; n is the diagonal place (v, v); the edges of the matrix follow row by row, then the fill. Values by
 * place are kept by the user of the graph.
 */
final class FillGraph {
    final int n;
    private final int[][] near;
    private final int[][] nearPlace;
    private final int[] degree;
    private final boolean[] removed;
    private final boolean[] written;
    private final int[] mark;
    private int places;

    /**
     * Starts with the pattern of a symmetric matrix.
     *
     * @param matrix the matrix
     * @param initial receives the values by place; at least n + entries / 2 + 1 long
     */
    FillGraph(IntegerMatrix matrix, long[] initial) {
        n = matrix.rows();
        near = new int[n][];
        nearPlace = new int[n][];
        degree = new int[n];
        removed = new boolean[n];
        written = new boolean[n];
        mark = new int[n];
        Arrays.fill(mark, -1);
        places = n;
        for (int v = 0; v < n; v++) {
            int size = matrix.rowStart(v + 1) - matrix.rowStart(v) + 2;
            near[v] = new int[size];
            nearPlace[v] = new int[size];
        }
        for (int v = 0; v < n; v++) {
            for (int k = matrix.rowStart(v); k < matrix.rowStart(v + 1); k++) {
                int w = matrix.column(k);
                if (w == v) {
                    initial[v] = matrix.value(k);
                    written[v] = true;
                } else if (w > v) {
                    initial[places] = matrix.value(k);
                    join(v, w, places++);
                }
            }
        }
    }

    int places() {
        return places;
    }

    int degree(int v) {
        return degree[v];
    }

    /** The neighbours of v, {@link #degree} of them; none is removed. */
    int[] near(int v) {
        return near[v];
    }

    /** The places of the edges to the neighbours, in their order. */
    int[] nearPlace(int v) {
        return nearPlace[v];
    }

    boolean isRemoved(int v) {
        return removed[v];
    }

    int newPlace() {
        if ((places & 0xffff) == 0) {
            Memory.check(places, 32, "filled places");
        }
        int place = places;
        places = Math.incrementExact(places);
        return place;
    }

    /** How many neighbours the edge (v, w) has. */
    int union(int v, int w) {
        for (int k = 0; k < degree[v]; k++) {
            mark[near[v][k]] = 0;
        }
        int size = degree[v] - 1;
        for (int k = 0; k < degree[w]; k++) {
            size += near[w][k] != v && mark[near[w][k]] < 0 ? 1 : 0;
        }
        for (int k = 0; k < degree[v]; k++) {
            mark[near[v][k]] = -1;
        }
        return size;
    }

    /**
     * Collects the neighbours of an edge; where one is not a neighbour of both ends a place is made for the missing value.
     *
     * @return their number m
     */
    int neighbours(int v, int w, int[] others, int[] placeToV, int[] placeToW) {
        int m = 0;
        for (int k = 0; k < degree[v]; k++) {
            int x = near[v][k];
            if (x != w) {
                mark[x] = m;
                others[m] = x;
                placeToV[m] = nearPlace[v][k];
                placeToW[m++] = -1;
            }
        }
        for (int k = 0; k < degree[w]; k++) {
            int x = near[w][k];
            if (x == v) {
                continue;
            }
            int at = mark[x];
            if (at < 0) {
                at = m++;
                others[at] = x;
                placeToV[at] = newPlace();
            }
            placeToW[at] = nearPlace[w][k];
        }
        for (int k = 0; k < m; k++) {
            mark[others[k]] = -1;
            if (placeToW[k] < 0) {
                placeToW[k] = newPlace();
            }
        }
        return m;
    }

    /** Takes a vertex out; {@link #join(int[], int, int[])} of its neighbours must follow before anything else. */
    void remove(int v) {
        removed[v] = true;
        near[v] = null;
        nearPlace[v] = null;
    }

    /**
     * Makes a clique of vertices that were all the neighbours of what was removed.
     *
     * @param targets receives the places (i, j), i &lt;= j, row by row: m(m+1)/2 of them
     */
    void join(int[] others, int m, int[] targets) {
        int t = 0;
        for (int i = 0; i < m; i++) {
            int v = others[i];
            markNear(v);
            written[v] = true;
            targets[t++] = v;
            for (int j = i + 1; j < m; j++) {
                int place = mark[others[j]];
                if (place < 0) {
                    place = newPlace();
                    join(v, others[j], place);
                }
                targets[t++] = place;
            }
            for (int k = 0; k < degree[v]; k++) {
                mark[near[v][k]] = -1;
            }
        }
    }

    /** Drops the removed neighbours of v and marks the others with their places. */
    private void markNear(int v) {
        int kept = 0;
        int[] names = near[v];
        int[] itsPlaces = nearPlace[v];
        for (int k = 0; k < degree[v]; k++) {
            int w = names[k];
            if (!removed[w]) {
                names[kept] = w;
                itsPlaces[kept++] = itsPlaces[k];
                mark[w] = itsPlaces[k];
            }
        }
        degree[v] = kept;
    }

    private void join(int v, int w, int place) {
        append(v, w, place);
        append(w, v, place);
    }

    private void append(int v, int w, int place) {
        int at = degree[v]++;
        if (at == near[v].length) {
            near[v] = Arrays.copyOf(near[v], 2 * at + 4);
            nearPlace[v] = Arrays.copyOf(nearPlace[v], 2 * at + 4);
        }
        near[v][at] = w;
        nearPlace[v][at] = place;
    }

    /** The places between vertices that were not removed, unless the matrix has 0 there and no step has written to it. */
    int[] rest() {
        IntList rest = new IntList(16);
        for (int v = 0; v < n; v++) {
            if (!removed[v]) {
                if (written[v]) {
                    rest.add(v);
                }
                for (int k = 0; k < degree[v]; k++) {
                    if (near[v][k] > v) {
                        rest.add(nearPlace[v][k]);
                    }
                }
            }
        }
        return rest.toArray();
    }
}
