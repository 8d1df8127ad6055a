package ropewalk.algebra.internal;

import java.math.BigInteger;
import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;
import ropewalk.algebra.MatrixTooLargeException;

/**
 * Sparse Gaussian elimination of any matrix over a residue ring, the pivots chosen as it goes by the count of H. M. Markowitz
 * (Manag. Sci. 3 (1957) 255–269): few entries in the pivot's row and column, and a unit of the ring.
 *
 * <p>Places are numbered: entry k of the matrix is number k, fill gets the next numbers. A place that was once filled stays,
 * also where its value cancels, so that the steps told to the listener are right modulo every prime and over the rationals,
 * as long as no pivot vanishes. The elimination ends when no unit is left; over a field all values left are 0 then.
 */
final class GeneralElimination {
    /** Is told every step. The arrays are valid during the call and longer than their content. */
    interface Listener {
        /**
         * One pivot was used.
         *
         * @param pivot its place
         * @param below the places below it in its column, {@code m} of them
         * @param beside the places beside it in its row, {@code l} of them
         * @param columns the columns of {@code beside}
         * @param targets m·l places that were changed, row by row
         */
        void step(int pivot, int[] below, int m, int[] beside, int[] columns, int l, int[] targets);
    }

    private static final int CANDIDATES = 4;
    private static final long LARGEST_REST = 4_000_000;

    private final PlaceValues values;
    private final Listener listener;
    private final Runnable checkpoint;
    private final int[][] rowColumn;
    private final int[][] rowPlace;
    private final int[] rowLength;
    private final int[] rowCount;
    private final int[][] columnRow;
    private final int[][] columnPlace;
    private final int[] columnLength;
    private final int[] columnCount;
    private final boolean[] rowDone;
    private final boolean[] columnDone;
    private final Queue rowQueue;
    private final Queue columnQueue;
    private int places;

    private final int[] pivotRows;
    private final int[] pivotColumns;
    private int pivots;

    private int[] below = new int[16];
    private int[] belowRow = new int[16];
    private int[] beside = new int[16];
    private int[] besideColumn = new int[16];
    private int[] targets = new int[256];
    private final int[] placeInRow;
    private final int[] stamp;

    private long bestCost;
    private int bestRow;
    private int bestColumn;
    private int bestPlace;

    GeneralElimination(IntegerMatrix matrix, PlaceValues values, Listener listener, Runnable checkpoint) {
        this.values = values;
        this.listener = listener;
        this.checkpoint = checkpoint;
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
        rowCount = rowLength.clone();
        columnCount = columnLength.clone();
        rowQueue = new Queue(rows);
        columnQueue = new Queue(columns);
        pivotRows = new int[Math.min(rows, columns)];
        pivotColumns = new int[pivotRows.length];
        placeInRow = new int[columns];
        stamp = new int[columns];
        Arrays.fill(stamp, -1);
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

    /** Eliminates as long as a unit is left. */
    void run() {
        for (int i = 0; i < rowColumn.length; i++) {
            offerRow(i);
        }
        for (int j = 0; j < columnRow.length; j++) {
            offerColumn(j);
        }
        while (choose()) {
            checkpoint.run();
            if (values.confirm(bestPlace)) {
                eliminate(bestRow, bestColumn);
            }
        }
    }

    int pivots() {
        return pivots;
    }

    int pivotRow(int k) {
        return pivotRows[k];
    }

    int pivotColumn(int k) {
        return pivotColumns[k];
    }

    int places() {
        return places;
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

    private void offerRow(int i) {
        if (rowCount[i] == 0) {
            rowQueue.remove(i);
        } else {
            rowQueue.put(i, rowCount[i]);
        }
    }

    private void offerColumn(int j) {
        if (columnCount[j] == 0) {
            columnQueue.remove(j);
        } else {
            columnQueue.put(j, columnCount[j]);
        }
    }

    /** Looks at a few of the shortest rows and columns. A line without a unit sleeps until it is changed. */
    private boolean choose() {
        bestCost = Long.MAX_VALUE;
        int looked = 0;
        int end = Math.max(rowQueue.keys(), columnQueue.keys());
        for (int k = Math.min(rowQueue.leastKey(), columnQueue.leastKey()); k < end; k++) {
            for (int j = columnQueue.first(k), after; j >= 0; j = after) {
                after = columnQueue.after(j);
                if (lookAtColumn(j)) {
                    looked++;
                } else {
                    columnQueue.remove(j);
                }
                if (bestCost <= (k - 1L) * (k - 1L) || looked >= CANDIDATES) {
                    return true;
                }
            }
            for (int i = rowQueue.first(k), after; i >= 0; i = after) {
                after = rowQueue.after(i);
                if (lookAtRow(i)) {
                    looked++;
                } else {
                    rowQueue.remove(i);
                }
                if (bestCost <= (k - 1L) * k || looked >= CANDIDATES) {
                    return true;
                }
            }
        }
        return bestCost != Long.MAX_VALUE;
    }

    private boolean lookAtColumn(int j) {
        if (columnLength[j] > 2 * columnCount[j]) {
            columnLength[j] = compactColumn(j, columnLength[j]);
        }
        boolean found = false;
        for (int k = 0; k < columnLength[j]; k++) {
            int i = columnRow[j][k];
            // The test may be dear: not asked where the answer would not matter.
            if (!rowDone[i] && (!found || cost(i, j) < bestCost) && values.isPivot(columnPlace[j][k])) {
                found = true;
                consider(i, j, columnPlace[j][k]);
            }
        }
        return found;
    }

    private boolean lookAtRow(int i) {
        boolean found = false;
        for (int k = 0; k < rowLength[i]; k++) {
            int j = rowColumn[i][k];
            if (!columnDone[j] && (!found || cost(i, j) < bestCost) && values.isPivot(rowPlace[i][k])) {
                found = true;
                consider(i, j, rowPlace[i][k]);
            }
        }
        return found;
    }

    private long cost(int i, int j) {
        return (rowCount[i] - 1L) * (columnCount[j] - 1L);
    }

    private void consider(int i, int j, int place) {
        long cost = cost(i, j);
        if (cost < bestCost) {
            bestCost = cost;
            bestRow = i;
            bestColumn = j;
            bestPlace = place;
        }
    }

    private void eliminate(int row, int column) {
        int l = collectRow(row, column);
        int pivot = besideColumn[l];
        rowDone[row] = true;
        int m = collectColumn(column);
        columnDone[column] = true;
        rowQueue.remove(row);
        columnQueue.remove(column);
        if ((long) m * l > targets.length) {
            targets = new int[Math.multiplyExact(m, l) * 3 / 2 + 1];
        }
        if (m > 0 && l > 0) {
            values.startStep(pivot);
        }
        for (int k = 0; k < m; k++) {
            checkpoint.run();
            change(belowRow[k], below[k], l, k * l);
        }
        for (int c = 0; c < l; c++) {
            columnCount[besideColumn[c]]--;
            offerColumn(besideColumn[c]);
        }
        for (int k = 0; k < m; k++) {
            offerRow(belowRow[k]);
        }
        pivotRows[pivots] = row;
        pivotColumns[pivots++] = column;
        if (listener != null) {
            listener.step(pivot, below, m, beside, besideColumn, l, targets);
        }
    }

    /** The live places of the pivot row without the pivot; its own place is left at the end of {@link #besideColumn}. */
    private int collectRow(int row, int column) {
        int length = rowLength[row];
        if (length > beside.length) {
            beside = new int[2 * length];
        }
        if (length >= besideColumn.length) {
            besideColumn = new int[2 * length];
        }
        int l = 0;
        int pivot = -1;
        for (int k = 0; k < length; k++) {
            int j = rowColumn[row][k];
            if (j == column) {
                pivot = rowPlace[row][k];
            } else if (!columnDone[j]) {
                beside[l] = rowPlace[row][k];
                besideColumn[l++] = j;
            }
        }
        besideColumn[l] = pivot;
        rowColumn[row] = null;
        rowPlace[row] = null;
        rowLength[row] = 0;
        return l;
    }

    private int collectColumn(int column) {
        int length = columnLength[column];
        if (length > below.length) {
            below = new int[2 * length];
            belowRow = new int[2 * length];
        }
        int m = 0;
        for (int k = 0; k < length; k++) {
            int i = columnRow[column][k];
            if (!rowDone[i]) {
                below[m] = columnPlace[column][k];
                belowRow[m++] = i;
            }
        }
        columnRow[column] = null;
        columnPlace[column] = null;
        columnLength[column] = 0;
        return m;
    }

    /** Adds a multiple of the pivot row to a row, and drops what is done from the row. */
    private void change(int row, int factorPlace, int l, int targetsFrom) {
        if (l > 0) {
            values.startRow(factorPlace);
        }
        int[] columns = rowColumn[row];
        int[] rowPlaces = rowPlace[row];
        int length = 0;
        for (int k = 0; k < rowLength[row]; k++) {
            int j = columns[k];
            if (!columnDone[j]) {
                columns[length] = j;
                rowPlaces[length++] = rowPlaces[k];
                stamp[j] = row;
                placeInRow[j] = rowPlaces[k];
            }
        }
        rowLength[row] = length;
        for (int c = 0; c < l; c++) {
            int j = besideColumn[c];
            int place = stamp[j] == row ? placeInRow[j] : newPlace(row, j);
            targets[targetsFrom + c] = place;
            values.add(place, beside[c]);
        }
        rowCount[row] = rowLength[row];
        // A row may be changed again before another one overwrites the stamps: they must not outlive this call.
        for (int k = 0; k < rowLength[row]; k++) {
            stamp[rowColumn[row][k]] = -1;
        }
    }

    private int newPlace(int row, int column) {
        if ((places & 0xffff) == 0) {
            Memory.check(places, 40, "filled places");
        }
        int place = places++;
        values.room(places);
        int length = rowLength[row]++;
        if (length == rowColumn[row].length) {
            rowColumn[row] = Arrays.copyOf(rowColumn[row], 2 * length + 4);
            rowPlace[row] = Arrays.copyOf(rowPlace[row], 2 * length + 4);
        }
        rowColumn[row][length] = column;
        rowPlace[row][length] = place;
        addToColumn(row, column, place);
        return place;
    }

    private void addToColumn(int row, int column, int place) {
        int length = columnLength[column];
        if (length == columnRow[column].length) {
            length = compactColumn(column, length);
        }
        columnRow[column][length] = row;
        columnPlace[column][length] = place;
        columnLength[column] = length + 1;
        columnCount[column]++;
    }

    /** Drops the rows that are done from a full column, and makes room where that frees little. */
    private int compactColumn(int column, int length) {
        int[] rows = columnRow[column];
        int[] columnPlaces = columnPlace[column];
        int kept = 0;
        for (int k = 0; k < length; k++) {
            if (!rowDone[rows[k]]) {
                rows[kept] = rows[k];
                columnPlaces[kept++] = columnPlaces[k];
            }
        }
        if (2 * kept >= rows.length) {
            columnRow[column] = Arrays.copyOf(rows, 2 * kept + 4);
            columnPlace[column] = Arrays.copyOf(columnPlaces, 2 * kept + 4);
        }
        return kept;
    }
}
