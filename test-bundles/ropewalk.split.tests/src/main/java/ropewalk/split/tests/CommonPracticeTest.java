package ropewalk.split.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceReference;
import ropewalk.diagram.LinkDiagram;
import ropewalk.families.ClosedChain;
import ropewalk.families.SplitUnion;
import ropewalk.families.TorusLink;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Exhibit;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.split.Verdict;

/** Common practice: what a topologist does by hand with the determinant and a colouring matrix. */
class CommonPracticeTest {

    private final Detection detection = Detection.installed();

    /**
     * Four crossings in a closed chain of two strands. By hand: its Goeritz matrix on the regions between the crossings is
     * the sum of the chessboard signs, so the determinant is 4, 2 or 0 as 4, 3 or 2 signs agree.
     */
    @ParameterizedTest
    @ValueSource(ints = {0b1111, 0b1110, 0b1101, 0b1011, 0b0111, 0b1100, 0b1010, 0b1001, 0b0110, 0b0101, 0b0011, 0b0001,
        0b0010, 0b0100, 0b1000, 0b0000})
    void fourCrossingsInAClosedChain(int signs) {
        int[] chain = new int[4];
        for (int i = 0; i < 4; i++) {
            chain[i] = (signs >> i & 1) == 1 ? 1 : -1;
        }
        int agree = Math.max(Integer.bitCount(signs), 4 - Integer.bitCount(signs));
        LinkDiagram link = ClosedChain.of(chain);
        CatalogueEntry determinant = Detection.SERVICES.await(MethodCatalogue.class, "").entries().stream()
                .filter(e -> e.id().equals("determinant")).findFirst().orElseThrow();
        assertTrue(determinant.methods().size() > 1, "rivals");
        for (var method : determinant.methods()) {
            String value = method.measure(link, Effort.ofSeconds(5)) instanceof Outcome.Exact<?> exact ? exact.value().text()
                    : "none";
            assertEquals(Integer.toString(2 * agree - 4), value, method.id());
        }
        assertEquals(agree == 2 ? "split" : "not split", detection.decide(link).word());
    }

    @Test
    void trefoilBesideHopfLink() throws InvalidSyntaxException {
        LinkDiagram link = SplitUnion.of(TorusLink.of(2, 3), TorusLink.of(2, 2));
        Verdict verdict = detection.decide(link);
        assertEquals("split", verdict.word());
        assertEquals("[[1],[2,3]]", verdict.apart().text());
        assertTrue(verdict.isDecided());

        Exhibit matrix = exhibits(link).stream().filter(e -> e.title().equals("Unreduced colouring matrix")).findFirst()
                .orElseThrow();
        List<List<BigInteger>> rows = matrix.matrix().rows();
        assertEquals(5, rows.size());
        assertEquals(5, rows.get(0).size());
        for (int i = 0; i < 5; i++) {
            BigInteger sum = BigInteger.ZERO;
            for (int j = 0; j < 5; j++) {
                sum = sum.add(rows.get(i).get(j));
                boolean inBlock = i < 3 == j < 3;
                assertTrue(inBlock || rows.get(i).get(j).signum() == 0, "entry " + i + "," + j + " outside the blocks");
            }
            assertEquals(BigInteger.ZERO, sum, "row " + i);
        }
        // The trefoil's block holds each arc once as over-arc; the Hopf link's rows are 2, -2 (its arc ends twice).
        for (int i = 0; i < 3; i++) {
            assertEquals(List.of(-1, -1, 2), rows.get(i).subList(0, 3).stream().map(BigInteger::intValue).sorted().toList());
        }
        for (int i = 3; i < 5; i++) {
            assertEquals(List.of(-2, 2), rows.get(i).subList(3, 5).stream().map(BigInteger::intValue).sorted().toList());
        }
        assertTrue(matrix.notes().contains("block 3×3: components [1]"), matrix.notes()::toString);
        assertTrue(matrix.notes().contains("block 2×2: components [2, 3]"), matrix.notes()::toString);
    }

    private static List<Exhibit> exhibits(LinkDiagram link) throws InvalidSyntaxException {
        Detection.SERVICES.await(Exhibit.Source.class, "");
        var context = Detection.SERVICES.context();
        List<Exhibit> all = new ArrayList<>();
        for (ServiceReference<Exhibit.Source> each : context.getServiceReferences(Exhibit.Source.class, null)) {
            all.addAll(context.getService(each).exhibits(link));
        }
        return all;
    }
}
