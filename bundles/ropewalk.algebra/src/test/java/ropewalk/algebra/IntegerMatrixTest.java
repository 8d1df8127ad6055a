package ropewalk.algebra;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;

class IntegerMatrixTest {
    private static final long SEED = 11;

    @Test
    void entriesInAnyOrderAddUp() {
        Random random = new Random(SEED);
        for (int c = 0; c < 500; c++) {
            int rows = random.nextInt(8);
            int columns = random.nextInt(8);
            long[] dense = new long[rows * columns];
            IntegerMatrix.Builder builder = IntegerMatrix.builder(rows, columns);
            for (int k = 0; k < 60 && dense.length > 0; k++) {
                int i = random.nextInt(rows);
                int j = random.nextInt(columns);
                long v = random.nextInt(5) - 2;
                dense[i * columns + j] += v;
                builder.add(i, j, v);
            }
            IntegerMatrix m = builder.build();
            assertArrayEquals(dense, m.toDense());
            assertEquals(IntegerMatrix.ofDense(rows, columns, dense), m, () -> "seed " + SEED + ", " + m);
            assertEquals(m.hashCode(), IntegerMatrix.ofDense(rows, columns, dense).hashCode());
            for (int i = 0; i < rows; i++) {
                for (int k = m.rowStart(i); k < m.rowStart(i + 1); k++) {
                    assertTrue(m.value(k) != 0, "no explicit zero");
                    assertTrue(k == m.rowStart(i) || m.column(k - 1) < m.column(k), "columns ascend");
                }
            }
            assertEquals(m.entries(), m.rowStart(rows));
        }
    }

    @Test
    void transposingTwiceGivesTheMatrixBack() {
        Random random = new Random(SEED);
        for (int c = 0; c < 200; c++) {
            IntegerMatrix m = Samples.any(random.nextInt(9), random.nextInt(9), 0.5, 3, random);
            IntegerMatrix t = m.transposed();
            assertEquals(m, t.transposed());
            for (int i = 0; i < m.rows(); i++) {
                for (int j = 0; j < m.columns(); j++) {
                    assertEquals(m.get(i, j), t.get(j, i));
                }
            }
            assertEquals(m.equals(t), m.isSymmetric(), () -> "seed " + SEED + ", " + m);
        }
    }

    @Test
    void symmetryIsSeen() {
        Random random = new Random(SEED);
        for (int n = 0; n < 30; n++) {
            assertTrue(Samples.symmetric(n, 0.3, 3, random).isSymmetric());
        }
        assertFalse(IntegerMatrix.ofDense(2, 2, new long[] {0, 1, 0, 0}).isSymmetric());
        assertFalse(IntegerMatrix.ofDense(2, 2, new long[] {0, 0, 1, 0}).isSymmetric());
        assertFalse(IntegerMatrix.ofDense(2, 2, new long[] {0, 1, 2, 0}).isSymmetric());
        assertFalse(IntegerMatrix.ofDense(1, 2, new long[] {1, 0}).isSymmetric());
    }

    @Test
    void strikingARowAndAColumnLeavesTheRest() {
        Random random = new Random(SEED);
        for (int c = 0; c < 200; c++) {
            IntegerMatrix m = Samples.any(1 + random.nextInt(7), 1 + random.nextInt(7), 0.6, 3, random);
            int row = random.nextInt(m.rows());
            int column = random.nextInt(m.columns());
            IntegerMatrix less = m.without(row, column);
            for (int i = 0; i < less.rows(); i++) {
                for (int j = 0; j < less.columns(); j++) {
                    assertEquals(m.get(i < row ? i : i + 1, j < column ? j : j + 1), less.get(i, j), () -> "seed " + SEED + ", " + m);
                }
            }
        }
    }

    @Test
    void mistakesAreNamed() {
        assertThrows(IllegalArgumentException.class, () -> IntegerMatrix.builder(-1, 2));
        assertThrows(IllegalArgumentException.class, () -> IntegerMatrix.ofDense(2, 2, new long[3]));
        assertThrows(IndexOutOfBoundsException.class, () -> IntegerMatrix.builder(1, 1).add(0, 1, 1));
        assertThrows(IndexOutOfBoundsException.class, () -> IntegerMatrix.builder(1, 1).build().without(1, 0));
        assertThrows(IndexOutOfBoundsException.class, () -> IntegerMatrix.builder(1, 1).build().get(0, 1));
        IntegerMatrix.Builder builder = IntegerMatrix.builder(1, 1).add(0, 0, Long.MAX_VALUE).add(0, 0, 1);
        assertThrows(ArithmeticException.class, builder::build);
        assertThrows(MatrixTooLargeException.class, () -> IntegerMatrix.builder(100_000, 100_000).build().toDense());
    }

    @Test
    void aBuilderMayBeUsedOn() {
        IntegerMatrix.Builder builder = IntegerMatrix.builder(2, 2).add(0, 0, 1);
        IntegerMatrix before = builder.build();
        IntegerMatrix after = builder.add(1, 1, 1).build();
        assertEquals(1, before.entries());
        assertEquals(2, after.entries());
    }
}
