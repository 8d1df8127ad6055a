package ropewalk.invariant;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/** Lists, whole numbers and texts of JSON: what canonical texts are made of. Nesting is bounded. */
final class Json {

    private static final int DEEPEST = 16;

    private final String text;
    private int at;

    Json(String text) {
        this.text = text;
    }

    Object whole() {
        Object tree = item(0);
        if (at != text.length()) {
            throw wrong();
        }
        return tree;
    }

    private Object item(int depth) {
        char c = peek();
        if (c == '[') {
            return list(depth);
        }
        if (c == '"') {
            return string();
        }
        int from = at;
        if (c == '-') {
            at++;
        }
        while (at < text.length() && Character.isDigit(text.charAt(at))) {
            at++;
        }
        try {
            return new BigInteger(text.substring(from, at));
        } catch (NumberFormatException e) {
            throw wrong();
        }
    }

    private List<Object> list(int depth) {
        if (depth == DEEPEST) {
            throw wrong();
        }
        at++;
        List<Object> items = new ArrayList<>();
        if (peek() == ']') {
            at++;
            return items;
        }
        while (true) {
            items.add(item(depth + 1));
            char c = peek();
            at++;
            if (c == ']') {
                return items;
            }
            if (c != ',') {
                throw wrong();
            }
        }
    }

    private String string() {
        StringBuilder out = new StringBuilder();
        at++;
        while (true) {
            char c = peek();
            at++;
            if (c == '"') {
                return out.toString();
            }
            out.append(c == '\\' ? escaped() : c);
        }
    }

    private char escaped() {
        char c = peek();
        at++;
        return switch (c) {
            case 'n' -> '\n';
            case 'r' -> '\r';
            case 't' -> '\t';
            case '"', '\\' -> c;
            case 'u' -> {
                if (at + 4 > text.length()) {
                    throw wrong();
                }
                at += 4;
                try {
                    yield (char) Integer.parseInt(text, at - 4, at, 16);
                } catch (NumberFormatException e) {
                    throw wrong();
                }
            }
            default -> throw wrong();
        };
    }

    private char peek() {
        if (at >= text.length()) {
            throw wrong();
        }
        return text.charAt(at);
    }

    private IllegalArgumentException wrong() {
        return new IllegalArgumentException("'" + text + "' is no canonical text, see position " + (at + 1));
    }
}
