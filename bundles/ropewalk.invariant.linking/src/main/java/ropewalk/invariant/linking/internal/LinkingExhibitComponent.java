package ropewalk.invariant.linking.internal;

import java.util.List;
import java.util.stream.IntStream;
import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Exhibit;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerMatrixValue;

/** Shows the linking matrix of a link of several components. */
@Component
public final class LinkingExhibitComponent implements Exhibit.Source {

    private static final int LARGEST = 60;

    @Override
    public List<Exhibit> exhibits(LinkDiagram link) {
        if (link.components() == 1 || link.components() > LARGEST) {
            return List.of();
        }
        List<String> labels = IntStream.rangeClosed(1, link.components()).mapToObj(i -> "k" + i).toList();
        return new LinkingMethodComponent().measure(link, Effort.ofSeconds(1))
                instanceof Outcome.Exact<IntegerMatrixValue> exact
                ? List.of(new Exhibit("Linking matrix", labels, labels, exact.value(), List.of())) : List.of();
    }
}
