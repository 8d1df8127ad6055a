package ropewalk.collection;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * The slow twin of the reader for rows without a limit of length: the whole text in memory, one char a byte, strings
 * throughout, and the decoder of the JDK to tell what is UTF-8.
 */
final class SlowCollection {

    private final String text;
    private final int width;
    private final int nameField;
    private final List<String> shapes = new ArrayList<>();

    private int pos;
    private int broken;
    private int next;

    private SlowCollection(byte[] bytes, int width, int nameField) {
        this.text = new String(bytes, StandardCharsets.ISO_8859_1);
        this.width = width;
        this.nameField = nameField;
    }

    /** The shapes, as {@link ReadBack#shapes()}, of a text whose header is its first line. */
    static List<String> shapes(byte[] bytes, List<String> header) {
        SlowCollection slow = new SlowCollection(bytes, header.size(), header.indexOf("name"));
        slow.pos = slow.afterBreak(0);
        while (slow.pos < slow.text.length()) {
            slow.row();
            slow.pos = slow.next;
        }
        return slow.shapes;
    }

    private void row() {
        List<String> fields = new ArrayList<>();
        List<Integer> starts = new ArrayList<>();
        List<Integer> ends = new ArrayList<>();
        broken = -1;
        int p = pos;
        while (true) {
            p = field(p, fields, starts, ends);
            if (broken >= 0) {
                break;
            }
            if (p == text.length() || text.charAt(p) != ',') {
                break;
            }
            p++;
        }
        int end = p;
        if (broken < 0) {
            next = p == text.length() ? p : afterBreak(p);
        }
        String raw = text.substring(pos, next);
        long line = 1 + breaks(text.substring(0, pos));
        int bad = firstBadByte(raw);
        if (broken >= 0 || bad >= 0) {
            int at = broken < 0 ? pos + bad : bad < 0 ? broken : Math.min(broken, pos + bad);
            reject(line, at);
        } else if (!text.substring(pos, end).matches("[ \t]*")) {
            judge(line, end, fields, starts, ends);
        }
    }

    private void judge(long line, int end, List<String> fields, List<Integer> starts, List<Integer> ends) {
        List<String> bare = fields.stream().limit(width).map(f -> f.startsWith("\ufeff") ? f.substring(1) : f).toList();
        if (bare.containsAll(List.of("name", "notation", "code"))) {
            reject(line, pos);
        } else if (fields.size() < width) {
            reject(line, end);
        } else if (fields.size() > width) {
            reject(line, ends.get(width - 1));
        } else if (fields.get(nameField).matches("[ \t\r\n]*")) {
            reject(line, starts.get(nameField));
        } else {
            shapes.add(line + " " + fields);
        }
    }

    private void reject(long line, int at) {
        String before = utf8(text.substring(pos, at));
        shapes.add(line + ":" + (1 + before.codePointCount(0, before.length())) + " rejected");
    }

    /** Reads the field at p; returns the index after it, or sets {@code broken} and {@code next}. */
    private int field(int p, List<String> fields, List<Integer> starts, List<Integer> ends) {
        if (p < text.length() && text.charAt(p) == '"') {
            int close = text.indexOf('"', p + 1);
            while (close >= 0 && text.startsWith("\"\"", close)) {
                close = text.indexOf('"', close + 2);
            }
            int after = close + 1;
            if (close >= 0 && (after == text.length() || ",\r\n".indexOf(text.charAt(after)) >= 0)) {
                fields.add(utf8(text.substring(p + 1, close)).replace("\"\"", "\""));
                starts.add(p + 1);
                ends.add(after);
                return after;
            }
            int lineEnd = nextBreak(p);
            broken = close < 0 || lineEnd < after ? p : after;
            next = lineEnd == text.length() ? lineEnd : afterBreak(lineEnd);
            return p;
        }
        int end = p;
        while (end < text.length() && ",\r\n\"".indexOf(text.charAt(end)) < 0) {
            end++;
        }
        if (end < text.length() && text.charAt(end) == '"') {
            broken = end;
            int lineEnd = nextBreak(end);
            next = lineEnd == text.length() ? lineEnd : afterBreak(lineEnd);
            return p;
        }
        fields.add(utf8(text.substring(p, end)));
        starts.add(p);
        ends.add(end);
        return end;
    }

    private int nextBreak(int from) {
        int p = from;
        while (p < text.length() && text.charAt(p) != '\n' && text.charAt(p) != '\r') {
            p++;
        }
        return p;
    }

    private int afterBreak(int from) {
        int p = nextBreak(from);
        return text.startsWith("\r\n", p) ? p + 2 : p + 1;
    }

    static long breaks(String text) {
        return text.replace("\r\n", "\n").chars().filter(c -> c == '\n' || c == '\r').count();
    }

    private static String utf8(String latin) {
        return new String(latin.getBytes(StandardCharsets.ISO_8859_1), StandardCharsets.UTF_8);
    }

    private static int firstBadByte(String latin) {
        byte[] bytes = latin.getBytes(StandardCharsets.ISO_8859_1);
        int nul = latin.indexOf('\0');
        int to = nul < 0 ? bytes.length : nul;
        ByteBuffer in = ByteBuffer.wrap(bytes, 0, to);
        try {
            StandardCharsets.UTF_8.newDecoder().decode(in);
            return nul;
        } catch (CharacterCodingException e) {
            return in.position();
        }
    }
}
