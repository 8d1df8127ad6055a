package ropewalk.diagram;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import ropewalk.diagram.NotADiagramException.Kind;

/** What a batch refuses, and that it is as before afterwards. */
class BuilderTest {

    // Hopf link with positive crossings: under 0 -> 2, over 3 -> 1.
    private static final int[] HOPF = {5, 4, 7, 6, 1, 0, 3, 2};
    private static final byte[] POSITIVE = {1, 1};

    private static NotADiagramException refused(int[] mates, byte[] signs, int... starts) {
        return assertThrows(NotADiagramException.class, () -> LinkDiagram.of(mates, signs, starts));
    }

    @Test
    void hopfLink() throws NotADiagramException {
        LinkDiagram d = LinkDiagram.of(HOPF, POSITIVE, new int[] {1, 2});
        assertEquals(2, d.components());
        assertEquals(4, Regions.of(d).count());
    }

    @Test
    void startsLieOnOutgoingDartsOfDifferentComponents() {
        String incoming = refused(HOPF, POSITIVE, 0, 1).getMessage();
        assertTrue(incoming.contains("component 1 starts at dart 0, which is incoming"), incoming);
        String twice = refused(HOPF, POSITIVE, 1, 6).getMessage();
        assertTrue(twice.contains("component 2 starts on component 1"), twice);
        String same = refused(HOPF, POSITIVE, 1, 2, 2).getMessage();
        assertTrue(same.contains("component 3 starts on component 2"), same);
        NotADiagramException missing = refused(HOPF, POSITIVE, 1);
        assertTrue(missing.getMessage().contains("2 strands belong to no component"), missing.getMessage());
        assertEquals(Kind.STRANDS, missing.kind());
        assertTrue(refused(HOPF, POSITIVE, 1, 8).getMessage().contains("does not exist"));
        assertTrue(refused(HOPF, POSITIVE, 1, -2).getMessage().contains("does not exist"));
        assertTrue(refused(new int[0], new byte[0], 0).getMessage().contains("does not exist"));
    }

    @Test
    void dartsPairUp() {
        assertTrue(refused(new int[] {5, 4, 7, 6, 1, 0, 3, 3}, POSITIVE, 1, 2).getMessage().contains("no partner"));
        assertTrue(refused(new int[] {0, 4, 7, 6, 1, 5, 3, 2}, POSITIVE, 1, 2).getMessage().contains("no partner"));
        assertTrue(refused(new int[] {8, 4, 7, 6, 1, 0, 3, 2}, POSITIVE, 1, 2).getMessage().contains("no partner"));
        assertTrue(refused(HOPF, new byte[] {1, -1}, 1, 2).getMessage().contains("both ways"));
        NotADiagramException sign = refused(HOPF, new byte[] {1, 0}, 1, 2);
        assertEquals("the sign of crossing 2 is 0; it must be 1 or -1", sign.getMessage());
        assertEquals(1, sign.crossing());
    }

    @Test
    void arraysAreLongEnough() {
        assertThrows(IllegalArgumentException.class, () -> LinkDiagram.of(new int[7], POSITIVE, new int[2]));
        assertThrows(IllegalArgumentException.class, () -> LinkDiagram.of(new int[12], POSITIVE, new int[2]));
        LinkBatch.Builder batch = new LinkBatch.Builder();
        assertThrows(IllegalArgumentException.class, () -> batch.add(2, HOPF, POSITIVE, 2, new int[1]));
        assertThrows(IllegalArgumentException.class, () -> batch.add(2, HOPF, new byte[1], 2, new int[2]));
        assertThrows(IllegalArgumentException.class,
                () -> batch.add(1 << 30, HOPF, POSITIVE, 2, new int[] {1, 2}));
    }

    @Test
    void tooFewRegionsForTheSphere() {
        // O1+ O2+ U1+ U2+, one curve; its graph is planar.
        NotADiagramException e = refused(new int[] {5, 7, 4, 6, 2, 0, 3, 1}, POSITIVE, 1);
        assertEquals(Kind.NOT_PLANAR, e.kind());
        assertEquals("the piece with crossing 1 has 2 crossings and 2 regions; on the sphere it would have 4",
                e.getMessage());
    }

    @Test
    void aBadDiagramLeavesTheBatchAsBefore() {
        Cases.run(11, 60, 30, (random, size) -> {
            LinkBatch.Builder batch = new LinkBatch.Builder();
            LinkDiagram[] added = new LinkDiagram[20];
            for (int i = 0; i < added.length; i++) {
                added[i] = RandomDiagrams.any(random, 1 + random.nextInt(size));
                assertThrows(NotADiagramException.class, () -> batch.add(2, HOPF, POSITIVE, 1, new int[] {1}));
                add(batch, added[i]);
                assertThrows(NotADiagramException.class,
                        () -> batch.add(1, new int[] {2, 3, 0, 1}, new byte[] {1}, 2, new int[] {1, 2}));
            }
            assertEquals(added.length, batch.size());
            LinkBatch links = batch.build();
            assertEquals(0, batch.size());
            add(batch, added[3]);
            assertEquals(added[3], batch.build().link(0));
            for (int i = 0; i < added.length; i++) {
                assertEquals(added[i], links.link(i));
                assertEquals(Codes.planar(added[i]), Codes.planar(links.link(i)));
                for (int d = 0; d < added[i].darts(); d++) {
                    assertEquals(added[i].component(d), links.link(i).component(d));
                }
            }
        });
    }

    private static void add(LinkBatch.Builder batch, LinkDiagram d) throws NotADiagramException {
        int[] mates = new int[d.darts() + 4];
        byte[] signs = new byte[d.crossings() + 1];
        int[] starts = new int[d.components() + 1];
        for (int e = 0; e < d.darts(); e++) {
            mates[e] = d.mate(e);
            signs[e / 4] = (byte) d.sign(e / 4);
        }
        for (int i = 0; i < d.components(); i++) {
            starts[i] = d.start(i);
        }
        batch.add(d.crossings(), mates, signs, d.components(), starts);
    }
}
