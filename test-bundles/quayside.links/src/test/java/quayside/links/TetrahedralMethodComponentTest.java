package quayside.links;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value.IntegerValue;

class TetrahedralMethodComponentTest {
    private static final long SEED = 20_260_108;

    private final TetrahedralMethodComponent method = new TetrahedralMethodComponent();
    private final TetrahedralInvariantComponent invariant = new TetrahedralInvariantComponent();

    /**
     * Carter, Jelsovsky, Kamada, Langford and Saito, Trans. AMS 355 (2003) give the state sums 4 + 12t of the trefoil and
     * the figure-eight knot and 16 + 48t of 8₁₈ over this quandle (recalled); t = 1 is the number of colourings. For a
     * knot with Alexander polynomial Δ it is 4 where Δ(ω) is not 0 modulo 2.
     */
    @Test
    void isThatOfThePapers() {
        assertEquals(4, count(new Braid(1)));
        assertEquals(16, count(new Braid(2, 1, 1, 1)));
        assertEquals(16, count(new Braid(2, -1, -1, -1)));
        assertEquals(16, count(new Braid(3, 1, -2, 1, -2)));
        assertEquals(64, count(new Braid(3, 1, -2, 1, -2, 1, -2, 1, -2)));
        assertEquals(4, count(new Braid(2, 1, 1, 1, 1, 1)));                // 5₁: Δ = t⁴ − t³ + t² − t + 1 (recalled)
        assertEquals(4, count(new Braid(3, 1, 1, 1, 2, -1, 2)));            // 5₂: Δ = 2t² − 3t + 2 (recalled)
        assertEquals(4, count(new Braid(2, 1, 1, 1, 1, 1, 1, 1)));          // 7₁: Δ = (t⁷ + 1)/(t + 1) (recalled)
        // The Hopf link by hand: x = ωx + (1 + ω)y gives x = y.
        assertEquals(4, count(new Braid(2, 1, 1)));
        // Borromean rings: Δ = (t₁ − 1)(t₂ − 1)(t₃ − 1) up to units (recalled), not 0 at ω.
        assertEquals(4, count(new Braid(3, 1, -2, 1, -2, 1, -2)));
        assertEquals(64, count(new Braid(3)));
    }

    /** The torus link (2, 2k) has Δ = 1 + s + … + sᵏ⁻¹, s = t₁t₂ (recalled): ω² if parallel, 1 if one is reversed. */
    @Test
    void dependsOnTheOrientationOfAComponent() {
        assertTrue(invariant.needsOrientation());
        LinkDiagram four = new Braid(2, 1, 1, 1, 1).closure();
        LinkDiagram six = new Braid(2, 1, 1, 1, 1, 1, 1).closure();
        boolean[] one = {true, false};
        assertEquals(4, count(four));
        assertEquals(16, count(four.reversed(one)));
        assertEquals(16, count(six));
        assertEquals(4, count(six.reversed(one)));
    }

    /** A second route without the field: rotations of the tetrahedron, all ways to colour the arcs tried out. */
    @Test
    void agreesWithTryingAllColours() {
        Random random = new Random(SEED);
        for (int round = 0; round < 400; round++) {
            Braid braid = Braid.random(random, 4, 7);
            boolean[] some = new boolean[braid.closure().components()];
            for (int i = 0; i < some.length; i++) {
                some[i] = random.nextBoolean();
            }
            LinkDiagram link = braid.closure().reversed(some);
            assertEquals(TetrahedronColourings.count(link), count(link),
                    () -> "seed " + SEED + ", " + braid + ", reversed " + Arrays.toString(some));
        }
    }

    /** The link of the README, which the determinant and linking number leave undecided. */
    @Test
    void theExampleOfTheReadme() {
        LinkDiagram link = new Braid(5, 1, 2, 2, -1, -3, -4, 2, 1, 3, 2, 2, -4, 3).closure();
        assertEquals(2, link.components());
        assertEquals(4, TetrahedronColourings.count(link));
        assertEquals(4, count(link));
    }

    @Test
    void markovMovesKeepIt() {
        Random random = new Random(SEED + 1);
        int aboveFour = 0;
        for (int round = 0; round < 150; round++) {
            Braid braid = Braid.random(random, 5, 25);
            long count = count(braid);
            aboveFour += count > 4 ? 1 : 0;
            Braid moved = braid;
            for (int move = 0; move < 20; move++) {
                moved = moved.moved(random);
                String after = "seed " + (SEED + 1) + ", " + braid + " became " + moved;
                assertEquals(count, count(moved), after);
            }
        }
        assertTrue(aboveFour > 30, "only " + aboveFour + " braids with more than the constant colourings");
    }

    @Test
    void mirrorImageAndReversalDoWhatTheInvariantSays() {
        Random random = new Random(SEED + 2);
        for (int round = 0; round < 200; round++) {
            Braid braid = Braid.random(random, 5, 25);
            LinkDiagram link = braid.closure();
            IntegerValue value = IntegerValue.of(count(link));
            assertEquals(invariant.underMirrorImage().orElseThrow().apply(value), IntegerValue.of(count(link.mirrored())),
                    () -> "seed " + (SEED + 2) + ", mirror image of " + braid);
            assertEquals(invariant.underReversal().orElseThrow().apply(value), IntegerValue.of(count(link.reversed())),
                    () -> "seed " + (SEED + 2) + ", reverse of " + braid);
        }
    }

    @Test
    void splitUnionsObeyTheLaw() {
        SplitLaw<IntegerValue> law = invariant.splitLaw().orElseThrow();
        Random random = new Random(SEED + 3);
        for (int round = 0; round < 150; round++) {
            Braid one = Braid.random(random, 4, 15);
            Braid two = Braid.random(random, 4, 15);
            LinkDiagram left = one.closure();
            LinkDiagram right = two.closure();
            boolean[] sides = new boolean[left.components() + right.components()];
            Arrays.fill(sides, 0, left.components(), true);
            IntegerValue whole = IntegerValue.of(count(left.splitUnion(right)));
            assertEquals(law.union(IntegerValue.of(count(left)), IntegerValue.of(count(right)), new Bipartition(sides)),
                    whole, () -> "seed " + (SEED + 3) + ", " + one + " beside " + two);
            assertTrue(law.admitsSplit(whole));
        }
        assertTrue(!law.admitsSplit(IntegerValue.of(4)));
    }

    @Test
    void stopsAtItsEffort() {
        Effort effort = Effort.ofSeconds(60);
        effort.cancel();
        assertThrows(Effort.SpentException.class, () -> method.measure(new Braid(2, 1, 1, 1).closure(), effort));
    }

    private long count(Braid braid) {
        return count(braid.closure());
    }

    private long count(LinkDiagram link) {
        Outcome<IntegerValue> outcome = method.measure(link, Effort.ofSeconds(30));
        assertInstanceOf(Outcome.Exact.class, outcome);
        return ((Outcome.Exact<IntegerValue>) outcome).value().value().longValueExact();
    }
}
