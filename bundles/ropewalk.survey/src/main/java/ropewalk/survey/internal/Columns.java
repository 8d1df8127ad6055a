package ropewalk.survey.internal;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.RankedMethod;
import ropewalk.survey.Survey.RequestException;
import ropewalk.survey.SurveyRequest;

/**
 * The columns of one survey, fixed at its start.
 *
 * @param measured the invariants, in order
 * @param hasVerdict whether the verdict is wanted and can be had
 */
record Columns(List<Column> measured, boolean hasVerdict) {

    private static final String VERDICT = "verdict";

    static Columns of(SurveyRequest request, List<CatalogueEntry> entries, boolean canDecide) throws RequestException {
        Set<String> only = new HashSet<>(request.only());
        Set<String> skip = new HashSet<>(request.skip());
        refuseUnknown(only, skip, entries, canDecide);
        List<Column> columns = new ArrayList<>();
        for (CatalogueEntry entry : entries) {
            Column column = column(entry, only, skip, request.withRivals());
            if (column != null) {
                columns.add(column);
            }
        }
        boolean wanted = (only.isEmpty() || only.contains(VERDICT)) && !skip.contains(VERDICT);
        return new Columns(columns, wanted && canDecide);
    }

    private static Column column(CatalogueEntry entry, Set<String> only, Set<String> skip, boolean withRivals) {
        if (skip.contains(entry.id())) {
            return null;
        }
        boolean whole = only.isEmpty() || only.contains(entry.id());
        List<RankedMethod> fillers = new ArrayList<>();
        List<RankedMethod> rivals = new ArrayList<>();
        for (RankedMethod method : entry.methods()) {
            boolean named = only.contains(method.id());
            if (skip.contains(method.id()) || !whole && !named) {
                continue;
            }
            fillers.add(method);
            if (withRivals || named) {
                rivals.add(method);
            }
        }
        return fillers.isEmpty() ? null : new Column(entry, List.copyOf(fillers), List.copyOf(rivals));
    }

    private static void refuseUnknown(Set<String> only, Set<String> skip, List<CatalogueEntry> entries,
            boolean canDecide) throws RequestException {
        Set<String> known = new TreeSet<>();
        for (CatalogueEntry entry : entries) {
            known.add(entry.id());
            entry.methods().forEach(method -> known.add(method.id()));
        }
        if (canDecide) {
            known.add(VERDICT);
        }
        Set<String> unknown = new TreeSet<>(only);
        unknown.addAll(skip);
        unknown.removeAll(known);
        if (!unknown.isEmpty()) {
            throw new RequestException("nothing installed is called '" + String.join("', '", unknown)
                    + "'; there are " + String.join(", ", known));
        }
    }
}
