package ropewalk.product.tests;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
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

/** What a group drops into its guests folder, or names with {@code --guest}. */
class GuestsTest {
    private static final byte[] ECHO = SmallBundle.named("guest.echo").subcommand(EchoGuest.class, "echo").jar();

    @TempDir
    static Path shared;
    private static Distribution product;

    @TempDir
    Path scratch;
    private Run run;

    @BeforeAll
    static void unpack() throws IOException {
        product = Subject.unpack(shared);
    }

    @AfterAll
    static void close() throws IOException {
        product.close();
    }

    @BeforeEach
    void prepare() {
        run = Run.of(product.file("ropewalk"), scratch);
    }

    @Test
    void goodOnesServeAndEachBadOneIsOneLine() throws IOException {
        Path guests = run.guests();
        Files.write(guests.resolve("a good one.jar"), ECHO);
        Files.write(guests.resolve("cut.jar"), Arrays.copyOf(ECHO, ECHO.length / 2));
        Files.writeString(guests.resolve("text.jar"), "This is a letter, not a jar.");
        Files.write(guests.resolve("plain.jar"), SmallBundle.named("x").header("Bundle-SymbolicName", "").jar());
        Files.write(guests.resolve("needy.jar"), SmallBundle.named("needy").header("Import-Package", "no.such.thing").jar());
        Files.write(guests.resolve("twin.jar"), ECHO);
        Files.writeString(guests.resolve("notes.txt"), "not looked at");
        Files.write(guests.resolve(".half.jar"), new byte[3]);
        Run.Ended ended = run.go("echo", "x");
        List<String> lines = ended.err().lines().toList();
        assertAll(() -> assertEquals(1, ended.status()), () -> assertEquals("[x]\n", ended.out()),
                () -> assertEquals(5, lines.size(), ended.err()),
                () -> assertEquals(1, count(lines, "ropewalk: guests/cut.jar cannot be read: .+; copy it again, or remove it")),
                () -> assertEquals(1, count(lines, "ropewalk: guests/text.jar cannot be read: .+; copy it again, or remove it")),
                () -> assertEquals(1, count(lines, "ropewalk: guests/plain.jar is no bundle: .+")),
                () -> assertEquals(1, count(lines, "ropewalk: guests/needy.jar cannot be started: it needs package no.such.thing, .+")),
                () -> assertEquals(1, count(lines, "ropewalk: guests/twin.jar is left out: .+")),
                () -> assertEquals(List.of(run.temporary()), Folders.below(run.temporary())));
    }

    private static long count(List<String> lines, String pattern) {
        return lines.stream().filter(line -> line.matches(pattern)).count();
    }

    @Test
    void namedOnesMustBeGood() throws IOException {
        Path cut = Files.write(scratch.resolve("cut.jar"), Arrays.copyOf(ECHO, 100));
        Path needy = Files.write(scratch.resolve("needy.jar"),
                SmallBundle.named("needy").header("Import-Package", "no.such.thing").jar());
        for (Path bad : List.of(cut, needy, scratch.resolve("nowhere.jar"))) {
            Run.Ended ended = run.go("--guest", bad.toString(), "echo");
            assertEquals(2, ended.status(), ended::toString);
            assertTrue(ended.err().matches("ropewalk: --guest \\Q" + bad + "\\E [^\n]+\n"), ended.err());
        }
    }

    @Test
    void arrivalChangeRemovalAndReturnAreFollowed() throws IOException {
        Path watch = Files.write(scratch.resolve("w.jar"), SmallBundle.named("w").subcommand(WatchGuest.class, "watch")
                .header("Import-Package", "org.osgi.framework").header("Bundle-Version", "7").jar());
        Path done = scratch.resolve("done");
        Run.Running running = run.start("--guest", watch.toString(), "watch", done.toString());
        Services.until("the subcommand runs", () -> running.out().contains("watch@7.0.0"));
        Path guest = run.guests().resolve("echo.jar");
        assertNext(running, "echo@1.0.0", () -> Files.write(guest, ECHO));
        assertNext(running, "echo@2.0.0", () -> Files.write(guest, SmallBundle.named("guest.echo")
                .subcommand(EchoGuest.class, "echo").header("Bundle-Version", "2").jar()));
        Files.delete(guest);
        Services.until("the guest has gone", () -> !last(running).contains("echo@"));
        assertNext(running, "echo@1.0.0", () -> Files.write(guest, ECHO));
        // A twin is refused, until the one that it is a twin of goes.
        Path twin = run.guests().resolve("twin.jar");
        Files.write(twin, ECHO);
        Services.until("the twin is refused", () -> running.err().contains("twin.jar"));
        assertNext(running, "echo@1.0.0 from twin.jar", () -> Files.delete(guest));
        // What was needed comes later.
        Files.write(run.guests().resolve("needy.jar"), SmallBundle.named("needy").subcommand(LookGuest.class, "look")
                .header("Import-Package", "org.osgi.framework,late.comer").jar());
        Services.until("the needy one is refused", () -> running.err().contains("needy.jar"));
        assertNext(running, "look@1.0.0", () -> Files.write(run.guests().resolve("late.jar"),
                SmallBundle.named("late").header("Export-Package", "late.comer").file("late/comer/x", new byte[1]).jar()));
        Files.createFile(done);
        Run.Ended ended = running.end();
        assertEquals(0, ended.status(), ended::toString);
        assertEquals(2, ended.err().lines().count(), ended.err());
        assertEquals(List.of(run.temporary()), Folders.below(run.temporary()));
    }

    private interface Step {
        void take() throws IOException;
    }

    private static void assertNext(Run.Running running, String expected, Step step) throws IOException {
        int before = running.out().length();
        step.take();
        Services.until("the list shows " + expected,
                () -> running.out().length() > before && running.out().substring(before).contains(expected));
    }

    private static String last(Run.Running running) {
        return running.out().lines().reduce("", (one, next) -> next);
    }
}
