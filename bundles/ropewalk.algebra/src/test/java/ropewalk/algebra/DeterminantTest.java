package ropewalk.algebra;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.Random;
import org.junit.jupiter.api.Test;
import ropewalk.algebra.internal.ModularDeterminant;

class DeterminantTest {
    private static final long SEED = 271828;
    private static final Runnable NONE = () -> { };

    private static void check(IntegerMatrix m) {
        BigInteger expected = SlowAlgebra.rankAndDeterminant(m)[1];
        assertEquals(expected, Determinant.of(m, NONE), () -> "seed " + SEED + ", " + m);
        // The sparse route as well where the small one would be taken.
        assertEquals(expected, ModularDeterminant.of(m, NONE), () -> "seed " + SEED + ", " + m);
    }

    @Test
    void emptyAndTiny() {
        check(IntegerMatrix.builder(0, 0).build());
        assertEquals(BigInteger.ONE, Determinant.of(IntegerMatrix.builder(0, 0).build(), NONE));
        for (long v : new long[] {0, 1, -1, Long.MAX_VALUE, Long.MIN_VALUE, (1L << 50) - 27}) {
            check(IntegerMatrix.ofDense(1, 1, new long[] {v}));
        }
        check(IntegerMatrix.builder(5, 5).build());
        assertThrows(IllegalArgumentException.class, () -> Determinant.of(IntegerMatrix.builder(2, 3).build(), NONE));
    }

    /** Rows of 2^62 (J - I) add to 2^64, which wraps to 0; the eigenvalues of J - I are 4 and four times -1. */
    @Test
    void rowSumsThatWrapAround() {
        for (long w : new long[] {1L << 62, -1L << 62}) {
            IntegerMatrix.Builder builder = IntegerMatrix.builder(5, 5);
            for (int i = 0; i < 5; i++) {
                for (int j = 0; j < 5; j++) {
                    builder.add(i, j, i == j ? 0 : w);
                }
            }
            IntegerMatrix m = builder.build();
            check(m);
            assertEquals(BigInteger.valueOf(4).multiply(BigInteger.valueOf(w).pow(5)), Determinant.of(m, NONE));
        }
    }

    @Test
    void smallOnes() {
        Random random = new Random(SEED);
        for (int c = 0; c < 1500; c++) {
            int n = random.nextInt(8);
            check(Samples.any(n, n, random.nextDouble(), 3, random));
            check(Samples.symmetric(n, random.nextDouble(), 2, random));
        }
    }

    @Test
    void largeEntries() {
        Random random = new Random(SEED);
        for (int c = 0; c < 200; c++) {
            int n = 1 + random.nextInt(9);
            long[] a = new long[n * n];
            for (int k = 0; k < a.length; k++) {
                a[k] = random.nextInt(3) == 0 ? 0 : random.nextLong() >> random.nextInt(64);
            }
            check(IntegerMatrix.ofDense(n, n, a));
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < i; j++) {
                    a[i * n + j] = a[j * n + i];
                }
            }
            check(IntegerMatrix.ofDense(n, n, a));
        }
    }

    @Test
    void mediumOnes() {
        Random random = new Random(SEED);
        for (int c = 0; c < 40; c++) {
            int n = 20 + random.nextInt(50);
            check(Samples.any(n, n, 3.0 / n, 3, random));
            check(Samples.symmetric(n, 3.0 / n, 2, random));
            check(Samples.ofRank(n, n, n - random.nextInt(2), random));
            check(Samples.any(n, n, 1, 1 << 20, random));
        }
        for (int side = 2; side < 11; side++) {
            check(Samples.planarLaplacian(side, random, false));
            check(Samples.planarLaplacian(side, random, true));
            check(Samples.colouring(side, random));
        }
    }

    @Test
    void multiplesOfThePrimesUsed() {
        // Entries that are 0 modulo the first primes: the pivots must be chosen anew, the primes skipped.
        BigInteger prime = BigInteger.ONE.shiftLeft(50).subtract(BigInteger.ONE);
        long[] first = new long[3];
        for (int k = 0; k < 3; k++) {
            while (!prime.isProbablePrime(100)) {
                prime = prime.subtract(BigInteger.ONE);
            }
            first[k] = prime.longValueExact();
            prime = prime.subtract(BigInteger.ONE);
        }
        Random random = new Random(SEED);
        for (int c = 0; c < 200; c++) {
            int n = 2 + random.nextInt(5);
            IntegerMatrix.Builder general = IntegerMatrix.builder(n, n);
            IntegerMatrix.Builder symmetric = IntegerMatrix.builder(n, n);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    long v = random.nextInt(4) == 0 ? random.nextInt(3) : first[random.nextInt(3)] * (random.nextInt(5) - 2);
                    general.add(i, j, v).add(j, i, random.nextInt(2));
                    symmetric.add(i, j, v);
                    if (j < i) {
                        symmetric.add(j, i, v);
                    }
                }
            }
            check(general.build());
            check(symmetric.build());
        }
    }

    @Test
    void exchangesTransposesBlocksAndScalings() {
        Random random = new Random(SEED);
        for (int c = 0; c < 30; c++) {
            int n = 30 + random.nextInt(30);
            IntegerMatrix m = c % 2 == 0 ? Samples.any(n, n, 3.0 / n, 2, random) : Samples.symmetric(n, 3.0 / n, 2, random);
            BigInteger d = Determinant.of(m, NONE);
            assertEquals(d, Determinant.of(m.transposed(), NONE), () -> "transposed, seed " + SEED + ", " + m);
            IntegerMatrix.Builder moved = IntegerMatrix.builder(n, n);
            IntegerMatrix.Builder sheared = IntegerMatrix.builder(n, n);
            IntegerMatrix.Builder doubled = IntegerMatrix.builder(2 * n, 2 * n);
            for (int i = 0; i < n; i++) {
                for (int k = m.rowStart(i); k < m.rowStart(i + 1); k++) {
                    int j = m.column(k);
                    moved.add((i + 1) % n, j, m.value(k));
                    sheared.add(i, j, m.value(k));
                    if (i % 3 == 0 && i + 1 < n) {
                        sheared.add(i + 1, j, 7 * m.value(k));
                    }
                    doubled.add(i, j, m.value(k)).add(n + i, n + j, 3 * m.value(k));
                }
            }
            // A cycle of n rows is an odd permutation for even n.
            assertEquals(n % 2 == 0 ? d.negate() : d, Determinant.of(moved.build(), NONE), () -> "seed " + SEED + ", " + m);
            assertEquals(d, Determinant.of(sheared.build(), NONE), () -> "seed " + SEED + ", " + m);
            assertEquals(d.multiply(d).multiply(BigInteger.valueOf(3).pow(n)), Determinant.of(doubled.build(), NONE),
                () -> "seed " + SEED + ", " + m);
        }
    }

    @Test
    void zeroPivotsEverywhere() {
        // A tree of pairs: every diagonal entry is 0, the determinant (-1)^(n/2) for a perfect matching, else 0.
        for (int n : new int[] {26, 27, 200, 201}) {
            IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n);
            for (int i = 0; i + 1 < n; i++) {
                builder.add(i, i + 1, 1).add(i + 1, i, 1);
            }
            BigInteger expected = n % 2 == 1 ? BigInteger.ZERO : n % 4 == 0 ? BigInteger.ONE : BigInteger.ONE.negate();
            assertEquals(expected, Determinant.of(builder.build(), NONE), "path with " + n + " vertices");
        }
    }

    @Test
    void whatTheCheckpointThrowsIsLetThrough() {
        IntegerMatrix m = Samples.planarLaplacian(20, new Random(SEED), true);
        IllegalStateException stop = new IllegalStateException("stop");
        for (int after : new int[] {0, 1, 10, 300, 1000}) {
            int[] count = new int[1];
            Runnable checkpoint = () -> {
                if (count[0]++ == after) {
                    throw stop;
                }
            };
            assertEquals(stop, assertThrows(IllegalStateException.class, () -> Determinant.of(m, checkpoint)));
        }
        int[] calls = new int[1];
        Determinant.of(m, () -> calls[0]++);
        assertTrue(calls[0] > 1000, "calls " + calls[0]);
    }
}
