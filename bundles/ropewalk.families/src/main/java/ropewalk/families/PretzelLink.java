package ropewalk.families;

import ropewalk.diagram.LinkDiagram;

/**
 * Pretzel links (p₁, …, pₙ): columns of |pᵢ| crossings side by side, tops joined to tops and bottoms to bottoms, which
 * is the numerator closure of 1/p₁ + … + 1/pₙ. In a column with p &gt; 0 the over-strand of every crossing falls from the
 * left to the right: positive crossings where the two strands run against each other, negative ones where both run down.
 * (1, 1, 1) is the right-handed trefoil, (-2, 3, 7) the mirror image of (2, -3, -7). The determinant of (p, q, r) is
 * |pq + qr + pr|, in general |Σᵢ Πⱼ pⱼ/pᵢ|; it is 0 for (3, 6, -2) and (4, 4, -2), which do not split.
 */
public final class PretzelLink {

    private PretzelLink() {
    }

    /**
     * The diagram with |p₁| + … + |pₙ| crossings.
     *
     * @param columns p₁, …, pₙ, any signs; 0 is a column of two strands that do not cross
     * @return the diagram
     * @throws IllegalArgumentException if there is no column
     */
    public static LinkDiagram of(int... columns) {
        if (columns.length == 0) {
            throw new IllegalArgumentException("a pretzel without columns; give at least one");
        }
        Wiring w = new Wiring();
        Tangle sum = null;
        for (int p : columns) {
            Tangle column = Tangle.rational(w, 0, p);
            sum = sum == null ? column : sum.plus(column);
        }
        sum.closeNumerator();
        return w.diagram();
    }
}
