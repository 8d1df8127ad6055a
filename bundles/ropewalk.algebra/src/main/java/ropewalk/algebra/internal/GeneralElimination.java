package ropewalk.algebra.internal;

import java.math.BigInteger;
import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;

/**
 * Sparse Gaussian elimination of any matrix over a residue ring, the pivots chosen as it goes by the count of H. M. Markowitz
 * (Manag. Sci. 3 (1957) 255–269): few entries in the pivot's row and column, and a unit of the ring.
 *
 * <p>Places are those of {@link FillLines}. A place that was once filled stays, also where its value cancels, and every step
 * is told in full, zeros included, so that the steps told to the listener are right modulo every prime and over the rationals,
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

    private final PlaceValues values;
    private final Listener listener;
    private final Runnable checkpoint;
    private final FillLines lines;
    private final int[] rowCount;
    private final int[] columnCount;
    private final Queue rowQueue;
    private final Queue columnQueue;

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
        lines = new FillLines(matrix);
        rowCount = lines.rowLength.clone();
        columnCount = lines.columnCount;
        rowQueue = new Queue(matrix.rows());
        columnQueue = new Queue(matrix.columns());
        pivotRows = new int[Math.min(matrix.rows(), matrix.columns())];
        pivotColumns = new int[pivotRows.length];
        placeInRow = new int[matrix.columns()];
        stamp = new int[matrix.columns()];
        Arrays.fill(stamp, -1);
    }

    /** Eliminates as long as a unit is left. */
    void run() {
        for (int i = 0; i < rowCount.length; i++) {
            offerRow(i);
        }
        for (int j = 0; j < columnCount.length; j++) {
            offerColumn(j);
        }
        while (choose()) {
            checkpoint.run();
            if (values.confirm(bestPlace)) {
                eliminate(bestRow, bestColumn, bestPlace);
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
        return lines.places();
    }

    /** The places outside all pivot rows and columns. */
    int[] rest() {
        return lines.rest();
    }

    /** The values outside all pivot rows and columns as a dense matrix, without lines that are empty. */
    BigInteger[][] rest(ResidueValues residues) {
        return lines.rest(residues);
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
        if (lines.columnLength[j] > 2 * columnCount[j]) {
            lines.compactColumn(j);
        }
        int[] rows = lines.columnRow[j];
        int[] places = lines.columnPlace[j];
        boolean found = false;
        for (int k = 0; k < lines.columnLength[j]; k++) {
            int i = rows[k];
            // The test may be dear: not asked where the answer would not matter.
            if (!lines.rowDone[i] && (!found || cost(i, j) < bestCost) && values.isPivot(places[k])) {
                found = true;
                consider(i, j, places[k]);
            }
        }
        return found;
    }

    private boolean lookAtRow(int i) {
        int[] columns = lines.rowColumn[i];
        int[] places = lines.rowPlace[i];
        boolean found = false;
        for (int k = 0; k < lines.rowLength[i]; k++) {
            int j = columns[k];
            if (!lines.columnDone[j] && (!found || cost(i, j) < bestCost) && values.isPivot(places[k])) {
                found = true;
                consider(i, j, places[k]);
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

    private void eliminate(int row, int column, int pivot) {
        int l = collectRow(row, column);
        int m = collectColumn(row, column);
        lines.dropRow(row);
        lines.dropColumn(column);
        rowQueue.remove(row);
        columnQueue.remove(column);
        long changes = (long) m * l;
        if (changes > targets.length) {
            Memory.check(changes, Integer.BYTES, "changes of one step");
            targets = new int[Math.toIntExact(Math.max(changes, Math.min(changes * 3 / 2, Integer.MAX_VALUE - 8)))];
        }
        if (m > 0 && l > 0) {
            values.startStep(pivot);
        }
        for (int k = 0; k < m; k++) {
            checkpoint.run();
            change(belowRow[k], below[k], l, k * l);
        }
        for (int c = 0; c < l; c++) {
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

    /** The live places of the pivot row without the pivot. */
    private int collectRow(int row, int column) {
        int length = lines.rowLength[row];
        if (length > beside.length) {
            beside = new int[2 * length];
            besideColumn = new int[2 * length];
        }
        int l = 0;
        for (int k = 0; k < length; k++) {
            int j = lines.rowColumn[row][k];
            if (j != column && !lines.columnDone[j]) {
                beside[l] = lines.rowPlace[row][k];
                besideColumn[l++] = j;
            }
        }
        return l;
    }

    /** The live places of the pivot column without the pivot. */
    private int collectColumn(int row, int column) {
        int length = lines.columnLength[column];
        if (length > below.length) {
            below = new int[2 * length];
            belowRow = new int[2 * length];
        }
        int m = 0;
        for (int k = 0; k < length; k++) {
            int i = lines.columnRow[column][k];
            if (i != row && !lines.rowDone[i]) {
                below[m] = lines.columnPlace[column][k];
                belowRow[m++] = i;
            }
        }
        return m;
    }

    /** Adds a multiple of the pivot row to a row, and drops what is done from the row. */
    private void change(int row, int factorPlace, int l, int targetsFrom) {
        if (l > 0) {
            values.startRow(factorPlace);
        }
        lines.compactRow(row);
        for (int k = 0; k < lines.rowLength[row]; k++) {
            int j = lines.rowColumn[row][k];
            stamp[j] = row;
            placeInRow[j] = lines.rowPlace[row][k];
        }
        for (int c = 0; c < l; c++) {
            int j = besideColumn[c];
            int place = stamp[j] == row ? placeInRow[j] : newPlace(row, j);
            targets[targetsFrom + c] = place;
            values.add(place, beside[c]);
        }
        rowCount[row] = lines.rowLength[row];
        // A row may be changed again before another one overwrites the stamps: they must not outlive this call.
        for (int k = 0; k < lines.rowLength[row]; k++) {
            stamp[lines.rowColumn[row][k]] = -1;
        }
    }

    private int newPlace(int row, int column) {
        int place = lines.newPlace(row, column);
        values.room(lines.places());
        return place;
    }
}
