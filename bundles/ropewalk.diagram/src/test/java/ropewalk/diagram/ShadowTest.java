package ropewalk.diagram;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** The generator of random maps: what it draws is a plane map, and all are drawn. */
class ShadowTest {

    @Test
    void connectedPlaneMaps() {
        Cases.run(7, 100, 300, (random, size) -> {
            LinkDiagram d = Shadow.uniform(random, size).diagram(random, 0);
            assertEquals(size, d.crossings());
            assertEquals(1, ConnectedPieces.of(d).count());
        });
    }

    @Test
    void everySmallMapIsDrawn() throws Exception {
        java.util.Random random = new java.util.Random(77);
        Map<String, Integer> counts = new HashMap<>();
        int draws = 20_000;
        for (int i = 0; i < draws; i++) {
            LinkDiagram d = Shadow.uniform(random, 2).diagram(random, 0);
            int loops = 0;
            for (int e = 0; e < d.darts(); e++) {
                loops += d.mate(e) / 4 == e / 4 ? 1 : 0;
            }
            counts.merge(d.components() + " curves, " + loops / 2 + " loops", 1, Integer::sum);
        }
        // There are 9 rooted 4-valent plane maps of two vertices (W. T. Tutte, 1963: 2 · 3^n (2n)! / (n! (n + 2)!)). Two
        // circles that meet twice have all 8 darts alike, so they are one of them; the others are one curve with two loops.
        assertEquals(2, counts.size(), counts.toString());
        int hopf = counts.get("2 curves, 0 loops");
        assertTrue(Math.abs(hopf - draws / 9.0) < 5 * Math.sqrt(draws * 8 / 81.0), counts.toString());
    }
}
