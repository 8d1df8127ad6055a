package ropewalk.diagram;

/**
 * A chessboard colouring: every region shaded or not, so that regions on the two sides of an edge differ. Each
 * connected piece has two such colourings, each the other's opposite; the one taken here leaves <em>fewer</em> regions
 * unshaded, and where both classes are equal the region of the piece's first corner is unshaded.
 */
public final class Shading {

    private static final DerivedKey<Shading> KEY = new DerivedKey<>("shading");

    private final Regions regions;
    private final boolean[] shaded;

    private Shading(Regions regions, boolean[] shaded) {
        this.regions = regions;
        this.shaded = shaded;
    }

    /**
     * The colouring of a diagram, computed once in O(n).
     *
     * @param diagram any diagram
     * @return its chessboard colouring with fewer unshaded regions in every piece
     */
    public static Shading of(LinkDiagram diagram) {
        return diagram.derived(KEY, Shading::find);
    }

    private static Shading find(LinkDiagram d) {
        Regions regions = Regions.of(d);
        ConnectedPieces pieces = ConnectedPieces.of(d);
        byte[] colour = new byte[regions.count()];          // 0 unknown, 1 unshaded, 2 shaded
        int[] piece = new int[regions.count()];
        int[] stack = new int[d.crossings()];
        boolean[] met = new boolean[d.crossings()];
        for (int first = 0; first < d.crossings(); first++) {
            if (!met[first]) {
                colour[regions.ofCorner(4 * first)] = 1;
                spread(d, regions, pieces, first, colour, piece, stack, met);
            }
        }
        int[] surplus = new int[pieces.count()];            // shaded minus unshaded
        for (int r = 0; r < colour.length; r++) {
            surplus[piece[r]] += 2 * colour[r] - 3;
        }
        boolean[] shaded = new boolean[colour.length];
        for (int r = 0; r < colour.length; r++) {
            shaded[r] = (colour[r] == 2) == (surplus[piece[r]] >= 0);
        }
        return new Shading(regions, shaded);
    }

    private static void spread(LinkDiagram d, Regions regions, ConnectedPieces pieces, int first, byte[] colour,
            int[] piece, int[] stack, boolean[] met) {
        int top = 0;
        stack[top++] = first;
        met[first] = true;
        while (top > 0) {
            int c = stack[--top];
            int even = 0;
            for (int i = 0; i < 4; i++) {
                int known = colour[regions.ofCorner(4 * c + i)];
                if (known != 0) {
                    even = (i & 1) == 0 ? known : 3 - known;
                }
            }
            for (int i = 0; i < 4; i++) {
                int r = regions.ofCorner(4 * c + i);
                colour[r] = (byte) ((i & 1) == 0 ? even : 3 - even);
                piece[r] = pieces.ofCrossing(c);
                int other = d.mate(4 * c + i) >> 2;
                if (!met[other]) {
                    met[other] = true;
                    stack[top++] = other;
                }
            }
        }
    }

    /**
     * The other colouring: shaded and unshaded exchanged everywhere.
     *
     * @return the opposite colouring
     */
    public Shading opposite() {
        boolean[] other = new boolean[shaded.length];
        for (int r = 0; r < other.length; r++) {
            other[r] = !shaded[r];
        }
        return new Shading(regions, other);
    }

    /**
     * The regions that are coloured.
     *
     * @return the regions
     */
    public Regions regions() {
        return regions;
    }

    /**
     * The colour of a region.
     *
     * @param region counted from 0
     * @return true if it is shaded
     */
    public boolean isShaded(int region) {
        return shaded[region];
    }

    /**
     * The colour of a corner.
     *
     * @param dart the corner lies between this dart and the next one counter-clockwise
     * @return true if the region there is shaded
     */
    public boolean isShadedAt(int dart) {
        return shaded[regions.ofCorner(dart)];
    }
}
