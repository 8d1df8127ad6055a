package ropewalk.split.moves.internal;

import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.moves.Move;
import ropewalk.diagram.moves.Reduction;
import ropewalk.invariant.Effort;
import ropewalk.invariant.ValueText;
import ropewalk.split.Evidence;
import ropewalk.split.Findings;
import ropewalk.split.Obstruction;
import ropewalk.split.Partition;
import ropewalk.split.Separator;

/** Removes kinks and bigons (Reidemeister's first and second move) until none is left, and looks for loose pieces. */
@Component(property = Obstruction.COST + ":Integer=5")
public final class ReductionSeparatorComponent implements Separator {

    private final String origin;

    /**
     * Made by the framework.
     *
     * @param context of this bundle
     */
    @Activate
    public ReductionSeparatorComponent(BundleContext context) {
        this.origin = Origin.of(context);
    }

    @Override
    public String name() {
        return "reduction by R1 and R2";
    }

    @Override
    public void search(LinkDiagram link, Findings findings, Effort effort) {
        Reduction reduction = Reduction.of(link);
        Partition pieces = Origin.piecesOf(reduction.result());
        if (pieces.classes() > 1) {
            findings.apart(pieces, reduction.result(), new Evidence("reduction", origin,
                    "{\"pieces\":" + pieces.text() + ",\"moves\":" + moves(reduction) + "}"));
        }
    }

    private static String moves(Reduction reduction) {
        StringBuilder out = new StringBuilder("[");
        for (Move move : reduction.moves()) {
            out.append(out.length() == 1 ? "" : ",").append(ValueText.quoted(move.toString()));
        }
        return out.append(']').toString();
    }
}
