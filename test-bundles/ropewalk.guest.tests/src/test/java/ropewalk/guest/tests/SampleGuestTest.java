package ropewalk.guest.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import ropewalk.guest.tests.Bench.Outcome;
import ropewalk.guest.tests.Bench.User;

/** The assembled product with the bundle of an outside group, used as that group would. */
class SampleGuestTest {
    private static final String COLUMN = "quayside.tetrahedral";
    private static final List<String> GUEST = List.of("--guest", Bench.QUAYSIDE.toString());

    /** See the tests of the guest for sources. */
    private static final List<String> COLOURINGS = List.of("4", "16", "16", "4", "256", "16", "4", "16", "4", "4", "4");

    private static Bench bench;
    private static Outcome alone;

    @BeforeAll
    static void unpack() throws IOException {
        bench = new Bench();
        alone = bench.user().survey(List.of());
    }

    @AfterAll
    static void cleanUp() throws IOException {
        bench.close();
    }

    @Test
    void withoutTheGuestNothingIsSeenOfIt() {
        assertEquals(0, alone.ended().status(), alone.ended().err());
        assertEquals(List.of(), alone.messages());
        assertEquals(Bench.NAMES, alone.results().column("name"));
        assertFalse(alone.results().columns().contains(COLUMN));
    }

    @Test
    void aGuestForOneRunAddsItsColumnBehindTheStandardOnes() throws IOException {
        Outcome with = bench.user().survey(GUEST);
        assertEquals(0, with.ended().status(), with.ended().err());
        assertEquals(List.of(), with.messages());
        assertEquals(COLOURINGS, with.results().column(COLUMN));
        List<String> columns = with.results().columns();
        assertEquals("verdict", columns.get(columns.indexOf(COLUMN) + 1));
        assertEquals(alone.results().without("seconds", "verdict", "pieces", "apart", "together", "evidence"),
                with.results().without(COLUMN, "seconds", "verdict", "pieces", "apart", "together", "evidence"));
    }

    /** The core alone cannot decide this link (determinant 0, no linking); 4 colourings are fewer than 4 · 4. */
    @Test
    void itsLawDecidesWhatWasUndecided() throws IOException {
        Outcome core = bench.user().survey(List.of("--features", "core"));
        assertEquals("undecided", core.results().cell("hidden", "verdict"));
        Outcome with = bench.user().survey(List.of("--features", "core", "--guest", Bench.QUAYSIDE.toString()));
        assertEquals("not split", with.results().cell("hidden", "verdict"));
        assertEquals("[[1,2]]", with.results().cell("hidden", "pieces"));
        assertEquals("law.quayside.tetrahedral:relies on quayside.links 1.0.0",
                with.results().cell("hidden", "evidence"));
        List<String> lines = Files.readAllLines(with.out().resolve("evidence.jsonl"));
        assertEquals(1, lines.stream().filter(line -> line.contains("\"link\":\"hidden\"")
                && line.contains("\"quayside.tetrahedral.rank\"")).count(), () -> String.join("\n", lines));
        assertEquals("split", with.results().cell("two trefoils", "verdict"));
    }

    @Test
    void aGuestInTheFolderIsThereUntilItIsTakenOut() throws IOException {
        User user = bench.user();
        Path jar = user.guests().resolve("quayside.links-1.0.0.jar");
        Files.copy(Bench.QUAYSIDE, jar);
        Outcome with = user.survey(List.of());
        assertEquals(0, with.ended().status(), with.ended().err());
        assertEquals(COLOURINGS, with.results().column(COLUMN));
        Files.delete(jar);
        Outcome after = user.survey(List.of());
        assertEquals(alone.results().without("seconds"), after.results().without("seconds"));
        assertEquals(List.of(), after.messages());
    }

    @Test
    void aBrokenJarCostsOneLine() throws IOException {
        User user = bench.user();
        byte[] whole = Files.readAllBytes(Bench.QUAYSIDE);
        Files.write(user.guests().resolve("half.jar"), java.util.Arrays.copyOf(whole, whole.length / 2));
        Outcome with = user.survey(List.of());
        assertEquals(0, with.ended().status(), with.ended().err());
        assertEquals(1, with.messages().size(), with.ended().err());
        assertTrue(with.messages().get(0).startsWith("ropewalk: guests/half.jar "), with.messages().get(0));
        assertEquals(alone.results().without("seconds"), with.results().without("seconds"));
    }

    @Test
    void aNamedMethodAloneFillsTheColumnWhereItApplies() throws IOException {
        Outcome with = bench.user().survey(GUEST, "--only", "determinant.trees");
        assertEquals(0, with.ended().status(), with.ended().err());
        // Not connected: two trefoils, unlink. Not alternating: torus (3,4), hidden.
        assertEquals(List.of("1", "3", "5", "2", "", "", "16", "", "5", "1", ""), with.results().column("determinant"));
        assertEquals(List.of("name", "notation", "components", "crossings", "determinant", "seconds"),
                with.results().columns());
    }

    @Test
    void rivalsAgreeOnEveryLink() throws IOException {
        Outcome with = bench.user().survey(GUEST, "--rivals");
        assertEquals(0, with.ended().status(), with.ended().err());
        Table rivals = with.rivals();
        assertFalse(rivals.column("agrees").contains("no"), rivals.toString());
        Set<String> methods = new TreeSet<>();
        int trees = 0;
        for (List<String> row : rivals.rows()) {
            if (row.get(1).equals("determinant")) {
                methods.add(row.get(2));
            }
            if (row.get(2).equals("determinant.trees")) {
                trees++;
                assertEquals("quayside.links 1.0.0", row.get(3));
                assertTrue(row.get(4).isEmpty() || row.get(4).equals(with.results().cell(row.get(0), "determinant")),
                        row.toString());
            }
        }
        assertTrue(methods.containsAll(Set.of("determinant.goeritz", "determinant.colouring", "determinant.trees")),
                methods.toString());
        assertEquals(Bench.NAMES.size(), trees);
        assertEquals(alone.results().column("determinant"), with.results().column("determinant"));
    }

    @Test
    void theGuestIsNoPartOfTheProduct() throws IOException {
        try (var files = Files.walk(bench.folder().resolve("product"))) {
            assertEquals(List.of(), files.filter(file -> file.getFileName().toString().contains("quayside")).toList());
        }
    }
}
