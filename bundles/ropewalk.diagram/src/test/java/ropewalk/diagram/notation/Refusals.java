package ropewalk.diagram.notation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import ropewalk.diagram.Codes;
import ropewalk.diagram.LinkBatch;

/** Checks that bad codes are refused at the byte marked by '^' in them, and leave reader and batch usable. */
final class Refusals {

    private final String notation;
    private final String good;
    private final CodeReader reader;

    Refusals(String notation, String good) {
        this.notation = notation;
        this.good = good;
        this.reader = Notations.reader(notation).orElseThrow();
    }

    void refused(String marked, String... reasons) throws CodeException {
        int mark = marked.indexOf('^');
        byte[] before = marked.substring(0, mark).getBytes(StandardCharsets.UTF_8);
        byte[] code = marked.replace("^", "").getBytes(StandardCharsets.UTF_8);
        refused(code, before.length, reasons);
    }

    void refused(byte[] code, int offset, String... reasons) throws CodeException {
        byte[] around = new byte[code.length + 5];
        java.util.Arrays.fill(around, (byte) '7');      // what lies outside must not be read
        System.arraycopy(code, 0, around, 3, code.length);
        LinkBatch.Builder batch = new LinkBatch.Builder();
        CodeException e = assertThrows(CodeException.class, () -> reader.read(around, 3, 3 + code.length, batch),
                () -> new String(code, StandardCharsets.UTF_8));
        String shown = new String(code, 0, Math.min(code.length, 80), StandardCharsets.UTF_8) + " -> " + e.offset() + ": "
                + e.getMessage();
        assertEquals(offset, e.offset() - 3, shown);
        for (String reason : reasons) {
            assertTrue(e.getMessage().contains(reason), shown);
        }
        assertFalse(e.getMessage().chars().anyMatch(c -> c < ' '), "one line: " + shown);
        assertTrue(e.getMessage().length() < 400, shown);
        assertEquals(0, batch.size());
        byte[] right = good.getBytes(StandardCharsets.UTF_8);
        reader.read(right, 0, right.length, batch);
        assertEquals(Codes.read(notation, good), batch.build().link(0), "after " + shown);
    }
}
