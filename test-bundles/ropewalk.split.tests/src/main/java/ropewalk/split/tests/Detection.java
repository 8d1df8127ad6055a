package ropewalk.split.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.notation.Notations;
import ropewalk.invariant.Effort;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.split.Partition;
import ropewalk.split.SplitDetection;
import ropewalk.split.Verdict;
import ropewalk.testkit.Services;

/** Split detection as it is installed; every verdict that it gives is checked for what holds of every verdict. */
final class Detection {

    static final Services SERVICES = new Services(Detection.class);
    private static final Set<String> INVARIANTS = Set.of("determinant", "nullity", "factors", "signature", "linking", "fox3",
            "fox5", "fox7");
    private static final List<String> STAGES = List.of("pieces of the diagram", "values of the whole link",
            "reduction by R1 and R2", "split laws");

    private static Detection installed;
    private static AssertionError missing;

    private final SplitDetection service;
    private final MethodCatalogue catalogue;

    private Detection() {
        service = SERVICES.await(SplitDetection.class, "");
        catalogue = SERVICES.await(MethodCatalogue.class, "");
    }

    /** Waits until everything has arrived; what did not come is waited for once and not by every test. */
    static synchronized Detection installed() {
        if (missing != null) {
            throw missing;
        }
        try {
            return arrived();
        } catch (AssertionError e) {
            missing = e;
            throw e;
        }
    }

    private static Detection arrived() {
        if (installed == null) {
            installed = new Detection();
        }
        installed.awaitStages(STAGES);
        Services.until("the invariants " + INVARIANTS, () -> installed.catalogue.entries().stream()
                .filter(e -> e.definition().isPresent() && !e.methods().isEmpty()).map(e -> e.id())
                .collect(Collectors.toSet()).containsAll(INVARIANTS));
        return installed;
    }

    /** An undecided link shows which stages there are. */
    private void awaitStages(List<String> stages) {
        Services.until("the stages " + stages, () -> new TreeSet<>(raw(Hard.undecided(), 20).tried())
                .containsAll(stages));
    }

    /** A verdict without any check. */
    Verdict raw(LinkDiagram link, double seconds) {
        return service.decide(link, Effort.ofSeconds(seconds));
    }

    /** A verdict whose partitions and evidence have been checked against one another. */
    Verdict decide(LinkDiagram link) {
        Verdict verdict = raw(link, 30);
        assertEquals("", verdict.limit(), "effort");
        assertConsistent(verdict, link.components());
        new EvidenceCheck(link).check(verdict);
        return verdict;
    }

    static void assertConsistent(Verdict verdict, int components) {
        assertEquals(components, verdict.together().size());
        assertEquals(components, verdict.apart().size());
        assertTrue(refines(verdict.together(), verdict.apart()), () -> "together " + verdict.together()
                + " does not refine apart " + verdict.apart());
        Partition together = Partition.singles(components);
        int[] apart = new int[components];
        for (Verdict.Argument argument : verdict.arguments()) {
            assertEquals(components, argument.ofWhole(components).size());
            if (argument.isApart()) {
                for (int i = 0; i < components; i++) {
                    apart[i] = apart[i] * components + argument.ofWhole(components).classOf(i);
                }
                apart = marks(Partition.of(apart));
            } else {
                together = together.join(argument.ofWhole(components));
            }
        }
        assertEquals(together, verdict.together(), "together is the join of the arguments");
        assertEquals(Partition.of(apart), verdict.apart(), "apart is the meet of the arguments");
        assertEquals(verdict.apart().classes() > 1 ? "split" : verdict.together().classes() == 1 ? "not split"
                : "undecided", verdict.word());
    }

    private static int[] marks(Partition partition) {
        int[] marks = new int[partition.size()];
        for (int i = 0; i < marks.length; i++) {
            marks[i] = partition.classOf(i);
        }
        return marks;
    }

    /** Whether each class of the finer one lies in a class of the coarser one. */
    static boolean refines(Partition finer, Partition coarser) {
        return finer.join(coarser).equals(coarser);
    }

    static String code(LinkDiagram link) {
        return Notations.writer("planar").orElseThrow().write(link);
    }
}
