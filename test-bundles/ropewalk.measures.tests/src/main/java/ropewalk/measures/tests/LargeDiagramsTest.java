package ropewalk.measures.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.Collections;
import java.util.Random;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.LinkDiagram;
import ropewalk.families.BraidClosure;
import ropewalk.families.ClosedChain;
import ropewalk.families.MontesinosLink;
import ropewalk.families.PretzelLink;
import ropewalk.families.SplitUnion;
import ropewalk.families.TorusLink;
import ropewalk.families.TwoBridgeLink;
import ropewalk.families.WheelClosure;
import ropewalk.invariant.catalogue.RankedMethod;

/** About two thousand crossings, values by closed formulas. */
class LargeDiagramsTest {

    private final Installed installed = new Installed();

    private void assertValue(String invariant, Object expected, LinkDiagram link) {
        for (RankedMethod method : installed.entry(invariant).methods()) {
            assertEquals(expected.toString(), Installed.exact(method, link).text(),
                    () -> method.id() + " of " + link);
        }
    }

    /** T(2, n): determinant n, H₁ = Z/n, signature 1 - n (Murasugi 1965), linking number n/2. */
    @Test
    void torusLinkOnTwoStrands() {
        LinkDiagram link = TorusLink.of(2, 2000);
        assertValue("determinant", 2000, link);
        assertValue("factors", "[2000]", link);
        assertValue("nullity", 0, link);
        assertValue("signature", -1999, link);
        assertValue("linking", "[[0,1000],[1000,0]]", link);
        assertValue("fox3", 3, link);
        assertValue("fox5", 25, link);
    }

    /** Brieskorn 1966: the pairs (i, j) by i/p + j/q; the determinant of T(p, q), p and q odd, is 1, else the odd one. */
    @Test
    void torusLinksOnMoreStrands() {
        for (int[] pq : new int[][] {{3, 1000}, {3, 1001}, {4, 667}, {7, 333}, {41, 49}}) {
            LinkDiagram link = TorusLink.of(pq[0], pq[1]);
            int p = pq[0];
            int q = pq[1];
            int signature = 0;
            for (int i = 1; i < p; i++) {
                for (int j = 1; j < q; j++) {
                    int twice = 2 * (i * q + j * p);
                    signature += twice > p * q && twice < 3 * p * q ? -1 : twice == p * q || twice == 3 * p * q ? 0 : 1;
                }
            }
            assertValue("signature", signature, link);
            assertValue("determinant", p % 2 == 0 ? q : q % 2 == 0 ? p : 1, link);
            assertValue("nullity", 0, link);
        }
    }

    /** Sedláček 1970: L₂ₙ - 2 spanning trees; Biggs 1999: their group is Z/F ⊕ Z/5F, n even; alternating: σ by Murasugi 1974. */
    @Test
    void wheel() {
        BigInteger[] fibonacci = fibonacci(2001);
        LinkDiagram link = WheelClosure.of(1000);
        BigInteger lucas = fibonacci[2001].add(fibonacci[1999]);
        assertValue("determinant", lucas.subtract(BigInteger.TWO), link);
        assertValue("factors", "[" + fibonacci[1000] + "," + fibonacci[1000].multiply(BigInteger.valueOf(5)) + "]", link);
        assertValue("nullity", 0, link);
        assertValue("signature", 0, link);
    }

    private static BigInteger[] fibonacci(int n) {
        BigInteger[] f = new BigInteger[n + 1];
        f[0] = BigInteger.ZERO;
        f[1] = BigInteger.ONE;
        for (int i = 2; i <= n; i++) {
            f[i] = f[i - 1].add(f[i - 2]);
        }
        return f;
    }

    /** The double branched cover of a two-bridge link is the lens space L(p, q) (Schubert 1956): H₁ = Z/p. */
    @Test
    void twoBridgeLinks() {
        Random random = new Random(41);
        for (int bound : new int[] {1, 4}) {
            int[] terms = new int[bound == 1 ? 2000 : 800];
            BigInteger p = BigInteger.ONE;          // p/q = a₁ + 1/(a₂ + …), built from the end
            BigInteger q = BigInteger.ZERO;
            for (int i = terms.length - 1; i >= 0; i--) {
                terms[i] = 1 + random.nextInt(bound);
                BigInteger above = p.multiply(BigInteger.valueOf(terms[i])).add(q);
                q = p;
                p = above;
            }
            LinkDiagram link = TwoBridgeLink.ofContinuedFraction(terms);
            assertValue("determinant", p, link);
            assertValue("factors", "[" + p + "]", link);
            assertValue("nullity", 0, link);
            for (int n : new int[] {3, 5, 7}) {
                assertValue("fox" + n, p.gcd(BigInteger.valueOf(n)).multiply(BigInteger.valueOf(n)), link);
            }
        }
    }

    /** |pq + qr + pr| (Goeritz 1933), and 0 for (3m, 6m, -2m). */
    @Test
    void pretzels() {
        assertValue("determinant", 701 * 651 + 651 * 649 + 701 * 649, PretzelLink.of(701, 651, 649));
        assertValue("determinant", Math.abs(901 * 650 - 650 * 449 - 901 * 449), PretzelLink.of(901, 650, -449));
        LinkDiagram zero = PretzelLink.of(546, 1092, -364);
        assertValue("determinant", 0, zero);
        assertValue("nullity", 1, zero);
    }

    /** |Σᵢ βᵢ Πⱼ αⱼ/αᵢ| (Montesinos 1973): the order of H₁ of the Seifert fibration (Seifert 1933). */
    @Test
    void montesinosLink() {
        MontesinosLink sum = MontesinosLink.empty();
        BigInteger numerator = BigInteger.ZERO;
        BigInteger denominator = BigInteger.ONE;
        Random random = new Random(43);
        for (int i = 0; i < 300; i++) {
            int alpha = 2 + random.nextInt(30);
            int beta = 1 + random.nextInt(alpha - 1);
            while (BigInteger.valueOf(alpha).gcd(BigInteger.valueOf(beta)).intValue() != 1) {
                beta = 1 + random.nextInt(alpha - 1);
            }
            int signed = random.nextBoolean() ? beta : -beta;
            sum = sum.plus(signed, alpha);
            BigInteger a = BigInteger.valueOf(alpha);
            numerator = numerator.multiply(a).add(denominator.multiply(BigInteger.valueOf(signed)));
            denominator = denominator.multiply(a);
        }
        assertValue("determinant", numerator.abs(), sum.closure());
    }

    /** A chain with a crossings of one sign and b of the other is T(2, a - b) after removals. */
    @Test
    void chainThatPullsApart() {
        int[] signs = new int[2000];
        for (int i = 0; i < signs.length; i++) {
            signs[i] = i % 2 == 0 ? 1 : -1;
        }
        LinkDiagram link = ClosedChain.of(signs);
        assertValue("determinant", 0, link);
        assertValue("factors", "[0]", link);
        assertValue("signature", 0, link);
        signs[1] = 1;
        assertValue("determinant", 2, ClosedChain.of(signs));
        assertValue("signature", -1, ClosedChain.of(signs));
    }

    /** Many pieces: 300 trefoils and 100 circles beside each other. */
    @Test
    void manyPieces() {
        LinkDiagram[] parts = new LinkDiagram[400];
        for (int i = 0; i < parts.length; i++) {
            parts[i] = i < 300 ? TorusLink.of(2, i % 3 == 0 ? -3 : 3) : SplitUnion.ofCircles(1);
        }
        LinkDiagram link = SplitUnion.of(parts);
        assertValue("determinant", 0, link);
        assertValue("nullity", 399, link);
        assertValue("signature", 100 * 2 - 200 * 2, link);
        assertValue("fox3", BigInteger.valueOf(3).pow(700), link);
        assertValue("fox5", BigInteger.valueOf(5).pow(400), link);
        String threes = "3,".repeat(300);
        String zeros = "0,".repeat(399);
        assertValue("factors", "[" + threes + zeros.substring(0, zeros.length() - 1) + "]", link);
    }

    /** A connected sum of figure-eight knots has as its double branched cover the sum of as many lens spaces L(5, 2). */
    @Test
    void connectedSumOfFigureEights() {
        LinkDiagram large = figureEights(450);
        assertValue("determinant", BigInteger.valueOf(5).pow(450), large);
        assertValue("fox5", BigInteger.valueOf(5).pow(451), large);
        assertValue("fox3", 3, large);
        assertValue("signature", 0, large);
        assertValue("factors", "[" + String.join(",", Collections.nCopies(80, "5")) + "]", figureEights(80));
    }

    private static LinkDiagram figureEights(int copies) {
        int[] word = new int[4 * copies];
        for (int i = 0; i < word.length; i++) {
            word[i] = i % 2 == 0 ? 1 + 2 * (i / 4) : -(2 + 2 * (i / 4));
        }
        return BraidClosure.of(2 * copies + 1, word);
    }
}
