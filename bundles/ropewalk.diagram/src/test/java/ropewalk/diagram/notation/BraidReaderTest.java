package ropewalk.diagram.notation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.Cases;
import ropewalk.diagram.Codes;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.Slow;

class BraidReaderTest {

    private final Refusals braid = new Refusals("braid", "3: 1 -2 1 -2");

    private static LinkDiagram read(String code) throws CodeException {
        return Codes.read("braid", code);
    }

    @Test
    void threePositiveLettersAreTheRightHandedTrefoil() throws CodeException {
        LinkDiagram d = read("2: 1 1 1");
        assertEquals(1, d.components());
        for (int c = 0; c < 3; c++) {
            assertEquals(1, d.sign(c));
        }
        // Drawn by hand from the top: edges 1 … 6 from the left strand's closing edge on.
        assertEquals(Codes.read("planar", "[[1,5,2,4],[5,3,6,2],[3,1,4,6]]"), d);
        assertEquals(d.mirrored().sign(0), read("2: -1 -1 -1").sign(0));
    }

    @Test
    void negativeLetter() throws CodeException {
        // One crossing: the strand from the upper left passes over. It starts left, comes out right, closes on the right.
        assertEquals(Codes.read("planar", "[[2,1,1,2]]"), read("2: -1"));
        assertEquals(Codes.read("planar", "[[1,1,2,2]]"), read("2: 1"));
        assertEquals(-1, read("2: -1").sign(0));
    }

    @Test
    void strandsWithoutLetters() throws CodeException {
        assertEquals(Codes.read("planar", "[[1],[2],[3]]"), read("3:"));
        assertEquals(Codes.read("planar", "[[1]]"), read(" 1 : "));
        LinkDiagram d = read("5: 2 2");
        assertEquals(5, d.components());
        assertEquals(-1, d.start(0));
        assertEquals(-1, d.start(3));
        assertEquals(-1, d.start(4));
        assertEquals(0, d.mate(d.start(1)), "the second strand comes into the first letter at the upper left");
        assertEquals(3, d.mate(d.start(2)), "the third at the upper right");
        assertEquals(1_000_000, read("1000000:").components());
    }

    @Test
    void separators() throws CodeException {
        LinkDiagram d = read("3: 1 -2 1 -2");
        for (String code : new String[] {"3:1,-2,1,-2", "3 :\n1\t-2\r\n 1  -2 ", "3: 1 , -2 ,1, -2"}) {
            assertEquals(d, read(code), code);
        }
    }

    @Test
    void refusals() throws CodeException {
        braid.refused("^", "number of strands", "end of the code");
        braid.refused("^: 1", "number of strands", "found ':'");
        braid.refused("^-2: 1", "number of strands", "found '-'");
        braid.refused("^0: 1", "0 strands", "at least 1");
        braid.refused("^1000000000: 1", "above 1000000");
        braid.refused("^1000001:", "above 1000000");
        braid.refused("^18446744073709551618: 1", "above 1000000");       // 2^64 + 2
        braid.refused("^03: 1", "leading 0");
        braid.refused("3^", "':' is expected", "end of the code");
        braid.refused("3 ^1 2", "':' is expected", "found '1'");
        braid.refused("3^.0: 1", "':' is expected", "found '.'");
        braid.refused("3: 1 ^0", "letter 0", "from 1 to 2 and from -1 to -2");
        braid.refused("3: 1 ^-0", "letter 0");
        braid.refused("3: 1 ^3", "letter 3 is out of range", "from 1 to 2 and from -1 to -2");
        braid.refused("3: 1 ^-3 1", "letter -3 is out of range");
        braid.refused("2: ^2", "letter 2", "are 1 and -1");
        braid.refused("1: ^1", "letter 1", "a braid of 1 strand has no letters");
        braid.refused("3: ^4294967297", "letter 4294967297 is out of range");
        braid.refused("3: ^-18446744073709551617 1", "letter -1844674407370955161… is out of range");
        braid.refused("3: ^" + "9".repeat(100_000), "is out of range");
        braid.refused("3: 1 ^01", "leading 0");
        braid.refused("3: 1 ^+2", "found '+'", "without '+'");
        braid.refused("3: 1 -^ 2", "after '-'", "found ' '");
        braid.refused("3: 1 -^-2", "after '-'", "found '-'");
        braid.refused("3: 1 -^", "after '-'", "end of the code");
        braid.refused("3: 1^-2", "a blank or ','", "found '-'");
        braid.refused("3: 1^.5", "a blank or ','", "found '.'");
        braid.refused("3: 1 ^x", "a letter is expected, found 'x'");
        braid.refused("3: 1,^,2", "a letter is expected, found ','");
        braid.refused("3: ^,1", "a letter is expected, found ','");
        braid.refused("3: 1, ^", "after ','", "end of the code");
        braid.refused("3: 1 ^\0", "found byte 0");
        braid.refused("3: 1 ^−2", "found byte 226");                      // a typographic minus
        braid.refused("3: ^[1 2]", "found '['");
    }

    /** The closure by labels that are merged, written as planar code. */
    private static String planar(int n, int[] word, Random random) {
        int edges = n;
        int[] at = IntStream.range(0, n + 1).toArray();         // name of the edge piece at each position
        List<int[]> corners = new ArrayList<>();                // upper left, lower left, lower right, upper right
        for (int letter : word) {
            int i = Math.abs(letter);
            int left = ++edges;
            int right = ++edges;
            corners.add(new int[] {at[i], left, right, at[i + 1]});
            at[i] = left;
            at[i + 1] = right;
        }
        int[] label = IntStream.range(0, edges + 1).toArray();
        for (int p = 1; p <= n; p++) {
            for (int e = 1; e <= edges; e++) {
                if (label[e] == at[p] && at[p] != p) {
                    label[e] = p;                               // closed: the bottom edge is the top edge
                }
            }
        }
        int[] order = new int[edges + 1];
        int next = 1 + random.nextInt(3);
        StringBuilder circles = new StringBuilder();
        for (int p = 1; p <= n; p++) {
            if (order[p] != 0) {
                continue;
            }
            int e = p;
            int letter = -1;
            boolean met = false;
            do {
                order[e] = next;
                next += 1 + random.nextInt(3);
                boolean found = false;
                for (int step = 1; step <= word.length && !found; step++) {
                    int c = Math.floorMod(letter + step, word.length);
                    int[] corner = corners.get(c);
                    boolean left = label[corner[0]] == e;
                    if (left || label[corner[3]] == e) {
                        e = label[corner[left ? 2 : 1]];
                        letter = c;
                        found = true;
                        met = true;
                    }
                }
            } while (e != p && met);
            if (!met) {
                circles.append(",[").append(order[p]).append(']');
            }
        }
        StringBuilder code = new StringBuilder();
        for (int c = 0; c < word.length; c++) {
            int[] k = corners.get(c);
            int shift = word[c] > 0 ? 0 : 3;
            code.append(",[").append(IntStream.range(0, 4).mapToObj(i -> String.valueOf(order[label[k[(i + shift) % 4]]]))
                    .collect(Collectors.joining(","))).append(']');
        }
        return "[" + code.append(circles).substring(1) + "]";
    }

    @Test
    void randomWordsAgainstLabels() {
        Cases.run(9_000, 400, 25, (random, size) -> {
            int n = 2 + random.nextInt(6);
            int[] word = random.ints(random.nextInt(size + 1), 1, n).map(i -> random.nextBoolean() ? i : -i).toArray();
            String code = n + ": " + IntStream.of(word).mapToObj(String::valueOf).collect(Collectors.joining(" "));
            LinkDiagram d = read(code);
            String planar = planar(n, word, random);
            LinkDiagram slow = Codes.read("planar", planar);
            for (int c = 0; c < word.length; c++) {     // straight from the definition
                assertEquals(Integer.signum(word[c]), d.sign(c), code);
            }
            assertEquals(d.components(), slow.components(), code + " " + planar);
            if (!hasFreeDirection(d)) {
                assertEquals(slow, d, code + " " + planar);
            }
        });
    }

    /** Two edges, over at both crossings: planar code does not say which way such a component runs. */
    private static boolean hasFreeDirection(LinkDiagram d) {
        for (int i = 0; i < d.components(); i++) {
            int s = d.start(i);
            if (s >= 0 && d.next(d.next(s)) == s && LinkDiagram.isOver(s) && LinkDiagram.isOver(d.next(s))) {
                return true;
            }
        }
        return false;
    }

    @Test
    void fullTwistsLinkEveryPairOnce() throws CodeException {
        for (int n = 2; n <= 7; n++) {
            String twist = IntStream.range(1, n).mapToObj(String::valueOf).collect(Collectors.joining(" "));
            LinkDiagram d = read(n + ": " + (twist + " ").repeat(n));
            assertEquals(n, d.components());
            assertEquals(n * (n - 1) / 2, Slow.linking(d).size());
            Slow.linking(d).values().forEach(twice -> assertEquals(2, twice));
        }
    }

    @Test
    void aBatchOfManyWordsWithOneReader() throws CodeException {
        CodeReader reader = Notations.reader("braid").orElseThrow();
        LinkBatch.Builder batch = new LinkBatch.Builder();
        String[] words = {"3: 1 -2 1 -2", "2: 1 1 1", "900:", "1:", "6: 1 2 3 4 5", "2: -1"};
        for (int i = 0; i < 60_000; i++) {
            byte[] word = words[i % words.length].getBytes(StandardCharsets.US_ASCII);
            reader.read(word, 0, word.length, batch);
        }
        LinkBatch links = batch.build();
        for (int i = 0; i < words.length; i++) {
            assertEquals(read(words[i]), links.link(i));
            assertEquals(links.link(i), links.link(60_000 - words.length + i));
        }
        assertNotEquals(links.link(0), links.link(1));
    }

    @Test
    void aMillionLetters() throws CodeException {
        LinkDiagram d = read("1000: " + "999 -1 500 ".repeat(333_334));
        assertEquals(1_000_002, d.crossings());
        assertTrue(d.components() >= 997);
    }
}
