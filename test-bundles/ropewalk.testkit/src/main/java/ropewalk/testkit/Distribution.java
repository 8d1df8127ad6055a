package ropewalk.testkit;

import java.io.IOException;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermission;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;

/**
 * The packed product, unpacked into a folder that is then made read-only, with the permissions that the zip names.
 */
public final class Distribution implements AutoCloseable {
    private final Path parent;
    private final Path folder;
    private final List<String> shipped;

    private Distribution(Path parent, Path folder) throws IOException {
        this.parent = parent;
        this.folder = folder;
        this.shipped = listing();
    }

    /**
     * Unpacks a zip.
     *
     * @param zip the product's zip, with one folder at its top
     * @param parent a folder to make, in which it is unpacked
     * @return the unpacked product
     * @throws IOException when the zip cannot be unpacked
     */
    public static Distribution unpack(Path zip, Path parent) throws IOException {
        Files.createDirectories(parent);
        List<Path> folders = new ArrayList<>();
        Path top = null;
        try (FileSystem packed = FileSystems.newFileSystem(zip, Map.of("enablePosixFileAttributes", "true"));
                Stream<Path> entries = Files.walk(packed.getPath("/"))) {
            for (Path entry : (Iterable<Path>) entries.skip(1)::iterator) {
                Path target = parent.resolve(entry.toString().substring(1));
                if (Files.isDirectory(entry)) {
                    folders.add(Files.createDirectories(target));
                    top = top == null ? target : top;
                } else {
                    Files.copy(entry, target);
                    Set<PosixFilePermission> permissions = EnumSet.copyOf(Files.getPosixFilePermissions(entry));
                    permissions.remove(PosixFilePermission.OWNER_WRITE);
                    Files.setPosixFilePermissions(target, permissions);
                }
            }
        }
        folders.forEach(each -> each.toFile().setWritable(false, false));
        return new Distribution(parent, top);
    }

    /**
     * Where the product lies.
     *
     * @return its top folder
     */
    public Path folder() {
        return folder;
    }

    /**
     * A file of the product.
     *
     * @param path its path below the top folder
     * @return the file
     */
    public Path file(String path) {
        return folder.resolve(path);
    }

    /**
     * What a run has changed in the product, which should be nothing. (Permissions alone do not show it: they do not
     * bind a superuser.)
     *
     * @return paths with size and time, of what is there and was not, or the other way round
     * @throws IOException when the folder cannot be looked through
     */
    public List<String> changes() throws IOException {
        List<String> now = listing();
        List<String> changes = new ArrayList<>(now);
        changes.removeAll(shipped);
        shipped.stream().filter(line -> !now.contains(line)).forEach(changes::add);
        return changes;
    }

    /** Deletes the unpacked product. */
    @Override
    public void close() throws IOException {
        Folders.delete(parent);
    }

    private List<String> listing() throws IOException {
        List<String> lines = new ArrayList<>();
        for (Path path : Folders.below(folder)) {
            lines.add(folder.relativize(path) + " " + Files.size(path) + " " + Files.getLastModifiedTime(path));
        }
        return lines;
    }
}
