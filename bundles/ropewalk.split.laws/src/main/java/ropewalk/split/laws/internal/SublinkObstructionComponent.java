package ropewalk.split.laws.internal;

import java.util.List;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.split.Findings;
import ropewalk.split.Obstruction;
import ropewalk.split.Partition;

/**
 * The split laws over sublinks: first every pair of components as a link of its own, since inseparability passes from a
 * sublink to the link, then every bipartition of the classes that are left.
 */
@Component(property = Obstruction.COST + ":Integer=100")
public final class SublinkObstructionComponent implements Obstruction {

    private final Laws laws;

    /**
     * Made by the framework.
     *
     * @param catalogue the installed invariants
     */
    @Activate
    public SublinkObstructionComponent(@Reference MethodCatalogue catalogue) {
        this.laws = new Laws(catalogue);
    }

    @Override
    public String name() {
        return "split laws";
    }

    @Override
    public void examine(LinkDiagram link, Findings findings, Effort effort) {
        List<Law> installed = laws.installed();
        if (installed.isEmpty()) {
            return;
        }
        if (link.components() > 2) {
            pairs(link, installed, findings, effort);
        }
        if (findings.together().classes() > 1) {
            new Bipartitions(link, findings.together(), installed, effort).examine(findings);
        }
    }

    private static void pairs(LinkDiagram link, List<Law> laws, Findings findings, Effort effort) {
        int k = link.components();
        boolean[] pair = new boolean[k];
        for (int i = 0; i < k; i++) {
            for (int j = i + 1; j < k; j++) {
                effort.checkpoint();
                Partition known = findings.together();
                if (known.classOf(i) == known.classOf(j)) {
                    continue;
                }
                pair[i] = true;
                pair[j] = true;
                new Bipartitions(link.sublink(pair), Partition.singles(2), laws, effort)
                        .examine(new SublinkFindings(findings, k, new int[] {i, j}));
                pair[i] = false;
                pair[j] = false;
            }
        }
    }
}
