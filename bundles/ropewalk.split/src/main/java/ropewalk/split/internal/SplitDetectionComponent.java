package ropewalk.split.internal;

import java.util.Comparator;
import java.util.List;
import java.util.concurrent.ConcurrentSkipListMap;
import org.osgi.framework.Constants;
import org.osgi.framework.ServiceReference;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.osgi.service.component.annotations.ReferenceCardinality;
import org.osgi.service.component.annotations.ReferencePolicy;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.split.Obstruction;
import ropewalk.split.Partition;
import ropewalk.split.Separator;
import ropewalk.split.SplitDetection;
import ropewalk.split.Verdict;

/** Offers split detection with the obstructions and separators that are there. */
@Component
public final class SplitDetectionComponent implements SplitDetection {

    private final ConcurrentSkipListMap<Place, Stage> stages = new ConcurrentSkipListMap<>(
            Comparator.comparingInt(Place::cost).thenComparing(Place::name).thenComparingLong(Place::service));

    private static final Verdict NOTHING_TO_SPLIT =
            new Verdict(Partition.whole(1), Partition.whole(1), List.of(), List.of(), "");

    private record Place(int cost, String name, long service) { }

    @Override
    public Verdict decide(LinkDiagram link, Effort effort) {
        return link.components() < 2 ? NOTHING_TO_SPLIT : new Squeeze(link, List.copyOf(stages.values()), effort).run();
    }

    @Reference(cardinality = ReferenceCardinality.MULTIPLE, policy = ReferencePolicy.DYNAMIC)
    void addObstruction(ServiceReference<Obstruction> reference, Obstruction obstruction) {
        stages.put(place(reference, obstruction.name()), new Stage(obstruction.name(), obstruction::examine));
    }

    void removeObstruction(ServiceReference<Obstruction> reference, Obstruction obstruction) {
        stages.remove(place(reference, obstruction.name()));
    }

    @Reference(cardinality = ReferenceCardinality.MULTIPLE, policy = ReferencePolicy.DYNAMIC)
    void addSeparator(ServiceReference<Separator> reference, Separator separator) {
        stages.put(place(reference, separator.name()), new Stage(separator.name(), separator::search));
    }

    void removeSeparator(ServiceReference<Separator> reference, Separator separator) {
        stages.remove(place(reference, separator.name()));
    }

    private static Place place(ServiceReference<?> reference, String name) {
        int cost = reference.getProperty(Obstruction.COST) instanceof Integer c ? c : 1000;
        return new Place(cost, name, (Long) reference.getProperty(Constants.SERVICE_ID));
    }
}
