package ropewalk.algebra;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class SmallMatrixTest {
    private static final long SEED = 20240501;
    private static final int CASES = 3000;

    @Test
    void determinantAgreesWithCofactors() {
        Random random = new Random(SEED);
        for (int c = 0; c < CASES; c++) {
            int n = random.nextInt(7);
            IntegerMatrix m = Samples.any(n, n, 0.3 + 0.7 * random.nextDouble(), 1 + random.nextInt(4), random);
            assertEquals(SlowAlgebra.cofactors(SlowAlgebra.big(m)).longValueExact(), SmallMatrix.determinant(m.toDense(), n),
                () -> "seed " + SEED + ", " + m);
        }
    }

    @Test
    void determinantIsRightOrRefusedForLargeEntries() {
        Random random = new Random(SEED);
        int refused = 0;
        for (int c = 0; c < CASES; c++) {
            int n = 1 + random.nextInt(6);
            IntegerMatrix m = Samples.any(n, n, 1, 1 << random.nextInt(30), random);
            long value = SmallMatrix.determinant(m.toDense(), n);
            if (value == SmallMatrix.TOO_LARGE) {
                refused++;
            } else {
                assertEquals(SlowAlgebra.cofactors(SlowAlgebra.big(m)), BigInteger.valueOf(value), () -> "seed " + SEED + ", " + m);
            }
        }
        assertTrue(refused > CASES / 10 && refused < CASES, "refused " + refused);
    }

    @Test
    void extremeEntriesAreRefused() {
        assertEquals(SmallMatrix.TOO_LARGE, SmallMatrix.determinant(new long[] {Long.MIN_VALUE}, 1));
        assertEquals(SmallMatrix.TOO_LARGE, SmallMatrix.determinant(new long[] {Long.MAX_VALUE}, 1));
        assertEquals(-1, SmallMatrix.rank(new long[] {Long.MIN_VALUE}, 1, 1));
        assertEquals(-1, SmallMatrix.invariantFactors(new long[] {Long.MIN_VALUE}, 1, 1, new long[1]));
        long[] result = {5, 6, 7, 8};
        assertFalse(SmallMatrix.symmetric(new long[] {Long.MIN_VALUE}, 1, result));
        assertEquals(5, result[0], "result is unchanged");
    }

    @Test
    void rankAgreesWithBigIntegers() {
        Random random = new Random(SEED);
        for (int c = 0; c < CASES; c++) {
            int rows = random.nextInt(9);
            int columns = random.nextInt(9);
            IntegerMatrix m = random.nextBoolean() ? Samples.any(rows, columns, random.nextDouble(), 2, random)
                : Samples.ofRank(rows, columns, random.nextInt(5), random);
            assertEquals(SlowAlgebra.rankAndDeterminant(m)[0].intValue(), SmallMatrix.rank(m.toDense(), rows, columns),
                () -> "seed " + SEED + ", " + m);
        }
    }

    @Test
    void symmetricAgreesWithTheCharacteristicPolynomial() {
        Random random = new Random(SEED);
        int singular = 0;
        for (int c = 0; c < CASES; c++) {
            int n = random.nextInt(9);
            IntegerMatrix m = Samples.symmetric(n, random.nextDouble(), 1 + random.nextInt(3), random);
            long[] result = new long[4];
            assertTrue(SmallMatrix.symmetric(m.toDense(), n, result), () -> "seed " + SEED + ", " + m);
            Inertia inertia = SlowAlgebra.inertia(m);
            assertEquals(SlowAlgebra.rankAndDeterminant(m)[1].longValueExact(), n == 0 ? 1 : result[0], () -> "" + m);
            assertEquals(inertia, new Inertia((int) result[2], (int) result[3], (int) result[1]), () -> "seed " + SEED + ", " + m);
            singular += inertia.zero() > 0 ? 1 : 0;
        }
        assertTrue(singular > CASES / 10, "singular " + singular);
    }

    @Test
    void emptyDiagonalIsNoObstacle() {
        Random random = new Random(SEED);
        for (int c = 0; c < CASES; c++) {
            int n = 1 + random.nextInt(8);
            IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < i; j++) {
                    long v = random.nextInt(5) - 2;
                    builder.add(i, j, v).add(j, i, v);
                }
            }
            IntegerMatrix m = builder.build();
            long[] result = new long[4];
            assertTrue(SmallMatrix.symmetric(m.toDense(), n, result));
            assertEquals(SlowAlgebra.inertia(m), new Inertia((int) result[2], (int) result[3], (int) result[1]), () -> "" + m);
            assertEquals(SlowAlgebra.rankAndDeterminant(m)[1].longValueExact(), result[0], () -> "" + m);
        }
    }

    @Test
    void factorsAgreeWithMinors() {
        Random random = new Random(SEED);
        for (int c = 0; c < CASES / 3; c++) {
            int rows = random.nextInt(5);
            int columns = random.nextInt(5);
            IntegerMatrix m = random.nextInt(4) > 0 ? Samples.any(rows, columns, 0.8, 1 + random.nextInt(6), random)
                : Samples.ofRank(rows, columns, random.nextInt(4), random);
            long[] out = new long[columns];
            int count = SmallMatrix.invariantFactors(m.toDense(), rows, columns, out);
            List<BigInteger> factors = new ArrayList<>();
            for (int k = 0; k < count; k++) {
                factors.add(BigInteger.valueOf(out[k]));
            }
            assertEquals(SlowAlgebra.factorsByMinors(m), factors, () -> "seed " + SEED + ", " + m);
        }
    }

    /** ((±1, x), (y, 0)) has the factor xy, which wraps around if the limits of the entries are too wide. */
    @Test
    void factorsAreRightOrRefusedWhereTheProductOverflows() {
        Random random = new Random(SEED);
        int right = 0;
        int refused = 0;
        for (int c = 0; c < CASES; c++) {
            long x = (1L << random.nextInt(45)) - random.nextInt(2);
            long y = (1L << random.nextInt(45)) + random.nextInt(2);
            int sign = random.nextBoolean() ? 1 : -1;
            long[] out = new long[2];
            int count = SmallMatrix.invariantFactors(new long[] {sign, x, y, 0}, 2, 2, out);
            BigInteger expected = BigInteger.valueOf(x).multiply(BigInteger.valueOf(y));
            if (count < 0) {
                refused++;
            } else {
                assertEquals(expected, count == 0 ? BigInteger.ONE : BigInteger.valueOf(out[0]), x + ", " + y);
                right++;
            }
        }
        assertTrue(refused > CASES / 10 && right > CASES / 10, "refused " + refused + ", right " + right);
    }

    /** Orthogonal rows of length s√2 and unit rows: products of minors are 4 s⁴, from 2^57 to 2^70. */
    @Test
    void numeratorsAtTheLimit() {
        for (long s = 20_000; s < 150_000; s += 97) {
            long[] a = {s, s, 0, 0, s, -s, 0, 0, 0, 0, 0, 1, 0, 0, 1, 0};
            long value = SmallMatrix.determinant(a.clone(), 4);
            long expected = 2 * s * s;
            assertTrue(value == expected || value == SmallMatrix.TOO_LARGE, s + ": " + value);
            assertEquals(4.0 * s * s * s * s < 0x1p61 * (1 - 1e-6), value != SmallMatrix.TOO_LARGE, s + " is just in or out of reach");
            long[] result = new long[4];
            if (SmallMatrix.symmetric(a.clone(), 4, result)) {
                assertArrayEquals(new long[] {expected, 0, 2, 2}, result, "s = " + s);
            }
        }
    }

    @Test
    void rankModuloAPrimeAgreesWithBigIntegers() {
        Random random = new Random(SEED);
        int[] primes = {2, 3, 5, 7, 65537, Integer.MAX_VALUE};
        for (int c = 0; c < CASES; c++) {
            int p = primes[random.nextInt(primes.length)];
            int rows = random.nextInt(10);
            int columns = random.nextInt(c % 50 == 0 ? 80 : 10);
            IntegerMatrix m = Samples.any(rows, columns, random.nextDouble(), c % 3 == 0 ? 1 << 20 : 3, random);
            assertEquals(SlowAlgebra.rankModulo(m, p), SmallMatrix.rankModulo(m.toDense(), rows, columns, p),
                () -> "seed " + SEED + ", modulo " + p + ", " + m);
        }
    }

    @Test
    void extremeResiduesAreReduced() {
        for (long v : new long[] {Long.MIN_VALUE, Long.MAX_VALUE, -33, -32, 31, 32}) {
            for (int p : new int[] {2, 3, 5, Integer.MAX_VALUE}) {
                int expected = BigInteger.valueOf(v).mod(BigInteger.valueOf(p)).signum();
                assertEquals(expected, SmallMatrix.rankModulo(new long[] {v, 0}, 1, 2, p), v + " modulo " + p);
            }
        }
    }

    @Test
    void whatLiesBehindTheMatrixIsLeftAlone() {
        long[] a = {2, 1, 1, 2, 77, 78};
        SmallMatrix.determinant(a, 2);
        assertEquals(77, a[4]);
        assertEquals(78, a[5]);
    }
}
