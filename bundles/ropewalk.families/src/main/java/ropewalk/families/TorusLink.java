package ropewalk.families;

import ropewalk.diagram.LinkDiagram;

/**
 * Torus links T(p, q): the closure of (σ₁σ₂…σ_{p-1})^q on p strands, gcd(p, q) components. T(3, 2) and T(2, 3) are the
 * right-handed trefoil; negative q gives the mirror image.
 */
public final class TorusLink {

    private TorusLink() {
    }

    /**
     * The diagram with (p - 1)·|q| crossings.
     *
     * @param p number of strands, at least 1
     * @param q number of p-th parts of a full twist, any sign; 0 gives p components without crossings
     * @return T(p, q), all strands parallel
     * @throws IllegalArgumentException if p is less than 1
     */
    public static LinkDiagram of(int p, int q) {
        if (p < 1) {
            throw new IllegalArgumentException("T(" + p + ", " + q + "): the first number is at least 1");
        }
        int[] letters = new int[Math.multiplyExact(p - 1, Math.abs(q))];
        for (int i = 0; i < letters.length; i++) {
            letters[i] = (1 + i % (p - 1)) * Integer.signum(q);
        }
        return BraidClosure.of(p, letters);
    }
}
