package ropewalk.families;

import ropewalk.diagram.LinkDiagram;

/**
 * The closures of (σ₁σ₂⁻¹)ⁿ on three strands: alternating, with a wheel of n spokes for their chessboard graph. n = 2 is
 * the figure-eight knot, n = 3 the Borromean rings. The determinant is L₂ₙ - 2 with Lucas numbers (Sedláček 1970, in
 * "Combinatorial structures and their applications", the number of spanning trees of a wheel).
 */
public final class WheelClosure {

    private WheelClosure() {
    }

    /**
     * The diagram with 2n crossings.
     *
     * @param spokes n, at least 0
     * @return the closed braid; three components if 3 divides n, else one
     * @throws IllegalArgumentException if n is negative
     */
    public static LinkDiagram of(int spokes) {
        if (spokes < 0) {
            throw new IllegalArgumentException(spokes + " spokes; their number is not negative");
        }
        int[] letters = new int[Math.multiplyExact(2, spokes)];
        for (int i = 0; i < letters.length; i++) {
            letters[i] = i % 2 == 0 ? 1 : -2;
        }
        return BraidClosure.of(3, letters);
    }
}
