package ropewalk.invariant.colouring.internal;

import java.math.BigInteger;
import java.util.Optional;
import java.util.function.UnaryOperator;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.InvariantBase;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value.IntegerValue;

/** The number of Fox colourings modulo a prime. */
abstract class FoxInvariant extends InvariantBase<IntegerValue> {

    private final SplitLaw<IntegerValue> law;

    FoxInvariant(int prime) {
        super("fox" + prime, "Fox " + prime + "-colourings", "The number of colourings of the arcs by integers modulo "
                + prime + " in which twice the over-arc is the sum of the two arcs that end at it, constant colourings "
                + "included (Fox 1962).", IntegerValue.class);
        this.law = new SplitLaw<>() {
            @Override
            public IntegerValue union(IntegerValue left, IntegerValue right, Bipartition which) {
                return new IntegerValue(left.value().multiply(right.value()));
            }

            @Override
            public boolean admitsSplit(IntegerValue whole) {
                // Either side has its constant colourings: a split link has at least p² in all.
                return whole.value().compareTo(BigInteger.valueOf((long) prime * prime)) >= 0;
            }
        };
    }

    @Override
    public Optional<UnaryOperator<IntegerValue>> underMirrorImage() {
        return Optional.of(UnaryOperator.identity());
    }

    @Override
    public Optional<UnaryOperator<IntegerValue>> underReversal() {
        return Optional.of(UnaryOperator.identity());
    }

    @Override
    public Optional<SplitLaw<IntegerValue>> splitLaw() {
        return Optional.of(law);
    }
}
