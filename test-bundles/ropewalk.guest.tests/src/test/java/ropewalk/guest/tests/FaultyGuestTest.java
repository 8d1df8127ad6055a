package ropewalk.guest.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import quayside.faulty.Claims;
import quayside.faulty.Faults;
import ropewalk.guest.tests.Bench.Outcome;
import ropewalk.invariant.Invariant;

/** Guests that break: only their own cells suffer, and the survey ends. */
class FaultyGuestTest {
    private static final String CROSSINGS_OF_FAULT = "3";

    private static Bench bench;
    private static Outcome alone;

    @BeforeAll
    static void unpack() throws IOException {
        bench = new Bench();
        alone = bench.user().survey(List.of());
        assertEquals(0, alone.ended().status(), alone.ended().err());
    }

    @AfterAll
    static void cleanUp() throws IOException {
        bench.close();
    }

    @Test
    void aFaultStaysInItsCell() throws Exception {
        String[] faults = {"throws", "error", "checked", "null", "novalue", "hollow", "type", "deep", "huge", "interrupts",
            "batch", "slow"};
        Outcome with = bench.user().survey(guests(faults), "--effort", "0.5");
        Table results = with.results();
        for (String fault : faults) {
            List<String> cells = results.column("faulty." + fault);
            for (int i = 0; i < cells.size(); i++) {
                String crossings = results.column("crossings").get(i);
                if (crossings.equals(CROSSINGS_OF_FAULT)) {
                    assertTrue(cells.get(i).matches("!(failed|effort): .+"), fault + ": " + cells);
                } else {
                    assertEquals(crossings, cells.get(i), fault + ": " + cells);
                }
            }
        }
        assertTrue(results.cell("trefoil", "faulty.slow").startsWith("!effort: "));
        assertTrue(results.cell("trefoil", "faulty.throws").contains("the table has no row for this"));
        assertNothingElseChanged(with);
        assertEquals(1, with.ended().status(), with.ended().err());
        assertEquals(1, with.messages().size(), with.ended().err());
        assertTrue(with.messages().get(0).contains(faults.length + " cells failed"), with.ended().err());
    }

    /** More rows than one batch holds, all on one thread: it must live on for the batches to come. */
    @Test
    void aThreadLeftInterruptedMeasuresOn() throws Exception {
        int rows = 4000;
        Path links = bench.folder().resolve("trefoils.csv");
        Files.writeString(links, "name,notation,code\n" + "trefoil,braid,2: 1 1 1\n".repeat(rows));
        Outcome with = bench.user().survey(links, guests("interrupts"), "--jobs", "1");
        assertEquals(rows, with.results().rows().size());
        assertTrue(with.results().column("determinant").stream().allMatch("3"::equals));
    }

    /** The link that hangs costs its cell, and what comes after it is not asked; what came before stays. */
    @Test
    void aHangCostsItsColumn() throws Exception {
        String[] faults = {"spins", "sleeps", "blocks"};
        Outcome with = bench.user().survey(guests(faults), "--effort", "0.5");
        for (String fault : faults) {
            List<String> cells = with.results().column("faulty." + fault);
            assertEquals("0", cells.get(0));
            assertTrue(cells.get(1).startsWith("!effort: "), cells.toString());
            assertEquals(1, with.messages().stream().filter(line -> line.contains("'faulty." + fault
                    + ".m' did not stop")).count(), with.ended().err());
        }
        assertNothingElseChanged(with);
        assertEquals(1, with.ended().status(), with.ended().err());
    }

    @Test
    void anotherDefinitionOfAnInvariantIsRefusedWithOneWarning() throws Exception {
        Outcome with = bench.user().survey(guest("other", Claims.OtherDeterminant.class));
        assertEquals(0, with.ended().status(), with.ended().err());
        assertNothingElseChanged(with);
        assertEquals(1, with.messages().size(), with.ended().err());
        assertTrue(with.messages().get(0).contains("other 1.0.0 defines 'determinant' differently"),
                with.ended().err());
    }

    @Test
    void aMethodWithoutItsPropertiesIsLeftOutWithOneWarning() throws Exception {
        Outcome orphan = bench.user().survey(guest("orphan", Claims.Orphan.class));
        assertUnchanged(orphan, "ropewalk.invariant");
        Outcome nameless = bench.user().survey(guest("nameless", Claims.Nameless.class));
        assertUnchanged(nameless, "ropewalk.method");
    }

    /** The component runtime tells of it, at more length than one line. */
    @Test
    void aMethodThatCannotBeMadeIsLeftOut() throws Exception {
        Outcome with = bench.user().survey(guest("unmade", Claims.Unmade.class));
        assertEquals(0, with.ended().status(), with.ended().err());
        assertNothingElseChanged(with);
        assertTrue(with.ended().err().contains("the tables are missing"), with.ended().err());
    }

    @Test
    void aMethodOfAnUndefinedInvariantIsLeftOutWithOneWarning() throws Exception {
        assertUnchanged(bench.user().survey(guest("undefined", Claims.Undefined.class)), "faulty.undefined");
    }

    @Test
    void anInvariantWithoutAnIdIsLeftOutWithOneWarning() throws Exception {
        assertUnchanged(bench.user().survey(guest("nullid", Claims.NullId.class)), "nullid");
    }

    @Test
    void anIdThatIsAColumnAlreadyIsLeftOut() throws Exception {
        Outcome with = bench.user().survey(guest("taken", family(Claims.TakenId.class)));
        assertEquals(0, with.ended().status(), with.ended().err());
        assertNothingElseChanged(with);
        assertTrue(with.messages().size() > 0 && with.messages().stream().allMatch(line -> line.contains("'verdict")),
                with.ended().err());
    }

    /** What its methods measure stays; verdicts are found without it. */
    @Test
    void aLawThatThrowsLeavesVerdictsAlone() throws Exception {
        Outcome with = bench.user().survey(guest("law", family(Claims.ThrowingLaw.class)));
        assertNothingElseChanged(with);
        assertEquals(with.results().column("crossings"), with.results().column("faulty.law"));
        assertEquals(1, with.messages().size(), with.ended().err());
        assertTrue(with.messages().get(0).contains("'faulty.law'"), with.ended().err());
    }

    @Test
    void aDefinitionWithNullsIsLeftOut() throws Exception {
        Outcome with = bench.user().survey(guest("nulllaw", family(Claims.NullLaw.class)));
        assertEquals(0, with.ended().status(), with.ended().err());
        assertNothingElseChanged(with);
        assertTrue(with.messages().size() > 0 && with.messages().stream().allMatch(line -> line.contains("faulty.nulllaw")),
                with.ended().err());
    }

    /** A method that hangs while a verdict asks for its law costs verdicts, but no other column, and the survey ends. */
    @Test
    void aLawThatHangsLeavesOtherColumnsAlone() throws Exception {
        Outcome with = bench.user().survey(guest("hanging", family(Claims.HangingLaw.class)), "--effort", "0.5");
        String[] verdict = {"seconds", "verdict", "pieces", "apart", "together", "evidence"};
        assertEquals(List.of(), alone.results().without(verdict).differences(with.results()));
        for (String name : Bench.NAMES) {
            String before = alone.results().cell(name, "verdict");
            String after = with.results().cell(name, "verdict");
            assertTrue(after.equals(before) || after.startsWith("!effort: "), name + ": " + after);
        }
        assertEquals(1, with.ended().status(), with.ended().err());
        assertTrue(with.ended().err().contains("'faulty.hanginglaw.m' did not stop"), with.ended().err());
    }

    @Test
    void rivalsThatDifferAreNamedInTheCell() throws Exception {
        Outcome with = bench.user().survey(guest("rival", Claims.WrongRival.class), "--rivals");
        assertEquals(1, with.ended().status(), with.ended().err());
        String cell = with.results().cell("trefoil", "determinant");
        assertTrue(cell.startsWith("!rivals differ: ") && cell.contains("determinant.goeritz=3")
                && cell.contains("faulty.rival.m=4"), cell);
        assertEquals("5", with.results().cell("figure-eight", "determinant"));
        assertEquals(List.of("trefoil, determinant: 3 became " + cell),
                alone.results().without("seconds").differences(with.results()));
    }

    private static void assertNothingElseChanged(Outcome with) {
        assertEquals(List.of(), alone.results().without("seconds").differences(with.results()), with.ended().err());
    }

    private static void assertUnchanged(Outcome with, String part) {
        assertEquals(0, with.ended().status(), with.ended().err());
        assertNothingElseChanged(with);
        assertEquals(1, with.messages().size(), with.ended().err());
        assertTrue(with.messages().get(0).contains(part), with.ended().err());
    }

    /** One jar with the named faults. */
    private static List<String> guests(String... faults) throws Exception {
        List<Class<?>> types = new ArrayList<>();
        for (String fault : faults) {
            types.add(Arrays.stream(Faults.class.getDeclaredClasses())
                    .filter(type -> measures(type).equals("faulty." + fault)).findFirst().orElseThrow());
        }
        types.add(Class.forName("quayside.faulty.FaultyInvariant"));
        return guest("faulty", types.toArray(Class<?>[]::new));
    }

    private static String measures(Class<?> type) {
        try {
            return ((Invariant<?>) type.getConstructor().newInstance()).id();
        } catch (ReflectiveOperationException fault) {
            throw new AssertionError(type.getName(), fault);
        }
    }

    private static Class<?>[] family(Class<?> type) throws ClassNotFoundException {
        List<Class<?>> types = new ArrayList<>(List.of(type, Class.forName("quayside.faulty.FaultyInvariant")));
        if (type == Claims.ThrowingLaw.class) {
            types.add(Class.forName(type.getName() + "$1"));
        }
        return types.toArray(Class<?>[]::new);
    }

    private static List<String> guest(String name, Class<?>... types) throws Exception {
        Path folder = Files.createTempDirectory(bench.folder(), "guest");
        return List.of("--guest", GuestJars.of(folder, name, Stream.of(types).toList()).toString());
    }
}
