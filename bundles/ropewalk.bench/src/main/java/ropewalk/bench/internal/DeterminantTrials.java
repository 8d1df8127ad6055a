package ropewalk.bench.internal;

import java.io.IOException;
import java.util.List;
import ropewalk.diagram.LinkDiagram;
import ropewalk.families.RandomDiagrams;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.invariant.catalogue.RankedMethod;

/** Determinants of single large diagrams, from the diagram in memory to the proved value; the best of several runs. */
final class DeterminantTrials {

    private static final int STRANDS = 30;
    private static final double EFFORT_SECONDS = 600;

    private final MethodCatalogue catalogue;

    DeterminantTrials(MethodCatalogue catalogue) {
        this.catalogue = catalogue;
    }

    List<Trial> all() {
        return List.of(
                new Trial("determinant-1000", "determinant of a closed braid of 30 strands, 1,000 crossings, best of 40",
                        folder -> determinant(1000, 40)),
                new Trial("determinant-20000", "determinant of a closed braid of 30 strands, 20,000 crossings, best of 3",
                        folder -> determinant(20_000, 3)));
    }

    private Trial.Figure determinant(int crossings, int runs) throws IOException {
        CatalogueEntry entry = catalogue.entries().stream().filter(e -> e.id().equals("determinant")).findFirst()
                .orElseThrow(() -> new IOException("nothing installed measures the determinant"));
        RankedMethod method = entry.methods().get(0);
        double best = Double.MAX_VALUE;
        int digits = 0;
        for (int run = 0; run < runs; run++) {
            // A diagram keeps what was computed of it, so each run takes a new one.
            LinkDiagram diagram = RandomDiagrams.braid(crossings, STRANDS, crossings);
            long begin = System.nanoTime();
            Outcome<?> outcome = method.measure(diagram, Effort.ofSeconds(EFFORT_SECONDS));
            best = Math.min(best, (System.nanoTime() - begin) / 1e9);
            if (!(outcome instanceof Outcome.Exact<?> exact)) {
                throw new IOException(method.id() + " gave " + outcome);
            }
            digits = exact.value().text().length();
        }
        return new Trial.Figure(best, 0, "a value of " + digits + " digits");
    }
}
