package ropewalk.diagram;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;

/** A 4-valent map without over and under: darts 4v … 4v+3 leave v counter-clockwise. Random ones for tests. */
public final class Shadow {

    private final int[] mates;

    private Shadow(int[] mates) {
        this.mates = mates;
    }

    /**
     * A uniformly random rooted 4-valent plane map with n vertices: the closure of a random binary tree with one bud at
     * each node (G. Schaeffer, 1997). The tree comes from a random word turned into place by the cycle lemma.
     */
    public static Shadow uniform(Random random, int n) {
        boolean[] inner = treeWord(random, n);
        int[] mates = new int[4 * n];
        int[] bud = new int[n];
        for (int v = 0; v < n; v++) {
            bud[v] = 1 + random.nextInt(3);
        }
        List<Integer> ends = new ArrayList<>();         // along the contour: dart d of a leaf, ~d of a bud
        ends.add(0);
        int[] slot = new int[n];
        int[] path = new int[n];
        int depth = 1;
        int nodes = 1;
        int read = 1;
        while (depth > 0) {
            int v = path[depth - 1];
            int i = ++slot[v];
            if (i == 4) {
                depth--;
            } else if (i == bud[v]) {
                ends.add(~(4 * v + i));
            } else if (inner[read++]) {
                join(mates, 4 * v + i, 4 * nodes);
                path[depth++] = nodes++;
            } else {
                ends.add(4 * v + i);
            }
        }
        return new Shadow(closed(mates, ends));
    }

    /** Preorder word of a uniformly random binary tree: n inner nodes, n + 1 leaves. */
    private static boolean[] treeWord(Random random, int n) {
        List<Boolean> word = new ArrayList<>();
        for (int i = 0; i < 2 * n + 1; i++) {
            word.add(i < n);
        }
        Collections.shuffle(word, random);
        int height = 0;
        int lowest = 0;
        int turn = 0;
        for (int i = 0; i < word.size(); i++) {
            height += word.get(i) ? 1 : -1;
            if (height < lowest) {
                lowest = height;
                turn = i + 1;
            }
        }
        boolean[] turned = new boolean[word.size()];
        for (int i = 0; i < turned.length; i++) {
            turned[i] = word.get((i + turn) % turned.length);
        }
        return turned;
    }

    /** Joins each bud to the leaf that closes it, going round twice, and the two leaves left over to each other. */
    private static int[] closed(int[] mates, List<Integer> ends) {
        boolean[] done = new boolean[ends.size()];
        List<Integer> open = new ArrayList<>();
        for (int i = 0; i < 2 * ends.size(); i++) {
            int at = i % ends.size();
            if (done[at]) {
                continue;
            }
            if (ends.get(at) < 0) {
                if (i < ends.size()) {
                    open.add(at);
                }
            } else if (!open.isEmpty()) {
                int bud = open.remove(open.size() - 1);
                join(mates, ~ends.get(bud), ends.get(at));
                done[bud] = true;
                done[at] = true;
            }
        }
        List<Integer> left = new ArrayList<>();
        for (int i = 0; i < done.length; i++) {
            if (!done[i]) {
                left.add(ends.get(i));
            }
        }
        if (left.size() != 2) {
            throw new AssertionError(left.size() + " leaves left over");
        }
        join(mates, left.get(0), left.get(1));
        return mates;
    }

    /** The closure of a braid of the given crossings' left positions, 1 … strands - 1. Unused strands are dropped. */
    public static Shadow braid(int strands, int[] word) {
        int[] mates = new int[4 * word.length];
        int[] first = new int[strands + 1];
        int[] last = new int[strands + 1];
        java.util.Arrays.fill(first, -1);
        for (int v = 0; v < word.length; v++) {
            for (int side = 0; side < 2; side++) {
                int position = word[v] + side;
                int in = 4 * v + 3 * side;              // upper left 0, lower left 1, lower right 2, upper right 3
                if (first[position] < 0) {
                    first[position] = in;
                } else {
                    join(mates, last[position], in);
                }
                last[position] = 4 * v + 1 + side;
            }
        }
        for (int p = 1; p <= strands; p++) {
            if (first[p] >= 0) {
                join(mates, last[p], first[p]);
            }
        }
        return new Shadow(mates);
    }

    private static void join(int[] mates, int a, int b) {
        mates[a] = b;
        mates[b] = a;
    }

    public int vertices() {
        return mates.length / 4;
    }

    /** The number of curves. */
    public int curves() {
        boolean[] met = new boolean[mates.length];
        int curves = 0;
        for (int d = 0; d < mates.length; d++) {
            if (!met[d]) {
                curves++;
                int e = d;
                do {
                    met[e] = true;
                    met[mates[e]] = true;
                    e = mates[e] ^ 2;
                } while (e != d);
            }
        }
        return curves;
    }

    /**
     * One curve out of all: a vertex where two curves meet is cut open so that they become one, until one is left. Takes
     * a connected shadow; the result has fewer vertices.
     */
    public Shadow joined() {
        int n = vertices();
        Slow.Classes curves = new Slow.Classes(4 * n);
        for (int d = 0; d < 4 * n; d++) {
            curves.merge(d, mates[d]);
            curves.merge(d, d ^ 2);
        }
        int[] joined = mates.clone();
        int[] number = new int[n];
        int left = 0;
        for (int v = 0; v < n; v++) {
            if (curves.of(4 * v) != curves.of(4 * v + 1)) {
                curves.merge(4 * v, 4 * v + 1);
                join(joined, joined[4 * v], joined[4 * v + 1]);
                join(joined, joined[4 * v + 2], joined[4 * v + 3]);
                number[v] = -1;
            } else {
                number[v] = left++;
            }
        }
        int[] packed = new int[4 * left];
        for (int d = 0; d < 4 * n; d++) {
            if (number[d / 4] >= 0) {
                packed[4 * number[d / 4] + d % 4] = 4 * number[joined[d] / 4] + joined[d] % 4;
            }
        }
        return new Shadow(packed);
    }

    /** A diagram on this shadow: random crossings, directions, component numbers, starts; circles mixed in. */
    public LinkDiagram diagram(Random random, int circles) throws NotADiagramException {
        int n = vertices();
        boolean[] outgoing = new boolean[4 * n];
        boolean[] met = new boolean[4 * n];
        List<Integer> first = new ArrayList<>();
        for (int d = 0; d < 4 * n; d++) {
            if (!met[d]) {
                int start = random.nextBoolean() ? d : mates[d];
                List<Integer> tails = new ArrayList<>();
                int e = start;
                do {
                    tails.add(e);
                    outgoing[e] = true;
                    met[e] = true;
                    met[mates[e]] = true;
                    e = mates[e] ^ 2;
                } while (e != start);
                first.add(tails.get(random.nextInt(tails.size())));
            }
        }
        for (int i = 0; i < circles; i++) {
            first.add(-1);
        }
        Collections.shuffle(first, random);
        int[] turn = new int[n];                        // dart d of the shadow becomes position (d - turn) mod 4
        byte[] signs = new byte[n];
        for (int v = 0; v < n; v++) {
            int axis = random.nextInt(2);
            turn[v] = outgoing[4 * v + axis] ? axis + 2 : axis;
            signs[v] = (byte) (outgoing[4 * v + (turn[v] + 1) % 4] ? 1 : -1);
        }
        int[] turned = new int[4 * n];
        for (int d = 0; d < 4 * n; d++) {
            turned[renamed(d, turn)] = renamed(mates[d], turn);
        }
        int[] starts = first.stream().mapToInt(d -> d < 0 ? -1 : renamed(d, turn)).toArray();
        return LinkDiagram.of(turned, signs, starts);
    }

    private static int renamed(int dart, int[] turn) {
        return 4 * (dart / 4) + Math.floorMod(dart - turn[dart / 4], 4);
    }
}
