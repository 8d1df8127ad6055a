package ropewalk.collection;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** Places and values inside a block. Expected by counting characters by hand. */
class RecordBlockTest {

    private static RecordBlock block(String text) throws IOException {
        try (CollectionReader reader = CollectionReader.open(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)),
                "f.csv", ReadingLimits.standard())) {
            return reader.next();
        }
    }

    @Test
    void columnsCountCharactersFromTheBeginningOfTheRow() throws IOException {
        RecordBlock block = block("name,notation,code\nfirst,p,x\n\u20ac\ud83e\udea2,p,\"\u00e9\"\"\nX[1]\"\n");
        assertEquals(2, block.size());
        assertEquals(1, block.columnAt(1, block.rowStart(1)));
        assertEquals(4, block.columnAt(1, block.start(1, 1)));
        assertEquals(7, block.columnAt(1, block.start(1, 2)));
        assertEquals("\u00e9\"\nX[1]", block.code(1).toString());
        // Bytes of the value: two of é, the quote, the line break, X. In the row: é at 7, quotes at 8 and 9, break 10, X 11.
        assertEquals(7, block.columnInValue(1, 2, 0));
        assertEquals(8, block.columnInValue(1, 2, 2));
        assertEquals(10, block.columnInValue(1, 2, 3));
        assertEquals(11, block.columnInValue(1, 2, 4));
        assertEquals(new Rejection("f.csv", 3, 11, "\u20ac\ud83e\udea2", "why"), block.rejectCode(1, 4, "why"));
        assertEquals(new Rejection("f.csv", 2, 7, "first", "why"), block.rejectNotation(0, "why"));
        assertEquals(9, block.rejectCode(0, 0, "why").column());
    }

    @Test
    void valuesAreCopiedOnlyWhereQuotesAreDoubled() throws IOException {
        RecordBlock block = block("name,notation,code,k\na,p,\"1,2\",\n\"b\",\"\",\"\"\"\"\"1\"\"\",\" z \"\n");
        assertSame(block.bytes(), block.code(0).bytes());
        assertEquals("1,2", block.code(0).toString());
        assertEquals("\"\"1\"", block.code(1).toString());
        assertEquals(4, block.code(1).length());
        assertTrue(block.hasDoubledQuotes(1, 2));
        assertFalse(block.hasDoubledQuotes(0, 2));
        assertTrue(block.isQuoted(1, 0));
        assertTrue(block.isQuoted(1, 1));
        assertFalse(block.isQuoted(0, 0));
        assertFalse(block.isQuoted(0, 3));
        assertEquals("", block.notation(1).toString());
        assertEquals("b", block.name(1));
        assertEquals(" z ", block.text(1, 3));
        assertEquals(1, block.header().keptSize());
        assertEquals(3, block.header().kept(0));
    }

    @Test
    void rejectionsKeepTheirPlaceAndTheirName() throws IOException {
        RecordBlock block = block("name,notation,code\nbad,p\na,p,\n\"\t\"\"=1\r\n2\",p\nbad2,p\nb,p,\n");
        assertEquals(2, block.size());
        assertEquals(3, block.rejections().size());
        assertEquals(0, block.recordsBefore(0));
        assertEquals(1, block.recordsBefore(1));
        assertEquals(1, block.recordsBefore(2));
        assertEquals("\t\"=1\r\n2", block.rejections().get(1).name());
        assertEquals(7, block.line(1));
    }

    @Test
    void placesOutsideAreRefused() throws IOException {
        RecordBlock block = block("name,notation,code\na,p,x\n");
        assertThrows(IndexOutOfBoundsException.class, () -> block.start(1, 0));
        assertThrows(IndexOutOfBoundsException.class, () -> block.start(0, 3));
        assertThrows(IndexOutOfBoundsException.class, () -> block.end(0, -1));
        assertThrows(IndexOutOfBoundsException.class, () -> block.columnAt(0, 99));
        assertThrows(IllegalArgumentException.class, () -> new ReadingLimits(0, 1, 1));
        assertThrows(IllegalArgumentException.class, () -> new Rejection("f", -1, 0, "", ""));
    }
}
