package ropewalk.launch;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * The installed features and those of them that this run starts. A feature is {@code features/NAME.bundles}, one jar
 * name a line, which the build writes from {@code features/NAME.json}.
 *
 * @param installed jar names by feature, {@code core} first, then by name
 * @param started names of the features to start
 */
record FeatureSet(Map<String, List<String>> installed, Set<String> started) {
    private static final String ENDING = ".bundles";

    /**
     * Reads the features of a product.
     *
     * @param chosen the features to start, or empty for all
     * @throws Refusal when a chosen feature is not installed, or the lists cannot be read
     */
    static FeatureSet read(Path product, Optional<List<String>> chosen) throws Refusal {
        Path folder = product.resolve("features");
        Map<String, List<String>> installed = new LinkedHashMap<>();
        try (DirectoryStream<Path> lists = Files.newDirectoryStream(folder, "*" + ENDING)) {
            List<Path> sorted = new ArrayList<>();
            lists.forEach(sorted::add);
            sorted.sort(Comparator.comparing((Path list) -> !name(list).equals("core")).thenComparing(FeatureSet::name));
            for (Path list : sorted) {
                installed.put(name(list), Files.readAllLines(list));
            }
        } catch (IOException fault) {
            throw new Refusal(Refusal.BROKEN,
                    folder + " cannot be read (" + Console.reason(fault) + "); unpack or build the product again");
        }
        Set<String> started = new LinkedHashSet<>(chosen.orElse(List.copyOf(installed.keySet())));
        for (String feature : started) {
            if (!installed.containsKey(feature)) {
                throw new Refusal(Refusal.USAGE, "feature " + feature + " is not installed; installed: "
                        + String.join(", ", installed.keySet()));
            }
        }
        return new FeatureSet(installed, started);
    }

    /** The jars of the features to start, each once. */
    List<Path> jars(Path product) {
        return started.stream().flatMap(feature -> installed.get(feature).stream()).distinct()
                .map(jar -> product.resolve("bundles").resolve(jar)).toList();
    }

    private static String name(Path list) {
        String file = list.getFileName().toString();
        return file.substring(0, file.length() - ENDING.length());
    }
}
