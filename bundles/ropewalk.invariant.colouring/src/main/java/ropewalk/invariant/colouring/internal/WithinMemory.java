package ropewalk.invariant.colouring.internal;

import java.util.function.Supplier;
import ropewalk.algebra.MatrixTooLargeException;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value;

/** A matrix that is too large for an exact method is a limit of ours, not a fault of the link. */
final class WithinMemory {

    private WithinMemory() {
    }

    static <V extends Value> Outcome<V> measure(Supplier<V> value) {
        try {
            return new Outcome.Exact<>(value.get());
        } catch (MatrixTooLargeException e) {
            return new Outcome.OutOfEffort<>(e.getMessage());
        }
    }
}
