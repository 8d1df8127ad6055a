package ropewalk.structure;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.notation.CodeException;
import ropewalk.diagram.notation.Notations;

/** Closed braids for the tests of this bundle; strands without letters are circles, others may fall into pieces. */
final class Braids {

    private Braids() {
    }

    static LinkDiagram of(String word) {
        byte[] text = word.getBytes(StandardCharsets.UTF_8);
        LinkBatch.Builder batch = new LinkBatch.Builder();
        try {
            Notations.reader("braid").orElseThrow().read(text, 0, text.length, batch);
        } catch (CodeException e) {
            throw new AssertionError(word, e);
        }
        return batch.build().link(0);
    }

    static List<String> random() {
        List<String> words = new ArrayList<>(List.of("1:", "3:", "2: 1", "2: 1 -1", "2: 1 1 1", "3: 1 -2 1 -2",
                "5: 1 1 1 -3 -3", "6: 1 -1 3 3 3 -5"));
        for (int seed = 0; seed < 200; seed++) {
            Random random = new Random(seed);
            int strands = 2 + random.nextInt(5);
            StringBuilder word = new StringBuilder(strands + ":");
            for (int k = random.nextInt(30); k > 0; k--) {
                word.append(' ').append((1 + random.nextInt(strands - 1)) * (random.nextBoolean() ? 1 : -1));
            }
            words.add(word.toString());
        }
        return words;
    }
}
