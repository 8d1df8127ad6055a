package ropewalk.algebra;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Plain textbook routes, slow and independent of the bundle's. */
final class SlowAlgebra {
    private SlowAlgebra() {
    }

    static BigInteger[][] big(IntegerMatrix matrix) {
        BigInteger[][] a = new BigInteger[matrix.rows()][matrix.columns()];
        for (int i = 0; i < matrix.rows(); i++) {
            for (int j = 0; j < matrix.columns(); j++) {
                a[i][j] = BigInteger.valueOf(matrix.get(i, j));
            }
        }
        return a;
    }

    /** Expansion along the first row, without any division. */
    static BigInteger cofactors(BigInteger[][] a) {
        int n = a.length;
        if (n == 0) {
            return BigInteger.ONE;
        }
        BigInteger sum = BigInteger.ZERO;
        for (int j = 0; j < n; j++) {
            if (a[0][j].signum() != 0) {
                BigInteger[][] minor = new BigInteger[n - 1][n - 1];
                for (int i = 1; i < n; i++) {
                    for (int k = 0; k < n - 1; k++) {
                        minor[i - 1][k] = a[i][k < j ? k : k + 1];
                    }
                }
                BigInteger term = a[0][j].multiply(cofactors(minor));
                sum = j % 2 == 0 ? sum.add(term) : sum.subtract(term);
            }
        }
        return sum;
    }

    /** Fraction-free elimination; rank at 0, and for a square matrix the determinant at 1. */
    static BigInteger[] rankAndDeterminant(IntegerMatrix matrix) {
        BigInteger[][] a = big(matrix);
        int rows = matrix.rows();
        int columns = matrix.columns();
        BigInteger previous = BigInteger.ONE;
        int rank = 0;
        int sign = 1;
        for (int j = 0; j < columns && rank < rows; j++) {
            int p = rank;
            while (p < rows && a[p][j].signum() == 0) {
                p++;
            }
            if (p == rows) {
                continue;
            }
            if (p != rank) {
                BigInteger[] row = a[p];
                a[p] = a[rank];
                a[rank] = row;
                sign = -sign;
            }
            for (int i = rank + 1; i < rows; i++) {
                for (int k = j + 1; k < columns; k++) {
                    a[i][k] = a[i][k].multiply(a[rank][j]).subtract(a[i][j].multiply(a[rank][k])).divide(previous);
                }
            }
            previous = a[rank++][j];
        }
        BigInteger determinant = rank < rows ? BigInteger.ZERO : previous.multiply(BigInteger.valueOf(sign));
        return new BigInteger[] {BigInteger.valueOf(rank), determinant};
    }

    /** Invariant factors from the greatest common divisors of all minors (the definition of determinantal divisors). */
    static List<BigInteger> factorsByMinors(IntegerMatrix matrix) {
        BigInteger[][] a = big(matrix);
        List<BigInteger> factors = new ArrayList<>();
        BigInteger before = BigInteger.ONE;
        int rank = 0;
        for (int order = 1; order <= Math.min(matrix.rows(), matrix.columns()); order++) {
            BigInteger divisor = BigInteger.ZERO;
            for (int[] rows : subsets(matrix.rows(), order)) {
                for (int[] columns : subsets(matrix.columns(), order)) {
                    BigInteger[][] minor = new BigInteger[order][order];
                    for (int i = 0; i < order; i++) {
                        for (int j = 0; j < order; j++) {
                            minor[i][j] = a[rows[i]][columns[j]];
                        }
                    }
                    divisor = divisor.gcd(cofactors(minor));
                }
            }
            if (divisor.signum() == 0) {
                break;
            }
            rank = order;
            if (!divisor.equals(before)) {
                factors.add(divisor.divide(before));
            }
            before = divisor;
        }
        for (int k = rank; k < matrix.columns(); k++) {
            factors.add(BigInteger.ZERO);
        }
        return factors;
    }

    /** Invariant factors by the plain algorithm: the least entry clears its row and column, and takes in what it does not divide. */
    static List<BigInteger> factors(IntegerMatrix matrix) {
        BigInteger[][] a = big(matrix);
        int rows = matrix.rows();
        int columns = matrix.columns();
        List<BigInteger> factors = new ArrayList<>();
        for (int t = 0; t < columns; t++) {
            BigInteger pivot = t < rows ? pivot(a, rows, columns, t) : BigInteger.ZERO;
            if (!pivot.equals(BigInteger.ONE)) {
                factors.add(pivot);
            }
        }
        return factors;
    }

    private static BigInteger pivot(BigInteger[][] a, int rows, int columns, int t) {
        while (true) {
            int row = -1;
            int column = -1;
            for (int i = t; i < rows; i++) {
                for (int j = t; j < columns; j++) {
                    if (a[i][j].signum() != 0 && (row < 0 || a[i][j].abs().compareTo(a[row][column].abs()) < 0)) {
                        row = i;
                        column = j;
                    }
                }
            }
            if (row < 0) {
                return BigInteger.ZERO;
            }
            BigInteger[] r = a[row];
            a[row] = a[t];
            a[t] = r;
            for (BigInteger[] line : a) {
                BigInteger v = line[column];
                line[column] = line[t];
                line[t] = v;
            }
            BigInteger d = a[t][t];
            boolean clear = true;
            for (int i = t + 1; i < rows; i++) {
                BigInteger q = a[i][t].divide(d);
                for (int j = t; j < columns; j++) {
                    a[i][j] = a[i][j].subtract(q.multiply(a[t][j]));
                }
                clear &= a[i][t].signum() == 0;
            }
            for (int j = t + 1; j < columns; j++) {
                BigInteger q = a[t][j].divide(d);
                for (int i = t; i < rows; i++) {
                    a[i][j] = a[i][j].subtract(q.multiply(a[i][t]));
                }
                clear &= a[t][j].signum() == 0;
            }
            for (int i = t + 1; i < rows && clear; i++) {
                for (int j = t + 1; j < columns && clear; j++) {
                    if (a[i][j].remainder(d).signum() != 0) {
                        for (int k = t; k < columns; k++) {
                            a[t][k] = a[t][k].add(a[i][k]);
                        }
                        clear = false;
                    }
                }
            }
            if (clear) {
                return d.abs();
            }
        }
    }

    private static List<int[]> subsets(int n, int order) {
        List<int[]> all = new ArrayList<>();
        for (int bits = 0; bits < 1 << n; bits++) {
            if (Integer.bitCount(bits) == order) {
                int[] subset = new int[order];
                for (int k = 0, next = 0; k < n; k++) {
                    if ((bits >> k & 1) != 0) {
                        subset[next++] = k;
                    }
                }
                all.add(subset);
            }
        }
        return all;
    }

    /**
     * Inertia from the characteristic polynomial (Faddeev–LeVerrier): its roots are real, so Descartes' rule of signs counts the
     * positive ones exactly.
     */
    static Inertia inertia(IntegerMatrix matrix) {
        int n = matrix.rows();
        BigInteger[][] a = big(matrix);
        BigInteger[] c = new BigInteger[n + 1];
        c[n] = BigInteger.ONE;
        BigInteger[][] m = new BigInteger[n][n];
        for (BigInteger[] row : m) {
            Arrays.fill(row, BigInteger.ZERO);
        }
        for (int k = 1; k <= n; k++) {
            m = product(a, m);
            for (int i = 0; i < n; i++) {
                m[i][i] = m[i][i].add(c[n - k + 1]);
            }
            BigInteger trace = BigInteger.ZERO;
            BigInteger[][] am = product(a, m);
            for (int i = 0; i < n; i++) {
                trace = trace.add(am[i][i]);
            }
            c[n - k] = trace.negate().divide(BigInteger.valueOf(k));
        }
        int zero = 0;
        while (zero < n && c[zero].signum() == 0) {
            zero++;
        }
        int changes = 0;
        int last = 0;
        for (BigInteger coefficient : c) {
            if (coefficient.signum() != 0) {
                changes += last != 0 && last != coefficient.signum() ? 1 : 0;
                last = coefficient.signum();
            }
        }
        return new Inertia(changes, n - zero - changes, zero);
    }

    private static BigInteger[][] product(BigInteger[][] a, BigInteger[][] b) {
        int n = a.length;
        BigInteger[][] c = new BigInteger[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                BigInteger sum = BigInteger.ZERO;
                for (int k = 0; k < n; k++) {
                    sum = sum.add(a[i][k].multiply(b[k][j]));
                }
                c[i][j] = sum;
            }
        }
        return c;
    }

    /** The rank modulo a prime, densely. */
    static int rankModulo(IntegerMatrix matrix, int prime) {
        int rows = matrix.rows();
        int columns = matrix.columns();
        BigInteger p = BigInteger.valueOf(prime);
        BigInteger[][] a = big(matrix);
        int rank = 0;
        for (int j = 0; j < columns && rank < rows; j++) {
            int pivot = rank;
            while (pivot < rows && a[pivot][j].mod(p).signum() == 0) {
                pivot++;
            }
            if (pivot == rows) {
                continue;
            }
            BigInteger[] row = a[pivot];
            a[pivot] = a[rank];
            a[rank] = row;
            BigInteger inverse = row[j].modInverse(p);
            for (int i = rank + 1; i < rows; i++) {
                BigInteger factor = a[i][j].multiply(inverse).mod(p);
                for (int k = j; k < columns; k++) {
                    a[i][k] = a[i][k].subtract(factor.multiply(row[k])).mod(p);
                }
            }
            rank++;
        }
        return rank;
    }
}
