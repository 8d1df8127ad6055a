package ropewalk.bench.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import ropewalk.survey.Survey;
import ropewalk.survey.SurveyListener;
import ropewalk.survey.SurveyReport;
import ropewalk.survey.SurveyRequest;

/** Whole surveys, from the first byte read to the last byte written, on all processors. */
final class SurveyTrials {

    private static final List<String> CHEAP = List.of("determinant", "nullity", "linking");
    private static final long SEED = 20_260_101;

    private final Survey survey;

    SurveyTrials(Survey survey) {
        this.survey = survey;
    }

    List<Trial> all() {
        return List.of(
                new Trial("cheap-100k", "survey --only determinant,nullity,linking of 100,000 links",
                        folder -> survey(folder, 100_000, CHEAP)),
                new Trial("cheap-2m", "survey --only determinant,nullity,linking of 2,000,000 links",
                        folder -> survey(folder, 2_000_000, CHEAP)),
                new Trial("default-100k", "survey of 100,000 links, everything installed",
                        folder -> survey(folder, 100_000, List.of())),
                new Trial("default-2m", "survey of 2,000,000 links, everything installed",
                        folder -> survey(folder, 2_000_000, List.of())));
    }

    private Trial.Figure survey(Path folder, int links, List<String> only) throws IOException {
        Path collection = folder.resolve("random-" + links + ".csv");
        if (!Files.exists(collection)) {
            RandomCollection.write(collection, links, SEED);
        }
        SurveyRequest request = new SurveyRequest(List.of(collection), Optional.of(folder.resolve("random.survey")), only,
                List.of(), false, false, 5, Runtime.getRuntime().availableProcessors());
        try {
            SurveyReport report = survey.run(request, new MessagesOnly());
            if (report.links() != links || report.rejected() > 0 || report.failedCells() > 0) {
                throw new IOException(report.links() + " of " + links + " links measured, " + report.rejected()
                        + " rejected, " + report.failedCells() + " cells failed");
            }
            return new Trial.Figure(report.seconds(), links / report.seconds(), links + " links");
        } catch (Survey.RequestException e) {
            throw new IOException(e.getMessage(), e);
        }
    }

    /** What goes wrong shows in the figures. */
    private static final class MessagesOnly implements SurveyListener {
        @Override
        public void message(String line) {
            System.err.println("ropewalk: " + line);
        }

        @Override
        public void progress(long links, long bytesRead, long bytesInAll) {
            // The figure is all that counts here.
        }
    }
}
