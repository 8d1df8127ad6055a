package ropewalk.algebra.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.Random;
import org.junit.jupiter.api.Test;

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

    @Test
    void productsAndDifferencesAreExact() {
        Random random = new Random(SEED);
        Lanes lanes = new Lanes(Primes.range(0, 16));
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
    void inversesInvert() {
        Random random = new Random(SEED);
        Lanes lanes = new Lanes(Primes.range(5, 13));
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
