package ropewalk.algebra;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import ropewalk.algebra.internal.ModularSmith;

/**
 * Invariant factors of integer matrices (H. J. S. Smith, 1861).
 *
 * <p><b>Method.</b> Small matrices by {@link SmallMatrix#invariantFactors}. Else the rank r and a minor d of order r that is
 * not 0, both proved; then sparse elimination over Z/d by units, and Smith's form over Z/d of the small part that is left.
 *
 * @since 1.0
 */
public final class InvariantFactors {
    private static final int SMALL = 400;

    private InvariantFactors() {
    }

    /**
     * The invariant factors of the cokernel of the row lattice: Z<sup>columns</sup> divided by the span of the rows is the
     * direct sum of the groups Z/d for the numbers d returned (Z/0 = Z). For a square symmetric matrix this is the usual
     * cokernel; for others the cokernel of the columns is that of {@link IntegerMatrix#transposed()}.
     *
     * @param matrix any matrix
     * @param checkpoint run about every millisecond; what it throws is let through
     * @return the factors above 1, ascending, each dividing the next, then columns - rank zeros; unmodifiable
     * @throws MatrixTooLargeException if the elimination does not fit into memory
     */
    public static List<BigInteger> of(IntegerMatrix matrix, Runnable checkpoint) {
        int rows = matrix.rows();
        int columns = matrix.columns();
        if ((long) rows * columns <= SMALL) {
            long[] out = new long[columns];
            int count = SmallMatrix.invariantFactors(matrix.toDense(), rows, columns, out);
            if (count >= 0) {
                List<BigInteger> factors = new ArrayList<>(count);
                for (int k = 0; k < count; k++) {
                    factors.add(BigInteger.valueOf(out[k]));
                }
                return List.copyOf(factors);
            }
        }
        return ModularSmith.factors(matrix, checkpoint);
    }
}
