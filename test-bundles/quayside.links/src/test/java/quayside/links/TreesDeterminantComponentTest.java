package quayside.links;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.Arcs;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerValue;

class TreesDeterminantComponentTest {
    private static final long SEED = 20_260_107;
    private static final long PRIME = 2_147_483_647;

    private final TreesDeterminantComponent method = new TreesDeterminantComponent();

    @Test
    void isThatOfTheTables() {
        assertEquals(3, determinant(new Braid(2, 1, 1, 1)));          // trefoil: Rolfsen 1976 (recalled)
        assertEquals(3, determinant(new Braid(2, -1, -1, -1)));
        assertEquals(5, determinant(new Braid(3, 1, -2, 1, -2)));     // figure-eight knot: Rolfsen 1976 (recalled)
        assertEquals(2, determinant(new Braid(2, 1, 1)));             // Hopf link
        for (int n = 1; n < 12; n++) {                                // torus link (2, n): n (recalled)
            int[] word = new int[n];
            java.util.Arrays.fill(word, 1);
            assertEquals(n, determinant(new Braid(2, word)));
        }
    }

    /** Closures of (σ₁σ₂⁻¹)ⁿ have a wheel as chessboard graph; it has L(2n) − 2 trees (Sedláček 1970, recalled). */
    @Test
    void isThatOfWheels() {
        long[] lucas = {2, 1};
        for (int n = 1; n <= 12; n++) {
            for (int i = 0; i < 2; i++) {
                lucas = new long[] {lucas[1], lucas[0] + lucas[1]};
            }
            int[] word = IntStream.range(0, 2 * n).map(i -> i % 2 == 0 ? 1 : -2).toArray();
            assertEquals(lucas[0] - 2, determinant(new Braid(3, word)), "n = " + n);
        }
    }

    @Test
    void unknotsWithAndWithoutCrossings() {
        assertEquals(1, determinant(new Braid(1)));
        assertEquals(1, determinant(new Braid(2, 1)));
        assertEquals(1, determinant(new Braid(2, -1)));
        assertEquals(1, determinant(new Braid(3, 1, -2)));
    }

    @Test
    void saysWhatItDoesNotCover() {
        assertReason("this one has 2 pieces", new Braid(2));
        assertReason("this one has 2 pieces", new Braid(3, 1, 1));
        assertReason("covers alternating diagrams", new Braid(2, 1, -1));
        assertReason("covers alternating diagrams", new Braid(3, 1, 2, 1, 2, 1, 2, 1, 2));   // torus knot (3, 4)
        assertReason("0 pieces", new Braid(1).closure().sublink(new boolean[1]));
    }

    /** Another matrix and another elimination: a minor of the colouring matrix modulo a prime is ± the determinant. */
    @Test
    void agreesWithTheColouringMatrix() {
        Random random = new Random(SEED);
        for (int round = 0; round < 300; round++) {
            int strands = 2 + random.nextInt(5);
            int[] word = IntStream.range(0, strands - 1 + random.nextInt(30)).map(i ->
                    i < strands - 1 ? i + 1 : 1 + random.nextInt(strands - 1)).map(i -> i % 2 == 0 ? -i : i).toArray();
            Braid braid = new Braid(strands, word);
            LinkDiagram link = braid.closure();
            long minor = colouringMinor(link);
            long trees = determinant(braid);
            assertTrue(minor == trees % PRIME || minor == (PRIME - trees % PRIME) % PRIME,
                    () -> "seed " + SEED + ", " + braid + ": " + trees + " trees, minor " + minor);
        }
    }

    private static long colouringMinor(LinkDiagram link) {
        Arcs arcs = Arcs.of(link);
        int n = link.crossings() - 1;
        long[][] a = new long[n + 1][n + 1];
        for (int c = 0; c <= n; c++) {
            a[c][arcs.over(c)] += 2;
            a[c][arcs.ofDart(4 * c)] += PRIME - 1;
            a[c][arcs.ofDart(4 * c + 2)] += PRIME - 1;
        }
        long determinant = 1;
        for (int k = 0; k < n; k++) {
            int pivot = k;
            while (pivot < n && a[pivot][k] % PRIME == 0) {
                pivot++;
            }
            if (pivot == n) {
                return 0;
            }
            long[] row = a[pivot];
            a[pivot] = a[k];
            a[k] = row;
            determinant = determinant * (row[k] % PRIME) % PRIME;
            long inverse = BigInteger.valueOf(row[k]).modInverse(BigInteger.valueOf(PRIME)).longValueExact();
            for (int i = k + 1; i < n; i++) {
                long factor = PRIME - a[i][k] % PRIME * inverse % PRIME;
                for (int j = k; j < n; j++) {
                    a[i][j] = (a[i][j] + factor * (row[j] % PRIME)) % PRIME;
                }
            }
        }
        return determinant;
    }

    private long determinant(Braid braid) {
        Outcome<IntegerValue> outcome = method.measure(braid.closure(), Effort.ofSeconds(5));
        assertInstanceOf(Outcome.Exact.class, outcome, () -> braid + ": " + outcome);
        return ((Outcome.Exact<IntegerValue>) outcome).value().value().longValueExact();
    }

    private void assertReason(String part, Braid braid) {
        assertReason(part, braid.closure());
    }

    private void assertReason(String part, LinkDiagram link) {
        Outcome<IntegerValue> outcome = method.measure(link, Effort.ofSeconds(5));
        assertInstanceOf(Outcome.NotApplicable.class, outcome);
        String reason = ((Outcome.NotApplicable<IntegerValue>) outcome).reason();
        assertTrue(reason.contains(part), reason);
    }
}
