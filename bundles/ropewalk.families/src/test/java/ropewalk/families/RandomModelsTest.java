package ropewalk.families;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.notation.CodeWriter;
import ropewalk.diagram.notation.Notations;

class RandomModelsTest {

    private static final long SEED = 20260101;

    /** Two 64-bit values that Vigna's published splitmix64.c gives for state 1234567 (recalled). */
    @Test
    void generatorIsSplitmix64() {
        SplitMix random = new SplitMix(1234567);
        assertEquals(6457827717110365317L, random.next());
        assertEquals(3203168211198807973L, random.next());
    }

    /** Breadth-first numbering from the root end: equal for two rooted maps exactly if they are the same. */
    private static String code(int[] mates, int root) {
        int n = mates.length / 4;
        int[] entry = new int[n];
        int[] number = new int[n];
        Arrays.fill(number, -1);
        int met = 0;
        number[root >> 2] = met;
        entry[met++] = root;
        StringBuilder code = new StringBuilder();
        for (int k = 0; k < met; k++) {
            for (int i = 0; i < 4; i++) {
                int end = entry[k] & ~3 | (entry[k] + i & 3);
                int far = mates[end];
                if (number[far >> 2] < 0) {
                    number[far >> 2] = met;
                    entry[met++] = far;
                }
                int place = number[far >> 2];
                code.append(place).append('.').append((far - entry[place]) & 3).append(' ');
            }
        }
        return code.toString();
    }

    /** χ² against equal frequencies of 2·3ⁿ(2n)!/(n!(n+2)!) rooted maps (Tutte 1963): 2, 9, 54, 378, 2916. */
    @Test
    void rootedMapsAreEquallyFrequent() {
        long[] count = {0, 2, 9, 54, 378, 2916};
        for (int n = 1; n < count.length; n++) {
            RandomPlaneDiagrams stream = new RandomPlaneDiagrams(SEED + n);
            Map<String, Integer> met = new HashMap<>();
            long draws = 60 * count[n];
            for (long i = 0; i < draws; i++) {
                int[] map = stream.nextMap(n);
                met.merge(code(map, stream.root()), 1, Integer::sum);
            }
            assertEquals(count[n], met.size(), "maps of " + n + " crossings, seed " + (SEED + n));
            assertEvenly(met, count[n], draws, "maps of " + n + " crossings");
        }
    }

    private static void assertEvenly(Map<String, Integer> met, long classes, long draws, String what) {
        double expected = (double) draws / classes;
        double chi = 0;
        for (int m : met.values()) {
            chi += (m - expected) * (m - expected) / expected;
        }
        double degrees = classes - 1;
        // 4 standard deviations above the mean; for few degrees the tail is heavier, hence the constant
        assertTrue(chi < degrees + 4 * Math.sqrt(2 * degrees) + 8, what + ": chi squared " + chi + " with " + degrees
                + " degrees of freedom, seed " + SEED);
        assertTrue(degrees < 50 || chi > degrees - 4 * Math.sqrt(2 * degrees), what + " are too even: " + chi);
    }

    @Test
    void crossingsAreFairCoins() {
        RandomPlaneDiagrams stream = new RandomPlaneDiagrams(SEED);
        Map<String, Integer> met = new HashMap<>();
        int draws = 64_000;
        for (int i = 0; i < draws; i++) {
            LinkDiagram d = stream.next(6);
            StringBuilder signs = new StringBuilder();
            for (int c = 0; c < 6; c++) {
                signs.append(d.sign(c) > 0 ? '+' : '-');
            }
            met.merge(signs.toString(), 1, Integer::sum);
        }
        assertEquals(64, met.size());
        assertEvenly(met, 64, draws, "signs");
    }

    @Test
    void diagramsAreConnectedOfTheAskedSize() {
        RandomPlaneDiagrams stream = new RandomPlaneDiagrams(SEED);
        for (int n : new int[] {1, 2, 3, 10, 100, 5000, 7}) {
            LinkDiagram d = stream.next(n);
            assertEquals(n, d.crossings());
            assertEquals(1, ConnectedPieces.of(d).count());
        }
        assertThrows(IllegalArgumentException.class, () -> RandomDiagrams.plane(1, 0));
    }

    @Test
    void bytesAreThoseOfThePlanarWriter() {
        CodeWriter writer = Notations.writer("planar").orElseThrow();
        RandomPlaneDiagrams diagrams = new RandomPlaneDiagrams(SEED);
        RandomPlaneDiagrams bytes = new RandomPlaneDiagrams(SEED);
        byte[] out = new byte[10_000];
        for (int i = 0; i < 3000; i++) {
            int n = 1 + i % 70;
            int end = bytes.nextPlanar(n, out, 5);
            assertTrue(end - 5 <= RandomPlaneDiagrams.planarRoom(n));
            assertEquals(writer.write(diagrams.next(n)), new String(out, 5, end - 5, StandardCharsets.US_ASCII),
                    "diagram " + i + " of seed " + SEED);
        }
        assertThrows(IllegalArgumentException.class, () -> bytes.nextPlanar(1000, new byte[100], 0));
    }

    @Test
    void seedsDecide() {
        assertEquals(RandomDiagrams.plane(5, 40), RandomDiagrams.plane(5, 40));
        assertTrue(!RandomDiagrams.plane(5, 40).equals(RandomDiagrams.plane(6, 40)));
        assertArrayEquals(RandomDiagrams.braidWord(3, 5, 50), RandomDiagrams.braidWord(3, 5, 50));
        LinkDiagram braid = RandomDiagrams.braid(3, 5, 50);
        assertEquals(50, braid.crossings());
    }

    @Test
    void lettersOfRandomBraidsAreEquallyFrequent() {
        Map<String, Integer> met = new HashMap<>();
        for (int letter : RandomDiagrams.braidWord(SEED, 6, 100_000)) {
            met.merge(String.valueOf(letter), 1, Integer::sum);
        }
        assertEquals(10, met.size());
        assertEvenly(met, 10, 100_000, "letters");
    }
}
