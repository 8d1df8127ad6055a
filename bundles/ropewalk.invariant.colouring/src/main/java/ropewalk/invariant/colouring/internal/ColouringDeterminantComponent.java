package ropewalk.invariant.colouring.internal;

import org.osgi.service.component.annotations.Component;
import ropewalk.algebra.Determinant;
import ropewalk.algebra.SmallMatrix;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerValue;
import ropewalk.structure.ColouringMatrix;

/**
 * The determinant of the colouring matrix without a row and a column (Fox 1962); a rival of the Goeritz route. Where a
 * component never passes under the matrix is not square: that component lifts off, and the determinant is 0, unless it
 * is the whole link.
 */
@Component(service = Method.class, property = {
    Method.ID + "=determinant.colouring", Method.INVARIANT + "=determinant", "service.ranking:Integer=50"})
public final class ColouringDeterminantComponent implements Method<IntegerValue> {

    private static final int SMALL = 24;

    @Override
    public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
        return WithinMemory.measure(() -> determinant(ColouringMatrix.of(link), effort));
    }

    private static IntegerValue determinant(ColouringMatrix matrix, Effort effort) {
        if (matrix.rows() == 0 && matrix.columns() == 1) {
            return IntegerValue.of(1);
        }
        if (matrix.rows() != matrix.columns()) {
            return IntegerValue.of(0);
        }
        int n = matrix.rows() - 1;
        if (n <= SMALL) {
            long[] minor = new long[n * n];
            matrix.fill(n, n, minor);
            long determinant = SmallMatrix.determinant(minor, n);
            if (determinant != SmallMatrix.TOO_LARGE) {
                return IntegerValue.of(Math.abs(determinant));
            }
        }
        return new IntegerValue(Determinant.of(matrix.reduced(), effort::checkpoint).abs());
    }
}
