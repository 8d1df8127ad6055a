package ropewalk.product.tests;

import java.io.IOException;
import java.nio.file.Path;
import ropewalk.testkit.Distribution;

/** What these tests are about, as the build made it. */
final class Subject {
    private Subject() { }

    /** The checkout. */
    static Path root() {
        return Path.of(System.getProperty("ropewalk.root")).normalize();
    }

    /** The product out of its zip, in a read-only folder with blanks, accents and a plus sign in its path. */
    static Distribution unpack(Path scratch) throws IOException {
        return Distribution.unpack(Path.of(System.getProperty("ropewalk.zip")), scratch.resolve("Prüf stand é+1"));
    }

    /** A message of the product: one line, which starts with its name. */
    static String line(String rest) {
        return "ropewalk: " + rest + "\n";
    }
}
