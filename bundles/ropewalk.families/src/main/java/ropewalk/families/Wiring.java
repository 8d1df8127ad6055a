package ropewalk.families;

import java.util.Arrays;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.NotADiagramException;

/**
 * A diagram in the making: crossings whose four ends are joined one pair after another. Vertex v owns the ends
 * 4v … 4v+3, counter-clockwise; the strand 4v, 4v+2 passes under, the other over. A <em>joint</em> is a vertex of the
 * strand 4v, 4v+2 alone, without a crossing; it disappears in the diagram. Orientation is settled at the end.
 */
final class Wiring {

    private static final int FREE = -1;

    private int[] mates = new int[64];
    private boolean[] joint = new boolean[16];
    private int vertices;

    /** A new crossing; gives its first end. */
    int crossing() {
        return vertex(false);
    }

    /** A new joint; gives one of its ends e, the other is e ^ 2. */
    int joint() {
        return vertex(true);
    }

    private int vertex(boolean isJoint) {
        if (vertices == joint.length) {
            joint = Arrays.copyOf(joint, 2 * vertices);
            mates = Arrays.copyOf(mates, 8 * vertices);
        }
        joint[vertices] = isJoint;
        Arrays.fill(mates, 4 * vertices, 4 * vertices + 4, FREE);
        return 4 * vertices++;
    }

    /** Joins two free ends by an edge. */
    void join(int a, int b) {
        if (a == b || mates[a] != FREE || mates[b] != FREE) {
            throw new IllegalStateException("ends " + a + " and " + b + " cannot be joined, one of them is taken");
        }
        mates[a] = b;
        mates[b] = a;
    }

    /**
     * The diagram. Components that meet a given start come first, in that order, and leave the vertex along it; the
     * others follow by their first end.
     *
     * @param starts ends along which components run out of their vertices
     */
    LinkDiagram diagram(int... starts) {
        int[] number = new int[vertices];
        int n = 0;
        for (int v = 0; v < vertices; v++) {
            number[v] = joint[v] ? -1 : n++;
        }
        Trail trail = new Trail(n);
        boolean[] met = new boolean[4 * vertices];
        for (int s : starts) {
            walk(s, met, number, trail);
        }
        for (int v = 0; v < vertices; v++) {
            walk(4 * v, met, number, trail);
            if (!joint[v]) {
                walk(4 * v + 1, met, number, trail);
            }
        }
        return trail.diagram(joined(number));
    }

    private void walk(int start, boolean[] met, int[] number, Trail trail) {
        if (met[start]) {
            return;
        }
        int e = start;
        int first = -1;
        do {
            met[e] = true;
            met[e ^ 2] = true;
            if (!joint[e >> 2]) {
                int end = 4 * number[e >> 2] + (e & 3);
                trail.leave(end);
                first = first < 0 ? end : first;
            }
            if (mates[e] == FREE) {
                throw new IllegalStateException("end " + e + " is joined to nothing");
            }
            e = mates[e] ^ 2;
        } while (e != start);
        trail.close(first);
    }

    /** The mates of the crossings alone, joints passed. */
    private int[] joined(int[] number) {
        int[] result = new int[4 * (int) Arrays.stream(number).filter(i -> i >= 0).count()];
        for (int v = 0; v < vertices; v++) {
            for (int i = 0; i < 4 && !joint[v]; i++) {
                int e = mates[4 * v + i];
                while (joint[e >> 2]) {
                    e = mates[e ^ 2];
                }
                result[4 * number[v] + i] = 4 * number[e >> 2] + (e & 3);
            }
        }
        return result;
    }

    /** Along which ends the components leave the crossings, and the diagram that follows from it. */
    static final class Trail {

        private final int[] underOut;
        private final int[] overOut;
        private int[] starts = new int[4];
        private int components;

        Trail(int crossings) {
            underOut = new int[crossings];
            overOut = new int[crossings];
        }

        void leave(int end) {
            ((end & 1) == 0 ? underOut : overOut)[end >> 2] = end & 3;
        }

        /** Ends a component that has left its first crossing along an end, or has none (-1). */
        void close(int first) {
            if (components == starts.length) {
                starts = Arrays.copyOf(starts, 2 * components);
            }
            starts[components++] = first;
        }

        /** Turns every crossing so that dart 0 is the incoming under-strand. */
        LinkDiagram diagram(int[] mates) {
            int n = underOut.length;
            byte[] signs = new byte[n];
            for (int c = 0; c < n; c++) {
                signs[c] = (byte) (((overOut[c] - underOut[c]) & 3) == 3 ? 1 : -1);
            }
            int[] turned = new int[4 * n];
            for (int e = 0; e < 4 * n; e++) {
                turned[turned(e)] = turned(mates[e]);
            }
            int[] first = new int[components];
            for (int i = 0; i < components; i++) {
                first[i] = starts[i] < 0 ? -1 : turned(starts[i]);
            }
            try {
                return LinkDiagram.of(turned, signs, first);
            } catch (NotADiagramException e) {
                throw new IllegalStateException("the construction does not lie on the sphere", e);
            }
        }

        private int turned(int end) {
            int under = underOut[end >> 2];
            return (end & ~3) | ((end - under + 2) & 3);
        }
    }
}
