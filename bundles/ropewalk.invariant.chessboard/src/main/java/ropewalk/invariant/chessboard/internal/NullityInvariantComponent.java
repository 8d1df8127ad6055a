package ropewalk.invariant.chessboard.internal;

import java.math.BigInteger;
import java.util.Optional;
import org.osgi.service.component.annotations.Component;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value.IntegerValue;

/** Defines the nullity. */
@Component(service = Invariant.class)
public final class NullityInvariantComponent extends DoubleCoverInvariant<IntegerValue> {

    private static final SplitLaw<IntegerValue> LAW = new SplitLaw<>() {
        @Override
        public IntegerValue union(IntegerValue left, IntegerValue right, Bipartition which) {
            return new IntegerValue(left.value().add(right.value()).add(BigInteger.ONE));
        }

        @Override
        public boolean admitsSplit(IntegerValue whole) {
            return whole.value().signum() > 0;
        }
    };

    /** The definition. */
    public NullityInvariantComponent() {
        super("nullity", "Nullity", "The rank of the first homology group of the double branched cover; 0 for a knot "
                + "(Murasugi 1965).", IntegerValue.class);
    }

    @Override
    public Optional<SplitLaw<IntegerValue>> splitLaw() {
        return Optional.of(LAW);
    }
}
