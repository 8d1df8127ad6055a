package ropewalk.diagram.notation;

import java.util.Arrays;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.NotADiagramException;

/**
 * Reads planar code: {@code [[a,b,c,d],…,[k],…]}, one quadruple of edge labels a crossing, counter-clockwise from the
 * incoming edge of the under-strand; {@code [k]} is a component without crossings. Every label occurs exactly twice
 * (that of a {@code [k]} once), labels increase along a component and wrap at its end, gaps are legal.
 *
 * <p>A component of exactly two edges that is over at both its crossings has no orientation in its labels: it runs so
 * that its lower label leaves the crossing that is listed first.
 *
 * <p>Cost O(n), or O(n log n) where labels have wide gaps.
 */
final class PlanarReader implements CodeReader {

    private static final long LARGEST_LABEL = Integer.MAX_VALUE;
    private static final int NONE = -1;
    private static final int CIRCLE = -2;

    private int[] labels = new int[256];        // by entry: 4 for each crossing, then 1 for each circle
    private int[] offsets = new int[256];
    private int[] circleLabels = new int[8];
    private int[] circleOffsets = new int[8];
    private int crossings;
    private int circles;
    private int[] names = new int[256];         // the label of each index where labels have wide gaps
    private boolean gaps;
    private int[] first = new int[256];         // by label or index: a dart, NONE or CIRCLE
    private int[] mates = new int[256];
    private byte[] signs = new byte[64];
    private int[] starts = new int[64];

    @Override
    public void read(byte[] text, int from, int to, LinkBatch.Builder batch) throws CodeException {
        parse(new Scan(text, from, to));
        int largest = index();
        pair(largest);
        int components = orient(largest);
        try {
            batch.add(crossings, mates, signs, components, starts);
        } catch (NotADiagramException e) {
            throw new CodeException(offsets[4 * e.crossing()], e.kind() == NotADiagramException.Kind.NOT_PLANAR
                    ? "this code does not close up to a sphere, it describes a virtual link: " + e.getMessage()
                    : e.getMessage());
        }
    }

    private void parse(Scan s) throws CodeException {
        crossings = 0;
        circles = 0;
        s.skipBlanks();
        expect(s, '[', "a planar code begins with '['");
        s.skipBlanks();
        if (s.peek() == ']') {
            throw new CodeException(s.at(), "an empty code; give a quadruple for each crossing, or [k] for a component "
                    + "without crossings");
        }
        while (true) {
            s.skipBlanks();
            expect(s, '[', "'[' and the labels of a crossing are expected");
            entry(s);
            s.skipBlanks();
            if (s.peek() == ']') {
                s.step();
                break;
            }
            expect(s, ',', "',' or ']' is expected after a crossing");
        }
        s.skipBlanks();
        if (!s.atEnd()) {
            throw new CodeException(s.at(), s.found() + " after the end of the code; nothing may follow the last ']'");
        }
    }

    private void entry(Scan s) throws CodeException {
        int base = 4 * crossings;
        if (labels.length < base + 4) {
            int more = (int) Math.min(Integer.MAX_VALUE - 16, 2L * labels.length);
            labels = Arrays.copyOf(labels, more);
            offsets = Arrays.copyOf(offsets, more);
        }
        int begin = s.at() - 1;
        int count = 0;
        while (true) {
            s.skipBlanks();
            if (!Scan.isDigit(s.peek())) {
                throw new CodeException(s.at(), "a label is expected, found " + s.found()
                        + "; labels are whole numbers from 1 to " + LARGEST_LABEL);
            }
            int offset = s.at();
            long label = s.number(LARGEST_LABEL, "a label");
            if (label == 0) {
                throw new CodeException(offset, "label 0; labels are whole numbers from 1 to " + LARGEST_LABEL);
            }
            if (count < 4) {
                labels[base + count] = (int) label;
                offsets[base + count] = offset;
            }
            count++;
            s.skipBlanks();
            if (s.peek() == ']') {
                s.step();
                break;
            }
            expect(s, ',', "',' or ']' is expected after a label, which is a whole number");
        }
        if (count == 4) {
            crossings++;
        } else if (count == 1) {
            circle(labels[base], offsets[base]);
        } else {
            throw new CodeException(begin, "an entry of " + count + " labels; a crossing has 4, a component without "
                    + "crossings 1");
        }
    }

    private void circle(int label, int offset) {
        if (circles == circleLabels.length) {
            circleLabels = Arrays.copyOf(circleLabels, 2 * circles);
            circleOffsets = Arrays.copyOf(circleOffsets, 2 * circles);
        }
        circleLabels[circles] = label;
        circleOffsets[circles++] = offset;
    }

    private static void expect(Scan s, char wanted, String rule) throws CodeException {
        if (s.peek() != wanted) {
            throw new CodeException(s.at(), rule + ", found " + s.found());
        }
        s.step();
    }

    /** Prepares the table of labels: by label where they are dense, by rank where they have wide gaps. */
    private int index() {
        int entries = 4 * crossings + circles;
        int largest = 0;
        for (int i = 0; i < 4 * crossings; i++) {
            largest = Math.max(largest, labels[i]);
        }
        for (int i = 0; i < circles; i++) {
            largest = Math.max(largest, circleLabels[i]);
        }
        gaps = largest > 2L * entries + 64;
        if (gaps) {
            names = Arrays.copyOf(labels, entries);
            System.arraycopy(circleLabels, 0, names, 4 * crossings, circles);
            Arrays.sort(names);
            int distinct = 0;
            for (int i = 0; i < entries; i++) {
                if (i == 0 || names[i] != names[i - 1]) {
                    names[distinct++] = names[i];
                }
            }
            names = Arrays.copyOf(names, distinct);
            for (int i = 0; i < 4 * crossings; i++) {
                labels[i] = Arrays.binarySearch(names, labels[i]);
            }
            for (int i = 0; i < circles; i++) {
                circleLabels[i] = Arrays.binarySearch(names, circleLabels[i]);
            }
            largest = distinct - 1;
        }
        if (first.length <= largest) {
            first = new int[largest + 1 + largest / 2];
        }
        Arrays.fill(first, 0, largest + 1, NONE);
        return largest;
    }

    private String name(int label) {
        return String.valueOf(gaps ? names[label] : label);
    }

    private void pair(int largest) throws CodeException {
        int darts = 4 * crossings;
        if (mates.length < darts) {
            mates = new int[labels.length];
            signs = new byte[labels.length / 4];
        }
        for (int d = 0; d < darts; d++) {
            int label = labels[d];
            int other = first[label];
            if (other == NONE) {
                first[label] = d;
                mates[d] = NONE;
            } else if (mates[other] == NONE) {
                mates[other] = d;
                mates[d] = other;
            } else {
                throw new CodeException(offsets[d], "label " + name(label)
                        + " occurs a third time; every label occurs exactly twice");
            }
        }
        for (int d = 0; d < darts; d++) {
            if (mates[d] == NONE) {
                refuseCircleWith(labels[d]);
                throw new CodeException(offsets[d], "label " + name(labels[d])
                        + " occurs once; every label occurs exactly twice, that of a component without crossings once");
            }
        }
        for (int i = 0; i < circles; i++) {
            if (first[circleLabels[i]] != NONE) {
                throw circleFault(i);
            }
            first[circleLabels[i]] = CIRCLE;
        }
    }

    private void refuseCircleWith(int label) throws CodeException {
        for (int i = 0; i < circles; i++) {
            if (circleLabels[i] == label) {
                throw circleFault(i);
            }
        }
    }

    private CodeException circleFault(int circle) {
        return new CodeException(circleOffsets[circle], "label " + name(circleLabels[circle])
                + " of a component without crossings is used elsewhere; give it a label of its own");
    }

    /** Finds the components by smallest label, their direction, and with it the sign of every crossing. */
    private int orient(int largest) throws CodeException {
        Arrays.fill(signs, 0, crossings, (byte) 0);
        int components = 0;
        for (int label = 0; label <= largest; label++) {
            int d = first[label];
            if (d == NONE) {
                continue;
            }
            if (components == starts.length) {
                starts = Arrays.copyOf(starts, 2 * components);
            }
            if (d == CIRCLE) {
                starts[components++] = -1;
                continue;
            }
            int start = direction(d);
            starts[components++] = start;
            walk(start);
        }
        return components;
    }

    /** The outgoing end of the edge whose lower-numbered end is d, the edge with its component's smallest label. */
    private int direction(int d) {
        int other = mates[d];
        int after = labels[other ^ 2];          // the label that follows if the edge is left along d
        int before = labels[d ^ 2];             // the one that follows if it is left along the other end
        if (after != before) {
            return after < before ? d : other;
        }
        // At most two edges: an under-passage tells, else the label leaves the crossing listed first.
        int e = d;
        do {
            int in = mates[e];
            if ((in & 1) == 0) {
                return (in & 3) == 0 ? d : other;
            }
            e = in ^ 2;
        } while (e != d);
        return d;
    }

    private void walk(int start) throws CodeException {
        int e = start;
        int previous = -1;
        do {
            int label = labels[e];
            if (label < previous) {
                throw new CodeException(offsets[e], "label " + name(label) + " follows label " + name(previous)
                        + "; labels must increase along a component from its smallest, " + name(labels[start]));
            }
            previous = label;
            first[label] = NONE;                // met
            int in = mates[e];
            int position = in & 3;
            if (position == 2) {
                throw new CodeException(offsets[in & ~3], "the labels of this component run from entry 3 to entry 1 "
                        + "here; entry 1 is the incoming and entry 3 the outgoing edge of the under-strand");
            }
            if (position != 0) {
                signs[in >> 2] = (byte) (position - 2);     // in at 3: positive, in at 1: negative
            }
            e = in ^ 2;
        } while (e != start);
    }
}
