package ropewalk.product.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import aQute.bnd.header.OSGiHeader;
import aQute.bnd.header.Parameters;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Properties;
import java.util.Set;
import java.util.TreeMap;
import java.util.jar.Attributes;
import java.util.jar.Manifest;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/**
 * What the bundles' manifests promise to one another: arrows point one way, as {@code arrows.properties} draws them. The
 * packages of wrapped libraries and of the framework are nobody's business here.
 */
class ManifestTest {
    private static final Map<String, Attributes> MANIFESTS = new TreeMap<>();

    @BeforeAll
    static void read() throws IOException {
        try (Stream<Path> folders = Files.list(Subject.root().resolve("bundles"))) {
            for (Path folder : folders.filter(each -> Files.exists(each.resolve("pom.xml"))).toList()) {
                try (InputStream in = Files.newInputStream(folder.resolve("target/classes/META-INF/MANIFEST.MF"))) {
                    MANIFESTS.put(folder.getFileName().toString(), new Manifest(in).getMainAttributes());
                }
            }
        }
        assertFalse(MANIFESTS.isEmpty(), "no bundles");
    }

    private static Parameters header(String bundle, String name) {
        return OSGiHeader.parseHeader(MANIFESTS.get(bundle).getValue(name));
    }

    /** Complaints are gathered, so that one run shows all. */
    private static void none(List<String> complaints) {
        assertEquals("", String.join("\n", complaints));
    }

    @Test
    void bundlesAreNamedAsTheirFolders() {
        MANIFESTS.forEach((folder, manifest) -> assertEquals(folder, manifest.getValue("Bundle-SymbolicName")));
    }

    @Test
    void exportsHaveVersionsOfTheirOwnAndNothingInternalIsExported() {
        List<String> complaints = new ArrayList<>();
        for (String bundle : MANIFESTS.keySet()) {
            header(bundle, "Export-Package").forEach((name, attributes) -> {
                if (attributes.getVersion() == null || attributes.getVersion().equals("0.0.0")) {
                    complaints.add(bundle + " exports " + name + " without a version; add @Version to its package-info");
                }
                if (List.of(name.split("[.]")).contains("internal")) {
                    complaints.add(bundle + " exports " + name + "; move what others need to another package");
                }
                if (!name.equals(bundle) && !name.startsWith(bundle + ".")) {
                    complaints.add(bundle + " exports " + name + ", which does not begin with its name");
                }
            });
        }
        none(complaints);
    }

    @Test
    void thereAreNoActivators() {
        List<String> complaints = new ArrayList<>();
        MANIFESTS.forEach((bundle, manifest) -> {
            if (manifest.getValue("Bundle-Activator") != null) {
                complaints.add(bundle + " has an activator; make it a component");
            }
        });
        none(complaints);
    }

    @Test
    void importsFollowTheArrows() throws IOException {
        Map<String, Set<String>> arrows = arrows();
        Map<String, String> owners = new TreeMap<>();
        MANIFESTS.keySet().forEach(bundle -> header(bundle, "Export-Package").keySet().forEach(name -> owners.put(name, bundle)));
        List<String> complaints = new ArrayList<>();
        for (String bundle : MANIFESTS.keySet()) {
            Set<String> allowed = arrows.get(kind(bundle));
            if (allowed == null) {
                complaints.add(bundle + " has no line in arrows.properties; say there what it may import");
                continue;
            }
            header(bundle, "Import-Package").forEach((name, attributes) -> {
                if (!name.startsWith("ropewalk.")) {
                    if (allowed.contains("(alone)") && !name.startsWith("java.")) {
                        complaints.add(bundle + " imports " + name + ", but depends on the JDK and on ours alone");
                    }
                    return;
                }
                String owner = owners.get(name);
                if (owner == null) {
                    complaints.add(bundle + " imports " + name + ", which no bundle exports");
                } else if (!owner.equals(bundle) && !allowed.contains(owner)) {
                    complaints.add(bundle + " imports " + name + " of " + owner + "; arrows.properties allows " + allowed);
                }
                if (attributes.get("version") == null) {
                    complaints.add(bundle + " imports " + name + " without a version range");
                }
            });
        }
        none(complaints);
    }

    /** A bundle that implements something shares the line {@code ropewalk.invariant.*} with its like, unless it has its own. */
    private static String kind(String bundle) throws IOException {
        if (arrows().containsKey(bundle)) {
            return bundle;
        }
        return bundle.substring(0, bundle.lastIndexOf('.')) + ".*";
    }

    private static Map<String, Set<String>> arrows() throws IOException {
        Properties lines = new Properties();
        try (InputStream in = ManifestTest.class.getResourceAsStream("/arrows.properties")) {
            lines.load(in);
        }
        Map<String, Set<String>> arrows = new TreeMap<>();
        lines.forEach((bundle, targets) -> arrows.put((String) bundle, new HashSet<>(List.of(((String) targets).split(" +")))));
        return arrows;
    }

    @Test
    void arrowsPointOneWay() throws IOException {
        Map<String, Set<String>> arrows = arrows();
        List<String> complaints = new ArrayList<>();
        for (String start : arrows.keySet()) {
            Set<String> reached = new HashSet<>();
            List<String> open = new ArrayList<>(arrows.get(start));
            while (!open.isEmpty()) {
                String next = open.remove(open.size() - 1);
                if (reached.add(next)) {
                    open.addAll(arrows.getOrDefault(next, Set.of()));
                }
            }
            if (reached.contains(start)) {
                complaints.add("the arrows from " + start + " lead back to it");
            }
        }
        for (Map.Entry<String, Set<String>> arrow : arrows.entrySet()) {
            for (String target : arrow.getValue()) {
                if (!target.isEmpty() && !target.startsWith("(") && !arrows.containsKey(target)) {
                    complaints.add(arrow.getKey() + " may import " + target + ", which has no line itself: what implements"
                            + " something is imported by nobody");
                }
            }
        }
        none(complaints);
    }
}
