package ropewalk.split.laws.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.MethodCatalogue;

/** The laws of what is installed, in the order of the catalogue; put together anew when something comes or goes. */
final class Laws {

    private record Snapshot(List<CatalogueEntry> entries, List<Law> laws) { }

    private final MethodCatalogue catalogue;
    private final Set<String> broken = ConcurrentHashMap.newKeySet();
    private volatile Snapshot snapshot = new Snapshot(List.of(), List.of());

    Laws(MethodCatalogue catalogue) {
        this.catalogue = catalogue;
    }

    List<Law> installed() {
        List<CatalogueEntry> entries = catalogue.entries();
        Snapshot known = snapshot;
        if (known.entries() != entries) {
            known = new Snapshot(entries, lawsOf(entries));
            snapshot = known;
        }
        return known.laws();
    }

    private List<Law> lawsOf(List<CatalogueEntry> entries) {
        List<Law> laws = new ArrayList<>();
        for (CatalogueEntry entry : entries) {
            entry.definition().flatMap(Invariant::splitLaw).ifPresent(rule -> laws.add(Law.of(entry, rule, broken)));
        }
        return laws;
    }
}
