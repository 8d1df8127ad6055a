package ropewalk.launch;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Expected folders: XDG Base Directory Specification 0.8; Apple, File System Programming Guide; Microsoft, KNOWNFOLDERID. */
class DataFolderTest {
    private static final Path HOME = Path.of("/home/me");

    @Test
    void thePlatformsFolder() {
        assertEquals(HOME.resolve(".local/share/ropewalk"), DataFolder.of(Map.of(), "Linux", HOME));
        assertEquals(Path.of("/data/ropewalk"), DataFolder.of(Map.of("XDG_DATA_HOME", "/data"), "Linux", HOME));
        assertEquals(HOME.resolve(".local/share/ropewalk"), DataFolder.of(Map.of("XDG_DATA_HOME", "data"), "FreeBSD", HOME));
        assertEquals(HOME.resolve("Library/Application Support/Ropewalk"),
                DataFolder.of(Map.of("XDG_DATA_HOME", "/data"), "Mac OS X", HOME));
        assertEquals(Path.of("/local/Ropewalk"), DataFolder.of(Map.of("LOCALAPPDATA", "/local"), "Windows 11", HOME));
        assertEquals(HOME.resolve("AppData/Local/Ropewalk"), DataFolder.of(Map.of(), "Windows 11", HOME));
    }

    @Test
    void theUsersOwnChoiceGoesFirst() {
        for (String system : new String[] {"Linux", "Mac OS X", "Windows 11"}) {
            assertEquals(Path.of("/mine"), DataFolder.of(Map.of("ROPEWALK_HOME", "/x/../mine", "XDG_DATA_HOME", "/data",
                    "LOCALAPPDATA", "/local"), system, HOME));
        }
    }
}
