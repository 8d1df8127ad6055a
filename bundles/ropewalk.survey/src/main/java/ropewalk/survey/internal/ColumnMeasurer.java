package ropewalk.survey.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.invariant.catalogue.RankedMethod;

/**
 * Measures one column of one batch: the first filler takes the whole batch, the next one the links to which it does not
 * apply. What fails in a method stays in its own cells.
 */
final class ColumnMeasurer {

    private final MethodCatalogue catalogue;
    private final Benches benches;
    private final Activity activity;
    private final Effort effort;
    private volatile Outcome<?>[] current;

    ColumnMeasurer(MethodCatalogue catalogue, Benches benches, Activity activity, Effort effort) {
        this.catalogue = catalogue;
        this.benches = benches;
        this.activity = activity;
        this.effort = effort;
    }

    /** For each link the outcome that fills its cell; null where the method's bundle was removed before. */
    Outcome<?>[] fill(Column column, LinkBatch batch, Map<String, Outcome<?>[]> salvaged, Clock clock) {
        return fill(column, run(column, column.fillers().get(0), batch, salvaged, clock), batch, clock);
    }

    /** The same where the outcomes of the first filler are known. */
    Outcome<?>[] fill(Column column, Outcome<?>[] first, LinkBatch batch, Clock clock) {
        Outcome<?>[] cells = first.clone();
        for (int m = 1; m < column.fillers().size(); m++) {
            int[] open = inapplicable(cells);
            if (open.length == 0) {
                break;
            }
            LinkDiagram[] links = new LinkDiagram[open.length];
            for (int i = 0; i < open.length; i++) {
                links[i] = batch.link(open[i]);
            }
            Outcome<?>[] next = run(column, column.fillers().get(m), LinkBatch.of(links), Map.of(), clock.at(open));
            for (int i = 0; i < open.length; i++) {
                cells[open[i]] = next[i];
            }
        }
        return cells;
    }

    /** The outcomes of each rival by itself. */
    Map<RankedMethod, Outcome<?>[]> rivals(Column column, LinkBatch batch, Map<String, Outcome<?>[]> salvaged,
            List<Clock> clocks) {
        Map<RankedMethod, Outcome<?>[]> all = new LinkedHashMap<>();
        for (RankedMethod method : column.rivals()) {
            Clock clock = new Clock(batch.size());
            all.put(method, run(column, method, batch, salvaged, clock));
            clocks.add(clock);
        }
        return all;
    }

    private Outcome<?>[] run(Column column, RankedMethod method, LinkBatch batch, Map<String, Outcome<?>[]> salvaged,
            Clock clock) {
        Outcome<?>[] cells = new Outcome<?>[batch.size()];
        if (benches.holds(method.id())) {
            Outcome<?>[] before = salvaged.getOrDefault(method.id(), new Outcome<?>[cells.length]);
            for (int i = 0; i < cells.length; i++) {
                cells[i] = i < before.length && before[i] != null ? before[i]
                        : new Outcome.OutOfEffort<>(method.id() + " hung and is not asked again in this survey");
            }
            return cells;
        }
        if (!catalogue.isInstalled(method)) {
            return cells;
        }
        if (batch.size() > 0) {
            current = cells;
            guarded(column, method, batch, cells, clock);
            current = null;
        }
        return cells;
    }

    /** What the method that runs now has said so far; for the watch. */
    Outcome<?>[] current() {
        return current;
    }

    private void guarded(Column column, RankedMethod method, LinkBatch batch, Outcome<?>[] cells, Clock clock) {
        Thread thread = Thread.currentThread();
        ClassLoader before = thread.getContextClassLoader();
        thread.setContextClassLoader(method.loader());
        activity.begin(method.id());
        clock.begin();
        try {
            measureAll(method.method(), batch, (i, outcome) -> {
                clock.tick(i);
                activity.nextCell();
                cells[i] = accepted(column, outcome);
            });
        } catch (Throwable e) {         // a guest may throw anything, checked exceptions and errors of its own too
            // The batch broke off: every link that has no outcome is measured by itself, so that the fault stays in
            // the cells it belongs to.
            oneByOne(column, method, batch, cells, clock);
        } finally {
            activity.end();
            thread.setContextClassLoader(before);
            Thread.interrupted();       // a method that leaves its thread interrupted would end the worker
        }
        for (int i = 0; i < cells.length; i++) {
            if (cells[i] == null) {
                cells[i] = new Outcome.Failed<>(method.id() + " gave no outcome for this link");
            }
        }
    }

    private void oneByOne(Column column, RankedMethod method, LinkBatch batch, Outcome<?>[] cells, Clock clock) {
        for (int i = 0; i < cells.length; i++) {
            if (cells[i] == null) {
                effort.restart();
                activity.nextCell();
                try {
                    cells[i] = accepted(column, method.measure(batch.link(i), effort));
                } catch (Effort.SpentException e) {
                    cells[i] = new Outcome.OutOfEffort<>(e.getMessage());
                }
                clock.tick(i);
            }
        }
    }

    private <V extends Value> void measureAll(Method<V> method, LinkBatch batch, Method.Sink<Value> sink) {
        method.measureAll(batch, effort, (i, outcome) -> sink.accept(i, widened(outcome)));
    }

    @SuppressWarnings("unchecked")
    private static Outcome<Value> widened(Outcome<?> outcome) {
        return (Outcome<Value>) outcome;        // outcomes are read only
    }

    private static Outcome<?> accepted(Column column, Outcome<?> outcome) {
        if (outcome == null) {
            return new Outcome.Failed<>("returned null");
        }
        if (outcome instanceof Outcome.Exact<?> exact && !column.entry().isOfType(exact.value())) {
            return new Outcome.Failed<>("the value is no "
                    + column.entry().definition().map(d -> d.valueType().getSimpleName()).orElse("value"));
        }
        return outcome;
    }

    private static int[] inapplicable(Outcome<?>[] cells) {
        List<Integer> open = new ArrayList<>();
        for (int i = 0; i < cells.length; i++) {
            if (cells[i] instanceof Outcome.NotApplicable) {
                open.add(i);
            }
        }
        return open.stream().mapToInt(Integer::intValue).toArray();
    }
}
