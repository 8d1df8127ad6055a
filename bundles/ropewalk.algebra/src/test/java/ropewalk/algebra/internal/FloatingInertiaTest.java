package ropewalk.algebra.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import ropewalk.algebra.Adversaries;
import ropewalk.algebra.IntegerMatrix;

/** The certificate by itself: right or withheld. The second route is elimination with big integers. */
class FloatingInertiaTest {
    private static final long SEED = 9192631;
    private static final Runnable NONE = () -> { };

    private static void add(IntegerMatrix.Builder builder, int i, int j, long v) {
        builder.add(i, j, v).add(j, i, v);
    }

    @Test
    void certificatesAreRightOrWithheld() {
        Random random = new Random(SEED);
        int certified = 0;
        int withheld = 0;
        for (int c = 0; c < 3000; c++) {
            IntegerMatrix m = c % 3 == 0 ? Adversaries.square(10 + c % 6, 1 + random.nextInt(25), random) : badlyScaled(c, random);
            int[] counts = CertifiedInertia.certify(m, ModularRank.rank(m, NONE), NONE);
            if (counts == null) {
                withheld++;
            } else {
                assertArrayEquals(DenseBareiss.inertia(m, NONE), counts, () -> "seed " + SEED + ", " + m);
                certified++;
            }
        }
        assertTrue(certified > 1000 && withheld > 300, "certified " + certified + ", withheld " + withheld);
    }

    /** No diagonal, entries of very different size. */
    private static IntegerMatrix badlyScaled(int kind, Random random) {
        int n = 1 + random.nextInt(14);
        IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < i; j++) {
                if (random.nextInt(2 * n) < 3) {
                    add(builder, i, j, kind % 2 == 0 ? 1L << random.nextInt(63) : random.nextBoolean() ? 1L << 62 : 1);
                }
            }
        }
        return builder.build();
    }

    /** Two paths of weights 1, 2^62, 1, 2^62, …: without a shift no pivot is worth having, and waiting for one must end. */
    @Test
    void waitingEnds() {
        IntegerMatrix.Builder builder = IntegerMatrix.builder(9, 9);
        int[] path = {4, 6, 8, 2, 1, 0, 5, 7};
        for (int k = 0; k + 1 < path.length; k++) {
            add(builder, path[k], path[k + 1], k % 2 == 0 ? 1 : 1L << 62);
        }
        IntegerMatrix m = builder.build();
        FloatingInertia run = new FloatingInertia(m, 0, NONE);
        run.run();
        assertEquals(Double.POSITIVE_INFINITY, run.residue());
        assertArrayEquals(new int[] {4, 4, 1}, CertifiedInertia.of(m, NONE), "a path is bipartite: its spectrum is symmetric");
    }

    @Test
    void conversionsAreCounted() {
        IntegerMatrix.Builder builder = IntegerMatrix.builder(40, 40);
        for (int i = 0; i + 1 < 40; i++) {
            add(builder, i, i + 1, Long.MAX_VALUE);
            builder.add(i, i, 1);
        }
        IntegerMatrix m = builder.build();
        FloatingInertia run = new FloatingInertia(m, 0x1p-300, NONE);
        run.run();
        assertTrue(run.residue() >= 0x1p9, "entries of 63 bits lose 10 bits on the way to doubles: " + run.residue());
        assertEquals(40, java.util.Arrays.stream(CertifiedInertia.of(m, NONE)).sum());
    }
}
