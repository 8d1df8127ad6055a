package ropewalk.algebra;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Random;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.DecompositionFactory_DDRM;
import org.junit.jupiter.api.Test;
import ropewalk.algebra.internal.CertifiedInertia;
import ropewalk.algebra.internal.DenseBareiss;

class InertiaTest {
    private static final long SEED = 577215;
    private static final Runnable NONE = () -> { };

    private static int[] counts(Inertia inertia) {
        return new int[] {inertia.positive(), inertia.negative(), inertia.zero()};
    }

    @Test
    void allRoutesAgreeWithTheCharacteristicPolynomial() {
        Random random = new Random(SEED);
        for (int c = 0; c < 600; c++) {
            int n = random.nextInt(c % 20 == 0 ? 30 : 10);
            IntegerMatrix m = Samples.symmetric(n, random.nextDouble(), 1 + random.nextInt(c % 2 == 0 ? 3 : 100), random);
            Inertia expected = SlowAlgebra.inertia(m);
            assertEquals(expected, Inertia.of(m, NONE), () -> "seed " + SEED + ", " + m);
            assertArrayEquals(counts(expected), CertifiedInertia.of(m, NONE), () -> "seed " + SEED + ", " + m);
            assertArrayEquals(counts(expected), DenseBareiss.inertia(m, NONE), () -> "seed " + SEED + ", " + m);
        }
    }

    @Test
    void largerOnesAgreeWithBigIntegers() {
        Random random = new Random(SEED);
        for (int side = 5; side < 13; side++) {
            IntegerMatrix m = Samples.planarLaplacian(side, random, false);
            assertArrayEquals(DenseBareiss.inertia(m, NONE), counts(Inertia.of(m, NONE)), () -> "seed " + SEED + ", " + m);
            IntegerMatrix sparse = Samples.symmetric(8 * side, 1.2 / side / 8, 2, random);
            assertArrayEquals(DenseBareiss.inertia(sparse, NONE), counts(Inertia.of(sparse, NONE)), () -> "seed " + SEED + ", " + sparse);
        }
    }

    /** EJML's eigenvalues are only floating point: counted where they are clearly away from 0. */
    @Test
    void ejmlSeesTheSameSigns() {
        Random random = new Random(SEED);
        for (int n : new int[] {10, 30, 60, 120}) {
            IntegerMatrix m = Samples.symmetric(n, 4.0 / n, 3, random);
            DMatrixRMaj a = new DMatrixRMaj(n, n);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    a.set(i, j, m.get(i, j));
                }
            }
            var eigen = DecompositionFactory_DDRM.eig(n, false, true);
            eigen.decompose(a);
            int[] counts = new int[3];
            for (int k = 0; k < n; k++) {
                double value = eigen.getEigenvalue(k).getReal();
                counts[value > 1e-9 ? 0 : value < -1e-9 ? 1 : 2]++;
            }
            assertArrayEquals(counts, counts(Inertia.of(m, NONE)), () -> "seed " + SEED + ", " + m);
        }
    }

    /** Eigenvalues far below any shift tried: the certificate must fail, not lie, and the exact route decide. */
    @Test
    void tinyEigenvalues() {
        for (int sign : new int[] {1, -1}) {
            // ((q, q + 1), (q + 1, q + 2)) has determinant -1, an eigenvalue of about -1 / 2q; one more to make it ± 1.
            long q = 1L << 40;
            int n = 30;
            IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n);
            for (int k = 0; k < n; k += 2) {
                builder.add(k, k, sign * q).add(k, k + 1, sign * (q + 1)).add(k + 1, k, sign * (q + 1)).add(k + 1, k + 1, sign * (q + 2));
            }
            assertEquals(new Inertia(n / 2, n / 2, 0), Inertia.of(builder.build(), NONE));
        }
        // A Gram matrix with one eigenvalue of about 2^-80: x -> (x, 2^20 x + ...) chained.
        int n = 30;
        IntegerMatrix.Builder chain = IntegerMatrix.builder(n, n);
        for (int k = 0; k < n; k++) {
            // L Lᵀ for unit lower bidiagonal L with 2^15 below the diagonal: positive definite with determinant 1.
            long below = 1L << 15;
            chain.add(k, k, k == 0 ? 1 : 1 + below * below);
            if (k > 0) {
                chain.add(k, k - 1, below).add(k - 1, k, below);
            }
        }
        assertEquals(new Inertia(n, 0, 0), Inertia.of(chain.build(), NONE));
    }

    @Test
    void congruenceKeepsTheInertia() {
        Random random = new Random(SEED);
        for (int c = 0; c < 20; c++) {
            int n = 30 + random.nextInt(20);
            IntegerMatrix m = Samples.symmetric(n, 2.0 / n, 2, random);
            int[][] order = new int[1][n];
            for (int k = 0; k < n; k++) {
                int at = random.nextInt(k + 1);
                order[0][k] = order[0][at];
                order[0][at] = k;
            }
            IntegerMatrix.Builder moved = IntegerMatrix.builder(n, n);
            for (int i = 0; i < n; i++) {
                for (int k = m.rowStart(i); k < m.rowStart(i + 1); k++) {
                    int sign = (i % 2 == 0 ? 1 : -1) * (m.column(k) % 2 == 0 ? 1 : -1);
                    moved.add(order[0][i], order[0][m.column(k)], sign * m.value(k));
                }
            }
            assertEquals(Inertia.of(m, NONE), Inertia.of(moved.build(), NONE), () -> "seed " + SEED + ", " + m);
        }
    }

    @Test
    void mistakesAreNamed() {
        assertThrows(IllegalArgumentException.class, () -> Inertia.of(IntegerMatrix.ofDense(2, 2, new long[] {0, 1, 0, 0}), NONE));
        assertEquals(new Inertia(0, 0, 0), Inertia.of(IntegerMatrix.builder(0, 0).build(), NONE));
        assertEquals(new Inertia(0, 0, 50), Inertia.of(IntegerMatrix.builder(50, 50).build(), NONE));
        assertEquals(-1, new Inertia(2, 3, 4).signature());
    }
}
