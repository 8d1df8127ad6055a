package quayside.links;

import java.util.Optional;
import java.util.function.UnaryOperator;
import org.osgi.service.component.annotations.Component;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.InvariantBase;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value.IntegerValue;

/**
 * Defines the number of colourings by the tetrahedral quandle.
 *
 * <p>Mirror image and reversal of all components turn a colouring by a quandle into one by its dual (the operation
 * undone). Here the dual is x * y = ω²x + ωy, which squaring, the automorphism of the field, makes into the quandle
 * itself. So neither changes the number, as the base class says by default. Reversing some of the components may.
 */
@Component(service = Invariant.class)
public final class TetrahedralInvariantComponent extends InvariantBase<IntegerValue> {

    /**
     * An arc of one side meets no arc of the other, so colourings of the two sides combine freely. Each side has at
     * least the 4 constant ones.
     */
    private static final SplitLaw<IntegerValue> LAW = new SplitLaw<>() {
        @Override
        public IntegerValue union(IntegerValue left, IntegerValue right, Bipartition which) {
            return new IntegerValue(left.value().multiply(right.value()));
        }

        @Override
        public boolean admitsSplit(IntegerValue whole) {
            return whole.value().bitLength() > 4;       // at least 16
        }
    };

    /** The definition. */
    public TetrahedralInvariantComponent() {
        super("quayside.tetrahedral", "Tetrahedral colourings", "The number of colourings of the arcs by the tetrahedral "
                + "quandle, the field of 4 elements with x * y = ωx + (1 + ω)y, constant ones included (Joyce 1982).",
                IntegerValue.class);
    }

    @Override
    public boolean needsOrientation() {
        return true;
    }

    /** Either change turns the quandle into its dual, with ω² for ω, and squaring is an isomorphism between the two. */
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
        return Optional.of(LAW);
    }
}
