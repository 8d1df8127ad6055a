package ropewalk.product.tests;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.jar.JarFile;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import ropewalk.testkit.Distribution;
import ropewalk.testkit.Folders;
import ropewalk.testkit.Run;
import ropewalk.testkit.Services;
import ropewalk.testkit.SmallBundle;

/** The command line of the packed product, up to the subcommand and after it. */
class LaunchTest {
    @TempDir
    static Path shared;
    private static Distribution product;
    private static Path echo;

    @TempDir
    Path scratch;
    private Run run;

    @BeforeAll
    static void unpack() throws IOException {
        product = Subject.unpack(shared);
        echo = Files.write(shared.resolve("echo.jar"), SmallBundle.named("guest.echo").subcommand(EchoGuest.class, "echo").jar());
    }

    @AfterAll
    static void nothingWasWrittenIntoTheProduct() throws IOException {
        List<String> changes = product.changes();
        product.close();
        assertEquals(List.of(), changes);
    }

    @BeforeEach
    void prepare() {
        run = Run.of(product.file("ropewalk"), scratch);
    }

    /** Runs to the end, and asserts what holds for each run: nothing is left in the temporary folder. */
    private Run.Ended go(String... arguments) throws IOException {
        Run.Ended ended = run.go(arguments);
        assertEquals(List.of(run.temporary()), Folders.below(run.temporary()), ended::toString);
        return ended;
    }

    @Test
    void helpListsTheSubcommands() throws IOException {
        Run.Ended help = go("--guest", echo.toString(), "--help");
        assertAll(() -> assertEquals(0, help.status()), () -> assertEquals("", help.err()),
                () -> assertTrue(help.out().startsWith("usage: ropewalk "), help.out()),
                () -> assertTrue(help.out().lines().anyMatch(line -> line.matches(" *echo +made by a test")), help.out()));
    }

    @Test
    void noSubcommandIsHelp() throws IOException {
        Run.Ended nothing = go();
        assertEquals(new Run.Ended(0, go("--help").out(), ""), nothing);
    }

    @Test
    void versionIsThatOfTheZip() throws IOException {
        String folder = product.folder().getFileName().toString();
        assertEquals(new Run.Ended(0, folder.replace("ropewalk-", "ropewalk ") + "\n", ""), go("--version"));
    }

    @Test
    void unknownSubcommandIsWrongUsage() throws IOException {
        assertEquals(new Run.Ended(2, "", Subject.line("unknown subcommand 'surwey'; 'ropewalk --help' lists them")),
                go("surwey"));
    }

    @Test
    void unknownOptionIsWrongUsage() throws IOException {
        Run.Ended ended = go("--feature", "core");
        assertAll(() -> assertEquals(2, ended.status()), () -> assertTrue(ended.err().matches(
                "ropewalk: unknown option --feature before the subcommand; possible are [^\n]*\n"), ended.err()));
    }

    @Test
    void argumentsAfterTheSubcommandAreItsOwn() throws IOException {
        assertEquals(new Run.Ended(6, "[--features][x][--guest][a  b][][é ∞]\n", ""),
                go("--guest=" + echo, "echo", "--features", "x", "--guest", "a  b", "", "é ∞"));
    }

    @Test
    void namesWithAccentsWorkWithoutALocale() throws IOException {
        run = run.with("LC_ALL", "C");
        assertEquals(new Run.Ended(1, "[é]\n", ""), go("--guest", echo.toString(), "echo", "é"));
    }

    @Test
    void exceptionIsOneLineAndItsDetailsGoToTheLog() throws IOException {
        Path jar = Files.write(scratch.resolve("b.jar"), SmallBundle.named("b").subcommand(BrokenGuest.class, "fray").jar());
        Path log = scratch.resolve("home").resolve("ropewalk.log");
        assertEquals(new Run.Ended(3, "", Subject.line(
                "fray broke: IllegalStateException: out of rope; details in " + log)), go("--guest", jar.toString(), "fray"));
        assertTrue(Files.readString(log).contains("at ropewalk.product.tests.BrokenGuest.applyAsInt("), "no trace in the log");
    }

    @Test
    void subcommandThatCannotBeMadeIsOneLine() throws IOException {
        Path jar = Files.write(scratch.resolve("u.jar"), SmallBundle.named("u").subcommand(UnmakeableGuest.class, "fray").jar());
        assertEquals(new Run.Ended(3, "", Subject.line("component " + UnmakeableGuest.class.getName()
                + " of u could not be made: java.lang.IllegalStateException: no rope at all")),
                go("--guest", jar.toString(), "fray"));
    }

    @Test
    void bundlesAreToldWhereTheyAre() throws IOException {
        Path jar = Files.write(scratch.resolve("look.jar"), SmallBundle.named("look").subcommand(LookGuest.class, "look")
                .header("Import-Package", "org.osgi.framework").jar());
        Path home = scratch.resolve("home");
        assertEquals(List.of(home.toString(), home.resolve("guests").toString(), product.folder().toString(), "core",
                product.folder().getFileName().toString().substring("ropewalk-".length())),
                go("--features", "core", "--guest", jar.toString(), "look", "ropewalk.data", "ropewalk.guests",
                        "ropewalk.product", "ropewalk.features", "ropewalk.version").out().lines().toList());
    }

    @Test
    void stoppedFromOutsideItStillLeavesNothing() throws IOException {
        Path jar = Files.write(scratch.resolve("w.jar"), SmallBundle.named("w").subcommand(WatchGuest.class, "watch")
                .type(EchoGuest.class).header("Import-Package", "org.osgi.framework").jar());
        Run.Running watching = run.start("--guest", jar.toString(), "watch", scratch.resolve("never").toString());
        Services.until("the subcommand runs", () -> watching.out().contains("watch@"));
        watching.process().destroy();
        Run.Ended ended = watching.end();
        assertAll(() -> assertEquals(128 + 15, ended.status()), () -> assertEquals("", ended.err()),
                () -> assertTrue(ended.out().endsWith("saved by EchoGuest\n"), ended.out()),
                () -> assertEquals(List.of(run.temporary()), Folders.below(run.temporary())));
    }

    @Test
    void worksThroughALinkFromAnotherFolder() throws IOException {
        Path link = Files.createSymbolicLink(scratch.resolve("a link"), product.file("ropewalk"));
        Path other = Files.createDirectory(scratch.resolve("other folder"));
        Files.copy(echo, other.resolve("mine.jar"));
        run = Run.of(link, scratch).in(other);
        assertEquals(new Run.Ended(1, "[x]\n", ""), go("--guest", "mine.jar", "echo", "x"));
        Files.delete(link);
    }

    @Test
    void archiveIsMadeOnceAndUsed() throws IOException {
        run = run.with("ROPEWALK_ARCHIVE", "").with("LC_ALL", "C");
        Path archives = scratch.resolve("home").resolve("archives");
        Path lost = Files.createDirectories(archives).resolve("1.jsa");
        Files.writeString(lost, "of a build that has gone");
        Files.writeString(archives.resolve("1.for"), scratch.resolve("gone") + "\n");
        assertEquals(0, run.go("--version").status());
        Services.until("the archive is there", () -> {
            List<Path> there = jsa(archives);
            return there.size() == 1 && !there.contains(lost);
        });
        Path log = scratch.resolve("classes.txt");
        run = run.with("ROPEWALK_JAVA_OPTS", "-Xlog:class+load:file=" + log);
        assertEquals(0, run.go("--help").status());
        // "Top" is what the archive adds to that of the JDK. Java 17 leaves the launcher's own classes out of it when there
        // is a blank or an accent in the path.
        assertTrue(Files.readString(log).contains("source: shared objects file (top)"), "not used");
        Files.writeString(jsa(archives).get(0), "stale");
        assertEquals(new Run.Ended(2, "", Subject.line("unknown subcommand 'x'; 'ropewalk --help' lists them")), run.go("x"));
    }

    private static List<Path> jsa(Path folder) {
        try {
            return Folders.below(folder).stream().filter(path -> path.toString().endsWith(".jsa")).toList();
        } catch (IOException | java.io.UncheckedIOException moved) {
            return List.of();   // looked at while a file was renamed: look again
        }
    }

    @Test
    void windowsLauncherIsThere() throws IOException {
        String text = Files.readString(product.file("ropewalk.cmd"));
        assertTrue(text.replace("\r\n", "").indexOf('\n') < 0, "cmd.exe wants CR LF");
        assertTrue(text.contains("ropewalk.launch.jar"), text);
    }

    @Test
    void everyLibraryComesWithItsLicence() throws IOException {
        for (Path jar : Folders.below(product.folder())) {
            String name = jar.getFileName().toString();
            if (name.endsWith(".jar") && !name.startsWith("ropewalk.")) {
                Path folder = product.file("licences").resolve(name.replace(".jar", ""));
                long texts = Folders.below(folder).stream().filter(file -> Files.isRegularFile(file)
                        && file.toFile().length() > 500).count();
                assertTrue(texts > 0, name + " has no licence in " + folder);
            }
        }
    }

    @Test
    void libraryListIsThatOfTheJars() throws IOException {
        List<String> shipped = Folders.below(product.folder()).stream().map(path -> path.getFileName().toString())
                .filter(name -> name.endsWith(".jar") && !name.startsWith("ropewalk.")).map(name -> name.replace(".jar", ""))
                .sorted().toList();
        List<String> listed = Files.readAllLines(product.file("licences/README.txt")).stream()
                .filter(line -> line.contains(": ")).map(line -> line.substring(0, line.indexOf(':'))).sorted().toList();
        assertEquals(shipped, listed);
    }

    @Test
    void launcherSharesNothingButTheFramework() throws IOException {
        try (JarFile jar = new JarFile(product.file("boot/ropewalk.launch.jar").toFile())) {
            List<String> strange = jar.stream().map(entry -> entry.getName())
                    .filter(name -> name.endsWith(".class") && !name.startsWith("ropewalk/launch/")).toList();
            assertEquals(List.of(), strange);
        }
    }
}
