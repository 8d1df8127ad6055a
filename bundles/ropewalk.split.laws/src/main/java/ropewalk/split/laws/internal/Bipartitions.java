package ropewalk.split.laws.internal;

import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Effort;
import ropewalk.invariant.ValueText;
import ropewalk.invariant.catalogue.CatalogueEntry.Measured;
import ropewalk.split.Evidence;
import ropewalk.split.Findings;
import ropewalk.split.Partition;

/**
 * Tries to exclude every bipartition of the classes of one link by the installed laws. Two components are together when
 * every bipartition that separates them is excluded; so the result is what the bipartitions that are left have in
 * common. With m classes there are 2^(m-1) - 1 bipartitions: all of them are looked at, or nothing is claimed.
 */
final class Bipartitions {

    /** More could not be listed in evidence that anybody reads; pairs have been tried before. */
    private static final int MOST_CLASSES = 16;

    private final LinkDiagram link;
    private final Partition classes;
    private final List<Law> laws;
    private final Effort effort;
    private final Map<Integer, LinkDiagram> sublinks = new HashMap<>();
    private final Map<String, Optional<Measured>> values = new HashMap<>();
    private final Set<String> kinds = new LinkedHashSet<>();
    private final Set<String> origins = new LinkedHashSet<>();
    private final StringBuilder listed = new StringBuilder();

    Bipartitions(LinkDiagram link, Partition classes, List<Law> laws, Effort effort) {
        this.link = link;
        this.classes = classes;
        this.laws = laws;
        this.effort = effort;
    }

    void examine(Findings findings) {
        int m = classes.classes();
        if (m > MOST_CLASSES) {
            return;
        }
        // Classes 1 … m-1 choose a side, class 0 stays on the left.
        int all = (1 << m) - 1;
        Partition common = Partition.whole(m);
        for (int right = 2; right <= all - 1; right += 2) {
            effort.checkpoint();
            if (!isExcluded(all & ~right, right)) {
                common = meet(common, right);
                if (common.classes() == m) {
                    return;
                }
            }
        }
        int[] marks = new int[classes.size()];
        for (int i = 0; i < marks.length; i++) {
            marks[i] = common.classOf(classes.classOf(i));
        }
        findings.together(Partition.of(marks), new Evidence(String.join("+", kinds), String.join(" and ", origins),
                "{\"bipartitions\":[" + listed + "]}"));
    }

    private static Partition meet(Partition partition, int right) {
        int[] marks = new int[partition.size()];
        for (int c = 0; c < marks.length; c++) {
            marks[c] = 2 * partition.classOf(c) + (right >> c & 1);
        }
        return Partition.of(marks);
    }

    private boolean isExcluded(int left, int right) {
        Bipartition which = new Bipartition(components(left));
        for (Law law : laws) {
            Optional<Measured> whole = value(law, left | right);
            if (whole.isEmpty()) {
                continue;
            }
            Optional<Measured> leftValue = value(law, left);
            Optional<Measured> rightValue = value(law, right);
            if (leftValue.isPresent() && rightValue.isPresent()
                    && law.excludes(whole.get().value(), leftValue.get().value(), rightValue.get().value(), which)) {
                note(law, which, whole.get(), leftValue.get(), rightValue.get());
                return true;
            }
        }
        return false;
    }

    private void note(Law law, Bipartition which, Measured whole, Measured left, Measured right) {
        kinds.add("law." + law.entry().id());
        for (Measured measured : List.of(whole, left, right)) {
            origins.add(measured.by().origin());
        }
        StringBuilder side = new StringBuilder();
        for (int i = 0; i < which.size(); i++) {
            if (which.isLeft(i)) {
                side.append(side.isEmpty() ? "" : ",").append(i + 1);
            }
        }
        listed.append(listed.isEmpty() ? "" : ",").append("{\"left\":[").append(side).append("],\"method\":")
                .append(ValueText.quoted(whole.by().id())).append(",\"whole\":")
                .append(ValueText.quoted(whole.value().text())).append(",\"sides\":[")
                .append(ValueText.quoted(left.value().text())).append(',')
                .append(ValueText.quoted(right.value().text())).append("]}");
    }

    private Optional<Measured> value(Law law, int set) {
        return values.computeIfAbsent(law.entry().id() + " " + set, key -> law.value(sublink(set), effort));
    }

    private LinkDiagram sublink(int set) {
        return sublinks.computeIfAbsent(set, s -> s == (1 << classes.classes()) - 1 ? link : link.sublink(components(s)));
    }

    private boolean[] components(int set) {
        boolean[] keep = new boolean[classes.size()];
        for (int i = 0; i < keep.length; i++) {
            keep[i] = (set >> classes.classOf(i) & 1) == 1;
        }
        return keep;
    }
}
