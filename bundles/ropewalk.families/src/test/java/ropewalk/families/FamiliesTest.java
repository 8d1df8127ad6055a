package ropewalk.families;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.Shading;

/** Closed formulas for the determinant, by a slow route of the test's own; crossings, components, signs. */
class FamiliesTest {

    private static void assertDeterminant(long expected, LinkDiagram d, String what) {
        assertEquals(BigInteger.valueOf(expected), SlowColouring.determinant(d), what);
    }

    private static int writhe(LinkDiagram d) {
        int sum = 0;
        for (int c = 0; c < d.crossings(); c++) {
            sum += d.sign(c);
        }
        return sum;
    }

    @Test
    void positiveLettersArePositiveCrossings() {
        LinkDiagram trefoil = BraidClosure.of(2, 1, 1, 1);
        assertEquals(3, writhe(trefoil));
        assertEquals(-2, writhe(BraidClosure.of(4, -1, 2, -3, -2)));
        assertEquals(trefoil.mirrored().sign(0), BraidClosure.of(2, -1, -1, -1).sign(0));
    }

    @Test
    void closedBraidsAreNumberedByTheLeftmostStrandAtTheTop() {
        LinkDiagram d = BraidClosure.of(4, 1, 3, 3);
        assertEquals(3, d.components());
        assertEquals(List.of(List.of(0, 0, 0), List.of(0, 0, 1), List.of(0, 1, 0)), SlowColouring.linking(d));
        LinkDiagram threeAndCircles = BraidClosure.of(5, -4, -4);
        assertEquals(-1, threeAndCircles.start(0));
        assertEquals(4, ConnectedPieces.of(threeAndCircles).count());
        assertEquals(3, BraidClosure.of(3).components());
    }

    @Test
    void lettersOutOfRangeAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> BraidClosure.of(2, 2));
        assertThrows(IllegalArgumentException.class, () -> BraidClosure.of(2, 0));
        assertThrows(IllegalArgumentException.class, () -> BraidClosure.of(0));
        assertThrows(IllegalArgumentException.class, () -> TwoBridgeLink.of(6, 2));
    }

    @Test
    void torusLinks() {
        for (int n = 1; n <= 12; n++) {
            assertDeterminant(n, TorusLink.of(2, n), "T(2," + n + ")");
            assertDeterminant(n, TorusLink.of(n, 2), "T(" + n + ",2)");
            assertEquals(-n, writhe(TorusLink.of(2, -n)));
        }
        // recalled: for odd p and q 1, for p even and q odd q (from the Alexander polynomial of a torus knot at -1)
        for (int p = 2; p <= 6; p++) {
            for (int q = 3; q <= 7; q++) {
                LinkDiagram d = TorusLink.of(p, q);
                int g = BigInteger.valueOf(p).gcd(BigInteger.valueOf(q)).intValue();
                assertEquals(g, d.components());
                if (g == 1) {
                    int value = p % 2 == 0 ? q : q % 2 == 0 ? p : 1;
                    assertDeterminant(value, d, "T(" + p + "," + q + ")");
                }
            }
        }
        assertDeterminant(3, TorusLink.of(3, 4), "T(3,4)");
        assertDeterminant(1, TorusLink.of(3, 5), "T(3,5)");
    }

    @Test
    void pretzels() {
        for (int p = -4; p <= 4; p++) {
            for (int q = -4; q <= 4; q++) {
                for (int r = -4; r <= 4; r++) {
                    assertDeterminant(Math.abs(p * q + q * r + p * r), PretzelLink.of(p, q, r),
                            "pretzel " + p + " " + q + " " + r);
                }
            }
        }
        assertDeterminant(0, PretzelLink.of(3, 6, -2), "pretzel (3, 6, -2)");
        assertDeterminant(0, PretzelLink.of(4, 4, -2), "pretzel (4, 4, -2)");
        assertEquals(3, writhe(PretzelLink.of(1, 1, 1)));
        assertEquals(2, PretzelLink.of(3, 6, -2).components());
        assertEquals(3, PretzelLink.of(4, 4, -2).components());
        assertEquals(3, writhe(PretzelLink.of(3)), "an unknot whose strands run against each other in its one column");
    }

    @Test
    void twoBridgeLinks() {
        for (int p = 1; p <= 24; p++) {
            for (int q = -p; q <= p; q++) {
                if (BigInteger.valueOf(p).gcd(BigInteger.valueOf(q)).intValue() == 1) {
                    LinkDiagram d = TwoBridgeLink.of(p, q);
                    assertDeterminant(p, d, p + "/" + q);
                    assertEquals(p % 2 == 0 ? 2 : 1, d.components(), p + "/" + q);
                    assertTrue(SlowColouring.factors(d).size() <= 1, "a lens space has cyclic homology");
                }
            }
        }
        assertDeterminant(0, TwoBridgeLink.of(0, 1), "0/1");
        assertEquals(5, writhe(TwoBridgeLink.of(5, 1)));
        assertEquals(-5, writhe(TwoBridgeLink.of(-5, 1)));
        assertEquals(0, writhe(TwoBridgeLink.of(5, 2)));
        assertDeterminant(30, TwoBridgeLink.ofContinuedFraction(4, 3, 2), "4 + 1/(3 + 1/2) = 30/7");
        assertDeterminant(4, TwoBridgeLink.ofContinuedFraction(2, -2, 2), "2 + 1/(-2 + 1/2) = 4/3");
    }

    @Test
    void montesinosLinks() {
        int[][][] sums = {{{1, 3}, {1, 3}, {1, 2}}, {{2, 3}, {1, 2}, {2, 5}}, {{-2, 3}, {1, 2}, {-3, 7}, {1, 4}},
            {{1, 3}, {1, 6}, {-1, 2}}};
        for (int[][] sum : sums) {
            MontesinosLink m = MontesinosLink.empty();
            long numerator = 0;
            long denominator = 1;
            for (int[] f : sum) {
                m = m.plus(f[0], f[1]);
                numerator = numerator * f[1] + denominator * f[0];
                denominator *= f[1];
            }
            assertDeterminant(Math.abs(numerator), m.closure(), Arrays.deepToString(sum));
        }
    }

    @Test
    void wheels() {
        long[] lucas = {2, 1};                          // L_0, L_1
        for (int n = 1; n <= 9; n++) {
            lucas = new long[] {lucas[0] + lucas[1], lucas[0] + 2 * lucas[1]};      // L_2n, L_2n+1
            assertDeterminant(lucas[0] - 2, WheelClosure.of(n), "wheel " + n);
            assertEquals(n % 3 == 0 ? 3 : 1, WheelClosure.of(n).components());
        }
    }

    @Test
    void chainsOfFour() {
        for (int bits = 0; bits < 16; bits++) {
            int[] signs = new int[4];
            int sum = 0;
            for (int i = 0; i < 4; i++) {
                signs[i] = (bits >> i & 1) == 1 ? 1 : -1;
                sum += signs[i];
            }
            LinkDiagram d = ClosedChain.of(signs);
            assertDeterminant(Math.abs(sum), d, "chain " + Arrays.toString(signs));
            Shading shading = Shading.of(d);
            for (int c = 0; c < 4; c++) {
                // four regions between the crossings against two: these are the shaded ones
                assertEquals(signs[c], shading.isShadedAt(4 * c + 1) ? 1 : -1, "chessboard sign");
            }
        }
    }

    @Test
    void satellites() {
        LinkDiagram[] knots = {SplitUnion.ofCircles(1), BraidClosure.of(2, 1, 1, 1), BraidClosure.of(2, -1, -1, -1),
            WheelClosure.of(2), TwoBridgeLink.of(7, 2), BraidClosure.of(2, 1)};
        for (LinkDiagram knot : knots) {
            BigInteger own = SlowColouring.determinant(knot);
            for (int f = -3; f <= 3; f++) {
                LinkDiagram cable = Satellite.cable(knot, f);
                assertEquals(List.of(List.of(0, f), List.of(f, 0)), SlowColouring.linking(cable));
                // The pattern is T(2, 2f); for two strands only it and the companion at (-1)^2 = 1 count (Seifert 1950).
                assertDeterminant(2 * Math.abs(f), cable, "cable " + f + " of " + own);
                LinkDiagram doubled = Satellite.whiteheadDouble(knot, f);
                assertEquals(1, doubled.components());
                // Only the framing counts (Seifert 1950), so take the unknot: the two-bridge knot 2f + 1/2.
                assertDeterminant(Math.abs(4 * f + 1), doubled, "Whitehead double " + f);
            }
            assertDeterminant(1, Satellite.whiteheadDouble(knot, 0), "untwisted Whitehead double");
            LinkDiagram bing = Satellite.bingDouble(knot, 0);
            assertEquals(List.of(List.of(0, 0), List.of(0, 0)), SlowColouring.linking(bing));
            assertEquals(List.of(BigInteger.ZERO), SlowColouring.factors(bing), "as for the unlink");
        }
        assertThrows(IllegalArgumentException.class, () -> Satellite.cable(SplitUnion.ofCircles(2), 0));
    }

    @Test
    void splitUnions() {
        LinkDiagram d = SplitUnion.of(BraidClosure.of(2, 1, 1), SplitUnion.ofCircles(2), WheelClosure.of(3));
        assertEquals(7, d.components());
        assertEquals(4, ConnectedPieces.of(d).count());
        assertDeterminant(0, d, "split");
        // Hopf link Z/2, three joins of pieces, Borromean rings of order 16
        assertEquals(BigInteger.valueOf(32), SlowColouring.factors(d).stream().filter(f -> f.signum() > 0)
                .reduce(BigInteger.ONE, BigInteger::multiply));
        assertEquals(3, SlowColouring.factors(d).stream().filter(f -> f.signum() == 0).count());
    }
}
