package ropewalk.product.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import ropewalk.testkit.Distribution;
import ropewalk.testkit.Run;
import ropewalk.testkit.SmallBundle;

/** Which bundles make up which feature, and which features start. */
class FeaturesTest {
    @TempDir
    static Path shared;
    private static Distribution product;

    @TempDir
    Path scratch;

    /** A product whose features are core as it is and an extra one with libraries in common. */
    @BeforeAll
    static void unpack() throws IOException {
        product = Subject.unpack(shared);
        Path features = product.file("features");
        features.toFile().setWritable(true);
        product.file("bundles").toFile().setWritable(true);
        try (Stream<Path> lists = Files.list(features)) {
            for (Path list : lists.filter(path -> !path.getFileName().toString().startsWith("core.")).toList()) {
                Files.delete(list);
            }
        }
        Files.write(product.file("bundles/extra-1.jar"), SmallBundle.named("extra").subcommand(EchoGuest.class, "echo").jar());
        List<String> extra = Files.readAllLines(features.resolve("core.bundles")).stream()
                .filter(jar -> !jar.startsWith("ropewalk.")).collect(Collectors.toCollection(ArrayList::new));
        extra.add("extra-1.jar");
        Files.write(features.resolve("extra.bundles"), extra);
    }

    @AfterAll
    static void close() throws IOException {
        product.close();
    }

    private Run.Ended go(String... arguments) throws IOException {
        return Run.of(product.file("ropewalk"), scratch).go(arguments);
    }

    @Test
    void allAreStartedUnlessSomeAreChosen() throws IOException {
        assertEquals(new Run.Ended(1, "[x]\n", ""), go("echo", "x"));
        assertEquals(new Run.Ended(1, "[x]\n", ""), go("--features", "core,extra", "echo", "x"));
        assertEquals(new Run.Ended(2, "", Subject.line("unknown subcommand 'echo'; 'ropewalk --help' lists them")),
                go("--features", "core", "echo", "x"));
    }

    @Test
    void missingFeatureIsNamed() throws IOException {
        assertEquals(new Run.Ended(2, "", Subject.line("'bench' comes with feature bench, which is not installed")),
                go("bench"));
        assertEquals(new Run.Ended(2, "", Subject.line("feature bench is not installed; installed: core, extra")),
                go("--features", "core,bench", "echo"));
        assertEquals(new Run.Ended(2, "", Subject.line("'survey' comes with feature core, which is not started; started: extra")),
                go("--features", "extra", "survey"));
    }

    @Test
    void everyBundleIsInAFeatureAndEveryFeatureIsMadeOfBundles() throws IOException {
        Set<String> bundles = new TreeSet<>();
        try (Stream<Path> poms = Files.find(Subject.root().resolve("bundles"), 3, (path, file) -> path.endsWith("pom.xml"))) {
            poms.forEach(pom -> bundles.add("ropewalk:" + pom.getParent().getFileName() + ":${project.version}"));
        }
        Set<String> named = new TreeSet<>();
        try (Stream<Path> features = Files.list(Subject.root().resolve("features"))) {
            for (Path feature : features.filter(path -> path.toString().endsWith(".json")).toList()) {
                List<String> ids = ids(feature);
                assertTrue(!ids.isEmpty(), feature + " names no bundle");
                assertEquals(ids.size(), new TreeSet<>(ids).size(), feature + " names a bundle twice");
                named.addAll(ids);
            }
        }
        named.removeIf(id -> !id.startsWith("ropewalk:"));
        assertEquals(bundles, named, "bundles in the reactor, and in features/*.json");
    }

    private static List<String> ids(Path feature) throws IOException {
        Stream.Builder<String> ids = Stream.builder();
        try (JsonParser json = new JsonFactory().createParser(feature.toFile())) {
            for (JsonToken token = json.nextToken(); token != null; token = json.nextToken()) {
                // Only the ids of bundles: the feature's own stands one level higher.
                if (token == JsonToken.VALUE_STRING && "id".equals(json.currentName())
                        && json.getParsingContext().getParent().inArray()) {
                    ids.add(json.getText());
                }
            }
        }
        return ids.build().toList();
    }
}
