package ropewalk.algebra.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import ropewalk.algebra.Adversaries;
import ropewalk.algebra.IntegerMatrix;

class LanesTest {
    private static final long SEED = 99;

    private static double residue(Random random, long p) {
        return switch (random.nextInt(6)) {
            case 0 -> p;
            case 1 -> -p;
            case 2 -> p - 1;
            case 3 -> random.nextInt(5) - 2;
            default -> (random.nextLong() % p);
        };
    }

    /** Near both ends of the range where the arithmetic is proved, and where p² passes a power of two. */
    private static long[] primes() {
        long[] primes = java.util.Arrays.copyOf(Primes.range(0, 4), 16);
        BigInteger end = BigInteger.ONE.shiftLeft(49);
        BigInteger middle = BigInteger.ONE.shiftLeft(99).sqrt();
        for (int k = 4; k < 8; k++) {
            primes[k] = (end = end.nextProbablePrime()).longValueExact();
            primes[k + 4] = (middle = middle.nextProbablePrime()).longValueExact();
        }
        middle = BigInteger.ONE.shiftLeft(99).sqrt().subtract(BigInteger.valueOf(1000));
        for (int k = 12; k < 16; k++) {
            primes[k] = (middle = middle.nextProbablePrime()).longValueExact();
        }
        return primes;
    }

    @ParameterizedTest
    @EnumSource(Lanes.Arithmetic.class)
    void productsAndDifferencesAreExact(Lanes.Arithmetic arithmetic) {
        Random random = new Random(SEED);
        Lanes lanes = new Lanes(primes(), arithmetic);
        double[] a = new double[16];
        double[] b = new double[16];
        double[] t = new double[16];
        double[] product = new double[16];
        for (int c = 0; c < 20_000; c++) {
            double[] before = new double[16];
            for (int k = 0; k < 16; k++) {
                a[k] = residue(random, lanes.prime(k));
                b[k] = residue(random, lanes.prime(k));
                before[k] = t[k] = residue(random, lanes.prime(k));
            }
            lanes.subtractProduct(t, a, b);
            lanes.multiply(product, a, b);
            for (int k = 0; k < 16; k++) {
                BigInteger p = BigInteger.valueOf(lanes.prime(k));
                BigInteger ab = BigInteger.valueOf((long) a[k]).multiply(BigInteger.valueOf((long) b[k]));
                BigInteger expected = BigInteger.valueOf((long) before[k]).subtract(ab).mod(p);
                assertEquals(expected.longValue(), lanes.canonical(t[k], k), "seed " + SEED);
                assertEquals(ab.mod(p).longValue(), lanes.canonical(product[k], k), "seed " + SEED);
                assertTrue(Math.abs(t[k]) <= lanes.prime(k) && Math.abs(product[k]) <= lanes.prime(k), "seed " + SEED);
                assertEquals(expected.signum() == 0, lanes.isZero(t[k], k));
            }
        }
    }

    @Test
    void primesOutsideTheProofAreRefused() {
        for (long p : new long[] {3, 1L << 49, (1L << 50) + 1}) {
            assertThrows(IllegalArgumentException.class, () -> new Lanes(new long[] {p}));
        }
    }

    /** A whole program gives the same residues with both: no result can depend on which one was faster. */
    @Test
    void programsAgree() {
        Random random = new Random(SEED);
        for (int c = 0; c < 300; c++) {
            IntegerMatrix m = Adversaries.square(c % Adversaries.KINDS, 1 + random.nextInt(20), random);
            Elimination elimination = Elimination.record(m, m.isSymmetric(), Adversaries.PRIMES[c % 3], () -> { });
            ProgramRun fused = new ProgramRun(elimination.program(), 8, () -> { });
            ProgramRun longs = new ProgramRun(elimination.program(), 8, () -> { });
            for (int from = 0; from < 24; from += 8) {
                fused.run(new Lanes(Primes.range(from, from + 8), Lanes.Arithmetic.FUSED));
                longs.run(new Lanes(Primes.range(from, from + 8), Lanes.Arithmetic.LONG));
                for (int lane = 0; lane < 8; lane++) {
                    assertEquals(fused.product(lane), longs.product(lane), () -> "seed " + SEED + ", " + m);
                }
                assertArrayEquals(fused.restIsZero(), longs.restIsZero(), () -> "seed " + SEED + ", " + m);
            }
        }
    }

    @ParameterizedTest
    @EnumSource(Lanes.Arithmetic.class)
    void inversesInvert(Lanes.Arithmetic arithmetic) {
        Random random = new Random(SEED);
        Lanes lanes = new Lanes(Primes.range(5, 13), arithmetic);
        double[] a = new double[8];
        double[] inverse = new double[8];
        for (int c = 0; c < 500; c++) {
            for (int k = 0; k < 8; k++) {
                a[k] = residue(random, lanes.prime(k));
            }
            lanes.invert(inverse, a);
            for (int k = 0; k < 8; k++) {
                BigInteger p = BigInteger.valueOf(lanes.prime(k));
                BigInteger v = BigInteger.valueOf((long) a[k]).mod(p);
                assertEquals(v.signum() == 0 ? BigInteger.ZERO : v.modInverse(p), BigInteger.valueOf(lanes.canonical(inverse[k], k)));
            }
        }
    }

    @Test
    void fieldProductsAreExact() {
        Random random = new Random(SEED);
        for (long p : new long[] {2, 3, 65537, Integer.MAX_VALUE, (1L << 50) - 27, (1L << 50) - 1}) {
            PrimeField field = new PrimeField(p);
            for (int c = 0; c < 20_000; c++) {
                long a = c % 7 == 0 ? p - 1 : field.of(random.nextLong());
                long b = c % 5 == 0 ? p - 1 : field.of(random.nextLong());
                assertEquals(BigInteger.valueOf(a).multiply(BigInteger.valueOf(b)).mod(BigInteger.valueOf(p)).longValue(),
                    field.multiply(a, b), () -> a + " * " + b + " modulo " + p);
            }
        }
    }
}
