package ropewalk.split.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Hashtable;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleException;
import org.osgi.framework.ServiceRegistration;
import ropewalk.diagram.LinkDiagram;
import ropewalk.families.BraidClosure;
import ropewalk.families.RandomDiagrams;
import ropewalk.families.Scrambled;
import ropewalk.families.SplitUnion;
import ropewalk.families.TorusLink;
import ropewalk.families.WheelClosure;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.InvariantBase;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value;
import ropewalk.invariant.Value.IntegerValue;
import ropewalk.oracle.PlainLink;
import ropewalk.split.Evidence;
import ropewalk.split.Findings;
import ropewalk.split.Obstruction;
import ropewalk.split.Partition;
import ropewalk.split.Separator;
import ropewalk.split.Verdict;

/** Bundles that go and come back, guests that are slow, and guests that lie. */
class ComingAndGoingTest {

    private final Detection detection = Detection.installed();
    private final List<ServiceRegistration<?>> registered = new ArrayList<>();

    @AfterEach
    void takeAway() {
        registered.forEach(ServiceRegistration::unregister);
    }

    private <S> void register(Class<S> type, S service, Object... properties) {
        Hashtable<String, Object> table = new Hashtable<>();
        for (int i = 0; i < properties.length; i += 2) {
            table.put((String) properties[i], properties[i + 1]);
        }
        registered.add(Detection.SERVICES.context().registerService(type, service, table));
    }

    private static Obstruction obstruction(String name, Looking looking) {
        return new Obstruction() {
            @Override
            public String name() {
                return name;
            }

            @Override
            public void examine(LinkDiagram link, Findings findings, Effort effort) {
                looking.look(link, findings, effort);
            }
        };
    }

    private static Separator separator(String name, Looking looking) {
        return new Separator() {
            @Override
            public String name() {
                return name;
            }

            @Override
            public void search(LinkDiagram link, Findings findings, Effort effort) {
                looking.look(link, findings, effort);
            }
        };
    }

    private interface Looking {
        void look(LinkDiagram link, Findings findings, Effort effort);
    }

    private static final Evidence TRUE = new Evidence("true", "nobody 0", "{}");
    private static final Evidence LIE = new Evidence("lie", "nobody 0", "{}");

    @Test
    void withoutTheLawsNothingIsNotSplit() throws BundleException {
        LinkDiagram hopf = TorusLink.of(2, 2);
        LinkDiagram rings = WheelClosure.of(3);
        assertEquals("not split", detection.decide(hopf).word());
        Bundle laws = Detection.SERVICES.bundle("ropewalk.split.laws");
        laws.stop();
        try {
            for (LinkDiagram link : List.of(hopf, rings)) {
                Verdict verdict = detection.decide(link);
                assertEquals("undecided", verdict.word());
                assertEquals(List.of(), verdict.arguments());
                assertEquals(List.of("pieces of the diagram", "reduction by R1 and R2"), verdict.tried());
            }
            assertEquals("split", detection.decide(SplitUnion.of(hopf, rings)).word());
        } finally {
            laws.start();
        }
        Detection.installed();
        assertEquals("not split", detection.decide(hopf).word());
        assertEquals("not split", detection.decide(rings).word());
    }

    @Test
    void withoutTheMovesNothingIsSplit() throws BundleException {
        LinkDiagram apart = SplitUnion.of(TorusLink.of(2, 2), SplitUnion.ofCircles(1));
        Bundle moves = Detection.SERVICES.bundle("ropewalk.split.moves");
        moves.stop();
        try {
            Verdict verdict = detection.raw(apart, 20);
            assertEquals("undecided", verdict.word());
            assertEquals("[[1,2],[3]]", verdict.together().text());
        } finally {
            moves.start();
        }
        Detection.installed();
        assertEquals("split", detection.decide(apart).word());
    }

    @Test
    void withoutMethodsTheLawsSayNothing() throws BundleException {
        List<Bundle> bundles = List.of(Detection.SERVICES.bundle("ropewalk.invariant.chessboard"),
                Detection.SERVICES.bundle("ropewalk.invariant.colouring"),
                Detection.SERVICES.bundle("ropewalk.invariant.linking"));
        for (Bundle bundle : bundles) {
            bundle.stop();
        }
        try {
            assertEquals("undecided", detection.decide(TorusLink.of(2, 2)).word());
            bundles.get(1).start();
            assertEquals("not split", detection.raw(TorusLink.of(2, 2), 20).word());
        } finally {
            for (Bundle bundle : bundles) {
                bundle.start();
            }
        }
        Detection.installed();
        assertEquals("not split", detection.decide(TorusLink.of(2, 2)).word());
    }

    /** A guest's invariant with a split law becomes an obstruction by itself, and stops being one when it leaves. */
    @Test
    void droppedInInvariantBecomesAnObstruction() {
        LinkDiagram link = Hard.undecided();
        assertEquals("undecided", detection.decide(link).word());
        SplitLaw<IntegerValue> law = (left, right, which) -> IntegerValue.of(0);
        Invariant<IntegerValue> guest = new InvariantBase<>("guest.trial", "Trial", "One for every link (this test).",
                IntegerValue.class) {
            @Override
            public Optional<SplitLaw<IntegerValue>> splitLaw() {
                return Optional.of(law);
            }
        };
        registerGuest(guest, (l, effort) -> new Outcome.Exact<>(IntegerValue.of(1)));
        Verdict verdict = detection.raw(link, 20);
        assertEquals("not split", verdict.word());
        assertEquals("law.guest.trial", verdict.arguments().get(0).evidence().kind());
        assertTrue(verdict.arguments().get(0).evidence().grade().startsWith("relies on ropewalk.split.tests "),
                verdict.arguments().get(0).evidence().grade());
        takeAway();
        registered.clear();
        assertEquals("undecided", detection.decide(link).word());
    }

    private void registerGuest(Invariant<IntegerValue> invariant, Method<? extends Value> method) {
        register(Invariant.class, invariant);
        register(Method.class, method, Method.ID, "guest.trial.one", Method.INVARIANT, "guest.trial");
    }

    /** A value of the wrong type, a thrown error and an inapplicable method prove nothing and break no verdict. */
    @Test
    void brokenMethodsOfAGuestProveNothing() {
        SplitLaw<IntegerValue> law = (left, right, which) -> IntegerValue.of(left.value().intValue() + 1);
        Invariant<IntegerValue> guest = new InvariantBase<>("guest.trial", "Trial", "Broken (this test).",
                IntegerValue.class) {
            @Override
            public Optional<SplitLaw<IntegerValue>> splitLaw() {
                return Optional.of(law);
            }
        };
        List<Method<? extends Value>> broken = List.of(
                (Method<Value.TextValue>) (l, effort) -> new Outcome.Exact<>(new Value.TextValue("wrong type")),
                (Method<IntegerValue>) (l, effort) -> new Outcome.NotApplicable<>("never"),
                (Method<IntegerValue>) (l, effort) -> new Outcome.Failed<>("always"),
                (Method<IntegerValue>) (l, effort) -> null,
                (Method<IntegerValue>) (l, effort) -> new Outcome.Exact<>(null),
                (Method<IntegerValue>) (l, effort) -> {
                    throw new IllegalStateException("broken");
                });
        for (Method<? extends Value> method : broken) {
            registerGuest(guest, method);
            assertEquals("undecided", detection.raw(Hard.undecided(), 20).word());
            assertEquals("not split", detection.raw(TorusLink.of(2, 2), 20).word());
            takeAway();
            registered.clear();
        }
    }

    @Test
    void slowObstructionIsCutAndTheRestKept() {
        // Hopf link beside the Bing double: the pieces and the Hopf link are known before the slow one comes.
        LinkDiagram link = SplitUnion.of(TorusLink.of(2, 2), Hard.undecided());
        register(Obstruction.class, obstruction("slow", (l, findings, effort) -> {
            while (true) {
                effort.checkpoint();
            }
        }), Obstruction.COST, 500);
        Verdict verdict = detection.raw(link, 0.5);
        assertTrue(verdict.limit().contains("processor time"), verdict.limit());
        assertTrue(verdict.tried().contains("slow"), verdict.tried()::toString);
        Detection.assertConsistent(verdict, 4);
        assertEquals("split", verdict.word());
        assertEquals("[[1,2],[3,4]]", verdict.apart().text());
        assertEquals("[[1,2],[3],[4]]", verdict.together().text());
        assertFalse(verdict.isDecided());
    }

    @Test
    void whatASlowObstructionFoundBeforeItWasCutIsKept() {
        register(Obstruction.class, obstruction("slow finder", (l, findings, effort) -> {
            findings.together(Partition.whole(2), LIE);
            while (true) {
                effort.checkpoint();
            }
        }), Obstruction.COST, 500);
        Verdict verdict = detection.raw(Hard.undecided(), 0.5);
        assertEquals("not split", verdict.word());
        assertFalse(verdict.limit().isEmpty());
    }

    @Test
    void obstructionThatTiesSomeLoosePiecesIsLoud() {
        LinkDiagram three = SplitUnion.of(TorusLink.of(2, 3), TorusLink.of(2, 3), SplitUnion.ofCircles(1));
        register(Obstruction.class, obstruction("liar", (l, findings, effort) -> {
            if (l.components() == 3) {
                findings.together(Partition.of(0, 0, 1), LIE);
            }
        }), Obstruction.COST, -1);
        IllegalStateException loud = assertThrows(IllegalStateException.class, () -> detection.raw(three, 20));
        assertTrue(loud.getMessage().contains("wrong"), loud.getMessage());
    }

    /** An obstruction cannot end the search before the diagram itself has been looked at. */
    @Test
    void obstructionThatTiesAllLoosePiecesIsNotBelieved() {
        for (int cost : new int[] {-1, 0, 1, 75}) {
            register(Obstruction.class, obstruction("a liar", (l, findings, effort) ->
                    findings.together(Partition.whole(l.components()), LIE)), Obstruction.COST, cost);
            try {
                assertEquals("split", detection.raw(SplitUnion.ofCircles(2), 20).word(), "cost " + cost);
            } catch (IllegalStateException loud) {
                assertTrue(loud.getMessage().contains("wrong"), loud.getMessage());
            }
            takeAway();
            registered.clear();
        }
    }

    /** A guest that pulls linked rings apart contradicts their linking number. */
    @Test
    void separatorAgainstAProofIsLoud() throws BundleException {
        register(Separator.class, separator("liar", (l, findings, effort) ->
                findings.apart(Partition.singles(l.components()), l, LIE)), Obstruction.COST, 20);
        LinkDiagram chain = BraidClosure.of(3, 1, 1, 2, -2);
        Bundle moves = Detection.SERVICES.bundle("ropewalk.split.moves");
        moves.stop();       // else the true separation comes before the lie
        try {
            IllegalStateException loud = assertThrows(IllegalStateException.class, () -> detection.raw(chain, 20));
            assertTrue(loud.getMessage().contains("one of the two arguments is wrong"), loud.getMessage());
        } finally {
            moves.start();
            takeAway();
            registered.clear();
            Detection.installed();
        }
    }

    /** After a true separation, what was proved of the whole must still be known of the parts. */
    @Test
    void separatorAgainstAProofOnTheWholeIsLoudOrNotAsked() throws BundleException {
        register(Separator.class, separator("liar", (l, findings, effort) -> {
            if (l.components() == 4) {
                findings.apart(Partition.of(0, 0, 0, 1), l, TRUE);
            } else {
                findings.apart(Partition.of(0, 1, 1), l, LIE);
            }
        }), Obstruction.COST, 20);
        List<Partition> proved = new ArrayList<>();
        register(Obstruction.class, obstruction("proof", (l, findings, effort) -> {
            if (l.components() == 4) {
                findings.together(proved.get(0), TRUE);
            }
        }), Obstruction.COST, 5);
        LinkDiagram chain = BraidClosure.of(4, 1, 1, 2, 2, 3, -3);
        Bundle laws = Detection.SERVICES.bundle("ropewalk.split.laws");
        laws.stop();
        try {
            proved.add(Partition.of(0, 0, 1, 2));
            assertThrows(IllegalStateException.class, () -> detection.raw(chain, 20));
            proved.set(0, Partition.of(0, 0, 0, 1));
            Verdict verdict = detection.raw(chain, 20);
            Detection.assertConsistent(verdict, 4);
            assertEquals("[[1,2,3],[4]]", verdict.apart().text());
        } finally {
            laws.start();
            takeAway();
            registered.clear();
            Detection.installed();
        }
    }

    /** Split links in connected diagrams, with nothing to pull them apart: the laws alone must not tie them. */
    @Test
    void lawsAloneNeverTieAcrossASphere() throws BundleException {
        Bundle moves = Detection.SERVICES.bundle("ropewalk.split.moves");
        moves.stop();
        try {
            int tied = 0;
            for (int seed = 0; seed < 200; seed++) {
                Unions.Known known = Unions.random(seed);
                LinkDiagram link = seed % 4 == 0 ? known.link() : Scrambled.of(seed, known.link(), seed % 4 * 5);
                try {
                    Verdict verdict = seed % 4 == 0 ? detection.raw(link, 20) : detection.decide(link);
                    assertEquals("undecided", verdict.word());
                    assertTrue(Detection.refines(verdict.together(), known.pieces()), () -> "together "
                            + verdict.together() + " across the pieces " + known.pieces());
                    tied += verdict.together().equals(known.pieces()) ? 1 : 0;
                } catch (AssertionError | RuntimeException e) {
                    throw Unions.at("union of seed " + seed, link, e);
                }
            }
            assertTrue(tied > 100, "the laws find the pieces of only " + tied);
        } finally {
            moves.start();
        }
        Detection.installed();
    }

    /** Links that do not split, with nothing to stop the moves. */
    @Test
    void movesAloneNeverPullALinkApartThatDoesNotSplit() throws BundleException {
        Bundle laws = Detection.SERVICES.bundle("ropewalk.split.laws");
        laws.stop();
        try {
            for (Map.Entry<String, LinkDiagram> hard : Hard.links().entrySet()) {
                for (int seed = 0; seed < 6; seed++) {
                    LinkDiagram link = Scrambled.of(seed, hard.getValue(), 10 * seed);
                    try {
                        assertEquals("undecided", detection.decide(link).word());
                    } catch (AssertionError | RuntimeException e) {
                        throw Unions.at(hard.getKey() + " scrambled by " + seed, link, e);
                    }
                }
            }
            for (int seed = 0; seed < 300; seed++) {
                LinkDiagram link = RandomDiagrams.plane(seed, 2 + seed % 30);
                try {
                    int pieces = detection.decide(link).apart().classes();
                    assertTrue(pieces - 1 <= new PlainLink(link).nullity(), pieces + " pieces");
                } catch (AssertionError | RuntimeException e) {
                    throw Unions.at("plane(" + seed + ")", link, e);
                }
            }
        } finally {
            laws.start();
        }
        Detection.installed();
    }
}
