package ropewalk.algebra.internal;

/**
 * Smith's normal form of a small dense matrix in place (H. J. S. Smith, Phil. Trans. 151 (1861) 293–326).
 *
 * <p>Every entry is kept below 2^31 in absolute value, checked after every operation, so that no product or sum of the next
 * operation can leave 64 bits.
 */
public final class SmallSmith {
    private static final long LIMIT = 1L << 31;

    private SmallSmith() {
    }

    /**
     * The invariant factors of the cokernel of the row lattice.
     *
     * @param a the matrix, row-major, overwritten
     * @param rows the number of rows
     * @param columns the number of columns
     * @param out receives the factors other than 1, then columns - rank zeros
     * @return how many were written, or -1 if an entry reached 2^31
     */
    public static int factors(long[] a, int rows, int columns, long[] out) {
        if (magnitude(a, 0, rows * columns) >= LIMIT) {
            return -1;
        }
        int written = 0;
        int t = 0;
        int steps = Math.min(rows, columns);
        while (t < steps && bringSmallest(a, rows, columns, t)) {
            long d = settle(a, rows, columns, t);
            if (d < 0) {
                return -1;
            }
            if (d != 1) {
                out[written++] = d;
            }
            t++;
        }
        for (; t < columns; t++) {
            out[written++] = 0;
        }
        return written;
    }

    private static long magnitude(long[] a, int from, int to) {
        long bits = 0;
        for (int k = from; k < to; k++) {
            bits |= a[k] ^ (a[k] >> 63);
        }
        return bits;
    }

    /** Brings an entry of least absolute value, not 0, to (t, t). False if all entries left are 0. */
    private static boolean bringSmallest(long[] a, int rows, int columns, int t) {
        long least = Long.MAX_VALUE;
        int row = -1;
        int column = -1;
        for (int i = t; i < rows && least > 1; i++) {
            for (int j = t; j < columns; j++) {
                long v = Math.abs(a[i * columns + j]);
                if (v != 0 && v < least) {
                    least = v;
                    row = i;
                    column = j;
                    if (v == 1) {
                        break;
                    }
                }
            }
        }
        if (row < 0) {
            return false;
        }
        exchangeRows(a, columns, t, row, t);
        exchangeColumns(a, rows, columns, t, column, t);
        return true;
    }

    /** Clears row and column t and makes (t, t) divide what is left. The pivot, positive, or -1 on reaching 2^31. */
    private static long settle(long[] a, int rows, int columns, int t) {
        while (true) {
            int row = clearColumn(a, rows, columns, t);
            if (row == -2) {
                return -1;
            }
            if (row >= 0) {
                exchangeRows(a, columns, t, row, t);
                continue;
            }
            long pivot = a[t * columns + t];
            if (pivot == 1 || pivot == -1) {
                return 1;
            }
            // Column t is empty below the pivot: taking multiples of it from another column changes row t only.
            int column = t + 1;
            while (column < columns && (a[t * columns + column] %= pivot) == 0) {
                column++;
            }
            if (column < columns) {
                exchangeColumns(a, rows, columns, t, column, t);
                continue;
            }
            row = notDivided(a, rows, columns, t, pivot);
            if (row < 0) {
                return Math.abs(pivot);
            }
            for (int j = t + 1; j < columns; j++) {
                a[t * columns + j] = a[row * columns + j];
            }
        }
    }

    /**
     * Takes multiples of row t from the rows below, until only remainders are left in column t.
     *
     * @return the row with the least remainder that is not 0; -1 if there is none; -2 if an entry reached 2^31
     */
    private static int clearColumn(long[] a, int rows, int columns, int t) {
        int top = t * columns;
        long pivot = a[top + t];
        boolean unit = pivot == 1 || pivot == -1;
        long bits = 0;
        long least = Long.MAX_VALUE;
        int leastRow = -1;
        for (int i = t + 1; i < rows; i++) {
            int at = i * columns;
            long v = a[at + t];
            if (v == 0) {
                continue;
            }
            long q = unit ? v * pivot : v / pivot;
            for (int j = t; j < columns; j++) {
                long w = a[at + j] - q * a[top + j];
                a[at + j] = w;
                bits |= w ^ (w >> 63);
            }
            long rest = Math.abs(a[at + t]);
            if (rest != 0 && rest < least) {
                least = rest;
                leastRow = i;
            }
        }
        return bits >= LIMIT ? -2 : leastRow;
    }

    private static int notDivided(long[] a, int rows, int columns, int t, long pivot) {
        for (int i = t + 1; i < rows; i++) {
            for (int j = t + 1; j < columns; j++) {
                if (a[i * columns + j] % pivot != 0) {
                    return i;
                }
            }
        }
        return -1;
    }

    private static void exchangeRows(long[] a, int columns, int i, int k, int from) {
        if (i != k) {
            for (int j = from; j < columns; j++) {
                long v = a[i * columns + j];
                a[i * columns + j] = a[k * columns + j];
                a[k * columns + j] = v;
            }
        }
    }

    private static void exchangeColumns(long[] a, int rows, int columns, int j, int k, int from) {
        if (j != k) {
            for (int i = from; i < rows; i++) {
                long v = a[i * columns + j];
                a[i * columns + j] = a[i * columns + k];
                a[i * columns + k] = v;
            }
        }
    }
}
