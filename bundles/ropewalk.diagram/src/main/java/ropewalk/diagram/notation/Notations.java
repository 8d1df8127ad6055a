package ropewalk.diagram.notation;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Supplier;

/** The notations that can be read and written, by the names that collections use. */
public final class Notations {

    private static final Map<String, Supplier<CodeReader>> READERS = new TreeMap<>(Map.of(
            "braid", BraidReader::new,
            "dowker", DowkerReader::new,
            "planar", PlanarReader::new));
    private static final Map<String, CodeWriter> WRITERS = new TreeMap<>(Map.of(
            "planar", new PlanarWriter()));

    private Notations() {
    }

    /**
     * The names of the notations that can be read.
     *
     * @return names in alphabetical order
     */
    public static List<String> readable() {
        return List.copyOf(READERS.keySet());
    }

    /**
     * The names of the notations that can be written.
     *
     * @return names in alphabetical order
     */
    public static List<String> writable() {
        return List.copyOf(WRITERS.keySet());
    }

    /**
     * A new reader for one thread.
     *
     * @param notation a name, as in {@link #readable}
     * @return the reader, or nothing if no notation has that name
     */
    public static Optional<CodeReader> reader(String notation) {
        return Optional.ofNullable(READERS.get(notation)).map(Supplier::get);
    }

    /**
     * The writer of a notation.
     *
     * @param notation a name, as in {@link #writable}
     * @return the writer, or nothing if that notation cannot be written
     */
    public static Optional<CodeWriter> writer(String notation) {
        return Optional.ofNullable(WRITERS.get(notation));
    }
}
