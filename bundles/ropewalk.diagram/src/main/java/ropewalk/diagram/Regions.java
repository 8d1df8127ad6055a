package ropewalk.diagram;

import java.util.Arrays;

/**
 * The regions of a diagram, connected piece by connected piece: a diagram does not say in which region of one piece
 * another piece lies, so each piece is looked at alone on its own sphere. Regions are numbered from 0 in the order of
 * their first corner. A piece without crossings has no region here (its circle bounds two discs).
 */
public final class Regions {

    private static final DerivedKey<Regions> KEY = new DerivedKey<>("regions");

    private final int count;
    private final int[] ofCorner;

    private Regions(int count, int[] ofCorner) {
        this.count = count;
        this.ofCorner = ofCorner;
    }

    /**
     * The regions of a diagram, computed once in O(n).
     *
     * @param diagram any diagram
     * @return its regions
     */
    public static Regions of(LinkDiagram diagram) {
        return diagram.derived(KEY, Regions::find);
    }

    private static Regions find(LinkDiagram diagram) {
        int[] region = new int[diagram.darts()];
        Arrays.fill(region, -1);
        int count = 0;
        for (int d = 0; d < region.length; d++) {
            if (region[d] < 0) {
                for (int e = d; region[e] < 0; e = LinkDiagram.clockwise(diagram.mate(e))) {
                    region[e] = count;
                }
                count++;
            }
        }
        return new Regions(count, region);
    }

    /**
     * How many regions there are.
     *
     * @return n + 2 for each connected piece with n crossings, added up
     */
    public int count() {
        return count;
    }

    /**
     * The region at a corner.
     *
     * @param dart the corner lies between this dart and the next one counter-clockwise
     * @return the region there, counted from 0
     */
    public int ofCorner(int dart) {
        return ofCorner[dart];
    }
}
