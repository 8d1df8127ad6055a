package ropewalk.families;

import ropewalk.diagram.LinkDiagram;

/** Split unions: diagrams side by side, their components numbered in that order. */
public final class SplitUnion {

    private SplitUnion() {
    }

    /**
     * The split union of several diagrams. O(n log m) for n crossings in m diagrams.
     *
     * @param diagrams at least one
     * @return all of them beside each other
     * @throws IllegalArgumentException if there is none
     */
    public static LinkDiagram of(LinkDiagram... diagrams) {
        if (diagrams.length == 0) {
            throw new IllegalArgumentException("a split union of nothing; give at least one diagram");
        }
        return of(diagrams, 0, diagrams.length);
    }

    private static LinkDiagram of(LinkDiagram[] diagrams, int from, int to) {
        if (to - from == 1) {
            return diagrams[from];
        }
        int middle = (from + to) >>> 1;
        return of(diagrams, from, middle).splitUnion(of(diagrams, middle, to));
    }

    /**
     * The unlink: circles without crossings.
     *
     * @param components at least 1
     * @return its diagram without crossings
     * @throws IllegalArgumentException if there is no component
     */
    public static LinkDiagram ofCircles(int components) {
        return BraidClosure.of(components);
    }
}
