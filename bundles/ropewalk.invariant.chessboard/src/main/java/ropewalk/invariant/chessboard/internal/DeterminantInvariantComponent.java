package ropewalk.invariant.chessboard.internal;

import java.util.Optional;
import org.osgi.service.component.annotations.Component;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value.IntegerValue;

/** Defines the determinant. */
@Component(service = Invariant.class)
public final class DeterminantInvariantComponent extends DoubleCoverInvariant<IntegerValue> {

    /** A separating sphere makes a free summand in H₁ of the double branched cover, whose order then counts as 0. */
    private static final SplitLaw<IntegerValue> LAW = new SplitLaw<>() {
        @Override
        public IntegerValue union(IntegerValue left, IntegerValue right, Bipartition which) {
            return IntegerValue.of(0);
        }

        @Override
        public boolean admitsSplit(IntegerValue whole) {
            return whole.value().signum() == 0;
        }
    };

    /** The definition. */
    public DeterminantInvariantComponent() {
        super("determinant", "Determinant", "The absolute value of the determinant of a Goeritz matrix of a connected "
                + "diagram; 0 where the diagram is disconnected (Goeritz 1933).", IntegerValue.class);
    }

    @Override
    public Optional<SplitLaw<IntegerValue>> splitLaw() {
        return Optional.of(LAW);
    }
}
