package ropewalk.algebra;

import java.math.BigInteger;
import java.util.Random;

/** Matrices made to break proofs: at the limits of 64 bits, of the bounds, of the pivots and of the rounding. */
public final class Adversaries {
    /** The number of kinds. */
    public static final int KINDS = 16;

    /** The largest primes below 2^50, found independently of the bundle. */
    public static final long[] PRIMES = primes(40);

    private Adversaries() {
    }

    private static long[] primes(int count) {
        long[] primes = new long[count];
        BigInteger candidate = BigInteger.ONE.shiftLeft(50).subtract(BigInteger.ONE);
        for (int k = 0; k < count; candidate = candidate.subtract(BigInteger.TWO)) {
            if (candidate.isProbablePrime(60)) {
                primes[k++] = candidate.longValueExact();
            }
        }
        return primes;
    }

    /**
     * A square matrix; from kind 10 on a symmetric one.
     *
     * @param kind 0 to {@link #KINDS} - 1
     * @param n rows and columns, at least 1
     * @param random where it comes from
     * @return the matrix
     */
    public static IntegerMatrix square(int kind, int n, Random random) {
        long[] a = new long[n * n];
        switch (kind) {
            case 0 -> nearOverflow(a, random);
            case 1 -> {
                // Singular but for 1 at one place.
                dependent(a, n, random);
                a[random.nextInt(a.length)] += random.nextInt(3) - 1;
            }
            case 2 -> rankOne(a, n, random);
            case 3 -> {
                nearOverflow(a, random);
                for (int i = 1; i < n; i++) {
                    if (random.nextInt(3) == 0) {
                        System.arraycopy(a, random.nextInt(i) * n, a, i * n, n);
                    }
                }
            }
            case 4 -> blocks(a, n, random);
            case 5 -> sylvester(a, n, 1L << random.nextInt(60));
            case 6 -> {
                // 2^a 3^b divides everything.
                small(a, 3, random);
                long scale = (1L << random.nextInt(20)) * (long) Math.pow(3, random.nextInt(12));
                for (int k = 0; k < a.length; k++) {
                    a[k] *= scale;
                }
            }
            case 7 -> unimodularTimesPrimes(a, n, random);
            case 8 -> {
                if (random.nextBoolean()) {
                    atTheLimitOfSmallMatrix(a, n, random);
                } else {
                    minorsAtTheLimit(a, n, random);
                    shuffle(a, n, random);
                }
            }
            case 9 -> {
                for (int k = 0; k < a.length; k++) {
                    a[k] = multipleOfAPrime(random);
                }
            }
            case 10 -> {
                nearOverflow(a, random);
                mirror(a, n);
                for (int i = 0; i < n && random.nextBoolean(); i++) {
                    a[i * n + i] = 0;
                }
            }
            case 11 -> laplacianOfCancellingWeights(a, n, random);
            case 12 -> symmetricTimesPrimes(a, n, random);
            case 13 -> {
                if (random.nextBoolean()) {
                    tinyEigenvalues(a, n, random);
                } else {
                    roundedAway(a, n, random);
                }
            }
            case 14 -> {
                for (int k = 0; k < a.length; k++) {
                    a[k] = multipleOfAPrime(random);
                }
                mirror(a, n);
            }
            case 15 -> {
                if (random.nextBoolean()) {
                    atTheLimitOfSmallMatrix(a, n, random);
                    mirror(a, n);
                    for (int i = 0; i < n; i++) {
                        a[i * n + i] = random.nextInt(3) == 0 ? a[i * n + i] : 0;
                    }
                } else {
                    minorsAtTheLimit(a, n, random);
                }
            }
            default -> throw new IllegalArgumentException("kind " + kind);
        }
        return IntegerMatrix.ofDense(n, n, a);
    }

    private static long sized(int bits, Random random) {
        return (random.nextLong() >>> 64 - bits | 1L << bits - 1) * (random.nextBoolean() ? 1 : -1);
    }

    /** At the ends of the range of 64 bits, or of the 32 bits within which {@link SmallMatrix#invariantFactors} stays. */
    private static void nearOverflow(long[] a, Random random) {
        int bits = random.nextInt(3) == 0 ? 31 : 63;
        int least = 20 + random.nextInt(bits - 20);
        for (int k = 0; k < a.length; k++) {
            a[k] = switch (random.nextInt(8)) {
                case 0 -> 0;
                case 1 -> random.nextInt(5) - 2;
                case 2 -> random.nextBoolean() ? -1L << bits : ~(-1L << bits);
                default -> sized(least + random.nextInt(bits + 1 - least), random);
            };
        }
    }

    private static void small(long[] a, int size, Random random) {
        for (int k = 0; k < a.length; k++) {
            a[k] = random.nextInt(2 * size + 1) - size;
        }
    }

    /** Every row is the sum or difference of two before, from the third on. */
    private static void dependent(long[] a, int n, Random random) {
        int bits = 1 + random.nextInt(40);
        for (int j = 0; j < n; j++) {
            a[j] = sized(bits, random);
        }
        for (int i = 1; i < n; i++) {
            int first = random.nextInt(i);
            int second = random.nextInt(i);
            for (int j = 0; j < n; j++) {
                a[i * n + j] = i < n - 1 && i < 3 ? sized(bits, random)
                    : i % 2 == 0 ? a[first * n + j] - a[second * n + j] : a[first * n + j] / 2 * 2 - a[second * n + j];
            }
        }
    }

    private static void rankOne(long[] a, int n, Random random) {
        long[] left = new long[n];
        long[] right = new long[n];
        for (int i = 0; i < n; i++) {
            left[i] = random.nextInt();
            right[i] = random.nextInt(4) == 0 ? 0 : random.nextInt();
        }
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                a[i * n + j] = left[i] * right[j];
            }
        }
    }

    private static void blocks(long[] a, int n, Random random) {
        int from = 0;
        while (from < n) {
            int to = Math.min(n, from + 1 + random.nextInt(4));
            for (int i = from; i < to; i++) {
                for (int j = from; j < to; j++) {
                    a[i * n + j] = random.nextInt(4) == 0 ? sized(1 + random.nextInt(63), random) : random.nextInt(7) - 3;
                }
            }
            from = to;
        }
    }

    /** Sylvester's matrix (1867; recalled) cut to n rows; for a power of two the determinant meets Hadamard's bound. */
    private static void sylvester(long[] a, int n, long scale) {
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                a[i * n + j] = Integer.bitCount(i & j) % 2 == 0 ? scale : -scale;
            }
        }
    }

    /** L D U with unit triangular L and U of 0, 1 and -1 near the diagonal, D of primes and ones: determinant 0 modulo them. */
    private static void unimodularTimesPrimes(long[] a, int n, Random random) {
        for (int i = 0; i < n; i++) {
            long d = random.nextInt(3) == 0 ? 1 : PRIMES[random.nextInt(random.nextBoolean() ? 2 : PRIMES.length)];
            long below = random.nextInt(3) - 1;
            long beside = random.nextInt(3) - 1;
            // Adds d (e_i + below e_(i+1)) (e_i + beside e_(i+1))ᵀ.
            a[i * n + i] += d;
            if (i + 1 < n) {
                a[(i + 1) * n + i] += below * d;
                a[i * n + i + 1] += beside * d;
                a[(i + 1) * n + i + 1] += below * beside * d;
            }
        }
        shuffle(a, n, random);
    }

    private static void symmetricTimesPrimes(long[] a, int n, Random random) {
        for (int i = 0; i < n; i++) {
            long d = (random.nextInt(3) == 0 ? 1 : PRIMES[random.nextInt(3)]) * (random.nextBoolean() ? 1 : -1);
            long below = random.nextInt(3) - 1;
            a[i * n + i] += d;
            if (i + 1 < n) {
                a[(i + 1) * n + i] += below * d;
                a[i * n + i + 1] += below * d;
                a[(i + 1) * n + i + 1] += below * below * d;
            }
        }
        if (random.nextInt(3) == 0) {
            // One eigenvalue 0, or not quite.
            a[n * n - 1] += random.nextInt(3) - 1;
        }
    }

    private static void shuffle(long[] a, int n, Random random) {
        for (int i = n - 1; i > 0; i--) {
            int k = random.nextInt(i + 1);
            for (int j = 0; j < n; j++) {
                long v = a[i * n + j];
                a[i * n + j] = a[k * n + j];
                a[k * n + j] = v;
            }
        }
    }

    /** The product of the lengths of the rows is near 2^30.5, above or below. */
    private static void atTheLimitOfSmallMatrix(long[] a, int n, Random random) {
        double size = Math.pow(2, 30.5 / n) / Math.sqrt(n) * (0.8 + 1.2 * random.nextDouble()) * (random.nextBoolean() ? 1 : 1.7);
        for (int k = 0; k < a.length; k++) {
            a[k] = random.nextInt(3) == 0 ? Math.round(random.nextGaussian() * size) : Math.round(random.nextBoolean() ? size : -size);
        }
    }

    /**
     * Symmetric blocks of order 1 and 2 on the diagonal, all of length 1 but one with orthogonal long rows: the minors from order
     * 2 on are as large as the product of the lengths, and numerators of fraction-free steps as large as its square.
     */
    private static void minorsAtTheLimit(long[] a, int n, Random random) {
        long s = 15_000 + random.nextInt(100_000);
        int big = random.nextInt(n);
        for (int i = 0; i < n; ) {
            boolean pair = i + 1 < n && (i == big || random.nextBoolean());
            long diagonal = i == big ? s : pair ? 0 : 1;
            a[i * n + i] = random.nextBoolean() ? diagonal : -diagonal;
            if (pair) {
                long beside = i == big ? s - random.nextInt(3) : 1;
                a[i * n + i + 1] = beside;
                a[(i + 1) * n + i] = beside;
                a[(i + 1) * n + i + 1] = random.nextInt(4) == 0 && i == big ? 0 : -a[i * n + i];
            }
            i += pair ? 2 : 1;
        }
    }

    private static long multipleOfAPrime(Random random) {
        return switch (random.nextInt(5)) {
            case 0 -> 0;
            case 1 -> random.nextInt(5) - 2;
            case 2 -> PRIMES[0] * (random.nextInt(7) - 3) + random.nextInt(2);
            default -> PRIMES[random.nextInt(3)] * (random.nextInt(7) - 3);
        };
    }

    private static void mirror(long[] a, int n) {
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < i; j++) {
                a[i * n + j] = a[j * n + i];
            }
        }
    }

    /** Edges of weight w and -w in parallel paths; rows add to 0, or nearly. Sometimes the last vertex is the ground. */
    private static void laplacianOfCancellingWeights(long[] a, int n, Random random) {
        long w = random.nextBoolean() ? 1 : sized(1 + random.nextInt(55), random);
        for (int edges = 2 * n; edges > 0; edges--) {
            int i = random.nextInt(n);
            int j = random.nextInt(n + 1);
            long weight = random.nextBoolean() ? w : -w;
            if (j == n) {
                a[i * n + i] += random.nextInt(4) == 0 ? weight : 0;
            } else if (i != j) {
                a[i * n + j] -= weight;
                a[j * n + i] -= weight;
                a[i * n + i] += weight;
                a[j * n + j] += weight;
            }
        }
    }

    /**
     * Blocks U diag(1, e) Uᵀ, e = -1, 0 or 1, U of determinant 1 with numbers of up to 30 bits: determinant e, but the entries
     * of 61 bits lose more than that on the way to doubles, so that a factorisation in floating point sees any sign.
     */
    private static void roundedAway(long[] a, int n, Random random) {
        for (int i = 0; i < n; i += 2) {
            BigInteger p = BigInteger.valueOf(2 + random.nextInt(1 << 30));
            BigInteger r = BigInteger.valueOf(2 + random.nextInt(1 << 30));
            if (i + 1 == n || !p.gcd(r).equals(BigInteger.ONE)) {
                a[i * n + i] = 1;
                continue;
            }
            // p s - r q = 1.
            long s = p.modInverse(r).longValueExact();
            long x = p.longValueExact();
            long y = r.longValueExact();
            long q = (x * s - 1) / y;
            long e = random.nextInt(3) - 1L;
            a[i * n + i] = x * x + e * y * y;
            a[i * n + i + 1] = x * q + e * y * s;
            a[(i + 1) * n + i] = a[i * n + i + 1];
            a[(i + 1) * n + i + 1] = q * q + e * s * s;
        }
    }

    /** L D Lᵀ, unit lower bidiagonal L with large numbers, D of 1 and -1: determinant ±1, eigenvalues near 0. */
    private static void tinyEigenvalues(long[] a, int n, Random random) {
        for (int i = 0; i < n; i++) {
            long d = random.nextInt(4) == 0 ? -1 : random.nextInt(8) == 0 ? 0 : 1;
            long below = sized(1 + random.nextInt(30), random);
            a[i * n + i] += d;
            if (i + 1 < n) {
                a[(i + 1) * n + i] += below * d;
                a[i * n + i + 1] += below * d;
                a[(i + 1) * n + i + 1] += below * below * d;
            }
        }
    }
}
