package ropewalk.collection;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Files several times larger than the memory, which is 64 MB here: read to the end, in time that is not quadratic. */
class HugeInputTest {

    private static final int MEGABYTES = 192;
    private static final long BYTES = (long) MEGABYTES << 20;

    private static String run(String kind) throws IOException, InterruptedException {
        Process process = new ProcessBuilder(Path.of(System.getProperty("java.home"), "bin", "java").toString(), "-Xmx64m",
                "-cp", System.getProperty("java.class.path"), HugeInput.class.getName(), kind, Integer.toString(MEGABYTES))
                .redirectErrorStream(true).start();
        String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8).strip();
        assertEquals(0, process.waitFor(), said);
        return said;
    }

    @ParameterizedTest
    @CsvSource({"line", "fields", "nuls", "quoted"})
    void oneLineIsOneRejection(String kind) throws IOException, InterruptedException {
        assertEquals("1 records, 1 rejections, line 3 last", run(kind));
    }

    @Test
    void anUnclosedQuoteBeforeManyRows() throws IOException, InterruptedException {
        // Rows of 16 bytes; the blank line at the end counts.
        long rows = BYTES / 16;
        assertEquals(rows + 1 + " records, 1 rejections, line " + (rows + 4) + " last", run("unclosed"));
    }

    @Test
    void anUnclosedQuoteBeforeRowsWithPairsOfQuotes() throws IOException, InterruptedException {
        long rows = BYTES / 14;
        assertEquals(rows + 1 + " records, 1 rejections, line " + (rows + 4) + " last", run("unclosed with pairs"));
    }

    @Test
    void everyRowWithAnUnclosedQuote() throws IOException, InterruptedException {
        long rows = BYTES / 17;
        assertEquals("1 records, " + rows + " rejections, line " + (rows + 3) + " last", run("all unclosed"));
    }

    @Test
    void longRowsOneAfterAnother() throws IOException, InterruptedException {
        long rows = BYTES / 7_800_012;
        assertEquals(rows + 1 + " records, 0 rejections, line " + (rows + 3) + " last", run("long rows"));
    }

    @Test
    void longNamesRejectedOneAfterAnother() throws IOException, InterruptedException {
        long rows = BYTES / 7_800_010;
        assertEquals("1 records, " + rows + " rejections, line " + (rows + 3) + " last", run("long names"));
    }

    @Test
    void blankLines() throws IOException, InterruptedException {
        assertEquals("1 records, 0 rejections, line " + (BYTES + 3) + " last", run("blank"));
    }

    @Test
    void noise() throws IOException, InterruptedException {
        String said = run("noise");
        assertTrue(said.startsWith("1 records, ") && said.endsWith(" last"), said);
    }
}
