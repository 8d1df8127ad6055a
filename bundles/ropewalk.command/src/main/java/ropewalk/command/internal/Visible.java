package ropewalk.command.internal;

/** Text of a collection on the terminal: control characters are shown, never sent. */
final class Visible {

    private Visible() {
    }

    static String text(String text) {
        StringBuilder out = new StringBuilder(text.length());
        text.codePoints().forEach(c -> {
            if (c < ' ' || c >= 0x7f && c < 0xa0 || Character.getType(c) == Character.FORMAT
                    || c == 0x2028 || c == 0x2029) {
                out.append(String.format("\\u%04x", c));
            } else {
                out.appendCodePoint(c);
            }
        });
        return out.toString();
    }
}
