package ropewalk.split.laws.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.Pair;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.MethodCatalogue;

/**
 * The split law of one installed invariant, with the methods that measure it.
 *
 * @param entry the invariant and its methods
 * @param rule its law
 */
record Law(CatalogueEntry entry, SplitLaw<Value> rule) {

    /** The laws of what is installed, in the order of the catalogue. */
    static List<Law> installed(MethodCatalogue catalogue) {
        List<Law> laws = new ArrayList<>();
        for (CatalogueEntry entry : catalogue.entries()) {
            entry.definition().flatMap(Invariant::splitLaw).ifPresent(rule -> laws.add(new Law(entry, generic(rule))));
        }
        return laws;
    }

    /** Values are checked against the invariant's type before they reach the law, see {@link CatalogueEntry#value}. */
    @SuppressWarnings("unchecked")
    private static SplitLaw<Value> generic(SplitLaw<?> rule) {
        return (SplitLaw<Value>) rule;
    }

    Optional<CatalogueEntry.Measured> value(LinkDiagram link, Effort effort) {
        return entry.value(link, effort);
    }

    boolean admitsSplit(Value whole) {
        return rule.admitsSplit(whole);
    }

    Set<Pair> ties(Value whole) {
        return rule.ties(whole);
    }

    /** Whether the value of the whole is not what the law makes of the two sides, so that no sphere realises it. */
    boolean excludes(Value whole, Value left, Value right, Bipartition which) {
        return !rule.union(left, right, which).text().equals(whole.text());
    }
}
