package ropewalk.split;

import org.osgi.annotation.versioning.ProviderType;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;

/** Decides which components come apart, with what is installed. A service; thread-safe. */
@ProviderType
public interface SplitDetection {

    /**
     * The verdict on a link.
     *
     * @param link any diagram
     * @param effort for the whole verdict; when it is used up, what was found until then counts
     * @return what is known
     */
    Verdict decide(LinkDiagram link, Effort effort);
}
