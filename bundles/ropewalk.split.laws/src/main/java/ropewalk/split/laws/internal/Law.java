package ropewalk.split.laws.internal;

import java.util.Optional;
import java.util.Set;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Pair;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value;
import ropewalk.invariant.catalogue.CatalogueEntry;

/**
 * The split law of one installed invariant, with the methods that measure it.
 *
 * @param entry the invariant and its methods
 * @param rule its law
 */
record Law(CatalogueEntry entry, SplitLaw<Value> rule) {

    /** Values are checked against the invariant's type before they reach the law, see {@link CatalogueEntry#value}. */
    @SuppressWarnings("unchecked")
    static Law of(CatalogueEntry entry, SplitLaw<?> rule) {
        return new Law(entry, (SplitLaw<Value>) rule);
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
