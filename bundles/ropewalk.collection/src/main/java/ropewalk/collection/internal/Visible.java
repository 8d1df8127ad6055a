package ropewalk.collection.internal;

import java.nio.charset.StandardCharsets;

/** Text of a file as it may appear in a one-line message. */
public final class Visible {

    private static final int LONGEST_QUOTATION = 40;

    private Visible() {
    }

    /**
     * {@return the text with every character that would break or hide parts of a line replaced by a visible escape}
     *
     * @param text the text
     */
    public static String escaped(String text) {
        int first = 0;
        while (first < text.length() && !hides(text.charAt(first))) {
            first++;
        }
        if (first == text.length()) {
            return text;
        }
        StringBuilder out = new StringBuilder(text.length() + 16).append(text, 0, first);
        for (int i = first; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '\n' -> out.append("\\n");
                case '\r' -> out.append("\\r");
                case '\t' -> out.append("\\t");
                default -> {
                    if (hides(c)) {
                        out.append(String.format("\\u%04X", (int) c));
                    } else {
                        out.append(c);
                    }
                }
            }
        }
        return out.toString();
    }

    /**
     * {@return the text in single quotes for a message: escaped, and cut after 40 characters}
     *
     * @param text the text
     */
    public static String quoted(String text) {
        if (text.codePointCount(0, text.length()) <= LONGEST_QUOTATION) {
            return "'" + escaped(text) + "'";
        }
        return "'" + escaped(text.substring(0, text.offsetByCodePoints(0, LONGEST_QUOTATION))) + "…'";
    }

    /**
     * As {@link #quoted(String)} for UTF-8 bytes; decodes no more than is shown.
     *
     * @param bytes the bytes
     * @param from first index
     * @param to index after the last
     * @return the text
     */
    public static String quoted(byte[] bytes, int from, int to) {
        int cut = Math.min(to, from + 4 * LONGEST_QUOTATION + 4);
        return quoted(new String(bytes, from, cut - from, StandardCharsets.UTF_8));
    }

    /** Controls, line and paragraph separators, and invisible format characters (marks of direction among them). */
    private static boolean hides(char c) {
        if (c >= ' ' && c < 0x7f) {
            return false;
        }
        int type = Character.getType(c);
        return type == Character.CONTROL || type == Character.FORMAT || type == Character.LINE_SEPARATOR
                || type == Character.PARAGRAPH_SEPARATOR;
    }
}
