package ropewalk.collection;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.SequenceInputStream;
import java.nio.charset.StandardCharsets;
import java.util.Collections;
import java.util.List;
import java.util.Random;

/** Run in a virtual machine of its own with little memory: reads one kind of huge file and prints what came out. */
final class HugeInput {

    private HugeInput() {
    }

    /** Arguments: the kind, the megabytes. Prints records, rejections, last line, last name. */
    public static void main(String[] arguments) throws IOException {
        long bytes = Long.parseLong(arguments[1]) << 20;
        List<InputStream> parts = List.of(text("name,notation,code\n"), body(arguments[0], bytes),
                text("\nlast,planar,\"X[1,2]\"\n"));
        long records = 0;
        long rejections = 0;
        String last = "";
        try (CollectionReader reader = CollectionReader.open(new SequenceInputStream(Collections.enumeration(parts)), "huge.csv",
                ReadingLimits.standard())) {
            for (RecordBlock block = reader.next(); block != null; block = reader.next()) {
                records += block.size();
                rejections += block.rejections().size();
                if (block.size() > 0) {
                    last = block.line(block.size() - 1) + " " + block.name(block.size() - 1);
                }
            }
        }
        System.out.println(records + " records, " + rejections + " rejections, line " + last);
    }

    private static InputStream body(String kind, long bytes) {
        return switch (kind) {
            case "line" -> new Repeated("x", bytes);
            case "fields" -> new Repeated("x,", bytes);
            case "nuls" -> new Repeated("\0", bytes);
            case "quoted" -> new SequenceInputStream(text("n,planar,\""), new Repeated("x", bytes));
            case "unclosed" -> new SequenceInputStream(text("n,planar,\"\n"), new Repeated("n,braid,aBaBaBa\n", bytes));
            case "all unclosed" -> new Repeated("n,planar,\"X[1,2]\n", bytes / 17 * 17);
            case "unclosed with pairs" -> new SequenceInputStream(text("n,planar,\"\n"),
                    new Repeated("n,\"\",aBaBaBaB\n", bytes / 14 * 14));
            case "long rows" -> new Repeated("n,planar,\"" + "X[1,2]".repeat(1_300_000) + "\"\n", bytes / 7_800_012 * 7_800_012, 1);
            case "long names" -> new Repeated("\"" + "n\u00e9".repeat(2_600_000) + "\",planar\n", bytes / 7_800_010 * 7_800_010, 1);
            case "blank" -> new Repeated("\n", bytes);
            case "noise" -> new Noise(bytes);
            default -> throw new IllegalArgumentException(kind);
        };
    }

    private static InputStream text(String text) {
        return new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8));
    }

    /** A pattern over and over, whole copies of it until the length is reached. */
    private static final class Repeated extends InputStream {

        private final byte[] pattern;
        private final long length;
        private long at;

        Repeated(String pattern, long length) {
            this(pattern, length, 4096);
        }

        Repeated(String pattern, long length, int copies) {
            this.pattern = pattern.repeat(copies).getBytes(StandardCharsets.UTF_8);
            this.length = length;
        }

        @Override
        public int read() {
            throw new UnsupportedOperationException("the reader reads many bytes at a time");
        }

        @Override
        public int read(byte[] b, int off, int len) {
            if (at == length) {
                return -1;
            }
            int start = (int) (at % pattern.length);
            int n = (int) Math.min(Math.min(len, pattern.length - start), length - at);
            System.arraycopy(pattern, start, b, off, n);
            at += n;
            return n;
        }
    }

    /** Random bytes, always the same. */
    private static final class Noise extends InputStream {

        private final Random random = new Random(51);
        private final byte[] chunk = new byte[1 << 16];
        private long left;

        Noise(long length) {
            left = length;
        }

        @Override
        public int read() {
            throw new UnsupportedOperationException("the reader reads many bytes at a time");
        }

        @Override
        public int read(byte[] b, int off, int len) {
            if (left == 0) {
                return -1;
            }
            random.nextBytes(chunk);
            int n = (int) Math.min(Math.min(len, chunk.length), left);
            System.arraycopy(chunk, 0, b, off, n);
            left -= n;
            return n;
        }
    }
}
