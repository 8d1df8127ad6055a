package ropewalk.algebra.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.Random;
import org.junit.jupiter.api.Test;
import ropewalk.algebra.Adversaries;
import ropewalk.algebra.IntegerMatrix;

/** The number of primes: enough by the bound, and not one more than needed where the bound is met. */
class PrimeCountTest {
    private static final long SEED = 42;

    /** Sylvester's matrices (1867; recalled) have entries ±1 and meet Hadamard's bound: |det| = n^(n/2). */
    private static IntegerMatrix sylvester(int n) {
        long[] a = new long[n * n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                a[i * n + j] = Integer.bitCount(i & j) % 2 == 0 ? 1 : -1;
            }
        }
        return IntegerMatrix.ofDense(n, n, a);
    }

    private static IntegerMatrix firstRowsExchanged(IntegerMatrix m) {
        int n = m.rows();
        long[] a = m.toDense();
        long[] first = java.util.Arrays.copyOf(a, n);
        System.arraycopy(a, n, a, 0, n);
        System.arraycopy(first, 0, a, n, n);
        return IntegerMatrix.ofDense(n, n, a);
    }

    @Test
    void onePrimeFewerIsWrongWhereTheBoundIsMet() {
        for (int n : new int[] {32, 64, 128}) {
            IntegerMatrix symmetric = sylvester(n);
            IntegerMatrix general = firstRowsExchanged(symmetric);
            BigInteger size = BigInteger.valueOf(n).pow(n / 2);
            for (IntegerMatrix m : new IntegerMatrix[] {symmetric, general}) {
                int needed = ModularDeterminant.primesNeeded(m);
                BigInteger value = ModularDeterminant.withPrimes(m, needed);
                assertEquals(size, value.abs(), "n = " + n);
                assertNotEquals(value, ModularDeterminant.withPrimes(m, needed - 1), "one prime fewer, n = " + n);
                assertEquals(value, ModularDeterminant.withPrimes(m, needed + 3), "more primes, n = " + n);
            }
            assertEquals(ModularDeterminant.withPrimes(symmetric, 40).negate(), ModularDeterminant.withPrimes(general, 40));
        }
    }

    @Test
    void productOfThePrimesExceedsTwiceTheBound() {
        for (double bits : new double[] {0, 1, 48.98, 48.99, 49, 98.9, 98.98, 99, 1000, 12345.6}) {
            BigInteger product = BigInteger.ONE;
            for (long p : Primes.range(0, PrimeBudget.forBits(bits))) {
                product = product.multiply(BigInteger.valueOf(p));
            }
            // 2^(bits + 1) < product, compared by the bit length, which is at most one too large.
            assertTrue(product.bitLength() - 1 >= Math.floor(bits + 1) - 1e-9, bits + " bits, " + product.bitLength());
            assertTrue(product.compareTo(BigInteger.ONE.shiftLeft((int) Math.floor(bits + 1))) > 0, "bits " + bits);
        }
    }

    @Test
    void primesArePrimeAndDescend() {
        long[] primes = Primes.range(0, 300);
        for (int k = 0; k < primes.length; k++) {
            assertTrue(BigInteger.valueOf(primes[k]).isProbablePrime(60), primes[k] + "");
            assertTrue(primes[k] < 1L << 50 && primes[k] > 1L << 49);
            assertTrue(k == 0 || primes[k] < primes[k - 1]);
        }
        for (int n = 2; n < 5000; n++) {
            assertEquals(BigInteger.valueOf(n).isProbablePrime(60), Primes.isPrime(n), n + "");
        }
        // Strong pseudoprimes to base 2 (C. Pomerance, J. L. Selfridge and S. S. Wagstaff, 1980; recalled).
        for (long n : new long[] {2047, 3277, 4033, 4681, 8321, 3215031751L}) {
            assertTrue(!Primes.isPrime(n), n + "");
        }
    }

    @Test
    void boundsHold() {
        Random random = new Random(SEED);
        for (int c = 0; c < 400; c++) {
            int n = 1 + random.nextInt(12);
            IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    long v = random.nextInt(3) == 0 ? random.nextInt(7) - 3 : 0;
                    builder.add(i, j, v);
                    if (j < i) {
                        builder.add(j, i, v);
                    }
                }
            }
            IntegerMatrix m = builder.build();
            BigInteger value = ModularDeterminant.withPrimes(m, 5).abs();
            TreeBound tree = new TreeBound(m);
            ShiftedBound shifted = new ShiftedBound(m);
            MinimumDegree.run(m, () -> { }, tree, shifted);
            for (double bits : new double[] {tree.bits(), shifted.bits()}) {
                assertTrue(value.signum() == 0 || Math.log(value.doubleValue()) / Math.log(2) <= bits,
                    () -> "seed " + SEED + ", bound 2^" + bits + ", value " + value + ", " + m);
            }
            double both = MinorBound.ofDeterminant(m, true, () -> { });
            assertTrue(value.signum() == 0 || Math.log(value.doubleValue()) / Math.log(2) <= both, () -> "" + m);
        }
    }

    /** Each bound by itself, against values from many more primes than Hadamard's bound asks for. */
    @Test
    void boundsHoldForAdversaries() {
        Random random = new Random(SEED);
        int sharp = 0;
        for (int c = 0; c < 60 * (Adversaries.KINDS - 10); c++) {
            int n = 1 + random.nextInt(c % 10 == 0 ? 40 : 12);
            IntegerMatrix m = Adversaries.square(10 + c % (Adversaries.KINDS - 10), n, random);
            BigInteger value = ModularDeterminant.withPrimes(m, 3 + n * 66 / 49).abs();
            TreeBound tree = new TreeBound(m);
            ShiftedBound shifted = new ShiftedBound(m);
            MinimumDegree.run(m, () -> { }, tree, shifted);
            int shift = Math.max(0, value.bitLength() - 80);
            double least = value.signum() == 0 ? Double.NEGATIVE_INFINITY
                : shift + Math.log(value.shiftRight(shift).doubleValue()) / Math.log(2);
            double general = MinorBound.ofDeterminant(m, false, () -> { });
            for (double bits : new double[] {tree.bits(), shifted.bits(), general, MinorBound.ofDeterminant(m, true, () -> { })}) {
                assertTrue(bits >= least - 1e-11 * Math.abs(least), () -> "seed " + SEED + ", bound 2^" + bits + ", value " + value + ", " + m);
                sharp += bits < least + 0.01 ? 1 : 0;
            }
        }
        assertTrue(sharp > 20, "only " + sharp + " bounds were nearly met: the test is blunt");
    }

    /** |det (A + iδ)| is close to |det A| where no eigenvalue is near 0, and never below. */
    @Test
    void shiftedBoundIsCloseForWellConditionedMatrices() {
        Random random = new Random(SEED);
        for (int n : new int[] {1, 5, 50, 300}) {
            IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n);
            for (int i = 0; i < n; i++) {
                builder.add(i, i, random.nextBoolean() ? 7 : -7);
                if (i > 0) {
                    builder.add(i, i - 1, 2).add(i - 1, i, 2);
                }
            }
            IntegerMatrix m = builder.build();
            ShiftedBound shifted = new ShiftedBound(m);
            MinimumDegree.run(m, () -> { }, shifted);
            BigInteger value = ModularDeterminant.withPrimes(m, 40).abs();
            int shift = Math.max(0, value.bitLength() - 60);
            double exact = shift + Math.log(value.shiftRight(shift).doubleValue()) / Math.log(2);
            assertTrue(shifted.bits() >= exact - 1e-9 && shifted.bits() < exact + 0.01 + n * 1e-4, n + ": " + shifted.bits() + ", " + exact);
        }
    }

    /** Cayley (1889; recalled): the complete graph has n^(n-2) spanning trees; here the bound is the value. */
    @Test
    void treeBoundIsSharpForLaplacians() {
        for (int n : new int[] {3, 5, 10, 40}) {
            IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    builder.add(i, j, i == j ? n - 1 : -1);
                }
            }
            IntegerMatrix m = builder.build().without(0, 0);
            TreeBound tree = new TreeBound(m);
            MinimumDegree.run(m, () -> { }, tree);
            double bits = tree.bits();
            double exact = (n - 2) * Math.log(n) / Math.log(2);
            assertTrue(bits >= exact && bits < exact + 0.01, n + ": " + bits + " against " + exact);
        }
    }
}
