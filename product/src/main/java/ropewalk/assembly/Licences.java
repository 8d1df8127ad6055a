package ropewalk.assembly;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;
import java.util.jar.JarEntry;
import java.util.jar.JarFile;

/**
 * Gathers what the licences of the shipped libraries ask to be shipped with them: a folder a library, with the licence
 * and notice files out of its own jar or, where its jar has no licence, the checked-in texts that
 * {@code libraries.properties} names for it.
 */
final class Licences {
    private final Path texts;
    private final Path target;

    Licences(Path texts, Path target) {
        this.texts = texts;
        this.target = target;
    }

    void gather(List<Path> jars) throws IOException {
        Properties libraries = new Properties();
        try (InputStream in = Files.newInputStream(texts.resolve("libraries.properties"))) {
            libraries.load(in);
        }
        List<String> summary = new ArrayList<>(List.of("Licences of the libraries that come with Ropewalk.", ""));
        for (Path jar : jars) {
            String name = jar.getFileName().toString().replaceAll("[.]jar$", "");
            if (name.startsWith("ropewalk.")) {
                continue;
            }
            String library = name.replaceAll("-[0-9][^-]*$", "");
            String entry = libraries.getProperty(library);
            if (entry == null) {
                throw new IOException(jar.getFileName() + " would be shipped without a licence; add " + library + " to "
                        + texts.resolve("libraries.properties"));
            }
            summary.add(name + ": " + entry);
            Path folder = Files.createDirectories(target.resolve(name));
            if (!fromJar(jar, folder)) {
                for (String licence : entry.split("[|]")) {
                    Files.copy(texts.resolve(licence.strip() + ".txt"), folder.resolve(licence.strip() + ".txt"),
                            StandardCopyOption.REPLACE_EXISTING);
                }
            }
        }
        Files.write(target.resolve("README.txt"), summary);
    }

    /** Takes the texts out of a jar; true if a licence is among them. */
    private static boolean fromJar(Path jar, Path folder) throws IOException {
        boolean licence = false;
        try (JarFile file = new JarFile(jar.toFile())) {
            for (JarEntry entry : (Iterable<JarEntry>) file.stream()::iterator) {
                String name = entry.getName();
                if (name.matches("(?i)(META-INF/)?(LICEN[CS]E|NOTICE|COPYING)[^/]*|about\\.html")) {
                    licence |= name.matches("(?i)(META-INF/)?LICEN[CS]E[^/]*");
                    try (InputStream in = file.getInputStream(entry)) {
                        Files.copy(in, folder.resolve(name.substring(name.lastIndexOf('/') + 1)),
                                StandardCopyOption.REPLACE_EXISTING);
                    }
                }
            }
        }
        return licence;
    }
}
