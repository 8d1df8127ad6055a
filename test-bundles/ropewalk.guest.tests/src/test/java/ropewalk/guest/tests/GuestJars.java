package ropewalk.guest.tests;

import aQute.bnd.component.DSAnnotations;
import aQute.bnd.osgi.Analyzer;
import aQute.bnd.osgi.EmbeddedResource;
import aQute.bnd.osgi.Jar;
import java.io.File;
import java.io.InputStream;
import java.nio.file.Path;
import java.util.List;
import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Method;

/** Makes jars of guests out of component classes of this module, by bnd, as their authors would. */
final class GuestJars {

    private GuestJars() {
    }

    /**
     * Makes the bundle that holds the given classes.
     *
     * @param folder an existing folder for the jar
     * @param name symbolic name, and the jar's name without its ending
     * @param types component classes, and what they need of this module
     * @return the jar
     */
    static Path of(Path folder, String name, List<Class<?>> types) throws Exception {
        Path file = folder.resolve(name + ".jar");
        try (Jar jar = new Jar(name); Analyzer analyzer = new Analyzer(jar)) {
            for (Class<?> type : types) {
                String path = type.getName().replace('.', '/') + ".class";
                try (InputStream bytes = type.getClassLoader().getResourceAsStream(path)) {
                    jar.putResource(path, new EmbeddedResource(bytes.readAllBytes(), 0));
                }
            }
            for (Class<?> shared : List.of(Method.class, LinkDiagram.class, Component.class)) {
                analyzer.addClasspath(new File(shared.getProtectionDomain().getCodeSource().getLocation().toURI()));
            }
            analyzer.addBasicPlugin(new DSAnnotations());
            analyzer.setBundleSymbolicName(name);
            analyzer.setBundleVersion("1.0.0");
            analyzer.setProperty("-noimportjava", "true");
            analyzer.setProperty("Import-Package", "*");
            jar.setManifest(analyzer.calcManifest());
            if (!analyzer.isOk()) {
                throw new AssertionError(name + " cannot be built: " + analyzer.getErrors());
            }
            jar.write(file.toFile());
        }
        return file;
    }
}
