package ropewalk.collection.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import org.junit.jupiter.api.Test;

/** Against the decoder of the JDK. */
class Utf8Test {

    private static final int[] EDGES = {0x00, 0x41, 0x7f, 0x80, 0x8f, 0x90, 0x9f, 0xa0, 0xbf, 0xc0, 0xff};

    private final CharsetDecoder decoder = StandardCharsets.UTF_8.newDecoder();
    private final CharBuffer chars = CharBuffer.allocate(2);

    @Test
    void agreesWithTheDecoder() {
        byte[] b = new byte[4];
        for (int lead = 0; lead < 256; lead++) {
            b[0] = (byte) lead;
            compare(b, 1);
            for (int second = 0; second < 256; second++) {
                b[1] = (byte) second;
                compare(b, 2);
                for (int third : EDGES) {
                    b[2] = (byte) third;
                    compare(b, 3);
                    for (int fourth : EDGES) {
                        b[3] = (byte) fourth;
                        compare(b, 4);
                    }
                }
            }
        }
    }

    private void compare(byte[] b, int to) {
        int expected = decoded(b, to);
        int found = Utf8.length(b, 0, to);
        assertEquals(expected, found, () -> String.format("%02x %02x %02x %02x, first %d", b[0], b[1], b[2], b[3], to));
    }

    /** The length of the first character, CUT if some bytes after these would make one, else INVALID. */
    private int decoded(byte[] b, int to) {
        for (int n = 1; n <= to; n++) {
            chars.clear();
            ByteBuffer in = ByteBuffer.wrap(b, 0, n);
            CoderResult result = decoder.reset().decode(in, chars, false);
            if (result.isError()) {
                return Utf8.INVALID;
            }
            if (in.position() > 0) {
                return n;
            }
        }
        // The decoder asks for more bytes also where none can help.
        byte[] longer = Arrays.copyOf(b, to + 1);
        for (int edge : EDGES) {
            longer[to] = (byte) edge;
            if (to < 4 && decoded(longer, to + 1) != Utf8.INVALID) {
                return Utf8.CUT;
            }
        }
        return Utf8.INVALID;
    }
}
