package ropewalk.invariant.chessboard.internal;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.osgi.service.component.annotations.Component;
import ropewalk.algebra.InvariantFactors;
import ropewalk.algebra.SmallMatrix;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value.IntegerList;
import ropewalk.structure.GoeritzForms;

/** The invariant factors of the Goeritz forms: their cokernels, and a summand Z for each further piece. */
@Component(service = Method.class, property = {
    Method.ID + "=factors.goeritz", Method.INVARIANT + "=factors", "service.ranking:Integer=100"})
public final class FactorsMethodComponent implements Method<IntegerList> {

    private static final int SMALL = 16;

    @Override
    public Outcome<IntegerList> measure(LinkDiagram link, Effort effort) {
        return WithinMemory.measure(() -> factors(link, effort));
    }

    private static IntegerList factors(LinkDiagram link, Effort effort) {
        GoeritzForms forms = GoeritzForms.of(link);
        int pieces = ConnectedPieces.of(link).count();
        if (pieces == 1 && forms.count() == 1) {
            return new IntegerList(ofPiece(forms, 0, effort));
        }
        List<BigInteger> cyclic = new ArrayList<>();
        for (int p = 0; p < forms.count(); p++) {
            cyclic.addAll(ofPiece(forms, p, effort));
        }
        return new IntegerList(DirectSum.of(cyclic, pieces - 1, effort::checkpoint));
    }

    private static List<BigInteger> ofPiece(GoeritzForms forms, int piece, Effort effort) {
        int n = forms.dimension(piece) - 1;
        if (n <= SMALL) {
            long[] form = new long[n * n];
            long[] out = new long[n];
            forms.fillReduced(piece, form);
            int count = SmallMatrix.invariantFactors(form, n, n, out);
            if (count >= 0) {
                List<BigInteger> factors = new ArrayList<>(count);
                for (int i = 0; i < count; i++) {
                    factors.add(BigInteger.valueOf(out[i]));
                }
                return factors;
            }
        }
        return InvariantFactors.of(forms.reduced(piece), effort::checkpoint);
    }
}
