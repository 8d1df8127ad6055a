package ropewalk.product.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import ropewalk.testkit.Distribution;
import ropewalk.testkit.Run;

/** The main job with the packed product, with good files and bad ones. */
class MainJobTest {
    private static final String HEADER = "name,notation,code\n";

    @TempDir
    static Path shared;
    private static Distribution product;

    @TempDir
    Path scratch;
    private Run run;

    @BeforeAll
    static void unpack() throws IOException {
        product = Subject.unpack(shared);
    }

    @AfterAll
    static void nothingWasWrittenIntoTheProduct() throws IOException {
        List<String> changes = product.changes();
        product.close();
        assertEquals(List.of(), changes);
    }

    @BeforeEach
    void prepare() {
        run = Run.of(product.file("ropewalk"), scratch).in(scratch);
    }

    private Path file(String name, byte[] content) throws IOException {
        return Files.write(scratch.resolve(name), content);
    }

    private Path file(String name, String content) throws IOException {
        return file(name, content.getBytes(StandardCharsets.UTF_8));
    }

    private List<String> lines(String name) throws IOException {
        return Files.readAllLines(scratch.resolve(name));
    }

    @Test
    void aCollectionBecomesAFolderOfResults() throws IOException {
        file("loops.csv", "name,notation,code,crossings\n\"a, \"\"b\"\"\",braid,2: 1 1 1,seven\n=1+2,planar,\"[[1],[2]]\",\n");
        Run.Ended ended = run.go("survey", "loops.csv");
        assertEquals(0, ended.status(), ended.err());
        assertEquals("", ended.out());
        assertTrue(ended.err().matches("ropewalk: 2 links, [0-9.]+ s to start, [0-9.]+ s from first byte to last, "
                + "[0-9]+ links/s; results in loops.survey\n"), ended.err());
        List<String> rows = lines("loops.survey/results.csv");
        assertEquals("name,notation,components,crossings,determinant,nullity,factors,signature,linking,fox3,fox5,fox7,"
                + "verdict,pieces,apart,together,evidence,seconds,given.crossings", rows.get(0));
        assertTrue(rows.get(1).matches("\"a, \"\"b\"\"\",braid,1,3,3,0,\\[3],-2,\\[\\[0]],9,5,7,not split,\\[\\[1]],"
                + "\\[\\[1]],\\[\\[1]],,[0-9.]+,seven"), rows.get(1));
        assertTrue(rows.get(2).startsWith("=1+2,planar,2,0,0,1,[0],0,\"[[0,0],[0,0]]\",9,25,49,split,\"[[1],[2]]\","),
                rows.get(2));
        assertEquals(List.of("file,line,column,name,reason"), lines("loops.survey/rejected.csv"));
        List<String> evidence = lines("loops.survey/evidence.jsonl");
        assertEquals(1, evidence.size());
        assertTrue(evidence.get(0).contains("\"claim\":\"apart\",\"components\":[[1],[2]],\"kind\":\"disconnected\""),
                evidence.get(0));
        Run.Ended again = run.go("survey", "loops.csv", "--only", "linking,determinant", "--quiet");
        assertEquals(0, again.status(), again.err());
        assertEquals("name,notation,components,crossings,determinant,linking,seconds,given.crossings",
                lines("loops.survey/results.csv").get(0));
    }

    @Test
    void everyBadFileIsALineAndStopsNoOther() throws IOException {
        file("empty.csv", "");
        file("nohead.csv", "a,planar,[[1]]\n");
        file("doubled.csv", "name,name,notation,code\na,b,planar,[[1]]\n");
        file("wide.csv", (HEADER + "a,planar,[[1]]\n").getBytes(StandardCharsets.UTF_16));
        file("latin.csv", (HEADER + "m\u00f4le,planar,[[1]]\ngood,planar,[[1]]\n").getBytes(StandardCharsets.ISO_8859_1));
        file("joined.csv", HEADER + "first,planar,[[1]]\n" + HEADER + "second,planar,[[1]]\n");
        Run.Ended ended = run.go("survey", "empty.csv", "nohead.csv", "doubled.csv", "wide.csv", "latin.csv", "joined.csv",
                "missing.csv", "--out", "out");
        assertEquals(1, ended.status(), ended.err());
        List<String> rejected = lines("out/rejected.csv");
        assertEquals(List.of("empty.csv,,", "nohead.csv,1,1", "doubled.csv,1,6", "wide.csv,1,1", "latin.csv,2,2",
                "joined.csv,3,1", "missing.csv,,"), rejected.subList(1, rejected.size()).stream()
                .map(row -> row.replaceAll("^([^,]*,[^,]*,[^,]*),.*", "$1")).toList());
        assertEquals(List.of("good", "first", "second"), lines("out/results.csv").stream().skip(1)
                .map(row -> row.substring(0, row.indexOf(','))).toList());
    }

    @Test
    void everyBadCodeIsALineAndCostsNoGoodRow() throws IOException {
        String[] bad = {
            "planar,\"[[1,1,1,2]]\"", "planar,\"[[1,2,3]]\"", "planar,\"[[3,2,4,1],[2,1,3,4]]\"",
            "planar,\"" + "[".repeat(5000) + "]".repeat(5000) + "\"", "planar,\"[[1,2,2,1\"",
            "planar,\"[[4294967297,2,2,1]]\"", "planar,\"[[1,1,2,2],[2]]\"", "planar,\"[[4,1,5,2],[1,6,4,3],[5,2,6,3]]\"",
            "braid,1000000000: 1", "braid,3: 3", "braid,3: 0", "braid,x", "dowker,4 6 3", "dowker,", "chalk,[[1]]",
            "planar,[[1]],more", "planar"};
        StringBuilder csv = new StringBuilder(HEADER);
        for (int i = 0; i < bad.length; i++) {
            csv.append("bad").append(i).append(',').append(bad[i]).append('\n');
            csv.append("good").append(i).append(",braid,2: 1 1\n");
        }
        csv.append("nul\0,planar,[[1]]\n,planar,[[1]]\n\"unclosed,planar,[[1]]\nlast,planar,[[1]]\n");
        file("codes.csv", csv.toString());
        Run.Ended ended = run.go("survey", "codes.csv");
        assertEquals(1, ended.status(), ended.err());
        List<String> results = lines("codes.survey/results.csv");
        assertEquals(1 + bad.length + 1, results.size());
        for (int i = 0; i < bad.length; i++) {
            assertTrue(results.get(i + 1).startsWith("good" + i + ",braid,2,2,2,0,[2],-1,"), results.get(i + 1));
        }
        List<String> rejected = lines("codes.survey/rejected.csv");
        assertEquals(1 + bad.length + 3, rejected.size(), () -> String.join("\n", rejected));
        for (int i = 0; i < bad.length; i++) {
            assertTrue(rejected.get(i + 1).startsWith("codes.csv," + (2 * i + 2) + ","), rejected.get(i + 1));
            assertFalse(rejected.get(i + 1).endsWith(","), rejected.get(i + 1));
        }
    }

    @Test
    void wrongUsageIsOneLineAndStatusTwo() throws IOException {
        file("loops.csv", HEADER + "a,planar,[[1]]\n");
        Files.createDirectories(scratch.resolve("mine"));
        Files.writeString(scratch.resolve("mine/thesis.tex"), "precious");
        for (List<String> wrong : List.of(List.of("survey"), List.of("survey", "loops.csv", "--onyl", "x"),
                List.of("survey", "loops.csv", "--only", "determinnat"), List.of("survey", "loops.csv", "--jobs", "0"),
                List.of("survey", "loops.csv", "--effort", "none"), List.of("survey", "loops.csv", "--out", "mine"),
                List.of("survey", "loops.csv", "--resume"), List.of("show"), List.of("show", "--code", "braid"),
                List.of("show", "--code", "braid:2: 7"), List.of("show", "loops.csv#b"),
                List.of("show", "--code", "braid:2: 1", "--as", "svg"), List.of("convert", "loops.csv"),
                List.of("convert", "loops.csv", "--to", "chalk"), List.of("bundles", "frobnicate"))) {
            Run.Ended ended = run.go(wrong.toArray(String[]::new));
            assertEquals(2, ended.status(), wrong + ": " + ended.err());
            assertTrue(ended.err().startsWith("ropewalk: "), ended.err());
            assertEquals(1, ended.err().lines().count(), ended.err());
            assertEquals("", ended.out());
        }
        assertEquals("precious", Files.readString(scratch.resolve("mine/thesis.tex")));
    }

    @Test
    void convertWritesWhatSurveyReads() throws IOException {
        file("loops.csv", "name,notation,code,note\nright,braid,2: 1 1 1,n1\neight,dowker,4 6 8 2,n2\nbad,braid,2: 9,n3\n"
                + "rings,planar,\"[[1],[2]]\",n4\n");
        Run.Ended ended = run.go("convert", "loops.csv", "--to", "planar", "--out", "planar.csv");
        assertEquals(1, ended.status());
        assertTrue(ended.err().startsWith("ropewalk: loops.csv:4:"), ended.err());
        assertEquals("name,notation,code,note", lines("planar.csv").get(0));
        assertEquals("rings,planar,\"[[1],[2]]\",n4", lines("planar.csv").get(3));
        run.go("survey", "loops.csv", "planar.csv", "--out", "both", "--only", "determinant,signature,linking,factors");
        List<String> rows = lines("both/results.csv").stream().map(row -> row.replaceAll(",(braid|dowker|planar),", ",")
                .replaceAll(",[0-9.]+,(n[0-9])$", ",$1")).toList();
        assertEquals(rows.subList(1, 4), rows.subList(4, 7));
    }

    @Test
    void showPrintsMatricesAndTheArgument() throws IOException {
        file("loops.csv", HEADER + "three \u001b[31mloops,planar,\"[[1,5,2,4],[3,1,4,6],[5,3,6,2],[7,10,8,9],[9,8,10,7]]\"\n");
        Run.Ended ended = run.go("show", "loops.csv#three \u001b[31mloops");
        assertEquals(0, ended.status(), ended.err());
        assertFalse(ended.out().contains("\u001b"), "no escape character of a collection reaches the terminal");
        assertTrue(ended.out().startsWith("three \\u001b[31mloops: 3 components, 5 crossings\n"), ended.out());
        for (String part : List.of("  pieces   [[1],[2,3]]", "Unreduced Goeritz matrix", "Unreduced colouring matrix",
                "block 3×3: components [1]", "block 2×2: components [2, 3]", "A colouring modulo 3", "Linking matrix")) {
            assertTrue(ended.out().contains(part), () -> part + " is missing in\n" + ended.out());
        }
    }

    @Test
    void bundlesTellsWhatIsThereAndWhere() throws IOException {
        Run.Ended list = run.go("bundles", "list");
        assertEquals(0, list.status(), list.err());
        assertTrue(list.out().lines().anyMatch(line -> line.matches("ropewalk\\.diagram +0\\.1\\.0 +runs")), list.out());
        assertTrue(list.out().lines().anyMatch(line -> line.matches(" +determinant\\.colouring +ropewalk.+0\\.1\\.0")),
                list.out());
        Run.Ended where = run.go("bundles", "where");
        assertTrue(where.out().contains(run.guests().toString()), where.out());
    }
}
