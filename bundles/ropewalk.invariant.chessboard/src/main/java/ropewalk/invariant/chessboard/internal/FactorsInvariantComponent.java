package ropewalk.invariant.chessboard.internal;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.osgi.service.component.annotations.Component;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value.IntegerList;

/** Defines the invariant factors of H₁ of the double branched cover. */
@Component(service = Invariant.class)
public final class FactorsInvariantComponent extends DoubleCoverInvariant<IntegerList> {

    private static final SplitLaw<IntegerList> LAW = new SplitLaw<>() {
        @Override
        public IntegerList union(IntegerList left, IntegerList right, Bipartition which) {
            List<BigInteger> orders = new ArrayList<>(left.values());
            orders.addAll(right.values());
            return new IntegerList(DirectSum.of(orders, 1, () -> { }));
        }

        @Override
        public boolean admitsSplit(IntegerList whole) {
            return whole.values().stream().anyMatch(d -> d.signum() == 0);
        }
    };

    /** The definition. */
    public FactorsInvariantComponent() {
        super("factors", "Invariant factors", "The first homology group of the double branched cover, the cokernel of a "
                + "Goeritz matrix, as a list of invariant factors, ones dropped and zeros last (Seifert 1933).",
                IntegerList.class);
    }

    @Override
    public Optional<SplitLaw<IntegerList>> splitLaw() {
        return Optional.of(LAW);
    }

    @Override
    public String latex(IntegerList value) {
        if (value.values().isEmpty()) {
            return "0";
        }
        StringBuilder out = new StringBuilder();
        for (var d : value.values()) {
            out.append(out.isEmpty() ? "" : " \\oplus ").append("\\mathbb{Z}").append(d.signum() == 0 ? "" : "/" + d);
        }
        return out.toString();
    }
}
