package ropewalk.diagram.moves;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import ropewalk.diagram.Codes;
import ropewalk.diagram.LinkDiagram;

class MoveTest {

    private static LinkDiagram braid(String word) throws Exception {
        return Codes.read("braid", word);
    }

    private static void refused(String move, LinkDiagram d, String reason) {
        IllegalArgumentException e = assertThrows(IllegalArgumentException.class, () -> Move.parse(move).apply(d));
        assertTrue(e.getMessage().contains(reason), e.getMessage());
    }

    @Test
    void writtenForm() {
        for (String text : new String[] {"R1 1", "R1 2147483647", "R2 1 2", "R2 9 2147483647"}) {
            assertEquals(text, Move.parse(text).toString());
        }
        assertEquals(new Move.R1Removal(4), Move.parse("R1 5"));
        assertEquals(new Move.R2Removal(0, 2), Move.parse("R2 1 3"));
        for (String text : new String[] {"", "R1", "R1 0", "R1 -1", "R1 01", "R1 1 2", "R2 1", "R2 2 1", "R2 1 1", "R3 1",
            "r1 1", "R1  1", "R1 1 ", "R1 2147483648", "R1 4294967297", "R1 99999999999999999999", "R2 1 2147483648",
            "R1 １"}) {
            assertThrows(IllegalArgumentException.class, () -> Move.parse(text), text);
        }
        assertThrows(IllegalArgumentException.class, () -> new Move.R1Removal(-1));
        assertThrows(IllegalArgumentException.class, () -> new Move.R2Removal(3, 3));
        assertThrows(IllegalArgumentException.class, () -> new Move.R2Removal(4, 3));
    }

    @Test
    void kinks() throws Exception {
        LinkDiagram circle = Codes.read("planar", "[[1]]");
        for (String code : new String[] {"[[1,1,2,2]]", "[[2,2,1,1]]", "[[1,2,2,1]]", "[[2,1,1,2]]"}) {
            assertEquals(circle, Move.parse("R1 1").apply(Codes.read("planar", code)), code);
        }
        assertEquals(braid("2: 1 1 1"), Move.parse("R1 4").apply(braid("3: 1 1 1 2")));
        assertEquals(braid("2: 1 1 1"), Move.parse("R1 1").apply(braid("3: -2 1 1 1")));
        // A nugatory crossing that is no kink stays: both sides have crossings.
        refused("R1 3", braid("4: 1 1 2 3 3"), "R1 does not apply: no region has its only corner at crossing 3");
        refused("R1 1", braid("2: 1 1"), "R1 does not apply");
        refused("R1 3", braid("2: 1 1"), "needs crossing 3, the diagram has 2 crossings");
    }

    @Test
    void bigons() throws Exception {
        // Both edges of the bigon close up: two components without crossings are left.
        assertEquals(Codes.read("planar", "[[1],[2]]"), Move.parse("R2 1 2").apply(braid("2: 1 -1")));
        assertEquals(Codes.read("planar", "[[1],[2]]"), Move.parse("R2 1 2").apply(braid("2: -1 1")));
        assertEquals(braid("3: 1 2"), Move.parse("R2 1 2").apply(braid("3: 1 -1 1 2")));
        assertEquals(braid("3: 1 2"), Move.parse("R2 2 3").apply(braid("3: 1 -1 1 2")));
        LinkDiagram freed = Move.parse("R2 1 4").apply(braid("3: 2 1 1 -2"));
        assertEquals(-1, freed.start(1));
        assertEquals(braid("2: 1 1"), freed.sublink(new boolean[] {true, false, true}));
        // The outer ends are joined to each other: one strand closes up beside the rest.
        assertEquals(braid("3: 1 1"), Move.parse("R2 3 4").apply(braid("3: 1 1 2 -2")));
        refused("R2 1 2", braid("2: 1 1"), "neither strand is over at both of the crossings 1 and 2");
        refused("R2 1 2", braid("3: 1 -2 1 -2"), "no region has its only two corners at the crossings 1 and 2");
        refused("R2 1 3", braid("3: 1 -2 1 -2"), "R2 does not apply");
        refused("R2 1 3", braid("2: 1 -1"), "needs crossing 3");
    }

    @Test
    void startsStayOnTheirEdge() throws Exception {
        LinkDiagram d = Codes.read("planar", "[[8,1,1,2],[2,4,3,3],[4,6,5,5],[6,8,7,7]]");
        LinkDiagram once = Move.parse("R1 1").apply(d);         // edges 8, 1, 2 become one, and it is the first
        assertEquals(3, once.crossings());
        assertEquals(Codes.read("planar", "[[1,4,3,3],[4,6,5,5],[6,1,7,7]]"), once);
    }
}
