package ropewalk.launch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import ropewalk.launch.CommandLine.Request;

class CommandLineTest {
    @Test
    void optionsBeforeTheSubcommandAreTakenOut() throws Refusal {
        assertEquals(new CommandLine(Optional.of(List.of("core", "split")), List.of(Path.of("a.jar"), Path.of("b c.jar")),
                Request.RUN, Optional.of("survey"), List.of("--features", "x", "--help", "")),
                CommandLine.of("--features", "core, split,", "--guest", "a.jar", "--guest=b c.jar", "survey", "--features",
                        "x", "--help", ""));
    }

    @Test
    void withoutSubcommandThereIsHelp() throws Refusal {
        assertEquals(Request.HELP, CommandLine.of().request());
        assertEquals(Request.HELP, CommandLine.of("--features=core").request());
        assertEquals(Request.HELP, CommandLine.of("--help", "survey").request());
        assertEquals(Request.VERSION, CommandLine.of("--version").request());
    }

    @ParameterizedTest
    @ValueSource(strings = {"--guest", "--features", "--features=", "--features=,", "--gues=x", "-x", "-"})
    void whatIsNoUseIsRefused(String option) {
        assertEquals(Refusal.USAGE, assertThrows(Refusal.class, () -> CommandLine.of(option)).status());
    }
}
