package ropewalk.algebra;

import ropewalk.algebra.internal.SmallModular;
import ropewalk.algebra.internal.SmallSmith;

/**
 * Exact elimination on small dense matrices, in place on arrays of the caller, without allocation. All methods are pure
 * functions of their arguments apart from the arrays they overwrite, and may be used from any number of threads.
 *
 * <p><b>Shape.</b> {@code a} is row-major: entry (i, j) of a matrix with c columns is {@code a[i * c + j]}. Longer arrays
 * are fine; what lies behind the matrix is neither read nor written.
 *
 * <p><b>Overflow.</b> A method either proves that 64 bits suffice or reports that it cannot, and then the content of
 * {@code a} is undefined: go to {@link Determinant}, {@link Rank}, {@link InvariantFactors} or {@link Inertia} with a copy.
 * The proof for the fraction-free methods: every intermediate value is a minor of the matrix up to order of rows and
 * columns (E. H. Bareiss, Math. Comp. 22 (1968) 565–578), and a minor is at most h = &Pi; max(1, ‖row‖) (J. Hadamard, 1893).
 * The numerators of a step are at most 3 h², so h² &le; 2<sup>61</sup> is enough. For a matrix of rows like (2, -1, -1) that
 * admits 23 rows, for chessboard matrices of random diagrams about 13.
 *
 * @since 1.0
 */
public final class SmallMatrix {
    /** What {@link #determinant} returns where 64 bits cannot be proved to suffice. No determinant that it proves is this. */
    public static final long TOO_LARGE = Long.MIN_VALUE;

    private static final double LARGEST_SQUARE = 0x1p61 * (1 - 1e-9);

    private SmallMatrix() {
    }

    /**
     * The determinant of a square matrix.
     *
     * @param a the matrix, overwritten
     * @param n rows and columns; 0 gives 1
     * @return the determinant, or {@link #TOO_LARGE}
     */
    public static long determinant(long[] a, int n) {
        if (!fits(a, n, n)) {
            return TOO_LARGE;
        }
        long previous = 1;
        boolean negative = false;
        for (int k = 0; k < n; k++) {
            int pivotRow = k;
            while (pivotRow < n && a[pivotRow * n + k] == 0) {
                pivotRow++;
            }
            if (pivotRow == n) {
                return 0;
            }
            if (pivotRow != k) {
                swapRows(a, n, k, pivotRow, k);
                negative = !negative;
            }
            bareissStep(a, n, n, k, k, previous);
            previous = a[k * n + k];
        }
        return negative ? -previous : previous;
    }

    /**
     * The rank over the rational numbers.
     *
     * @param a the matrix, overwritten
     * @param rows the number of rows
     * @param columns the number of columns
     * @return the rank, or -1 where 64 bits cannot be proved to suffice
     */
    public static int rank(long[] a, int rows, int columns) {
        if (!fits(a, rows, columns)) {
            return -1;
        }
        long previous = 1;
        int rank = 0;
        for (int j = 0; j < columns && rank < rows; j++) {
            int pivotRow = rank;
            while (pivotRow < rows && a[pivotRow * columns + j] == 0) {
                pivotRow++;
            }
            if (pivotRow == rows) {
                continue;
            }
            if (pivotRow != rank) {
                swapRows(a, columns, rank, pivotRow, j);
            }
            bareissStep(a, rows, columns, rank, j, previous);
            previous = a[rank * columns + j];
            rank++;
        }
        return rank;
    }

    /**
     * Determinant and inertia of a symmetric matrix in one elimination.
     *
     * <p>Fraction-free with symmetric exchanges. A step takes a diagonal entry that is not 0; where all of them are 0 it takes
     * the two rows and columns of an entry b off the diagonal together (Bareiss's two-step formula), which add one positive
     * and one negative square, the block being ((0, b), (b, 0)). The signs are invariants of congruence (Sylvester 1852).
     *
     * @param a the matrix, both triangles filled; overwritten
     * @param n rows and columns
     * @param result receives at 0 the determinant, at 1 the nullity, at 2 the number of positive and at 3 the number of
     *     negative eigenvalues
     * @return true; false where 64 bits cannot be proved to suffice, and then {@code result} is unchanged
     */
    public static boolean symmetric(long[] a, int n, long[] result) {
        if (!fits(a, n, n)) {
            return false;
        }
        long previous = 1;
        int k = 0;
        int positive = 0;
        while (k < n) {
            int s = k;
            while (s < n && a[s * n + s] == 0) {
                s++;
            }
            if (s < n) {
                if (s != k) {
                    exchange(a, n, k, s);
                }
                long pivot = a[k * n + k];
                symmetricStep(a, n, k, previous);
                positive += (int) ((pivot ^ previous) >>> 63) ^ 1;
                previous = pivot;
                k++;
            } else {
                if (!bringForward(a, n, k)) {
                    break;
                }
                previous = blockStep(a, n, k, previous);
                positive++;
                k += 2;
            }
        }
        result[0] = k == n ? previous : 0;
        result[1] = n - k;
        result[2] = positive;
        result[3] = k - positive;
        return true;
    }

    /**
     * The invariant factors of the cokernel of the row lattice, Z<sup>columns</sup> / Z<sup>rows</sup> a.
     *
     * @param a the matrix, overwritten
     * @param rows the number of rows
     * @param columns the number of columns
     * @param out receives the factors other than 1, each dividing the next, then a 0 for every free summand (columns - rank of
     *     them); at least {@code columns} long
     * @return how many were written, or -1 where an intermediate value reached 2<sup>31</sup>
     */
    public static int invariantFactors(long[] a, int rows, int columns, long[] out) {
        return SmallSmith.factors(a, rows, columns, out);
    }

    /**
     * The rank modulo a prime. Never overflows.
     *
     * @param a the matrix, overwritten
     * @param rows the number of rows
     * @param columns the number of columns
     * @param prime a prime from 2 to 2<sup>31</sup> - 1; not tested for being one
     * @return the rank over the field with that many elements
     */
    public static int rankModulo(long[] a, int rows, int columns, int prime) {
        return SmallModular.rank(a, rows, columns, prime);
    }

    /** Whether the square of Hadamard's bound on all minors is below 2^61. Squares are summed exactly, products rounded. */
    private static boolean fits(long[] a, int rows, int columns) {
        if (columns > 1024) {
            return false;
        }
        double product = 1;
        long bits = 0;
        for (int i = 0, at = 0; i < rows; i++) {
            long sum = 0;
            for (int end = at + columns; at < end; at++) {
                long v = a[at];
                bits |= v ^ (v >> 63);
                sum += v * v;
            }
            product *= Math.max(1, sum);
        }
        return bits < 1 << 26 && product < LARGEST_SQUARE;
    }

    private static void swapRows(long[] a, int columns, int i, int k, int from) {
        for (int j = from; j < columns; j++) {
            long v = a[i * columns + j];
            a[i * columns + j] = a[k * columns + j];
            a[k * columns + j] = v;
        }
    }

    /** The rows below {@code row}, right of {@code column}, become the minors of one order more. */
    private static void bareissStep(long[] a, int rows, int columns, int row, int column, long previous) {
        int zeros = Long.numberOfTrailingZeros(previous);
        long inverse = inverse(previous >> zeros);
        int pivotAt = row * columns;
        long pivot = a[pivotAt + column];
        for (int i = row + 1; i < rows; i++) {
            int at = i * columns;
            long factor = a[at + column];
            for (int j = column + 1; j < columns; j++) {
                a[at + j] = (a[at + j] * pivot - factor * a[pivotAt + j] >> zeros) * inverse;
            }
        }
    }

    private static void symmetricStep(long[] a, int n, int k, long previous) {
        int zeros = Long.numberOfTrailingZeros(previous);
        long inverse = inverse(previous >> zeros);
        int pivotAt = k * n;
        long pivot = a[pivotAt + k];
        for (int i = k + 1; i < n; i++) {
            int at = i * n;
            long factor = a[pivotAt + i];
            for (int j = i; j < n; j++) {
                a[at + j] = (a[at + j] * pivot - factor * a[pivotAt + j] >> zeros) * inverse;
            }
        }
    }

    /**
     * The inverse of an odd number modulo 2^64. A quotient that is known to be whole and to fit is the product with it
     * (T. Jebelean, J. Symb. Comput. 15 (1993) 169–180): one multiplication in place of a division. Newton's iteration doubles
     * the number of right bits, of which d itself has three.
     */
    private static long inverse(long d) {
        long x = d;
        x *= 2 - d * x;
        x *= 2 - d * x;
        x *= 2 - d * x;
        x *= 2 - d * x;
        return x * (2 - d * x);
    }

    /** Exchanges rows and columns k &lt; s in the upper triangle of what is left. */
    private static void exchange(long[] a, int n, int k, int s) {
        long v = a[k * n + k];
        a[k * n + k] = a[s * n + s];
        a[s * n + s] = v;
        for (int j = k + 1; j < s; j++) {
            v = a[k * n + j];
            a[k * n + j] = a[j * n + s];
            a[j * n + s] = v;
        }
        for (int j = s + 1; j < n; j++) {
            v = a[k * n + j];
            a[k * n + j] = a[s * n + j];
            a[s * n + j] = v;
        }
    }

    /** With an empty diagonal from k on: brings an entry that is not 0 to (k, k + 1). False if there is none. */
    private static boolean bringForward(long[] a, int n, int k) {
        for (int i = k; i < n; i++) {
            for (int j = i + 1; j < n; j++) {
                if (a[i * n + j] != 0) {
                    if (i != k) {
                        exchange(a, n, k, i);
                    }
                    if (j != k + 1) {
                        exchange(a, n, k + 1, j);
                        long v = a[k * n + j];
                        a[k * n + j] = a[k * n + k + 1];
                        a[k * n + k + 1] = v;
                    }
                    return true;
                }
            }
        }
        return false;
    }

    /**
     * Two steps at once with the block ((0, b), (b, 0)) at k and k + 1. Expanding the minor of order 3 along its last row gives
     * new(i, j) = (a(i,k) f(j) + a(i,k+1) g(j) + a(i,j) d) / previous, with f(j) = b a(k+1,j) / previous,
     * g(j) = b a(k,j) / previous and d = -b² / previous; all of them are minors. The free lower triangle keeps f and g.
     */
    private static long blockStep(long[] a, int n, int k, long previous) {
        int zeros = Long.numberOfTrailingZeros(previous);
        long inverse = inverse(previous >> zeros);
        int first = k * n;
        int second = first + n;
        long b = a[first + k + 1];
        long d = (-b * b >> zeros) * inverse;
        for (int j = k + 2; j < n; j++) {
            a[j * n + k] = (b * a[second + j] >> zeros) * inverse;
            a[j * n + k + 1] = (b * a[first + j] >> zeros) * inverse;
        }
        for (int i = k + 2; i < n; i++) {
            long x = a[first + i];
            long y = a[second + i];
            for (int j = i; j < n; j++) {
                long numerator = x * a[j * n + k] + y * a[j * n + k + 1] + a[i * n + j] * d;
                a[i * n + j] = (numerator >> zeros) * inverse;
            }
        }
        return d;
    }
}
