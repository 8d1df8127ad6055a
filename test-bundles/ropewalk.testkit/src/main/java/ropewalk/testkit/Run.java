package ropewalk.testkit;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;

/**
 * A run of the product as a process of its own, with its own data folder, temporary folder and current folder.
 *
 * <p>A run is described by {@link #of}, refined by {@link #with} and {@link #in}, and carried out by {@link #go} or,
 * when the test wants to do something meanwhile, {@link #start}.
 */
public final class Run {
    private static final long LIMIT_SECONDS = 180;

    private final Path launcher;
    private final Path scratch;
    private final Map<String, String> environment;
    private final Path current;

    private Run(Path launcher, Path scratch, Map<String, String> environment, Path current) {
        this.launcher = launcher;
        this.scratch = scratch;
        this.environment = Map.copyOf(environment);
        this.current = current;
    }

    /**
     * Describes runs of a launcher.
     *
     * @param launcher the shell script
     * @param scratch an existing folder; {@code home}, {@code tmp}, out and err files are made in it
     * @return the description
     */
    public static Run of(Path launcher, Path scratch) {
        // No start-up archive: the process that makes one would outlive the test.
        return new Run(launcher, scratch, Map.of("ROPEWALK_HOME", scratch.resolve("home").toString(),
                "ROPEWALK_ARCHIVE", "no"), scratch);
    }

    /**
     * The same with another variable.
     *
     * @param variable its name
     * @param value its value; the empty text counts as not set
     * @return the new description
     */
    public Run with(String variable, String value) {
        Map<String, String> more = new HashMap<>(environment);
        more.put(variable, value);
        return new Run(launcher, scratch, more, current);
    }

    /**
     * The same in another current folder.
     *
     * @param folder the folder
     * @return the new description
     */
    public Run in(Path folder) {
        return new Run(launcher, scratch, environment, folder);
    }

    /**
     * The guests folder of these runs, made if it is not there.
     *
     * @return the folder
     * @throws IOException when it cannot be made
     */
    public Path guests() throws IOException {
        return Files.createDirectories(scratch.resolve("home").resolve("guests"));
    }

    /**
     * The folder for temporary files of these runs.
     *
     * @return the folder
     */
    public Path temporary() {
        return scratch.resolve("tmp");
    }

    /**
     * Runs to the end.
     *
     * @param arguments arguments of the product
     * @return what came of it
     * @throws IOException when the process cannot be started
     * @throws AssertionError when it has not ended after 60 s
     */
    public Ended go(String... arguments) throws IOException {
        return start(arguments).end();
    }

    /**
     * Starts a run.
     *
     * @param arguments arguments of the product
     * @return the process
     * @throws IOException when the process cannot be started
     */
    public Running start(String... arguments) throws IOException {
        Files.createDirectories(temporary());
        Path out = Files.createTempFile(scratch, "out", ".txt");
        Path err = Files.createTempFile(scratch, "err", ".txt");
        List<String> command = new ArrayList<>(List.of(launcher.toString()));
        command.addAll(List.of(arguments));
        ProcessBuilder builder = new ProcessBuilder(command).directory(current.toFile())
                .redirectOutput(out.toFile()).redirectError(err.toFile());
        builder.environment().putAll(environment);
        builder.environment().merge("ROPEWALK_JAVA_OPTS", "-Djava.io.tmpdir=" + temporary(), (mine, more) -> mine + " " + more);
        Process process = builder.start();
        process.getOutputStream().close();
        return new Running(process, out, err);
    }

    /**
     * A run under way.
     *
     * @param process the process
     * @param outFile where its standard output goes
     * @param errFile where its standard error goes
     */
    public record Running(Process process, Path outFile, Path errFile) {

        /**
         * Its standard output so far.
         *
         * @return the text
         */
        public String out() {
            return text(outFile);
        }

        /**
         * Its standard error so far.
         *
         * @return the text
         */
        public String err() {
            return text(errFile);
        }

        /**
         * Waits for the end.
         *
         * @return what came of it
         * @throws AssertionError when it has not ended after 60 s; the process is then killed
         */
        public Ended end() {
            try {
                if (!process.waitFor(LIMIT_SECONDS, TimeUnit.SECONDS)) {
                    process.destroyForcibly();
                    throw new AssertionError("no end after " + LIMIT_SECONDS + " s; out: " + out() + "; err: " + err());
                }
            } catch (InterruptedException stop) {
                process.destroyForcibly();
                Thread.currentThread().interrupt();
                throw new AssertionError("interrupted", stop);
            }
            return new Ended(process.exitValue(), out(), err());
        }

        private static String text(Path file) {
            try {
                return Files.readString(file, StandardCharsets.UTF_8);
            } catch (IOException fault) {
                throw new AssertionError("output of the run cannot be read: " + fault, fault);
            }
        }
    }

    /**
     * A run that has ended.
     *
     * @param status exit status
     * @param out standard output
     * @param err standard error
     */
    public record Ended(int status, String out, String err) { }
}
