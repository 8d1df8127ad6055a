package ropewalk.split;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;

class PartitionTest {

    @Test
    void classesAreNumberedByTheirSmallestComponent() {
        Partition p = Partition.of(7, -3, 7, Integer.MIN_VALUE, -3, Integer.MAX_VALUE);
        assertEquals("[[1,3],[2,5],[4],[6]]", p.text());
        assertEquals(4, p.classes());
        assertEquals(6, p.size());
        assertArrayEquals(new int[] {0, 1, 0, 2, 1, 3}, marks(p));
        assertArrayEquals(new boolean[] {false, true, false, false, true, false}, p.members(1));
    }

    @Test
    void equalityIsThatOfClassesAndNotOfMarks() {
        assertEquals(Partition.of(1, 2, 1), Partition.of(9, -9, 9));
        assertEquals(Partition.of(1, 2, 1).hashCode(), Partition.of(9, -9, 9).hashCode());
        assertNotEquals(Partition.of(1, 2, 1), Partition.of(1, 2, 2));
        assertNotEquals(Partition.singles(2), Partition.singles(3));
    }

    @Test
    void extremes() {
        assertEquals("[[1,2,3]]", Partition.whole(3).text());
        assertEquals("[[1],[2],[3]]", Partition.singles(3).text());
        assertEquals("[[1]]", Partition.whole(1).text());
        assertEquals(Partition.whole(1), Partition.singles(1));
        assertEquals("[]", Partition.of().text());
        assertEquals(Partition.of(), Partition.whole(0));
        assertEquals(Partition.of(), Partition.singles(0));
        assertEquals(0, Partition.whole(0).classes());
    }

    @Test
    void manyComponentsKeepTheirOrder() {
        StringBuilder expected = new StringBuilder("[[1");
        int[] marks = new int[12];
        for (int i = 1; i < 12; i++) {
            marks[i] = i % 2;
            expected.append(i % 2 == 0 ? "," + (i + 1) : "");
        }
        expected.append("],[2,4,6,8,10,12]]");
        assertEquals(expected.toString(), Partition.of(marks).text());
    }

    /** Against the transitive closure of "same class in one of the two". */
    @Test
    void joinIsTheTransitiveClosure() {
        for (int seed = 0; seed < 400; seed++) {
            Random random = new Random(seed);
            int n = random.nextInt(12);
            Partition a = random(n, random);
            Partition b = random(n, random);
            boolean[][] tied = new boolean[n][n];
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    tied[i][j] = a.classOf(i) == a.classOf(j) || b.classOf(i) == b.classOf(j);
                }
            }
            for (int k = 0; k < n; k++) {
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j < n; j++) {
                        tied[i][j] |= tied[i][k] && tied[k][j];
                    }
                }
            }
            Partition join = a.join(b);
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    assertEquals(tied[i][j], join.classOf(i) == join.classOf(j), "seed " + seed + ": " + a + " and " + b);
                }
            }
            assertEquals(join, b.join(a), "seed " + seed);
            assertEquals(join, join.join(a), "seed " + seed);
            assertEquals(a, a.join(Partition.singles(n)), "seed " + seed);
            assertEquals(Partition.whole(n), a.join(Partition.whole(n)), "seed " + seed);
            assertEquals(join, Partition.of(marks(join)), "seed " + seed);
        }
    }

    @Test
    void partitionsOfDifferentLinksAreNotJoined() {
        assertThrows(IllegalArgumentException.class, () -> Partition.singles(2).join(Partition.whole(3)));
        assertThrows(IllegalArgumentException.class, () -> Partition.singles(3).join(Partition.whole(2)));
    }

    @Test
    void callersCannotChangeIt() {
        int[] marks = {1, 2, 1};
        Partition p = Partition.of(marks);
        Arrays.fill(marks, 0);
        Arrays.fill(p.members(0), false);
        assertEquals("[[1,3],[2]]", p.text());
    }

    private static Partition random(int n, Random random) {
        int[] marks = new int[n];
        for (int i = 0; i < n; i++) {
            marks[i] = random.nextInt(n + 1) * 1_000_003;
        }
        return Partition.of(marks);
    }

    private static int[] marks(Partition p) {
        int[] marks = new int[p.size()];
        Arrays.setAll(marks, p::classOf);
        return marks;
    }
}
