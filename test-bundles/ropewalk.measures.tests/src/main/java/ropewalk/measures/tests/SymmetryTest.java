package ropewalk.measures.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.moves.Reduction;
import ropewalk.families.Scrambled;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.Value;
import ropewalk.invariant.Value.IntegerMatrixValue;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.RankedMethod;
import ropewalk.oracle.PlainLink;
import ropewalk.oracle.Renumbered;

/** What a change of the diagram does to each value, by every installed method. */
class SymmetryTest {

    private final Installed installed = new Installed();

    private interface Rule {
        /** The text that the changed diagram must have. */
        Optional<String> expected(Invariant<?> definition, Value before);
    }

    private void holds(LinkDiagram before, LinkDiagram after, String change, Rule rule) {
        for (CatalogueEntry entry : installed.entries()) {
            Invariant<?> definition = entry.definition().orElseThrow();
            for (RankedMethod method : entry.methods()) {
                Value value = Installed.exact(method, before);
                rule.expected(definition, value).ifPresent(text -> assertEquals(text,
                        Installed.exact(method, after).text(), () -> method.id() + " under " + change + " of "
                                + value.text()));
            }
        }
    }

    /** The invariant's own rule; its value has been checked by the method that gave it. */
    @SuppressWarnings("unchecked")
    private static Optional<String> applied(Optional<? extends UnaryOperator<?>> rule, Value value) {
        return rule.map(r -> ((UnaryOperator<Value>) r).apply(value).text());
    }

    @Test
    void mirrorImage() {
        Sample.each(Sample.all(), d -> holds(d, d.mirrored(), "mirror image",
                (definition, value) -> applied(definition.underMirrorImage(), value)));
    }

    @Test
    void reversalOfAllComponents() {
        Sample.each(Sample.all(), d -> holds(d, d.reversed(), "reversal",
                (definition, value) -> applied(definition.underReversal(), value)));
    }

    @Test
    void reversalOfSomeComponentsChangesNothingThatNeedsNoOrientation() {
        Random random = new Random(5);
        Sample.each(Sample.all(), d -> holds(d, d.reversed(some(d, random)), "partial reversal",
                (definition, value) -> definition.needsOrientation() ? Optional.empty() : Optional.of(value.text())));
    }

    /** Linking numbers change sign where exactly one of the two is turned round. */
    @Test
    void reversalOfSomeComponentsAndLinkingNumbers() {
        Random random = new Random(6);
        Sample.each(Sample.all(), d -> {
            boolean[] which = some(d, random);
            List<List<BigInteger>> before = ((IntegerMatrixValue) installed.value("linking", d)).rows();
            List<List<BigInteger>> after = new ArrayList<>();
            for (int i = 0; i < which.length; i++) {
                List<BigInteger> row = new ArrayList<>();
                for (int j = 0; j < which.length; j++) {
                    BigInteger lk = before.get(i).get(j);
                    row.add(which[i] == which[j] ? lk : lk.negate());
                }
                after.add(row);
            }
            assertEquals(new IntegerMatrixValue(after).text(), installed.text("linking", d.reversed(which)));
        });
    }

    /**
     * Murasugi, "On the signature of links", Topology 9 (1970): with the part K turned round, the signature grows by twice
     * the linking number of K with the rest. (Sign checked on the Hopf link: positive -1, negative 1.)
     */
    @Test
    void reversalOfSomeComponentsAndSignature() {
        Random random = new Random(7);
        Sample.each(Sample.all(), d -> {
            boolean[] which = some(d, random);
            long[][] linking = new PlainLink(d).linking();
            long between = 0;
            for (int i = 0; i < which.length; i++) {
                for (int j = 0; j < which.length; j++) {
                    between += which[i] && !which[j] ? linking[i][j] : 0;
                }
            }
            assertEquals(installed.number("signature", d) + 2 * between,
                    installed.number("signature", d.reversed(which)));
        });
    }

    @Test
    void removalOfKinksAndBigons() {
        Sample.each(Sample.all(), d -> holds(d, Reduction.of(d).result(), "reduction",
                (definition, value) -> Optional.of(value.text())));
    }

    @Test
    void otherNumbersForCrossingsAndStarts() {
        Random random = new Random(8);
        Sample.each(Sample.all(), d -> {
            Renumbered other = Renumbered.all(d, random);
            holds(d, other.diagram(), "renumbering", (definition, value) -> Optional.of(
                    definition.id().equals("linking") ? permuted((IntegerMatrixValue) value, other.newNumber())
                            : value.text()));
        });
    }

    /** Reidemeister moves in all directions keep the link (Reidemeister 1927), so they keep every value. */
    @Test
    void reidemeisterMoves() {
        List<Sample> samples = Sample.all().stream().filter(s -> s.diagram().crossings() <= 30).toList();
        long[] seed = {0};
        Sample.each(samples, d -> {
            long s = ++seed[0];
            holds(d, Scrambled.of(s, d, 25), "scrambling with seed " + s,
                    (definition, value) -> Optional.of(value.text()));
        });
    }

    private static String permuted(IntegerMatrixValue matrix, int[] newNumber) {
        long[][] rows = new long[newNumber.length][newNumber.length];
        for (int i = 0; i < rows.length; i++) {
            for (int j = 0; j < rows.length; j++) {
                rows[newNumber[i]][newNumber[j]] = matrix.rows().get(i).get(j).longValueExact();
            }
        }
        return IntegerMatrixValue.of(rows).text();
    }

    private static boolean[] some(LinkDiagram d, Random random) {
        boolean[] which = new boolean[d.components()];
        for (int i = 0; i < which.length; i++) {
            which[i] = random.nextBoolean();
        }
        return which;
    }
}
