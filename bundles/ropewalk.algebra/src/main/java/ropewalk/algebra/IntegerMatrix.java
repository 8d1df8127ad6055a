package ropewalk.algebra;

import java.util.Arrays;

/**
 * A sparse matrix of 64-bit integers. Immutable and thread-safe.
 *
 * <p><b>Conventions.</b> Rows are 0 … rows-1, columns 0 … columns-1; either number may be 0. The entries of row i are
 * number {@code rowStart(i)} to {@code rowStart(i + 1) - 1}, their columns ascend strictly, and no value is 0.
 *
 * <p><b>Equality</b> is equality of size and of all entries.
 *
 * <p><b>Cost</b> for z entries: 12 z + 4 rows bytes. Accessors are O(1), except {@link #get} which is O(log) of the
 * entries of the row; everything that makes another matrix is O(z + rows + columns), except {@link #toDense}.
 *
 * @since 1.0
 */
public final class IntegerMatrix {
    private final int columns;
    private final int[] start;
    private final int[] column;
    private final long[] value;

    private IntegerMatrix(int columns, int[] start, int[] column, long[] value) {
        this.columns = columns;
        this.start = start;
        this.column = column;
        this.value = value;
    }

    /**
     * Starts a matrix without entries.
     *
     * @param rows the number of rows, at least 0
     * @param columns the number of columns, at least 0
     * @return a builder, to be used by one thread
     * @throws IllegalArgumentException if a number is negative
     */
    public static Builder builder(int rows, int columns) {
        return new Builder(rows, columns);
    }

    /**
     * Makes a matrix from all its entries.
     *
     * @param rows the number of rows
     * @param columns the number of columns
     * @param rowMajor rows·columns values, entry (i, j) at i·columns + j; copied
     * @return the matrix
     * @throws IllegalArgumentException if a number is negative or the array has another length
     */
    public static IntegerMatrix ofDense(int rows, int columns, long[] rowMajor) {
        checkSize(rows, columns);
        if ((long) rows * columns != rowMajor.length) {
            throw new IllegalArgumentException("rowMajor has " + rowMajor.length + " values; a " + rows + " x " + columns
                + " matrix needs " + (long) rows * columns);
        }
        int count = 0;
        for (long v : rowMajor) {
            count += v == 0 ? 0 : 1;
        }
        int[] start = new int[rows + 1];
        int[] column = new int[count];
        long[] value = new long[count];
        int next = 0;
        for (int i = 0; i < rows; i++) {
            for (int j = 0; j < columns; j++) {
                long v = rowMajor[i * columns + j];
                if (v != 0) {
                    column[next] = j;
                    value[next++] = v;
                }
            }
            start[i + 1] = next;
        }
        return new IntegerMatrix(columns, start, column, value);
    }

    private static void checkSize(int rows, int columns) {
        if (rows < 0 || columns < 0 || rows == Integer.MAX_VALUE || columns == Integer.MAX_VALUE) {
            throw new IllegalArgumentException("a matrix of " + rows + " x " + columns
                + " was asked for; both numbers must be 0 to " + (Integer.MAX_VALUE - 1));
        }
    }

    /**
     * The number of rows.
     *
     * @return at least 0
     */
    public int rows() {
        return start.length - 1;
    }

    /**
     * The number of columns.
     *
     * @return at least 0
     */
    public int columns() {
        return columns;
    }

    /**
     * The number of entries that are not 0.
     *
     * @return at least 0
     */
    public int entries() {
        return column.length;
    }

    /**
     * Where the entries of a row begin.
     *
     * @param i a row, or the number of rows
     * @return the number of the first entry of row i; for i = rows the number of entries
     */
    public int rowStart(int i) {
        return start[i];
    }

    /**
     * The column of an entry.
     *
     * @param k the number of the entry
     * @return its column
     */
    public int column(int k) {
        return column[k];
    }

    /**
     * The value of an entry.
     *
     * @param k the number of the entry
     * @return its value, not 0
     */
    public long value(int k) {
        return value[k];
    }

    /**
     * The value at a place.
     *
     * @param i the row
     * @param j the column
     * @return the value, possibly 0
     */
    public long get(int i, int j) {
        if (j < 0 || j >= columns) {
            throw new IndexOutOfBoundsException("column " + j + " of a matrix with " + columns + " columns");
        }
        int k = Arrays.binarySearch(column, start[i], start[i + 1], j);
        return k < 0 ? 0 : value[k];
    }

    /**
     * All values.
     *
     * @return a new array of rows·columns values, entry (i, j) at i·columns + j
     * @throws MatrixTooLargeException if no array is that long
     */
    public long[] toDense() {
        long size = (long) rows() * columns;
        if (size > Integer.MAX_VALUE - 8) {
            throw new MatrixTooLargeException("a " + rows() + " x " + columns + " matrix has " + size
                + " places, more than an array holds; read its entries one by one");
        }
        long[] dense = new long[(int) size];
        for (int i = 0; i < rows(); i++) {
            for (int k = start[i]; k < start[i + 1]; k++) {
                dense[i * columns + column[k]] = value[k];
            }
        }
        return dense;
    }

    /**
     * The transposed matrix.
     *
     * @return a matrix with rows and columns exchanged
     */
    public IntegerMatrix transposed() {
        int[] newStart = new int[columns + 1];
        for (int j : column) {
            newStart[j + 1]++;
        }
        for (int j = 0; j < columns; j++) {
            newStart[j + 1] += newStart[j];
        }
        int[] next = Arrays.copyOf(newStart, columns);
        int[] newColumn = new int[column.length];
        long[] newValue = new long[column.length];
        for (int i = 0; i < rows(); i++) {
            for (int k = start[i]; k < start[i + 1]; k++) {
                int to = next[column[k]]++;
                newColumn[to] = i;
                newValue[to] = value[k];
            }
        }
        return new IntegerMatrix(rows(), newStart, newColumn, newValue);
    }

    /**
     * This matrix without one row and one column.
     *
     * @param row the row to strike out
     * @param struckColumn the column to strike out
     * @return a matrix of one row and one column less
     * @throws IndexOutOfBoundsException if there is no such row or column
     */
    public IntegerMatrix without(int row, int struckColumn) {
        if (row < 0 || row >= rows() || struckColumn < 0 || struckColumn >= columns) {
            throw new IndexOutOfBoundsException("row " + row + " and column " + struckColumn + " cannot be struck out of a "
                + rows() + " x " + columns + " matrix");
        }
        int[] newStart = new int[rows()];
        int[] newColumn = new int[column.length];
        long[] newValue = new long[column.length];
        int next = 0;
        for (int i = 0, to = 0; i < rows(); i++) {
            if (i == row) {
                continue;
            }
            for (int k = start[i]; k < start[i + 1]; k++) {
                if (column[k] != struckColumn) {
                    newColumn[next] = column[k] > struckColumn ? column[k] - 1 : column[k];
                    newValue[next++] = value[k];
                }
            }
            newStart[++to] = next;
        }
        return new IntegerMatrix(columns - 1, newStart, Arrays.copyOf(newColumn, next), Arrays.copyOf(newValue, next));
    }

    /**
     * Whether the matrix equals its transposed matrix.
     *
     * @return true if it is square and symmetric
     */
    public boolean isSymmetric() {
        if (rows() != columns) {
            return false;
        }
        // Rows ascend, so the entries (j, i) with i = 0, 1, … are met in the order of row j: one cursor a row suffices.
        int[] cursor = Arrays.copyOf(start, columns);
        for (int i = 0; i < columns; i++) {
            for (int k = start[i]; k < start[i + 1]; k++) {
                int j = column[k];
                int c = cursor[j]++;
                if (c >= start[j + 1] || column[c] != i || value[c] != value[k]) {
                    return false;
                }
            }
        }
        return true;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof IntegerMatrix that && columns == that.columns && Arrays.equals(start, that.start)
            && Arrays.equals(column, that.column) && Arrays.equals(value, that.value);
    }

    @Override
    public int hashCode() {
        return 31 * (31 * Arrays.hashCode(start) + Arrays.hashCode(column)) + Arrays.hashCode(value);
    }

    @Override
    public String toString() {
        StringBuilder text = new StringBuilder(rows() + " x " + columns + " matrix, " + entries() + " entries");
        if (rows() <= 20 && columns <= 20) {
            for (int i = 0; i < rows(); i++) {
                text.append(i == 0 ? ": [" : "; ");
                for (int j = 0; j < columns; j++) {
                    text.append(j == 0 ? "" : ", ").append(get(i, j));
                }
            }
            text.append(rows() == 0 ? "" : "]");
        }
        return text.toString();
    }

    /** Collects entries in any order; entries at one place are added. Not thread-safe. */
    public static final class Builder {
        private final int rows;
        private final int columns;
        private int size;
        private int[] row = new int[16];
        private int[] column = new int[16];
        private long[] value = new long[16];

        Builder(int rows, int columns) {
            checkSize(rows, columns);
            this.rows = rows;
            this.columns = columns;
        }

        /**
         * Adds a value at a place.
         *
         * @param i the row
         * @param j the column
         * @param v the value
         * @return this builder
         * @throws IndexOutOfBoundsException if the place is outside the matrix
         */
        public Builder add(int i, int j, long v) {
            if (i < 0 || i >= rows || j < 0 || j >= columns) {
                throw new IndexOutOfBoundsException("place (" + i + ", " + j + ") is outside a " + rows + " x " + columns
                    + " matrix");
            }
            if (size == row.length) {
                grow();
            }
            row[size] = i;
            column[size] = j;
            value[size++] = v;
            return this;
        }

        private void grow() {
            if (size > 700_000_000) {
                throw new MatrixTooLargeException("more than 700000000 entries were added; add equal places up first");
            }
            int length = size + (size >> 1);
            row = Arrays.copyOf(row, length);
            column = Arrays.copyOf(column, length);
            value = Arrays.copyOf(value, length);
        }

        /**
         * Makes the matrix. The builder may be used on.
         *
         * @return the matrix of the sums
         * @throws ArithmeticException if a sum at one place leaves the range of 64 bits
         */
        public IntegerMatrix build() {
            int[] byColumn = sorted(null, column, columns);
            int[] order = sorted(byColumn, row, rows);
            int[] start = new int[rows + 1];
            int[] newColumn = new int[size];
            long[] newValue = new long[size];
            int next = 0;
            for (int k = 0, i = 0; i < rows; i++) {
                while (k < size && row[order[k]] == i) {
                    int j = column[order[k]];
                    long sum = 0;
                    for (; k < size && row[order[k]] == i && column[order[k]] == j; k++) {
                        sum = sum(sum, value[order[k]], i, j);
                    }
                    newColumn[next] = j;
                    newValue[next] = sum;
                    next += sum == 0 ? 0 : 1;
                }
                start[i + 1] = next;
            }
            return new IntegerMatrix(columns, start, Arrays.copyOf(newColumn, next), Arrays.copyOf(newValue, next));
        }

        private static long sum(long a, long b, int i, int j) {
            long sum = a + b;
            if (((a ^ sum) & (b ^ sum)) < 0) {
                throw new ArithmeticException("the values added at (" + i + ", " + j
                    + ") leave the range of 64 bits; scale the matrix down or split the entry over more rows");
            }
            return sum;
        }

        /** A stable counting sort of the entries, given in the order {@code before} (null: as added), by key. */
        private int[] sorted(int[] before, int[] key, int keys) {
            int[] next = new int[keys + 1];
            for (int k = 0; k < size; k++) {
                next[key[k] + 1]++;
            }
            for (int k = 0; k < keys; k++) {
                next[k + 1] += next[k];
            }
            int[] order = new int[size];
            for (int k = 0; k < size; k++) {
                int entry = before == null ? k : before[k];
                order[next[key[entry]]++] = entry;
            }
            return order;
        }
    }
}
