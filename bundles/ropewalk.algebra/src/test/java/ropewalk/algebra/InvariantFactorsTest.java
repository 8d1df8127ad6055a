package ropewalk.algebra;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import ropewalk.algebra.internal.ModularSmith;

class InvariantFactorsTest {
    private static final long SEED = 141421;
    private static final Runnable NONE = () -> { };

    @Test
    void agreeWithTheMinors() {
        Random random = new Random(SEED);
        for (int c = 0; c < 1500; c++) {
            int rows = random.nextInt(5);
            int columns = random.nextInt(5);
            IntegerMatrix m = switch (c % 3) {
                case 0 -> Samples.any(rows, columns, 0.8, 1 + random.nextInt(12), random);
                case 1 -> Samples.ofRank(rows, columns, random.nextInt(4), random);
                default -> Samples.any(rows, columns, 0.8, 1 << 25, random);
            };
            List<BigInteger> expected = SlowAlgebra.factorsByMinors(m);
            assertEquals(expected, InvariantFactors.of(m, NONE), () -> "seed " + SEED + ", " + m);
            assertEquals(expected, ModularSmith.factors(m, NONE), () -> "seed " + SEED + ", " + m);
        }
    }

    /** U D V with U and V products of random elementary matrices has the factors of D. */
    @Test
    void planted() {
        Random random = new Random(SEED);
        long[][] planted = {{}, {2}, {3, 3, 3}, {2, 4, 8}, {2, 6, 12, 0}, {0, 0, 0}, {5, 1_000_003L * 5}, {3, 3, 3, 3, 45, 45L * 1009},
            {2, 2, 2, 2, 2, 2, 6, 30, 30 * 7 * 11 * 13 * 17}, {(1L << 31) - 1}, {1L << 20, 1L << 40}};
        for (long[] factors : planted) {
            for (int c = 0; c < 6; c++) {
                int n = factors.length + 10 + random.nextInt(20);
                int columns = n;
                BigInteger[][] a = new BigInteger[n][n];
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j < n; j++) {
                        a[i][j] = i != j ? BigInteger.ZERO : i < factors.length ? BigInteger.valueOf(factors[i]) : BigInteger.ONE;
                    }
                }
                for (int step = 0; step < 2 * n; step++) {
                    int i = random.nextInt(n);
                    int k = (i + 1 + random.nextInt(n - 1)) % n;
                    boolean add = random.nextBoolean();
                    boolean byRows = random.nextBoolean();
                    for (int j = 0; j < n; j++) {
                        BigInteger by = byRows ? a[k][j] : a[j][k];
                        if (byRows) {
                            a[i][j] = add ? a[i][j].add(by) : a[i][j].subtract(by);
                        } else {
                            a[j][i] = add ? a[j][i].add(by) : a[j][i].subtract(by);
                        }
                    }
                }
                IntegerMatrix.Builder builder = IntegerMatrix.builder(n, columns);
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j < n; j++) {
                        builder.add(i, j, a[i][j].longValueExact());
                    }
                }
                IntegerMatrix m = builder.build();
                List<BigInteger> expected = new ArrayList<>();
                for (long f : factors) {
                    expected.add(BigInteger.valueOf(f));
                }
                assertEquals(expected, InvariantFactors.of(m, NONE), () -> "seed " + SEED + ", " + m);
            }
        }
    }

    @Test
    void transposingKeepsTheFactorsUpToFreeOnes() {
        Random random = new Random(SEED);
        for (int c = 0; c < 40; c++) {
            IntegerMatrix m = Samples.any(20 + random.nextInt(20), 20 + random.nextInt(20), 0.1, 3, random);
            assertEquals(torsion(InvariantFactors.of(m, NONE)), torsion(InvariantFactors.of(m.transposed(), NONE)),
                () -> "seed " + SEED + ", " + m);
            int free = InvariantFactors.of(m, NONE).size() - torsion(InvariantFactors.of(m, NONE)).size();
            assertEquals(m.columns() - Rank.of(m, NONE), free, () -> "seed " + SEED + ", " + m);
        }
    }

    private static List<BigInteger> torsion(List<BigInteger> factors) {
        return factors.stream().filter(f -> f.signum() != 0).toList();
    }

    @Test
    void productIsTheDeterminantAndFactorsCountRanks() {
        Random random = new Random(SEED);
        for (int side = 4; side < 14; side++) {
            for (IntegerMatrix m : List.of(Samples.planarLaplacian(side, random, false), Samples.planarLaplacian(side, random, true),
                Samples.colouring(side, random))) {
                List<BigInteger> factors = InvariantFactors.of(m, NONE);
                BigInteger product = BigInteger.ONE;
                for (int k = 0; k < factors.size(); k++) {
                    product = product.multiply(factors.get(k));
                    if (k > 0 && factors.get(k - 1).signum() != 0) {
                        assertEquals(BigInteger.ZERO, factors.get(k).mod(factors.get(k - 1)), "divisibility");
                    }
                }
                assertEquals(Determinant.of(m, NONE).abs(), product, () -> "seed " + SEED + ", " + m);
                for (int p : new int[] {2, 3, 5, 7}) {
                    long divided = factors.stream().filter(f -> f.mod(BigInteger.valueOf(p)).signum() == 0).count();
                    assertEquals(m.columns() - divided, Rank.modulo(m, p, NONE), () -> "modulo " + p + ", seed " + SEED + ", " + m);
                }
            }
        }
    }
}
