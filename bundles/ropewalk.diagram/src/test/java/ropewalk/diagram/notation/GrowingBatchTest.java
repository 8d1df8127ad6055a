package ropewalk.diagram.notation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;

/** Readers and builders keep scratch arrays; every size must be right after every other. */
class GrowingBatchTest {

    private static void read(CodeReader reader, String code, LinkBatch.Builder batch) throws CodeException {
        byte[] bytes = code.getBytes(StandardCharsets.UTF_8);
        reader.read(bytes, 0, bytes.length, batch);
    }

    @Test
    void diagramsOfSlowlyGrowingSizeShareABatch() throws CodeException {
        List<Integer> sizes = new ArrayList<>();
        for (int n = 0; n <= 300; n++) {
            sizes.add(n);
        }
        for (int n = 2000; n > 0; n -= 97) {
            sizes.add(n);
            sizes.add(1);
        }
        CodeReader braid = Notations.reader("braid").orElseThrow();
        LinkBatch.Builder batch = new LinkBatch.Builder();
        for (int n : sizes) {
            read(braid, "2:" + " 1".repeat(n), batch);
        }
        LinkBatch braids = batch.build();
        CodeReader planar = Notations.reader("planar").orElseThrow();
        CodeWriter writer = Notations.writer("planar").orElseThrow();
        for (int i = 0; i < braids.size(); i++) {
            read(planar, writer.write(braids.link(i)), batch);
        }
        LinkBatch again = batch.build();
        for (int i = 0; i < sizes.size(); i++) {
            LinkDiagram diagram = again.link(i);
            assertEquals(sizes.get(i), diagram.crossings());
            assertEquals(braids.link(i), diagram, "size " + sizes.get(i));
        }
    }

    @Test
    void dowkerSequencesOfSlowlyGrowingSizeShareABatch() throws CodeException {
        CodeReader dowker = Notations.reader("dowker").orElseThrow();
        LinkBatch.Builder batch = new LinkBatch.Builder();
        int count = 0;
        for (int n = 1; n <= 201; n += 2) {
            // The closed braid of n twists: passage i + n is the other one through the crossing of passage i.
            StringBuilder code = new StringBuilder();
            for (int odd = 1; odd < 2 * n; odd += 2) {
                int even = (odd + n - 1) % (2 * n) + 1;
                code.append(odd == 1 ? "" : " ").append(even);
            }
            read(dowker, code.toString(), batch);
            count++;
        }
        LinkBatch links = batch.build();
        for (int i = 0; i < count; i++) {
            assertEquals(2 * i + 1, links.link(i).crossings());
        }
    }
}
