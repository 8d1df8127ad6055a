package ropewalk.invariant;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * Reads and writes the canonical texts of values: JSON without blanks, whole numbers of any size, texts in quotes.
 */
public final class ValueText {

    private ValueText() {
    }

    static String list(List<BigInteger> values) {
        StringBuilder out = new StringBuilder("[");
        for (int i = 0; i < values.size(); i++) {
            out.append(i == 0 ? "" : ",").append(values.get(i));
        }
        return out.append(']').toString();
    }

    static String texts(List<String> values) {
        StringBuilder out = new StringBuilder("[");
        for (int i = 0; i < values.size(); i++) {
            out.append(i == 0 ? "" : ",").append(quoted(values.get(i)));
        }
        return out.append(']').toString();
    }

    /**
     * A text as a JSON string (RFC 8259).
     *
     * @param text any text
     * @return it in quotes, with escapes where JSON asks for them
     */
    public static String quoted(String text) {
        StringBuilder out = new StringBuilder(text.length() + 2).append('"');
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '"' -> out.append("\\\"");
                case '\\' -> out.append("\\\\");
                case '\n' -> out.append("\\n");
                case '\r' -> out.append("\\r");
                case '\t' -> out.append("\\t");
                default -> {
                    if (c < ' ' || c == 0x7f || c >= 0x80 && c < 0xa0) {
                        out.append(String.format("\\u%04x", (int) c));
                    } else {
                        out.append(c);
                    }
                }
            }
        }
        return out.append('"').toString();
    }

    /**
     * Reads a canonical text.
     *
     * @param <V> the type of the value
     * @param type which record it is
     * @param text as {@link Value#text} writes it
     * @return the value
     * @throws IllegalArgumentException if the text is no canonical text of that type
     */
    public static <V extends Value> V read(Class<V> type, String text) {
        Value value;
        if (type == Value.TextValue.class) {
            value = new Value.TextValue(text);
        } else if (type == Value.IntegerValue.class) {
            value = new Value.IntegerValue(integer(text, text));
        } else if (type == Value.RationalValue.class) {
            int slash = text.indexOf('/');
            value = slash < 0 ? new Value.RationalValue(integer(text, text), BigInteger.ONE)
                    : new Value.RationalValue(integer(text.substring(0, slash), text),
                            integer(text.substring(slash + 1), text));
        } else {
            Object tree = new Json(text).whole();
            if (type == Value.IntegerList.class) {
                value = new Value.IntegerList(integers(tree, text));
            } else if (type == Value.IntegerMatrixValue.class) {
                value = new Value.IntegerMatrixValue(items(tree, text).stream().map(row -> integers(row, text)).toList());
            } else if (type == Value.PolynomialValue.class) {
                value = new Value.PolynomialValue(items(tree, text).stream().map(term -> term(term, text)).toList());
            } else if (type == Value.StepsValue.class) {
                value = steps(items(tree, text), text);
            } else if (type == Value.TableValue.class) {
                List<List<String>> rows = items(tree, text).stream().map(row -> strings(row, text)).toList();
                if (rows.isEmpty()) {
                    throw wrong(text);
                }
                value = new Value.TableValue(rows.get(0), rows.subList(1, rows.size()));
            } else {
                throw new IllegalArgumentException(type.getName() + " is no type of value");
            }
        }
        if (!value.text().equals(text)) {
            throw new IllegalArgumentException("'" + text + "' is not canonical; write '" + value.text() + "'");
        }
        return type.cast(value);
    }

    private static Value.Term term(Object tree, String text) {
        List<?> parts = sized(tree, 2, text);
        return new Value.Term(integers(parts.get(0), text), integer(String.valueOf(parts.get(1)), text));
    }

    private static Value.StepsValue steps(List<?> parts, String text) {
        if (parts.isEmpty()) {
            throw wrong(text);
        }
        List<Value.Jump> jumps = new ArrayList<>();
        for (Object part : parts.subList(1, parts.size())) {
            List<String> jump = strings(part, text);
            if (jump.size() != 3) {
                throw wrong(text);
            }
            jumps.add(new Value.Jump(jump.get(0), jump.get(1), jump.get(2)));
        }
        return new Value.StepsValue(string(parts.get(0), text), jumps);
    }

    private static List<?> items(Object tree, String text) {
        if (tree instanceof List<?> list) {
            return list;
        }
        throw wrong(text);
    }

    private static List<?> sized(Object tree, int size, String text) {
        List<?> list = items(tree, text);
        if (list.size() != size) {
            throw wrong(text);
        }
        return list;
    }

    private static List<BigInteger> integers(Object tree, String text) {
        return items(tree, text).stream().map(item -> integer(String.valueOf(item), text)).toList();
    }

    private static List<String> strings(Object tree, String text) {
        return items(tree, text).stream().map(item -> string(item, text)).toList();
    }

    private static String string(Object item, String text) {
        if (item instanceof String s) {
            return s;
        }
        throw wrong(text);
    }

    private static BigInteger integer(String digits, String text) {
        try {
            return new BigInteger(digits);
        } catch (NumberFormatException e) {
            throw wrong(text);
        }
    }

    private static IllegalArgumentException wrong(String text) {
        return new IllegalArgumentException("'" + text + "' is not the text of such a value");
    }
}
