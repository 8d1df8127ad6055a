package ropewalk.collection;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Every way a row can be bad, one by one: the rows around it survive, and the lines are right. Expected by RFC 4180 and by hand. */
class BadRowsTest {

    private static final String HEAD = "name,notation,code\n";
    private static final String BEFORE = "before,planar,\"X[1,2],X[2,1]\"\n";
    private static final String AFTER = "after,planar,\"X[3,4],X[4,3]\"\n";

    /** Reads a bad row, in line 3, between two good ones; all is well if it is rejected there and nothing else is. */
    private static ReadBack.Entry onlyRejection(byte[] row) {
        byte[] text = RandomTextTest.joined((HEAD + BEFORE).getBytes(StandardCharsets.UTF_8), row,
                ("\n" + AFTER).getBytes(StandardCharsets.UTF_8));
        ReadBack read = ReadBack.ofAllSizes(text, 1 << 20);
        long lines = SlowCollection.breaks(new String(row, StandardCharsets.ISO_8859_1));
        assertEquals(3, read.entries().size(), read::toString);
        assertEquals("2 [before, planar, X[1,2],X[2,1]]", read.shapes().get(0));
        assertEquals(4 + lines + " [after, planar, X[3,4],X[4,3]]", read.shapes().get(2));
        ReadBack.Entry bad = read.entries().get(1);
        assertEquals(3, bad.line());
        return bad;
    }

    private static void assertRejected(String row, int column, String name, String reason) {
        assertRejected(row.getBytes(StandardCharsets.UTF_8), column, name, reason);
    }

    private static void assertRejected(byte[] row, int column, String name, String reason) {
        ReadBack.Entry bad = onlyRejection(row);
        assertEquals(column, bad.column(), bad::toString);
        assertEquals(name, bad.name(), bad::toString);
        assertTrue(bad.reason() != null && bad.reason().contains(reason), bad::toString);
    }

    private static byte[] withBytes(String before, String after, int... bytes) {
        byte[] middle = new byte[bytes.length];
        for (int k = 0; k < bytes.length; k++) {
            middle[k] = (byte) bytes[k];
        }
        return RandomTextTest.joined(before.getBytes(StandardCharsets.UTF_8), middle, after.getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void bytesThatAreNotUtf8() {
        assertRejected(withBytes("n,planar,x", "y", 0xff), 11, "n", "0xFF is not UTF-8");
        assertRejected(withBytes("\u20acn,planar,x", "y", 0xc3), 12, "\u20acn", "0xC3 is not UTF-8");
        assertRejected(withBytes("n,planar,", "", 0xc0, 0x80), 10, "n", "0xC0");
        assertRejected(withBytes("n,planar,", "", 0xe0, 0x80, 0x80), 10, "n", "0xE0");
        assertRejected(withBytes("n,planar,", "", 0xed, 0xa0, 0x80), 10, "n", "0xED");
        assertRejected(withBytes("n,planar,", "", 0xf4, 0x90, 0x80, 0x80), 10, "n", "0xF4");
        assertRejected(withBytes("n,planar,", "", 0xf0, 0x9f, 0xaa), 10, "n", "0xF0");
        assertRejected(withBytes("n,planar,\"", "\"", 0xe2, 0x82), 11, "n", "0xE2");
        assertRejected(withBytes("", ",planar,x", 'n', 0xe9), 2, "n\ufffd", "save the file as UTF-8");
    }

    @Test
    void aWrongByteInQuotesDoesNotEndTheRowAtItsLine() {
        assertRejected(withBytes("n,planar,\"one\n", "two\nthree\"", 0xff), 15, "n", "0xFF");
    }

    @Test
    void aNul() {
        assertRejected("n,planar,a\0b", 11, "n", "NUL");
        assertRejected("n,planar,\"a\0b\"", 12, "n", "NUL");
        assertRejected("\0", 1, "\0", "NUL");
    }

    @Test
    void textAfterAClosingQuote() {
        assertRejected("\"abc\"def,planar,x", 6, "", "ends before 'def,planar,x'");
        assertRejected("n,planar,\"abc\"def", 15, "n", "doubled");
        assertRejected("n,\"planar\" ,x", 11, "n", "only a comma");
    }

    @Test
    void aQuoteInAFieldThatIsNotQuoted() {
        assertRejected("n,planar,a\"b", 11, "n", "put the field in quotes and double the quote");
        assertRejected("n,planar,x\"", 11, "n", "put the field in quotes");
        assertRejected("n,planar, \"x\"", 11, "n", "remove the blank");
        assertRejected(" \"n\",planar,x", 2, "", "remove the blank");
    }

    @Test
    void tooFewAndTooManyFields() {
        assertRejected("n,planar", 9, "n", "2 fields found, the header has 3");
        assertRejected("n", 2, "n", "1 field found, the header has 3");
        assertRejected("\"\"", 3, "", "1 field found");
        assertRejected("n,planar,X[1,2],X[2,1]", 13, "n", "6 fields found, the header has 3; "
                + "a field that contains commas, most likely the code, must stand in quotes");
        assertRejected("n,planar,\"x\ny\",", 15, "n", "4 fields found");
    }

    @Test
    void anEmptyName() {
        assertRejected(",planar,x", 1, "", "name is empty");
        assertRejected("\" \t\",planar,x", 2, " \t", "name is empty");
        assertRejected("\"\n\",planar,x", 2, "\n", "name is empty");
    }

    @Test
    void theHeaderOnceMore() {
        assertRejected("name,notation,code", 1, "name", "repeats the header");
        assertRejected("\"name\",\"notation\",\"code\"", 1, "name", "repeats the header");
        assertRejected("\ufeffname,notation,code", 1, "\ufeffname", "repeats the header");
        assertRejected("code,name,notation", 1, "code", "repeats the header");
        assertRejected("name,notation,code,given", 1, "name", "repeats the header");
    }

    @Test
    void anUnclosedQuoteEndsAtItsLineAndTheNextHasQuotes() {
        assertRejected("n,planar,\"X[1,2]", 10, "n", "the quote opened here is not closed");
        assertRejected("\"n,planar,X", 1, "", "the quote opened here is not closed");
    }

    @Test
    void anUnclosedQuoteWithNoQuoteUpToTheEnd() {
        ReadBack read = ReadBack.ofAllSizes(HEAD + "a,braid,\"aB\nb,braid,aB\r\nc,braid,Ab\n\nd,braid,bb");
        assertEquals(List.of("2:9 rejected", "3 [b, braid, aB]", "4 [c, braid, Ab]", "6 [d, braid, bb]"), read.shapes());
    }

    @Test
    void unclosedQuotesInSequence() {
        ReadBack read = ReadBack.ofAllSizes(HEAD + "a,planar,\"X\nb,planar,\"Y\nc,planar,\"Z\n" + AFTER);
        assertEquals(List.of("2:10 rejected", "3:10 rejected", "4:10 rejected", "5 [after, planar, X[3,4],X[4,3]]"), read.shapes());
        ReadBack twice = ReadBack.ofAllSizes(HEAD + "a,planar,\"X\nb,planar,\"Y\nc,braid,aB\nd,braid,bA");
        assertEquals(List.of("2:10 rejected", "3:10 rejected", "4 [c, braid, aB]", "5 [d, braid, bA]"), twice.shapes());
    }

    @Test
    void anUnclosedQuoteAfterAFieldOfSeveralLines() {
        ReadBack read = ReadBack.ofAllSizes(HEAD + "\"a\nb\",planar,\"X\nc,braid,aB\n" + AFTER);
        assertEquals(List.of("2:14 rejected", "4 [c, braid, aB]", "5 [after, planar, X[3,4],X[4,3]]"), read.shapes());
        assertEquals("a\nb", read.rejections().get(0).name());
    }

    @Test
    void anUnclosedQuoteAtTheVeryEnd() {
        ReadBack read = ReadBack.ofAllSizes(HEAD + BEFORE + "n,planar,\"");
        assertEquals(List.of("2 [before, planar, X[1,2],X[2,1]]", "3:10 rejected"), read.shapes());
    }

    @Test
    void lineBreaksOfAllKindsAndBlankLines() {
        ReadBack read = ReadBack.ofAllSizes("\ufeff\r\n \t\rname,notation,code\r\r"
                + "a,p,\"1\r2\r\n3\n4\"\r\n\r\n\t\n\"b\",\"p\",\"\"\"\"\rc,p,");
        assertEquals(List.of("5 [a, p, 1\r2\r\n3\n4]", "11 [b, p, \"]", "12 [c, p, ]"), read.shapes());
    }

    @Test
    void otherColumnsAnywhere() {
        ReadBack read = ReadBack.ofAllSizes("year,code,\"a \"\"b\"\"\",name,notation\n1999,x,,n,p\n,,\"\",m,\n");
        assertEquals(List.of("year", "code", "a \"b\"", "name", "notation"), read.header());
        assertEquals(List.of("2 [1999, x, , n, p]", "3 [, , , m, ]"), read.shapes());
    }

    @Test
    void reasonsAreOneLineWithoutControls() {
        String row = "n,planar,\"a\"\u0007\u001b[31m\t\u202e\u2028";
        ReadBack.Entry bad = onlyRejection(row.getBytes(StandardCharsets.UTF_8));
        assertTrue(bad.reason().contains("'\\u0007\\u001B[31m\\t\\u202E\\u2028'"), bad::toString);
        assertTrue(new Rejection("f", 1, 1, "", "a\r\nb\0").reason().equals("a\\r\\nb\\u0000"));
    }
}
