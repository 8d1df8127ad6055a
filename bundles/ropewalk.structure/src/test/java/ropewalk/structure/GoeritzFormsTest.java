package ropewalk.structure;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import ropewalk.algebra.IntegerMatrix;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.Regions;
import ropewalk.diagram.Shading;

class GoeritzFormsTest {

    /** By hand: the right-handed trefoil has three regions inside and out of the chain, and the triangle of both discs. */
    @Test
    void trefoilByHand() {
        LinkDiagram trefoil = Braids.of("2: 1 1 1");
        GoeritzForms few = GoeritzForms.of(trefoil);
        GoeritzForms many = GoeritzForms.of(trefoil, few.shading().opposite());
        assertEquals(1, few.count());
        assertEquals(2, few.dimension(0));
        assertEquals(3, many.dimension(0));
        // Two regions that meet at three crossings of one chessboard sign; and three that meet pairwise, of the other.
        int s = few.chessboardSign(0);
        assertEquals(IntegerMatrix.ofDense(2, 2, new long[] {-3 * s, 3 * s, 3 * s, -3 * s}), few.unreduced(0));
        assertEquals(IntegerMatrix.ofDense(3, 3, new long[] {2 * s, -s, -s, -s, 2 * s, -s, -s, -s, 2 * s}),
                many.unreduced(0));
        // Gordon, Litherland 1978: -2 = -sign(G) - correction by either surface.
        assertEquals(-2, Integer.signum(3 * s) - few.correction(0));
        assertEquals(-2, -2 * Integer.signum(s) - many.correction(0));
    }

    @Test
    void smallPathEqualsMatrixPath() {
        for (String word : Braids.random()) {
            LinkDiagram d = Braids.of(word);
            for (Shading shading : List.of(Shading.of(d), Shading.of(d).opposite())) {
                GoeritzForms forms = GoeritzForms.of(d, shading);
                for (int p = 0; p < forms.count(); p++) {
                    int n = forms.dimension(p) - 1;
                    long[] small = new long[n * n + 5];
                    Arrays.fill(small, 99);         // what an earlier form left there
                    forms.fillReduced(p, small);
                    assertArrayEquals(forms.reduced(p).toDense(), Arrays.copyOf(small, n * n), word);
                    assertEquals(forms.unreduced(p).without(n, n), forms.reduced(p), word);
                    for (int i = n * n; i < small.length; i++) {
                        assertEquals(99, small[i], word + ": wrote behind the form");
                    }
                }
            }
        }
    }

    /** The definition, once more: entry by entry over pairs of corners. */
    @Test
    void entriesAreSumsOfChessboardSigns() {
        for (String word : Braids.random()) {
            LinkDiagram d = Braids.of(word);
            GoeritzForms forms = GoeritzForms.of(d);
            Regions regions = Regions.of(d);
            int[] pieceOfRow = new int[regions.count()];
            for (int dart = 0; dart < d.darts(); dart++) {
                pieceOfRow[regions.ofCorner(dart)] = ConnectedPieces.of(d).ofCrossing(dart >> 2);
            }
            for (int r = 0; r < regions.count(); r++) {
                assertEquals(forms.shading().isShaded(r), forms.row(r) < 0, word);
                for (int q = 0; q < r; q++) {
                    if (forms.row(r) >= 0 && forms.row(q) >= 0 && pieceOfRow[r] == pieceOfRow[q]) {
                        assertEquals(meeting(d, forms, regions, r, q),
                                forms.unreduced(pieceOfRow[r]).get(forms.row(r), forms.row(q)), word);
                    }
                }
            }
            for (int p = 0; p < forms.count(); p++) {
                IntegerMatrix g = forms.unreduced(p);
                assertTrue(g.isSymmetric(), word);
                for (int i = 0; i < g.rows(); i++) {
                    long sum = 0;
                    for (int j = 0; j < g.columns(); j++) {
                        sum += g.get(i, j);
                    }
                    assertEquals(0, sum, word);
                }
            }
        }
    }

    private static long meeting(LinkDiagram d, GoeritzForms forms, Regions regions, int r, int q) {
        long sum = 0;
        for (int c = 0; c < d.crossings(); c++) {
            for (int i = 0; i < 4; i++) {
                if (regions.ofCorner(4 * c + i) == r && regions.ofCorner(4 * c + (i + 2 & 3)) == q) {
                    sum += forms.chessboardSign(c);
                }
            }
        }
        return sum;
    }

    @Test
    void oppositeShadingHasOppositeSignsAndTheOtherRegions() {
        for (String word : Braids.random()) {
            LinkDiagram d = Braids.of(word);
            GoeritzForms forms = GoeritzForms.of(d);
            GoeritzForms other = GoeritzForms.of(d, forms.shading().opposite());
            for (int c = 0; c < d.crossings(); c++) {
                assertEquals(-forms.chessboardSign(c), other.chessboardSign(c), word);
            }
            int regions = 0;
            for (int p = 0; p < forms.count(); p++) {
                assertTrue(forms.dimension(p) <= other.dimension(p), word + ": fewer unshaded regions are taken");
                regions += forms.dimension(p) + other.dimension(p);
            }
            assertEquals(Regions.of(d).count(), regions, word);
            assertSame(forms, GoeritzForms.of(d), "kept with the diagram");
        }
    }
}
