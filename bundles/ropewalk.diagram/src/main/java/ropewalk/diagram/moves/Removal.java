package ropewalk.diagram.moves;

import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.NotADiagramException;

/** One move, made the plain way: look at the corners, leave out the crossings, build and check the new diagram. */
final class Removal {

    private Removal() {
    }

    static LinkDiagram kink(LinkDiagram d, int crossing) {
        requireCrossing(d, crossing);
        for (int corner = 4 * crossing; corner < 4 * crossing + 4; corner++) {
            if (acrossRegion(d, corner) == corner) {
                return without(d, crossing, crossing);
            }
        }
        throw new IllegalArgumentException("R1 does not apply: no region has its only corner at crossing "
                + (crossing + 1));
    }

    static LinkDiagram bigon(LinkDiagram d, int first, int second) {
        requireCrossing(d, first);
        requireCrossing(d, second);
        boolean met = false;
        for (int corner = 4 * first; corner < 4 * first + 4; corner++) {
            int other = acrossRegion(d, corner);
            if (other >> 2 == second && acrossRegion(d, other) == corner) {
                if (LinkDiagram.isOver(corner) == LinkDiagram.isOver(d.mate(corner))) {
                    return without(d, first, second);
                }
                met = true;
            }
        }
        String where = "the crossings " + (first + 1) + " and " + (second + 1);
        throw new IllegalArgumentException("R2 does not apply: " + (met
                ? "neither strand is over at both of " + where
                : "no region has its only two corners at " + where));
    }

    /** The next corner of the region on the left of a dart. */
    private static int acrossRegion(LinkDiagram d, int corner) {
        return LinkDiagram.clockwise(d.mate(corner));
    }

    private static void requireCrossing(LinkDiagram d, int crossing) {
        if (crossing >= d.crossings()) {
            throw new IllegalArgumentException("the move needs crossing " + (crossing + 1) + ", the diagram has "
                    + d.crossings() + " crossings");
        }
    }

    private static LinkDiagram without(LinkDiagram d, int a, int b) {
        int n = d.crossings() - (a == b ? 1 : 2);
        int[] mates = new int[4 * n];
        byte[] signs = new byte[n];
        for (int c = 0; c < d.crossings(); c++) {
            if (c == a || c == b) {
                continue;
            }
            signs[renumbered(c, a, b)] = (byte) d.sign(c);
            for (int dart = 4 * c; dart < 4 * c + 4; dart++) {
                int end = d.mate(dart);
                while (end >> 2 == a || end >> 2 == b) {
                    end = d.mate(end ^ 2);
                }
                mates[moved(dart, a, b)] = moved(end, a, b);
            }
        }
        int[] starts = new int[d.components()];
        for (int i = 0; i < starts.length; i++) {
            int start = d.start(i);
            int steps = 0;
            while (start >= 0 && (start >> 2 == a || start >> 2 == b)) {
                start = ++steps > 4 ? -1 : d.mate(start ^ 2);       // at most four passages vanish
            }
            starts[i] = start < 0 ? -1 : moved(start, a, b);
        }
        try {
            return LinkDiagram.of(mates, signs, starts);
        } catch (NotADiagramException e) {
            throw new IllegalStateException("a removal left no diagram", e);
        }
    }

    private static int renumbered(int c, int a, int b) {
        int below = (a < c ? 1 : 0) + (b < c && b != a ? 1 : 0);
        return c - below;
    }

    private static int moved(int dart, int a, int b) {
        return 4 * renumbered(dart >> 2, a, b) + (dart & 3);
    }
}
