package ropewalk.families;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.LinkDiagram;

class ScrambledTest {

    /** Components, linking numbers and H₁ of the double branched cover stay; the diagram hangs together. */
    @Test
    void theLinkStays() {
        LinkDiagram[] links = {
            SplitUnion.of(BraidClosure.of(2, 1, 1, 1), BraidClosure.of(2, -1, -1, -1)),
            SplitUnion.of(BraidClosure.of(2, 1, 1), SplitUnion.ofCircles(2), WheelClosure.of(3)),
            SplitUnion.ofCircles(4),
            SplitUnion.of(PretzelLink.of(3, 6, -2), TwoBridgeLink.of(12, 5)),
            WheelClosure.of(2), SplitUnion.ofCircles(1)};
        for (LinkDiagram link : links) {
            for (long seed = 1; seed <= 25; seed++) {
                LinkDiagram scrambled = Scrambled.of(seed, link, (int) seed);
                String what = link + " scrambled with seed " + seed;
                assertEquals(link.components(), scrambled.components(), what);
                assertEquals(1, ConnectedPieces.of(scrambled).count(), what);
                assertEquals(SlowColouring.linking(link), SlowColouring.linking(scrambled), what);
                assertEquals(SlowColouring.factors(link), SlowColouring.factors(scrambled), what);
            }
        }
    }

    @Test
    void slidesHappen() {
        // Without slides the crossings that are there stay neighbours as they were; with them some triangle turns over.
        LinkDiagram braid = BraidClosure.of(3, 1, 2, 1, 1, 2, 2);
        int changed = 0;
        for (long seed = 0; seed < 200; seed++) {
            LinkDiagram moved = Scrambled.of(seed, braid, 1);
            if (moved.crossings() == braid.crossings() && !moved.equals(braid)) {
                changed++;
            }
        }
        assertTrue(changed > 0, "no slide in 200 tries");
    }

    @Test
    void eachComponentOfASplitUnionStaysWhatItWas() {
        LinkDiagram link = SplitUnion.of(BraidClosure.of(2, 1, 1, 1), WheelClosure.of(2), TorusLink.of(2, 5));
        for (long seed = 100; seed < 110; seed++) {
            LinkDiagram scrambled = Scrambled.of(seed, link, 30);
            for (int i = 0; i < 3; i++) {
                boolean[] keep = new boolean[3];
                keep[i] = true;
                assertEquals(SlowColouring.determinant(link.sublink(keep)),
                        SlowColouring.determinant(scrambled.sublink(keep)), "component " + i + ", seed " + seed);
            }
        }
    }
}
