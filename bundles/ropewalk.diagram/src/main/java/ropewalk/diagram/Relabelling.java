package ropewalk.diagram;

/** Mirror image and reversal: every crossing is turned so that its incoming under-strand is dart 0 again. */
final class Relabelling {

    private Relabelling() {
    }

    static LinkDiagram mirrored(LinkDiagram d) {
        int n = d.crossings();
        byte[] turns = new byte[n];
        byte[] signs = new byte[n];
        for (int c = 0; c < n; c++) {
            // The over-strand comes in at 3 (positive) or 1 (negative); that end becomes 0.
            turns[c] = (byte) (d.sign(c) > 0 ? 1 : 3);
            signs[c] = (byte) -d.sign(c);
        }
        return turned(d, turns, signs, new boolean[d.components()]);
    }

    static LinkDiagram reversed(LinkDiagram d, boolean[] which) {
        if (which.length != d.components()) {
            throw new IllegalArgumentException(which.length + " choices for " + d.components()
                    + " components; give one for each");
        }
        int n = d.crossings();
        byte[] turns = new byte[n];
        byte[] signs = new byte[n];
        for (int c = 0; c < n; c++) {
            boolean under = which[d.component(4 * c)];
            boolean over = which[d.component(4 * c + 1)];
            turns[c] = (byte) (under ? 2 : 0);
            signs[c] = (byte) (under == over ? d.sign(c) : -d.sign(c));
        }
        return turned(d, turns, signs, which);
    }

    private static LinkDiagram turned(LinkDiagram d, byte[] turns, byte[] signs, boolean[] reversed) {
        int n = d.crossings();
        int[] mates = new int[4 * n];
        for (int e = 0; e < 4 * n; e++) {
            mates[turned(e, turns)] = turned(d.mate(e), turns);
        }
        int[] starts = new int[d.components()];
        int[] strands = new int[2 * n];
        for (int i = 0; i < starts.length; i++) {
            int s = d.start(i);
            starts[i] = s < 0 ? -1 : turned(reversed[i] ? d.mate(s) : s, turns);
        }
        for (int c = 0; c < n; c++) {
            for (int i = 0; i < 2; i++) {
                strands[2 * c + (turned(4 * c + i, turns) & 1)] = d.component(4 * c + i);
            }
        }
        return new LinkDiagram(n, starts.length, mates, signs, strands, 0, starts, 0);
    }

    private static int turned(int dart, byte[] turns) {
        return (dart & ~3) | ((dart + turns[dart >> 2]) & 3);
    }
}
