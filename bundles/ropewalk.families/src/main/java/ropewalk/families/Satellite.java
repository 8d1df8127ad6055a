package ropewalk.families;

import ropewalk.diagram.LinkDiagram;

/**
 * Satellites of a knot with two parallel strands in the companion's direction: the knot is drawn double, and a tangle is
 * set into the pair on the knot's first edge. The framing is the linking number of the two parallels; the diagram's own
 * is its writhe, the difference is made up by full twists. A companion of n crossings gives 4n + 2 |framing - writhe|
 * crossings and those of the tangle.
 */
public final class Satellite {

    private static final int[] CLASP = {0, 2};          // the tangle 1/2
    private static final int[] COUNTER_CLASP = {0, -2};

    private Satellite() {
    }

    /**
     * The cable of two strands: two parallels of the knot, both running its way, with the framing for their linking
     * number. With framing 0 the determinant is 0; if the knot is not trivial the link does not split all the same: its
     * exterior is that of the knot and (pair of pants) × S¹, glued along a torus that is incompressible on both sides,
     * hence irreducible.
     *
     * @param knot a diagram of one component
     * @param framing the linking number of the two components
     * @return the cable
     * @throws IllegalArgumentException if the diagram has several components
     */
    public static LinkDiagram cable(LinkDiagram knot, int framing) {
        return of(knot, framing);
    }

    /**
     * A Whitehead double: the two parallels hooked into one knot by a clasp of two positive crossings (Whitehead 1937).
     * Its Alexander polynomial depends on the framing alone, and is 1 for framing 0.
     *
     * @param knot a diagram of one component
     * @param framing the linking number of the parallels before they are hooked
     * @return the doubled knot
     * @throws IllegalArgumentException if the diagram has several components
     */
    public static LinkDiagram whiteheadDouble(LinkDiagram knot, int framing) {
        return of(knot, framing, CLASP);
    }

    /**
     * The Bing double: two components, each a thin loop along half of the knot, hooked into one another at both ends by
     * clasps of opposite kind (Bing 1956; Cimasoni 2006 on its split and slice properties). With framing 0 all linking
     * numbers are 0, and it splits only if the knot is trivial.
     *
     * @param knot a diagram of one component
     * @param framing the linking number of the parallels before they are cut and hooked; 0 is the usual one
     * @return the link of two components
     * @throws IllegalArgumentException if the diagram has several components
     */
    public static LinkDiagram bingDouble(LinkDiagram knot, int framing) {
        return of(knot, framing, CLASP, COUNTER_CLASP);
    }

    private static LinkDiagram of(LinkDiagram knot, int framing, int[]... inset) {
        if (knot.components() != 1) {
            throw new IllegalArgumentException("a companion of " + knot.components() + " components; give a knot");
        }
        int writhe = 0;
        for (int c = 0; c < knot.crossings(); c++) {
            writhe += knot.sign(c);
        }
        Wiring w = new Wiring();
        Tangle pair = Tangle.rational(w, Math.multiplyExact(2, Math.subtractExact(framing, writhe)));
        for (int[] terms : inset) {
            pair = pair.plus(Tangle.rational(w, terms));
        }
        if (knot.crossings() == 0) {
            int north = w.joint();
            int south = w.joint();
            pair.fill(north, south, north ^ 2, south ^ 2);
            return inset.length == 0 ? w.diagram(north, south) : w.diagram();
        }
        int start = knot.start(0);
        int[] left = new int[knot.darts()];
        int[] right = new int[knot.darts()];
        for (int c = 0; c < knot.crossings(); c++) {
            doubleCrossing(w, 4 * c, left, right);
        }
        for (int d = 0; d < knot.darts(); d++) {
            int mate = knot.mate(d);
            if (d < mate && d != start && mate != start) {
                w.join(left[d], right[mate]);
                w.join(right[d], left[mate]);
            }
        }
        int end = knot.mate(start);
        pair.fill(left[start], right[start], right[end], left[end]);
        return inset.length == 0 ? w.diagram(left[start], right[start]) : w.diagram();
    }

    /**
     * Four crossings for one. With dart 0 to the west, then counter-clockwise: the two under-strands are the north and
     * the south row, the over-strands the west and the east column. Left and right are those of somebody who leaves.
     */
    private static void doubleCrossing(Wiring w, int dart, int[] left, int[] right) {
        int northWest = w.crossing();
        int northEast = w.crossing();
        int southWest = w.crossing();
        int southEast = w.crossing();
        w.join(northWest | 2, northEast);
        w.join(southWest | 2, southEast);
        w.join(northWest | 1, southWest | 3);
        w.join(northEast | 1, southEast | 3);
        left[dart] = southWest;
        right[dart] = northWest;
        left[dart | 1] = southEast | 1;
        right[dart | 1] = southWest | 1;
        left[dart | 2] = northEast | 2;
        right[dart | 2] = southEast | 2;
        left[dart | 3] = northWest | 3;
        right[dart | 3] = northEast | 3;
    }
}
