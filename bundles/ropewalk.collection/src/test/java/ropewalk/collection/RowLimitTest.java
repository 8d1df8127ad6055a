package ropewalk.collection;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Rows at, just above and far above the longest row, which has 20 bytes here. */
class RowLimitTest {

    private static final String HEAD = "name,notation,code\n";

    private static List<String> shapes(String rows) {
        return ReadBack.ofAllSizes((HEAD + rows).getBytes(StandardCharsets.UTF_8), 20).shapes();
    }

    @Test
    void theLongestRowIsReadWhateverEndsIt() {
        for (String end : new String[] {"", "\n", "\r", "\r\n"}) {
            assertEquals(List.of("2 [n, planar, 12345678901]"), shapes("n,planar,12345678901" + end), end);
            assertEquals(List.of("2 [n, planar, 123456789]"), shapes("n,planar,\"123456789\"" + end), end);
        }
    }

    @Test
    void aLongerRowIsRejectedWhateverEndsIt() {
        for (String end : new String[] {"\n", "\r", "\r\n"}) {
            for (int more = 1; more < 70; more++) {
                assertEquals(List.of("2:21 rejected", "3 [m, p, x]"),
                        shapes("n,planar,12345678901" + "x".repeat(more) + end + "m,p,x"), end + more);
            }
        }
        assertEquals(List.of("2:21 rejected"), shapes("n,planar,12345678901xxx"));
    }

    @Test
    void aQuotedFieldThatGoesOnTooLongEndsAtTheFirstLineBreakAfterItsQuote() {
        assertEquals(List.of("2:5 rejected", "3 [b, p, c]", "4 [d, p, e]", "5:15 rejected"),
                shapes("n,p,\"abcd\nb,p,c\nd,p,e\n12345678901234\"\n"));
    }

    @Test
    void aQuotedFieldOfOneLongLineIsDroppedUpToItsLineBreak() {
        for (int more = 20; more < 90; more++) {
            assertEquals(List.of("2:5 rejected", "3 [m, p, x]"), shapes("n,p,\"" + "y".repeat(more) + "\r\nm,p,x\n"), "" + more);
        }
    }

    @Test
    void theQuoteThatCouldCloseOrDoubleAtTheCutIsNotTheEnd() {
        // A row may have 20 bytes, 22 are looked at, and the last quote is byte 22.
        assertEquals(List.of("2:5 rejected", "3 [b, p, c]", "4:8 rejected"), shapes("n,p,\"ab\nb,p,c\n1234567\""));
    }

    @Test
    void aCharacterAcrossTheCutIsNotAWrongByte() {
        for (int before = 0; before < 4; before++) {
            String row = "n,planar," + "x".repeat(before) + "\ud83e\udea2".repeat(9);
            ReadBack read = ReadBack.ofAllSizes((HEAD + row + "\nm,p,x\n").getBytes(StandardCharsets.UTF_8), 20);
            assertTrue(read.rejections().get(0).reason().contains("more than the 20 bytes"), read::toString);
            assertEquals("3 [m, p, x]", read.shapes().get(1));
        }
    }

    @Test
    void theReasonSaysHowLongARowMayBe() {
        ReadBack read = ReadBack.ofAllSizes((HEAD + "n,planar,12345678901234567\n").getBytes(StandardCharsets.UTF_8), 20);
        assertTrue(read.rejections().get(0).reason().contains("more than the 20 bytes"), read::toString);
        assertEquals("n", read.rejections().get(0).name());
    }

    @Test
    void linesAfterALongRowOfSeveralLinesAreRight() {
        assertEquals(List.of("2:21 rejected", "5 [m, p, x]"), shapes("\"a\nb\nc\",planar,12345678901234567890123\nm,p,x"));
    }

    @Test
    void theLimitIsAtMostAnEighthOfTheMemory() {
        assertTrue(ReadingLimits.standard().rowBytes() <= Runtime.getRuntime().maxMemory() / 8);
        assertTrue(ReadingLimits.standard().rowBytes() <= 256 << 20);
    }
}
