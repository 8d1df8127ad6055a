package ropewalk.guest.tests;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import ropewalk.testkit.Distribution;
import ropewalk.testkit.Folders;
import ropewalk.testkit.Run;

/** The unpacked product with a small collection, and runs of it each with a data folder of its own. */
final class Bench implements AutoCloseable {

    /** The guest that the neighbouring module builds. */
    static final Path QUAYSIDE = Path.of(System.getProperty("quayside.jar")).toAbsolutePath().normalize();

    /** The values of these links are in the tests of the guest, with their sources. */
    static final List<String> NAMES = List.of("unknot", "trefoil", "figure-eight", "Hopf", "two trefoils", "unlink",
            "Borromean", "torus (3,4)", "5_1", "curl", "hidden");

    private static final String COLLECTION = """
            name,notation,code
            unknot,braid,1:
            trefoil,braid,2: 1 1 1
            figure-eight,braid,3: 1 -2 1 -2
            Hopf,braid,2: 1 1
            two trefoils,braid,4: 1 1 1 3 3 3
            unlink,braid,2:
            Borromean,braid,3: 1 -2 1 -2 1 -2
            "torus (3,4)",braid,3: 1 2 1 2 1 2 1 2
            5_1,braid,2: 1 1 1 1 1
            curl,braid,2: 1
            hidden,braid,5: 1 2 2 -1 -3 -4 2 1 3 2 2 -4 3
            """;

    private final Path folder;
    private final Distribution product;
    private final Path collection;
    private int runs;

    Bench() throws IOException {
        folder = Files.createTempDirectory("ropewalk-guests-");
        product = Distribution.unpack(Path.of(System.getProperty("ropewalk.zip")), folder.resolve("product"));
        collection = Files.writeString(folder.resolve("links.csv"), COLLECTION);
    }

    Path folder() {
        return folder;
    }

    /** A new user, who has no guests. */
    User user() throws IOException {
        Path scratch = Files.createDirectory(folder.resolve("user" + ++runs));
        // Runs are short: the optimising compiler would not pay. Little memory, so that a guest soon uses it up.
        return new User(Run.of(product.file("ropewalk"), scratch).with("ROPEWALK_JAVA_OPTS",
                "-XX:TieredStopAtLevel=1 -Xmx256m"), scratch);
    }

    @Override
    public void close() throws IOException {
        product.close();
        Folders.delete(folder);
    }

    /** Somebody with a data folder of their own. */
    final class User {

        private final Run run;
        private final Path scratch;
        private int surveys;

        private User(Run run, Path scratch) {
            this.run = run;
            this.scratch = scratch;
        }

        /** The folder where this user drops guests. */
        Path guests() throws IOException {
            return run.guests();
        }

        /** Surveys the collection; the options before the subcommand, and those after it. */
        Outcome survey(List<String> before, String... after) throws IOException {
            return survey(collection, before, after);
        }

        /** Surveys another collection. */
        Outcome survey(Path links, List<String> before, String... after) throws IOException {
            Path out = scratch.resolve("survey" + ++surveys);
            List<String> arguments = new ArrayList<>(before);
            arguments.addAll(List.of("survey", links.toString(), "--out", out.toString(), "--quiet"));
            arguments.addAll(List.of(after));
            Run.Ended ended = run.go(arguments.toArray(String[]::new));
            return new Outcome(ended, out);
        }
    }

    /** What came of a survey. */
    record Outcome(Run.Ended ended, Path out) {

        Table results() {
            if (!Files.exists(out.resolve("results.csv"))) {
                throw new AssertionError("no results.csv; status " + ended.status() + ", messages: " + ended.err());
            }
            return Table.read(out.resolve("results.csv"));
        }

        Table rivals() {
            return Table.read(out.resolve("rivals.csv"));
        }

        /** The messages, less the closing line with its times. */
        List<String> messages() {
            List<String> lines = ended.err().lines().toList();
            if (lines.isEmpty() || !lines.get(lines.size() - 1).contains(" links/s")) {
                throw new AssertionError("no closing line: " + ended.err());
            }
            return lines.subList(0, lines.size() - 1);
        }
    }
}
