package ropewalk.families;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import ropewalk.diagram.LinkDiagram;

/** The colouring matrix, written out and eliminated without any cleverness: the slow twin for tests. */
final class SlowColouring {

    private SlowColouring() {
    }

    /** One row a crossing, one column an arc; arcs are found by walking, components never under are arcs of their own. */
    static BigInteger[][] matrix(LinkDiagram d) {
        int[] arc = new int[d.darts()];
        int arcs = 0;
        for (int i = 0; i < d.components(); i++) {
            if (d.start(i) < 0) {
                arcs++;
                continue;
            }
            int begin = d.start(i);
            for (int e = d.next(begin); e != d.start(i); e = d.next(e)) {
                if (!LinkDiagram.isOver(e)) {
                    begin = e;
                }
            }
            int e = begin;
            do {
                arc[e] = arcs;
                arc[d.mate(e)] = arcs;
                e = d.next(e);
                if (!LinkDiagram.isOver(e)) {
                    arcs++;
                }
            } while (e != begin);
            if (LinkDiagram.isOver(begin)) {
                arcs++;
            }
        }
        BigInteger[][] m = new BigInteger[d.crossings()][arcs];
        for (int c = 0; c < m.length; c++) {
            Arrays.fill(m[c], BigInteger.ZERO);
            add(m[c], arc[4 * c], -1);
            add(m[c], arc[4 * c + 2], -1);
            add(m[c], arc[4 * c + 1], 2);
        }
        return m;
    }

    private static void add(BigInteger[] row, int column, int value) {
        row[column] = row[column].add(BigInteger.valueOf(value));
    }

    /** |det| of the matrix without its last row and column (Bareiss 1968); 0 where it is not square. */
    static BigInteger determinant(LinkDiagram d) {
        BigInteger[][] m = matrix(d);
        int n = m.length;
        int arcs = n == 0 ? d.components() : m[0].length;
        if (arcs != n) {
            return arcs == 1 ? BigInteger.ONE : BigInteger.ZERO;
        }
        BigInteger last = BigInteger.ONE;
        for (int k = 0; k < n - 1; k++) {
            int pivot = k;
            while (pivot < n - 1 && m[pivot][k].signum() == 0) {
                pivot++;
            }
            if (pivot == n - 1) {
                return BigInteger.ZERO;
            }
            BigInteger[] swap = m[pivot];
            m[pivot] = m[k];
            m[k] = swap;
            for (int i = k + 1; i < n - 1; i++) {
                for (int j = k + 1; j < n - 1; j++) {
                    m[i][j] = m[i][j].multiply(m[k][k]).subtract(m[i][k].multiply(m[k][j])).divide(last);
                }
            }
            last = m[k][k];
        }
        return last.abs();
    }

    /** The invariant factors of H₁ of the double branched cover, ones dropped, zeros last, by row and column steps. */
    static List<BigInteger> factors(LinkDiagram d) {
        BigInteger[][] m = matrix(d);
        int rows = m.length;
        int columns = rows == 0 ? d.components() : m[0].length;
        List<BigInteger> diagonal = new ArrayList<>();
        for (int k = 0; k < Math.min(rows, columns) && clear(m, k); k++) {
            diagonal.add(m[k][k].abs());
        }
        for (int i = 0; i < diagonal.size(); i++) {
            for (int j = i + 1; j < diagonal.size(); j++) {
                BigInteger a = diagonal.get(i);
                BigInteger b = diagonal.get(j);
                BigInteger g = a.gcd(b);
                diagonal.set(i, g);
                diagonal.set(j, a.divide(g).multiply(b));
            }
        }
        List<BigInteger> result = new ArrayList<>(diagonal);
        while (result.size() < columns - 1) {
            result.add(BigInteger.ZERO);
        }
        result.removeIf(BigInteger.ONE::equals);
        return result;
    }

    private static boolean clear(BigInteger[][] m, int k) {
        while (true) {
            int r = -1;
            int c = -1;
            for (int i = k; i < m.length; i++) {
                for (int j = k; j < m[0].length; j++) {
                    if (m[i][j].signum() != 0 && (r < 0 || m[i][j].abs().compareTo(m[r][c].abs()) < 0)) {
                        r = i;
                        c = j;
                    }
                }
            }
            if (r < 0) {
                return false;
            }
            BigInteger[] swap = m[r];
            m[r] = m[k];
            m[k] = swap;
            for (BigInteger[] row : m) {
                BigInteger x = row[c];
                row[c] = row[k];
                row[k] = x;
            }
            boolean clean = true;
            for (int i = k + 1; i < m.length; i++) {
                BigInteger q = m[i][k].divide(m[k][k]);
                for (int j = k; j < m[0].length; j++) {
                    m[i][j] = m[i][j].subtract(q.multiply(m[k][j]));
                }
                clean &= m[i][k].signum() == 0;
            }
            for (int j = k + 1; j < m[0].length; j++) {
                BigInteger q = m[k][j].divide(m[k][k]);
                for (int i = k; i < m.length; i++) {
                    m[i][j] = m[i][j].subtract(q.multiply(m[i][k]));
                }
                clean &= m[k][j].signum() == 0;
            }
            if (clean) {
                return true;
            }
        }
    }

    /** Linking numbers, 0 on the diagonal. */
    static List<List<Integer>> linking(LinkDiagram d) {
        int k = d.components();
        int[][] sums = new int[k][k];
        for (int c = 0; c < d.crossings(); c++) {
            int a = d.component(4 * c);
            int b = d.component(4 * c + 1);
            if (a != b) {
                sums[a][b] += d.sign(c);
                sums[b][a] += d.sign(c);
            }
        }
        List<List<Integer>> result = new ArrayList<>();
        for (int[] row : sums) {
            result.add(Arrays.stream(row).map(x -> x / 2).boxed().toList());
        }
        return result;
    }
}
