package ropewalk.launch;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;

/**
 * The user's data folder, which holds the guests folder, the log, preferences and start-up archives. Nothing of the
 * user's lies under the product, which may be read-only.
 */
final class DataFolder {
    private DataFolder() { }

    /**
     * {@code ROPEWALK_HOME} if it is set, else the place where the platform keeps such data: on Windows
     * {@code %LOCALAPPDATA%\Ropewalk}, on macOS {@code ~/Library/Application Support/Ropewalk}, elsewhere
     * {@code $XDG_DATA_HOME/ropewalk} or {@code ~/.local/share/ropewalk} (XDG Base Directory Specification). The shell
     * launcher follows the same rule, since it looks for the archive before there is a Java to ask.
     *
     * @param environment variables of the process
     * @param system name of the operating system, as in {@code os.name}
     * @param home the user's home folder
     */
    static Path of(Map<String, String> environment, String system, Path home) {
        String chosen = environment.getOrDefault("ROPEWALK_HOME", "");
        if (!chosen.isEmpty()) {
            return Path.of(chosen).toAbsolutePath().normalize();
        }
        String name = system.toLowerCase(Locale.ROOT);
        if (name.startsWith("windows")) {
            String local = environment.getOrDefault("LOCALAPPDATA", "");
            return (local.isEmpty() ? home.resolve("AppData").resolve("Local") : Path.of(local)).resolve("Ropewalk");
        }
        if (name.startsWith("mac")) {
            return home.resolve("Library").resolve("Application Support").resolve("Ropewalk");
        }
        String shared = environment.getOrDefault("XDG_DATA_HOME", "");
        // The specification: "All paths must be absolute. A relative path should be considered invalid and ignored."
        boolean usable = !shared.isEmpty() && Path.of(shared).isAbsolute();
        return (usable ? Path.of(shared) : home.resolve(".local").resolve("share")).resolve("ropewalk");
    }

    /** The data folder of this process. */
    static Path ofThisProcess() {
        return of(System.getenv(), System.getProperty("os.name"), Path.of(System.getProperty("user.home")));
    }
}
