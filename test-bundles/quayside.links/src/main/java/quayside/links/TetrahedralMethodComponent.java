package quayside.links;

import java.math.BigInteger;
import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.Arcs;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerValue;

/**
 * Colourings by the tetrahedral quandle as the solutions of linear equations over the field of 4 elements, one equation
 * a crossing: the under-arc to the left of the over-strand is x * y, where x is the under-arc to its right and y the
 * over-arc.
 */
@Component(service = Method.class, property = {
    Method.ID + "=quayside.tetrahedral.rank", Method.INVARIANT + "=quayside.tetrahedral"})
public final class TetrahedralMethodComponent implements Method<IntegerValue> {

    @Override
    public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
        Arcs arcs = Arcs.of(link);
        FieldOfFourMatrix equations = new FieldOfFourMatrix(link.crossings(), arcs.count());
        for (int c = 0; c < link.crossings(); c++) {
            // The under-strand runs from the right of the over-strand to its left exactly at a positive crossing.
            int right = link.sign(c) > 0 ? 4 * c : 4 * c + 2;
            equations.add(c, arcs.ofDart(right ^ 2), FieldOfFourMatrix.ONE);
            equations.add(c, arcs.ofDart(right), FieldOfFourMatrix.OMEGA);
            equations.add(c, arcs.over(c), FieldOfFourMatrix.ONE ^ FieldOfFourMatrix.OMEGA);
        }
        int solutions = arcs.count() - equations.rank(effort::checkpoint);
        return new Outcome.Exact<>(new IntegerValue(BigInteger.ONE.shiftLeft(2 * solutions)));
    }
}
