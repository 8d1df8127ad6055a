package ropewalk.diagram;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;

class LinkDiagramTest {

    private static final int CASES = 300;
    private static final int SIZE = 50;

    /** Two numberings of the darts say the same partition. */
    private static void assertSameClasses(Slow.Classes slow, int darts, java.util.function.IntUnaryOperator fast) {
        Map<Integer, Integer> names = new HashMap<>();
        Set<Integer> used = new HashSet<>();
        for (int d = 0; d < darts; d++) {
            Integer name = names.putIfAbsent(slow.of(d), fast.applyAsInt(d));
            assertEquals(name == null ? fast.applyAsInt(d) : name, fast.applyAsInt(d));
            assertTrue(name != null || used.add(fast.applyAsInt(d)), "two classes are one");
        }
    }

    private static boolean[] choice(Random random, int length) {
        boolean[] choice = new boolean[length];
        for (int i = 0; i < length; i++) {
            choice[i] = random.nextBoolean();
        }
        return choice;
    }

    @Test
    void strandsFollowTheirComponents() {
        Cases.run(100, CASES, SIZE, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            assertSameClasses(Slow.strands(d), d.darts(), d::component);
            for (int e = 0; e < d.darts(); e++) {
                assertEquals(e, d.mate(d.mate(e)));
                assertNotEquals(d.isOutgoing(e), d.isOutgoing(d.mate(e)));
                assertNotEquals(d.isOutgoing(e), d.isOutgoing(e ^ 2));
                assertEquals(e, LinkDiagram.clockwise(LinkDiagram.counterClockwise(e)));
                if (d.isOutgoing(e)) {
                    assertEquals(d.component(e), d.component(d.next(e)));
                    assertTrue(d.isOutgoing(d.next(e)));
                }
            }
            for (int i = 0; i < d.components(); i++) {
                if (d.start(i) >= 0) {
                    assertTrue(d.isOutgoing(d.start(i)));
                    assertEquals(i, d.component(d.start(i)));
                }
            }
            assertFalse(d.crossings() > 0 && d.isOutgoing(0));
        });
    }

    @Test
    void positiveWhereTheOverStrandTurnsLeftIntoTheUnderStrand() {
        // Right-handed: turn the over-strand's direction counter-clockwise by less than half a turn to get the under's.
        Cases.run(150, CASES, SIZE, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            for (int c = 0; c < d.crossings(); c++) {
                int overOut = d.isOutgoing(4 * c + 1) ? 4 * c + 1 : 4 * c + 3;
                int underOut = d.isOutgoing(4 * c) ? 4 * c : 4 * c + 2;
                assertEquals(d.sign(c) == 1, LinkDiagram.counterClockwise(overOut) == underOut);
            }
        });
    }

    @Test
    void regionsOfEveryPieceAreCrossingsAndTwo() {
        Cases.run(200, CASES, SIZE, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            Regions regions = Regions.of(d);
            Slow.Classes pieces = Slow.crossings(d);
            assertEquals(d.crossings() + 2 * pieces.count(), regions.count());
            assertSameClasses(Slow.regions(d), d.darts(), regions::ofCorner);
            int next = 0;
            for (int e = 0; e < d.darts(); e++) {
                assertTrue(regions.ofCorner(e) <= next);
                next = Math.max(next, regions.ofCorner(e) + 1);
            }
            assertSame(regions, Regions.of(d));
        });
    }

    @Test
    void connectedPieces() {
        Cases.run(250, CASES, SIZE, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            ConnectedPieces pieces = ConnectedPieces.of(d);
            Slow.Classes slow = Slow.crossings(d);
            assertSameClasses(slow, d.crossings(), pieces::ofCrossing);
            assertEquals(slow.count(), pieces.withCrossings());
            Set<Integer> met = new HashSet<>();
            for (int i = 0; i < d.components(); i++) {
                if (d.start(i) < 0) {
                    assertTrue(pieces.ofComponent(i) >= pieces.withCrossings());
                    assertTrue(met.add(pieces.ofComponent(i)));
                } else {
                    assertEquals(pieces.ofCrossing(d.start(i) / 4), pieces.ofComponent(i));
                }
            }
            assertEquals(slow.count() + met.size(), pieces.count());
        });
    }

    @Test
    void arcsChangeAtUnderPassagesOnly() {
        Cases.run(300, CASES, SIZE, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            Arcs arcs = Arcs.of(d);
            assertSameClasses(Slow.arcs(d), d.darts(), arcs::ofDart);
            int neverUnder = 0;
            for (int i = 0; i < d.components(); i++) {
                int component = i;
                boolean under = false;
                for (int c = 0; c < d.crossings(); c++) {
                    under |= d.component(4 * c) == component;
                }
                neverUnder += under ? 0 : 1;
                if (d.start(i) >= 0) {
                    assertEquals(arcs.firstOf(i), arcs.ofDart(d.start(i)));
                }
                assertTrue(arcs.firstOf(i + 1) > arcs.firstOf(i));
            }
            assertEquals(d.crossings() + neverUnder, arcs.count());
            assertEquals(arcs.count(), arcs.firstOf(d.components()));
            for (int e = 0; e < d.darts(); e++) {
                int arc = arcs.ofDart(e);
                assertTrue(arcs.firstOf(d.component(e)) <= arc && arc < arcs.firstOf(d.component(e) + 1));
                assertEquals(arcs.over(e / 4), arcs.ofDart(e | 1));
                if (d.isOutgoing(e) && !LinkDiagram.isOver(e)) {        // numbered along the component
                    int first = arcs.firstOf(d.component(e));
                    int many = arcs.firstOf(d.component(e) + 1) - first;
                    assertEquals(first + (arcs.ofDart(e ^ 2) - first + 1) % many, arc);
                }
            }
        });
    }

    @Test
    void shadingIsProperAndLeavesFewerUnshaded() {
        Cases.run(350, CASES, SIZE, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            Shading shading = Shading.of(d);
            Regions regions = Regions.of(d);
            int[] balance = new int[ConnectedPieces.of(d).count()];
            Set<Integer> counted = new HashSet<>();
            for (int e = 0; e < d.darts(); e++) {
                assertNotEquals(shading.isShadedAt(e), shading.isShadedAt(LinkDiagram.clockwise(e)));
                assertNotEquals(shading.isShadedAt(e), shading.opposite().isShadedAt(e));
                assertEquals(shading.isShaded(regions.ofCorner(e)), shading.isShadedAt(e));
                if (counted.add(regions.ofCorner(e))) {
                    balance[ConnectedPieces.of(d).ofCrossing(e / 4)] += shading.isShadedAt(e) ? 1 : -1;
                }
            }
            Set<Integer> first = new HashSet<>();
            for (int c = 0; c < d.crossings(); c++) {
                int piece = ConnectedPieces.of(d).ofCrossing(c);
                assertTrue(balance[piece] >= 0);
                if (first.add(piece) && balance[piece] == 0) {
                    assertFalse(shading.isShadedAt(4 * c));
                }
            }
        });
    }

    @Test
    void mirrorImage() {
        Cases.run(400, CASES, SIZE, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            LinkDiagram m = d.mirrored();
            assertEquals(d, m.mirrored());
            LinkDiagram checked = checked(m);
            for (int c = 0; c < d.crossings(); c++) {
                assertEquals(-d.sign(c), m.sign(c));
                assertEquals(d.component(4 * c), m.component(4 * c + 1));
                assertEquals(d.component(4 * c + 1), m.component(4 * c));
            }
            assertSameComponents(checked, m);
            assertEquals(Regions.of(d).count(), Regions.of(m).count());
            // The word of passages stays, with over and under exchanged.
            for (int i = 0; i < d.components(); i++) {
                assertEquals(word(d, i, true), word(m, i, false));
            }
        });
    }

    /** Crossing numbers along a component from its start; a mark where it is over (or under). */
    private static String word(LinkDiagram d, int component, boolean over) {
        StringBuilder word = new StringBuilder();
        int start = d.start(component);
        for (int e = start; e >= 0;) {
            word.append(d.mate(e) / 4).append(LinkDiagram.isOver(d.mate(e)) == over ? "+ " : "- ");
            e = d.next(e);
            if (e == start) {
                break;
            }
        }
        return word.toString();
    }

    /** The same diagram through the checks, with components found anew. */
    private static LinkDiagram checked(LinkDiagram d) throws NotADiagramException {
        int[] mates = new int[d.darts()];
        byte[] signs = new byte[d.crossings()];
        int[] starts = new int[d.components()];
        for (int e = 0; e < mates.length; e++) {
            mates[e] = d.mate(e);
            signs[e / 4] = (byte) d.sign(e / 4);
        }
        for (int i = 0; i < starts.length; i++) {
            starts[i] = d.start(i);
        }
        return LinkDiagram.of(mates, signs, starts);
    }

    private static void assertSameComponents(LinkDiagram a, LinkDiagram b) {
        assertEquals(a, b);
        for (int e = 0; e < a.darts(); e++) {
            assertEquals(a.component(e), b.component(e));
        }
    }

    @Test
    void reversal() {
        Cases.run(450, CASES, SIZE, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            boolean[] which = choice(random, d.components());
            boolean[] others = new boolean[which.length];
            for (int i = 0; i < which.length; i++) {
                others[i] = !which[i];
            }
            LinkDiagram r = d.reversed(which);
            assertEquals(d, r.reversed(which));
            assertEquals(d.reversed(), r.reversed(others));
            assertEquals(r.mirrored(), d.mirrored().reversed(which));
            assertSameComponents(checked(r), r);
            for (int c = 0; c < d.crossings(); c++) {
                int turned = which[d.component(4 * c)] == which[d.component(4 * c + 1)] ? 1 : -1;
                assertEquals(turned * d.sign(c), r.sign(c));
                assertEquals(d.component(4 * c), r.component(4 * c));
                assertEquals(d.component(4 * c + 1), r.component(4 * c + 1));
            }
            for (int i = 0; i < which.length; i++) {
                String forward = word(d, i, true);
                String[] letters = word(r, i, true).split(" ");
                if (which[i] && !forward.isEmpty()) {       // the first edge stays first: the word turns round in place
                    java.util.Collections.reverse(java.util.Arrays.asList(letters));
                }
                assertEquals(forward.trim(), String.join(" ", letters));
            }
        });
        assertThrows(IllegalArgumentException.class,
                () -> RandomDiagrams.map(new Random(1), 5).reversed(new boolean[17]));
        assertThrows(IllegalArgumentException.class,
                () -> RandomDiagrams.map(new Random(1), 5).sublink(new boolean[17]));
    }

    @Test
    void sublinksCompose() {
        Cases.run(500, CASES, SIZE, (random, size) -> {
            LinkDiagram d = RandomDiagrams.any(random, size);
            boolean[] keep = choice(random, d.components());
            LinkDiagram s = d.sublink(keep);
            assertSameComponents(checked(s), s);
            boolean[] keepOfThese = choice(random, s.components());
            boolean[] both = new boolean[keep.length];
            int k = 0;
            for (int i = 0; i < keep.length; i++) {
                if (keep[i]) {
                    both[i] = keepOfThese[k];
                    String word = word(d, i, true);
                    assertEquals(kept(word, d, keep), word(s, k, true));
                    k++;
                }
            }
            assertEquals(k, s.components());
            assertEquals(d.sublink(both), s.sublink(keepOfThese));
            assertEquals(d.mirrored().sublink(keep), s.mirrored());
            boolean[] all = new boolean[keep.length];
            java.util.Arrays.fill(all, true);
            assertEquals(d, d.sublink(all));
            assertEquals(0, d.sublink(new boolean[keep.length]).components());
        });
    }

    /** The word of a component with the crossings that go left out and the others numbered anew. */
    private static String kept(String word, LinkDiagram d, boolean[] keep) {
        StringBuilder kept = new StringBuilder();
        for (String letter : word.isEmpty() ? new String[0] : word.split(" ")) {
            int c = Integer.parseInt(letter.substring(0, letter.length() - 1));
            if (keep[d.component(4 * c)] && keep[d.component(4 * c + 1)]) {
                int number = 0;
                for (int b = 0; b < c; b++) {
                    number += keep[d.component(4 * b)] && keep[d.component(4 * b + 1)] ? 1 : 0;
                }
                kept.append(number).append(letter.charAt(letter.length() - 1)).append(' ');
            }
        }
        return kept.toString();
    }

    @Test
    void splitUnion() {
        Cases.run(550, CASES, SIZE, (random, size) -> {
            LinkDiagram a = RandomDiagrams.any(random, size);
            LinkDiagram b = RandomDiagrams.any(random, 1 + random.nextInt(size));
            LinkDiagram both = a.splitUnion(b);
            assertSameComponents(checked(both), both);
            assertEquals(ConnectedPieces.of(a).count() + ConnectedPieces.of(b).count(), ConnectedPieces.of(both).count());
            boolean[] left = new boolean[both.components()];
            boolean[] right = new boolean[both.components()];
            for (int i = 0; i < left.length; i++) {
                left[i] = i < a.components();
                right[i] = !left[i];
            }
            assertEquals(a, both.sublink(left));
            assertEquals(b, both.sublink(right));
        });
    }

    @Test
    void differentDiagramsAreNotEqual() throws Exception {
        LinkDiagram trefoil = Codes.read("planar", "[[1,5,2,4],[3,1,4,6],[5,3,6,2]]");
        assertNotEquals(trefoil, trefoil.mirrored());
        assertNotEquals(trefoil, trefoil.splitUnion(Codes.read("planar", "[[1]]")));
        assertNotEquals(trefoil, Codes.read("planar", "[[3,1,4,6],[5,3,6,2],[1,5,2,4]]"));
    }
}
