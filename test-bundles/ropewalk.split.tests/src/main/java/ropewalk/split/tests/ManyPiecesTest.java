package ropewalk.split.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import ropewalk.diagram.LinkDiagram;
import ropewalk.families.BraidClosure;
import ropewalk.families.SplitUnion;
import ropewalk.split.Partition;
import ropewalk.split.Verdict;

/** Links of very many components: nothing may be gone through once for each piece. */
class ManyPiecesTest {

    private static final double SECONDS = 60;

    private final Detection detection = Detection.installed();

    @Test
    void aHundredThousandLooseCircles() {
        Verdict verdict = detection.raw(SplitUnion.ofCircles(100_000), SECONDS);
        assertEquals("split", verdict.word());
        assertTrue(verdict.isDecided());
        assertEquals(Partition.singles(100_000), verdict.apart());
        assertEquals(1, verdict.arguments().size());
    }

    @Test
    void aThousandChainsSideBySideInOneBraid() {
        int chains = 1000;
        int[] word = new int[2 * chains];
        int[] marks = new int[2 * chains];
        for (int i = 0; i < chains; i++) {
            word[2 * i] = 2 * i + 1;
            word[2 * i + 1] = 2 * i + 1;
            marks[2 * i] = i;
            marks[2 * i + 1] = i;
        }
        LinkDiagram link = BraidClosure.of(2 * chains, word);
        Verdict verdict = detection.raw(link, SECONDS);
        assertTrue(verdict.isDecided(), verdict.limit());
        assertEquals(Partition.of(marks), verdict.apart());
        assertEquals(1 + chains, verdict.arguments().size());
        // Each chain's argument speaks of that chain alone.
        assertEquals("[[1,2]]", verdict.arguments().get(1).claim());
        assertEquals("[[3,4]]", verdict.arguments().get(2).claim());
    }
}
