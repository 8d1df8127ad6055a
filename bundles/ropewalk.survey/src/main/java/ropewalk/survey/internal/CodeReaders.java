package ropewalk.survey.internal;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import ropewalk.collection.Slice;
import ropewalk.diagram.notation.CodeReader;
import ropewalk.diagram.notation.Notations;

/** One thread's readers, found by the bytes of the notation's name. */
final class CodeReaders {

    private final Map<String, Optional<CodeReader>> known = new HashMap<>();
    private byte[] lastName = {};
    private CodeReader last;

    /** The reader, or null if no notation has that name. */
    CodeReader of(Slice name) {
        if (last != null && Arrays.equals(lastName, 0, lastName.length, name.bytes(), name.from(), name.to())) {
            return last;
        }
        String text = name.toString();
        if (text.length() > 100) {
            return null;
        }
        CodeReader reader = known.computeIfAbsent(text, Notations::reader).orElse(null);
        if (reader == null) {
            known.remove(text);     // unknown names are not collected
            return null;
        }
        lastName = Arrays.copyOfRange(name.bytes(), name.from(), name.to());
        last = reader;
        return reader;
    }
}
