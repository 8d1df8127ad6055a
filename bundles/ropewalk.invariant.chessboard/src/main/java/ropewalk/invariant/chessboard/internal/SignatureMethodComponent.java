package ropewalk.invariant.chessboard.internal;

import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerValue;

/** The signature of the Goeritz forms with the correction of Gordon and Litherland (1978). */
@Component(service = Method.class, property = {
    Method.ID + "=signature.goeritz", Method.INVARIANT + "=signature", "service.ranking:Integer=100"})
public final class SignatureMethodComponent implements Method<IntegerValue> {

    @Override
    public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
        return WithinMemory.measure(() -> IntegerValue.of(GoeritzElimination.signature(link, effort)));
    }
}
