package ropewalk.families;

import java.util.Arrays;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.NotADiagramException;

/**
 * An endless stream of random diagrams: a uniformly random rooted 4-valent plane map, a fair coin for every crossing
 * and for the direction of every component. All draws are independent.
 *
 * <p>The map is the closure of a uniformly random binary tree whose inner nodes carry one bud each, at one of three
 * places (Schaeffer 1997, "Bijective census and random generation of Eulerian planar maps with prescribed vertex
 * degrees", Electronic J. Combin. 4). Rooted at a random one of its two free leaves, each rooted map is met with the
 * same probability; with n crossings there are 2·3ⁿ(2n)!/(n!(n+2)!) of them (Tutte 1963). A large random diagram has
 * many connected summands and splits off small unknots, so its determinant is mostly 0.
 *
 * <p>One thread at a time. O(n) time for a diagram of n crossings; scratch arrays are kept from one to the next.
 */
public final class RandomPlaneDiagrams {

    private static final int INNER = 1;

    private final SplitMix random;
    private byte[] word = new byte[0];      // a tree in prefix order: INNER or leaf, by node
    private int[] path = new int[0];        // crossing and slot, outermost first
    private int[] buds = new int[0];        // buds not yet matched
    private int[] leaves = new int[0];      // leaves met while no bud was open
    private int[] ends = new int[0];        // mates before the crossings are turned
    private int[] outs = new int[0];        // by strand 2c, 2c + 1: along which of the ends 0 … 3 it leaves
    private int[] mates = new int[0];
    private byte[] signs = new byte[0];
    private int[] starts = new int[0];
    private int[] turns = new int[0];       // the incoming end of the under-strand
    private int[] labels = new int[0];
    private int components;
    private int root;
    private int shift;                      // where the tree begins in the word

    /**
     * A stream.
     *
     * @param seed determines everything that comes
     */
    public RandomPlaneDiagrams(long seed) {
        random = new SplitMix(seed);
    }

    /**
     * The next diagram.
     *
     * @param crossings n, at least 1
     * @return a connected diagram; components are numbered by their first crossing
     * @throws IllegalArgumentException if there is no crossing
     */
    public LinkDiagram next(int crossings) {
        LinkBatch.Builder batch = new LinkBatch.Builder();
        next(crossings, batch);
        return batch.build().link(0);
    }

    /**
     * Adds the next diagram to a batch.
     *
     * @param crossings n, at least 1
     * @param batch takes the diagram
     * @throws IllegalArgumentException if there is no crossing
     */
    public void next(int crossings, LinkBatch.Builder batch) {
        draw(crossings);
        try {
            batch.add(crossings, mates, signs, components, starts);
        } catch (NotADiagramException e) {
            throw new IllegalStateException("the closed tree does not lie on the sphere", e);
        }
    }

    /**
     * Writes the planar code of the next diagram: the bytes that the planar writer gives for it.
     *
     * @param crossings n, at least 1
     * @param out takes the bytes
     * @param at where to begin
     * @return where the code ends (exclusive)
     * @throws IllegalArgumentException if there is no crossing or out has less than {@link #planarRoom} bytes left
     */
    public int nextPlanar(int crossings, byte[] out, int at) {
        if (out.length - at < planarRoom(crossings)) {
            throw new IllegalArgumentException((out.length - at) + " bytes left for a code of " + crossings
                    + " crossings; leave room for " + planarRoom(crossings));
        }
        draw(crossings);
        label();
        int end = at;
        for (int c = 0; c < crossings; c++) {
            out[end++] = (byte) (c == 0 ? '[' : ',');
            for (int d = 4 * c; d < 4 * c + 4; d++) {
                out[end++] = (byte) ((d & 3) == 0 ? '[' : ',');
                end = number(labels[d], out, end);
            }
            out[end++] = ']';
        }
        out[end++] = ']';
        return end;
    }

    /**
     * How long the planar code of a diagram can be at most.
     *
     * @param crossings n
     * @return a number of bytes
     */
    public static int planarRoom(int crossings) {
        int digits = String.valueOf(2 * crossings).length();
        return Math.addExact(2, Math.multiplyExact(crossings, 6 + 4 * digits));
    }

    /** The map without crossings: the mates of the ends, which {@link #root} belongs to. For tests of uniformity. */
    int[] nextMap(int crossings) {
        room(crossings);
        drawTree(crossings);
        close(crossings);
        return Arrays.copyOf(ends, 4 * crossings);
    }

    /** The root of the last map: one of its ends. */
    int root() {
        return root;
    }

    private void draw(int n) {
        room(n);
        drawTree(n);
        close(n);
        orient(n);
        turn(n);
    }

    private void room(int n) {
        if (n < 1) {
            throw new IllegalArgumentException(n + " crossings; a random plane map has at least 1");
        }
        if (signs.length < n) {
            int m = Math.addExact(n, n / 2);
            word = new byte[2 * m + 1];
            path = new int[2 * m];
            buds = new int[m];
            leaves = new int[m + 2];
            ends = new int[Math.multiplyExact(4, m)];
            outs = new int[2 * m];
            mates = new int[4 * m];
            labels = new int[4 * m];
            signs = new byte[m];
            turns = new int[m];
            starts = new int[2 * m];
        }
    }

    /**
     * A uniform binary tree of n inner nodes: a random word of n inner nodes and n + 1 leaves, turned to the one of its
     * cyclic shifts that is a tree in prefix order (cycle lemma, Dvoretzky and Motzkin 1947).
     */
    private void drawTree(int n) {
        int length = 2 * n + 1;
        int inner = n;
        int height = 0;
        int lowest = 0;
        int first = 0;                  // just behind the first place of lowest height
        for (int i = 0; i < length; i++) {
            if (random.below(length - i) < inner) {
                word[i] = INNER;
                inner--;
                height++;
            } else {
                word[i] = 0;
                if (--height < lowest) {
                    lowest = height;
                    first = i + 1;
                }
            }
        }
        shift = first == length ? 0 : first;
    }

    /**
     * Walks round the tree, end 0 of every crossing towards the root, and joins each bud to the leaf that closes it as
     * brackets close, cyclically; the two leaves that are left are joined to one another.
     */
    private void close(int n) {
        int length = 2 * n + 1;
        int at = shift;
        int crossings = 0;
        int open = 0;
        int loose = 0;
        int top = 0;
        int end = -1;                   // the end whose other side comes next; -1 at the root
        while (true) {
            // a node in prefix order hangs at this end
            boolean isInner = word[at] == INNER;
            at = at + 1 == length ? 0 : at + 1;
            if (isInner) {
                int c = crossings++;
                if (end >= 0) {
                    pair(end, 4 * c);
                }
                path[2 * top] = 4 * c;
                path[2 * top++ + 1] = 1 + random.below(3);
            } else if (open > 0) {
                pair(buds[--open], end);
            } else {
                leaves[loose++] = end;
            }
            end = -1;
            while (top > 0 && end < 0) {
                int e = ++path[2 * top - 2];
                if ((e & 3) == 0) {
                    top--;              // all four ends are served
                } else if ((e & 3) == path[2 * top - 1]) {
                    buds[open++] = e;
                } else {
                    end = e;
                }
            }
            if (end < 0) {
                break;
            }
        }
        if (open > 0) {
            pair(buds[--open], 0);      // the leaf at the root comes last
        } else {
            leaves[loose++] = 0;
        }
        int met = 0;
        while (open > 0) {
            pair(buds[--open], leaves[met++]);
        }
        pair(leaves[met], leaves[met + 1]);
        root = leaves[random.coin() ? met : met + 1];
    }

    private void pair(int a, int b) {
        ends[a] = b;
        ends[b] = a;
    }

    /** Follows the components; tosses for their directions. */
    private void orient(int n) {
        Arrays.fill(outs, 0, 2 * n, -1);
        components = 0;
        for (int s = 0; s < 2 * n; s++) {
            if (outs[s] >= 0) {
                continue;
            }
            int first = 4 * (s >> 1) + (s & 1) + (random.coin() ? 2 : 0);
            starts[components++] = first;
            int e = first;
            do {
                outs[2 * (e >> 2) + (e & 1)] = e & 3;
                e = ends[e] ^ 2;
            } while (e != first);
        }
    }

    /** Tosses for the crossings and turns each so that end 0 is the incoming under-strand. */
    private void turn(int n) {
        long coins = 0;
        for (int c = 0; c < n; c++) {
            if ((c & 63) == 0) {
                coins = random.next();
            }
            int under = (int) (coins & 1);
            coins >>>= 1;
            int underOut = outs[2 * c + under];
            int overOut = outs[2 * c + 1 - under];
            turns[c] = underOut ^ 2;
            signs[c] = (byte) ((overOut - underOut & 3) == 3 ? 1 : -1);
        }
        for (int e = 0; e < 4 * n; e++) {
            mates[turned(e)] = turned(ends[e]);
        }
        for (int i = 0; i < components; i++) {
            starts[i] = turned(starts[i]);
        }
    }

    private int turned(int end) {
        return (end & ~3) | ((end - turns[end >> 2]) & 3);
    }

    /** Labels as the planar writer gives them. */
    private void label() {
        int next = 1;
        for (int i = 0; i < components; i++) {
            int start = starts[i];
            int second = mates[start] ^ 2;
            if (second < start && (start & 1) == 1 && (second & 1) == 1 && (mates[second] ^ 2) == start) {
                start = second;         // two edges, over at both crossings: the lower label leaves the first listed
            }
            int e = start;
            do {
                labels[e] = next;
                labels[mates[e]] = next++;
                e = mates[e] ^ 2;
            } while (e != start);
        }
    }

    private static int number(int value, byte[] out, int at) {
        if (value < 10) {
            out[at] = (byte) ('0' + value);
            return at + 1;
        }
        int end = number(value / 10, out, at);
        out[end] = (byte) ('0' + value % 10);
        return end + 1;
    }
}
