package ropewalk.invariant.colouring.internal;

import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerValue;

/** Fox 3-colourings by the rank of the colouring matrix modulo 3. */
@Component(service = Method.class, property = {
    Method.ID + "=fox3.rank", Method.INVARIANT + "=fox3", "service.ranking:Integer=100"})
public final class Fox3MethodComponent implements Method<IntegerValue> {

    @Override
    public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
        return WithinMemory.measure(() -> new IntegerValue(FoxColourings.count(link, 3, effort::checkpoint)));
    }
}
