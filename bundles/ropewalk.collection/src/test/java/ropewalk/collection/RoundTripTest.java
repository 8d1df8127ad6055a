package ropewalk.collection;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.writer.CsvWriter;
import de.siegmar.fastcsv.writer.LineDelimiter;
import de.siegmar.fastcsv.writer.QuoteStrategies;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What was written is what is read, and a general-purpose library reads and writes the same. */
class RoundTripTest {

    private static final String[] PIECES = {"a", "Z", "7", ",", "\"", "\n", "\r", "\r\n", " ", "\t", "=1+1", "+", "-", "@", "\\",
        "\u001b[31m", "\u0007", "\u007f", "\u0085", "\u2028", "\ufeff", "\u202e", "e\u0301", "\u00e9", "\u20ac", "\ud83e\udea2",
        "\uffff", "'", ";", "X[1,2,3,4]", "\"\"", "#", "NULL"};

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4})
    void whatIsWrittenIsRead(int seed) throws IOException {
        Random random = new Random(seed);
        for (int n = 0; n < 200; n++) {
            List<List<String>> table = table(random);
            byte[] text = written(table);
            String where = "seed " + seed + ", case " + n;
            ReadBack read = ReadBack.of(text, ReadBack.allSizes(1 << 20).get(random.nextInt(30)));
            assertEquals(table.get(0), read.header(), where);
            assertEquals(table.subList(1, table.size()), read.entries().stream().map(ReadBack.Entry::fields).toList(), where);
            assertEquals(table, read(text), where);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {5, 6, 7, 8})
    void whatTheLibraryWritesIsRead(int seed) throws IOException {
        Random random = new Random(seed);
        for (int n = 0; n < 200; n++) {
            List<List<String>> table = table(random);
            StringWriter text = new StringWriter();
            CsvWriter.CsvWriterBuilder builder = CsvWriter.builder()
                    .lineDelimiter(List.of(LineDelimiter.LF, LineDelimiter.CR, LineDelimiter.CRLF).get(n % 3));
            try (CsvWriter writer = (n % 2 == 0 ? builder : builder.quoteStrategy(QuoteStrategies.ALWAYS)).build(text)) {
                table.forEach(writer::writeRecord);
            }
            byte[] bytes = text.toString().getBytes(StandardCharsets.UTF_8);
            String where = "seed " + seed + ", case " + n;
            ReadBack read = ReadBack.of(bytes, ReadBack.allSizes(1 << 20).get(random.nextInt(30)));
            assertEquals(table.get(0), read.header(), where);
            assertEquals(table.subList(1, table.size()), read.entries().stream().map(ReadBack.Entry::fields).toList(), where);
            assertEquals(startingLines(bytes), read.entries().stream().map(ReadBack.Entry::line).toList(), where);
            copiedFieldsKeepTheirValue(bytes, table, where);
        }
    }

    /** Copies raw fields and values; read by the library both give the table again. */
    private static void copiedFieldsKeepTheirValue(byte[] bytes, List<List<String>> table, String where) throws IOException {
        CsvRows raw = new CsvRows();
        CsvRows values = new CsvRows();
        try (CollectionReader reader = CollectionReader.open(new ByteArrayInputStream(bytes), "f", new ReadingLimits(3, 50, 9999))) {
            for (String column : reader.header().columns()) {
                raw.field(column);
                values.field(column);
            }
            raw.endRow();
            values.endRow();
            for (RecordBlock block = reader.next(); block != null; block = reader.next()) {
                for (int i = 0; i < block.size(); i++) {
                    for (int f = 0; f < block.fieldCount(); f++) {
                        raw.field(block, i, f);
                        values.field(block.value(i, f));
                    }
                    raw.endRow();
                    values.endRow();
                }
            }
        }
        assertEquals(table, read(bytes(raw)), where);
        assertEquals(table, read(bytes(values)), where);
        assertArrayEquals(written(table), bytes(values), where);
    }

    private static List<List<String>> table(Random random) {
        List<String> header = new ArrayList<>(List.of("name", "notation", "code"));
        for (int k = random.nextInt(4); k > 0; k--) {
            header.add(random.nextInt(header.size() + 1), k + cell(random));
        }
        List<List<String>> table = new ArrayList<>(List.of(header));
        for (int r = random.nextInt(12); r > 0; r--) {
            List<String> row = new ArrayList<>();
            for (int f = 0; f < header.size(); f++) {
                row.add(f == header.indexOf("name") ? "n" + cell(random) : cell(random));
            }
            table.add(row);
        }
        return table;
    }

    private static String cell(Random random) {
        StringBuilder text = new StringBuilder();
        for (int k = random.nextInt(6); k > 0; k--) {
            text.append(PIECES[random.nextInt(PIECES.length)]);
        }
        return text.toString();
    }

    private static byte[] written(List<List<String>> table) throws IOException {
        CsvRows rows = new CsvRows();
        for (List<String> row : table) {
            row.forEach(rows::field);
            rows.endRow();
        }
        return bytes(rows);
    }

    private static byte[] bytes(CsvRows rows) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        rows.writeTo(out);
        return out.toByteArray();
    }

    private static List<List<String>> read(byte[] text) throws IOException {
        List<List<String>> table = new ArrayList<>();
        try (CsvReader<CsvRecord> reader = CsvReader.builder().ofCsvRecord(new String(text, StandardCharsets.UTF_8))) {
            reader.forEach(record -> table.add(record.getFields()));
        }
        return table;
    }

    private static List<Long> startingLines(byte[] text) throws IOException {
        List<Long> lines = new ArrayList<>();
        try (CsvReader<CsvRecord> reader = CsvReader.builder().ofCsvRecord(new String(text, StandardCharsets.UTF_8))) {
            reader.forEach(record -> lines.add(record.getStartingLineNumber()));
        }
        return lines.subList(1, lines.size());
    }
}
