package ropewalk.survey.internal;

import java.util.List;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.RankedMethod;

/**
 * One column of the results.
 *
 * @param entry the invariant
 * @param fillers methods that may fill the cell, in the order they are asked
 * @param rivals further methods that run in any case and are compared
 */
record Column(CatalogueEntry entry, List<RankedMethod> fillers, List<RankedMethod> rivals) {

    String id() {
        return entry.id();
    }
}
