package ropewalk.diagram;

import java.util.Arrays;

/**
 * The connected pieces of a diagram: what hangs together through crossings. A component without crossings is a piece
 * of its own. Pieces with crossings come first, by their first crossing, then the others by component.
 *
 * <p>They are pieces of the <em>diagram</em>; two components of one piece may still come apart in space.
 */
public final class ConnectedPieces {

    private static final DerivedKey<ConnectedPieces> KEY = new DerivedKey<>("connected pieces");

    private final int count;
    private final int withCrossings;
    private final int[] ofCrossing;
    private final int[] ofComponent;

    private ConnectedPieces(int count, int withCrossings, int[] ofCrossing, int[] ofComponent) {
        this.count = count;
        this.withCrossings = withCrossings;
        this.ofCrossing = ofCrossing;
        this.ofComponent = ofComponent;
    }

    /**
     * The pieces of a diagram, computed once in O(n).
     *
     * @param diagram any diagram
     * @return its connected pieces
     */
    public static ConnectedPieces of(LinkDiagram diagram) {
        return diagram.derived(KEY, ConnectedPieces::find);
    }

    private static ConnectedPieces find(LinkDiagram d) {
        int n = d.crossings();
        int[] piece = new int[n];
        Arrays.fill(piece, -1);
        int[] stack = new int[n];
        int count = 0;
        for (int first = 0; first < n; first++) {
            if (piece[first] >= 0) {
                continue;
            }
            int top = 0;
            stack[top++] = first;
            piece[first] = count;
            while (top > 0) {
                int c = stack[--top];
                for (int i = 0; i < 4; i++) {
                    int other = d.mate(4 * c + i) >> 2;
                    if (piece[other] < 0) {
                        piece[other] = count;
                        stack[top++] = other;
                    }
                }
            }
            count++;
        }
        int withCrossings = count;
        int[] ofComponent = new int[d.components()];
        for (int i = 0; i < ofComponent.length; i++) {
            ofComponent[i] = d.start(i) < 0 ? count++ : piece[d.start(i) >> 2];
        }
        return new ConnectedPieces(count, withCrossings, piece, ofComponent);
    }

    /**
     * How many pieces there are.
     *
     * @return the number of pieces, components without crossings counted
     */
    public int count() {
        return count;
    }

    /**
     * How many pieces have crossings; these are the pieces 0 … withCrossings-1.
     *
     * @return the number of pieces with crossings
     */
    public int withCrossings() {
        return withCrossings;
    }

    /**
     * The piece of a crossing.
     *
     * @param crossing 0 … n-1
     * @return its piece, counted from 0
     */
    public int ofCrossing(int crossing) {
        return ofCrossing[crossing];
    }

    /**
     * The piece of a component.
     *
     * @param component counted from 0
     * @return its piece, counted from 0
     */
    public int ofComponent(int component) {
        return ofComponent[component];
    }
}
