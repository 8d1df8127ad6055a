package ropewalk.invariant.linking.internal;

import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerMatrixValue;

/** Linking numbers by counting signed crossings. O(crossings + components²). */
@Component(service = Method.class, property = {
    Method.ID + "=linking.crossings", Method.INVARIANT + "=linking", "service.ranking:Integer=100"})
public final class LinkingMethodComponent implements Method<IntegerMatrixValue> {

    /** A matrix of more entries would be no cell of a table. */
    private static final int MOST_COMPONENTS = 2000;

    private static final IntegerMatrixValue KNOT = IntegerMatrixValue.of(new long[1][1]);

    @Override
    public Outcome<IntegerMatrixValue> measure(LinkDiagram link, Effort effort) {
        int k = link.components();
        if (k == 1) {
            return new Outcome.Exact<>(KNOT);
        }
        if (k > MOST_COMPONENTS) {
            return new Outcome.OutOfEffort<>("a linking matrix of " + k + " components; it is made for at most "
                    + MOST_COMPONENTS);
        }
        long[][] twice = new long[k][k];
        for (int c = 0; c < link.crossings(); c++) {
            int under = link.component(4 * c);
            int over = link.component(4 * c + 1);
            if (under != over) {
                twice[under][over] += link.sign(c);
                twice[over][under] += link.sign(c);
            }
        }
        for (int i = 0; i < k; i++) {
            for (int j = 0; j < k; j++) {
                twice[i][j] /= 2;       // two closed curves in the plane cross an even number of times
            }
        }
        return new Outcome.Exact<>(IntegerMatrixValue.of(twice));
    }
}
