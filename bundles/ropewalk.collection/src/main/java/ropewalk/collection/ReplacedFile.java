package ropewalk.collection;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.channels.Channels;
import java.nio.channels.FileChannel;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;

/**
 * A file that appears under its name only when it is finished, in one step and in place of an older one. Until then it is
 * written beside, as {@code NAME.0.part}. If it is closed without {@link #finish()}, the older file stays and the part is deleted.
 */
public final class ReplacedFile implements AutoCloseable {

    private final Path target;
    private final Path part;
    private final FileChannel channel;
    private final OutputStream out;
    private boolean finished;

    private ReplacedFile(Path target, Path part, FileChannel channel) {
        this.target = target;
        this.part = part;
        this.channel = channel;
        this.out = new BufferedOutputStream(Channels.newOutputStream(channel), 1 << 16);
    }

    /**
     * Begins a file that will be called {@code target}; its folder must exist.
     *
     * @param target the file to replace
     * @return the file, to be closed
     * @throws IOException if writing fails
     */
    public static ReplacedFile begin(Path target) throws IOException {
        for (int k = 0;; k++) {
            Path part = target.resolveSibling(target.getFileName() + "." + k + ".part");
            try {
                return new ReplacedFile(target, part,
                        FileChannel.open(part, StandardOpenOption.WRITE, StandardOpenOption.CREATE_NEW));
            } catch (FileAlreadyExistsException e) {
                if (k == 1000) {
                    throw new IOException(part + " and a thousand before it exist; delete what broken runs left there", e);
                }
            }
        }
    }

    /** {@return where to write} Buffered. */
    public OutputStream output() {
        return out;
    }

    /**
     * Forces everything to the disk, closes the stream and puts the file in place.
     *
     * @throws IOException if that fails; once everything is written, the part is kept and named in the message
     */
    public void finish() throws IOException {
        out.flush();
        channel.force(true);
        out.close();
        finished = true;
        try {
            Files.move(part, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (IOException e) {
            throw new IOException(target + " could not be replaced (" + e.getMessage() + "); the finished file is "
                    + part + ", close programs that use the old one and rename it", e);
        }
    }

    /** Deletes the part unless the file is finished. */
    @Override
    public void close() throws IOException {
        if (!finished) {
            channel.close();
            Files.deleteIfExists(part);
        }
    }
}
