package ropewalk.algebra.internal;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import ropewalk.algebra.IntegerMatrix;

/**
 * Invariant factors of any integer matrix by way of a residue ring.
 *
 * <p>Let r be the rank and d the absolute value of a minor of order r that is not 0. The product s_1 … s_r of the invariant
 * factors is the greatest common divisor of all such minors, so each s_i divides d. Over Z/d the same row and column operations
 * give the factors gcd(s_i, d) = s_i, up to units, where s_i = d, which appears as 0, is told from s_i = 0 by i &lt;= r (J. L.
 * Hafner and K. S. McCurley, SIAM J. Comput. 20 (1991) 1068–1083, for computing modulo a multiple of the determinant). Pivots
 * that are units of Z/d split off factors 1; the small rest is brought to Smith's form by {@link DenseSmith}.
 */
public final class ModularSmith {
    private ModularSmith() {
    }

    /**
     * The invariant factors of the cokernel of the row lattice.
     *
     * @param matrix any matrix
     * @param checkpoint run after every pivot
     * @return the factors other than 1, each dividing the next, then columns - rank zeros
     */
    public static List<BigInteger> factors(IntegerMatrix matrix, Runnable checkpoint) {
        Elimination elimination = ModularRank.of(matrix, checkpoint);
        int rank = elimination.rank();
        List<BigInteger> factors = new ArrayList<>();
        if (rank > 0) {
            BigInteger minor = ModularDeterminant.of(ModularRank.pivotPart(matrix, elimination), checkpoint).abs();
            if (!minor.equals(BigInteger.ONE)) {
                factors.addAll(modulo(matrix, minor, rank, checkpoint));
            }
        }
        factors.addAll(Collections.nCopies(matrix.columns() - rank, BigInteger.ZERO));
        return List.copyOf(factors);
    }

    private static List<BigInteger> modulo(IntegerMatrix matrix, BigInteger modulus, int rank, Runnable checkpoint) {
        ResidueValues values = ResidueValues.of(matrix, modulus);
        GeneralElimination run = new GeneralElimination(matrix, values, null, checkpoint);
        run.run();
        return DenseSmith.factors(run.rest(values), modulus, rank - run.pivots(), checkpoint);
    }
}
