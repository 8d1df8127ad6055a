package ropewalk.structure;

import java.util.Arrays;
import ropewalk.algebra.IntegerMatrix;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.DerivedKey;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.Regions;
import ropewalk.diagram.Shading;

/**
 * The Goeritz forms of a diagram, one for each connected piece with crossings (L. Goeritz, Math. Z. 36 (1933)).
 *
 * <p>The chessboard sign of a crossing is 1 where, going clockwise round it from a shaded corner, one meets the
 * over-strand first, and -1 otherwise. The unreduced form of a piece has a row for each of its unshaded regions: off the
 * diagonal the sum of the chessboard signs at the crossings where the two regions meet, on the diagonal what makes the
 * row sum zero. A crossing where a region meets itself adds nothing. The reduced form lacks the last row and column.
 *
 * <p>The pieces are treated apart, since the chessboard surface of a disconnected diagram is disconnected.
 *
 * <p>Cost O(n) to set up; the matrices are made when asked for.
 */
public final class GoeritzForms {

    private static final DerivedKey<GoeritzForms> KEY = new DerivedKey<>("Goeritz forms");

    private final LinkDiagram diagram;
    private final Shading shading;
    private final ConnectedPieces pieces;
    private final int[] indexOfRegion;      // within its piece, -1 for shaded regions
    private final int[] dimension;          // unshaded regions of each piece
    private final int[] correction;
    private final int[] firstCrossing;      // where each piece begins in crossings
    private final int[] crossings;

    private GoeritzForms(LinkDiagram diagram, Shading shading) {
        this.diagram = diagram;
        this.shading = shading;
        this.pieces = ConnectedPieces.of(diagram);
        Regions regions = shading.regions();
        this.indexOfRegion = new int[regions.count()];
        this.dimension = new int[pieces.withCrossings()];
        this.correction = new int[pieces.withCrossings()];
        this.firstCrossing = new int[pieces.withCrossings() + 1];
        this.crossings = new int[diagram.crossings()];
        sortCrossings();
        Arrays.fill(indexOfRegion, -1);
        for (int d = 0; d < diagram.darts(); d++) {
            int r = regions.ofCorner(d);
            if (indexOfRegion[r] < 0 && !shading.isShaded(r)) {
                indexOfRegion[r] = dimension[pieces.ofCrossing(d >> 2)]++;
            }
        }
        for (int c = 0; c < diagram.crossings(); c++) {
            int shaded = 4 * c + (shading.isShadedAt(4 * c) ? 0 : 1);
            if (diagram.isOutgoing(shaded) == diagram.isOutgoing(LinkDiagram.counterClockwise(shaded))) {
                correction[pieces.ofCrossing(c)] += chessboardSign(c);
            }
        }
    }

    /** By piece, in one pass: a diagram may have as many pieces as crossings. */
    private void sortCrossings() {
        for (int c = 0; c < crossings.length; c++) {
            firstCrossing[pieces.ofCrossing(c) + 1]++;
        }
        for (int p = 1; p < firstCrossing.length; p++) {
            firstCrossing[p] += firstCrossing[p - 1];
        }
        int[] next = firstCrossing.clone();
        for (int c = 0; c < crossings.length; c++) {
            crossings[next[pieces.ofCrossing(c)]++] = c;
        }
    }

    /**
     * The forms over the unshaded regions of {@link Shading#of}, computed once.
     *
     * @param diagram any diagram
     * @return its Goeritz forms
     */
    public static GoeritzForms of(LinkDiagram diagram) {
        return diagram.derived(KEY, d -> new GoeritzForms(d, Shading.of(d)));
    }

    /**
     * The forms over the unshaded regions of a given colouring.
     *
     * @param diagram any diagram
     * @param shading a chessboard colouring of it
     * @return the Goeritz forms of that colouring
     */
    public static GoeritzForms of(LinkDiagram diagram, Shading shading) {
        return new GoeritzForms(diagram, shading);
    }

    /**
     * The colouring that the forms belong to.
     *
     * @return the chessboard colouring
     */
    public Shading shading() {
        return shading;
    }

    /**
     * How many forms there are.
     *
     * @return the number of connected pieces with crossings
     */
    public int count() {
        return dimension.length;
    }

    /**
     * The chessboard sign of a crossing.
     *
     * @param crossing counted from 0
     * @return 1 or -1
     */
    public int chessboardSign(int crossing) {
        return shading.isShadedAt(4 * crossing + 1) ? 1 : -1;
    }

    /**
     * The number of rows of an unreduced form.
     *
     * @param piece counted from 0
     * @return its unshaded regions, at least 1
     */
    public int dimension(int piece) {
        return dimension[piece];
    }

    /**
     * The row of a region in the unreduced form of its piece.
     *
     * @param region counted from 0
     * @return the row, or -1 for a shaded region
     */
    public int row(int region) {
        return indexOfRegion[region];
    }

    /**
     * The correction term of Gordon and Litherland (Invent. Math. 47 (1978)): the sum of the chessboard signs over the
     * crossings at which the orientations of the two strands do not fit an orientation of the shaded surface. In these
     * conventions the piece has signature -sign(G) - correction.
     *
     * @param piece counted from 0
     * @return the correction
     */
    public int correction(int piece) {
        return correction[piece];
    }

    /**
     * Writes the reduced form of a small piece into an array of the caller.
     *
     * @param piece counted from 0
     * @param target takes (dimension - 1)² numbers, row by row
     */
    public void fillReduced(int piece, long[] target) {
        int n = dimension[piece] - 1;
        Arrays.fill(target, 0, n * n, 0);
        addUp(piece, n, (i, j, value) -> target[i * n + j] += value);
    }

    /**
     * The unreduced form of a piece.
     *
     * @param piece counted from 0
     * @return a symmetric matrix, dimension × dimension, whose rows sum to zero
     */
    public IntegerMatrix unreduced(int piece) {
        return matrix(piece, dimension[piece]);
    }

    /**
     * The reduced form of a piece: the unreduced one without its last row and column.
     *
     * @param piece counted from 0
     * @return a symmetric matrix, one less in size
     */
    public IntegerMatrix reduced(int piece) {
        return matrix(piece, dimension[piece] - 1);
    }

    private IntegerMatrix matrix(int piece, int n) {
        IntegerMatrix.Builder matrix = IntegerMatrix.builder(n, n);
        addUp(piece, n, matrix::add);
        return matrix.build();
    }

    private interface Entries {
        void add(int row, int column, long value);
    }

    /** What each crossing of a piece adds to the first n rows and columns of its unreduced form. */
    private void addUp(int piece, int n, Entries entries) {
        for (int at = firstCrossing[piece]; at < firstCrossing[piece + 1]; at++) {
            int c = crossings[at];
            int first = firstUnshaded(c);
            int u = indexOfRegion[shading.regions().ofCorner(first)];
            int v = indexOfRegion[shading.regions().ofCorner(first ^ 2)];
            if (u == v) {
                continue;
            }
            int sign = chessboardSign(c);
            if (u < n && v < n) {
                entries.add(u, v, sign);
                entries.add(v, u, sign);
            }
            if (u < n) {
                entries.add(u, u, -sign);
            }
            if (v < n) {
                entries.add(v, v, -sign);
            }
        }
    }

    private int firstUnshaded(int crossing) {
        return 4 * crossing + (shading.isShadedAt(4 * crossing) ? 1 : 0);
    }
}
