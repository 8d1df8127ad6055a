package ropewalk.diagram.notation;

import java.util.Arrays;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.NotADiagramException;

/**
 * Reads Dowker–Thistlethwaite sequences of knots (C. H. Dowker, M. B. Thistlethwaite, 1983). Walk along the knot and
 * number the passages through crossings 1, 2, …, 2n: each crossing gets an odd and an even number, and the sequence
 * lists the even partners of 1, 3, 5, …. A partner is positive where the odd passage runs over, negative where the
 * even one does; so all signs alike belong to an alternating diagram. {@code 4 6 2} is a trefoil, {@code 4 6 8 2} the
 * figure-eight knot. Blanks or a comma stand between numbers; brackets around all of them are let pass.
 *
 * <p><b>Which mirror image.</b> A sequence fixes a diagram on the sphere only up to mirror image, and each of its prime
 * summands for itself (a summand is what a circle cuts out that meets the curve twice; a nugatory crossing is one for
 * itself). Here, in each summand, the crossing that the walk from passage 1 meets first is positive. So {@code 4 6 2}
 * is the right-handed trefoil and {@code -4 -6 -2} again, seen from behind. The choice depends on the sequence alone.
 *
 * <p>Crossings are numbered in the order of the sequence; the knot starts on the edge that leads into passage 1.
 *
 * <p>Cost: O(n) beside the embedding; at most 20,000 crossings, since the embedding takes about 7 KB for each.
 */
final class DowkerReader implements CodeReader {

    static final int MOST_CROSSINGS = 20_000;

    private int[] evens = new int[64];          // signed, by crossing
    private int[] offsets = new int[64];
    private int crossings;

    @Override
    public void read(byte[] text, int from, int to, LinkBatch.Builder batch) throws CodeException {
        parse(new Scan(text, from, to));
        int[] crossingAt = pair();
        boolean[] oddIsOver = new boolean[crossings];
        for (int c = 0; c < crossings; c++) {
            oddIsOver[c] = evens[c] > 0;
        }
        boolean[] turns = ShadowEmbedding.turns(crossingAt, offsets);
        byte[] signs = signs(crossingAt, turns, oddIsOver);
        try {
            batch.add(crossings, mates(crossingAt, signs, oddIsOver), signs, 1,
                    new int[] {outgoing(crossingAt, signs, oddIsOver, 2 * crossings - 1)});
        } catch (NotADiagramException e) {
            throw new IllegalStateException("the embedding of a Dowker sequence is not plane: "
                    + Arrays.toString(Arrays.copyOf(evens, crossings)), e);
        }
    }

    private void parse(Scan s) throws CodeException {
        crossings = 0;
        s.skipBlanks();
        int open = "[({".indexOf(s.peek());
        if (open >= 0) {
            s.step();
            s.skipBlanks();
        }
        boolean more = s.peek() == '-' || Scan.isDigit(s.peek());
        if (!more) {
            throw new CodeException(s.at(), "an even number is expected, found " + s.found()
                    + "; a sequence has one for each crossing, as in 4 6 2");
        }
        while (more) {
            number(s);
            more = separator(s);
        }
        if (open >= 0) {
            char close = "])}".charAt(open);
            if (s.peek() != close) {
                throw new CodeException(s.at(), "a number or '" + close + "' is expected, found " + s.found());
            }
            s.step();
            s.skipBlanks();
            if (!s.atEnd()) {
                throw new CodeException(s.at(), s.found() + " after the end of the sequence; nothing may follow '" + close
                        + "'");
            }
        } else if (!s.atEnd()) {
            throw new CodeException(s.at(), "a number is expected, found " + s.found()
                    + "; numbers are even and whole, like 4 and -6");
        }
    }

    private void number(Scan s) throws CodeException {
        int at = s.at();
        boolean negative = s.peek() == '-';
        if (negative) {
            s.step();
        }
        if (!Scan.isDigit(s.peek())) {
            throw new CodeException(s.at(), (negative ? "a digit is expected after '-'" : "a number is expected")
                    + ", found " + s.found() + "; numbers are even and whole, like 4 and -6");
        }
        int most = 2 * MOST_CROSSINGS;
        int value = (int) s.numberOrMore(most, "a number");
        if (value == 0) {
            throw new CodeException(at, "number 0; the numbers are 2, 4, 6, …, each with or without '-'");
        }
        if (value > most) {
            throw new CodeException(at, "number " + s.since(at) + "; numbers above " + most + " are not let pass, a sequence "
                    + "may have " + MOST_CROSSINGS + " crossings");
        }
        if ((value & 1) == 1) {
            throw new CodeException(at, "number " + s.since(at) + " is odd; a sequence lists the even partners of 1, 3, 5, …");
        }
        if (crossings == evens.length) {
            evens = Arrays.copyOf(evens, 2 * crossings);
            offsets = Arrays.copyOf(offsets, 2 * crossings);
        }
        offsets[crossings] = at;
        evens[crossings++] = negative ? -value : value;
    }

    private static boolean separator(Scan s) throws CodeException {
        int end = s.at();
        s.skipBlanks();
        if (s.peek() == ',') {
            s.step();
            s.skipBlanks();
            return true;
        }
        boolean number = s.peek() == '-' || Scan.isDigit(s.peek());
        if (number && s.at() == end) {
            throw new CodeException(end, "a blank or ',' is expected after a number, found " + s.found());
        }
        return number;
    }

    /** The crossing of each passage, counted from 0; passage 2c is the odd-numbered one of crossing c. */
    private int[] pair() throws CodeException {
        int[] crossingAt = new int[2 * crossings];
        boolean[] used = new boolean[crossings + 1];
        for (int c = 0; c < crossings; c++) {
            int even = Math.abs(evens[c]);
            if (even > 2 * crossings) {
                throw new CodeException(offsets[c], "number " + evens[c] + " is out of range; " + crossings
                        + (crossings == 1 ? " crossing has the number 2" : " crossings have the numbers 2 to "
                        + 2 * crossings));
            }
            if (used[even / 2]) {
                throw new CodeException(offsets[c], "number " + even + " occurs a second time; each of 2, 4, …, "
                        + 2 * crossings + " occurs once" + missing());
            }
            used[even / 2] = true;
            crossingAt[2 * c] = c;
            crossingAt[even - 1] = c;
        }
        return crossingAt;
    }

    private String missing() {
        boolean[] there = new boolean[crossings + 1];
        for (int c = 0; c < crossings; c++) {
            if (Math.abs(evens[c]) <= 2 * crossings) {
                there[Math.abs(evens[c]) / 2] = true;
            }
        }
        int i = 1;
        while (there[i]) {
            i++;
        }
        return ", " + 2 * i + " is missing";
    }

    /** Turns whole summands over until the first crossing of each is positive. */
    private byte[] signs(int[] crossingAt, boolean[] turns, boolean[] oddIsOver) {
        int[] summands = Summands.of(crossingAt);
        byte[] signs = new byte[crossings];
        byte[] flips = new byte[crossings];     // by summand
        for (int c : crossingAt) {
            signs[c] = (byte) (turns[c] == oddIsOver[c] ? 1 : -1);
            if (flips[summands[c]] == 0) {
                flips[summands[c]] = signs[c];
            }
        }
        for (int c = 0; c < crossings; c++) {
            signs[c] *= flips[summands[c]];
        }
        return signs;
    }

    private int[] mates(int[] crossingAt, byte[] signs, boolean[] oddIsOver) {
        int[] mates = new int[4 * crossings];
        int tail = outgoing(crossingAt, signs, oddIsOver, crossingAt.length - 1);
        for (int p = 0; p < crossingAt.length; p++) {
            int out = outgoing(crossingAt, signs, oddIsOver, p);
            mates[tail] = out ^ 2;
            mates[out ^ 2] = tail;
            tail = out;
        }
        return mates;
    }

    private static int outgoing(int[] crossingAt, byte[] signs, boolean[] oddIsOver, int passage) {
        int c = crossingAt[passage];
        boolean over = oddIsOver[c] == ((passage & 1) == 0);
        return 4 * c + (over ? 2 - signs[c] : 2);
    }
}
