package ropewalk.launch;

import java.io.IOException;
import java.io.InputStream;
import java.util.Optional;
import java.util.Properties;

/** Which feature brings which of the product's own subcommands; so that one that is missing can be told from a slip. */
final class KnownSubcommands {
    private KnownSubcommands() { }

    /** The feature that brings a subcommand, or empty if the product knows none of this name. */
    static Optional<String> feature(String subcommand) throws Refusal {
        Properties features = new Properties();
        try (InputStream list = KnownSubcommands.class.getResourceAsStream("subcommands.properties")) {
            features.load(list);
        } catch (IOException fault) {
            throw new Refusal(Refusal.BROKEN, "the list of subcommands in the launcher cannot be read ("
                    + Console.reason(fault) + "); unpack or build the product again");
        }
        return Optional.ofNullable(features.getProperty(subcommand));
    }
}
