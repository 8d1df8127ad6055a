package ropewalk.collection;

import java.util.Objects;
import ropewalk.collection.internal.Visible;

/**
 * What is wrong with one row of a collection, or with the file as a whole.
 *
 * @param file   the file as the user named it
 * @param line   the physical line where the row begins, the first line being 1; 0 where there is no line, as for a file that
 *               does not exist
 * @param column the place of the fault in characters (code points) from the beginning of the row, the first being 1; 0 where
 *               there is none
 * @param name   the name of the link as it stands in the file, possibly empty; bytes that are not UTF-8 appear as U+FFFD,
 *               and a reader cuts it after 64 KiB
 * @param reason what was found and what would be right; one line: line breaks and other control characters given here are
 *               replaced by visible escapes such as {@code \n} and {@code \}{@code u0000}
 */
public record Rejection(String file, long line, int column, String name, String reason) {

    /**
     * Checks the numbers and makes the reason one line.
     *
     * @param file the file
     * @param line the line, or 0
     * @param column the column, or 0
     * @param name the name
     * @param reason what was found and what would be right
     * @throws IllegalArgumentException if line or column is negative
     */
    public Rejection {
        Objects.requireNonNull(file, "file");
        Objects.requireNonNull(name, "name");
        if (line < 0 || column < 0) {
            throw new IllegalArgumentException("line " + line + ", column " + column + "; neither may be negative");
        }
        reason = Visible.escaped(reason);
    }

    /** The rejection as one line of a message: {@code file:line:column: reason}, parts that are unknown left out. */
    @Override
    public String toString() {
        StringBuilder text = new StringBuilder(Visible.escaped(file));
        if (line > 0) {
            text.append(':').append(line);
        }
        if (line > 0 && column > 0) {
            text.append(':').append(column);
        }
        return text.append(": ").append(reason).toString();
    }
}
