package ropewalk.algebra.internal;

/**
 * The steps of an elimination, as told by the elimination that chose the pivots, by places. A place is read by the step that
 * uses it up and written by the steps before; {@link Compiler} turns the recording into a program.
 */
final class Recording implements GeneralElimination.Listener, SymmetricElimination.Listener {
    /** One pivot of any matrix: pivot, m, l, m places below, l places beside, m·l targets. */
    static final int GENERAL = 0;
    /** One diagonal pivot of a symmetric matrix: pivot, m, m places beside, m(m+1)/2 targets (i, j), i &lt;= j. */
    static final int DIAGONAL = 1;
    /** A block ((a, b), (b, d)): places of a, b, d, m, m places beside a, m beside d, m(m+1)/2 targets. */
    static final int BLOCK = 2;

    private final IntList kinds = new IntList(256);
    private final IntList starts = new IntList(256);
    private final IntList code;
    private boolean symmetric = true;

    Recording(int entries) {
        code = new IntList(4 * entries);
    }

    @Override
    public void step(int pivot, int[] below, int m, int[] beside, int[] columns, int l, int[] targets) {
        begin(GENERAL);
        symmetric = false;
        code.add(pivot);
        code.add(m);
        code.add(l);
        append(below, m);
        append(beside, l);
        append(targets, m * l);
    }

    @Override
    public void diagonal(int pivot, int[] beside, int m, int[] targets) {
        begin(DIAGONAL);
        code.add(pivot);
        code.add(m);
        append(beside, m);
        append(targets, pairs(m));
    }

    @Override
    public void block(int a, int b, int d, int[] besideA, int[] besideD, int m, int[] targets) {
        begin(BLOCK);
        code.add(a);
        code.add(b);
        code.add(d);
        code.add(m);
        append(besideA, m);
        append(besideD, m);
        append(targets, pairs(m));
    }

    /** The pairs (i, j) with i &lt;= j of m things; an ArithmeticException rather than a wrong number where no int holds it. */
    static int pairs(int m) {
        return Math.toIntExact(m * (m + 1L) / 2);
    }

    private void begin(int kind) {
        kinds.add(kind);
        starts.add(code.size());
    }

    private void append(int[] values, int count) {
        int at = code.extend(count);
        System.arraycopy(values, 0, code.raw(), at, count);
    }

    /** Whether all steps are symmetric ones. */
    boolean isSymmetric() {
        return symmetric;
    }

    int steps() {
        return kinds.size();
    }

    int kind(int step) {
        return kinds.get(step);
    }

    int start(int step) {
        return starts.get(step);
    }

    /** The code; see the kinds for the layout of a step. */
    int[] code() {
        return code.raw();
    }
}
