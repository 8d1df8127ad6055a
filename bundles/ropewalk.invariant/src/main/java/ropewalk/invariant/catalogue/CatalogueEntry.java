package ropewalk.invariant.catalogue;

import java.util.List;
import java.util.Optional;
import ropewalk.invariant.Invariant;

/**
 * An invariant and its methods.
 *
 * @param id the invariant's id
 * @param definition its definition, missing where a method names an invariant that nobody defines
 * @param methods rivals, the one to be asked first at the head
 */
public record CatalogueEntry(String id, Optional<Invariant<?>> definition, List<RankedMethod> methods) {

    // Keeps a copy.
    public CatalogueEntry {
        methods = List.copyOf(methods);
    }
}
