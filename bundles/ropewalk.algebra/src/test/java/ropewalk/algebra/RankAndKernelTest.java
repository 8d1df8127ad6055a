package ropewalk.algebra;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;

class RankAndKernelTest {
    private static final long SEED = 161803;
    private static final Runnable NONE = () -> { };
    private static final int[] PRIMES = {2, 3, 5, 31, 65537, Integer.MAX_VALUE};

    @Test
    void rankAgreesWithBigIntegers() {
        Random random = new Random(SEED);
        for (int c = 0; c < 150; c++) {
            int rows = random.nextInt(70);
            int columns = random.nextInt(70);
            IntegerMatrix m = switch (c % 3) {
                case 0 -> Samples.any(rows, columns, 2.5 / Math.max(1, columns), 3, random);
                case 1 -> Samples.ofRank(rows, columns, random.nextInt(40), random);
                default -> Samples.symmetric(rows, 1.5 / Math.max(1, rows), 2, random);
            };
            int expected = SlowAlgebra.rankAndDeterminant(m)[0].intValue();
            assertEquals(expected, Rank.of(m, NONE), () -> "seed " + SEED + ", " + m);
            assertEquals(expected, Rank.of(m.transposed(), NONE), () -> "transposed, seed " + SEED + ", " + m);
        }
    }

    @Test
    void rankIsNotThatOfTheFirstPrime() {
        // Modulo 2^50 - 27, the largest prime below 2^50, the rank is smaller than over the rationals.
        long p = (1L << 50) - 27;
        int n = 40;
        IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n + 1);
        for (int i = 0; i < n; i++) {
            builder.add(i, i, i % 3 == 0 ? p : 1);
        }
        assertEquals(n, Rank.of(builder.build(), NONE));
        builder.add(n - 1, n - 1, -1);
        assertEquals((n - 1) % 3 == 0 ? n : n - 1, Rank.of(builder.build(), NONE));
    }

    @Test
    void rankModuloPrimesAgreesWithTheDenseRoute() {
        Random random = new Random(SEED);
        for (int c = 0; c < 150; c++) {
            int p = PRIMES[c % PRIMES.length];
            IntegerMatrix m = Samples.any(random.nextInt(70), 1 + random.nextInt(70), 0.06, 4, random);
            assertEquals(SlowAlgebra.rankModulo(m, p), Rank.modulo(m, p, NONE), () -> "seed " + SEED + ", modulo " + p + ", " + m);
        }
        assertThrows(IllegalArgumentException.class, () -> Rank.modulo(IntegerMatrix.builder(1, 1).build(), 9, NONE));
        assertThrows(IllegalArgumentException.class, () -> Rank.modulo(IntegerMatrix.builder(1, 1).build(), 1, NONE));
    }

    @Test
    void kernelIsABasisOfSolutions() {
        Random random = new Random(SEED);
        for (int c = 0; c < 200; c++) {
            int p = PRIMES[c % PRIMES.length];
            int rows = random.nextInt(40);
            int columns = random.nextInt(60);
            IntegerMatrix m = c % 2 == 0 ? Samples.any(rows, columns, 0.1, 4, random)
                : Samples.ofRank(rows, columns, random.nextInt(20), random);
            int[][] basis = Kernel.modulo(m, p, NONE);
            assertEquals(columns - SlowAlgebra.rankModulo(m, p), basis.length, () -> "seed " + SEED + ", modulo " + p + ", " + m);
            IntegerMatrix.Builder vectors = IntegerMatrix.builder(basis.length, columns);
            for (int b = 0; b < basis.length; b++) {
                for (int i = 0; i < rows; i++) {
                    long sum = 0;
                    for (int k = m.rowStart(i); k < m.rowStart(i + 1); k++) {
                        sum = Math.floorMod(sum + m.value(k) * basis[b][m.column(k)], (long) p);
                    }
                    assertEquals(0, sum, () -> "seed " + SEED + ", modulo " + p + ", " + m);
                }
                for (int j = 0; j < columns; j++) {
                    assertTrue(basis[b][j] >= 0 && basis[b][j] < p);
                    vectors.add(b, j, basis[b][j]);
                }
            }
            assertEquals(basis.length, SlowAlgebra.rankModulo(vectors.build(), p), "independent");
        }
    }

    @Test
    void aMillionRows() {
        // Three columns; row i is (1, i mod 2, i mod 3): rank 3, and modulo 2 and 3 as well.
        int rows = 1_000_000;
        IntegerMatrix.Builder thin = IntegerMatrix.builder(rows, 3);
        IntegerMatrix.Builder chain = IntegerMatrix.builder(rows, rows);
        for (int i = 0; i < rows; i++) {
            thin.add(i, 0, 1).add(i, 1, i % 2).add(i, 2, i % 3);
            chain.add(i, i, 1).add(i, (i + 1) % rows, -1);
        }
        IntegerMatrix m = thin.build();
        assertEquals(3, Rank.modulo(m, 2, NONE));
        assertEquals(3, Rank.modulo(m, 3, NONE));
        assertEquals(3, Rank.of(m, NONE));
        // The incidence matrix of a cycle has rank one less than its length.
        assertEquals(rows - 1, Rank.modulo(chain.build(), 3, NONE));
    }
}
