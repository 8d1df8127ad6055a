package ropewalk.invariant.chessboard.internal;

import java.util.Optional;
import java.util.function.UnaryOperator;
import org.osgi.service.component.annotations.Component;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.InvariantBase;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value.IntegerValue;

/** Defines the signature. */
@Component(service = Invariant.class)
public final class SignatureInvariantComponent extends InvariantBase<IntegerValue> {

    private static final SplitLaw<IntegerValue> LAW = new SplitLaw<>() {
        @Override
        public IntegerValue union(IntegerValue left, IntegerValue right, Bipartition which) {
            return new IntegerValue(left.value().add(right.value()));
        }
    };

    /** The definition. */
    public SignatureInvariantComponent() {
        super("signature", "Signature", "The signature of V + V^T for a Seifert matrix V of the oriented link, -2 for the "
                + "right-handed trefoil (Trotter 1962, Murasugi 1965).", IntegerValue.class);
    }

    @Override
    public boolean needsOrientation() {
        return true;
    }

    @Override
    public Optional<UnaryOperator<IntegerValue>> underMirrorImage() {
        return Optional.of(value -> new IntegerValue(value.value().negate()));
    }

    @Override
    public Optional<UnaryOperator<IntegerValue>> underReversal() {
        return Optional.of(UnaryOperator.identity());
    }

    @Override
    public Optional<SplitLaw<IntegerValue>> splitLaw() {
        return Optional.of(LAW);
    }
}
