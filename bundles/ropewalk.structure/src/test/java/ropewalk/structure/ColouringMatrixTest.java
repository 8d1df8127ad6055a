package ropewalk.structure;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import ropewalk.algebra.IntegerMatrix;
import ropewalk.diagram.Arcs;
import ropewalk.diagram.LinkDiagram;

class ColouringMatrixTest {

    @Test
    void smallLinksByHand() {
        // Kink: its one arc passes over itself and ends there twice, 2 - 1 - 1.
        assertEquals(IntegerMatrix.ofDense(1, 1, new long[] {0}), ColouringMatrix.of(Braids.of("2: 1")).unreduced());
        // Hopf link: each arc passes over the other's two ends, 2 and -1 - 1.
        long[] hopf = ColouringMatrix.of(Braids.of("2: 1 1")).unreduced().toDense();
        assertEquals(2, Math.abs(hopf[0]));
        assertArrayEquals(new long[] {hopf[0], -hopf[0], -hopf[0], hopf[0]}, hopf);
        // One circle over another: two crossings, three arcs, the circle on top a closed one.
        ColouringMatrix over = ColouringMatrix.of(Braids.of("2: 1 -1"));
        assertEquals(2, over.rows());
        assertEquals(3, over.columns());
        // Without crossings: no row, a column for each circle.
        ColouringMatrix circles = ColouringMatrix.of(Braids.of("3:"));
        assertEquals(0, circles.rows());
        assertEquals(3, circles.columns());
        assertEquals(0, circles.unreduced().rows());
        assertEquals(3, circles.unreduced().columns());
    }

    @Test
    void entriesFollowTheDefinition() {
        for (String word : Braids.random()) {
            LinkDiagram d = Braids.of(word);
            ColouringMatrix colouring = ColouringMatrix.of(d);
            Arcs arcs = Arcs.of(d);
            IntegerMatrix matrix = colouring.unreduced();
            assertEquals(d.crossings(), matrix.rows(), word);
            assertEquals(arcs.count(), matrix.columns(), word);
            for (int c = 0; c < matrix.rows(); c++) {
                long sum = 0;
                for (int a = 0; a < matrix.columns(); a++) {
                    int expected = (arcs.over(c) == a ? 2 : 0) - (arcs.ofDart(4 * c) == a ? 1 : 0)
                            - (arcs.ofDart(4 * c + 2) == a ? 1 : 0);
                    assertEquals(expected, matrix.get(c, a), word);
                    sum += matrix.get(c, a);
                }
                assertEquals(0, sum, word);
            }
        }
    }

    @Test
    void smallPathEqualsMatrixPath() {
        for (String word : Braids.random()) {
            ColouringMatrix colouring = ColouringMatrix.of(Braids.of(word));
            int rows = colouring.rows();
            int columns = colouring.columns();
            long[] whole = filled(rows * columns);
            colouring.fill(rows, columns, whole);
            assertArrayEquals(colouring.unreduced().toDense(), Arrays.copyOf(whole, rows * columns), word);
            if (rows == columns && rows > 0) {
                long[] minor = filled((rows - 1) * (rows - 1));
                colouring.fill(rows - 1, rows - 1, minor);
                assertArrayEquals(colouring.reduced().toDense(), Arrays.copyOf(minor, (rows - 1) * (rows - 1)), word);
                assertEquals(colouring.unreduced().without(rows - 1, rows - 1), colouring.reduced(), word);
                assertEquals(99, minor[minor.length - 1], word + ": wrote behind the minor");
            } else {
                IllegalStateException none = assertThrows(IllegalStateException.class, colouring::reduced, word);
                assertTrue(none.getMessage().contains(rows + " rows and " + columns + " columns"), none.getMessage());
            }
        }
    }

    private static long[] filled(int size) {
        long[] target = new long[size + 3];
        Arrays.fill(target, 99);
        return target;
    }
}
