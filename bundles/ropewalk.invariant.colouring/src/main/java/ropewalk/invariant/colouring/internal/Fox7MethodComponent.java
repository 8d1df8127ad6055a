package ropewalk.invariant.colouring.internal;

import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerValue;

/** Fox 7-colourings by the rank of the colouring matrix modulo 7. */
@Component(service = Method.class, property = {
    Method.ID + "=fox7.rank", Method.INVARIANT + "=fox7", "service.ranking:Integer=100"})
public final class Fox7MethodComponent implements Method<IntegerValue> {

    @Override
    public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
        return WithinMemory.measure(() -> new IntegerValue(FoxColourings.count(link, 7, effort::checkpoint)));
    }
}
