package ropewalk.command.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import ropewalk.collection.CollectionReader;
import ropewalk.collection.RecordBlock;
import ropewalk.collection.Slice;
import ropewalk.collection.UnreadableCollectionException;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.notation.CodeException;
import ropewalk.diagram.notation.CodeReader;
import ropewalk.diagram.notation.Notations;

/**
 * Links to be shown one by one.
 *
 * @param name what it is called
 * @param notation how it was written
 * @param diagram the diagram
 */
record OneLink(String name, String notation, LinkDiagram diagram) {

    /** From {@code NOTATION:CODE} on the command line. */
    static OneLink ofCode(String argument) throws UsageException {
        int colon = argument.indexOf(':');
        if (colon < 0) {
            throw new UsageException("--code takes NOTATION:CODE, for example 'braid:2: 1 1 1'");
        }
        String notation = argument.substring(0, colon).trim();
        byte[] code = argument.substring(colon + 1).getBytes(StandardCharsets.UTF_8);
        try {
            return new OneLink("link", notation, read(notation, new Slice(code, 0, code.length)));
        } catch (CodeException e) {
            throw new UsageException("--code, at character " + (e.offset() + 1) + " of the code: " + e.getMessage());
        }
    }

    /** From {@code FILE} or {@code FILE#NAME}; a file that exists under the whole text is taken as it is. */
    static List<OneLink> ofFile(String argument, int most) throws UsageException, UnreadableCollectionException {
        int hash = argument.lastIndexOf('#');
        boolean whole = hash < 0 || Files.exists(Arguments.path(argument));
        Path file = Arguments.path(whole ? argument : argument.substring(0, hash));
        Optional<String> name = whole ? Optional.empty() : Optional.of(argument.substring(hash + 1));
        List<OneLink> links = new ArrayList<>();
        try (CollectionReader reader = CollectionReader.open(file)) {
            for (RecordBlock block = reader.next(); block != null; block = reader.next()) {
                for (int i = 0; i < block.size() && links.size() < most; i++) {
                    if (name.isEmpty() || name.get().equals(block.name(i))) {
                        links.add(ofRecord(block, i));
                    }
                }
            }
        } catch (UnreadableCollectionException e) {
            throw e;
        } catch (IOException e) {
            throw new UsageException(file + " cannot be closed: " + e.getMessage());
        }
        if (links.isEmpty()) {
            throw new UsageException(name.map(n -> "no good row of " + file + " is called '" + n + "'")
                    .orElse(file + " has no good row"));
        }
        return links;
    }

    private static OneLink ofRecord(RecordBlock block, int i) throws UsageException {
        try {
            return new OneLink(block.name(i), block.notation(i).toString(),
                    read(block.notation(i).toString(), block.code(i)));
        } catch (CodeException e) {
            throw new UsageException(block.rejectCode(i, e.offset() - block.code(i).from(), e.getMessage()).toString());
        }
    }

    static LinkDiagram read(String notation, Slice code) throws UsageException, CodeException {
        CodeReader reader = Notations.reader(notation).orElseThrow(() -> new UsageException("no notation is called '"
                + notation + "'; there are " + String.join(", ", Notations.readable())));
        LinkBatch.Builder batch = new LinkBatch.Builder();
        reader.read(code.bytes(), code.from(), code.to(), batch);
        return batch.build().link(0);
    }
}
