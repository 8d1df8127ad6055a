package ropewalk.survey.internal;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
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
        refuseUnknown(request, entries, canDecide);
        return choose(request, entries, canDecide);
    }

    /** The columns that the same request has now; ids that have gone meanwhile are no fault of the request. */
    static Columns ofArrivals(SurveyRequest request, List<CatalogueEntry> entries) {
        return choose(request, entries, false);
    }

    private static Columns choose(SurveyRequest request, List<CatalogueEntry> entries, boolean canDecide) {
        Set<String> only = new HashSet<>(request.only());
        Set<String> skip = new HashSet<>(request.skip());
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

    /** All methods that may be asked. */
    Stream<RankedMethod> methods() {
        return measured.stream().flatMap(column -> column.fillers().stream());
    }

    /** The columns that are here and not there; verdicts are given once. */
    Columns without(Columns earlier) {
        Set<String> known = new HashSet<>();
        earlier.measured().forEach(column -> known.add(column.id()));
        return new Columns(measured.stream().filter(column -> !known.contains(column.id())).toList(), false);
    }

    /** These columns and the added ones, in the order of the catalogue. */
    Columns with(Columns added, List<CatalogueEntry> order) {
        List<Column> all = new ArrayList<>();
        for (CatalogueEntry entry : order) {
            added.measured().stream().filter(c -> c.id().equals(entry.id())).forEach(all::add);
            measured.stream().filter(c -> c.id().equals(entry.id())).forEach(all::add);
        }
        // What was measured stays, also if its bundle has gone meanwhile: behind, where the order does not know it.
        measured.stream().filter(c -> !all.contains(c)).forEach(all::add);
        return new Columns(List.copyOf(all), hasVerdict);
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

    private static void refuseUnknown(SurveyRequest request, List<CatalogueEntry> entries, boolean canDecide)
            throws RequestException {
        Set<String> known = new TreeSet<>();
        for (CatalogueEntry entry : entries) {
            known.add(entry.id());
            entry.methods().forEach(method -> known.add(method.id()));
        }
        if (canDecide) {
            known.add(VERDICT);
        }
        Set<String> unknown = new TreeSet<>(request.only());
        unknown.addAll(request.skip());
        unknown.removeAll(known);
        if (!unknown.isEmpty()) {
            throw new RequestException("nothing installed is called '" + String.join("', '", unknown)
                    + "'; there are " + String.join(", ", known));
        }
    }
}
