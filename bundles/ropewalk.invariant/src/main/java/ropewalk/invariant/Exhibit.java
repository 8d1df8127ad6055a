package ropewalk.invariant;

import java.util.List;
import org.osgi.annotation.versioning.ConsumerType;
import ropewalk.diagram.LinkDiagram;

/**
 * A matrix to be shown beside the diagram, its rows and columns tied to what they stand for.
 *
 * @param title a few words
 * @param rows one label for each row: {@code r1} a region, {@code c1} a crossing, {@code a1} an arc, {@code k1} a
 *        component
 * @param columns one label for each column
 * @param matrix its entries
 * @param notes lines to be read with it: what the labels stand for, the blocks
 */
public record Exhibit(String title, List<String> rows, List<String> columns, Value.IntegerMatrixValue matrix,
        List<String> notes) {

    // Keeps copies.
    public Exhibit {
        rows = List.copyOf(rows);
        columns = List.copyOf(columns);
        notes = List.copyOf(notes);
    }

    /** A service that has matrices to show; registered beside the methods that use them. */
    @ConsumerType
    public interface Source {

        /**
         * The matrices of a link.
         *
         * @param link any diagram
         * @return what there is to show, in order; empty if nothing
         */
        List<Exhibit> exhibits(LinkDiagram link);
    }
}
