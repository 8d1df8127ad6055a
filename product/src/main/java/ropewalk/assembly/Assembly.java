package ropewalk.assembly;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.TreeSet;

/** Completes the product folder, which holds the launcher and the feature files already. */
public final class Assembly {
    private Assembly() { }

    /**
     * Fills {@code bundles/} with what the features name, writes {@code features/NAME.bundles}, {@code licences/} and
     * {@code boot/build}.
     *
     * @param arguments the product folder, the folder of all libraries, and the folder of the checked-in licences
     * @throws IOException when a file cannot be read or written, a feature names a bundle that is not there, or a
     *         library comes without a licence; this stops the build
     */
    public static void main(String[] arguments) throws IOException {
        Path product = Path.of(arguments[0]);
        Path libraries = Path.of(arguments[1]);
        Files.createDirectories(product.resolve("bundles"));
        for (Path feature : files(product.resolve("features"), "*.json")) {
            takeBundles(product, libraries, feature);
        }
        List<Path> jars = new ArrayList<>(files(product.resolve("boot"), "*.jar"));
        jars.addAll(files(product.resolve("bundles"), "*.jar"));
        new Licences(Path.of(arguments[2]), product.resolve("licences")).gather(jars);
        Files.writeString(product.resolve("boot").resolve("build"), digest(jars) + "\n");
    }

    private static void takeBundles(Path product, Path libraries, Path feature) throws IOException {
        List<String> names = new ArrayList<>();
        for (String id : FeatureFile.bundles(feature)) {
            String[] part = id.split(":");
            String jar = part[1] + "-" + part[2] + ".jar";
            if (!Files.exists(libraries.resolve(jar))) {
                throw new IOException(feature.getFileName() + " names " + id + ", but no dependency of the product is "
                        + jar + "; add it to product/pom.xml, or correct the feature");
            }
            Files.copy(libraries.resolve(jar), product.resolve("bundles").resolve(jar), StandardCopyOption.REPLACE_EXISTING);
            names.add(jar);
        }
        String name = feature.getFileName().toString().replaceAll("[.]json$", ".bundles");
        Files.write(feature.resolveSibling(name), names);
    }

    /** Tells one build from another: a start-up archive serves exactly the jars that it was made from. */
    private static String digest(List<Path> jars) throws IOException {
        try {
            MessageDigest digest = MessageDigest.getInstance("SHA-256");
            for (Path jar : jars) {
                digest.update(jar.getFileName().toString().getBytes(java.nio.charset.StandardCharsets.UTF_8));
                digest.update(Files.readAllBytes(jar));
            }
            return HexFormat.of().formatHex(digest.digest(), 0, 8);
        } catch (NoSuchAlgorithmException impossible) {
            throw new AssertionError(impossible);   // every Java has SHA-256
        }
    }

    private static List<Path> files(Path folder, String pattern) throws IOException {
        TreeSet<Path> sorted = new TreeSet<>();
        try (DirectoryStream<Path> found = Files.newDirectoryStream(folder, pattern)) {
            found.forEach(sorted::add);
        }
        return List.copyOf(sorted);
    }
}
