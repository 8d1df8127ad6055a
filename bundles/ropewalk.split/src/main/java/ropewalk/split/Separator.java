package ropewalk.split;

import org.osgi.annotation.versioning.ConsumerType;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;

/**
 * Looks for a motion that pulls components apart. A service with the property {@link Obstruction#COST}. Stateless and
 * deterministic.
 */
@ConsumerType
public interface Separator {

    /**
     * A word for what was tried.
     *
     * @return for example {@code reduction}
     */
    String name();

    /**
     * Looks for a separation.
     *
     * @param link a link of at least two components
     * @param findings takes the separation
     * @param effort bounds the whole verdict; let through what its checkpoint throws
     */
    void search(LinkDiagram link, Findings findings, Effort effort);
}
