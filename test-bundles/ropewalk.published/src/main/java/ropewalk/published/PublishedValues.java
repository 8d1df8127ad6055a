package ropewalk.published;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** Reads the files of this bundle, by a reader of its own: a fault of the product's reader must not hide in it. */
public final class PublishedValues {

    /** The files, each with the header {@value #HEADER}. */
    public static final List<String> FILES = List.of("knots-through-8.csv", "links-and-sums.csv", "montesinos.csv",
            "torus.csv", "two-bridge.csv", "wheels.csv");

    private static final String HEADER = "name,notation,code,invariant,value,source";

    private PublishedValues() {
    }

    /**
     * All values of all files.
     *
     * @return in the order of the files
     * @throws IllegalStateException if a file is missing or is no table of this kind
     */
    public static List<PublishedValue> all() {
        List<PublishedValue> values = new ArrayList<>();
        for (String file : FILES) {
            values.addAll(parse(file, text(file)));
        }
        return values;
    }

    /**
     * Reads one table.
     *
     * @param file its name, for messages
     * @param text the table with its header
     * @return its rows
     * @throws IllegalStateException if a row has not six fields or the header is another
     */
    public static List<PublishedValue> parse(String file, String text) {
        List<List<String>> records = records(file, text);
        if (records.isEmpty() || !String.join(",", records.get(0)).equals(HEADER)) {
            throw new IllegalStateException(file + " does not begin with " + HEADER);
        }
        List<PublishedValue> values = new ArrayList<>();
        for (int i = 1; i < records.size(); i++) {
            List<String> r = records.get(i);
            if (r.size() != 6) {
                throw new IllegalStateException(file + " row " + i + ": " + r.size() + " fields; give six");
            }
            values.add(new PublishedValue(file, i, r.get(0), r.get(1), r.get(2), r.get(3), r.get(4), r.get(5)));
        }
        return values;
    }

    private static String text(String file) {
        try (InputStream in = PublishedValues.class.getResourceAsStream(file)) {
            if (in == null) {
                throw new IllegalStateException("no file " + file + " beside " + PublishedValues.class.getName());
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Records of RFC 4180. */
    private static List<List<String>> records(String file, String text) {
        List<List<String>> records = new ArrayList<>();
        List<String> record = new ArrayList<>();
        StringBuilder field = new StringBuilder();
        boolean quoted = false;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (quoted) {
                if (c != '"') {
                    field.append(c);
                } else if (i + 1 < text.length() && text.charAt(i + 1) == '"') {
                    field.append('"');
                    i++;
                } else {
                    quoted = false;
                }
            } else if (c == '"') {
                if (!field.isEmpty()) {
                    throw new IllegalStateException(file + ": a quote inside the field '" + field + "'");
                }
                quoted = true;
            } else if (c == ',' || c == '\n') {
                record.add(field.toString());
                field.setLength(0);
                if (c == '\n') {
                    records.add(record);
                    record = new ArrayList<>();
                }
            } else if (c != '\r') {
                field.append(c);
            }
        }
        if (quoted || !field.isEmpty() || !record.isEmpty()) {
            throw new IllegalStateException(file + " does not end with a whole line");
        }
        return records;
    }
}
