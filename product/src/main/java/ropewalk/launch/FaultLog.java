package ropewalk.launch;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Instant;

/** Where the details of faults are kept that cost the user one line. */
final class FaultLog {
    private FaultLog() { }

    static void append(Path log, String what, Throwable fault) throws IOException {
        try (PrintWriter out = new PrintWriter(
                Files.newBufferedWriter(log, StandardOpenOption.CREATE, StandardOpenOption.APPEND))) {
            out.println(Instant.now() + " " + what);
            fault.printStackTrace(out);
            if (out.checkError()) {
                throw new IOException("the disk may be full");
            }
        }
    }
}
