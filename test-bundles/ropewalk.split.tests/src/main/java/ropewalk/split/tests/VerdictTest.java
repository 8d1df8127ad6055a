package ropewalk.split.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.LinkDiagram;
import ropewalk.families.BraidClosure;
import ropewalk.families.RandomDiagrams;
import ropewalk.families.Scrambled;
import ropewalk.families.SplitUnion;
import ropewalk.families.TorusLink;
import ropewalk.oracle.PlainLink;
import ropewalk.oracle.Renumbered;
import ropewalk.split.Partition;
import ropewalk.split.Verdict;

/** Verdicts on links whose pieces are known by construction. None may be wrong; undecided is never wrong. */
class VerdictTest {

    private final Detection detection = Detection.installed();

    @Test
    void splitUnionsSideBySideAreDecided() {
        for (int seed = 0; seed < 120; seed++) {
            Unions.Known known = Unions.random(seed);
            try {
                Verdict verdict = detection.decide(known.link());
                assertEquals("split", verdict.word());
                assertEquals(known.pieces(), verdict.apart());
                assertEquals(known.pieces(), verdict.together());
                assertTrue(verdict.isDecided());
            } catch (AssertionError | RuntimeException e) {
                throw Unions.at("union of seed " + seed, known.link(), e);
            }
        }
    }

    @Test
    void scrambledSplitUnionsAreNeverCalledNotSplit() {
        int decided = 0;
        int undecided = 0;
        for (int seed = 0; seed < 160; seed++) {
            Unions.Known known = Unions.random(seed);
            LinkDiagram link = Scrambled.of(seed, known.link(), seed % 8 * 25);
            try {
                Verdict verdict = detection.decide(link);
                assertNotEquals("not split", verdict.word());
                assertTrue(Detection.refines(verdict.together(), known.pieces()), () -> "together " + verdict.together()
                        + " across the pieces " + known.pieces());
                assertTrue(Detection.refines(known.pieces(), verdict.apart()), () -> "apart " + verdict.apart()
                        + " within the pieces " + known.pieces());
                decided += verdict.isDecided() ? 1 : 0;
                undecided += verdict.word().equals("undecided") ? 1 : 0;
            } catch (AssertionError | RuntimeException e) {
                throw Unions.at("scrambled union of seed " + seed, link, e);
            }
        }
        assertTrue(decided > 20, decided + " decided, " + undecided + " undecided");
    }

    @Test
    void determinantNotZeroMeansNotSplit() {
        int met = 0;
        for (int seed = 0; met < 150; seed++) {
            LinkDiagram link = Unions.nonSplit(new Random(1000 + seed));
            if (link.components() > 1) {
                met++;
                LinkDiagram scrambled = seed % 3 == 0 ? Scrambled.of(seed, link, 20) : link;
                try {
                    assertEquals("not split", detection.decide(scrambled).word());
                } catch (AssertionError | RuntimeException e) {
                    throw Unions.at("link of seed " + (1000 + seed), scrambled, e);
                }
            }
        }
    }

    /** Components joined by a path of non-zero linking numbers lie on one side of every sphere. */
    @Test
    void linkedComponentsStayTogether() {
        for (int seed = 0; seed < 200; seed++) {
            LinkDiagram link = RandomDiagrams.braid(seed, 3 + seed % 4, 6 + seed % 30);
            if (link.components() < 2) {
                continue;
            }
            try {
                Partition linked = PlainLaws.tiedBy("linking", PlainLaws.value("linking", link), link.components());
                Verdict verdict = detection.decide(link);
                assertTrue(Detection.refines(linked, verdict.together()), linked + " linked, together "
                        + verdict.together());
            } catch (AssertionError | RuntimeException e) {
                throw Unions.at("braid(" + seed + ")", link, e);
            }
        }
    }

    /** m pieces need nullity at least m - 1 (the law of the nullity). */
    @Test
    void randomDiagramsHaveNoMorePiecesThanTheNullityAllows() {
        for (int seed = 0; seed < 200; seed++) {
            LinkDiagram link = RandomDiagrams.plane(seed, 1 + seed % 40);
            try {
                Verdict verdict = detection.decide(link);
                assertTrue(verdict.apart().classes() - 1 <= new PlainLink(link).nullity(), verdict.apart()::text);
            } catch (AssertionError | RuntimeException e) {
                throw Unions.at("plane(" + seed + ")", link, e);
            }
        }
    }

    @Test
    void linksThatDoNotSplitAreNeverCalledSplit() {
        for (Map.Entry<String, LinkDiagram> hard : Hard.links().entrySet()) {
            for (int round = 0; round < 4; round++) {
                LinkDiagram link = round == 0 ? hard.getValue() : Scrambled.of(round, hard.getValue(), 8 * round);
                try {
                    assertNotEquals("split", detection.decide(link).word());
                } catch (AssertionError | RuntimeException e) {
                    throw Unions.at(hard.getKey() + " in round " + round, link, e);
                }
            }
        }
    }

    @Test
    void linksThatDoNotSplitStayWholeBesideOthers() {
        List<LinkDiagram> hard = new ArrayList<>(Hard.links().values());
        for (int i = 0; i < hard.size(); i++) {
            LinkDiagram left = hard.get(i);
            LinkDiagram right = i % 3 == 0 ? SplitUnion.ofCircles(2) : hard.get((i + 5) % hard.size());
            int[] marks = new int[left.components() + right.components()];
            for (int c = 0; c < right.components(); c++) {
                marks[left.components() + c] = i % 3 == 0 ? 1 + c : 1;
            }
            Partition pieces = Partition.of(marks);
            LinkDiagram union = left.splitUnion(right);
            for (LinkDiagram link : List.of(union, Scrambled.of(i, union, 10))) {
                try {
                    Verdict verdict = detection.decide(link);
                    assertTrue(Detection.refines(pieces, verdict.apart()), verdict.apart()::text);
                    assertTrue(Detection.refines(verdict.together(), pieces), verdict.together()::text);
                } catch (AssertionError | RuntimeException e) {
                    throw Unions.at("union " + i, link, e);
                }
            }
        }
    }

    /** What the installed laws are promised to decide (mathematics of the split laws; determinants not 1 of the companions). */
    @Test
    void zeroFramedCablesOfKnotsWithDeterminantNotOneAreDecided() {
        assertEquals("not split", detection.decide(Hard.links().get("cable of the trefoil")).word());
        assertEquals("not split", detection.decide(Hard.links().get("cable of the figure-eight knot")).word());
        assertEquals("undecided", detection.decide(Hard.undecided()).word());
    }

    @Test
    void piecesFollowTheComponents() {
        for (int seed = 0; seed < 150; seed++) {
            Random random = new Random(seed);
            Unions.Known known = Unions.random(seed);
            LinkDiagram link = seed % 2 == 0 ? known.link() : Scrambled.of(seed, known.link(), 10);
            Renumbered other = Renumbered.components(link, random);
            try {
                Verdict before = detection.decide(link);
                Verdict after = detection.decide(other.diagram());
                assertEquals(permuted(before.together(), other.newNumber()), after.together(), "together");
                assertEquals(permuted(before.apart(), other.newNumber()), after.apart(), "apart");
            } catch (AssertionError | RuntimeException e) {
                throw Unions.at("union of seed " + seed, link, e);
            }
        }
    }

    private static Partition permuted(Partition partition, int[] newNumber) {
        int[] marks = new int[newNumber.length];
        for (int i = 0; i < marks.length; i++) {
            marks[newNumber[i]] = partition.classOf(i);
        }
        return Partition.of(marks);
    }

    /** Orientation and mirror image are no part of the question. */
    @Test
    void mirrorImageHasTheSamePieces() {
        for (int seed = 0; seed < 80; seed++) {
            LinkDiagram link = Scrambled.of(seed, Unions.random(seed).link(), seed % 20);
            Verdict before = detection.decide(link);
            Verdict after = detection.decide(link.mirrored());
            assertEquals(before.together(), after.together(), "seed " + seed);
            assertEquals(before.apart(), after.apart(), "seed " + seed);
        }
    }

    @Test
    void knotsHaveOnePiece() {
        for (LinkDiagram knot : List.of(SplitUnion.ofCircles(1), TorusLink.of(2, 3), BraidClosure.of(2, 1))) {
            Verdict verdict = detection.decide(knot);
            assertEquals("not split", verdict.word());
            assertEquals("[[1]]", verdict.apart().text());
            assertTrue(verdict.isDecided());
        }
    }

    @Test
    void manyThreadsGetTheSameVerdicts() throws Exception {
        List<LinkDiagram> links = new ArrayList<>();
        List<String> alone = new ArrayList<>();
        for (int seed = 0; seed < 40; seed++) {
            LinkDiagram link = Scrambled.of(seed, Unions.random(seed).link(), 5);
            links.add(link);
            alone.add(detection.raw(link, 30).toString());
        }
        ExecutorService threads = Executors.newFixedThreadPool(4);
        try {
            Callable<List<String>> all = () -> links.stream().map(l -> detection.raw(l, 30).toString()).toList();
            for (Future<List<String>> each : threads.invokeAll(List.of(all, all, all, all))) {
                assertEquals(alone, each.get());
            }
        } finally {
            threads.shutdownNow();
        }
    }
}
