package quayside.links;

import ropewalk.diagram.Arcs;
import ropewalk.diagram.LinkDiagram;

/**
 * The slow twin: the tetrahedral quandle as the vertices of a tetrahedron, x * y being x turned by a third of a turn
 * about the axis through y (so the colours are a conjugation class of the alternating group). All colours are tried.
 */
final class TetrahedronColourings {

    /** For each vertex y what the turn about y makes of the vertices; all seen from outside in one sense. */
    private static final int[][] TURN = {{0, 2, 3, 1}, {3, 1, 0, 2}, {1, 3, 2, 0}, {2, 0, 1, 3}};

    static {
        for (int x = 0; x < 4; x++) {
            for (int y = 0; y < 4; y++) {
                for (int z = 0; z < 4; z++) {
                    // (x * y) * z = (x * z) * (y * z): without it this is no quandle
                    if (TURN[z][TURN[y][x]] != TURN[TURN[z][y]][TURN[z][x]]) {
                        throw new AssertionError("not self-distributive at " + x + ", " + y + ", " + z);
                    }
                }
            }
        }
    }

    private TetrahedronColourings() {
    }

    static long count(LinkDiagram link) {
        return count(link, Arcs.of(link), new int[Arcs.of(link).count()], 0);
    }

    private static long count(LinkDiagram link, Arcs arcs, int[] colours, int arc) {
        if (arc == colours.length) {
            return fits(link, arcs, colours) ? 1 : 0;
        }
        long sum = 0;
        for (int colour = 0; colour < 4; colour++) {
            colours[arc] = colour;
            sum += count(link, arcs, colours, arc + 1);
        }
        return sum;
    }

    private static boolean fits(LinkDiagram link, Arcs arcs, int[] colours) {
        for (int c = 0; c < link.crossings(); c++) {
            int over = 4 * c + 2 + link.sign(c);            // the end at which the over-strand comes in
            int right = LinkDiagram.counterClockwise(over); // going in there, the next end is to the right
            int x = colours[arcs.ofDart(right)];
            int y = colours[arcs.ofDart(over)];
            if (colours[arcs.ofDart(right ^ 2)] != TURN[y][x]) {
                return false;
            }
        }
        return true;
    }
}
