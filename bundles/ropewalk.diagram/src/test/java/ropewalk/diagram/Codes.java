package ropewalk.diagram;

import java.nio.charset.StandardCharsets;
import ropewalk.diagram.notation.CodeException;
import ropewalk.diagram.notation.CodeReader;
import ropewalk.diagram.notation.Notations;

/** Reads and writes codes by their notation's name. */
public final class Codes {

    private Codes() {
    }

    public static LinkDiagram read(String notation, String code) throws CodeException {
        return read(Notations.reader(notation).orElseThrow(), code);
    }

    public static LinkDiagram read(CodeReader reader, String code) throws CodeException {
        byte[] bytes = code.getBytes(StandardCharsets.UTF_8);
        LinkBatch.Builder batch = new LinkBatch.Builder();
        reader.read(bytes, 0, bytes.length, batch);
        return batch.build().link(0);
    }

    public static String planar(LinkDiagram diagram) {
        return Notations.writer("planar").orElseThrow().write(diagram);
    }
}
