package ropewalk.invariant.colouring.internal;

import java.math.BigInteger;
import java.util.Optional;
import ropewalk.algebra.Kernel;
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

    /** Colours of all arcs in a colouring that is not constant, the first of them 0; nothing if there is none. */
    static Optional<int[]> example(LinkDiagram link, int prime, Runnable checkpoint) {
        for (int[] colours : Kernel.modulo(ColouringMatrix.of(link).unreduced(), prime, checkpoint)) {
            int[] shifted = colours.clone();
            boolean constant = true;
            for (int a = 0; a < shifted.length; a++) {
                shifted[a] = Math.floorMod(shifted[a] - colours[0], prime);
                constant &= shifted[a] == 0;
            }
            if (!constant) {
                return Optional.of(shifted);
            }
        }
        return Optional.empty();
    }
}
