package ropewalk.diagram;

import java.util.Arrays;

/**
 * Euler's formula for every connected piece: n crossings, 2n edges, n + 2 regions, or the map does not lie on the
 * sphere. Keeps its scratch arrays from one diagram to the next.
 */
final class SphereCheck {

    private static final int FACE_MET = 1;
    private static final int PIECE_MET = 2;

    private int[] stack = new int[64];
    private int[] seen = new int[256];

    /** Checks the map with the given mates, an involution without fixed points on the darts 0 … 4n-1. */
    void check(int n, int[] mates) throws NotADiagramException {
        if (stack.length < n) {
            // Doubled, so that slowly growing diagrams do not allocate each time, within what an array can hold.
            int room = Math.max(n, Math.min(2 * stack.length, 1 << 28));
            stack = new int[room];
            seen = new int[4 * room];
        }
        Arrays.fill(seen, 0, 4 * n, 0);
        int regions = 0;
        for (int d = 0; d < 4 * n; d++) {
            if (seen[d] == 0) {
                regions++;
                for (int e = d; seen[e] == 0; e = LinkDiagram.clockwise(mates[e])) {
                    seen[e] = FACE_MET;
                }
            }
        }
        int pieces = 0;
        for (int c = 0; c < n; c++) {
            if (seen[4 * c] != PIECE_MET) {
                pieces++;
                markPiece(c, mates);
            }
        }
        // No piece has more than n + 2 regions, so the sums agree only if every piece has as many.
        if (regions != n + 2 * pieces) {
            throw fault(n, mates, pieces);
        }
    }

    private void markPiece(int crossing, int[] mates) {
        int top = 0;
        stack[top++] = crossing;
        seen[4 * crossing] = PIECE_MET;
        while (top > 0) {
            int c = stack[--top];
            for (int i = 0; i < 4; i++) {
                int other = mates[4 * c + i] >> 2;
                if (seen[4 * other] != PIECE_MET) {
                    seen[4 * other] = PIECE_MET;
                    stack[top++] = other;
                }
            }
        }
    }

    /** Counts again, piece by piece, to name the first one that is wrong. */
    private NotADiagramException fault(int n, int[] mates, int pieces) {
        int[] piece = new int[n];
        int[] first = new int[pieces];
        int[] size = new int[pieces];
        int[] regions = new int[pieces];
        Arrays.fill(piece, -1);
        int count = 0;
        for (int c = 0; c < n; c++) {
            if (piece[c] < 0) {
                first[count] = c;
                size[count] = number(c, mates, piece, count);
                count++;
            }
        }
        boolean[] met = new boolean[4 * n];
        for (int d = 0; d < 4 * n; d++) {
            if (!met[d]) {
                regions[piece[d >> 2]]++;
                for (int e = d; !met[e]; e = LinkDiagram.clockwise(mates[e])) {
                    met[e] = true;
                }
            }
        }
        for (int i = 0; i < count; i++) {
            if (regions[i] != size[i] + 2) {
                return new NotADiagramException(NotADiagramException.Kind.NOT_PLANAR, first[i],
                        "the piece with crossing " + (first[i] + 1) + " has " + size[i] + " crossings and " + regions[i]
                        + " regions; on the sphere it would have " + (size[i] + 2));
            }
        }
        throw new IllegalStateException("regions were miscounted");
    }

    private int number(int crossing, int[] mates, int[] piece, int number) {
        int top = 0;
        int size = 0;
        stack[top++] = crossing;
        piece[crossing] = number;
        while (top > 0) {
            int c = stack[--top];
            size++;
            for (int i = 0; i < 4; i++) {
                int other = mates[4 * c + i] >> 2;
                if (piece[other] < 0) {
                    piece[other] = number;
                    stack[top++] = other;
                }
            }
        }
        return size;
    }
}
