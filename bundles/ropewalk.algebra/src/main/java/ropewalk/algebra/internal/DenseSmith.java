package ropewalk.algebra.internal;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * Smith's normal form of a small dense matrix over Z/m, m any number (a principal ideal ring; A. Storjohann and T. Mulders,
 * ESA 1998, 139–150). All operations are unimodular over Z, or multiply a row by a unit of Z/m.
 */
final class DenseSmith {
    private final BigInteger[][] a;
    private final BigInteger m;
    private final int rows;
    private final int columns;
    private final Runnable checkpoint;

    private DenseSmith(BigInteger[][] a, BigInteger m, Runnable checkpoint) {
        this.a = a;
        this.m = m;
        this.rows = a.length;
        this.columns = rows == 0 ? 0 : a[0].length;
        this.checkpoint = checkpoint;
    }

    /**
     * The first factors.
     *
     * @param a residues from 0 to m - 1, rows of equal length; overwritten
     * @param m the modulus, above 1
     * @param count how many factors
     * @param checkpoint run after every row operation
     * @return those among the first {@code count} factors that are not 1, as divisors of m, each dividing the next; 0 as m
     */
    static List<BigInteger> factors(BigInteger[][] a, BigInteger m, int count, Runnable checkpoint) {
        DenseSmith job = new DenseSmith(a, m, checkpoint);
        List<BigInteger> factors = new ArrayList<>();
        for (int t = 0; t < count; t++) {
            BigInteger factor = job.bringForward(t) ? job.settle(t) : m;
            if (!factor.equals(BigInteger.ONE)) {
                factors.add(factor);
            }
        }
        return factors;
    }

    /** Brings an entry whose common divisor with m is least to (t, t). False if all entries left are 0. */
    private boolean bringForward(int t) {
        BigInteger least = m;
        int row = -1;
        int column = -1;
        for (int i = t; i < rows && !least.equals(BigInteger.ONE); i++) {
            checkpoint.run();
            for (int j = t; j < columns; j++) {
                if (a[i][j].signum() != 0) {
                    BigInteger divisor = a[i][j].gcd(m);
                    if (divisor.compareTo(least) < 0) {
                        least = divisor;
                        row = i;
                        column = j;
                    }
                }
            }
        }
        if (row < 0) {
            return false;
        }
        BigInteger[] r = a[t];
        a[t] = a[row];
        a[row] = r;
        exchangeColumns(t, column, t);
        return true;
    }

    private void exchangeColumns(int j, int k, int from) {
        for (int i = from; i < rows && j != k; i++) {
            BigInteger v = a[i][j];
            a[i][j] = a[i][k];
            a[i][k] = v;
        }
    }

    /** Clears row and column t and makes (t, t), a divisor of m, divide all that is left. Each round lessens the pivot. */
    private BigInteger settle(int t) {
        while (true) {
            normalise(t);
            for (int i = t + 1; i < rows; i++) {
                checkpoint.run();
                clear(t, i);
            }
            BigInteger pivot = a[t][t];
            // Column t is empty below: what a column operation takes from row t costs nothing elsewhere.
            int column = t + 1;
            while (column < columns && (a[t][column] = a[t][column].mod(pivot)).signum() == 0) {
                column++;
            }
            if (column < columns) {
                exchangeColumns(t, column, t);
                continue;
            }
            int row = notDivided(t, pivot);
            if (row < 0) {
                return pivot;
            }
            System.arraycopy(a[row], t + 1, a[t], t + 1, columns - t - 1);
        }
    }

    /** Multiplies row t by a unit that makes the pivot gcd(pivot, m). */
    private void normalise(int t) {
        BigInteger pivot = a[t][t];
        BigInteger divisor = pivot.gcd(m);
        if (pivot.equals(divisor)) {
            return;
        }
        BigInteger k = m.divide(divisor);
        BigInteger unit = unit(pivot.divide(divisor).modInverse(k), k);
        for (int j = t; j < columns; j++) {
            a[t][j] = a[t][j].multiply(unit).mod(m);
        }
    }

    /**
     * A unit of Z/m that is s modulo k, where k divides m and s is prime to k. With h the part of m prime to s, s + h k is prime
     * to every prime q that divides m: where q divides s it divides neither k nor h, else it divides h and not s.
     */
    private BigInteger unit(BigInteger s, BigInteger k) {
        BigInteger h = m;
        for (BigInteger common = s.gcd(h); !common.equals(BigInteger.ONE); common = s.gcd(h)) {
            h = h.divide(common);
        }
        return s.add(h.multiply(k)).mod(m);
    }

    /** Makes (i, t) zero; where the pivot does not divide it, the pivot becomes their greatest common divisor. */
    private void clear(int t, int i) {
        BigInteger b = a[i][t];
        if (b.signum() == 0) {
            return;
        }
        BigInteger pivot = a[t][t];
        BigInteger[] quotient = b.divideAndRemainder(pivot);
        if (quotient[1].signum() == 0) {
            for (int j = t; j < columns; j++) {
                a[i][j] = a[i][j].subtract(quotient[0].multiply(a[t][j])).mod(m);
            }
            return;
        }
        BigInteger g = pivot.gcd(b);
        BigInteger p = pivot.divide(g);
        BigInteger q = b.divide(g);
        // x p + y q = 1, so ((x, y), (-q, p)) has determinant 1.
        BigInteger y = p.equals(BigInteger.ONE) ? BigInteger.ZERO : q.modInverse(p);
        BigInteger x = BigInteger.ONE.subtract(y.multiply(q)).divide(p);
        for (int j = t; j < columns; j++) {
            BigInteger upper = a[t][j];
            BigInteger lower = a[i][j];
            a[t][j] = x.multiply(upper).add(y.multiply(lower)).mod(m);
            a[i][j] = p.multiply(lower).subtract(q.multiply(upper)).mod(m);
        }
    }

    private int notDivided(int t, BigInteger pivot) {
        for (int i = t + 1; i < rows; i++) {
            checkpoint.run();
            for (int j = t + 1; j < columns; j++) {
                if (a[i][j].mod(pivot).signum() != 0) {
                    return i;
                }
            }
        }
        return -1;
    }
}
