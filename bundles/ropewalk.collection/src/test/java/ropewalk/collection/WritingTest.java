package ropewalk.collection;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Rows, rejected.csv and files that are replaced. */
class WritingTest {

    private static String text(CsvRows rows) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        rows.writeTo(out);
        return out.toString(StandardCharsets.UTF_8);
    }

    @Test
    void quotesOnlyWhereNeeded() throws IOException {
        CsvRows rows = new CsvRows();
        rows.field("a b").field(" x ").field("=1+1").field("a,b").field("a\"b").field("a\nb").field("\r").empty().field("").endRow();
        assertEquals("a b, x ,=1+1,\"a,b\",\"a\"\"b\",\"a\nb\",\"\r\",,\r\n", text(rows));
        byte[] bytes = "..a\"b,..".getBytes(StandardCharsets.US_ASCII);
        rows.clear();
        rows.field(bytes, 0, 3).field(bytes, 2, 5).field(bytes, 4, 6).endRow();
        assertEquals("..a,\"a\"\"b\",\"b,\"\r\n", text(rows));
    }

    @Test
    void aRowOfOneEmptyFieldIsNoBlankLine() throws IOException {
        CsvRows rows = new CsvRows();
        rows.field("").endRow().empty().endRow().empty().empty().endRow().field(new byte[0], 0, 0).endRow();
        assertEquals("\"\"\r\n\"\"\r\n,\r\n\"\"\r\n", text(rows));
    }

    @Test
    void integersAndDecimals() throws IOException {
        Random random = new Random(31);
        for (int n = 0; n < 3000; n++) {
            long value = n == 0 ? Long.MIN_VALUE : n == 1 ? Long.MAX_VALUE : random.nextLong() >> random.nextInt(64);
            int decimals = 1 + random.nextInt(18);
            CsvRows rows = new CsvRows();
            rows.field(value).decimal(value, decimals).endRow();
            assertEquals(value + "," + BigDecimal.valueOf(value, decimals).toPlainString() + "\r\n", text(rows), "seed 31, case " + n);
        }
        CsvRows rows = new CsvRows();
        assertEquals("0,0.000,-0.001,12.340\r\n", text(rows.field(0).decimal(0, 3).decimal(-1, 3).decimal(12340, 3).endRow()));
        assertThrows(IllegalArgumentException.class, () -> rows.decimal(1, 0));
        assertThrows(IllegalArgumentException.class, () -> rows.decimal(1, 19));
    }

    @Test
    void allCharactersAndLoneSurrogates() throws IOException {
        StringBuilder all = new StringBuilder();
        for (int point = 0; point <= 0x10ffff; point += point < 0x3000 ? 1 : 37) {
            if (point < 0xd800 || point > 0xdfff) {
                all.appendCodePoint(point);
            }
        }
        CsvRows rows = new CsvRows();
        rows.field(all).endRow();
        assertEquals("\"" + all.toString().replace("\"", "\"\"") + "\"\r\n", text(rows));
        rows.clear();
        rows.field("a\ud800b\udc00\ud83e").endRow();
        assertEquals("a\ufffdb\ufffd\ufffd\r\n", text(rows));
    }

    @Test
    void rejectedFile() throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (RejectedFile file = new RejectedFile(out)) {
            file.add(new Rejection("my \"data\", 1.csv", 12, 5, "=a\n\u001b\"", "one, two"));
            file.add(new Rejection("none.csv", 0, 0, "", "does not exist"));
            assertEquals(2, file.count());
            file.flush();
            assertTrue(out.size() > 40);
        }
        assertEquals("file,line,column,name,reason\r\n"
                + "\"my \"\"data\"\", 1.csv\",12,5,\"=a\n\u001b\"\"\",\"one, two\"\r\n"
                + "none.csv,,,,does not exist\r\n", out.toString(StandardCharsets.UTF_8));
    }

    @Test
    void aFileIsReplacedOnlyWhenFinished(@TempDir Path folder) throws IOException {
        Path target = Files.writeString(folder.resolve("results.csv"), "old");
        try (ReplacedFile file = ReplacedFile.begin(target)) {
            file.output().write("new".getBytes(StandardCharsets.UTF_8));
            assertEquals("old", Files.readString(target));
        }
        assertEquals(List.of("results.csv"), names(folder));
        assertEquals("old", Files.readString(target));
        try (ReplacedFile file = ReplacedFile.begin(target); ReplacedFile other = ReplacedFile.begin(target)) {
            file.output().write("new".getBytes(StandardCharsets.UTF_8));
            other.output().write("other".getBytes(StandardCharsets.UTF_8));
            file.finish();
            assertEquals("new", Files.readString(target));
        }
        assertEquals("new", Files.readString(target));
        assertEquals(List.of("results.csv"), names(folder));
        assertFalse(Files.exists(folder.resolve("results.csv.0.part")));
    }

    @Test
    void aFinishedFileThatCannotBePutInPlaceIsKept(@TempDir Path folder) throws IOException {
        Path target = Files.createDirectory(folder.resolve("taken"));
        Files.writeString(target.resolve("inside"), "x");
        try (ReplacedFile file = ReplacedFile.begin(target)) {
            file.output().write("new".getBytes(StandardCharsets.UTF_8));
            IOException failure = assertThrows(IOException.class, file::finish);
            assertTrue(failure.getMessage().contains("taken.0.part"), failure::getMessage);
        }
        assertEquals("new", Files.readString(folder.resolve("taken.0.part")));
    }

    private static List<String> names(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(p -> p.getFileName().toString()).sorted().toList();
        }
    }
}
