package ropewalk.survey.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static ropewalk.survey.internal.FakeCatalogue.exactly;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Outcome;
import ropewalk.split.Partition;
import ropewalk.split.SplitDetection;
import ropewalk.split.Verdict;
import ropewalk.survey.Survey.RequestException;
import ropewalk.survey.SurveyListener;
import ropewalk.survey.SurveyReport;
import ropewalk.survey.SurveyRequest;

class SurveyRunTest {

    @TempDir
    private Path folder;

    private final List<String> messages = Collections.synchronizedList(new ArrayList<>());

    private final SurveyListener listener = new SurveyListener() {
        @Override
        public void message(String line) {
            messages.add(line);
        }

        @Override
        public void progress(long links, long bytesRead, long bytesInAll) {
            assertTrue(bytesRead <= bytesInAll || bytesInAll == 0);
        }
    };

    /** Braid closures of 2 strands with 1, 2, 3, … crossings. */
    private Path twists(String name, int count) throws IOException {
        StringBuilder csv = new StringBuilder("name,notation,code,note\n");
        for (int i = 1; i <= count; i++) {
            csv.append("t").append(i).append(",braid,2:").append(" 1".repeat(i)).append(",n").append(i).append('\n');
        }
        return Files.writeString(folder.resolve(name), csv);
    }

    private SurveyRequest request(int jobs, double effort, List<String> only, boolean rivals, Path... files) {
        return new SurveyRequest(List.of(files), Optional.of(folder.resolve("out" + jobs)), only, List.of(), rivals, false,
                effort, jobs);
    }

    private SurveyReport run(FakeCatalogue catalogue, SurveyRequest request) throws IOException, RequestException {
        return new SurveyRun(request, catalogue, null, listener).run();
    }

    /** The rows without the seconds, which stand before the last, kept column. */
    private static List<String> rows(SurveyReport report) throws IOException {
        return Files.readAllLines(report.folder().resolve("results.csv")).stream()
                .map(line -> line.replaceAll(",[0-9.]+,(n[0-9]*)$", ",$1")).toList();
    }

    @Test
    void rowsComeInInputOrderWhateverTheNumberOfThreads() throws Exception {
        Path file = twists("twists.csv", 2000);
        FakeCatalogue catalogue = new FakeCatalogue().with("size", (link, effort) -> exactly(link.crossings()));
        List<String> one = rows(run(catalogue, request(1, 5, List.of(), false, file)));
        List<String> four = rows(run(catalogue, request(4, 5, List.of(), false, file)));
        assertEquals(one, four);
        assertEquals("name,notation,components,crossings,size,seconds,note", one.get(0));
        for (int i = 1; i <= 2000; i++) {
            assertEquals("t" + i + ",braid," + (2 - i % 2) + "," + i + "," + i + ",n" + i, one.get(i));
        }
    }

    @Test
    void aFaultStaysInItsOwnCells() throws Exception {
        FakeCatalogue catalogue = new FakeCatalogue()
                .with("good", (link, effort) -> exactly(1))
                .with("throws", (link, effort) -> {
                    if (link.crossings() == 3) {
                        throw new IllegalStateException("three\nlines");
                    }
                    return exactly(2);
                })
                .with("null", (link, effort) -> link.crossings() == 2 ? null : exactly(3))
                .with("overflow", (link, effort) -> {
                    if (link.crossings() == 1) {
                        throw new StackOverflowError();
                    }
                    return exactly(4);
                });
        SurveyReport report = run(catalogue, request(2, 5, List.of(), false, twists("f.csv", 4)));
        List<String> rows = rows(report);
        assertEquals("t1,braid,1,1,1,2,3,!failed: StackOverflowError,n1", rows.get(1));
        assertEquals("t2,braid,2,2,1,2,!failed: returned null,4,n2", rows.get(2));
        assertEquals("t3,braid,1,3,1,!failed: IllegalStateException: three lines,3,4,n3", rows.get(3));
        assertEquals("t4,braid,2,4,1,2,3,4,n4", rows.get(4));
        assertEquals(3, report.failedCells());
    }

    @Test
    void theNextMethodTakesTheLinksToWhichTheFirstDoesNotApply() throws Exception {
        FakeCatalogue catalogue = new FakeCatalogue().with("parity",
                (link, effort) -> link.crossings() % 2 == 0 ? exactly(0) : new Outcome.NotApplicable<>("even only"),
                (link, effort) -> link.crossings() % 3 == 0 ? exactly(3) : new Outcome.NotApplicable<>("threes only"));
        List<String> rows = rows(run(catalogue, request(1, 5, List.of(), false, twists("p.csv", 5))));
        assertEquals(List.of("", "0", "3", "0", ""), rows.subList(1, 6).stream().map(r -> r.split(",", -1)[4]).toList());
        List<String> second = rows(run(catalogue, request(1, 5, List.of("parity.b"), false, twists("p.csv", 6))));
        assertEquals(List.of("", "", "3", "", "", "3"),
                second.subList(1, 7).stream().map(r -> r.split(",", -1)[4]).toList());
    }

    @Test
    void rivalsThatDifferAreNamedInTheCell() throws Exception {
        FakeCatalogue catalogue = new FakeCatalogue().with("size", (link, effort) -> exactly(link.crossings()),
                (link, effort) -> exactly(link.crossings() == 3 ? 33 : link.crossings()));
        SurveyReport report = run(catalogue, request(2, 5, List.of(), true, twists("r.csv", 4)));
        assertEquals("t2,braid,2,2,2,n2", rows(report).get(2));
        assertEquals("t3,braid,1,3,\"!rivals differ: size.a=3, size.b=33\",n3", rows(report).get(3));
        assertEquals(1, report.failedCells());
        List<String> rivals = Files.readAllLines(report.folder().resolve("rivals.csv"));
        assertEquals("link,invariant,method,bundle,value,seconds,agrees", rivals.get(0));
        assertEquals(9, rivals.size());
        assertEquals(2, rivals.stream().filter(r -> r.startsWith("t3,size,size.") && r.endsWith(",no")).count());
    }

    @Test
    void aMethodThatHangsIsAbandonedAndTheRestIsMeasured() throws Exception {
        FakeCatalogue catalogue = new FakeCatalogue()
                .with("good", (link, effort) -> exactly(link.crossings()))
                .with("hangs", (link, effort) -> {
                    if (link.crossings() == 3) {
                        waitUntilCancelled(effort);
                    }
                    return exactly(7);
                })
                .with("later", (link, effort) -> {
                    effort.checkpoint();
                    return exactly(9);
                });
        SurveyReport report = run(catalogue, request(1, 0.1, List.of(), false, twists("h.csv", 600)));
        List<String> rows = rows(report);
        assertEquals(601, rows.size());
        assertEquals("t2,braid,2,2,2,7,9,n2", rows.get(2), "what it had said before is kept");
        assertTrue(rows.get(3).startsWith("t3,braid,1,3,3,!effort: hangs.a hung"), rows.get(3));
        assertTrue(rows.get(600).startsWith("t600,braid,2,600,600,!effort: hangs.a"), rows.get(600));
        assertTrue(rows.stream().skip(1).allMatch(row -> row.matches(".*,9,n\\d+")), "later columns know nothing of it");
        assertEquals(1, messages.stream().filter(m -> m.contains("'hangs.a' did not stop")).count());
        assertEquals(List.of("hangs.a"), catalogue.setAside());
    }

    /** Takes no notice of its effort until it is abandoned; then it comes back, and its worker goes on. */
    private static void waitUntilCancelled(Effort effort) {
        while (true) {
            try {
                effort.checkpoint();
            } catch (Effort.SpentException e) {
                if (e.getMessage().equals("cancelled")) {
                    return;
                }
            }
        }
    }

    private static void sleepForGood() {
        while (true) {
            try {
                Thread.sleep(1000);
            } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
            }
        }
    }

    @Test
    void effortIsCountedForEachCell() throws Exception {
        FakeCatalogue catalogue = new FakeCatalogue().with("slow", (link, effort) -> {
            while (link.crossings() == 2) {
                effort.checkpoint();
            }
            return exactly(1);
        });
        List<String> rows = rows(run(catalogue, request(1, 0.05, List.of(), false, twists("e.csv", 3))));
        assertEquals("t1,braid,1,1,1,n1", rows.get(1));
        assertTrue(rows.get(2).startsWith("t2,braid,2,2,!effort: 0.05 s"), rows.get(2));
        assertEquals("t3,braid,1,3,1,n3", rows.get(3));
    }

    @Test
    void whatArrivesDuringTheSurveyIsMeasuredInAFurtherPass() throws Exception {
        FakeCatalogue catalogue = new FakeCatalogue();
        AtomicInteger calls = new AtomicInteger();
        catalogue.with("first", (link, effort) -> {
            if (calls.incrementAndGet() == 100) {
                catalogue.with("guest.late", (l, e) -> exactly(10L * l.crossings()));
            }
            return exactly(link.crossings());
        });
        SurveyReport report = run(catalogue, request(2, 5, List.of(), false, twists("late.csv", 700)));
        List<String> rows = rows(report);
        assertEquals("name,notation,components,crossings,first,guest.late,seconds,note", rows.get(0));
        assertEquals(701, rows.size());
        for (int i = 1; i <= 700; i++) {
            assertEquals("t" + i + ",braid," + (2 - i % 2) + "," + i + "," + i + "," + 10 * i + ",n" + i, rows.get(i));
        }
        assertEquals(700, report.links());
    }

    @Test
    void whatLeavesIsMarkedRemoved() throws Exception {
        FakeCatalogue catalogue = new FakeCatalogue();
        catalogue.with("first", (link, effort) -> {
            if (link.crossings() == 600) {
                catalogue.remove("guest.gone");
            }
            return exactly(link.crossings());
        });
        catalogue.with("guest.gone", (link, effort) -> exactly(5));
        List<String> rows = rows(run(catalogue, request(1, 5, List.of(), false, twists("gone.csv", 700))));
        assertEquals("t1,braid,1,1,1,5,n1", rows.get(1));
        assertEquals("t700,braid,2,700,700,!removed,n700", rows.get(700));
    }

    @Test
    void badRowsAreRejectedInInputOrderAndCostNoGoodOne() throws Exception {
        Path file = Files.writeString(folder.resolve("bad.csv"), "name,notation,code\na,braid,2: 1\nb,braid,2: 5\n"
                + "c,planar,\"[[1,1,1,2]]\"\nd,nothing,x\n\"e,braid,2: 1\nf,braid,2: 1 1\n");
        Path missing = folder.resolve("missing.csv");
        FakeCatalogue catalogue = new FakeCatalogue().with("size", (link, effort) -> exactly(link.crossings()));
        SurveyReport report = run(catalogue, request(2, 5, List.of(), false, missing, file));
        List<String> rejected = Files.readAllLines(report.folder().resolve("rejected.csv"));
        assertEquals(List.of("missing.csv,,", "bad.csv,3,12", "bad.csv,4,17", "bad.csv,5,3", "bad.csv,6,1"),
                rejected.subList(1, 6).stream().map(r -> r.replace(folder + "/", "").replaceAll("^([^,]*,[^,]*,[^,]*),.*", "$1"))
                .toList());
        List<String> results = Files.readAllLines(report.folder().resolve("results.csv"));
        assertEquals(3, results.size());
        assertTrue(results.get(1).startsWith("a,braid,1,1,1,"));
        assertTrue(results.get(2).startsWith("f,braid,2,2,2,"));
        assertEquals(5, report.rejected());
    }

    @Test
    void unknownIdsAndForeignFoldersAreRefusedBeforeAnythingIsWritten() throws Exception {
        Path file = twists("t.csv", 1);
        FakeCatalogue catalogue = new FakeCatalogue().with("size", (link, effort) -> exactly(1));
        RequestException unknown = assertThrows(RequestException.class,
                () -> run(catalogue, request(1, 5, List.of("size", "siez"), false, file)));
        assertEquals("nothing installed is called 'siez'; there are size, size.a", unknown.getMessage());
        assertFalse(Files.exists(folder.resolve("out1")));
        Files.createDirectories(folder.resolve("out1"));
        Files.writeString(folder.resolve("out1/thesis.tex"), "precious");
        assertThrows(RequestException.class, () -> run(catalogue, request(1, 5, List.of(), false, file)));
        assertEquals("precious", Files.readString(folder.resolve("out1/thesis.tex")));
        assertFalse(Files.exists(folder.resolve("out1/results.csv")));
    }

    @Test
    void aStoppedSurveyKeepsWholeRowsOnly() throws Exception {
        AtomicInteger calls = new AtomicInteger();
        SurveyRun[] run = new SurveyRun[1];
        FakeCatalogue catalogue = new FakeCatalogue().with("size", (link, effort) -> {
            if (calls.incrementAndGet() == 1500) {
                new Thread(run[0]::stop).start();
            }
            return exactly(link.crossings());
        });
        Path file = twists("stop.csv", 3000);
        run[0] = new SurveyRun(request(1, 5, List.of(), false, file, file, file), catalogue, null, listener);
        SurveyReport report = run[0].run();
        List<String> rows = rows(report);
        assertFalse(report.isComplete());
        assertEquals(report.links(), rows.size() - 1);
        assertTrue(report.links() < 9000);
        assertTrue(rows.get(rows.size() - 1).matches("t\\d+,braid,[12],\\d+,\\d+,n\\d+"), rows.get(rows.size() - 1));
    }

    @Test
    void aVerdictThatHangsCostsThatLinkAlone() throws Exception {
        FakeCatalogue catalogue = new FakeCatalogue().with("size", (link, effort) -> exactly(link.crossings()));
        SplitDetection detection = (link, effort) -> {
            if (link.crossings() == 3) {
                sleepForGood();
            }
            return new Verdict(Partition.whole(link.components()), Partition.whole(link.components()), List.of(),
                    List.of("nothing"), "");
        };
        SurveyReport report = new SurveyRun(request(1, 0.1, List.of(), false, twists("v.csv", 5)), catalogue, detection,
                listener).run();
        List<String> verdicts = rows(report).stream().skip(1).map(row -> row.split(",", -1)[5]).toList();
        assertEquals(List.of("not split", "not split", "!effort: the verdict did not stop at its effort", "not split",
                "not split"), verdicts);
        assertEquals(1, report.failedCells());
        assertEquals(1, messages.stream().filter(m -> m.contains("a verdict did not stop")).count());
    }
}
