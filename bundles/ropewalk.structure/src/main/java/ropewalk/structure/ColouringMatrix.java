package ropewalk.structure;

import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;
import ropewalk.diagram.Arcs;
import ropewalk.diagram.DerivedKey;
import ropewalk.diagram.LinkDiagram;

/**
 * The colouring matrix of a diagram: a row for each crossing, a column for each arc; 2 at the arc that passes over, -1
 * at each of the two arcs that end there, added where arcs coincide (R. H. Fox, A quick trip through knot theory, 1962).
 * Its kernel modulo n holds the n-colourings.
 *
 * <p>There are as many arcs as crossings, and one more for each component that never passes under; so the matrix need
 * not be square. With the pieces of the diagram in order it is block diagonal.
 *
 * <p>Cost O(n).
 */
public final class ColouringMatrix {

    private static final DerivedKey<ColouringMatrix> KEY = new DerivedKey<>("colouring matrix");

    private final LinkDiagram diagram;
    private final Arcs arcs;

    private ColouringMatrix(LinkDiagram diagram) {
        this.diagram = diagram;
        this.arcs = Arcs.of(diagram);
    }

    /**
     * The colouring matrix of a diagram.
     *
     * @param diagram any diagram
     * @return its colouring matrix
     */
    public static ColouringMatrix of(LinkDiagram diagram) {
        return diagram.derived(KEY, ColouringMatrix::new);
    }

    /**
     * The number of rows.
     *
     * @return the number of crossings
     */
    public int rows() {
        return diagram.crossings();
    }

    /**
     * The number of columns.
     *
     * @return the number of arcs
     */
    public int columns() {
        return arcs.count();
    }

    /**
     * Writes the matrix without its last rows or columns into an array of the caller.
     *
     * @param rows how many rows
     * @param columns how many columns
     * @param target takes rows × columns numbers, row by row
     */
    public void fill(int rows, int columns, long[] target) {
        Arrays.fill(target, 0, rows * columns, 0);
        for (int c = 0; c < rows; c++) {
            add(target, c, columns, arcs.over(c), 2);
            add(target, c, columns, arcs.ofDart(4 * c), -1);
            add(target, c, columns, arcs.ofDart(4 * c + 2), -1);
        }
    }

    private static void add(long[] target, int row, int columns, int column, int value) {
        if (column < columns) {
            target[row * columns + column] += value;
        }
    }

    /**
     * The whole matrix.
     *
     * @return a matrix with a row for each crossing and a column for each arc, rows summing to zero
     */
    public IntegerMatrix unreduced() {
        return matrix(rows(), columns());
    }

    /**
     * The matrix without its last row and its last column, defined where it is square.
     *
     * @return a square matrix, one less in size than the number of crossings
     */
    public IntegerMatrix reduced() {
        if (rows() != columns() || rows() == 0) {
            throw new IllegalStateException("a colouring matrix of " + rows() + " rows and " + columns()
                    + " columns has no square minor by striking one row and one column");
        }
        return matrix(rows() - 1, columns() - 1);
    }

    private IntegerMatrix matrix(int rows, int columns) {
        IntegerMatrix.Builder matrix = IntegerMatrix.builder(rows, columns);
        for (int c = 0; c < rows; c++) {
            add(matrix, c, arcs.over(c), columns, 2);
            add(matrix, c, arcs.ofDart(4 * c), columns, -1);
            add(matrix, c, arcs.ofDart(4 * c + 2), columns, -1);
        }
        return matrix.build();
    }

    private static void add(IntegerMatrix.Builder matrix, int row, int column, int columns, int value) {
        if (column < columns) {
            matrix.add(row, column, value);
        }
    }
}
