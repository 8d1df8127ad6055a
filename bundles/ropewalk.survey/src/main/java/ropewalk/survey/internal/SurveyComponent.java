package ropewalk.survey.internal;

import java.io.IOException;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.osgi.service.component.annotations.ReferenceCardinality;
import org.osgi.service.component.annotations.ReferencePolicyOption;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.split.SplitDetection;
import ropewalk.survey.Survey;
import ropewalk.survey.SurveyListener;
import ropewalk.survey.SurveyReport;
import ropewalk.survey.SurveyRequest;

/** Offers the survey over what the catalogue lists, with verdicts where split detection is installed. */
@Component
public final class SurveyComponent implements Survey {

    private final MethodCatalogue catalogue;
    private final SplitDetection detection;
    private final Set<SurveyRun> running = ConcurrentHashMap.newKeySet();

    /**
     * Made by the framework.
     *
     * @param catalogue the installed invariants
     * @param detection split detection, or null where it is not installed
     */
    @Activate
    public SurveyComponent(@Reference MethodCatalogue catalogue, @Reference(
            cardinality = ReferenceCardinality.OPTIONAL,
            policyOption = ReferencePolicyOption.GREEDY) SplitDetection detection) {
        this.catalogue = catalogue;
        this.detection = detection;
    }

    @Override
    public SurveyReport run(SurveyRequest request, SurveyListener listener) throws RequestException, IOException {
        SurveyRun run = new SurveyRun(request, catalogue, detection, listener);
        running.add(run);
        try {
            return run.run();
        } finally {
            running.remove(run);
        }
    }

    @Override
    public void stop() {
        running.forEach(SurveyRun::stop);
    }
}
