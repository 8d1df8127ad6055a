package ropewalk.invariant.linking.internal;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.UnaryOperator;
import org.osgi.service.component.annotations.Component;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.InvariantBase;
import ropewalk.invariant.Pair;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value.IntegerMatrixValue;

/** Defines the linking matrix. */
@Component(service = Invariant.class)
public final class LinkingInvariantComponent extends InvariantBase<IntegerMatrixValue> {

    private static final SplitLaw<IntegerMatrixValue> LAW = new SplitLaw<>() {
        @Override
        public IntegerMatrixValue union(IntegerMatrixValue left, IntegerMatrixValue right, Bipartition which) {
            int[] place = new int[which.size()];
            int leftCount = 0;
            int rightCount = 0;
            for (int i = 0; i < place.length; i++) {
                place[i] = which.isLeft(i) ? leftCount++ : rightCount++;
            }
            List<List<BigInteger>> rows = new ArrayList<>();
            for (int i = 0; i < place.length; i++) {
                List<BigInteger> row = new ArrayList<>();
                for (int j = 0; j < place.length; j++) {
                    IntegerMatrixValue side = which.isLeft(i) ? left : right;
                    row.add(which.isLeft(i) == which.isLeft(j) ? side.rows().get(place[i]).get(place[j])
                            : BigInteger.ZERO);
                }
                rows.add(row);
            }
            return new IntegerMatrixValue(rows);
        }

        @Override
        public Set<Pair> ties(IntegerMatrixValue whole) {
            Set<Pair> ties = new HashSet<>();
            for (int i = 0; i < whole.rows().size(); i++) {
                for (int j = i + 1; j < whole.rows().size(); j++) {
                    if (whole.rows().get(i).get(j).signum() != 0) {
                        ties.add(new Pair(i, j));
                    }
                }
            }
            return ties;
        }
    };

    /** The definition. */
    public LinkingInvariantComponent() {
        super("linking", "Linking matrix", "Linking numbers between the components: half the sum of the crossing signs "
                + "between two components, 0 on the diagonal (Gauss 1833, Brunn 1892).", IntegerMatrixValue.class);
    }

    @Override
    public boolean needsOrientation() {
        return true;
    }

    @Override
    public Optional<UnaryOperator<IntegerMatrixValue>> underMirrorImage() {
        return Optional.of(value -> new IntegerMatrixValue(value.rows().stream()
                .map(row -> row.stream().map(BigInteger::negate).toList()).toList()));
    }

    @Override
    public Optional<UnaryOperator<IntegerMatrixValue>> underReversal() {
        return Optional.of(UnaryOperator.identity());
    }

    @Override
    public Optional<SplitLaw<IntegerMatrixValue>> splitLaw() {
        return Optional.of(LAW);
    }

    @Override
    public String latex(IntegerMatrixValue value) {
        StringBuilder out = new StringBuilder("\\begin{pmatrix}");
        for (int i = 0; i < value.rows().size(); i++) {
            out.append(i == 0 ? "" : "\\\\");
            for (int j = 0; j < value.rows().get(i).size(); j++) {
                out.append(j == 0 ? "" : "&").append(value.rows().get(i).get(j));
            }
        }
        return out.append("\\end{pmatrix}").toString();
    }
}
