package quayside.links;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import java.util.jar.Attributes;
import java.util.jar.Manifest;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

class ManifestTest {
    private static final Pattern PACKAGE = Pattern.compile("([\\w.]+);version=\"([^\"]*)\"");

    /** Two packages with the range of a bundle that implements them, so any 1.x of Ropewalk will do. */
    @Test
    void importsThePublicPackagesAndNothingElse() throws IOException {
        Attributes manifest = manifest();
        Set<String> imports = new TreeSet<>();
        Matcher matcher = PACKAGE.matcher(manifest.getValue("Import-Package"));
        while (matcher.find()) {
            imports.add(matcher.group(1) + " " + matcher.group(2));
        }
        assertEquals(new TreeSet<>(Set.of("ropewalk.diagram [1.0,2)", "ropewalk.invariant [1.0,2)")), imports);
        assertEquals(2, manifest.getValue("Import-Package").split(";version").length - 1);
        assertNull(manifest.getValue("Export-Package"));
        assertNull(manifest.getValue("Require-Bundle"));
    }

    @Test
    void listsItsThreeComponents() throws IOException {
        String components = manifest().getValue("Service-Component");
        for (Class<?> type : Set.of(TreesDeterminantComponent.class, TetrahedralInvariantComponent.class,
                TetrahedralMethodComponent.class)) {
            assertTrue(components.contains(type.getName()), components);
        }
        assertEquals(3, components.split(",").length);
    }

    private static Attributes manifest() throws IOException {
        try (InputStream in = Files.newInputStream(Path.of("target/classes/META-INF/MANIFEST.MF"))) {
            return new Manifest(in).getMainAttributes();
        }
    }
}
