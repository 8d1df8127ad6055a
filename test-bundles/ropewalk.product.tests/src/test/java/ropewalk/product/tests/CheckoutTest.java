package ropewalk.product.tests;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
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

/**
 * The launcher in a checkout, and with Javas that will not do. The checkout is a small one, and its {@code mvn} a script
 * that copies the packed product to where Maven would put it together and counts how often it is called: what is tested
 * is when a build is made, used and removed.
 */
class CheckoutTest {
    private static final String BUILDING = Subject.line("building (first use, or the sources have changed)");

    @TempDir
    static Path shared;
    private static Distribution product;

    @TempDir
    Path scratch;
    private Path checkout;
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
    void makeCheckout() throws IOException {
        checkout = scratch.resolve("a chéckout");
        write("pom.xml", "<project/>");
        write("bundles/a/src/main/java/A.java", "class A { }");
        write("bundles/a/src/test/java/ATest.java", "class ATest { }");
        write("features/core.json", "{}");
        Path launcher = write("product/ropewalk", Files.readString(product.file("ropewalk")));
        launcher.toFile().setExecutable(true);
        script("bin/mvn", """
                echo "$@" >>'%1$s/calls'
                [ ! -e '%1$s/mvn-says' ] || { cat '%1$s/mvn-says'; exit 1; }
                rm -rf product/target/ropewalk && mkdir -p product/target/ropewalk
                cp -R '%2$s'/boot '%2$s'/bundles '%2$s'/features product/target/ropewalk
                chmod -R u+w product/target/ropewalk
                """.formatted(scratch, product.folder()));
        run = Run.of(launcher, scratch).with("PATH", scratch.resolve("bin") + ":" + System.getenv("PATH"));
    }

    private Path write(String path, String text) throws IOException {
        Path file = checkout.resolve(path);
        Files.createDirectories(file.getParent());
        return Files.writeString(file, text);
    }

    private Path script(String path, String text) throws IOException {
        Path file = scratch.resolve(path);
        Files.createDirectories(file.getParent());
        Files.writeString(file, "#!/usr/bin/env bash\n" + text);
        file.toFile().setExecutable(true);
        return file;
    }

    private List<String> calls() throws IOException {
        Path calls = scratch.resolve("calls");
        return Files.exists(calls) ? Files.readAllLines(calls) : List.of();
    }

    private List<Path> builds() throws IOException {
        try (Stream<Path> all = Files.list(checkout.resolve("product/target/builds"))) {
            return all.filter(path -> !path.getFileName().toString().startsWith(".")).sorted().toList();
        }
    }

    @Test
    void buildsOnceForEachStateOfTheSources() throws IOException {
        assertEquals(BUILDING, run.go("--version").err());
        assertEquals("", run.go("--version").err());
        write("bundles/a/src/test/java/ATest.java", "class ATest { int changed; }");
        assertEquals("", run.go("--version").err());
        Files.setLastModifiedTime(checkout.resolve("pom.xml"), FileTime.from(Instant.EPOCH));
        assertEquals("", run.go("--version").err());
        write("bundles/a/src/main/java/A.java", "class A { int changed; }");
        assertEquals(BUILDING, run.go("--version").err());
        Files.delete(checkout.resolve("bundles/a/src/main/java/A.java"));
        assertEquals(BUILDING, run.go("--version").err());
        assertEquals(3, calls().size());
        assertTrue(calls().get(0).startsWith("-B -q -Dstyle.color=never -o -DskipTests "), calls().get(0));
    }

    @Test
    void severalFirstRunsMakeOneBuild() throws IOException {
        severalAtOnce();
    }

    @Test
    void severalFirstRunsMakeOneBuildWithoutFlock() throws IOException {
        Path tools = Files.createDirectories(scratch.resolve("tools"));
        for (String tool : List.of("bash", "dirname", "readlink", "find", "cksum", "sort", "tr", "mkdir", "rmdir", "cat", "rm", "mv",
                "cp", "sleep", "grep", "chmod", "tail", "env", "java")) {
            Files.createSymbolicLink(tools.resolve(tool), onThePath(tool));
        }
        run = run.with("PATH", scratch.resolve("bin") + ":" + tools);
        Files.createDirectories(checkout.resolve("product/target/builds/.locked"));
        Files.writeString(checkout.resolve("product/target/builds/.locked/pid"), "999999999\n");   // of a run that was killed
        severalAtOnce();
        Folders.delete(tools);
    }

    private void severalAtOnce() throws IOException {
        List<Run.Running> running = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            running.add(run.start("--version"));
        }
        StringBuilder messages = new StringBuilder();
        for (Run.Running each : running) {
            Run.Ended ended = each.end();
            assertEquals(0, ended.status(), ended::toString);
            messages.append(ended.err());
        }
        assertEquals(BUILDING, messages.toString());
        assertEquals(1, calls().size());
    }

    private static Path onThePath(String tool) {
        return Stream.of(System.getenv("PATH").split(":")).map(folder -> Path.of(folder, tool)).filter(Files::isExecutable)
                .findFirst().orElseThrow(() -> new AssertionError("this test needs " + tool));
    }

    @Test
    void buildStaysWhileItIsUsedAndGoesLater() throws IOException {
        Path watch = Files.write(scratch.resolve("w.jar"), SmallBundle.named("w").subcommand(WatchGuest.class, "watch")
                .type(EchoGuest.class).header("Import-Package", "org.osgi.framework").jar());
        Run.Running survey = run.start("--guest", watch.toString(), "watch", scratch.resolve("done").toString());
        Services.until("the subcommand runs", () -> survey.out().contains("watch@"));
        Path first = builds().get(0);
        rebuild();
        retiredLongAgo(first);
        rebuild();
        assertTrue(Files.exists(first.resolve("boot")), "the build of a running process was removed");
        Files.createFile(scratch.resolve("done"));
        assertEquals(0, survey.end().status());
        assertEquals(List.of(first.resolve("users")), Folders.below(first.resolve("users")));
        rebuild();
        assertTrue(Files.notExists(first), "the build is still there, though nobody uses it");
        assertEquals(3, builds().size());   // the others went out of use within this minute
    }

    private void rebuild() throws IOException {
        write("pom.xml", Files.readString(checkout.resolve("pom.xml")) + "\n");
        assertEquals(BUILDING, run.go("--version").err());
    }

    private static void retiredLongAgo(Path build) throws IOException {
        Files.setLastModifiedTime(build.resolve("retired"), FileTime.from(Instant.now().minusSeconds(600)));
    }

    @Test
    void goesOnlineOnlyWhenSomethingIsMissing() throws IOException {
        Files.writeString(scratch.resolve("mvn-says"), "[ERROR] A.java:[1,2] ';' expected\n");
        Run.Ended broken = run.go("--version");
        assertAll(() -> assertEquals(3, broken.status()), () -> assertEquals(1, calls().size()),
                () -> assertEquals(BUILDING + "[ERROR] A.java:[1,2] ';' expected\n" + Subject.line(
                        "the build failed; all of it is in " + checkout.resolve("product/target/build.log")), broken.err()));
        Files.writeString(scratch.resolve("mvn-says"), "Cannot access central in offline mode\n");
        assertEquals(3, run.go("--version").status());
        assertEquals(3, calls().size());
        assertTrue(calls().get(2).startsWith("-B -q -Dstyle.color=never -DskipTests "), calls().get(2));
        assertEquals(List.of(), builds());
        Files.delete(scratch.resolve("mvn-says"));
        assertEquals(BUILDING, run.go("--version").err());
    }

    @Test
    void olderJavaIsOneLineWhateverOptionsFollow() throws IOException {
        Path home = scratch.resolve("old");
        Path java = script("old/bin/java", "echo 'Unrecognized option' >&2; exit 1\n");
        run = run.with("JAVA_HOME", home.toString()).with("ROPEWALK_JAVA_OPTS", "-XX:+NoSuchOption");
        for (String version : List.of("11.0.2", "1.8.0_292", "16", "9-ea")) {
            Files.writeString(home.resolve("release"), "IMPLEMENTOR=\"x\"\nJAVA_VERSION=\"" + version + "\"\n");
            assertEquals(new Run.Ended(3, "", Subject.line(java + " is Java " + version
                    + ", and 17 or later is needed; install JDK 17, or set JAVA_HOME")), run.go("--version"));
        }
        // Without the file, Java itself is asked.
        Files.delete(home.resolve("release"));
        script("old/bin/java", "echo 'openjdk version \"12.0.1\" 2019-04-16' >&2\n");
        assertEquals(new Run.Ended(3, "", Subject.line(java
                + " is Java 12.0.1, and 17 or later is needed; install JDK 17, or set JAVA_HOME")), run.go("--version"));
    }

    @Test
    void noJavaIsOneLine() throws IOException {
        Path empty = Files.createDirectories(scratch.resolve("empty"));
        assertEquals(new Run.Ended(3, "", Subject.line("JAVA_HOME is " + empty
                + ", but there is no bin/java in it; set it to a JDK 17 or later, or unset it")),
                run.with("JAVA_HOME", empty.toString()).go("--version"));
        Path bash = Files.createSymbolicLink(empty.resolve("bash"), onThePath("bash"));
        assertEquals(new Run.Ended(3, "", Subject.line("no Java found on the PATH; install JDK 17 or later, or set JAVA_HOME")),
                run.with("JAVA_HOME", "").with("PATH", bash.getParent().toString()).go("--version"));
        Files.delete(bash);
        assertEquals(List.of(run.temporary()), Folders.below(run.temporary()));
    }
}
