package ropewalk.algebra;

import java.util.Random;

/** Random matrices of the shapes that link diagrams give. Every result is a function of the arguments and the generator. */
final class Samples {
    private Samples() {
    }

    /**
     * The Laplacian of a side × side square grid with random diagonals, some edges missing, all weights
     * random signs, or all 1; the last row and column struck. Planar, with separators of the order of the side: the hard case.
     */
    static IntegerMatrix planarLaplacian(int side, Random random, boolean alternating) {
        IntegerMatrix.Builder builder = IntegerMatrix.builder(side * side, side * side);
        for (int i = 0; i < side; i++) {
            for (int j = 0; j < side; j++) {
                int v = i * side + j;
                int kind = random.nextInt(8);
                // All columns of the grid are there and the first row: it stays connected.
                if (j + 1 < side && (kind != 0 || i == 0)) {
                    edge(builder, v, v + 1, weight(random, alternating));
                }
                if (i + 1 < side) {
                    edge(builder, v, v + side, weight(random, alternating));
                }
                if (i + 1 < side && j + 1 < side && kind < 3) {
                    edge(builder, v, v + side + 1, weight(random, alternating));
                }
            }
        }
        return builder.build().without(side * side - 1, side * side - 1);
    }

    private static long weight(Random random, boolean alternating) {
        return alternating || random.nextBoolean() ? 1 : -1;
    }

    private static void edge(IntegerMatrix.Builder builder, int u, int v, long w) {
        builder.add(u, v, w).add(v, u, w).add(u, u, -w).add(v, v, -w);
    }

    /** Rows with 2, -1, -1 at three near columns of a side × side grid, one row and column struck: not symmetric. */
    static IntegerMatrix colouring(int side, Random random) {
        int n = side * side;
        IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n);
        for (int v = 0; v < n; v++) {
            int i = v / side;
            int j = v % side;
            int right = i * side + (j + 1) % side;
            int down = (i + 1) % side * side + j;
            int[] place = {v, right, down};
            int over = random.nextInt(3);
            for (int k = 0; k < 3; k++) {
                builder.add(v, place[k], k == over ? 2 : -1);
            }
        }
        return builder.build().without(n - 1, n - 1);
    }

    /** Any matrix: each place is filled with the probability, by a value up to the size. */
    static IntegerMatrix any(int rows, int columns, double density, int size, Random random) {
        IntegerMatrix.Builder builder = IntegerMatrix.builder(rows, columns);
        for (int i = 0; i < rows; i++) {
            for (int j = 0; j < columns; j++) {
                if (random.nextDouble() < density) {
                    builder.add(i, j, random.nextInt(2 * size + 1) - size);
                }
            }
        }
        return builder.build();
    }

    /** A symmetric matrix; about half of the diagonal is 0. */
    static IntegerMatrix symmetric(int n, double density, int size, Random random) {
        IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n);
        for (int i = 0; i < n; i++) {
            if (random.nextBoolean()) {
                builder.add(i, i, random.nextInt(2 * size + 1) - size);
            }
            for (int j = i + 1; j < n; j++) {
                if (random.nextDouble() < density) {
                    long v = random.nextInt(2 * size + 1) - size;
                    builder.add(i, j, v).add(j, i, v);
                }
            }
        }
        return builder.build();
    }

    /** A matrix of rank at most r: the product of a rows × r and an r × columns matrix with values -1, 0, 1. */
    static IntegerMatrix ofRank(int rows, int columns, int r, Random random) {
        long[] left = any(rows, r, 0.6, 1, random).toDense();
        long[] right = any(r, columns, 0.6, 1, random).toDense();
        long[] product = new long[rows * columns];
        for (int i = 0; i < rows; i++) {
            for (int j = 0; j < columns; j++) {
                for (int k = 0; k < r; k++) {
                    product[i * columns + j] += left[i * r + k] * right[k * columns + j];
                }
            }
        }
        return IntegerMatrix.ofDense(rows, columns, product);
    }
}
