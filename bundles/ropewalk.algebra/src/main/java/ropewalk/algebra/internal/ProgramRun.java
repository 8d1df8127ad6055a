package ropewalk.algebra.internal;

/** Runs a program modulo one batch of primes after the other. Not thread-safe; slots are kept between the batches. */
final class ProgramRun {
    private final Program program;
    private final Runnable checkpoint;
    private final int[] code;
    private final double[][] slot;
    private final double[][] prefix;
    private final double[][] pivot;
    private final double[][] block;
    private final double[] total;
    private final double[] inverse;
    private final double[] running;
    private final double[] scaled;
    private final double[] scaled2;
    private final double[] determinant;
    private Lanes lanes;
    private int at;

    ProgramRun(Program program, int laneCount, Runnable checkpoint) {
        this.program = program;
        this.code = program.code;
        this.checkpoint = checkpoint;
        slot = new double[program.slots][laneCount];
        prefix = new double[program.widest][laneCount];
        block = new double[program.widest][];
        pivot = new double[program.widest][];
        total = new double[laneCount];
        inverse = new double[laneCount];
        running = new double[laneCount];
        scaled = new double[laneCount];
        scaled2 = new double[laneCount];
        determinant = new double[laneCount];
    }

    /** Runs all steps modulo the primes of the lanes, as many as given to the constructor. */
    void run(Lanes batch) {
        lanes = batch;
        java.util.Arrays.fill(determinant, 1);
        at = 0;
        for (int level = 0; level < program.levels; level++) {
            int count = code[at++];
            at = load(code, at);
            int header = at;
            readPivots(count);
            invertTotal();
            unrollInverses(count);
            int from = header;
            for (int k = 0; k < count; k++) {
                at = load(code, at);
                int kind = code[from];
                switch (kind) {
                    case Recording.GENERAL -> general(prefix[k]);
                    case Recording.DIAGONAL -> diagonal(prefix[k]);
                    default -> blockStep(prefix[k], slot[code[from + 1]], slot[code[from + 2]], slot[code[from + 3]]);
                }
                from += kind == Recording.BLOCK ? 4 : 2;
                checkpoint.run();
            }
        }
    }

    /** The product of all pivots in a lane, or -1 where one of them is 0. */
    long product(int lane) {
        return lanes.isZero(determinant[lane], lane) ? -1 : lanes.canonical(determinant[lane], lane);
    }

    /** Whether all that is left is 0 in a lane; loads what no step has touched. */
    boolean[] restIsZero() {
        int next = load(program.restCode, 0);
        boolean[] zero = new boolean[lanes.count()];
        java.util.Arrays.fill(zero, true);
        for (int k = 0; k < program.rest; k++) {
            double[] values = slot[program.restCode[next + k]];
            for (int lane = 0; lane < zero.length; lane++) {
                zero[lane] &= lanes.isZero(values[lane], lane);
            }
        }
        return zero;
    }

    private int load(int[] from, int start) {
        int next = start;
        for (int count = from[next++]; count > 0; count--) {
            double[] target = slot[from[next++]];
            int place = from[next++];
            lanes.load(target, place < program.initial.length ? program.initial[place] : 0);
        }
        return next;
    }

    /** prefix[k] becomes the product of the pivots before k, total that of all. */
    private void readPivots(int count) {
        java.util.Arrays.fill(total, 1);
        for (int k = 0; k < count; k++) {
            if (code[at++] == Recording.BLOCK) {
                double[] d = block[k] == null ? block[k] = new double[total.length] : block[k];
                double[] b = slot[code[at + 1]];
                lanes.multiply(d, slot[code[at]], slot[code[at + 2]]);
                lanes.subtractProduct(d, b, b);
                pivot[k] = d;
                at += 3;
            } else {
                pivot[k] = slot[code[at++]];
            }
            System.arraycopy(total, 0, prefix[k], 0, total.length);
            lanes.multiply(total, total, pivot[k]);
        }
    }

    private void invertTotal() {
        lanes.multiply(determinant, determinant, total);
        lanes.invert(inverse, total);
    }

    /** prefix[k] becomes the inverse of pivot k (P. L. Montgomery, Math. Comp. 48 (1987) 243–264, section 10.3.1). */
    private void unrollInverses(int count) {
        System.arraycopy(inverse, 0, running, 0, running.length);
        for (int k = count - 1; k >= 0; k--) {
            lanes.multiply(prefix[k], prefix[k], running);
            lanes.multiply(running, running, pivot[k]);
        }
    }

    private void general(double[] inverseOfPivot) {
        int m = code[at++];
        int l = code[at++];
        int below = at;
        int beside = below + m;
        int target = beside + l;
        for (int i = 0; i < m; i++) {
            checkpoint.run();
            lanes.multiply(scaled, slot[code[below + i]], inverseOfPivot);
            for (int j = 0; j < l; j++) {
                lanes.subtractProduct(slot[code[target++]], scaled, slot[code[beside + j]]);
            }
        }
        at = target;
    }

    private void diagonal(double[] inverseOfPivot) {
        int m = code[at++];
        int beside = at;
        int target = beside + m;
        for (int i = 0; i < m; i++) {
            checkpoint.run();
            lanes.multiply(scaled, slot[code[beside + i]], inverseOfPivot);
            for (int j = i; j < m; j++) {
                lanes.subtractProduct(slot[code[target++]], scaled, slot[code[beside + j]]);
            }
        }
        at = target;
    }

    /** The factors of row i are (d x - b y, a y - b x) / (a d - b²). */
    private void blockStep(double[] inverseOfPivot, double[] a, double[] b, double[] d) {
        int m = code[at++];
        int first = at;
        int second = first + m;
        int target = second + m;
        for (int i = 0; i < m; i++) {
            checkpoint.run();
            double[] x = slot[code[first + i]];
            double[] y = slot[code[second + i]];
            lanes.multiply(scaled, d, x);
            lanes.subtractProduct(scaled, b, y);
            lanes.multiply(scaled, scaled, inverseOfPivot);
            lanes.multiply(scaled2, a, y);
            lanes.subtractProduct(scaled2, b, x);
            lanes.multiply(scaled2, scaled2, inverseOfPivot);
            for (int j = i; j < m; j++) {
                double[] t = slot[code[target++]];
                lanes.subtractProduct(t, scaled, slot[code[first + j]]);
                lanes.subtractProduct(t, scaled2, slot[code[second + j]]);
            }
        }
        at = target;
    }
}
