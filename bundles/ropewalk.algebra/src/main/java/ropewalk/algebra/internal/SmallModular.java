package ropewalk.algebra.internal;

/**
 * Ranks of small dense matrices modulo a prime, in place. For the primes 2 and 3 and at most 64 columns a row is one or
 * two words, and a row operation a few logical instructions; other primes take one long per entry.
 */
public final class SmallModular {
    /** Bit x + 32 says, for -32 &lt;= x &lt; 32, whether x is 1 modulo 3, and whether it is 2. */
    private static final long ONE_MODULO_3 = residues(1);
    private static final long TWO_MODULO_3 = residues(2);

    private SmallModular() {
    }

    private static long residues(int residue) {
        long bits = 0;
        for (int x = -32; x < 32; x++) {
            bits |= Math.floorMod(x, 3) == residue ? 1L << (x + 32) : 0;
        }
        return bits;
    }

    /**
     * The rank modulo a prime.
     *
     * @param a the matrix, row-major, overwritten
     * @param rows the number of rows
     * @param columns the number of columns
     * @param prime a prime below 2^31
     * @return the rank
     */
    public static int rank(long[] a, int rows, int columns, int prime) {
        if (prime < 2) {
            throw new IllegalArgumentException("prime = " + prime + "; it must be a prime from 2 to 2147483647");
        }
        if (prime == 2 && columns <= 64) {
            return rankModulo2(a, rows, columns);
        }
        // Packed rows take two places each, so that a row never overwrites one that was not yet read.
        if (prime == 3 && columns <= 64 && columns >= 2) {
            return rankModulo3(a, rows, columns);
        }
        return general(a, rows, columns, prime);
    }

    private static int rankModulo2(long[] a, int rows, int columns) {
        for (int i = 0, at = 0; i < rows; i++) {
            long word = 0;
            for (int j = 0; j < columns; j++) {
                word |= (a[at++] & 1) << j;
            }
            if (columns > 0) {
                a[i] = word;
            }
        }
        int rank = 0;
        for (int i = 0; i < rows && columns > 0; i++) {
            long word = a[i];
            if (word == 0) {
                continue;
            }
            rank++;
            int bit = Long.numberOfTrailingZeros(word);
            for (int k = i + 1; k < rows; k++) {
                a[k] ^= word & -(a[k] >>> bit & 1);
            }
        }
        return rank;
    }

    /**
     * A row is the pair (x, y) of masks of its entries 1 and 2. The sum of (x, y) and (u, v) follows T. J. Boothby and
     * R. W. Bradshaw, Bitslicing and the method of four Russians over larger finite fields (arXiv:0901.1413, 2009), in a form
     * checked on all nine pairs by a test: t = (x | v) ^ (y | u); new x = (y | v) ^ t, new y = (x | u) ^ t.
     */
    private static int rankModulo3(long[] a, int rows, int columns) {
        pack3(a, rows, columns);
        int rank = 0;
        for (int i = 0; i < rows; i++) {
            long u = a[2 * i];
            long v = a[2 * i + 1];
            if ((u | v) == 0) {
                continue;
            }
            rank++;
            int bit = Long.numberOfTrailingZeros(u | v);
            if ((v >>> bit & 1) != 0) {
                long w = u;
                u = v;
                v = w;
            }
            // The pivot is 1 now. A row with entry 1 there gets minus the pivot row, (v, u); one with entry 2 gets (u, v).
            for (int k = i + 1; k < rows; k++) {
                long x = a[2 * k];
                long y = a[2 * k + 1];
                long minus = -(x >>> bit & 1);
                long plus = -(y >>> bit & 1);
                long p = u & plus | v & minus;
                long q = v & plus | u & minus;
                long t = (x | q) ^ (y | p);
                a[2 * k] = (y | q) ^ t;
                a[2 * k + 1] = (x | p) ^ t;
            }
        }
        return rank;
    }

    private static void pack3(long[] a, int rows, int columns) {
        for (int i = 0, at = 0; i < rows; i++) {
            long ones = 0;
            long twos = 0;
            for (int j = 0; j < columns; j++) {
                long shifted = a[at++] + 32;
                if ((shifted & ~63) != 0) {
                    shifted = Math.floorMod(shifted - 32, 3L) + 32;
                }
                ones |= (ONE_MODULO_3 >>> shifted & 1) << j;
                twos |= (TWO_MODULO_3 >>> shifted & 1) << j;
            }
            a[2 * i] = ones;
            a[2 * i + 1] = twos;
        }
    }

    private static int general(long[] a, int rows, int columns, int prime) {
        for (int k = 0; k < rows * columns; k++) {
            a[k] = Math.floorMod(a[k], (long) prime);
        }
        int rank = 0;
        for (int j = 0; j < columns && rank < rows; j++) {
            int pivotRow = rank;
            while (pivotRow < rows && a[pivotRow * columns + j] == 0) {
                pivotRow++;
            }
            if (pivotRow == rows) {
                continue;
            }
            for (int k = j; k < columns; k++) {
                long v = a[pivotRow * columns + k];
                a[pivotRow * columns + k] = a[rank * columns + k];
                a[rank * columns + k] = v;
            }
            clearBelow(a, rows, columns, rank, j, prime);
            rank++;
        }
        return rank;
    }

    private static void clearBelow(long[] a, int rows, int columns, int row, int column, int prime) {
        int top = row * columns;
        long inverse = inverse(a[top + column], prime);
        for (int i = row + 1; i < rows; i++) {
            int at = i * columns;
            if (a[at + column] != 0) {
                long factor = prime - a[at + column] * inverse % prime;
                for (int j = column + 1; j < columns; j++) {
                    a[at + j] = (a[at + j] + factor * a[top + j]) % prime;
                }
            }
        }
    }

    /** The inverse by the extended Euclidean algorithm. */
    static long inverse(long value, long prime) {
        long r = prime;
        long s = value;
        long x = 0;
        long y = 1;
        while (s != 0) {
            long q = r / s;
            long t = r - q * s;
            r = s;
            s = t;
            t = x - q * y;
            x = y;
            y = t;
        }
        if (r != 1) {
            throw new IllegalArgumentException(prime + " is not a prime: it shares the factor " + r + " with an entry");
        }
        return x < 0 ? x + prime : x;
    }
}
