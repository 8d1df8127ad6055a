package ropewalk.split;

import org.osgi.annotation.versioning.ProviderType;
import ropewalk.diagram.LinkDiagram;

/** Takes what obstructions and separators find out about one link, and says what is known so far. */
@ProviderType
public interface Findings {

    /**
     * The classes of components that are proved inseparable so far.
     *
     * @return the lower partition; stop when it is a single class
     */
    Partition together();

    /**
     * Components that no sphere separates.
     *
     * @param classes components of one class are inseparable
     * @param evidence why
     */
    void together(Partition classes, Evidence evidence);

    /**
     * Components that come apart.
     *
     * @param pieces spheres separate components of different classes
     * @param diagram a diagram of the same link, same component numbers, from which to go on
     * @param evidence how
     */
    void apart(Partition pieces, LinkDiagram diagram, Evidence evidence);
}
