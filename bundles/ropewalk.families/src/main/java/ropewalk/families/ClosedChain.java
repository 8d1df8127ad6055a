package ropewalk.families;

import ropewalk.diagram.LinkDiagram;

/**
 * Closed chains of two strands: crossings one below the other, each of a given sign while both strands run down. The
 * regions between the crossings shaded, the chessboard signs are these signs, and the determinant is the absolute value
 * of their sum: with four crossings 4, 2 or 0 as 4, 3 or 2 of them agree.
 */
public final class ClosedChain {

    private ClosedChain() {
    }

    /**
     * The diagram of a chain.
     *
     * @param signs for each crossing 1 or -1
     * @return the closed chain, both strands running down; two components if their number is even, else one
     * @throws IllegalArgumentException if a sign is neither 1 nor -1
     */
    public static LinkDiagram of(int... signs) {
        for (int s : signs) {
            if (s != 1 && s != -1) {
                throw new IllegalArgumentException("sign " + s + "; a sign is 1 or -1");
            }
        }
        return BraidClosure.of(2, signs);
    }
}
