package ropewalk.diagram.notation;

import java.util.Arrays;

/**
 * The prime summands of a closed curve on the sphere that crosses itself. Draw a chord for each crossing between its
 * two passages on a circle: a summand is a set of chords that hang together by crossing one another. For such a set
 * leaves gaps on the circle, no other chord joins two gaps, and the stretch of curve in a gap can be cut off by a circle
 * that meets the curve twice; while chords that cross are never parted that way.
 */
final class Summands {

    private final int[] parent;
    private final int[] open;                   // by summand so far: chords begun and not ended
    private final int[] stack;                  // summands so far that have open chords, the latest on top
    private int top;

    private Summands(int crossings) {
        parent = new int[crossings];
        open = new int[crossings];
        stack = new int[crossings];
        Arrays.fill(parent, -1);
    }

    /**
     * The summand of every crossing, named by one of its crossings. Nearly O(n).
     *
     * @param crossingAt the crossing of each passage; every crossing 0 … n-1 occurs twice
     */
    static int[] of(int[] crossingAt) {
        Summands s = new Summands(crossingAt.length / 2);
        for (int c : crossingAt) {
            if (s.parent[c] < 0) {
                s.begin(c);
            } else {
                s.end(c);
            }
        }
        int[] summands = new int[crossingAt.length / 2];
        for (int c = 0; c < summands.length; c++) {
            summands[c] = s.find(c);
        }
        return summands;
    }

    private void begin(int c) {
        parent[c] = c;
        open[c] = 1;
        stack[top++] = c;
    }

    /** Whatever was begun after this chord and has not ended crosses it. */
    private void end(int c) {
        int mine = find(c);
        while (stack[top - 1] != mine) {
            int other = stack[--top];
            parent[other] = mine;
            open[mine] += open[other];
        }
        open[mine]--;
        if (open[mine] == 0) {
            top--;
        }
    }

    private int find(int c) {
        int root = c;
        while (parent[root] != root) {
            root = parent[root];
        }
        for (int at = c; parent[at] != root;) {
            int up = parent[at];
            parent[at] = root;
            at = up;
        }
        return root;
    }
}
