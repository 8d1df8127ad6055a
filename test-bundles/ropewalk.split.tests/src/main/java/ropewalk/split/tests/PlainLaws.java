package ropewalk.split.tests;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import ropewalk.algebra.Inertia;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.Shading;
import ropewalk.oracle.ExactMatrix;
import ropewalk.oracle.JsonTree;
import ropewalk.oracle.PlainLink;
import ropewalk.split.Partition;
import ropewalk.structure.GoeritzForms;

/**
 * Values and split laws a second time, from the texts of the values alone: the colouring matrix, reduced by Euclid's
 * algorithm, for all that lives on H₁ of the double branched cover, and the other shading for the signature.
 */
final class PlainLaws {

    private PlainLaws() {
    }

    static String value(String invariant, LinkDiagram link) {
        PlainLink plain = new PlainLink(link);
        return switch (invariant) {
            case "determinant" -> plain.determinant().toString();
            case "nullity" -> Integer.toString(plain.nullity());
            case "factors" -> plain.factors().toString().replace(" ", "");
            case "linking" -> Arrays.deepToString(plain.linking()).replace(" ", "");
            case "signature" -> Integer.toString(signature(link));
            case "fox3", "fox5", "fox7" -> colours(plain.factors(), BigInteger.valueOf(prime(invariant))).toString();
            default -> throw new AssertionError("no second route to " + invariant);
        };
    }

    private static int prime(String fox) {
        return Integer.parseInt(fox.substring(3));
    }

    private static BigInteger colours(List<BigInteger> factors, BigInteger p) {
        return factors.stream().map(p::gcd).reduce(p, BigInteger::multiply);
    }

    private static int signature(LinkDiagram link) {
        GoeritzForms forms = GoeritzForms.of(link, Shading.of(link).opposite());
        int signature = 0;
        for (int p = 0; p < forms.count(); p++) {
            signature -= Inertia.of(forms.reduced(p), () -> { }).signature() + forms.correction(p);
        }
        return signature;
    }

    /** Which components the value of the whole link ties: all of them, or those that are linked. */
    static Partition tiedBy(String invariant, String value, int components) {
        boolean all = switch (invariant) {
            case "determinant" -> new BigInteger(value).signum() != 0;
            case "nullity" -> value.equals("0");
            case "factors" -> integers(value).stream().noneMatch(d -> d.signum() == 0);
            case "fox3", "fox5", "fox7" -> new BigInteger(value).intValueExact() < prime(invariant) * prime(invariant);
            default -> false;
        };
        if (!all && invariant.equals("linking")) {
            List<?> rows = (List<?>) JsonTree.read(value);
            Partition tied = Partition.singles(components);
            for (int i = 0; i < components; i++) {
                for (int j = 0; j < i; j++) {
                    if (!((List<?>) rows.get(i)).get(j).equals(0L)) {
                        int[] marks = new int[components];
                        Arrays.setAll(marks, m -> m);
                        marks[i] = j;
                        tied = tied.join(Partition.of(marks));
                    }
                }
            }
            return tied;
        }
        return all ? Partition.whole(components) : Partition.singles(components);
    }

    /** Whether the values of the two sides allow a sphere between them. */
    static boolean couldSplit(String invariant, String whole, String left, String right, boolean[] isLeft) {
        return switch (invariant) {
            case "determinant" -> whole.equals("0");
            case "nullity" -> number(whole) == number(left) + number(right) + 1;
            case "signature" -> number(whole) == number(left) + number(right);
            case "fox3", "fox5", "fox7" -> number(whole) == number(left) * number(right);
            case "factors" -> integers(whole).equals(sum(integers(left), integers(right)));
            case "linking" -> {
                List<?> rows = (List<?>) JsonTree.read(whole);
                boolean blocks = true;
                for (int i = 0; i < isLeft.length; i++) {
                    for (int j = 0; j < isLeft.length; j++) {
                        blocks &= isLeft[i] == isLeft[j] || ((List<?>) rows.get(i)).get(j).equals(0L);
                    }
                }
                yield blocks;
            }
            default -> throw new AssertionError("no second law of " + invariant);
        };
    }

    private static List<BigInteger> sum(List<BigInteger> left, List<BigInteger> right) {
        List<BigInteger> all = new ArrayList<>(left);
        all.addAll(right);
        all.add(BigInteger.ZERO);
        long[][] diagonal = new long[all.size()][all.size()];
        for (int i = 0; i < diagonal.length; i++) {
            diagonal[i][i] = all.get(i).longValueExact();
        }
        return new ExactMatrix(diagonal, diagonal.length).factors();
    }

    private static long number(String text) {
        return Long.parseLong(text);
    }

    private static List<BigInteger> integers(String list) {
        return ((List<?>) JsonTree.read(list)).stream().map(n -> BigInteger.valueOf((Long) n)).toList();
    }
}
