package ropewalk.algebra.internal;

import java.math.BigInteger;
import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;
import ropewalk.algebra.MatrixTooLargeException;

/**
 * The rows and columns of any matrix under elimination: which places are filled. The counterpart of {@link FillGraph} for
 * matrices that are not symmetric.
 *
 * <p>Places are numbered: entry k of the matrix is number k, fill gets the next numbers. A place that was once filled stays,
 * also where its value cancels. Values by place are kept by the user. The arrays are read directly in the pivot search; only
 * this class writes to them.
 */
final class FillLines {
    private static final long LARGEST_REST = 4_000_000;

    /** Of row i the columns and places, the first {@code rowLength[i]} of them; rows that are not done have live columns only. */
    final int[][] rowColumn;
    final int[][] rowPlace;
    final int[] rowLength;
    /** Of column j the rows and places, the first {@code columnLength[j]} of them, those of rows that are done included. */
    final int[][] columnRow;
    final int[][] columnPlace;
    final int[] columnLength;
    /** How many rows of a column are not done. */
    final int[] columnCount;
    final boolean[] rowDone;
    final boolean[] columnDone;
    private int places;

    FillLines(IntegerMatrix matrix) {
        int rows = matrix.rows();
        int columns = matrix.columns();
        rowColumn = new int[rows][];
        rowPlace = new int[rows][];
        rowLength = new int[rows];
        columnRow = new int[columns][];
        columnPlace = new int[columns][];
        columnLength = new int[columns];
        rowDone = new boolean[rows];
        columnDone = new boolean[columns];
        places = matrix.entries();
        fill(matrix);
        columnCount = columnLength.clone();
    }

    private void fill(IntegerMatrix matrix) {
        for (int k = 0; k < places; k++) {
            columnLength[matrix.column(k)]++;
        }
        for (int j = 0; j < columnRow.length; j++) {
            columnRow[j] = new int[columnLength[j]];
            columnPlace[j] = new int[columnLength[j]];
        }
        Arrays.fill(columnLength, 0);
        for (int i = 0; i < rowColumn.length; i++) {
            int from = matrix.rowStart(i);
            int length = matrix.rowStart(i + 1) - from;
            rowLength[i] = length;
            rowColumn[i] = new int[length];
            rowPlace[i] = new int[length];
            for (int k = 0; k < length; k++) {
                int j = matrix.column(from + k);
                rowColumn[i][k] = j;
                rowPlace[i][k] = from + k;
                columnRow[j][columnLength[j]] = i;
                columnPlace[j][columnLength[j]++] = from + k;
            }
        }
    }

    int places() {
        return places;
    }

    /** A row was used as pivot row: its lists go. */
    void dropRow(int row) {
        rowDone[row] = true;
        for (int k = 0; k < rowLength[row]; k++) {
            columnCount[rowColumn[row][k]]--;
        }
        rowColumn[row] = null;
        rowPlace[row] = null;
        rowLength[row] = 0;
    }

    /** A column was used as pivot column: its lists go. The rows that have a place in it must be compacted next. */
    void dropColumn(int column) {
        columnDone[column] = true;
        columnRow[column] = null;
        columnPlace[column] = null;
        columnLength[column] = 0;
    }

    /** Drops the columns that are done from a row. */
    void compactRow(int row) {
        int[] columns = rowColumn[row];
        int[] itsPlaces = rowPlace[row];
        int kept = 0;
        for (int k = 0; k < rowLength[row]; k++) {
            if (!columnDone[columns[k]]) {
                columns[kept] = columns[k];
                itsPlaces[kept++] = itsPlaces[k];
            }
        }
        rowLength[row] = kept;
    }

    /** Makes a place at a row and column that have none in common. */
    int newPlace(int row, int column) {
        if ((places & 0xffff) == 0) {
            Memory.check(places, 40, "filled places");
        }
        int place = places;
        places = Math.incrementExact(places);
        int length = rowLength[row]++;
        if (length == rowColumn[row].length) {
            rowColumn[row] = Arrays.copyOf(rowColumn[row], 2 * length + 4);
            rowPlace[row] = Arrays.copyOf(rowPlace[row], 2 * length + 4);
        }
        rowColumn[row][length] = column;
        rowPlace[row][length] = place;
        if (columnLength[column] == columnRow[column].length) {
            compactColumn(column);
        }
        int at = columnLength[column]++;
        columnRow[column][at] = row;
        columnPlace[column][at] = place;
        columnCount[column]++;
        return place;
    }

    /** Drops the rows that are done from a column, and makes room where that frees little. */
    void compactColumn(int column) {
        int[] rows = columnRow[column];
        int[] itsPlaces = columnPlace[column];
        int kept = 0;
        for (int k = 0; k < columnLength[column]; k++) {
            if (!rowDone[rows[k]]) {
                rows[kept] = rows[k];
                itsPlaces[kept++] = itsPlaces[k];
            }
        }
        if (2 * kept >= rows.length) {
            columnRow[column] = Arrays.copyOf(rows, 2 * kept + 4);
            columnPlace[column] = Arrays.copyOf(itsPlaces, 2 * kept + 4);
        }
        columnLength[column] = kept;
    }

    /** The places outside all pivot rows and columns. */
    int[] rest() {
        IntList rest = new IntList(16);
        for (int i = 0; i < rowColumn.length; i++) {
            for (int k = 0; k < rowLength[i] && !rowDone[i]; k++) {
                if (!columnDone[rowColumn[i][k]]) {
                    rest.add(rowPlace[i][k]);
                }
            }
        }
        return rest.toArray();
    }

    /** The values outside all pivot rows and columns as a dense matrix, without lines that are empty. */
    BigInteger[][] rest(ResidueValues residues) {
        int[] newColumn = new int[columnRow.length];
        int columns = 0;
        int rows = 0;
        for (int j = 0; j < newColumn.length; j++) {
            newColumn[j] = columnDone[j] || columnCount[j] == 0 ? -1 : columns++;
        }
        for (int i = 0; i < rowColumn.length; i++) {
            rows += rowDone[i] || rowLength[i] == 0 ? 0 : 1;
        }
        if ((long) rows * columns > LARGEST_REST) {
            throw new MatrixTooLargeException("the elimination by units leaves a dense " + rows + " x " + columns
                + " part, more than " + LARGEST_REST + " numbers; split the matrix into blocks");
        }
        BigInteger[][] rest = new BigInteger[rows][columns];
        for (int i = 0, to = 0; i < rowColumn.length; i++) {
            if (rowDone[i] || rowLength[i] == 0) {
                continue;
            }
            Arrays.fill(rest[to], BigInteger.ZERO);
            for (int k = 0; k < rowLength[i]; k++) {
                rest[to][newColumn[rowColumn[i][k]]] = residues.get(rowPlace[i][k]);
            }
            to++;
        }
        return rest;
    }
}
