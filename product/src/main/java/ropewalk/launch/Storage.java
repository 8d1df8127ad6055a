package ropewalk.launch;

import java.io.IOException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;

/**
 * The framework's storage: a temporary folder of this process alone, gone when the process is.
 *
 * <p>When the process is stopped from outside (Ctrl-C), other shutdown hooks may still need classes of the bundles, and
 * hooks run side by side. So the hook here deletes nothing: it puts the folder on the list that the JVM works off when
 * all application hooks have ended ({@link java.io.File#deleteOnExit()}, which may be called from a hook).
 */
final class Storage implements AutoCloseable {
    private final Path folder;
    private final Thread hook;

    private Storage(Path folder) {
        this.folder = folder;
        this.hook = new Thread(this::deleteAfterAllHooks, "ropewalk storage");
    }

    static Storage create() throws IOException {
        Storage storage = new Storage(Files.createTempDirectory("ropewalk-"));
        Runtime.getRuntime().addShutdownHook(storage.hook);
        return storage;
    }

    Path folder() {
        return folder;
    }

    /** Deletes the folder. The framework must have stopped. */
    @Override
    public void close() throws IOException {
        try {
            Runtime.getRuntime().removeShutdownHook(hook);
        } catch (IllegalStateException shuttingDown) {
            return;   // the hook has taken over
        }
        Files.walkFileTree(folder, new SimpleFileVisitor<>() {
            @Override
            public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) throws IOException {
                Files.delete(file);
                return FileVisitResult.CONTINUE;
            }

            @Override
            public FileVisitResult postVisitDirectory(Path visited, IOException fault) throws IOException {
                if (fault != null) {
                    throw fault;
                }
                Files.delete(visited);
                return FileVisitResult.CONTINUE;
            }
        });
    }

    private void deleteAfterAllHooks() {
        try (var paths = Files.walk(folder)) {
            paths.forEach(path -> path.toFile().deleteOnExit());   // worked off backwards: contents before their folder
        } catch (IOException | java.io.UncheckedIOException fault) {
            Console.line("temporary folder " + folder + " may be left behind (" + Console.reason(fault) + "); delete it");
        }
    }
}
