package ropewalk.algebra;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import ropewalk.algebra.internal.CertifiedInertia;
import ropewalk.algebra.internal.DenseBareiss;
import ropewalk.algebra.internal.ModularDeterminant;
import ropewalk.algebra.internal.ModularRank;
import ropewalk.algebra.internal.ModularSmith;

/**
 * Every route against plain big integers on {@link Adversaries}. More cases with {@code -Dropewalk.cases=100000}, others with
 * {@code -Dropewalk.seed=1}.
 */
class AdversarialTest {
    private static final long SEED = Long.getLong("ropewalk.seed", 602214);
    private static final int CASES = Integer.getInteger("ropewalk.cases", 100);
    private static final Runnable NONE = () -> { };

    static int[] kinds() {
        int[] kinds = new int[Adversaries.KINDS];
        for (int k = 0; k < kinds.length; k++) {
            kinds[k] = k;
        }
        return kinds;
    }

    @ParameterizedTest(name = "kind {0}")
    @MethodSource("kinds")
    void small(int kind) {
        Random random = new Random(SEED + kind);
        for (int c = 0; c < CASES; c++) {
            IntegerMatrix m = Adversaries.square(kind, 1 + random.nextInt(7), random);
            check(kind, m);
            if (m.rows() > 1) {
                // Not square: one row, or one column, is gone.
                int at = random.nextInt(m.rows());
                IntegerMatrix.Builder cut = IntegerMatrix.builder(m.rows(), m.rows() - 1);
                for (int i = 0; i < m.rows(); i++) {
                    for (int k = m.rowStart(i); k < m.rowStart(i + 1); k++) {
                        if (m.column(k) < m.rows() - 1 && i != at) {
                            cut.add(i, m.column(k), m.value(k));
                        }
                    }
                }
                checkRankAndFactors(kind, cut.build());
                checkRankAndFactors(kind, cut.build().transposed());
            }
        }
    }

    @ParameterizedTest(name = "kind {0}")
    @MethodSource("kinds")
    void medium(int kind) {
        Random random = new Random(SEED + kind);
        for (int c = 0; c < 1 + CASES / 100; c++) {
            check(kind, Adversaries.square(kind, 8 + random.nextInt(17), random));
        }
    }

    private static void check(int kind, IntegerMatrix m) {
        int n = m.rows();
        BigInteger[] expected = SlowAlgebra.rankAndDeterminant(m);
        assertEquals(expected[1], Determinant.of(m, NONE), () -> message(kind, m));
        assertEquals(expected[1], ModularDeterminant.of(m, NONE), () -> message(kind, m));
        long small = SmallMatrix.determinant(m.toDense(), n);
        if (small != SmallMatrix.TOO_LARGE) {
            assertEquals(expected[1], BigInteger.valueOf(small), () -> message(kind, m));
        }
        checkRankAndFactors(kind, m);
        if (m.isSymmetric()) {
            checkInertia(kind, m, expected[1]);
        }
    }

    private static void checkRankAndFactors(int kind, IntegerMatrix m) {
        int rank = SlowAlgebra.rankAndDeterminant(m)[0].intValue();
        assertEquals(rank, Rank.of(m, NONE), () -> message(kind, m));
        assertEquals(rank, ModularRank.rank(m, NONE), () -> message(kind, m));
        int small = SmallMatrix.rank(m.toDense(), m.rows(), m.columns());
        assertEquals(rank, small < 0 ? rank : small, () -> message(kind, m));
        List<BigInteger> factors = SlowAlgebra.factors(m);
        assertEquals(factors, InvariantFactors.of(m, NONE), () -> message(kind, m));
        assertEquals(factors, ModularSmith.factors(m, NONE), () -> message(kind, m));
        long[] out = new long[m.columns()];
        int count = SmallMatrix.invariantFactors(m.toDense(), m.rows(), m.columns(), out);
        if (count >= 0) {
            List<BigInteger> direct = new ArrayList<>();
            for (int k = 0; k < count; k++) {
                direct.add(BigInteger.valueOf(out[k]));
            }
            assertEquals(factors, direct, () -> message(kind, m));
        }
    }

    private static void checkInertia(int kind, IntegerMatrix m, BigInteger determinant) {
        Inertia expected = SlowAlgebra.inertia(m);
        int[] counts = {expected.positive(), expected.negative(), expected.zero()};
        assertEquals(expected, Inertia.of(m, NONE), () -> message(kind, m));
        assertArrayEquals(counts, CertifiedInertia.of(m, NONE), () -> message(kind, m));
        assertArrayEquals(counts, DenseBareiss.inertia(m, NONE), () -> message(kind, m));
        long[] result = new long[4];
        if (SmallMatrix.symmetric(m.toDense(), m.rows(), result)) {
            assertEquals(determinant, BigInteger.valueOf(result[0]), () -> message(kind, m));
            assertEquals(expected, new Inertia((int) result[2], (int) result[3], (int) result[1]), () -> message(kind, m));
        }
    }

    private static String message(int kind, IntegerMatrix m) {
        return "seed " + SEED + ", kind " + kind + ", " + m;
    }
}
