package ropewalk.split.laws.internal;

import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;
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
 * @param broken ids of laws that broke, each of which is told of once
 */
record Law(CatalogueEntry entry, SplitLaw<Value> rule, Set<String> broken) {

    /** Values are checked against the invariant's type before they reach the law, see {@link CatalogueEntry#value}. */
    @SuppressWarnings("unchecked")
    static Law of(CatalogueEntry entry, SplitLaw<?> rule, Set<String> broken) {
        return new Law(entry, (SplitLaw<Value>) rule, broken);
    }

    Optional<CatalogueEntry.Measured> value(LinkDiagram link, Effort effort) {
        return entry.value(link, effort);
    }

    boolean admitsSplit(Value whole) {
        return asked(() -> rule.admitsSplit(whole), true);
    }

    /** Pairs of components below the given number. */
    Set<Pair> ties(Value whole, int components) {
        return asked(() -> {
            Set<Pair> ties = Set.copyOf(rule.ties(whole));
            for (Pair tie : ties) {
                if (tie.second() >= components) {
                    throw new IllegalArgumentException("it ties component " + (tie.second() + 1) + " of " + components);
                }
            }
            return ties;
        }, Set.of());
    }

    /** Whether the value of the whole is not what the law makes of the two sides, so that no sphere realises it. */
    boolean excludes(Value whole, Value left, Value right, Bipartition which) {
        return asked(() -> !rule.union(left, right, which).text().equals(whole.text()), false);
    }

    /** A law is somebody else's code: one that breaks proves nothing, and is named once. */
    private <T> T asked(Supplier<T> question, T silence) {
        try {
            return question.get();
        } catch (Effort.SpentException e) {
            throw e;
        } catch (Throwable e) {
            if (broken.add(entry.id())) {
                System.err.println("ropewalk: the split law of '" + entry.id() + "' breaks (" + e
                        + "); it says nothing where it does, tell its author");
            }
            return silence;
        }
    }
}
