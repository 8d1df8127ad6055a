package ropewalk.split.moves.internal;

import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.split.Evidence;
import ropewalk.split.Findings;
import ropewalk.split.Obstruction;
import ropewalk.split.Partition;
import ropewalk.split.Separator;

/** A diagram that is disconnected as it stands: a circle in the plane between two pieces is a sphere in space. */
@Component(property = Obstruction.COST + ":Integer=0")
public final class DisconnectedSeparatorComponent implements Separator {

    private final String origin;

    /**
     * Made by the framework.
     *
     * @param context of this bundle
     */
    @Activate
    public DisconnectedSeparatorComponent(BundleContext context) {
        this.origin = Origin.of(context);
    }

    @Override
    public String name() {
        return "pieces of the diagram";
    }

    @Override
    public void search(LinkDiagram link, Findings findings, Effort effort) {
        Partition pieces = Origin.piecesOf(link);
        if (pieces.classes() > 1) {
            findings.apart(pieces, link, new Evidence("disconnected", origin, "{\"pieces\":" + pieces.text() + "}"));
        }
    }
}
