package quayside.links;

import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerValue;

/**
 * The determinant of a connected alternating diagram as the number of spanning trees of its chessboard graph (Crowell
 * 1959). A rival of methods that others bring; its ranking below theirs makes it fill a cell only where it is named.
 */
@Component(service = Method.class, property = {
    Method.ID + "=determinant.trees", Method.INVARIANT + "=determinant", "service.ranking:Integer=-10"})
public final class TreesDeterminantComponent implements Method<IntegerValue> {

    @Override
    public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
        int pieces = ConnectedPieces.of(link).count();
        if (pieces != 1) {
            return new Outcome.NotApplicable<>("covers connected diagrams; this one has " + pieces + " pieces");
        }
        int crossing = fault(link);
        if (crossing >= 0) {
            return new Outcome.NotApplicable<>("covers alternating diagrams; here a strand that leaves crossing "
                    + (crossing + 1) + " passes twice on one level");
        }
        return new Outcome.Exact<>(new IntegerValue(ChessboardGraph.of(link).spanningTrees(effort::checkpoint)));
    }

    /** A crossing at an edge that is over at both ends, or under at both; -1 if the diagram alternates. */
    private static int fault(LinkDiagram link) {
        for (int dart = 0; dart < link.darts(); dart++) {
            if (LinkDiagram.isOver(dart) == LinkDiagram.isOver(link.mate(dart))) {
                return dart >> 2;
            }
        }
        return -1;
    }
}
