package ropewalk.diagram;

import java.util.HashMap;
import java.util.Map;

/** Second routes, slow and plain, by merging classes instead of walking round. */
public final class Slow {

    private Slow() {
    }

    /** Classes of 0 … n-1 under merging. */
    public static final class Classes {
        private final int[] name;

        public Classes(int n) {
            name = new int[n];
            for (int i = 0; i < n; i++) {
                name[i] = i;
            }
        }

        public int of(int i) {
            int r = i;
            while (name[r] != r) {
                r = name[r];
            }
            name[i] = r;
            return r;
        }

        public void merge(int a, int b) {
            name[of(a)] = of(b);
        }

        public int count() {
            int count = 0;
            for (int i = 0; i < name.length; i++) {
                count += name[i] == i ? 1 : 0;
            }
            return count;
        }
    }

    /** Corners that lie in one region: the two sides of every edge carry corners of both its ends. */
    public static Classes regions(LinkDiagram d) {
        Classes corners = new Classes(d.darts());
        for (int e = 0; e < d.darts(); e++) {
            corners.merge(e, LinkDiagram.clockwise(d.mate(e)));
        }
        return corners;
    }

    public static Classes crossings(LinkDiagram d) {
        Classes pieces = new Classes(d.crossings());
        for (int e = 0; e < d.darts(); e++) {
            pieces.merge(e / 4, d.mate(e) / 4);
        }
        return pieces;
    }

    /** Dart ends on one arc. */
    public static Classes arcs(LinkDiagram d) {
        Classes ends = new Classes(d.darts());
        for (int e = 0; e < d.darts(); e++) {
            ends.merge(e, d.mate(e));
            if (e % 2 == 1) {
                ends.merge(e, 4 * (e / 4) + (e + 2) % 4);
            }
        }
        return ends;
    }

    public static Classes strands(LinkDiagram d) {
        Classes ends = new Classes(d.darts());
        for (int e = 0; e < d.darts(); e++) {
            ends.merge(e, d.mate(e));
            ends.merge(e, 4 * (e / 4) + (e + 2) % 4);
        }
        return ends;
    }

    /** Twice the linking number of every two components. */
    public static Map<String, Integer> linking(LinkDiagram d) {
        Map<String, Integer> sums = new HashMap<>();
        for (int c = 0; c < d.crossings(); c++) {
            int a = d.component(4 * c);
            int b = d.component(4 * c + 1);
            if (a != b) {
                sums.merge(Math.min(a, b) + " " + Math.max(a, b), d.sign(c), Integer::sum);
            }
        }
        sums.values().removeIf(v -> v == 0);
        return sums;
    }

    /** The dimension of the space of Fox colourings modulo a prime, by elimination. */
    public static int colouringDimension(LinkDiagram d, int p) {
        Arcs arcs = Arcs.of(d);
        int[][] rows = new int[d.crossings()][arcs.count()];
        for (int c = 0; c < rows.length; c++) {
            rows[c][arcs.over(c)] += 2;
            rows[c][arcs.ofDart(4 * c)] += p - 1;
            rows[c][arcs.ofDart(4 * c + 2)] += p - 1;
        }
        int rank = 0;
        for (int col = 0; col < arcs.count(); col++) {
            int pivot = rank;
            while (pivot < rows.length && rows[pivot][col] % p == 0) {
                pivot++;
            }
            if (pivot == rows.length) {
                continue;
            }
            int[] swap = rows[rank];
            rows[rank] = rows[pivot];
            rows[pivot] = swap;
            int inverse = 1;
            while (inverse * rows[rank][col] % p != 1) {
                inverse++;
            }
            for (int r = rank + 1; r < rows.length; r++) {
                int factor = rows[r][col] * inverse % p;
                for (int j = col; factor != 0 && j < arcs.count(); j++) {
                    rows[r][j] = Math.floorMod(rows[r][j] - factor * rows[rank][j], p);
                }
            }
            rank++;
        }
        return arcs.count() - rank;
    }

    /** Fox 3-colourings, by trying all. */
    public static long threeColourings(LinkDiagram d) {
        Arcs arcs = Arcs.of(d);
        long count = 0;
        long all = Math.round(Math.pow(3, arcs.count()));
        int[] colour = new int[arcs.count()];
        for (long i = 0; i < all; i++) {
            long rest = i;
            for (int a = 0; a < colour.length; a++) {
                colour[a] = (int) (rest % 3);
                rest /= 3;
            }
            boolean good = true;
            for (int c = 0; good && c < d.crossings(); c++) {
                good = (colour[arcs.over(c)] + colour[arcs.ofDart(4 * c)] + colour[arcs.ofDart(4 * c + 2)]) % 3 == 0;
            }
            count += good ? 1 : 0;
        }
        return count;
    }
}
