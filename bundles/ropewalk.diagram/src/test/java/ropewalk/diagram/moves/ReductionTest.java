package ropewalk.diagram.moves;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.Arcs;
import ropewalk.diagram.Cases;
import ropewalk.diagram.Codes;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.RandomDiagrams;
import ropewalk.diagram.Slow;

class ReductionTest {

    private static Reduction reduced(String notation, String code) throws Exception {
        LinkDiagram d = Codes.read(notation, code);
        Reduction reduction = Reduction.of(d);
        check(d, reduction);
        return reduction;
    }

    /** Replayed, made one by one, and nothing is left to do. */
    private static void check(LinkDiagram d, Reduction reduction) {
        LinkDiagram result = reduction.result();
        assertEquals(result, reduction.replay(d));
        assertEquals(result, oneByOne(d, reduction.moves()));
        for (int e = 0; e < result.darts(); e++) {
            assertEquals(oneByOne(d, reduction.moves()).component(e), result.component(e));
        }
        assertNothingLeft(result);
        assertEquals(d.components(), result.components());
        assertEquals(Slow.linking(d), Slow.linking(result));
        for (int i = 0; i < d.components(); i++) {
            assertEquals(result.start(i) < 0, reduction.circles().contains(i));
        }
        assertSame(result, Reduction.of(result).result());
    }

    private static LinkDiagram oneByOne(LinkDiagram d, List<Move> moves) {
        List<Integer> there = new ArrayList<>();
        for (int c = 0; c < d.crossings(); c++) {
            there.add(c);
        }
        LinkDiagram now = d;
        for (Move move : moves) {
            String[] words = move.toString().split(" ");
            StringBuilder renumbered = new StringBuilder(words[0]);
            for (int i = 1; i < words.length; i++) {
                renumbered.append(' ').append(there.indexOf(Integer.parseInt(words[i]) - 1) + 1);
            }
            now = Move.parse(renumbered.toString()).apply(now);
            for (int i = 1; i < words.length; i++) {
                there.remove((Integer) (Integer.parseInt(words[i]) - 1));
            }
        }
        return now;
    }

    /** No region of one corner; none of two at two crossings where one strand is over at both. */
    private static void assertNothingLeft(LinkDiagram d) {
        Slow.Classes regions = Slow.regions(d);
        Map<Integer, List<Integer>> corners = new HashMap<>();
        for (int e = 0; e < d.darts(); e++) {
            corners.computeIfAbsent(regions.of(e), r -> new ArrayList<>()).add(e);
        }
        for (List<Integer> corner : corners.values()) {
            assertTrue(corner.size() > 1, () -> "a kink is left in " + Codes.planar(d));
            if (corner.size() == 2 && corner.get(0) / 4 != corner.get(1) / 4) {
                int e = corner.get(0);
                assertEquals(corner.get(1) / 4, d.mate(e) / 4);
                assertNotEquals(LinkDiagram.isOver(e), LinkDiagram.isOver(d.mate(e)), () -> "bigon in " + Codes.planar(d));
            }
        }
    }

    @Test
    void unknotsAndUnlinks() throws Exception {
        for (String word : new String[] {"2: 1", "2: -1", "3: 1 2", "3: 1 -2", "5: 4 3 2 1", "4: 1 -2 3", "3: 1 2 -2 2"}) {
            Reduction r = reduced("braid", word);
            assertEquals(Codes.read("planar", "[[1]]"), r.result(), word);
            assertEquals(List.of(0), r.circles());
        }
        for (String word : new String[] {"2: 1 -1", "2: -1 1 1 -1", "3: 1 2 -2 -1 1", "3: 2 1 -1"}) {
            assertEquals(Codes.read("planar", "[[1],[2]]"), reduced("braid", word).result(), word);
        }
        assertEquals(List.of("R2 1 2"), reduced("braid", "2: 1 -1").moves().stream().map(Move::toString).toList());
        assertEquals(List.of(0, 1, 2), reduced("braid", "3: 1 -2 2 -1").circles());
        assertEquals(0, reduced("planar", "[[1,1,2,2],[6,6,5,5],[9]]").result().crossings());
        assertEquals(0, reduced("planar", "[[8,1,1,2],[2,4,3,3],[4,6,5,5],[6,8,7,7]]").result().crossings());
    }

    @Test
    void nothingToDo() throws Exception {
        for (String word : new String[] {"2: 1 1", "2: 1 1 1", "3: 1 -2 1 -2", "3: 1 -2 1 -2 1 -2", "2:"}) {
            LinkDiagram d = Codes.read("braid", word);
            assertSame(d, Reduction.of(d).result());
            assertEquals(List.of(), Reduction.of(d).moves());
        }
        // The nugatory crossing between two clasps is no kink.
        assertEquals(5, reduced("braid", "4: 1 1 2 3 3").result().crossings());
    }

    @Test
    void conjugatesFallOff() throws Exception {
        Reduction r = reduced("braid", "4: 3 2 -1 3 1 1 1 -3 1 -2 -3");
        assertEquals(3, r.result().crossings());
        assertEquals(2, r.circles().size());
    }

    @Test
    void randomDiagrams() {
        int[] total = new int[2];
        Cases.run(20_000, 600, 60, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            Reduction r = Reduction.of(d);
            check(d, r);
            total[0] += r.moves().size();
            total[1] += r.moves().stream().filter(m -> m instanceof Move.R2Removal).count();
            for (int p : new int[] {2, 3, 5, 7}) {
                assertEquals(Slow.colouringDimension(d, p), Slow.colouringDimension(r.result(), p), () -> Codes.planar(d));
            }
        });
        assertTrue(total[0] > 1_000 && total[1] > 300, "the cases are empty: " + total[0] + " " + total[1]);
    }

    @Test
    void coloursOfSmallDiagramsByTryingAll() {
        Cases.run(30_000, 300, 8, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            if (Arcs.of(d).count() <= 10) {
                assertEquals(Slow.threeColourings(d), Slow.threeColourings(Reduction.of(d).result()));
            }
        });
    }

    @Test
    void falseMovesAreRefused() {
        Cases.run(40_000, 300, 40, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            List<Move> moves = new ArrayList<>(Reduction.of(d).moves());
            int a = random.nextInt(d.crossings() + 1);
            int b = random.nextInt(d.crossings() + 1);
            Move odd = a == b ? new Move.R1Removal(a) : new Move.R2Removal(Math.min(a, b), Math.max(a, b));
            moves.add(random.nextInt(moves.size() + 1), odd);
            // Whatever the list, the two ways of making it agree, on refusal too.
            LinkDiagram plain = null;
            try {
                plain = oneByOne(d, moves);
            } catch (IllegalArgumentException e) {
                assertThrows(IllegalArgumentException.class, () -> new Reduction(d, moves).replay(d));
            }
            if (plain != null) {
                assertEquals(plain, new Reduction(d, moves).replay(d));
            }
        });
    }

    @Test
    void everyPairOfCrossingsIsJudgedAlike() {
        Cases.run(50_000, 150, 25, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            for (int a = 0; a < d.crossings(); a++) {
                for (int b = a; b < d.crossings(); b++) {
                    Move move = a == b ? new Move.R1Removal(a) : new Move.R2Removal(a, b);
                    LinkDiagram plain;
                    try {
                        plain = move.apply(d);
                    } catch (IllegalArgumentException e) {
                        assertThrows(IllegalArgumentException.class, () -> new Reduction(d, List.of(move)).replay(d));
                        continue;
                    }
                    assertEquals(plain, new Reduction(d, List.of(move)).replay(d), move + " in " + Codes.planar(d));
                    assertEquals(Slow.linking(d), Slow.linking(plain));
                    assertEquals(Slow.colouringDimension(d, 3), Slow.colouringDimension(plain, 3));
                }
            }
        });
    }

    @Test
    void refusalNamesTheMove() throws Exception {
        LinkDiagram d = Codes.read("braid", "3: 1 -1 2");
        Reduction wrong = new Reduction(d, List.of(Move.parse("R2 1 2"), Move.parse("R1 2")));
        IllegalArgumentException e = assertThrows(IllegalArgumentException.class, () -> wrong.replay(d));
        assertEquals("move 2, R1 2: crossing 2 was removed before", e.getMessage());
        Reduction beyond = new Reduction(d, List.of(Move.parse("R1 4")));
        e = assertThrows(IllegalArgumentException.class, () -> beyond.replay(d));
        assertEquals("move 1, R1 4: the diagram has only 3 crossings", e.getMessage());
    }

    @Test
    void aMillionCrossings() throws Exception {
        LinkDiagram d = Codes.read("braid", "2: " + "1 -1 ".repeat(500_000));
        Reduction r = Reduction.of(d);
        assertEquals(Codes.read("planar", "[[1],[2]]"), r.result());
        assertEquals(500_000, r.moves().size());
        assertEquals(r.result(), r.replay(d));
        LinkDiagram nested = Codes.read("braid", "2: " + "1 ".repeat(500_000) + "-1 ".repeat(499_999));
        Reduction inner = Reduction.of(nested);
        assertEquals(Codes.read("planar", "[[1]]"), inner.result());
        assertEquals(inner.result(), inner.replay(nested));
        LinkDiagram stays = Codes.read("braid", "2: " + "1 ".repeat(1_000_000));
        assertFalse(Reduction.of(stays).moves().size() > 0);
    }
}
