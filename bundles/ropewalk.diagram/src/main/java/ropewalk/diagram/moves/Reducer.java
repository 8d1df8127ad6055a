package ropewalk.diagram.moves;

import java.util.ArrayList;
import java.util.List;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.NotADiagramException;

/**
 * Removes kinks and bigons in place. A stack holds the crossings that may have a place at one of their corners. A
 * removal changes only regions along the edges that it joins, and a region of one or two corners has one at either end
 * of each of its edges: so it is enough to look again at one end of every joined edge, and the whole takes O(n).
 */
final class Reducer {

    private final LinkDiagram diagram;
    private final int[] mates;
    private final int[] starts;
    private final boolean[] gone;
    private final boolean[] waiting;
    private final int[] stack;
    private int top;
    private int left;
    private final List<Move> moves = new ArrayList<>();

    Reducer(LinkDiagram diagram) {
        this.diagram = diagram;
        int n = diagram.crossings();
        mates = new int[4 * n];
        for (int d = 0; d < 4 * n; d++) {
            mates[d] = diagram.mate(d);
        }
        starts = new int[diagram.components()];
        for (int i = 0; i < starts.length; i++) {
            starts[i] = diagram.start(i);
        }
        gone = new boolean[n];
        waiting = new boolean[n];
        stack = new int[n];
        left = n;
    }

    Reduction reduce() {
        for (int c = diagram.crossings() - 1; c >= 0; c--) {
            look(c);
        }
        while (top > 0) {
            int c = stack[--top];
            waiting[c] = false;
            if (!gone[c]) {
                visit(c);
            }
        }
        return new Reduction(moves.isEmpty() ? diagram : packed(), moves);
    }

    private void look(int crossing) {
        if (!waiting[crossing]) {
            waiting[crossing] = true;
            stack[top++] = crossing;
        }
    }

    private void visit(int c) {
        for (int d = 4 * c; d < 4 * c + 4; d++) {
            int e = LinkDiagram.clockwise(mates[d]);
            if (e == d) {
                moves.add(new Move.R1Removal(c));
                remove(c);
                return;
            }
            int other = e >> 2;
            if (other != c && LinkDiagram.clockwise(mates[e]) == d && ((d ^ mates[d]) & 1) == 0) {
                moves.add(new Move.R2Removal(Math.min(c, other), Math.max(c, other)));
                remove(c);
                remove(other);
                return;
            }
        }
    }

    private void remove(int c) {
        gone[c] = true;
        left--;
        passThrough(4 * c);
        passThrough(4 * c + 1);
    }

    /** Joins what lies before and behind a strand of a crossing that vanishes. */
    private void passThrough(int dart) {
        int out = diagram.isOutgoing(dart) ? dart : dart ^ 2;
        int before = mates[out ^ 2];
        int behind = mates[out];
        int component = diagram.component(dart);
        if (starts[component] == out) {
            starts[component] = before == out ? -1 : before;
        }
        if (before == out) {
            return;                             // the strand closed up here: a component without crossings
        }
        mates[before] = behind;
        mates[behind] = before;
        if (!gone[before >> 2]) {
            look(before >> 2);
        }
    }

    private LinkDiagram packed() {
        int[] number = new int[gone.length];
        int n = 0;
        for (int c = 0; c < gone.length; c++) {
            number[c] = gone[c] ? -1 : n++;
        }
        int[] newMates = new int[4 * left];
        byte[] signs = new byte[left];
        for (int c = 0; c < gone.length; c++) {
            if (!gone[c]) {
                signs[number[c]] = (byte) diagram.sign(c);
                for (int d = 4 * c; d < 4 * c + 4; d++) {
                    newMates[4 * number[c] + (d & 3)] = 4 * number[mates[d] >> 2] + (mates[d] & 3);
                }
            }
        }
        for (int i = 0; i < starts.length; i++) {
            if (starts[i] >= 0) {
                starts[i] = 4 * number[starts[i] >> 2] + (starts[i] & 3);
            }
        }
        try {
            return LinkDiagram.of(newMates, signs, starts);
        } catch (NotADiagramException e) {
            throw new IllegalStateException("moves left no diagram", e);
        }
    }
}
