package ropewalk.split;

import org.osgi.annotation.versioning.ConsumerType;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;

/**
 * Proves components inseparable. A service; the property {@link #COST} puts obstructions and separators in order, cheap
 * ones first. Stateless and deterministic.
 */
@ConsumerType
public interface Obstruction {

    /** Service property: a whole number, 0 for what costs nothing, 100 for what measures sublinks, 1000 and more for searches. */
    String COST = "ropewalk.cost";

    /**
     * A word for what was tried.
     *
     * @return for example {@code split laws}
     */
    String name();

    /**
     * Looks for proofs.
     *
     * @param link a link of at least two components
     * @param findings takes what is found as soon as it is found
     * @param effort bounds the whole verdict; let through what its checkpoint throws
     */
    void examine(LinkDiagram link, Findings findings, Effort effort);
}
