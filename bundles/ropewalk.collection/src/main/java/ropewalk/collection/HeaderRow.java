package ropewalk.collection;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import ropewalk.collection.internal.Visible;

/** Checks what stands in the first row of a collection. */
final class HeaderRow {

    static final String EXPECTED = "the first row must name the columns: name,notation,code";

    static final String NOT_UTF8 = "NUL bytes in the header: UTF-16, or no text at all; save the file as UTF-8";

    private HeaderRow() {
    }

    /** What the first bytes show the file to be if it is no text in UTF-8, or null. */
    static String foreignFormat(byte[] b, int end) {
        int first = end < 2 ? 0 : (b[0] & 0xff) << 8 | b[1] & 0xff;
        return switch (first) {
            case 0xfffe, 0xfeff -> "the byte order mark of UTF-16; save the file as UTF-8";
            case 0x504b -> end > 3 && b[2] == 3 && b[3] == 4
                    ? "a zip archive or a spreadsheet; save the table as CSV in UTF-8" : null;
            case 0x1f8b -> "a file compressed by gzip; decompress it first";
            default -> null;
        };
    }

    /** Why these columns are not those of a collection, or null. */
    static String objection(List<String> columns) {
        for (String required : CollectionHeader.REQUIRED) {
            if (!columns.contains(required)) {
                return missing(columns, required);
            }
        }
        List<String> seen = new ArrayList<>(columns);
        for (String column : columns) {
            seen.remove(column);
            if (seen.contains(column)) {
                return column.isEmpty() ? "two columns have no name; name them, or remove the commas at the end of the rows"
                        : "two columns are called " + Visible.quoted(column) + "; rename one of them";
            }
        }
        return null;
    }

    /** The index of the first column that occurred before, or 0. */
    static int repeated(List<String> columns) {
        for (int f = 1; f < columns.size(); f++) {
            if (columns.indexOf(columns.get(f)) < f) {
                return f;
            }
        }
        return 0;
    }

    private static String missing(List<String> columns, String required) {
        String found = columns.stream().limit(8).map(Visible::quoted).collect(Collectors.joining(", "))
                + (columns.size() > 8 ? ", …" : "");
        if (columns.size() == 1 && columns.get(0).matches("(?s).*[;\t].*")) {
            return "found the single column " + found + "; separate the columns by commas, and so in all rows";
        }
        for (String column : columns) {
            if (column.strip().equalsIgnoreCase(required)) {
                return "column " + Visible.quoted(column) + " found; call it '"
                        + required + "', in small letters and without blanks";
            }
        }
        return "no column '" + required + "' among " + found + "; " + EXPECTED;
    }
}
