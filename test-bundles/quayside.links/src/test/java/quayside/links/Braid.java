package quayside.links;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.notation.CodeException;
import ropewalk.diagram.notation.Notations;

/** A braid word, with the moves of Markov (1936) that keep the link type of its closure. */
record Braid(int strands, int... word) {

    static Braid random(Random random, int mostStrands, int mostLetters) {
        int strands = 1 + random.nextInt(mostStrands);
        int letters = strands == 1 ? 0 : random.nextInt(mostLetters + 1);
        return new Braid(strands, random.ints(letters, 1, Math.max(2, strands))
                .map(letter -> random.nextBoolean() ? letter : -letter).toArray());
    }

    /** A random one of: conjugation, stabilisation, cancelling letters put in, a braid relation where one fits. */
    Braid moved(Random random) {
        int letter = strands == 1 ? 0 : (1 + random.nextInt(strands - 1)) * (random.nextBoolean() ? 1 : -1);
        int place = random.nextInt(word.length + 1);
        switch (random.nextInt(4)) {
            case 0:
                return letter == 0 ? this : new Braid(strands, joined(new int[] {letter}, word, new int[] {-letter}));
            case 1:
                return new Braid(strands + 1, joined(word, new int[] {random.nextBoolean() ? strands : -strands}));
            case 2:
                return letter == 0 ? this : new Braid(strands, joined(Arrays.copyOf(word, place),
                        new int[] {letter, -letter}, Arrays.copyOfRange(word, place, word.length)));
            default:
                return related(place);
        }
    }

    /** The first place from a given one on where letters commute or a b a = b a b holds is rewritten. */
    private Braid related(int from) {
        int[] w = word.clone();
        for (int i = from; i + 1 < w.length; i++) {
            int a = w[i];
            int b = w[i + 1];
            int distance = Math.abs(Math.abs(a) - Math.abs(b));
            if (distance > 1) {
                w[i] = b;
                w[i + 1] = a;
                return new Braid(strands, w);
            }
            if (distance == 1 && i + 2 < w.length && w[i + 2] == a && (a > 0) == (b > 0)) {
                w[i] = b;
                w[i + 1] = a;
                w[i + 2] = b;
                return new Braid(strands, w);
            }
        }
        return this;
    }

    private static int[] joined(int[]... parts) {
        return Arrays.stream(parts).flatMapToInt(IntStream::of).toArray();
    }

    LinkDiagram closure() {
        String code = this.toString();
        byte[] bytes = code.getBytes(StandardCharsets.UTF_8);
        LinkBatch.Builder batch = new LinkBatch.Builder();
        try {
            Notations.reader("braid").orElseThrow().read(bytes, 0, bytes.length, batch);
        } catch (CodeException fault) {
            throw new AssertionError(code, fault);
        }
        return batch.build().link(0);
    }

    @Override
    public String toString() {
        return strands + ": " + Arrays.stream(word).mapToObj(Integer::toString).collect(Collectors.joining(" "));
    }
}
