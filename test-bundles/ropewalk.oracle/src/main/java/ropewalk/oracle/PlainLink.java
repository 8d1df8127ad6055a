package ropewalk.oracle;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;
import ropewalk.diagram.LinkDiagram;

/**
 * What can be read off a diagram with nothing but its darts: arcs, pieces and Seifert circles by merging, the colouring
 * matrix by the arcs, linking numbers by the crossings at which one component passes over the other.
 */
public final class PlainLink {

    private final LinkDiagram diagram;

    /**
     * A diagram to look at.
     *
     * @param diagram any diagram
     */
    public PlainLink(LinkDiagram diagram) {
        this.diagram = diagram;
    }

    /** Sets that are merged; names are numbered by first element. */
    private static final class Merging {
        private final int[] parent;

        Merging(int size) {
            parent = new int[size];
            Arrays.setAll(parent, i -> i);
        }

        int find(int x) {
            return parent[x] == x ? x : (parent[x] = find(parent[x]));
        }

        void merge(int x, int y) {
            parent[Math.max(find(x), find(y))] = Math.min(find(x), find(y));
        }

        int[] numbered() {
            int[] number = new int[parent.length];
            int count = 0;
            for (int i = 0; i < number.length; i++) {
                number[i] = find(i) == i ? count++ : number[find(i)];
            }
            return number;
        }

        int count() {
            int count = 0;
            for (int i = 0; i < parent.length; i++) {
                count += find(i) == i ? 1 : 0;
            }
            return count;
        }
    }

    private int circles() {
        int circles = 0;
        for (int i = 0; i < diagram.components(); i++) {
            circles += diagram.start(i) < 0 ? 1 : 0;
        }
        return circles;
    }

    private Merging edges() {
        Merging ends = new Merging(diagram.darts());
        for (int d = 0; d < diagram.darts(); d++) {
            ends.merge(d, diagram.mate(d));
        }
        return ends;
    }

    private Merging arcsOfDarts() {
        Merging ends = edges();
        for (int c = 0; c < diagram.crossings(); c++) {
            ends.merge(4 * c + 1, 4 * c + 3);
        }
        return ends;
    }

    /**
     * The number of arcs.
     *
     * @return circles without crossings counted
     */
    public int arcs() {
        return arcsOfDarts().count() + circles();
    }

    /**
     * The unreduced colouring matrix; circles without crossings have the last columns.
     *
     * @return a row for each crossing, a column for each arc
     */
    public long[][] colouringRows() {
        int[] arc = arcsOfDarts().numbered();
        long[][] rows = new long[diagram.crossings()][arcs()];
        for (int c = 0; c < rows.length; c++) {
            rows[c][arc[4 * c + 1]] += 2;
            rows[c][arc[4 * c]] -= 1;
            rows[c][arc[4 * c + 2]] -= 1;
        }
        return rows;
    }

    /**
     * H₁ of the double branched cover, without the summand Z that every colouring matrix has.
     *
     * @return factors above 1, then zeros
     */
    public List<BigInteger> factors() {
        List<BigInteger> factors = new ExactMatrix(colouringRows(), arcs()).factors();
        return factors.subList(0, factors.size() - 1);
    }

    /**
     * The determinant: the order of H₁ of the double branched cover, 0 where it is infinite.
     *
     * @return the product of the factors
     */
    public BigInteger determinant() {
        return factors().stream().reduce(BigInteger.ONE, BigInteger::multiply);
    }

    /**
     * The rank of H₁ of the double branched cover.
     *
     * @return the zeros among the factors
     */
    public int nullity() {
        return (int) factors().stream().filter(d -> d.signum() == 0).count();
    }

    /**
     * The number of colourings, found by trying all.
     *
     * @param n how many colours; n to the power of arcs must be small
     * @return how many assignments satisfy every crossing
     */
    public long colourings(int n) {
        long[][] rows = colouringRows();
        int arcs = arcs();
        long all = Math.round(Math.pow(n, arcs));
        long good = 0;
        for (long code = 0; code < all; code++) {
            boolean fits = true;
            for (int c = 0; c < rows.length && fits; c++) {
                long sum = 0;
                long rest = code;
                for (int a = 0; a < arcs; a++) {
                    sum += rows[c][a] * (rest % n);
                    rest /= n;
                }
                fits = sum % n == 0;
            }
            good += fits ? 1 : 0;
        }
        return good;
    }

    /**
     * Linking numbers: the sum of the signs where the one passes over the other, which is half the sum over all crossings
     * between the two.
     *
     * @return the matrix, 0 on the diagonal
     */
    public long[][] linking() {
        long[][] over = new long[diagram.components()][diagram.components()];
        for (int c = 0; c < diagram.crossings(); c++) {
            int top = diagram.component(4 * c + 3);
            int bottom = diagram.component(4 * c + 2);
            if (top != bottom) {
                over[top][bottom] += diagram.sign(c);
            }
        }
        return over;
    }

    /**
     * The connected pieces of the diagram.
     *
     * @return how many, circles without crossings counted
     */
    public int pieces() {
        return piecesOfDarts().count() + circles();
    }

    private Merging piecesOfDarts() {
        Merging ends = edges();
        for (int d = 0; d < diagram.darts(); d++) {
            ends.merge(d, d & ~3);
        }
        return ends;
    }

    /**
     * Which components hang together in the diagram.
     *
     * @return for each component a mark; equal marks in one piece
     */
    public int[] pieceOfComponents() {
        Merging ends = piecesOfDarts();
        int[] marks = new int[diagram.components()];
        for (int i = 0; i < marks.length; i++) {
            marks[i] = diagram.start(i) < 0 ? diagram.darts() + i : ends.find(diagram.start(i));
        }
        return marks;
    }

    /**
     * The Seifert circles (Seifert 1934).
     *
     * @return how many, circles without crossings counted
     */
    public int seifertCircles() {
        Merging ends = edges();
        for (int c = 0; c < diagram.crossings(); c++) {
            int overIn = diagram.sign(c) > 0 ? 4 * c + 3 : 4 * c + 1;
            int overOut = overIn ^ 2;
            ends.merge(4 * c, overOut);         // what comes in below goes out above
            ends.merge(overIn, 4 * c + 2);
        }
        return ends.count() + circles();
    }
}
