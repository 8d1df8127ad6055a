package ropewalk.guest.tests;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A CSV file (RFC 4180) without line breaks in its cells.
 *
 * @param columns the header
 * @param rows the cells below it
 */
record Table(List<String> columns, List<List<String>> rows) {

    private static final Pattern CELL = Pattern.compile("(?:^|,)(?:\"((?:[^\"]|\"\")*)\"|([^\",]*))");

    static Table read(Path file) {
        try {
            List<List<String>> rows = new ArrayList<>();
            for (String line : Files.readAllLines(file)) {
                rows.add(cells(line));
            }
            for (List<String> row : rows) {
                if (row.size() != rows.get(0).size()) {
                    throw new AssertionError(file + ": " + row.size() + " cells under " + rows.get(0) + ": " + row);
                }
            }
            return new Table(rows.get(0), rows.subList(1, rows.size()));
        } catch (IOException fault) {
            throw new UncheckedIOException(fault);
        }
    }

    private static List<String> cells(String line) {
        List<String> cells = new ArrayList<>();
        Matcher cell = CELL.matcher(line);
        int at = 0;
        while (cell.find()) {
            if (cell.start() != at) {
                throw new AssertionError("not CSV at " + at + ": " + line);
            }
            cells.add(cell.group(1) == null ? cell.group(2) : cell.group(1).replace("\"\"", "\""));
            at = cell.end();
        }
        if (at != line.length()) {
            throw new AssertionError("not CSV at " + at + ": " + line);
        }
        return cells;
    }

    /** The cells of a column, in order. */
    List<String> column(String name) {
        int index = columns.indexOf(name);
        if (index < 0) {
            throw new AssertionError("no column " + name + " among " + columns);
        }
        return rows.stream().map(row -> row.get(index)).toList();
    }

    /** The cell of the first row with a name. */
    String cell(String name, String column) {
        int row = column("name").indexOf(name);
        if (row < 0) {
            throw new AssertionError("no row " + name + " among " + column("name"));
        }
        return column(column).get(row);
    }

    /** The cells of the columns here that are not the same in another table with the same columns and more. */
    List<String> differences(Table other) {
        List<String> found = new ArrayList<>();
        List<String> shared = other.columns().stream().filter(columns::contains).toList();
        if (!shared.equals(columns)) {
            found.add("columns " + columns + " became " + other.columns());
            return found;
        }
        for (String column : columns) {
            for (String name : column("name")) {
                String before = cell(name, column);
                String after = other.cell(name, column);
                if (!before.equals(after)) {
                    found.add(name + ", " + column + ": " + before + " became " + after);
                }
            }
        }
        return found;
    }

    /** The same without some columns. */
    Table without(String... left) {
        List<Integer> kept = new ArrayList<>();
        for (int i = 0; i < columns.size(); i++) {
            if (!List.of(left).contains(columns.get(i))) {
                kept.add(i);
            }
        }
        return new Table(kept.stream().map(columns::get).toList(),
                rows.stream().map(row -> kept.stream().map(row::get).toList()).toList());
    }
}
