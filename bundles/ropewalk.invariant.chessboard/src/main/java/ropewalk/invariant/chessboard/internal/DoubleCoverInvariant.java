package ropewalk.invariant.chessboard.internal;

import java.util.Optional;
import java.util.function.UnaryOperator;
import ropewalk.invariant.InvariantBase;
import ropewalk.invariant.Value;

/**
 * What the double branched cover alone determines, up to its orientation: neither the mirror image of the link nor a
 * reversal changes it.
 *
 * @param <V> the type of the value
 */
abstract class DoubleCoverInvariant<V extends Value> extends InvariantBase<V> {

    DoubleCoverInvariant(String id, String title, String definition, Class<V> valueType) {
        super(id, title, definition, valueType);
    }

    @Override
    public final Optional<UnaryOperator<V>> underMirrorImage() {
        return Optional.of(UnaryOperator.identity());
    }

    @Override
    public final Optional<UnaryOperator<V>> underReversal() {
        return Optional.of(UnaryOperator.identity());
    }
}
