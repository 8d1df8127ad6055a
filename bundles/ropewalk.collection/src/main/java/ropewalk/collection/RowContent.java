package ropewalk.collection;

import java.nio.charset.StandardCharsets;
import ropewalk.collection.internal.RowScanner;

/** What the fields of a scanned row say; bounds are those of {@link RowScanner#bounds()}. */
final class RowContent {

    private static final byte[][] REQUIRED = CollectionHeader.REQUIRED.stream()
            .map(word -> word.getBytes(StandardCharsets.US_ASCII)).toArray(byte[][]::new);
    private static final int ALL = (1 << REQUIRED.length) - 1;

    // A rejected row may be as long as a row can be; its name alone must not fill the memory a second time.
    private static final int LONGEST_NAME = 1 << 16;

    private RowContent() {
    }

    /** The value of field f, doubled quotes resolved; bytes that are not UTF-8 become U+FFFD. */
    static String text(byte[] b, int[] bounds, int f) {
        int end = bounds[2 * f + 1];
        int to = end < 0 ? ~end : end;
        String raw = new String(b, bounds[2 * f], to - bounds[2 * f], StandardCharsets.UTF_8);
        return end < 0 ? raw.replace("\"\"", "\"") : raw;
    }

    /** The value of field f as it goes into a rejection: in full up to 64 KiB, else cut there and marked by an ellipsis. */
    static String nameText(byte[] b, int[] bounds, int f) {
        int end = bounds[2 * f + 1];
        int to = end < 0 ? ~end : end;
        int cut = bounds[2 * f] + LONGEST_NAME;
        if (to <= cut) {
            return text(b, bounds, f);
        }
        while ((b[cut] & 0xc0) == 0x80 && cut > bounds[2 * f]) {
            cut--;
        }
        return text(b, new int[] {bounds[2 * f], end < 0 ? ~cut : cut}, 0) + "\u2026";
    }

    /** The index of the comma that follows field f, which is not the last of its row. */
    static int commaAfter(byte[] b, int[] bounds, int f) {
        int end = bounds[2 * f + 1];
        int to = end < 0 ? ~end : end;
        return b[to] == '"' ? to + 1 : to;
    }

    /** Whether field f has nothing but blanks, tabs and line breaks. */
    static boolean isBlank(byte[] b, int[] bounds, int f) {
        int end = bounds[2 * f + 1];
        for (int p = bounds[2 * f]; p < (end < 0 ? ~end : end); p++) {
            if (b[p] != ' ' && b[p] != '\t' && b[p] != '\r' && b[p] != '\n') {
                return false;
            }
        }
        return true;
    }

    /** Whether the fields contain the names of all required columns, in any order, as after joining files. */
    static boolean repeatsHeader(byte[] b, int[] bounds, int fields) {
        int found = 0;
        int others = 0;
        for (int f = 0; f < fields && others <= fields - REQUIRED.length; f++) {
            int word = word(b, bounds, f);
            found |= word;
            others += word == 0 ? 1 : 0;
        }
        return found == ALL;
    }

    private static int word(byte[] b, int[] bounds, int f) {
        int to = bounds[2 * f + 1];
        int from = to < 0 ? to : afterByteOrderMark(b, bounds[2 * f], to);
        for (int w = 0; w < REQUIRED.length; w++) {
            byte[] word = REQUIRED[w];
            if (to - from == word.length && matches(b, from, word)) {
                return 1 << w;
            }
        }
        return 0;
    }

    private static boolean matches(byte[] b, int from, byte[] word) {
        for (int k = 0; k < word.length; k++) {
            if (b[from + k] != word[k]) {
                return false;
            }
        }
        return true;
    }

    /** The index after a byte order mark at {@code from}, or {@code from} if there is none. */
    static int afterByteOrderMark(byte[] b, int from, int to) {
        boolean mark = to - from >= 3 && b[from] == (byte) 0xef && b[from + 1] == (byte) 0xbb && b[from + 2] == (byte) 0xbf;
        return mark ? from + 3 : from;
    }
}
