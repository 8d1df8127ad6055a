package ropewalk.command.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class ArgumentsTest {

    private static Arguments of(String... arguments) throws UsageException {
        return Arguments.of(arguments, List.of("--out", "--only"), List.of("--quiet"));
    }

    @Test
    void optionsMayStandAnywhereAndTakeTheirValueEitherWay() throws UsageException {
        Arguments arguments = of("a.csv", "--out", "x", "--quiet", "b.csv", "--only=p, q,,r");
        assertEquals(List.of("a.csv", "b.csv"), arguments.plain());
        assertEquals(Optional.of("x"), arguments.value("--out"));
        assertEquals(List.of("p", "q", "r"), arguments.ids("--only"));
        assertTrue(arguments.has("--quiet"));
        assertFalse(of("a.csv").has("--quiet"));
    }

    @Test
    void whatFollowsTwoDashesIsAFile() throws UsageException {
        assertEquals(List.of("--quiet", "-"), of("--", "--quiet", "-").plain());
    }

    @Test
    void unknownOptionsAndMissingValuesAreRefused() {
        assertEquals("there is no option --onyl here; there are --out, --only, --quiet",
                assertThrows(UsageException.class, () -> of("--onyl", "x")).getMessage());
        assertEquals("--out needs a value", assertThrows(UsageException.class, () -> of("--out")).getMessage());
        assertThrows(UsageException.class, () -> of("--quiet=yes"));
    }

    @Test
    void controlCharactersAreShownAndNeverSent() {
        assertEquals("a\\u001b[31m\\u000ab\\u202ec\\u0085é∞", Visible.text("a\u001b[31m\nb\u202ec\u0085é∞"));
    }
}
