package ropewalk.collection;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Files that are no collection are one rejection, for every size of window. */
class UnreadableFilesTest {

    private static void assertUnreadable(byte[] text, long line, int column, String reason) {
        for (ReadingLimits limits : ReadBack.allSizes(1 << 20)) {
            ClosingStream in = new ClosingStream(text);
            Rejection rejection = assertThrows(UnreadableCollectionException.class,
                    () -> CollectionReader.open(in, "f.csv", limits)).rejection();
            assertTrue(in.closed, "left open");
            assertEquals("f.csv", rejection.file());
            assertEquals(line, rejection.line(), rejection::toString);
            assertEquals(column, rejection.column(), rejection::toString);
            assertTrue(rejection.reason().contains(reason), rejection::toString);
        }
    }

    private static void assertUnreadable(String text, long line, int column, String reason) {
        assertUnreadable(text.getBytes(StandardCharsets.UTF_8), line, column, reason);
    }

    @Test
    void emptyFiles() {
        assertUnreadable("", 0, 0, "is empty");
        assertUnreadable("\ufeff", 0, 0, "is empty");
        assertUnreadable("\n\r\n  \n", 0, 0, "name,notation,code");
    }

    @Test
    void utf16() {
        for (String name : new String[] {"UTF-16LE", "UTF-16BE", "UTF-32LE", "UTF-32BE"}) {
            byte[] bare = "name,notation,code\r\n".getBytes(Charset.forName(name));
            assertUnreadable(bare, 1, name.endsWith("LE") ? 2 : 1, "save the file as UTF-8");
        }
        assertUnreadable("\ufeffname,notation,code".getBytes(StandardCharsets.UTF_16LE), 1, 1, "UTF-16; save the file as UTF-8");
        assertUnreadable("\ufeffname,notation,code".getBytes(StandardCharsets.UTF_16BE), 1, 1, "UTF-16; save the file as UTF-8");
        assertUnreadable(new byte[5000], 1, 1, "save the file as UTF-8");
    }

    @Test
    void otherFormats() {
        assertUnreadable("PK\u0003\u0004\0\0", 1, 1, "save the table as CSV");
        assertUnreadable(new byte[] {0x1f, (byte) 0x8b, 8, 0}, 1, 1, "decompress");
    }

    @Test
    void wrongColumns() {
        assertUnreadable("a,b\n1,2\n", 1, 1, "no column 'name' among 'a', 'b'");
        assertUnreadable("\nname,code\n", 2, 1, "no column 'notation'");
        assertUnreadable("name,notation,code,name\n", 1, 20, "two columns are called 'name'; rename");
        assertUnreadable("name,notation,code,\u20ac,x,\u20ac\n", 1, 24, "two columns are called '\u20ac'");
        assertUnreadable("name,notation,code,,\n", 1, 21, "two columns have no name");
        assertUnreadable("name;notation;code\n", 1, 1, "separate the columns by commas");
        assertUnreadable("name\tnotation\tcode\n", 1, 1, "separate the columns by commas");
        assertUnreadable("Name,notation,code\n", 1, 1, "column 'Name' found; call it 'name'");
        assertUnreadable("name, notation,code\n", 1, 1, "column ' notation' found; call it 'notation'");
    }

    @Test
    void malformedHeaders() {
        assertUnreadable("name,notation,\"code\nx,y,z\n", 1, 15, "not closed");
        assertUnreadable("name,nota\"tion,code\n", 1, 10, "quote inside a field");
        assertUnreadable(new byte[] {'n', 'a', 'm', (byte) 0xe9, ',', 'x', '\n'}, 1, 4, "0xE9 is not UTF-8");
        assertUnreadable("x".repeat((1 << 20) + 7), 1, (1 << 20) + 1, "more than the 1048576 bytes");
    }

    @Test
    void filesThatAreNotThere(@TempDir Path folder) throws IOException {
        Rejection missing = assertThrows(UnreadableCollectionException.class,
                () -> CollectionReader.open(folder.resolve("none.csv"))).rejection();
        assertEquals(folder.resolve("none.csv").toString(), missing.file());
        assertTrue(missing.reason().contains("does not exist"), missing::toString);
        Rejection notFile = assertThrows(UnreadableCollectionException.class, () -> CollectionReader.open(folder)).rejection();
        assertTrue(notFile.reason().contains("is a folder"), notFile::toString);
        Path good = Files.writeString(folder.resolve("good.csv"), "name,notation,code\nn,p,x");
        try (CollectionReader reader = CollectionReader.open(good)) {
            RecordBlock block = reader.next();
            assertEquals("n", block.name(0));
            assertEquals(good.toString(), block.file());
            assertNull(reader.next());
            assertNull(reader.next());
        }
    }

    @Test
    void anErrorOnTheWayKeepsAllWholeRowsBeforeIt() throws IOException {
        byte[] text = "name,notation,code\na,p,x\nb,p\nc,p,\"y\"\nd,p,z".getBytes(StandardCharsets.UTF_8);
        for (ReadingLimits limits : ReadBack.allSizes(1 << 20)) {
            List<ReadBack.Entry> entries = new ArrayList<>();
            try (CollectionReader reader = CollectionReader.open(new BreakingStream(text), "f.csv", limits)) {
                UnreadableCollectionException broken = assertThrows(UnreadableCollectionException.class, () -> {
                    for (RecordBlock block = reader.next(); block != null; block = reader.next()) {
                        ReadBack.addAll(entries, block);
                    }
                });
                assertEquals(5, broken.rejection().line());
                assertTrue(broken.rejection().reason().contains("disk gone"), broken::getMessage);
                assertNull(reader.next());
            }
            assertEquals(List.of("2 [a, p, x]", "3:4 rejected", "4 [c, p, y]"),
                    entries.stream().map(ReadBack.Entry::shape).toList(), limits::toString);
        }
        Rejection header = assertThrows(UnreadableCollectionException.class, () -> CollectionReader.open(
                new BreakingStream("name,nota".getBytes(StandardCharsets.UTF_8)), "f.csv", ReadingLimits.standard())).rejection();
        assertEquals(1, header.line());
    }

    private static final class ClosingStream extends ByteArrayInputStream {

        private boolean closed;

        ClosingStream(byte[] bytes) {
            super(bytes);
        }

        @Override
        public void close() {
            closed = true;
        }
    }

    private static final class BreakingStream extends InputStream {

        private final ByteArrayInputStream whole;

        BreakingStream(byte[] bytes) {
            whole = new ByteArrayInputStream(bytes);
        }

        @Override
        public int read() throws IOException {
            int b = whole.read();
            if (b < 0) {
                throw new IOException("disk gone");
            }
            return b;
        }
    }
}
