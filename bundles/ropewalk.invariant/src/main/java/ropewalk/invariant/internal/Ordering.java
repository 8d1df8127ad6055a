package ropewalk.invariant.internal;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.RankedMethod;

/** Puts invariants and rivals in order; refuses a second, different definition of one id with one warning. */
final class Ordering {

    /** The order of columns that the results table promises. */
    private static final List<String> STANDARD = List.of("determinant", "nullity", "factors", "signature", "linking",
            "fox3", "fox5", "fox7", "alexander", "jones");

    private static final Comparator<String> BY_COLUMN = Comparator.<String>comparingInt(id -> {
        int place = STANDARD.indexOf(id);
        return place < 0 ? STANDARD.size() : place;
    }).thenComparing(Comparator.naturalOrder());

    private static final Comparator<RankedMethod> BY_RANK = Comparator.comparingInt(RankedMethod::ranking).reversed()
            .thenComparing(RankedMethod::id);

    private final Set<String> warned = new HashSet<>();

    synchronized List<CatalogueEntry> entries(Collection<RankedMethod> methods,
            Collection<CatalogueComponent.Definition> definitions) {
        Map<String, Invariant<?>> first = new HashMap<>();
        Map<String, List<RankedMethod>> byInvariant = new TreeMap<>(BY_COLUMN);
        definitions.stream().sorted(Comparator.comparingLong(CatalogueComponent.Definition::order))
                .forEach(d -> define(d, first, byInvariant));
        for (RankedMethod method : methods) {
            byInvariant.computeIfAbsent(method.invariant(), id -> new ArrayList<>()).add(method);
        }
        List<CatalogueEntry> entries = new ArrayList<>();
        byInvariant.forEach((id, rivals) -> {
            if (!first.containsKey(id)) {
                undefined(id, rivals);
                return;
            }
            rivals.sort(BY_RANK);
            entries.add(new CatalogueEntry(id, Optional.ofNullable(first.get(id)), rivals));
        });
        return entries;
    }

    private void define(CatalogueComponent.Definition definition, Map<String, Invariant<?>> first,
            Map<String, List<RankedMethod>> byInvariant) {
        Invariant<?> invariant = definition.invariant();
        Invariant<?> known = first.putIfAbsent(invariant.id(), invariant);
        byInvariant.computeIfAbsent(invariant.id(), id -> new ArrayList<>());
        if (known != null && !same(known, invariant) && warned.add(invariant.id() + " " + definition.origin())) {
            System.err.println("ropewalk: " + definition.origin() + " defines '" + invariant.id()
                    + "' differently from the definition that was there first; the first one counts. Give the other an "
                    + "id of its own");
        }
    }

    private void undefined(String id, List<RankedMethod> methods) {
        for (RankedMethod method : methods) {
            if (warned.add(method.id() + " " + method.origin())) {
                System.err.println("ropewalk: " + method.origin() + " brings the method '" + method.id() + "' of '" + id
                        + "', an invariant that nothing here defines; it is left out until a bundle defines it");
            }
        }
    }

    private static boolean same(Invariant<?> a, Invariant<?> b) {
        return a.definition().equals(b.definition()) && a.valueType() == b.valueType()
                && a.needsOrientation() == b.needsOrientation();
    }
}
