package ropewalk.measures.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.LinkDiagram;
import ropewalk.families.BraidClosure;
import ropewalk.families.RandomDiagrams;
import ropewalk.invariant.Value.IntegerList;
import ropewalk.invariant.Value.IntegerMatrixValue;
import ropewalk.invariant.catalogue.RankedMethod;
import ropewalk.oracle.ExactMatrix;
import ropewalk.oracle.PlainLink;

/** Theorems that tie the values to each other and to counts by other routes. */
class RelationsTest {

    private static final int[] PRIMES = {3, 5, 7};

    private final Installed installed = new Installed();

    private List<BigInteger> factors(LinkDiagram d) {
        return ((IntegerList) installed.value("factors", d)).values();
    }

    @Test
    void determinantAndNullityFollowFromTheFactors() {
        Sample.each(Sample.all(), d -> {
            List<BigInteger> factors = factors(d);
            assertEquals(factors.stream().reduce(BigInteger.ONE, BigInteger::multiply).toString(),
                    installed.text("determinant", d));
            assertEquals(factors.stream().filter(f -> f.signum() == 0).count(), installed.number("nullity", d));
            for (int i = 0; i < factors.size(); i++) {
                assertTrue(factors.get(i).signum() >= 0 && !factors.get(i).equals(BigInteger.ONE), "normal form");
                if (i > 0) {
                    boolean divides = factors.get(i - 1).signum() == 0 ? factors.get(i).signum() == 0
                            : factors.get(i).mod(factors.get(i - 1)).signum() == 0;
                    assertTrue(divides, "each factor divides the next: " + factors);
                }
            }
        });
    }

    /** Presentation by the colouring matrix, reduced by Euclid's algorithm, against the Goeritz forms. */
    @Test
    void factorsByTheColouringMatrix() {
        List<Sample> samples = Sample.all().stream().filter(s -> s.diagram().crossings() <= 40).toList();
        Sample.each(samples, d -> {
            PlainLink plain = new PlainLink(d);
            List<BigInteger> expected = plain.factors();
            assertEquals(expected, factors(d));
            BigInteger product = expected.stream().reduce(BigInteger.ONE, BigInteger::multiply);
            for (RankedMethod method : installed.entry("determinant").methods()) {
                assertEquals(product.toString(), Installed.exact(method, d).text(), method.id());
            }
        });
    }

    /** Fox 1962: n-colourings are the homomorphisms of Z ⊕ H₁ to Z/n. */
    @Test
    void coloursFollowFromTheFactors() {
        Sample.each(Sample.all(), d -> {
            for (int p : PRIMES) {
                BigInteger n = BigInteger.valueOf(p);
                BigInteger expected = factors(d).stream().map(n::gcd).reduce(n, BigInteger::multiply);
                assertEquals(expected.toString(), installed.text("fox" + p, d));
            }
        });
    }

    @Test
    void coloursByTryingAll() {
        int tried = 0;
        for (int p : PRIMES) {
            List<Sample> few = Sample.small(p == 3 ? 9 : 5).stream()
                    .filter(s -> Math.pow(p, new PlainLink(s.diagram()).arcs()) < 20_000).toList();
            tried += few.size();
            Sample.each(few, d -> assertEquals(Long.toString(new PlainLink(d).colourings(p)),
                    installed.text("fox" + p, d)));
        }
        assertTrue(tried > 400, "only " + tried);
    }

    @Test
    void linkingNumbersByTheCrossingsWhereOnePassesOverTheOther() {
        Sample.each(Sample.all(), d -> {
            long[][] over = new PlainLink(d).linking();
            assertEquals(IntegerMatrixValue.of(over).text(), installed.text("linking", d));
            for (int i = 0; i < over.length; i++) {
                for (int j = 0; j < i; j++) {
                    assertEquals(over[i][j], over[j][i], "linking is symmetric");
                }
            }
        });
    }

    @Test
    void linkingNumbersOfASublink() {
        Random random = new Random(21);
        Sample.each(Sample.all(), d -> {
            boolean[] keep = new boolean[d.components()];
            List<Integer> kept = new ArrayList<>();
            for (int i = 0; i < keep.length; i++) {
                keep[i] = random.nextInt(3) > 0;
                if (keep[i]) {
                    kept.add(i);
                }
            }
            if (!kept.isEmpty()) {
                List<List<BigInteger>> whole = ((IntegerMatrixValue) installed.value("linking", d)).rows();
                assertEquals(new IntegerMatrixValue(kept.stream().map(i -> kept.stream().map(j -> whole.get(i).get(j))
                        .toList()).toList()).text(), installed.text("linking", d.sublink(keep)));
            }
        });
    }

    /**
     * The signature of a form of rank 1 - χ(F) - nullity, F a connected Seifert surface with k boundary curves: σ has the
     * parity of k - 1 + nullity. On the surface of the diagram's own Seifert circles (Seifert 1934), piece by piece, it is
     * at most crossings - circles + pieces, less the nullity of the pieces.
     */
    @Test
    void parityAndSizeOfTheSignature() {
        Sample.each(Sample.all(), d -> {
            int signature = installed.number("signature", d);
            int nullity = installed.number("nullity", d);
            assertEquals(Math.floorMod(d.components() - 1 + nullity, 2), Math.floorMod(signature, 2));
            PlainLink plain = new PlainLink(d);
            int pieces = plain.pieces();
            int rank = d.crossings() - plain.seifertCircles() + pieces - (nullity - pieces + 1);
            assertTrue(Math.abs(signature) <= rank, signature + " is the signature of a form of rank " + rank);
            assertTrue(nullity < d.components(), "nullity " + nullity + " of " + d.components() + " components");
            assertTrue(nullity >= pieces - 1, "nullity " + nullity + " of " + pieces + " pieces");
        });
    }

    /** Murasugi, Trans. AMS 117 (1965): a knot has odd determinant, and σ ≡ 0 mod 4 exactly if it is 1 mod 4. */
    @Test
    void determinantAndSignatureOfAKnot() {
        List<Sample> knots = new ArrayList<>(Sample.all().stream().filter(s -> s.diagram().components() == 1).toList());
        for (long seed = 1; knots.size() < 150; seed++) {
            LinkDiagram d = RandomDiagrams.plane(seed, 5 + (int) (seed % 40));
            if (d.components() == 1) {
                knots.add(new Sample("plane(" + seed + ", " + d.crossings() + ")", d));
            }
        }
        Sample.each(knots, d -> {
            BigInteger determinant = new BigInteger(installed.text("determinant", d));
            assertTrue(determinant.testBit(0), "even determinant " + determinant);
            assertEquals(determinant.mod(BigInteger.valueOf(4)).intValue() == 1,
                    Math.floorMod(installed.number("signature", d), 4) == 0, "determinant " + determinant);
            assertEquals(0, installed.number("nullity", d));
        });
    }

    /** Links have even determinant, with 0: they have the non-constant colourings modulo 2. */
    @Test
    void determinantOfALinkOfSeveralComponentsIsEven() {
        Sample.each(Sample.all(), d -> {
            if (d.components() > 1) {
                assertTrue(!new BigInteger(installed.text("determinant", d)).testBit(0));
                long even = factors(d).stream().filter(f -> !f.testBit(0)).count();
                assertEquals(d.components() - 1, even, "H₁ modulo 2 has dimension components - 1 (Fox 1962)");
            }
        });
    }

    /** A connected sum has the sum of the double branched covers, and Seifert surfaces side by side. */
    @Test
    void connectedSum() {
        for (long seed = 1; seed <= 80; seed++) {
            int m = 2 + (int) (seed % 3);
            int n = 2 + (int) (seed % 2);
            int[] left = RandomDiagrams.braidWord(seed, m, 4 + (int) (seed % 17));
            int[] right = RandomDiagrams.braidWord(-seed, n, 3 + (int) (seed % 13));
            int[] both = new int[left.length + right.length];
            System.arraycopy(left, 0, both, 0, left.length);
            for (int i = 0; i < right.length; i++) {        // strand m of the left one is strand 1 of the right one
                both[left.length + i] = right[i] + Integer.signum(right[i]) * (m - 1);
            }
            LinkDiagram a = BraidClosure.of(m, left);
            LinkDiagram b = BraidClosure.of(n, right);
            Sample.each(List.of(new Sample("sum of the closed braids of seed " + seed, BraidClosure.of(m + n - 1, both))),
                    sum -> {
                        assertEquals(new BigInteger(installed.text("determinant", a)).multiply(
                                new BigInteger(installed.text("determinant", b))).toString(),
                                installed.text("determinant", sum));
                        assertEquals(installed.number("signature", a) + installed.number("signature", b),
                                installed.number("signature", sum));
                        assertEquals(directSum(factors(a), factors(b)), factors(sum));
                    });
        }
    }

    private static List<BigInteger> directSum(List<BigInteger> a, List<BigInteger> b) {
        List<BigInteger> all = new ArrayList<>(a);
        all.addAll(b);
        long[][] diagonal = new long[all.size()][all.size()];
        for (int i = 0; i < diagonal.length; i++) {
            diagonal[i][i] = all.get(i).longValueExact();
        }
        return new ExactMatrix(diagonal, diagonal.length).factors();
    }
}
