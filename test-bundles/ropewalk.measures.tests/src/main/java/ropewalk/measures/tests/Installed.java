package ropewalk.measures.tests;

import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.List;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.invariant.catalogue.RankedMethod;
import ropewalk.testkit.Services;

/** What is installed, as a group's script would ask for it. */
final class Installed {

    /** The invariants that these tests were written for; a new one must come with tests of its own. */
    static final List<String> KNOWN = List.of("determinant", "nullity", "factors", "signature", "linking", "fox3", "fox5",
            "fox7");

    private static final double SECONDS = 60;

    private static MethodCatalogue arrived;
    private static AssertionError missing;

    private final MethodCatalogue catalogue = arrived();

    /** Waits until everything has arrived; what did not come is waited for once and not by every test. */
    private static synchronized MethodCatalogue arrived() {
        if (missing != null) {
            throw missing;
        }
        try {
            arrived = arrived == null ? awaited() : arrived;
            return arrived;
        } catch (AssertionError e) {
            missing = e;
            throw e;
        }
    }

    private static MethodCatalogue awaited() {
        MethodCatalogue catalogue = new Services(Installed.class).await(MethodCatalogue.class, "");
        Services.until("all of " + KNOWN + " are measured", () -> KNOWN.stream().allMatch(id -> catalogue.entries().stream()
                .anyMatch(e -> e.id().equals(id) && e.definition().isPresent() && !e.methods().isEmpty())));
        return catalogue;
    }

    List<CatalogueEntry> entries() {
        return catalogue.entries();
    }

    CatalogueEntry entry(String id) {
        return catalogue.entries().stream().filter(e -> e.id().equals(id)).findFirst()
                .orElseThrow(() -> new AssertionError("no invariant '" + id + "' is installed"));
    }

    Invariant<?> definition(String id) {
        return entry(id).definition().orElseThrow();
    }

    /** The value that fills the cell. */
    Value value(String id, LinkDiagram link) {
        return entry(id).value(link, Effort.ofSeconds(SECONDS)).orElseThrow().value();
    }

    String text(String id, LinkDiagram link) {
        return value(id, link).text();
    }

    int number(String id, LinkDiagram link) {
        return Integer.parseInt(text(id, link));
    }

    static Value exact(RankedMethod method, LinkDiagram link) {
        Outcome<?> outcome = method.measure(link, Effort.ofSeconds(SECONDS));
        return assertInstanceOf(Outcome.Exact.class, outcome, method.id()).value();
    }
}
