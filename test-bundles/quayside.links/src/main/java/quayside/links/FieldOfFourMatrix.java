package quayside.links;

/**
 * A matrix over the field of 4 elements {0, 1, ω, ω + 1}, ω² = ω + 1. An element a + bω is the number a + 2b, so that
 * adding is exclusive or; a row keeps its a and its b as bits of two lists of words.
 */
final class FieldOfFourMatrix {

    static final int ONE = 1;
    static final int OMEGA = 2;

    private final int columns;
    private final long[][] ones;
    private final long[][] omegas;

    FieldOfFourMatrix(int rows, int columns) {
        this.columns = columns;
        int words = (columns + 63) >> 6;
        ones = new long[rows][words];
        omegas = new long[rows][words];
    }

    /** Adds an element, 0 … 3, to an entry. */
    void add(int row, int column, int element) {
        ones[row][column >> 6] ^= (element & 1L) << column;
        omegas[row][column >> 6] ^= (element >> 1 & 1L) << column;
    }

    private int entry(int row, int column) {
        return (int) (ones[row][column >> 6] >>> column & 1 | (omegas[row][column >> 6] >>> column & 1) << 1);
    }

    /**
     * The rank. Brings the matrix to echelon form: it serves once. O(rows² · columns / 64).
     *
     * @param checkpoint called once a column
     */
    int rank(Runnable checkpoint) {
        int rank = 0;
        for (int column = 0; column < columns && rank < ones.length; column++) {
            checkpoint.run();
            int pivot = rank;
            while (pivot < ones.length && entry(pivot, column) == 0) {
                pivot++;
            }
            if (pivot == ones.length) {
                continue;
            }
            swap(ones, pivot, rank);
            swap(omegas, pivot, rank);
            int inverse = square(entry(rank, column));          // x³ = 1
            for (int row = rank + 1; row < ones.length; row++) {
                int entry = entry(row, column);
                if (entry != 0) {
                    addMultiple(row, rank, product(entry, inverse), column >> 6);
                }
            }
            rank++;
        }
        return rank;
    }

    private void addMultiple(int target, int source, int factor, int from) {
        for (int w = from; w < ones[target].length; w++) {
            long a = ones[source][w];
            long b = omegas[source][w];
            // (a + bω)(1) = a + bω, (a + bω)ω = b + (a + b)ω, (a + bω)(1 + ω) = (a + b) + aω
            ones[target][w] ^= factor == ONE ? a : factor == OMEGA ? b : a ^ b;
            omegas[target][w] ^= factor == ONE ? b : factor == OMEGA ? a ^ b : a;
        }
    }

    static int product(int x, int y) {
        int low = (x & 1) * y;
        int high = (x >> 1) * y;                                // to be multiplied by ω
        return low ^ (high >> 1) ^ ((high & 1) ^ (high >> 1)) << 1;
    }

    private static int square(int x) {
        return product(x, x);
    }

    private static void swap(long[][] rows, int i, int j) {
        long[] row = rows[i];
        rows[i] = rows[j];
        rows[j] = row;
    }
}
