package ropewalk.diagram.notation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.Cases;
import ropewalk.diagram.Codes;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.RandomDiagrams;
import ropewalk.diagram.Regions;

class PlanarReaderTest {

    private static LinkDiagram read(String code) throws CodeException {
        return Codes.read("planar", code);
    }

    @Test
    void overStrandFromEntryFourToEntryTwoIsPositive() throws CodeException {
        LinkDiagram trefoil = read("[[1,5,2,4],[3,1,4,6],[5,3,6,2]]");
        assertEquals(3, trefoil.crossings());
        assertEquals(1, trefoil.components());
        for (int c = 0; c < 3; c++) {
            assertEquals(1, trefoil.sign(c));
        }
        // Label 1 leaves crossing 2 at its entry 2 and comes into crossing 1 at its entry 1.
        assertEquals(5, trefoil.start(0));
        assertEquals(0, trefoil.mate(5));
        LinkDiagram left = read("[[1,4,2,5],[3,6,4,1],[5,2,6,3]]");
        assertEquals(-1, left.sign(0));
        // The strand over crossing 1 goes from entry 2, label 4, to entry 4, label 5.
        assertNotEquals(trefoil, left);
    }

    @Test
    void oneCrossingLoops() throws CodeException {
        for (String code : new String[] {"[[1,1,2,2]]", "[[2,2,1,1]]", "[[1,2,2,1]]", "[[2,1,1,2]]"}) {
            LinkDiagram loop = read(code);
            assertEquals(1, loop.crossings(), code);
            assertEquals(1, loop.components(), code);
            assertEquals(3, Regions.of(loop).count(), code);
            int in = loop.mate(loop.start(0));
            assertEquals(1, code.charAt(2 + 2 * (in & 3)) - '0', "label 1 comes in: " + code);
        }
        // Under from 1 to 2, then over from 2 to 1: label 2 is entry 4 in the first, entry 2 in the other.
        assertEquals(1, read("[[1,1,2,2]]").sign(0));
        assertEquals(-1, read("[[1,2,2,1]]").sign(0));
    }

    @Test
    void nugatoryCrossingsAndSeveralPieces() throws CodeException {
        LinkDiagram chain = read("[[8,1,1,2],[2,4,3,3],[4,6,5,5],[6,8,7,7]]");
        assertEquals(4, chain.crossings());
        assertEquals(1, chain.components());
        LinkDiagram pieces = read("[[3],[1,1,2,2],[6,6,5,5],[4]]");
        assertEquals(4, pieces.components());
        assertEquals(-1, pieces.start(1));
        assertEquals(-1, pieces.start(2));
        assertTrue(pieces.start(0) >= 0 && pieces.start(3) >= 4);
    }

    @Test
    void gapsAndCirclesBetween() throws CodeException {
        LinkDiagram dense = read("[[1,4,2,3],[3,2,4,1]]");
        LinkDiagram wide = read("[[1,2147483647,20,300],[300,20,2147483647,1]]");
        assertEquals(dense, wide);
        LinkDiagram hopf = read("[[10],[20,80,30,70],[50],[70,30,80,20],[2147483647],[5]]");
        assertEquals(6, hopf.components());
        int[] circles = {0, 1, 3, 5};
        for (int i : circles) {
            assertEquals(-1, hopf.start(i));
        }
        assertEquals(0, hopf.component(0) - 2);
        assertEquals(4, hopf.component(1));
    }

    @Test
    void overOnlyComponentOfTwoEdgesRunsOutOfTheFirstCrossing() throws CodeException {
        // Labels 3 and 4 pass over 1, 2; nothing in them says which way.
        String[] codes = {"[[1,3,2,4],[2,3,1,4]]", "[[1,4,2,3],[2,4,1,3]]"};
        for (String code : codes) {
            LinkDiagram d = read(code);
            int start = d.start(1);
            assertEquals(0, start / 4, code);
            assertEquals('3', code.charAt(2 + 2 * (start & 3)), code);
            assertEquals(0, d.sign(0) + d.sign(1), code);
            String written = Codes.planar(d);
            assertEquals(d, read(written), written);
        }
    }

    @Test
    void blanksAndLineBreaksAreLetPass() throws CodeException {
        assertEquals(read("[[1,5,2,4],[3,1,4,6],[5,3,6,2]]"),
                read(" [\n[ 1 ,\t5,2 , 4]\r\n, [3,1,4,6],[5,3,6,2\n]\n]\n "));
    }

    @Test
    void torusBraidOfAMillionCrossings() throws CodeException {
        int n = 1_000_000;
        for (int step : new int[] {1, 1000}) {
            StringBuilder code = new StringBuilder(40 * n);
            for (int k = 0; k < n; k++) {
                int a = k + 1;
                int b = n + k + 1;
                int a1 = k + 1 == n ? 1 : a + 1;
                int b1 = k + 1 == n ? n + 1 : b + 1;
                boolean even = k % 2 == 0;
                code.append(k == 0 ? "[[" : ",[").append(step * (even ? a : b)).append(',')
                        .append(step * (even ? b1 : a1)).append(',').append(step * (even ? a1 : b1)).append(',')
                        .append(step * (even ? b : a)).append(']');
            }
            LinkDiagram d = read(code.append(']').toString());
            assertEquals(n, d.crossings());
            assertEquals(2, d.components());
            int sum = 0;
            for (int c = 0; c < n; c++) {
                sum += d.sign(c);
            }
            assertEquals(n, sum);
            assertEquals(n + 2, Regions.of(d).count());
            assertEquals(d, read(Codes.planar(d)));
        }
    }

    @Test
    void aMillionKinksInPieces() throws CodeException {
        int n = 1_000_000;
        StringBuilder code = new StringBuilder(40 * n);
        String virtual = "[[1000000007,1000000006,1000000008,1000000005],[1000000008,1000000007,1000000005,1000000006]]";
        for (int k = 0; k < n; k++) {
            int a = 2 * k + 1;
            code.append(k == 0 ? "[[" : ",[").append(a).append(',').append(a).append(',').append(a + 1).append(',')
                    .append(a + 1).append(']');
        }
        int end = code.length();
        assertEquals(n, read(code + "]").components());
        byte[] bad = (code + "," + virtual.substring(1)).getBytes(StandardCharsets.UTF_8);
        CodeException e = org.junit.jupiter.api.Assertions.assertThrows(CodeException.class,
                () -> Notations.reader("planar").orElseThrow().read(bad, 0, bad.length, new LinkBatch.Builder()));
        assertEquals(end + 2, e.offset(), e.getMessage());
    }

    @Test
    void writtenAndReadAgainIsTheSame() {
        Cases.run(5_000, 400, 60, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            String code = Codes.planar(d);
            LinkDiagram again = read(code);
            assertEquals(code, Codes.planar(again));
            boolean moved = false;          // the start of a two-edge component over at both crossings may move
            for (int i = 0; i < d.components(); i++) {
                moved |= d.start(i) != again.start(i);
                if (d.start(i) != again.start(i)) {
                    int s = d.start(i);
                    assertEquals(again.start(i), d.next(s));
                    assertEquals(s, d.next(d.next(s)));
                    assertTrue(LinkDiagram.isOver(s) && LinkDiagram.isOver(d.next(s)));
                }
            }
            if (!moved) {
                assertEquals(d, again);
                assertEquals(d.hashCode(), again.hashCode());
            }
        });
    }
}
