package ropewalk.diagram.notation;

import java.util.Arrays;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.NotADiagramException;

/**
 * Reads braid words: {@code n: w1 w2 …}, closed up in the standard way. All n strands run downwards; the letter i is a
 * positive (right-handed) crossing of the strands at the positions i and i + 1 from the left, the letter -i the
 * negative one, so that {@code 2: 1 1 1} is the right-handed trefoil. A word without letters, {@code 3:}, is the
 * unlink of three components. Blanks or a comma stand between letters.
 *
 * <p>Crossings are numbered in the order of the letters, components by their leftmost strand at the top; a component
 * starts with that strand, on the edge that comes round the closure. There are at most 1,000,000 strands.
 *
 * <p>Cost O(n + length) time; the scratch arrays are used again.
 */
final class BraidReader implements CodeReader {

    private static final int MOST_STRANDS = 1_000_000;
    private static final int MOST_LETTERS = 536_000_000;

    private int[] tops = new int[16];           // by position: the first dart from the top, or -1
    private int[] ends = new int[16];           // by position: the outgoing dart that waits for its other end, or -1
    private int[] strands = new int[16];        // by position: where the strand here began at the top
    private int[] mates = new int[256];
    private byte[] signs = new byte[64];
    private int[] starts = new int[16];
    private int crossings;

    @Override
    public void read(byte[] text, int from, int to, LinkBatch.Builder batch) throws CodeException {
        Scan s = new Scan(text, from, to);
        int n = strands(s);
        prepare(n);
        letters(s, n);
        int components = close(n);
        try {
            batch.add(crossings, mates, signs, components, starts);
        } catch (NotADiagramException e) {
            throw new IllegalStateException("a closed braid is a diagram", e);
        }
    }

    private static int strands(Scan s) throws CodeException {
        s.skipBlanks();
        int at = s.at();
        if (!Scan.isDigit(s.peek())) {
            throw new CodeException(at, "the number of strands is expected, found " + s.found()
                    + "; a braid word is written as 3: 1 -2 1");
        }
        long n = s.number(MOST_STRANDS, "a number of strands");
        if (n == 0) {
            throw new CodeException(at, "a braid of 0 strands; it has at least 1");
        }
        s.skipBlanks();
        if (s.peek() != ':') {
            throw new CodeException(s.at(), "':' is expected after the number of strands, found " + s.found());
        }
        s.step();
        return (int) n;
    }

    private void prepare(int n) {
        crossings = 0;
        if (tops.length <= n) {
            tops = new int[n + 1];
            ends = new int[n + 1];
            strands = new int[n + 1];
            starts = new int[n + 1];
        }
        Arrays.fill(tops, 1, n + 1, -1);
        Arrays.fill(ends, 1, n + 1, -1);
        for (int p = 1; p <= n; p++) {
            strands[p] = p;
        }
    }

    private void letters(Scan s, int n) throws CodeException {
        s.skipBlanks();
        while (!s.atEnd()) {
            int at = s.at();
            boolean negative = s.peek() == '-';
            if (negative) {
                s.step();
            }
            if (!Scan.isDigit(s.peek())) {
                throw new CodeException(s.at(), (negative ? "a digit is expected after '-', found "
                        : "a letter is expected, found ") + s.found()
                        + "; letters are whole numbers like 2 and -2, without '+'");
            }
            int letter = (int) s.numberOrMore(MOST_STRANDS, "a letter");
            if (letter == 0) {
                throw new CodeException(at, "letter 0; " + range(n));
            }
            if (letter >= n) {
                throw new CodeException(at, "letter " + s.since(at) + " is out of range; " + range(n));
            }
            if (crossings == MOST_LETTERS) {
                throw new CodeException(at, "more than " + MOST_LETTERS + " letters; a diagram holds no more crossings");
            }
            cross(letter, negative);
            separator(s);
        }
    }

    private static String range(int n) {
        return n == 1 ? "a braid of 1 strand has no letters" : n == 2 ? "the letters of a braid of 2 strands are 1 and -1"
                : "the letters of a braid of " + n + " strands run from 1 to " + (n - 1) + " and from -1 to -" + (n - 1);
    }

    private static void separator(Scan s) throws CodeException {
        int end = s.at();
        s.skipBlanks();
        if (s.peek() == ',') {
            s.step();
            s.skipBlanks();
            if (s.atEnd()) {
                throw new CodeException(s.at(), "a letter is expected after ',', found " + s.found());
            }
        } else if (!s.atEnd() && s.at() == end) {
            throw new CodeException(end, "a blank or ',' is expected after a letter, found " + s.found());
        }
    }

    private void cross(int left, boolean negative) {
        int c = crossings++;
        if (mates.length < 4 * crossings) {
            int more = 4 * (int) Math.min(MOST_LETTERS, 2L * signs.length);
            mates = Arrays.copyOf(mates, more);
            signs = Arrays.copyOf(signs, more / 4);
        }
        // Counter-clockwise from the upper left: upper left, lower left, lower right, upper right. The under-strand
        // comes in at the upper left of a positive crossing and at the upper right of a negative one.
        int turn = negative ? 1 : 0;
        signs[c] = (byte) (negative ? -1 : 1);
        enter(left, 4 * c + turn);
        enter(left + 1, 4 * c + ((3 + turn) & 3));
        ends[left] = 4 * c + 1 + turn;
        ends[left + 1] = 4 * c + 2 + turn;
        int strand = strands[left];
        strands[left] = strands[left + 1];
        strands[left + 1] = strand;
    }

    private void enter(int position, int dart) {
        if (ends[position] < 0) {
            tops[position] = dart;
        } else {
            join(ends[position], dart);
        }
    }

    private void join(int a, int b) {
        mates[a] = b;
        mates[b] = a;
    }

    /** Joins bottom to top and finds the components, the cycles of the permutation; returns their number. */
    private int close(int n) {
        int components = 0;
        for (int p = 1; p <= n; p++) {
            if (ends[p] >= 0) {
                join(ends[p], tops[p]);
            }
            int next = strands[p];
            if (next != 0) {
                starts[components++] = ends[p];
            }
            for (int q = p; next != 0; next = strands[q]) {
                strands[q] = 0;                 // met
                q = next;
            }
        }
        return components;
    }
}
