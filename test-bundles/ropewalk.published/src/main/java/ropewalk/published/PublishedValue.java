package ropewalk.published;

/**
 * A value that somebody else has published, or that follows from a published formula.
 *
 * @param file the file of this bundle that holds it
 * @param row its place in that file, 1 for the first after the header
 * @param name of the link
 * @param notation of the code
 * @param code of a diagram
 * @param invariant the id of what is given
 * @param value its canonical text
 * @param source author and year, {@code recalled} where it was written down from memory
 */
public record PublishedValue(String file, int row, String name, String notation, String code, String invariant,
        String value, String source) {

    /**
     * Where it stands.
     *
     * @return file, row and name, for messages
     */
    public String place() {
        return file + " row " + row + " (" + name + ")";
    }
}
