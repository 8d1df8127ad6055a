package ropewalk.invariant.catalogue;

import java.util.List;
import java.util.Optional;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value;

/**
 * An invariant and its methods.
 *
 * @param id the invariant's id
 * @param definition its definition, missing where a method names an invariant that nobody defines
 * @param methods rivals, the one to be asked first at the head
 */
public record CatalogueEntry(String id, Optional<Invariant<?>> definition, List<RankedMethod> methods) {

    // Keeps a copy.
    public CatalogueEntry {
        methods = List.copyOf(methods);
    }

    /**
     * The value of one link by the first method that covers it.
     *
     * @param link any diagram
     * @param effort for this link; {@link Effort.SpentException} is let through
     * @return the value and who found it, or nothing where no method gives one
     */
    public Optional<Measured> value(LinkDiagram link, Effort effort) {
        for (RankedMethod method : methods) {
            Outcome<?> outcome = method.measure(link, effort);
            if (outcome instanceof Outcome.Exact<?> exact) {
                return isOfType(exact.value()) ? Optional.of(new Measured(exact.value(), method)) : Optional.empty();
            }
            if (!(outcome instanceof Outcome.NotApplicable)) {
                return Optional.empty();
            }
        }
        return Optional.empty();
    }

    /**
     * Whether a value has the type that the definition asks for.
     *
     * @param value a value some method gave, possibly null
     * @return true if it has, or if there is no definition
     */
    public boolean isOfType(Value value) {
        return value != null && definition.map(d -> d.valueType().isInstance(value)).orElse(true);
    }

    /**
     * A value and who found it.
     *
     * @param value exact
     * @param by the method
     */
    public record Measured(Value value, RankedMethod by) { }
}
