package ropewalk.measures.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import ropewalk.algebra.Determinant;
import ropewalk.algebra.Inertia;
import ropewalk.algebra.IntegerMatrix;
import ropewalk.algebra.InvariantFactors;
import ropewalk.algebra.Rank;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.Shading;
import ropewalk.invariant.Value.IntegerList;
import ropewalk.structure.ColouringMatrix;
import ropewalk.structure.GoeritzForms;

/** The matrices behind the values: no choice that is made in them may be seen in the result. */
class MatricesTest {

    private static final Runnable ON = () -> { };

    private final Installed installed = new Installed();

    /** Goeritz 1933 for the determinant, Gordon and Litherland 1978 for the signature: either surface will do. */
    @Test
    void bothShadingsGiveTheSameValues() {
        Sample.each(Sample.all(), d -> {
            Shading shading = Shading.of(d);
            agrees(d, GoeritzForms.of(d, shading));
            agrees(d, GoeritzForms.of(d, shading.opposite()));
        });
    }

    private void agrees(LinkDiagram d, GoeritzForms forms) {
        int pieces = ConnectedPieces.of(d).count();
        BigInteger determinant = pieces > 1 ? BigInteger.ZERO : BigInteger.ONE;
        int nullity = pieces - 1;
        int signature = 0;
        List<List<BigInteger>> cokernels = new ArrayList<>();
        for (int p = 0; p < forms.count(); p++) {
            IntegerMatrix g = forms.reduced(p);
            determinant = determinant.multiply(Determinant.of(g, ON).abs());
            nullity += g.rows() - Rank.of(g, ON);
            signature -= Inertia.of(g, ON).signature() + forms.correction(p);
            cokernels.add(InvariantFactors.of(g, ON));
        }
        assertEquals(determinant.toString(), installed.text("determinant", d), "determinant");
        assertEquals(nullity, installed.number("nullity", d), "nullity");
        assertEquals(signature, installed.number("signature", d), "signature");
        if (pieces == 1 && forms.count() == 1) {
            assertEquals(new IntegerList(cokernels.get(0)).text(), installed.text("factors", d), "factors");
        }
    }

    @Test
    void everyStruckRowAndColumnOfAGoeritzFormGivesTheSameDeterminant() {
        Sample.each(Sample.small(9), d -> {
            for (Shading shading : List.of(Shading.of(d), Shading.of(d).opposite())) {
                GoeritzForms forms = GoeritzForms.of(d, shading);
                for (int p = 0; p < forms.count(); p++) {
                    assertSums(forms.unreduced(p));
                    assertMinors(forms.unreduced(p), forms.count() == 1 && ConnectedPieces.of(d).count() == 1
                            ? installed.text("determinant", d) : Determinant.of(forms.reduced(p), ON).abs().toString());
                }
            }
        });
    }

    @Test
    void everyStruckRowAndColumnOfAColouringMatrixGivesTheSameDeterminant() {
        int[] square = {0};
        Sample.each(Sample.small(9), d -> {
            ColouringMatrix colouring = ColouringMatrix.of(d);
            if (colouring.rows() == colouring.columns()) {
                square[0]++;
                assertMinors(colouring.unreduced(), installed.text("determinant", d));
            }
        });
        assertTrue(square[0] > 60, square[0] + " square ones");
    }

    private static void assertMinors(IntegerMatrix matrix, String expected) {
        for (int i = 0; i < matrix.rows(); i++) {
            for (int j = 0; j < matrix.columns(); j++) {
                assertEquals(expected, Determinant.of(matrix.without(i, j), ON).abs().toString(),
                        "row " + i + " and column " + j);
            }
        }
    }

    private static void assertSums(IntegerMatrix matrix) {
        assertTrue(matrix.isSymmetric());
        for (int i = 0; i < matrix.rows(); i++) {
            long sum = 0;
            for (int j = 0; j < matrix.columns(); j++) {
                sum += matrix.get(i, j);
            }
            assertEquals(0, sum, "row " + i);
        }
    }
}
