package ropewalk.survey;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/**
 * What to measure.
 *
 * @param files collections, at least one
 * @param out the output folder, or nothing for {@code NAME.survey} in the current folder
 * @param only ids of invariants or methods, or {@code verdict}; empty for all
 * @param skip ids to leave out
 * @param withRivals whether every method runs, and rivals are compared
 * @param strict whether a verdict that only relies on somebody's word stays undecided
 * @param effortSeconds processor seconds that a cell may use
 * @param jobs number of threads
 */
public record SurveyRequest(List<Path> files, Optional<Path> out, List<String> only, List<String> skip,
        boolean withRivals, boolean strict, double effortSeconds, int jobs) {

    // Keeps copies.
    public SurveyRequest {
        files = List.copyOf(files);
        only = List.copyOf(only);
        skip = List.copyOf(skip);
    }
}
