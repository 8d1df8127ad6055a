package ropewalk.measures.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Pair;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.RankedMethod;
import ropewalk.oracle.Renumbered;

/** Split unions behave as each invariant's law says, whichever components lie on which side. */
class SplitLawTest {

    private final Installed installed = new Installed();

    @Test
    void everyInvariantHasALaw() {
        for (CatalogueEntry entry : installed.entries()) {
            assertTrue(entry.definition().orElseThrow().splitLaw().isPresent(), entry.id());
        }
    }

    @Test
    void splitUnion() {
        List<Sample> samples = Sample.all();
        Random random = new Random(11);
        for (int i = 0; i < 250; i++) {
            Sample left = samples.get(random.nextInt(samples.size()));
            Sample right = samples.get(random.nextInt(samples.size()));
            Renumbered whole = Renumbered.all(left.diagram().splitUnion(right.diagram()), random);
            boolean[] isLeft = new boolean[whole.newNumber().length];
            for (int c = 0; c < left.diagram().components(); c++) {
                isLeft[whole.newNumber()[c]] = true;
            }
            Sample.each(List.of(new Sample("union " + i + " of " + left.how() + " and " + right.how(), whole.diagram())),
                    d -> lawsHold(d, new Bipartition(isLeft)));
        }
    }

    private void lawsHold(LinkDiagram whole, Bipartition which) {
        // The sublinks are numbered in the order that the law expects.
        LinkDiagram left = whole.sublink(which.left());
        LinkDiagram right = whole.sublink(which.right());
        for (CatalogueEntry entry : installed.entries()) {
            SplitLaw<Value> law = law(entry);
            for (RankedMethod method : entry.methods()) {
                Value value = Installed.exact(method, whole);
                Value union = law.union(Installed.exact(method, left), Installed.exact(method, right), which);
                assertEquals(union.text(), value.text(), method.id());
                assertTrue(law.admitsSplit(value), method.id() + " does not admit that " + value.text() + " splits");
                for (Pair tie : law.ties(value)) {
                    assertEquals(which.isLeft(tie.first()), which.isLeft(tie.second()),
                            method.id() + " ties " + tie + " across the sphere");
                }
            }
        }
    }

    /** A law that no link breaks would prove nothing: each must exclude some link that does not split. */
    @Test
    void everyLawIsBrokenByALinkThatDoesNotSplit() {
        for (CatalogueEntry entry : installed.entries()) {
            SplitLaw<Value> law = law(entry);
            int excluded = 0;
            for (int n = 2; n <= 42; n += 2) {
                LinkDiagram torus = ropewalk.families.TorusLink.of(2, n);
                Bipartition which = new Bipartition(new boolean[] {true, false});
                Value whole = Installed.exact(entry.methods().get(0), torus);
                Value side = Installed.exact(entry.methods().get(0), torus.sublink(which.left()));
                excluded += law.union(side, side, which).text().equals(whole.text()) ? 0 : 1;
                if (!law.admitsSplit(whole) || !law.ties(whole).isEmpty()) {
                    assertNotEquals(law.union(side, side, which).text(), whole.text(), entry.id());
                }
            }
            assertTrue(excluded > 0, entry.id() + " excludes nothing");
        }
    }

    @SuppressWarnings("unchecked")      // each method's value has been checked to be of the law's type
    private static SplitLaw<Value> law(CatalogueEntry entry) {
        return (SplitLaw<Value>) entry.definition().orElseThrow().splitLaw().orElseThrow();
    }
}
