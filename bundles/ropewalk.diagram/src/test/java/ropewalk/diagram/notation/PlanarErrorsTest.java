package ropewalk.diagram.notation;

import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** Every way in which planar code can be wrong: at which byte it shows (marked by '^') and what the message says. */
class PlanarErrorsTest {

    private static final String TREFOIL = "[[1,5,2,4],[3,1,4,6],[5,3,6,2]]";

    private final Refusals planar = new Refusals("planar", TREFOIL);

    @Test
    void labelsOccurTwice() throws CodeException {
        planar.refused("[[1,1,2,2],[3,3,4,4],[5,5,^1,6]]", "label 1 occurs a third time", "exactly twice");
        planar.refused("[[1,1,2,2],[3,3,^4,5]]", "label 4 occurs once", "exactly twice");
        planar.refused("[[^1,2,3,4]]", "label 1 occurs once");
        planar.refused("[[1,1,1000000000,1000000000],[2,2,3,^2000000000],[3,4,4,5]]", "label 2000000000 occurs once");
        planar.refused("[[1,1,1000000000,1000000000],[2,2,3,3],[^1000000000,4,4,5]]",
                "label 1000000000 occurs a third time");
        planar.refused("[[^1,2,3,4],[4,3,2,5]]", "label 1 occurs once");
    }

    @Test
    void circlesHaveLabelsOfTheirOwn() throws CodeException {
        planar.refused("[[1,1,2,2],[^1]]", "label 1", "component without crossings", "own");
        planar.refused("[[^1],[1,1,2,2]]", "label 1", "own");
        planar.refused("[[1],[2],[^1]]", "label 1", "own");
        planar.refused("[[7],[2000000000],[^2000000000]]", "label 2000000000", "own");
        planar.refused("[[1,1,2,3],[^3],[2,5,5,6],[6]]", "label 3", "own");
    }

    @Test
    void entriesHaveFourLabelsOrOne() throws CodeException {
        planar.refused("[[1,1,2,2],^[3,4]]", "an entry of 2 labels", "a crossing has 4");
        planar.refused("[[1,1,2,2], ^[3,4,5]]", "an entry of 3 labels");
        planar.refused("[^[1,1,2,2,3]]", "an entry of 5 labels");
        planar.refused("[[^]]", "a label is expected, found ']'");
        planar.refused("[[1,1,2,2],^]", "'['", "found ']'");
        planar.refused("[[1,1,2,2,^]]", "a label is expected");
    }

    @Test
    void theCodeLiesOnTheSphere() throws CodeException {
        // One crossing, one curve through it twice on a torus.
        planar.refused("[[^1,2,1,2]]", "does not close up to a sphere", "virtual", "1 crossings and 1 regions", "have 3");
        // O1+ O2+ U1+ U2+: its graph, two vertices and four edges between them, is planar; the code is not.
        planar.refused("[[^3,2,4,1],[4,3,1,2]]", "virtual", "the piece with crossing 1 has 2 crossings and 2 regions",
                "it would have 4");
        planar.refused("[[1,1,2,2],[^5,4,6,3],[6,5,3,4]]", "the piece with crossing 2");
        planar.refused("[[11,11,12,12],[5,5,6,6],[3,3,4,4],[^23,22,24,21],[24,23,21,22],[31,31,32,32]]",
                "the piece with crossing 4");
    }

    @Test
    void labelsRunRoundTheirComponent() throws CodeException {
        planar.refused("[[1,5,2,3],[4,1,^3,6],[5,4,6,2]]", "label 3 follows label 4", "increase", "smallest, 1");
        planar.refused("[[1,5000000,2,3],[4,1,^3,6000000],[5000000,4,6000000,2]]", "label 3 follows label 4");
        planar.refused("[[^2,4,1,5],[3,1,4,6],[5,3,6,2]]", "from entry 3 to entry 1", "incoming");
        planar.refused("[[^1,3,2,4],[1,4,2,3]]", "from entry 3 to entry 1");
    }

    @Test
    void labelsAreWholeNumbersFromOne() throws CodeException {
        planar.refused("[[^0,1,1,2]]", "label 0", "from 1 to 2147483647");
        planar.refused("[[^-1,1,2,2]]", "found '-'", "whole numbers");
        planar.refused("[[^+1,1,2,2]]", "found '+'");
        planar.refused("[[1^.5,1,2,2]]", "found '.'", "whole number");
        planar.refused("[[1^e3,1,2,2]]", "found 'e'");
        planar.refused("[[^01,1,2,2]]", "leading 0");
        planar.refused("[[^00,1,2,2]]", "leading 0");
        planar.refused("[[1 ^1,2,2]]", "found '1'");
        planar.refused("[[^\"1\",1,2,2]]", "found '\"'");
        planar.refused("[[^null]]", "found 'n'");
    }

    @Test
    void labelsBeyondTheRangeDoNotWrapRound() throws CodeException {
        planar.refused("[[^2147483648,1,2,2]]", "above 2147483647");
        planar.refused("[[1,^4294967297,2,2]]", "above 2147483647");               // 2^32 + 1
        planar.refused("[[1,^18446744073709551617,2,2]]", "above 2147483647");     // 2^64 + 1
        planar.refused("[[1,^36893488147419103233,2,2]]", "above 2147483647");     // 2^65 + 1
        planar.refused("[[1,1,2,^" + "9".repeat(100_000) + "]]", "above 2147483647");
        planar.refused("[[1,^" + "0".repeat(100_000) + "1,2,2]]", "leading 0");
    }

    @Test
    void bytesThatAreNoCode() throws CodeException {
        planar.refused("^", "begins with '['", "the end of the code");
        planar.refused("  ^", "begins with '['", "the end of the code");
        planar.refused("[^]", "an empty code", "[k]");
        planar.refused("[ \n^]", "an empty code");
        planar.refused("^PD[1]", "begins with '['", "found 'P'");
        planar.refused("[^1,1,2,2]", "'['", "found '1'");
        planar.refused("[[1,1,^\0,2]]", "found byte 0");
        planar.refused("[[1,^é,2,2]]", "found byte 195");
        planar.refused("[[1,1,2,2]]^é", "after the end");
        planar.refused("[[1,1,^２,2]]", "found byte 239");                            // a full-width digit
        planar.refused("[[1,1,2,2]^\u00a0]", "found byte 194");                      // a no-break space
        planar.refused(new byte[] {'[', '[', '1', ',', (byte) 0xff, ']', ']'}, 4, "found byte 255");
        planar.refused("\ufeff[[1]]".getBytes(StandardCharsets.UTF_8), 0, "found byte 239");
    }

    @Test
    void whatFollowsTheCode() throws CodeException {
        planar.refused("[[1,1,2,2]]^x", "'x' after the end of the code");
        planar.refused("[[1,1,2,2]] ^]", "']' after the end of the code");
        planar.refused("[[1,1,2,2]]^[[1]]", "'[' after the end of the code");
        planar.refused("[[1,1,2,2]^[3]]", "',' or ']'");
    }

    @Test
    void truncatedAnywhere() throws CodeException {
        String code = "[[1, 5,2,4],[3,1,4,6],[5,3,6,2]]";
        for (int to = 0; to < code.length(); to++) {
            String cut = code.substring(0, to);
            planar.refused(cut.getBytes(StandardCharsets.UTF_8), to, "found the end of the code");
        }
    }

    @Test
    void nestedDeeply() throws CodeException {
        planar.refused("[[^" + "[".repeat(4_998), "a label is expected, found '['");
        planar.refused("[[^" + "[".repeat(4_998) + "1" + "]".repeat(5_000), "a label is expected, found '['");
        planar.refused("[[1,1,2,2],[^" + "[".repeat(1_000_000), "found '['");
    }
}
