package ropewalk.split.laws.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Pair;
import ropewalk.invariant.ValueText;
import ropewalk.invariant.catalogue.CatalogueEntry.Measured;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.split.Evidence;
import ropewalk.split.Findings;
import ropewalk.split.Obstruction;
import ropewalk.split.Partition;

/** What the value of the whole link alone proves: that it is no split link's value, or that it ties components. */
@Component(property = Obstruction.COST + ":Integer=10")
public final class WholeLinkObstructionComponent implements Obstruction {

    private static final double FIRST_SHARE = 0.05;

    private final Laws laws;

    /**
     * Made by the framework.
     *
     * @param catalogue the installed invariants
     */
    @Activate
    public WholeLinkObstructionComponent(@Reference MethodCatalogue catalogue) {
        this.laws = new Laws(catalogue);
    }

    @Override
    public String name() {
        return "values of the whole link";
    }

    @Override
    public void examine(LinkDiagram link, Findings findings, Effort effort) {
        List<Law> open = new ArrayList<>(laws.installed());
        // A dear invariant must not use up what a cheap one needs: a small part of the effort for each, then the rest.
        for (double share : new double[] {FIRST_SHARE, 1}) {
            Effort part = effort.part(share);
            for (Law law : List.copyOf(open)) {
                part.restart();
                try {
                    apply(law, link, findings, part);
                    open.remove(law);
                } catch (Effort.SpentException e) {
                    effort.checkpoint();
                }
                if (findings.together().classes() == 1) {
                    return;
                }
            }
        }
    }

    private static void apply(Law law, LinkDiagram link, Findings findings, Effort effort) {
        Optional<Measured> measured = law.value(link, effort);
        if (measured.isEmpty()) {
            return;
        }
        if (!law.admitsSplit(measured.get().value())) {
            findings.together(Partition.whole(link.components()), evidence(law, measured.get()));
            return;
        }
        Set<Pair> ties = law.ties(measured.get().value(), link.components());
        if (!ties.isEmpty()) {
            findings.together(joined(ties, link.components()), evidence(law, measured.get()));
        }
    }

    private static Partition joined(Set<Pair> ties, int components) {
        int[] root = new int[components];
        Arrays.setAll(root, i -> i);
        for (Pair tie : ties) {
            root[find(root, tie.first())] = find(root, tie.second());
        }
        Arrays.setAll(root, i -> find(root, i));
        return Partition.of(root);
    }

    private static int find(int[] root, int i) {
        int r = i;
        while (root[r] != r) {
            r = root[r];
        }
        return r;
    }

    private static Evidence evidence(Law law, Measured measured) {
        return new Evidence("law." + law.entry().id(), measured.by().origin(), "{\"method\":"
                + ValueText.quoted(measured.by().id()) + ",\"value\":" + ValueText.quoted(measured.value().text()) + "}");
    }
}
