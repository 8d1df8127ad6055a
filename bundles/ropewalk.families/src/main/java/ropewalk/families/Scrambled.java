package ropewalk.families;

import java.util.Arrays;
import ropewalk.diagram.LinkDiagram;

/**
 * Makes a diagram hard to read without changing its link: random Reidemeister moves (Reidemeister 1927). Pieces that lie
 * beside each other are first pushed over one another, so that a split union becomes one connected diagram; what splits
 * goes on splitting, and the components keep their numbers and orientation.
 */
public final class Scrambled {

    private final SplitMix random;
    private int[] mates;
    private int[] starts;
    private int crossings;

    private Scrambled(LinkDiagram diagram, SplitMix random) {
        this.random = random;
        crossings = diagram.crossings();
        mates = new int[Math.max(64, 8 * crossings)];
        for (int d = 0; d < diagram.darts(); d++) {
            mates[d] = diagram.mate(d);
        }
        starts = new int[diagram.components()];
        for (int i = 0; i < starts.length; i++) {
            starts[i] = diagram.start(i);
        }
    }

    /**
     * A connected diagram of the same link. O(moves · n) time.
     *
     * <p>Components without crossings get a curl, pieces are joined by pokes; then come the moves: a curl in one of
     * twelve, a poke (of an edge over or under another of the same region) in four of twelve, and else a slide of a
     * strand over a crossing, where the region that was drawn is a triangle that allows it.
     *
     * @param seed any number
     * @param diagram any diagram
     * @param moves how many random moves follow after the diagram is connected; slides that find no triangle count
     * @return a connected diagram
     * @throws IllegalArgumentException if the number of moves is negative
     */
    public static LinkDiagram of(long seed, LinkDiagram diagram, int moves) {
        if (moves < 0) {
            throw new IllegalArgumentException(moves + " moves; their number is not negative");
        }
        Scrambled s = new Scrambled(diagram, new SplitMix(seed));
        s.connect();
        for (int i = 0; i < moves && s.crossings > 0; i++) {
            s.move();
        }
        return s.diagram();
    }

    private void connect() {
        for (int i = 0; i < starts.length && starts.length > 1; i++) {
            if (starts[i] < 0) {
                starts[i] = circle();
            }
        }
        boolean[] reached = new boolean[crossings];
        int[] stack = new int[crossings];
        int pieces = 0;
        int[] ofPiece = new int[crossings];
        for (int c = 0; c < reached.length; c++) {
            if (!reached[c]) {
                ofPiece[pieces++] = c;
                flood(c, reached, stack);
            }
        }
        for (int i = 1; i < pieces; i++) {
            // On the sphere any region of one piece may hold the other piece, with any region of it outside.
            int a = 4 * ofPiece[i] + random.below(4);
            int b = 4 * ofPiece[random.below(i)] + random.below(4);
            poke(a, b, random.coin());
        }
    }

    private void flood(int from, boolean[] reached, int[] stack) {
        int top = 0;
        stack[top++] = from;
        reached[from] = true;
        while (top > 0) {
            int c = stack[--top];
            for (int i = 0; i < 4; i++) {
                int other = mates[4 * c + i] >> 2;
                if (!reached[other]) {
                    reached[other] = true;
                    stack[top++] = other;
                }
            }
        }
    }

    private void move() {
        int a = random.below(4 * crossings);
        int kind = random.below(12);
        if (kind == 0) {
            curl(a, random.below(4), random.coin());
            return;
        }
        int sides = 1;
        for (int e = nextInRegion(a); e != a; e = nextInRegion(e)) {
            sides++;
        }
        if (kind <= 4) {
            int b = a;
            for (int i = random.below(sides); i > 0; i--) {
                b = nextInRegion(b);
            }
            if (b != a && b != mates[a]) {
                poke(a, b, random.coin());
            }
        } else if (sides == 3) {
            slide(a);
        }
    }

    /** A region lies to the left of its ends. */
    private int nextInRegion(int end) {
        return LinkDiagram.clockwise(mates[end]);
    }

    private int crossing() {
        if (4 * crossings == mates.length) {
            mates = Arrays.copyOf(mates, 2 * mates.length);
        }
        return 4 * crossings++;
    }

    private void join(int a, int b) {
        mates[a] = b;
        mates[b] = a;
    }

    /** A circle with one curl; gives an end along which it may start. */
    private int circle() {
        int c = crossing();
        join(c, c | 1);
        join(c | 2, c | 3);
        return c | random.below(4);
    }

    /** First move: a curl in the edge at a. */
    private void curl(int a, int turn, boolean otherSide) {
        int far = mates[a];
        int c = crossing();
        int in = c | turn;
        int out = c | (turn + 1 & 3);
        join(c | (turn + 2 & 3), c | (turn + 3 & 3));
        join(a, otherSide ? out : in);
        join(far, otherSide ? in : out);
    }

    /** Second move: pushes the edge at a over or under the edge at b; one region lies to the left of both. */
    private void poke(int a, int b, boolean over) {
        int farA = mates[a];
        int farB = mates[b];
        int x = crossing();
        int y = crossing();
        // The edge of a runs east below the region, that of b west above it. Ends west, south, east, north.
        int west = over ? 0 : 1;
        int south = over ? 1 : 2;
        int east = over ? 2 : 3;
        int north = over ? 3 : 0;
        join(a, x | south);
        join(x | north, y | north);
        join(y | south, farA);
        join(b, y | east);
        join(y | west, x | east);
        join(x | west, farB);
    }

    /** Third move on the triangle to the left of a, if one of its strands lies above or below the two others. */
    private void slide(int a) {
        int[] side = {a, nextInRegion(a), nextInRegion(nextInRegion(a))};
        boolean someOver = false;
        for (int e : side) {
            someOver |= LinkDiagram.isOver(e) && LinkDiagram.isOver(mates[e]);
        }
        boolean distinct = side[0] >> 2 != side[1] >> 2 && side[1] >> 2 != side[2] >> 2 && side[0] >> 2 != side[2] >> 2;
        if (!someOver || !distinct) {
            return;
        }
        // Each strand meets its two crossings in the other order: what hung at its outer end before the first crossing
        // now hangs at the inner end of the second.
        int[] outer = new int[6];
        int[] moved = new int[6];
        int[] far = new int[6];
        for (int i = 0; i < 3; i++) {
            int p = side[i];
            int q = mates[p];
            outer[2 * i] = p ^ 2;
            moved[2 * i] = q;
            outer[2 * i + 1] = q ^ 2;
            moved[2 * i + 1] = p;
        }
        for (int i = 0; i < 6; i++) {
            far[i] = mates[outer[i]];
            for (int j = 0; j < 6; j++) {
                if (far[i] == outer[j]) {
                    far[i] = moved[j];
                    break;
                }
            }
        }
        for (int i = 0; i < 6; i++) {
            join(moved[i], far[i]);
        }
        for (int i = 0; i < 6; i += 2) {
            join(outer[i], outer[i + 1]);
        }
    }

    private LinkDiagram diagram() {
        Wiring.Trail trail = new Wiring.Trail(crossings);
        for (int start : starts) {
            if (start >= 0) {
                int e = start;
                do {
                    trail.leave(e);
                    e = mates[e] ^ 2;
                } while (e != start);
            }
            trail.close(start);
        }
        return trail.diagram(Arrays.copyOf(mates, 4 * crossings));
    }
}
