package ropewalk.testkit;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;

/** Folders that tests make, look through and take away. */
public final class Folders {
    private Folders() { }

    /**
     * Deletes a folder with all that is in it, also where it was made read-only.
     *
     * @param folder the folder; nothing happens if it does not exist
     * @throws IOException when something cannot be deleted
     */
    public static void delete(Path folder) throws IOException {
        for (Path path : below(folder)) {
            if (Files.isDirectory(path, java.nio.file.LinkOption.NOFOLLOW_LINKS)) {
                path.toFile().setWritable(true);
            }
        }
        for (Path path : below(folder).stream().sorted(Comparator.reverseOrder()).toList()) {
            Files.delete(path);
        }
    }

    /**
     * Everything in a folder, itself included, a folder before its contents.
     *
     * @param folder the folder
     * @return its paths in order, none if it does not exist
     * @throws IOException when it cannot be looked through
     */
    public static List<Path> below(Path folder) throws IOException {
        if (!Files.exists(folder)) {
            return List.of();
        }
        try (Stream<Path> paths = Files.walk(folder)) {
            return paths.sorted().toList();
        }
    }
}
