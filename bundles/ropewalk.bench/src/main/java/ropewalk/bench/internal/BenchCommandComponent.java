package ropewalk.bench.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.function.ToIntFunction;
import java.util.stream.Stream;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.survey.Survey;

/** {@code bench}: times surveys and determinants and prints a table. */
@Component(service = ToIntFunction.class, property = {
    "ropewalk.subcommand=bench",
    "ropewalk.summary=time surveys and determinants on this machine"})
public final class BenchCommandComponent implements ToIntFunction<String[]> {

    private static final int DONE = 0;
    private static final int WRONG_USAGE = 2;
    private static final int BROKE = 3;

    private final List<Trial> trials = new ArrayList<>();

    /**
     * Made by the framework.
     *
     * @param survey the survey
     * @param catalogue the installed invariants
     */
    @Activate
    public BenchCommandComponent(@Reference Survey survey, @Reference MethodCatalogue catalogue) {
        trials.addAll(new SurveyTrials(survey).all());
        trials.addAll(new DeterminantTrials(catalogue).all());
    }

    @Override
    public int applyAsInt(String[] arguments) {
        if (arguments.length == 1 && (arguments[0].equals("--help") || arguments[0].equals("-h"))) {
            usage();
            return DONE;
        }
        List<Trial> chosen = new ArrayList<>();
        for (String name : arguments) {
            trials.stream().filter(t -> t.name().equals(name)).findFirst().ifPresent(chosen::add);
        }
        if (chosen.size() < arguments.length) {
            System.err.println("ropewalk: bench knows "
                    + String.join(", ", trials.stream().map(Trial::name).toList()) + "; see 'ropewalk bench --help'");
            return WRONG_USAGE;
        }
        try {
            run(arguments.length == 0 ? trials : chosen);
            return DONE;
        } catch (IOException e) {
            System.err.println("ropewalk: bench broke off: " + e.getMessage());
            return BROKE;
        }
    }

    private void usage() {
        System.out.println("ropewalk bench [NAME…]\n\nTimes all of these, or those named, on data made from fixed seeds in"
                + " a temporary folder:\n");
        for (Trial trial : trials) {
            System.out.printf("  %-18s %s%n", trial.name(), trial.summary());
        }
    }

    private static void run(List<Trial> chosen) throws IOException {
        Path folder = Files.createTempDirectory("ropewalk-bench");
        try {
            System.out.printf("%-18s %10s %12s  %s%n", "name", "seconds", "links/s", "value");
            for (Trial trial : chosen) {
                Trial.Figure figure = trial.work().in(folder);
                System.out.printf(Locale.ROOT, "%-18s %10.4f %12s  %s%n", trial.name(), figure.seconds(),
                        figure.rate() > 0 ? String.format(Locale.ROOT, "%.0f", figure.rate()) : "", figure.value());
            }
        } finally {
            delete(folder);
        }
    }

    private static void delete(Path folder) throws IOException {
        try (Stream<Path> paths = Files.walk(folder)) {
            for (Path path : paths.sorted(Comparator.reverseOrder()).toList()) {
                Files.delete(path);
            }
        }
    }
}
