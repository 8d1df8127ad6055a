package ropewalk.measures.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.RankedMethod;

/** The survey's door, measureAll, gives what measure gives, in order, and rivals give the same. */
class BatchesTest {

    private final Installed installed = new Installed();
    private final List<Sample> samples = Sample.all();

    @Test
    void batchesGiveTheOutcomesOfSingleLinks() {
        LinkBatch batch = LinkBatch.of(samples.stream().map(Sample::diagram).toArray(LinkDiagram[]::new));
        for (CatalogueEntry entry : installed.entries()) {
            for (RankedMethod method : entry.methods()) {
                List<String> inBatch = texts(method.method(), batch);
                List<String> alone = samples.stream().map(s -> Installed.exact(method, s.diagram()).text()).toList();
                assertEquals(alone, inBatch, method.id());
            }
        }
    }

    private static <V extends Value> List<String> texts(Method<V> method, LinkBatch batch) {
        List<String> texts = new ArrayList<>();
        method.measureAll(batch, Effort.ofSeconds(60), (i, outcome) -> {
            assertEquals(texts.size(), i, "outcomes come in order");
            texts.add(outcome instanceof Outcome.Exact<V> exact ? exact.value().text() : outcome.toString());
        });
        return texts;
    }

    @Test
    void rivalsAgree() {
        for (CatalogueEntry entry : installed.entries()) {
            if (entry.methods().size() > 1) {
                Sample.each(samples, d -> {
                    String first = Installed.exact(entry.methods().get(0), d).text();
                    for (RankedMethod rival : entry.methods()) {
                        assertEquals(first, Installed.exact(rival, d).text(), rival.id());
                    }
                });
            }
        }
    }

    @Test
    void valuesHaveTheDeclaredTypeAndReadBack() {
        for (CatalogueEntry entry : installed.entries()) {
            Class<? extends Value> type = entry.definition().orElseThrow().valueType();
            for (RankedMethod method : entry.methods()) {
                Sample.each(samples, d -> {
                    Value value = Installed.exact(method, d);
                    assertEquals(value, ropewalk.invariant.ValueText.read(type, value.text()), method.id());
                });
            }
        }
    }
}
