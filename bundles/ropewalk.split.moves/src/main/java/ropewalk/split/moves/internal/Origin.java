package ropewalk.split.moves.internal;

import org.osgi.framework.BundleContext;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.LinkDiagram;
import ropewalk.split.Partition;

/** What both separators need: whose word it is, and which components hang together in a diagram. */
final class Origin {

    private Origin() {
    }

    static String of(BundleContext context) {
        return context.getBundle().getSymbolicName() + " " + context.getBundle().getVersion();
    }

    static Partition piecesOf(LinkDiagram diagram) {
        ConnectedPieces pieces = ConnectedPieces.of(diagram);
        int[] marks = new int[diagram.components()];
        for (int i = 0; i < marks.length; i++) {
            marks[i] = pieces.ofComponent(i);
        }
        return Partition.of(marks);
    }
}
