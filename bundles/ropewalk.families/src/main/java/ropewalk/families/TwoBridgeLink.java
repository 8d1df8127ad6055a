package ropewalk.families;

import java.math.BigInteger;
import ropewalk.diagram.LinkDiagram;

/**
 * Two-bridge links: the numerator closure of the rational tangle p/q = a₁ + 1/(a₂ + 1/(… + 1/aₙ)). p/1 is the positive
 * torus link T(2, p), 5/2 the figure-eight knot, 8/3 the Whitehead link. The determinant is |p|, the double branched
 * cover is the lens space L(p, q) (Schubert 1956, Conway 1970); a link of two components if p is even, and p/q and p/q′
 * are the same knot if q ≡ q′ or q q′ ≡ 1 modulo p.
 */
public final class TwoBridgeLink {

    private TwoBridgeLink() {
    }

    /**
     * The alternating diagram of p/q, its crossings the sum of the terms of the regular continued fraction.
     *
     * @param p the determinant; a negative one gives the mirror image
     * @param q prime to p, taken modulo p
     * @return the diagram; 0/1 is the unlink of two components, 1/q the unknot
     * @throws IllegalArgumentException if p and q have a common factor
     */
    public static LinkDiagram of(int p, int q) {
        if (!BigInteger.valueOf(p).gcd(BigInteger.valueOf(q)).equals(BigInteger.ONE)) {
            throw new IllegalArgumentException("the fraction " + p + "/" + q + " can be reduced, which a two-bridge link "
                    + "cannot; give numbers without common factor");
        }
        if (p == 0) {
            return ofContinuedFraction(0);
        }
        long a = Math.abs((long) p);
        long b = Math.floorMod((long) q, a);
        return ofContinuedFraction(FractionTerms.of(a, b == 0 ? 1 : b, Integer.signum(p)));
    }

    /**
     * The diagram with |a₁| + … + |aₙ| crossings.
     *
     * @param terms a₁, …, aₙ, of any sign; all positive or all negative gives an alternating diagram. Conway's notation
     *        "a b c" has the same terms
     * @return the diagram
     * @throws IllegalArgumentException if there is no term
     */
    public static LinkDiagram ofContinuedFraction(int... terms) {
        if (terms.length == 0) {
            throw new IllegalArgumentException("a continued fraction without terms; give at least one");
        }
        Wiring w = new Wiring();
        Tangle.rational(w, terms).closeNumerator();
        return w.diagram();
    }
}
