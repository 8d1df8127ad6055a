package ropewalk.collection;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Random texts: the slow twin says the same, and good rows survive what stands around them. */
class RandomTextTest {

    /** Pieces out of which nearly everything that matters to a reader arises. */
    private static final List<byte[]> PIECES = pieces("\"", "\"", "\"\"", ",", ",", "\n", "\r\n", "\r", "a", "name", "planar",
            " ", "\t", "\u00e9", "\u20ac", "\ud83e\udea2", "\ufeff", "X[1,2]", "name,notation,code", "\",\"", "\"\n", "a,b,c\n",
            "\0", "\u0080", "x,y,\"z\"\r\n", "=1+1");
    private static final byte[][] BAD = {{(byte) 0xff}, {(byte) 0xc3}, {(byte) 0xe2, (byte) 0x82}, {(byte) 0xed, (byte) 0xa0,
        (byte) 0x80}, {(byte) 0xc0, (byte) 0x80}, {(byte) 0xf4, (byte) 0x90, (byte) 0x80, (byte) 0x80}, {(byte) 0x80}};

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4, 5, 6})
    void theSlowTwinSaysTheSame(int seed) {
        Random random = new Random(seed);
        for (int n = 0; n < 1500; n++) {
            byte[] text = randomText(random, 1 + random.nextInt(n % 10 == 0 ? 200 : 25), seed % 2 == 0 ? 0.05 : 0);
            List<String> header = n % 2 == 0 ? List.of("name", "notation", "code") : List.of("code", "given", "name", "notation");
            byte[] whole = joined((String.join(",", header) + "\n").getBytes(StandardCharsets.UTF_8), text);
            ReadingLimits limits = ReadBack.allSizes(1 << 20).get(random.nextInt(30));
            String where = "seed " + seed + ", case " + n + ", " + limits + ", text " + shown(whole);
            assertEquals(SlowCollection.shapes(whole, header), ReadBack.of(whole, limits).shapes(), where);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {11, 12, 13})
    void allSizesAndAllWaysToArriveSayTheSame(int seed) throws IOException {
        Random random = new Random(seed);
        for (int n = 0; n < 150; n++) {
            byte[] whole = joined("name,notation,code\r\n".getBytes(StandardCharsets.UTF_8), randomText(random, 60, 0.03));
            for (int rowBytes : new int[] {18, 19, 20, 23, 37, 1000}) {
                ReadBack read = ReadBack.ofAllSizes(whole, rowBytes);
                InputStream trickle = new Trickle(whole, new Random(n));
                assertEquals(read, ReadBack.of(trickle, new ReadingLimits(4, 9, rowBytes)), "seed " + seed + ", case " + n);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {21, 22, 23, 24})
    void goodRowsSurviveAnyGarbageLine(int seed) {
        Random random = new Random(seed);
        for (int n = 0; n < 1000; n++) {
            ByteArrayOutputStream text = new ByteArrayOutputStream();
            text.writeBytes("name,notation,code\n".getBytes(StandardCharsets.UTF_8));
            List<String> expected = new ArrayList<>();
            for (int k = 0; k < 12; k++) {
                // After garbage a quoted code: were a quote still open there, X would follow the quote that closes it.
                boolean garbage = random.nextInt(3) == 0;
                if (garbage) {
                    text.writeBytes(garbageLine(random));
                }
                long line = 1 + SlowCollection.breaks(text.toString(StandardCharsets.ISO_8859_1));
                String code = garbage || random.nextBoolean() ? "X[1,2,3,4],X[2,1,4,3]" : random.nextBoolean() ? "" : "aBaB";
                String quotes = code.contains(",") || random.nextBoolean() ? "\"" : "";
                text.writeBytes(("good" + k + ",planar," + quotes + code + quotes + "\n").getBytes(StandardCharsets.UTF_8));
                expected.add(line + " [good" + k + ", planar, " + code + "]");
            }
            byte[] whole = text.toByteArray();
            List<String> found = ReadBack.of(whole, ReadBack.allSizes(1 << 20).get(random.nextInt(30))).shapes();
            found = found.stream().filter(s -> s.contains("good")).toList();
            assertEquals(expected, found, "seed " + seed + ", case " + n + ", text " + shown(whole));
        }
    }

    @Test
    void plainRandomBytesAreReadToTheEnd() {
        for (int seed = 1; seed <= 300; seed++) {
            byte[] noise = new byte[3000];
            new Random(seed).nextBytes(noise);
            byte[] whole = joined("name,notation,code\n".getBytes(StandardCharsets.UTF_8), noise,
                    "\nlast,planar,\"1,2\"\n".getBytes(StandardCharsets.UTF_8));
            List<String> shapes = ReadBack.of(whole, new ReadingLimits(1 + seed % 9, 1 + seed % 700, 1 + seed % 5000 * 20)).shapes();
            assertTrue(shapes.size() > 1, "seed " + seed);
            assertTrue(shapes.get(shapes.size() - 1).endsWith("[last, planar, 1,2]"), "seed " + seed + ": " + shapes);
        }
    }

    /** A line that may hold anything, line breaks of other kinds included, but ends with LF. */
    private static byte[] garbageLine(Random random) {
        byte[] text = randomText(random, 1 + random.nextInt(8), 0.1);
        ByteArrayOutputStream line = new ByteArrayOutputStream();
        for (byte b : text) {
            if (b != '\n' && b != '\r') {
                line.write(b);
            }
        }
        line.write('\n');
        return line.toByteArray();
    }

    private static byte[] randomText(Random random, int pieces, double bad) {
        ByteArrayOutputStream text = new ByteArrayOutputStream();
        for (int k = 0; k < pieces; k++) {
            text.writeBytes(random.nextDouble() < bad ? BAD[random.nextInt(BAD.length)] : PIECES.get(random.nextInt(PIECES.size())));
        }
        return text.toByteArray();
    }

    private static List<byte[]> pieces(String... texts) {
        List<byte[]> all = new ArrayList<>();
        for (String text : texts) {
            all.add(text.getBytes(StandardCharsets.UTF_8));
        }
        return all;
    }

    static byte[] joined(byte[]... parts) {
        ByteArrayOutputStream all = new ByteArrayOutputStream();
        for (byte[] part : parts) {
            all.writeBytes(part);
        }
        return all.toByteArray();
    }

    private static String shown(byte[] text) {
        return ropewalk.collection.internal.Visible.escaped(new String(text, StandardCharsets.ISO_8859_1));
    }

    /** Hands out one to three bytes at a time, and sometimes none. */
    private static final class Trickle extends ByteArrayInputStream {

        private final Random random;

        Trickle(byte[] bytes, Random random) {
            super(bytes);
            this.random = random;
        }

        @Override
        public int read(byte[] b, int off, int len) {
            return super.read(b, off, Math.min(len, random.nextInt(4)));
        }
    }
}
