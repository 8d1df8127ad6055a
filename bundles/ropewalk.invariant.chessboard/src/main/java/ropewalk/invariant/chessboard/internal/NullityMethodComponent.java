package ropewalk.invariant.chessboard.internal;

import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerValue;

/** The nullity as the corank of the Goeritz forms, one more for each further piece of the diagram. */
@Component(service = Method.class, property = {
    Method.ID + "=nullity.goeritz", Method.INVARIANT + "=nullity", "service.ranking:Integer=100"})
public final class NullityMethodComponent implements Method<IntegerValue> {

    @Override
    public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
        return WithinMemory.measure(() -> IntegerValue.of(GoeritzElimination.nullity(link, effort)));
    }
}
