package ropewalk.survey.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CopyOnWriteArrayList;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.InvariantBase;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerValue;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.invariant.catalogue.RankedMethod;

/** A catalogue that tests fill by hand. */
final class FakeCatalogue implements MethodCatalogue {

    private final List<CatalogueEntry> entries = new CopyOnWriteArrayList<>();
    private final List<String> setAside = new CopyOnWriteArrayList<>();

    interface Measure {
        Outcome<IntegerValue> of(LinkDiagram link, Effort effort);
    }

    static Outcome<IntegerValue> exactly(long value) {
        return new Outcome.Exact<>(IntegerValue.of(value));
    }

    /** Adds an integer invariant with methods id.a, id.b, … asked in that order. */
    FakeCatalogue with(String id, Measure... measures) {
        Invariant<IntegerValue> definition = new InvariantBase<>(id, id, id + " (test)", IntegerValue.class) { };
        List<RankedMethod> methods = new ArrayList<>();
        for (int i = 0; i < measures.length; i++) {
            Measure measure = measures[i];
            Method<IntegerValue> method = measure::of;
            methods.add(new RankedMethod(id + "." + (char) ('a' + i), id, method, -i, "fake", "1",
                    FakeCatalogue.class.getClassLoader()));
        }
        entries.add(new CatalogueEntry(id, Optional.of(definition), methods));
        return this;
    }

    void remove(String id) {
        entries.removeIf(entry -> entry.id().equals(id));
    }

    @Override
    public List<CatalogueEntry> entries() {
        return List.copyOf(entries);
    }

    @Override
    public boolean isInstalled(RankedMethod method) {
        return entries.stream().anyMatch(entry -> entry.methods().contains(method));
    }

    /** Tests look at what the survey itself does with a method that hangs. */
    @Override
    public void setAside(RankedMethod method) {
        setAside.add(method.id());
    }

    List<String> setAside() {
        return setAside;
    }
}
