package quayside.faulty;

import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.InvariantBase;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerValue;

/** An invariant and its only method in one, which are right (the number of crossings) but on links of 3 crossings. */
abstract class FaultyInvariant extends InvariantBase<IntegerValue> implements Method<IntegerValue> {

    FaultyInvariant(String id) {
        super(id, "Faulty " + id, "Nothing of interest (made by a test).", IntegerValue.class);
    }

    @Override
    public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
        return link.crossings() == 3 ? fail(link, effort)
                : new Outcome.Exact<>(IntegerValue.of(link.crossings()));
    }

    abstract Outcome<IntegerValue> fail(LinkDiagram link, Effort effort);
}
