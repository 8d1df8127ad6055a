package ropewalk.families;

import java.util.ArrayList;
import java.util.List;
import ropewalk.diagram.LinkDiagram;

/**
 * Montesinos links: the numerator closure of a sum of rational tangles β₁/α₁ + … + βₙ/αₙ (Montesinos 1973). The double
 * branched cover is Seifert fibred with exceptional fibres of orders |αᵢ|; the determinant is |Σᵢ βᵢ Πⱼ αⱼ/αᵢ|. With three
 * or more tangles, all |αᵢ| ≥ 2, the link does not split.
 */
public final class MontesinosLink {

    private final List<int[]> tangles;

    private MontesinosLink(List<int[]> tangles) {
        this.tangles = tangles;
    }

    /**
     * The sum of no tangles, to which {@link #plus} adds.
     *
     * @return an empty sum
     */
    public static MontesinosLink empty() {
        return new MontesinosLink(List.of());
    }

    /**
     * The sum with one more tangle at the right.
     *
     * @param beta numerator, any sign
     * @param alpha denominator, at least 1; 1 makes a row of beta crossings
     * @return the longer sum
     * @throws IllegalArgumentException if alpha is less than 1
     */
    public MontesinosLink plus(int beta, int alpha) {
        if (alpha < 1) {
            throw new IllegalArgumentException("the tangle " + beta + "/" + alpha + "; give a denominator of at least 1");
        }
        List<int[]> more = new ArrayList<>(tangles);
        more.add(FractionTerms.of(Math.abs((long) beta), alpha, beta < 0 ? -1 : 1));
        return new MontesinosLink(List.copyOf(more));
    }

    /**
     * The diagram of the closure.
     *
     * @return the diagram; its crossings are the sum of the terms of all regular continued fractions
     * @throws IllegalStateException if no tangle was added
     */
    public LinkDiagram closure() {
        if (tangles.isEmpty()) {
            throw new IllegalStateException("a sum of no tangles has no closure; add one first");
        }
        Wiring w = new Wiring();
        Tangle sum = Tangle.rational(w, tangles.get(0));
        for (int[] terms : tangles.subList(1, tangles.size())) {
            sum = sum.plus(Tangle.rational(w, terms));
        }
        sum.closeNumerator();
        return w.diagram();
    }
}
