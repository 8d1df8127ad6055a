package ropewalk.diagram;

import java.util.Arrays;

/**
 * The arcs of a diagram: the stretches of strand from one under-crossing to the next, and every component that never
 * passes under as one closed arc. So there are as many arcs as crossings, and one more for each component that never
 * passes under. The arcs are numbered from 0 along the components in their order, starting with the arc that holds the
 * component's first edge.
 */
public final class Arcs {

    private static final DerivedKey<Arcs> KEY = new DerivedKey<>("arcs");

    private final int count;
    private final int[] ofDart;
    private final int[] ofComponent;

    private Arcs(int count, int[] ofDart, int[] ofComponent) {
        this.count = count;
        this.ofDart = ofDart;
        this.ofComponent = ofComponent;
    }

    /**
     * The arcs of a diagram, computed once in O(n).
     *
     * @param diagram any diagram
     * @return its arcs
     */
    public static Arcs of(LinkDiagram diagram) {
        return diagram.derived(KEY, Arcs::find);
    }

    private static Arcs find(LinkDiagram d) {
        int[] arc = new int[d.darts()];
        int[] first = new int[d.components() + 1];
        Arrays.fill(arc, -1);
        int count = 0;
        for (int i = 0; i < d.components(); i++) {
            first[i] = count;
            int start = d.start(i);
            if (start >= 0) {
                count = number(d, start, arc, count);
            } else {
                count++;
            }
        }
        first[d.components()] = count;
        return new Arcs(count, arc, first);
    }

    private static int number(LinkDiagram d, int start, int[] arc, int from) {
        int next = from;
        int e = start;
        do {
            arc[e] = next;
            int in = d.mate(e);
            arc[in] = next;
            if (!LinkDiagram.isOver(in)) {
                next++;
            }
            e = in ^ 2;
        } while (e != start);
        if (next == from) {
            return from + 1;            // over everywhere: one closed arc
        }
        if (LinkDiagram.isOver(start)) {
            // The last stretch runs over the start into the first arc: give it that arc's number.
            int last = next;
            e = start;
            while (LinkDiagram.isOver(e)) {
                int back = e ^ 2;
                int out = d.mate(back);
                arc[back] = from;
                arc[out] = from;
                e = out;
            }
            return last;
        }
        return next;
    }

    /**
     * How many arcs there are.
     *
     * @return the number of arcs, closed ones counted
     */
    public int count() {
        return count;
    }

    /**
     * The arc of an edge end.
     *
     * @param dart 0 … 4n-1; at an over-crossing all four ends of its strand have one arc
     * @return its arc, counted from 0
     */
    public int ofDart(int dart) {
        return ofDart[dart];
    }

    /**
     * The arc that passes over at a crossing.
     *
     * @param crossing 0 … n-1
     * @return its arc, counted from 0
     */
    public int over(int crossing) {
        return ofDart[4 * crossing + 1];
    }

    /**
     * The first arc of a component; its arcs are {@code firstOf(i) … firstOf(i + 1) - 1}.
     *
     * @param component counted from 0; the number of components gives the number of arcs
     * @return the arc that holds its first edge, counted from 0
     */
    public int firstOf(int component) {
        return ofComponent[component];
    }
}
