package ropewalk.algebra.internal;

import ropewalk.algebra.IntegerMatrix;
import ropewalk.algebra.MatrixTooLargeException;

/** Rank and right kernel modulo one prime by sparse elimination; the pivot rows are kept for the back substitution. */
public final class PrimeKernel {
    private final IntegerMatrix matrix;
    private final PrimeField field;
    private final Runnable checkpoint;

    /**
     * Prepares.
     *
     * @param matrix the matrix
     * @param prime a prime
     * @param checkpoint run after every pivot
     * @throws IllegalArgumentException if the number is not a prime
     */
    public PrimeKernel(IntegerMatrix matrix, int prime, Runnable checkpoint) {
        if (prime < 2 || !Primes.isPrime(prime)) {
            throw new IllegalArgumentException("modulus " + prime + " is not a prime; only fields are served, for other moduli"
                + " use the invariant factors");
        }
        this.matrix = matrix;
        this.field = new PrimeField(prime);
        this.checkpoint = checkpoint;
    }

    /**
     * The rank.
     *
     * @return the rank modulo the prime
     */
    public int rank() {
        GeneralElimination run = new GeneralElimination(matrix, new PrimeValues(matrix, field), null, checkpoint);
        run.run();
        return run.pivots();
    }

    /**
     * A basis of the right kernel: one vector for each column without pivot, 1 there and 0 at the other such columns.
     *
     * @return the basis, residues from 0 to p - 1
     */
    public int[][] basis() {
        PrimeValues values = new PrimeValues(matrix, field);
        IntList starts = new IntList(matrix.columns());
        IntList columns = new IntList(matrix.entries());
        IntList residues = new IntList(matrix.entries());
        GeneralElimination run = new GeneralElimination(matrix, values, (pivot, below, m, beside, besideColumns, l, targets) -> {
            starts.add(columns.size());
            long minusInverse = field.negate(field.inverse(values.get(pivot)));
            for (int k = 0; k < l; k++) {
                columns.add(besideColumns[k]);
                residues.add((int) field.multiply(values.get(beside[k]), minusInverse));
            }
        }, checkpoint);
        run.run();
        starts.add(columns.size());
        boolean[] isPivot = new boolean[matrix.columns()];
        for (int k = 0; k < run.pivots(); k++) {
            isPivot[run.pivotColumn(k)] = true;
        }
        int[][] basis = new int[roomFor(matrix.columns() - run.pivots())][];
        int next = 0;
        for (int free = 0; free < isPivot.length; free++) {
            if (!isPivot[free]) {
                basis[next++] = solve(run, starts, columns.raw(), residues.raw(), free);
            }
        }
        return basis;
    }

    private int roomFor(int vectors) {
        long memory = Runtime.getRuntime().maxMemory();
        if (4L * vectors * matrix.columns() > memory / 2) {
            throw new MatrixTooLargeException("a basis of " + vectors + " vectors of length " + matrix.columns()
                + " does not fit into half of the memory of " + memory
                + " bytes; ask for the rank instead, or start the virtual machine with a larger -Xmx");
        }
        return vectors;
    }

    private int[] solve(GeneralElimination run, IntList starts, int[] columns, int[] residues, int free) {
        int[] vector = new int[matrix.columns()];
        vector[free] = 1;
        long p = field.p;
        for (int k = run.pivots() - 1; k >= 0; k--) {
            long sum = 0;
            for (int c = starts.get(k); c < starts.get(k + 1); c++) {
                sum += (long) residues[c] * vector[columns[c]] % p;
            }
            vector[run.pivotColumn(k)] = (int) (sum % p);
            if ((k & 255) == 0) {
                checkpoint.run();
            }
        }
        return vector;
    }
}
