package ropewalk.invariant.chessboard.internal;

import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerValue;

/** The determinant of the Goeritz form (Goeritz 1933). */
@Component(service = Method.class, property = {
    Method.ID + "=determinant.goeritz", Method.INVARIANT + "=determinant", "service.ranking:Integer=100"})
public final class DeterminantMethodComponent implements Method<IntegerValue> {

    @Override
    public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
        return WithinMemory.measure(() -> GoeritzElimination.determinant(link, effort));
    }
}
