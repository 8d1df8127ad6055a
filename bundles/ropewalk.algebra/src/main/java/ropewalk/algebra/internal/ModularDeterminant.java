package ropewalk.algebra.internal;

import java.math.BigInteger;
import ropewalk.algebra.IntegerMatrix;

/**
 * The determinant from its residues modulo many primes, as many as a proved bound demands. The elimination is recorded once,
 * modulo one prime, and replayed modulo the others; a prime at which a recorded pivot vanishes is left out.
 */
public final class ModularDeterminant {
    private final IntegerMatrix matrix;
    private final boolean symmetric;
    private final Runnable checkpoint;

    private ModularDeterminant(IntegerMatrix matrix, Runnable checkpoint) {
        this.matrix = matrix;
        this.symmetric = matrix.isSymmetric();
        this.checkpoint = checkpoint;
    }

    /**
     * The determinant.
     *
     * @param matrix a square matrix
     * @param checkpoint run after every pivot
     * @return its determinant
     */
    public static BigInteger of(IntegerMatrix matrix, Runnable checkpoint) {
        ModularDeterminant job = new ModularDeterminant(matrix, checkpoint);
        double bits = MinorBound.ofDeterminant(matrix, job.symmetric, checkpoint);
        return bits < 0 ? BigInteger.ZERO : job.with(PrimeBudget.forBits(bits));
    }

    /** The number of primes after which {@link #of} stops. */
    static int primesNeeded(IntegerMatrix matrix) {
        return PrimeBudget.forBits(MinorBound.ofDeterminant(matrix, matrix.isSymmetric(), () -> { }));
    }

    /** What a number of primes determines: the determinant if the product of the primes exceeds its double. */
    static BigInteger withPrimes(IntegerMatrix matrix, int count) {
        return new ModularDeterminant(matrix, () -> { }).with(count);
    }

    private BigInteger with(int needed) {
        long chosen = Primes.range(0, 1)[0];
        while (true) {
            Elimination elimination = Elimination.record(matrix, symmetric, chosen, checkpoint);
            if (elimination.rank() < matrix.rows() && elimination.isComplete()) {
                return BigInteger.ZERO;
            }
            PrimeBudget budget = new PrimeBudget(elimination, needed, checkpoint);
            long better = budget.run();
            if (better < 0) {
                if (elimination.rank() < matrix.rows()) {
                    return BigInteger.ZERO;
                }
                long[] residues = budget.products();
                BigInteger value = ChineseRemainder.signed(residues, budget.primes(), residues.length, checkpoint);
                return elimination.oddPermutation() ? value.negate() : value;
            }
            // Modulo that prime the rank is larger than modulo the chosen one: this ends after at most n rounds.
            chosen = better;
        }
    }
}
