package ropewalk.diagram.moves;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads the written form of moves. */
final class MoveText {

    private static final Pattern R1 = Pattern.compile("R1 ([1-9][0-9]{0,9})");
    private static final Pattern R2 = Pattern.compile("R2 ([1-9][0-9]{0,9}) ([1-9][0-9]{0,9})");

    private MoveText() {
    }

    static Move parse(String text) {
        Matcher r1 = R1.matcher(text);
        if (r1.matches()) {
            return new Move.R1Removal(crossing(r1.group(1)));
        }
        Matcher r2 = R2.matcher(text);
        if (r2.matches()) {
            return new Move.R2Removal(crossing(r2.group(1)), crossing(r2.group(2)));
        }
        throw new IllegalArgumentException("'" + text + "' is no move; write R1 5 or R2 1 3, crossings counted from 1, "
                + "the lower one first");
    }

    private static int crossing(String digits) {
        long number = Long.parseLong(digits);
        if (number > Integer.MAX_VALUE) {
            throw new IllegalArgumentException("crossing " + number + "; no diagram has more than " + Integer.MAX_VALUE);
        }
        return (int) number - 1;
    }
}
