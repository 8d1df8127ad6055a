package ropewalk.diagram;

import java.util.Arrays;

/** Sublinks and split unions. */
final class Surgery {

    private Surgery() {
    }

    static LinkDiagram sublink(LinkDiagram d, boolean[] keep) {
        if (keep.length != d.components()) {
            throw new IllegalArgumentException(keep.length + " choices for " + d.components()
                    + " components; give one for each");
        }
        int[] number = new int[keep.length];
        int k = 0;
        for (int i = 0; i < keep.length; i++) {
            number[i] = keep[i] ? k++ : -1;
        }
        boolean[] stays = new boolean[d.crossings()];
        for (int c = 0; c < stays.length; c++) {
            stays[c] = keep[d.component(4 * c)] && keep[d.component(4 * c + 1)];
        }
        return without(d, stays, number, k);
    }

    /**
     * The diagram in which every crossing that does not stay is passed straight through. Right only where no two
     * strands that stay are made to cross without a crossing; the caller answers for that.
     *
     * @param number new number of each component, or -1 where it goes
     */
    static LinkDiagram without(LinkDiagram d, boolean[] stays, int[] number, int k) {
        int[] crossing = new int[d.crossings()];
        int n = 0;
        for (int c = 0; c < crossing.length; c++) {
            crossing[c] = stays[c] ? n++ : -1;
        }
        int[] mates = new int[4 * n];
        byte[] signs = new byte[n];
        int[] strands = new int[2 * n];
        for (int c = 0; c < crossing.length; c++) {
            if (!stays[c]) {
                continue;
            }
            int m = crossing[c];
            signs[m] = (byte) d.sign(c);
            strands[2 * m] = number[d.component(4 * c)];
            strands[2 * m + 1] = number[d.component(4 * c + 1)];
            for (int i = 0; i < 4; i++) {
                int e = d.mate(4 * c + i);
                while (!stays[e >> 2]) {
                    e = d.mate(e ^ 2);
                }
                mates[4 * m + i] = 4 * crossing[e >> 2] + (e & 3);
            }
        }
        int[] starts = new int[k];
        Arrays.fill(starts, -1);
        for (int i = 0; i < number.length; i++) {
            if (number[i] >= 0 && d.start(i) >= 0) {
                starts[number[i]] = startThatStays(d, d.start(i), stays, crossing);
            }
        }
        return new LinkDiagram(n, k, mates, signs, strands, 0, starts, 0);
    }

    /** The outgoing dart of the edge that now holds the old first edge, or -1 if no crossing is left on it. */
    private static int startThatStays(LinkDiagram d, int start, boolean[] stays, int[] crossing) {
        int e = start;
        do {
            if (stays[e >> 2]) {
                return 4 * crossing[e >> 2] + (e & 3);
            }
            e = d.mate(e ^ 2);      // backwards along the orientation
        } while (e != start);
        return -1;
    }

    static LinkDiagram splitUnion(LinkDiagram left, LinkDiagram right) {
        int n = left.crossings() + right.crossings();
        int k = left.components() + right.components();
        int[] mates = new int[4 * n];
        byte[] signs = new byte[n];
        int[] strands = new int[2 * n];
        int[] starts = new int[k];
        copy(left, mates, signs, strands, starts, 0, 0);
        copy(right, mates, signs, strands, starts, left.crossings(), left.components());
        return new LinkDiagram(n, k, mates, signs, strands, 0, starts, 0);
    }

    private static void copy(LinkDiagram d, int[] mates, byte[] signs, int[] strands, int[] starts, int crossing,
            int component) {
        for (int e = 0; e < d.darts(); e++) {
            mates[4 * crossing + e] = 4 * crossing + d.mate(e);
        }
        for (int c = 0; c < d.crossings(); c++) {
            signs[crossing + c] = (byte) d.sign(c);
            strands[2 * (crossing + c)] = component + d.component(4 * c);
            strands[2 * (crossing + c) + 1] = component + d.component(4 * c + 1);
        }
        for (int i = 0; i < d.components(); i++) {
            starts[component + i] = d.start(i) < 0 ? -1 : 4 * crossing + d.start(i);
        }
    }
}
