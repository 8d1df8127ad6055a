package ropewalk.diagram.moves;

import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.NotADiagramException;

/**
 * Makes moves on the signed Gauss words of the components: each passage of a strand through a crossing knows the ones
 * before and after it. On the sphere this is all that counts: a crossing is a kink if its two passages are neighbours;
 * two crossings of opposite sign bound a bigon with one strand above if their over-passages are neighbours and their
 * under-passages are.
 *
 * <p>Proof of the first: the edge between the passages joins two darts next to each other, so one side of it has a
 * single corner. Of the second: the two edges close up to a curve that turns at both crossings. Opposite signs say that it
 * turns to the same side at both; then all other darts of the two crossings lie on the other side, and the side of the
 * turns, crossed by nothing of this connected piece, is a region of two corners.
 */
final class Replay {

    private final LinkDiagram diagram;
    private final int[] before;                 // passages: 2c under, 2c + 1 over at crossing c
    private final int[] after;
    private final int[] starts;                 // by component: the passage before its first edge, or -1
    private final boolean[] gone;
    private int left;

    Replay(LinkDiagram diagram) {
        this.diagram = diagram;
        int n = diagram.crossings();
        before = new int[2 * n];
        after = new int[2 * n];
        gone = new boolean[n];
        left = n;
        for (int p = 0; p < 2 * n; p++) {
            after[p] = passage(diagram.mate(out(p)));
            before[after[p]] = p;
        }
        starts = new int[diagram.components()];
        for (int i = 0; i < starts.length; i++) {
            starts[i] = diagram.start(i) < 0 ? -1 : passage(diagram.start(i));
        }
    }

    private static int passage(int dart) {
        return 2 * (dart >> 2) + (dart & 1);
    }

    private int out(int passage) {
        int dart = 4 * (passage >> 1) + (passage & 1);
        return diagram.isOutgoing(dart) ? dart : dart ^ 2;
    }

    void make(Move move) {
        if (move instanceof Move.R1Removal r1) {
            requireThere(r1.crossing());
            requireNeighbours(2 * r1.crossing(), 2 * r1.crossing() + 1, "the two passages of the crossing");
            remove(r1.crossing());
        } else if (move instanceof Move.R2Removal r2) {
            requireThere(r2.first());
            requireThere(r2.second());
            requireNeighbours(2 * r2.first(), 2 * r2.second(), "the two under-passages");
            requireNeighbours(2 * r2.first() + 1, 2 * r2.second() + 1, "the two over-passages");
            if (diagram.sign(r2.first()) == diagram.sign(r2.second())) {
                throw new IllegalArgumentException("the two crossings have the same sign; they must have opposite ones");
            }
            remove(r2.first());
            remove(r2.second());
        }
    }

    private void requireThere(int crossing) {
        if (crossing >= gone.length) {
            throw new IllegalArgumentException("the diagram has only " + gone.length + " crossings");
        }
        if (gone[crossing]) {
            throw new IllegalArgumentException("crossing " + (crossing + 1) + " was removed before");
        }
    }

    private void requireNeighbours(int p, int q, String what) {
        if (after[p] != q && after[q] != p) {
            throw new IllegalArgumentException(what + " do not follow one another");
        }
    }

    private void remove(int crossing) {
        gone[crossing] = true;
        left--;
        for (int p = 2 * crossing; p < 2 * crossing + 2; p++) {
            int component = diagram.component(out(p));
            if (starts[component] == p) {
                starts[component] = before[p] == p ? -1 : before[p];
            }
            after[before[p]] = after[p];
            before[after[p]] = before[p];
        }
    }

    LinkDiagram diagram() {
        int[] number = new int[gone.length];
        byte[] signs = new byte[left];
        int n = 0;
        for (int c = 0; c < gone.length; c++) {
            if (!gone[c]) {
                signs[n] = (byte) diagram.sign(c);
                number[c] = n++;
            }
        }
        int[] mates = new int[4 * left];
        for (int p = 0; p < after.length; p++) {
            if (!gone[p >> 1]) {
                int tail = renumbered(out(p), number);
                int head = renumbered(out(after[p]) ^ 2, number);
                mates[tail] = head;
                mates[head] = tail;
            }
        }
        int[] darts = new int[starts.length];
        for (int i = 0; i < starts.length; i++) {
            darts[i] = starts[i] < 0 ? -1 : renumbered(out(starts[i]), number);
        }
        try {
            return LinkDiagram.of(mates, signs, darts);
        } catch (NotADiagramException e) {
            throw new IllegalStateException("moves left no diagram", e);
        }
    }

    private static int renumbered(int dart, int[] number) {
        return 4 * number[dart >> 2] + (dart & 3);
    }
}
