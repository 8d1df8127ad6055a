package ropewalk.diagram.notation;

import ropewalk.diagram.LinkDiagram;

/**
 * Writes planar code with the labels 1, 2, … along the components in their order, crossings in their order, components
 * without crossings last. Reading it again gives an equal diagram, except that a component of two edges which is over
 * at both its crossings starts where {@link PlanarReader} lets it start.
 */
final class PlanarWriter implements CodeWriter {

    @Override
    public String write(LinkDiagram d) {
        int[] labels = new int[d.darts()];
        StringBuilder circles = new StringBuilder();
        int next = 1;
        for (int i = 0; i < d.components(); i++) {
            if (d.start(i) < 0) {
                circles.append(",[").append(next++).append(']');
                continue;
            }
            int start = start(d, d.start(i));
            int e = start;
            do {
                labels[e] = next;
                labels[d.mate(e)] = next++;
                e = d.next(e);
            } while (e != start);
        }
        StringBuilder out = new StringBuilder(24 * Math.min(d.crossings(), 1 << 24) + 16);
        for (int c = 0; c < d.crossings(); c++) {
            out.append(",[").append(labels[4 * c]);
            for (int i = 1; i < 4; i++) {
                out.append(',').append(labels[4 * c + i]);
            }
            out.append(']');
        }
        out.append(circles).append(']');
        if (out.charAt(0) == ',') {
            out.setCharAt(0, '[');
        } else {
            out.insert(0, '[');
        }
        return out.toString();
    }

    /** Two edges, over at both crossings: the lower label must leave the crossing that is listed first. */
    private static int start(LinkDiagram d, int start) {
        int second = d.next(start);
        boolean overTwice = second != start && d.next(second) == start
                && LinkDiagram.isOver(start) && LinkDiagram.isOver(second);
        return overTwice ? Math.min(start, second) : start;
    }
}
