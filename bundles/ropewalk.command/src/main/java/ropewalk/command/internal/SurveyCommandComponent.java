package ropewalk.command.internal;

import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.ToIntFunction;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import ropewalk.survey.Survey;
import ropewalk.survey.SurveyReport;
import ropewalk.survey.SurveyRequest;

/** {@code survey}: measures collections. */
@Component(service = ToIntFunction.class, property = {
    "ropewalk.subcommand=survey",
    "ropewalk.summary=measure every link of collections and write results.csv"})
public final class SurveyCommandComponent extends Subcommand {

    private static final String USAGE = """
            ropewalk survey FILE… [--out DIR] [--only ID,…] [--skip ID,…] [--rivals] [--strict] [--effort SECONDS]
                            [--jobs N] [--quiet]

            Measures every link of the collections (CSV with the columns name,notation,code) and writes results.csv,
            rejected.csv and evidence.jsonl to DIR, which is NAME.survey in the current folder unless given.

              --out DIR         another output folder; one that no survey wrote is never overwritten
              --only ID,…       these invariants or methods alone; 'verdict' is the verdict
              --skip ID,…       all but these
              --rivals          run every method and compare; rivals.csv
              --strict          leave undecided what relies on unchecked evidence
              --effort SECONDS  processor time a cell may use, 5 unless given
              --jobs N          threads, as many as processors unless given
              --quiet           no progress

            Exit status: 0 every link was read and measured, 1 a row was rejected or a cell failed, 2 wrong usage,
            3 the survey itself broke.""";

    private final Survey survey;

    /**
     * Made by the framework.
     *
     * @param survey the survey
     */
    @Activate
    public SurveyCommandComponent(@Reference Survey survey) {
        super("survey", USAGE);
        this.survey = survey;
    }

    @Override
    int run(String[] arguments) throws UsageException, IOException {
        Arguments options = Arguments.of(arguments,
                List.of("--out", "--only", "--skip", "--effort", "--jobs", "--ledger"),
                List.of("--rivals", "--strict", "--quiet", "--resume"));
        if (options.has("--resume") || options.value("--ledger").isPresent()) {
            throw new UsageException((options.has("--resume") ? "--resume" : "--ledger")
                    + " comes with feature ledger, which is not installed");
        }
        SurveyRequest request = request(options);
        Progress progress = Progress.onStandardError(options.has("--quiet"));
        Thread hook = new Thread(survey::stop, "survey stop");
        Runtime.getRuntime().addShutdownHook(hook);
        try {
            SurveyReport report = survey.run(request, progress);
            progress.end();
            return closing(report);
        } catch (Survey.RequestException e) {
            progress.end();
            message(e.getMessage());
            return WRONG_USAGE;
        } catch (IllegalStateException e) {
            progress.end();
            message("the survey broke off: " + e.getMessage());
            return BROKE;
        } finally {
            removeHook(hook);
        }
    }

    private static void removeHook(Thread hook) {
        try {
            Runtime.getRuntime().removeShutdownHook(hook);
        } catch (IllegalStateException e) {
            return;     // the machine is stopping: the hook is at work
        }
    }

    private static SurveyRequest request(Arguments options) throws UsageException {
        if (options.plain().isEmpty()) {
            throw new UsageException("survey needs a collection file");
        }
        List<Path> files = Arguments.paths(options.plain());
        Optional<Path> out = options.value("--out").isPresent()
                ? Optional.of(Arguments.path(options.value("--out").get())) : Optional.empty();
        int processors = Runtime.getRuntime().availableProcessors();
        double jobs = number(options, "--jobs", processors);
        if (jobs != Math.rint(jobs) || jobs < 1 || jobs > 1024) {
            throw new UsageException("--jobs takes a whole number from 1 to 1024");
        }
        double effort = number(options, "--effort", 5);
        if (!(effort > 0)) {
            throw new UsageException("--effort takes seconds above 0");
        }
        return new SurveyRequest(files, out, options.ids("--only"), options.ids("--skip"), options.has("--rivals"),
                options.has("--strict"), effort, (int) jobs);
    }

    private static double number(Arguments options, String name, double otherwise) throws UsageException {
        Optional<String> text = options.value(name);
        if (text.isEmpty()) {
            return otherwise;
        }
        try {
            return Double.parseDouble(text.get());
        } catch (NumberFormatException e) {
            throw new UsageException(name + " takes a number, not '" + text.get() + "'");
        }
    }

    private static String counted(long number, String what) {
        return number + " " + what + (number == 1 ? "" : "s");
    }

    private static int closing(SurveyReport report) {
        if (!report.isComplete()) {
            message("stopped; " + report.links() + " rows are in " + report.folder());
            return BROKE;
        }
        if (report.rejected() > 0 || report.failedCells() > 0) {
            message(counted(report.rejected(), "row") + " rejected (see " + report.folder().resolve("rejected.csv") + "), "
                    + counted(report.failedCells(), "cell") + " failed (beginning with '!')");
        }
        long started = System.currentTimeMillis() - ManagementFactory.getRuntimeMXBean().getStartTime();
        double starting = Math.max(0, started / 1e3 - (System.nanoTime() - report.firstByteNanos()) / 1e9);
        message(String.format(Locale.ROOT, "%s, %.2f s to start, %.3f s from first byte to last, %.0f links/s; "
                + "results in %s", counted(report.links(), "link"), starting, report.seconds(), report.links() / report.seconds(),
                report.folder()));
        return report.rejected() > 0 || report.failedCells() > 0 ? SOME_FAILED : DONE;
    }
}
