package ropewalk.oracle;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/** Dense matrices of whole numbers of any size, eliminated without fractions (Bareiss 1968). Cubic time. */
public final class ExactMatrix {

    private final BigInteger[][] entries;
    private final int columns;

    /**
     * A matrix.
     *
     * @param rows its rows, all of one length
     * @param columns that length, needed where there is no row
     */
    public ExactMatrix(long[][] rows, int columns) {
        this.columns = columns;
        this.entries = new BigInteger[rows.length][columns];
        for (int i = 0; i < rows.length; i++) {
            for (int j = 0; j < columns; j++) {
                entries[i][j] = BigInteger.valueOf(rows[i][j]);
            }
        }
    }

    private BigInteger[][] copy() {
        BigInteger[][] copy = new BigInteger[entries.length][];
        for (int i = 0; i < copy.length; i++) {
            copy[i] = entries[i].clone();
        }
        return copy;
    }

    /**
     * The determinant of a square matrix; 1 for the empty one.
     *
     * @return its value
     */
    public BigInteger determinant() {
        if (entries.length != columns) {
            throw new IllegalStateException(entries.length + " rows, " + columns + " columns: no determinant");
        }
        BigInteger[][] a = copy();
        BigInteger before = BigInteger.ONE;
        int sign = 1;
        for (int k = 0; k < columns; k++) {
            int p = k;
            while (p < columns && a[p][k].signum() == 0) {
                p++;
            }
            if (p == columns) {
                return BigInteger.ZERO;
            }
            if (p != k) {
                BigInteger[] row = a[p];
                a[p] = a[k];
                a[k] = row;
                sign = -sign;
            }
            for (int i = k + 1; i < columns; i++) {
                for (int j = k + 1; j < columns; j++) {
                    a[i][j] = a[i][j].multiply(a[k][k]).subtract(a[i][k].multiply(a[k][j])).divide(before);
                }
            }
            before = a[k][k];
        }
        return sign > 0 ? before : before.negate();
    }

    /**
     * The Smith normal form by Euclid's algorithm on rows and columns.
     *
     * @return the cokernel of the rows in Z^columns: the factors above 1, each dividing the next, then a 0 for each Z
     */
    public List<BigInteger> factors() {
        BigInteger[][] a = copy();
        List<BigInteger> diagonal = new ArrayList<>();
        int k = 0;
        while (k < a.length && k < columns && smallestTo(a, k)) {
            if (!clear(a, k)) {
                continue;
            }
            int[] bad = notDivisible(a, k);
            if (bad != null) {
                for (int j = k; j < columns; j++) {
                    a[k][j] = a[k][j].add(a[bad[0]][j]);
                }
                continue;
            }
            diagonal.add(a[k][k].abs());
            k++;
        }
        List<BigInteger> factors = new ArrayList<>(diagonal.stream().filter(d -> !d.equals(BigInteger.ONE)).toList());
        for (int i = k; i < columns; i++) {
            factors.add(BigInteger.ZERO);
        }
        return factors;
    }

    private boolean smallestTo(BigInteger[][] a, int k) {
        int row = -1;
        int column = -1;
        for (int i = k; i < a.length; i++) {
            for (int j = k; j < columns; j++) {
                if (a[i][j].signum() != 0 && (row < 0 || a[i][j].abs().compareTo(a[row][column].abs()) < 0)) {
                    row = i;
                    column = j;
                }
            }
        }
        if (row < 0) {
            return false;
        }
        BigInteger[] r = a[row];
        a[row] = a[k];
        a[k] = r;
        for (BigInteger[] each : a) {
            BigInteger e = each[column];
            each[column] = each[k];
            each[k] = e;
        }
        return true;
    }

    /** Subtracts multiples of row and column k; true if nothing but the pivot is left in them. */
    private boolean clear(BigInteger[][] a, int k) {
        boolean clean = true;
        for (int i = k + 1; i < a.length; i++) {
            BigInteger q = a[i][k].divide(a[k][k]);
            for (int j = k; q.signum() != 0 && j < columns; j++) {
                a[i][j] = a[i][j].subtract(q.multiply(a[k][j]));
            }
            clean &= a[i][k].signum() == 0;
        }
        for (int j = k + 1; j < columns; j++) {
            BigInteger q = a[k][j].divide(a[k][k]);
            for (int i = k; q.signum() != 0 && i < a.length; i++) {
                a[i][j] = a[i][j].subtract(q.multiply(a[i][k]));
            }
            clean &= a[k][j].signum() == 0;
        }
        return clean;
    }

    private int[] notDivisible(BigInteger[][] a, int k) {
        for (int i = k + 1; i < a.length; i++) {
            for (int j = k + 1; j < columns; j++) {
                if (a[i][j].remainder(a[k][k]).signum() != 0) {
                    return new int[] {i, j};
                }
            }
        }
        return null;
    }

    /**
     * Positive minus negative squares of a symmetric form.
     *
     * @param signature that difference
     * @param nullity the dimension of its radical
     */
    public record Form(int signature, int nullity) { }

    /**
     * The signature of a symmetric matrix: Bareiss' elimination with pivots on the diagonal. Its k-th pivot is a minor of
     * size k, so the k-th square has the sign of the quotient of two pivots. Where the diagonal is zero and the rest is
     * not, one row and column is added to another first, which is a congruence and makes the diagonal non-zero.
     *
     * @return signature and nullity
     */
    public Form form() {
        BigInteger[][] a = copy();
        int n = columns;
        BigInteger before = BigInteger.ONE;
        int signature = 0;
        for (int k = 0; k < n; k++) {
            if (!pivot(a, k)) {
                return new Form(signature, n - k);
            }
            signature += a[k][k].signum() * before.signum();
            for (int i = k + 1; i < n; i++) {
                for (int j = k + 1; j < n; j++) {
                    a[i][j] = a[i][j].multiply(a[k][k]).subtract(a[i][k].multiply(a[k][j])).divide(before);
                }
            }
            before = a[k][k];
        }
        return new Form(signature, 0);
    }

    private static boolean pivot(BigInteger[][] a, int k) {
        int n = a.length;
        for (int i = k; i < n; i++) {
            if (a[i][i].signum() != 0) {
                swap(a, i, k);
                return true;
            }
        }
        for (int i = k; i < n; i++) {
            for (int j = i + 1; j < n; j++) {
                if (a[i][j].signum() != 0) {
                    for (int m = k; m < n; m++) {
                        a[i][m] = a[i][m].add(a[j][m]);
                    }
                    for (int m = k; m < n; m++) {
                        a[m][i] = a[m][i].add(a[m][j]);
                    }
                    swap(a, i, k);
                    return true;
                }
            }
        }
        return false;
    }

    private static void swap(BigInteger[][] a, int i, int k) {
        BigInteger[] row = a[i];
        a[i] = a[k];
        a[k] = row;
        for (BigInteger[] each : a) {
            BigInteger e = each[i];
            each[i] = each[k];
            each[k] = e;
        }
    }
}
