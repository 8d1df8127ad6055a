package ropewalk.invariant.colouring.internal;

import java.math.BigInteger;
import ropewalk.algebra.Rank;
import ropewalk.algebra.SmallMatrix;
import ropewalk.diagram.LinkDiagram;
import ropewalk.structure.ColouringMatrix;

/** Counts the colourings of the arcs modulo a prime (Fox 1962), constant ones included. */
final class FoxColourings {

    private static final int SMALL = 40;

    private FoxColourings() {
    }

    /** The number of colourings: the prime to the power of arcs minus rank. */
    static BigInteger count(LinkDiagram link, int prime, Runnable checkpoint) {
        ColouringMatrix matrix = ColouringMatrix.of(link);
        int rows = matrix.rows();
        int columns = matrix.columns();
        int rank;
        if (rows <= SMALL && columns <= SMALL) {
            long[] scratch = new long[rows * columns];
            matrix.fill(rows, columns, scratch);
            rank = SmallMatrix.rankModulo(scratch, rows, columns, prime);
        } else {
            rank = Rank.modulo(matrix.unreduced(), prime, checkpoint);
        }
        return BigInteger.valueOf(prime).pow(columns - rank);
    }
}
