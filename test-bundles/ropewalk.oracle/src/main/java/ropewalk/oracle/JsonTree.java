package ropewalk.oracle;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Reads JSON (RFC 8259) of objects, lists, texts and whole numbers into maps, lists, texts and longs. */
public final class JsonTree {

    private final String text;
    private int at;

    private JsonTree(String text) {
        this.text = text;
    }

    /**
     * Reads a text.
     *
     * @param text JSON
     * @return its tree
     * @throws IllegalArgumentException if it is none
     */
    public static Object read(String text) {
        JsonTree reader = new JsonTree(text);
        Object tree = reader.item();
        if (reader.at != text.length()) {
            throw reader.wrong();
        }
        return tree;
    }

    /**
     * Reads an object.
     *
     * @param text JSON
     * @return its members
     */
    public static Map<?, ?> object(String text) {
        return (Map<?, ?>) read(text);
    }

    private Object item() {
        return switch (peek()) {
            case '{' -> members();
            case '[' -> items();
            case '"' -> string();
            default -> number();
        };
    }

    private Map<String, Object> members() {
        Map<String, Object> members = new LinkedHashMap<>();
        at++;
        while (peek() != '}') {
            String key = string();
            expect(':');
            if (members.put(key, item()) != null) {
                throw wrong();
            }
            if (peek() != '}') {
                expect(',');
            }
        }
        at++;
        return members;
    }

    private List<Object> items() {
        List<Object> items = new ArrayList<>();
        at++;
        while (peek() != ']') {
            items.add(item());
            if (peek() != ']') {
                expect(',');
            }
        }
        at++;
        return items;
    }

    private String string() {
        expect('"');
        StringBuilder out = new StringBuilder();
        while (peek() != '"') {
            char c = text.charAt(at++);
            if (c == '\\') {
                c = text.charAt(at++);
                if (c == 'u') {
                    out.append((char) Integer.parseInt(text.substring(at, at + 4), 16));
                    at += 4;
                    continue;
                }
                int place = "nrt\"\\/".indexOf(c);
                if (place < 0) {
                    throw wrong();
                }
                c = "\n\r\t\"\\/".charAt(place);
            }
            out.append(c);
        }
        at++;
        return out.toString();
    }

    private Long number() {
        int from = at;
        while (at < text.length() && "-0123456789".indexOf(text.charAt(at)) >= 0) {
            at++;
        }
        if (from == at) {
            throw wrong();
        }
        return Long.valueOf(text.substring(from, at));
    }

    private void expect(char c) {
        if (peek() != c) {
            throw wrong();
        }
        at++;
    }

    private char peek() {
        if (at >= text.length()) {
            throw wrong();
        }
        return text.charAt(at);
    }

    private IllegalArgumentException wrong() {
        return new IllegalArgumentException("no JSON at position " + (at + 1) + " of " + text);
    }
}
