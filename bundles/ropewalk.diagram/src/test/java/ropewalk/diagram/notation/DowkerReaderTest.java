package ropewalk.diagram.notation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.Cases;
import ropewalk.diagram.Codes;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.NotADiagramException;
import ropewalk.diagram.RandomDiagrams;
import ropewalk.diagram.Slow;

class DowkerReaderTest {

    private final Refusals dowker = new Refusals("dowker", "4 6 8 2");

    private static LinkDiagram read(String code) throws CodeException {
        return Codes.read("dowker", code);
    }

    private static int writhe(LinkDiagram d) {
        return IntStream.range(0, d.crossings()).map(d::sign).sum();
    }

    @Test
    void smallKnots() throws CodeException {
        LinkDiagram trefoil = read("4 6 2");
        assertEquals(3, writhe(trefoil));
        // Passage 1 runs over crossing 1, from edge 1 to edge 2, and meets 4, from edge 4 to edge 5, and so on round.
        assertEquals(Codes.read("planar", "[[4,2,5,1],[6,4,1,3],[2,6,3,5]]"), trefoil);
        LinkDiagram behind = read("-4 -6 -2");
        assertEquals(3, writhe(behind));
        assertEquals(Codes.read("planar", "[[1,5,2,4],[3,1,4,6],[5,3,6,2]]"), behind);
        LinkDiagram eight = read("4 6 8 2");
        assertEquals(4, eight.crossings());
        assertEquals(0, writhe(eight));
        assertEquals(1, Slow.colouringDimension(eight, 3));
        assertEquals(2, Slow.colouringDimension(eight, 5));         // determinant 5 (Rolfsen 1976, recalled)
        assertEquals(2, Slow.colouringDimension(trefoil, 3));
        assertEquals(1, read("2").crossings());
        assertEquals(1, writhe(read("2")));
        assertEquals(1, writhe(read("-2")));
        assertEquals(1, Slow.colouringDimension(read("4 -6 2"), 3));        // not alternating: the unknot
    }

    @Test
    void determinantsOfTheTable() throws CodeException {
        // Sequences of prime alternating knots (Dowker and Thistlethwaite 1983, recalled); determinants from Rolfsen 1976
        // (recalled): 5_1 5, 5_2 7, 7_1 7. A prime p divides the determinant where colourings modulo p are not constant.
        String[] codes = {"6 8 10 2 4", "4 8 10 2 6", "8 10 12 14 2 4 6"};
        int[] determinants = {5, 7, 7};
        for (int i = 0; i < codes.length; i++) {
            for (int p : new int[] {2, 3, 5, 7, 11, 13}) {
                assertEquals(determinants[i] == p ? 2 : 1, Slow.colouringDimension(read(codes[i]), p), codes[i] + " mod " + p);
            }
        }
    }

    @Test
    void forms() throws CodeException {
        LinkDiagram d = read("4 6 -8 2");
        for (String code : new String[] {"4,6,-8,2", "[4, 6, -8, 2]", " ( 4 6 -8 2 ) ", "{4 ,6 ,-8\n,2}\n"}) {
            assertEquals(d, read(code), code);
        }
    }

    @Test
    void refusals() throws CodeException {
        dowker.refused("^", "an even number is expected", "end of the code");
        dowker.refused("[^]", "an even number is expected", "found ']'");
        dowker.refused("4 ^7 2", "number 7 is odd", "even partners");
        dowker.refused("4 ^-7 2", "number -7 is odd");
        dowker.refused("4 6 ^4", "number 4 occurs a second time", "2 is missing");
        dowker.refused("4 -6 2 ^6", "number 6 occurs a second time", "8 is missing");
        dowker.refused("4 ^8 2", "number 8 is out of range", "2 to 6");
        dowker.refused("4 ^-8 2", "number -8 is out of range");
        dowker.refused("^4", "number 4 is out of range", "1 crossing has the number 2");
        dowker.refused("4 ^0 2", "number 0");
        dowker.refused("4 ^-0 2", "number 0");
        dowker.refused("4 ^4294967302 2", "number 4294967302");           // 2^32 + 6
        dowker.refused("4 ^18446744073709551622 2", "number 18446744073709551622");
        dowker.refused("4 ^" + "8".repeat(100_000) + " 2", "number 88888888888888888888…");
        dowker.refused("4 ^40002 2", "numbers above 40000 are not let pass", "20000 crossings");
        dowker.refused("4 ^06 2", "leading 0");
        dowker.refused("4 6^.0 2", "a number is expected, found '.'");
        dowker.refused("4 6^-2", "a blank or ','");
        dowker.refused("4 -^ 6 2", "after '-'");
        dowker.refused("4 ^+6 2", "found '+'");
        dowker.refused("4 6 ^x", "a number is expected, found 'x'");
        dowker.refused("4 6,^,2", "a number is expected, found ','");
        dowker.refused("4 6 2,^", "a number is expected", "end of the code");
        dowker.refused("[4 6 2^", "']' is expected", "end of the code");
        dowker.refused("[4 6 2^)", "']' is expected", "found ')'");
        dowker.refused("[4 6 2] ^8", "after the end");
        dowker.refused("4 6 2^]", "found ']'");
        dowker.refused("[^[4 6 2]]", "found '['");
        dowker.refused("4 6 ^\0", "found byte 0");
        dowker.refused("4 ^−6 2", "found byte 226");
    }

    private static boolean[] overs(int[] evens) {
        boolean[] over = new boolean[2 * evens.length];
        for (int c = 0; c < evens.length; c++) {
            over[2 * c] = evens[c] > 0;
            over[Math.abs(evens[c]) - 1] = evens[c] < 0;
        }
        return over;
    }

    /** Whether some choice of signs puts the sequence on the sphere, by trying all. */
    private static boolean realizable(int[] evens) {
        int n = evens.length;
        int[] at = new int[2 * n];
        for (int c = 0; c < n; c++) {
            at[2 * c] = c;
            at[Math.abs(evens[c]) - 1] = c;
        }
        boolean[] over = overs(evens);
        for (int choice = 0; choice < 1 << (n - 1); choice++) {
            byte[] signs = new byte[n];
            for (int c = 0; c < n; c++) {
                signs[c] = (byte) ((choice >> c & 1) == 0 ? 1 : -1);
            }
            int[] mates = new int[4 * n];
            for (int p = 0; p < 2 * n; p++) {
                int q = (p + 1) % (2 * n);
                int tail = 4 * at[p] + (over[p] ? 2 - signs[at[p]] : 2);
                int head = 4 * at[q] + (over[q] ? 2 + signs[at[q]] : 0);
                mates[tail] = head;
                mates[head] = tail;
            }
            try {
                LinkDiagram.of(mates, signs, new int[] {mates[4 * at[0] + (over[0] ? 2 + signs[at[0]] : 0)]});
                return true;
            } catch (NotADiagramException e) {
                assertEquals(NotADiagramException.Kind.NOT_PLANAR, e.kind());
            }
        }
        return false;
    }

    private static void permutations(List<Integer> start, List<Integer> rest, List<int[]> all) {
        if (rest.isEmpty()) {
            all.add(start.stream().mapToInt(i -> i).toArray());
        }
        for (Integer next : rest) {
            List<Integer> more = new ArrayList<>(start);
            more.add(next);
            List<Integer> others = new ArrayList<>(rest);
            others.remove(next);
            permutations(more, others, all);
        }
    }

    private static String text(int[] evens) {
        return IntStream.of(evens).mapToObj(String::valueOf).collect(Collectors.joining(" "));
    }

    @Test
    void allSequencesOfUpToSixCrossings() {
        Random random = new Random(4);
        for (int n = 1; n <= 6; n++) {
            List<int[]> all = new ArrayList<>();
            permutations(List.of(), IntStream.rangeClosed(1, n).mapToObj(i -> 2 * i).toList(), all);
            for (int[] evens : all) {
                for (int c = 0; c < n; c++) {
                    evens[c] *= random.nextBoolean() ? 1 : -1;
                }
                try {
                    assertSequence(evens, read(text(evens)));
                    assertTrue(realizable(evens), text(evens));
                } catch (CodeException e) {
                    assertTrue(e.getMessage().startsWith("no closed curve in the plane has this sequence"), e.getMessage());
                    assertTrue(!realizable(evens), text(evens));
                }
            }
        }
    }

    /** The diagram has the sequence, and the first crossing of every summand is positive. */
    private static void assertSequence(int[] evens, LinkDiagram d) {
        int n = evens.length;
        int[] at = new int[2 * n];
        boolean[] over = overs(evens);
        int[][] ends = new int[n][2];
        int e = d.start(0);
        for (int p = 0; p < 2 * n; p++) {
            at[p] = d.mate(e) / 4;
            ends[at[p]][p % 2] = p;
            assertEquals(over[p], LinkDiagram.isOver(d.mate(e)));
            e = d.next(e);
        }
        assertEquals(d.start(0), e);
        for (int c = 0; c < n; c++) {
            assertEquals(2 * c, ends[c][0], "crossings in the order of the sequence");
            assertEquals(Math.abs(evens[c]) - 1, ends[c][1]);
        }
        Slow.Classes summands = summands(ends);
        boolean[] met = new boolean[n];
        for (int c : at) {
            if (!met[summands.of(c)]) {
                met[summands.of(c)] = true;
                assertEquals(1, d.sign(c), "first of its summand: " + text(evens));
            }
        }
    }

    /** Crossings whose chords cross, merged pair by pair. */
    private static Slow.Classes summands(int[][] ends) {
        Slow.Classes summands = new Slow.Classes(ends.length);
        for (int[] a : ends) {
            for (int[] b : ends) {
                int low = Math.min(a[0], a[1]);
                int high = Math.max(a[0], a[1]);
                if (low < b[0] && b[0] < high != (low < b[1] && b[1] < high)) {
                    summands.merge(java.util.Arrays.asList(ends).indexOf(a), java.util.Arrays.asList(ends).indexOf(b));
                }
            }
        }
        return summands;
    }

    private static int[] sequence(LinkDiagram d, int start, int[] crossings, int[][] ends) {
        int n = d.crossings();
        int e = start;
        for (int p = 0; p < 2 * n; p++) {
            int in = d.mate(e);
            ends[in / 4][p % 2] = LinkDiagram.isOver(in) ? p + 1 : -(p + 1);
            crossings[p] = in / 4;
            e = d.next(e);
        }
        int[] evens = new int[n];
        for (int[] both : ends) {
            evens[(Math.abs(both[0]) - 1) / 2] = -both[1];
        }
        return evens;
    }

    @Test
    void randomKnots() {
        Cases.run(600, 300, 80, (random, vertices) -> {
            LinkDiagram d = RandomDiagrams.knot(random, vertices);
            int size = d.crossings();
            assertEquals(1, d.components());
            int start = d.start(0);
            for (int i = random.nextInt(2 * size); i > 0; i--) {
                start = d.next(start);
            }
            int[] crossings = new int[2 * size];
            int[][] ends = new int[size][2];
            int[] evens = sequence(d, start, crossings, ends);
            LinkDiagram again = read(text(evens));
            assertSequence(evens, again);
            // The same crossings up to turning over whole summands.
            for (int[] both : ends) {
                both[0] = Math.abs(both[0]);
                both[1] = Math.abs(both[1]);
            }
            Slow.Classes summands = summands(ends);
            int[] flip = new int[size];
            for (int c = 0; c < size; c++) {
                int same = d.sign(c) * again.sign((ends[c][0] - 1) / 2);
                int summand = summands.of(c);
                assertTrue(flip[summand] == 0 || flip[summand] == same, text(evens));
                flip[summand] = same;
            }
        });
    }

    @Test
    void randomSequencesThatNoCurveHas() {
        Cases.run(800, 200, 80, (random, size) -> {
            List<Integer> evens = new ArrayList<>(IntStream.rangeClosed(1, size + 6).mapToObj(i -> 2 * i).toList());
            Collections.shuffle(evens, random);
            int[] sequence = evens.stream().mapToInt(i -> i).toArray();
            try {
                assertSequence(sequence, read(text(sequence)));
            } catch (CodeException e) {
                assertTrue(e.getMessage().contains("hold a subdivision of K"), e.getMessage());
            }
        });
    }

    @Test
    void largeSequences() throws CodeException {
        int n = 3_001;                      // the torus knot (2, n): the partner of i is i + n
        int[] evens = new int[n];
        for (int c = 0; c < n; c++) {
            evens[c] = (2 * c + n) % (2 * n) + 1;
        }
        LinkDiagram torus = read(text(evens));
        assertEquals(n, writhe(torus));
        Cases.run(31, 2, 3_000, (random, size) -> {
            LinkDiagram d = RandomDiagrams.knot(random, 4_000);
            int more = d.crossings();
            int[] sequence = sequence(d, d.start(0), new int[2 * more], new int[more][2]);
            LinkDiagram again = read(text(sequence));
            assertEquals(more, again.crossings());
            assertEquals(text(sequence), text(sequence(again, again.start(0), new int[2 * more], new int[more][2])));
        });
        List<Integer> shuffled = new ArrayList<>(IntStream.rangeClosed(1, 3_000).mapToObj(i -> 2 * i).toList());
        Collections.shuffle(shuffled, new Random(2));
        String code = shuffled.stream().map(String::valueOf).collect(Collectors.joining(" "));
        CodeException e = org.junit.jupiter.api.Assertions.assertThrows(CodeException.class, () -> read(code));
        assertTrue(e.getMessage().length() < 300, e.getMessage());
    }
}
