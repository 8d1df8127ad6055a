package ropewalk.product.tests;

import java.util.function.ToIntFunction;

/** A guest's subcommand that cannot even be made. */
public final class UnmakeableGuest implements ToIntFunction<String[]> {
    /** For the component runtime, to its regret. */
    public UnmakeableGuest() {
        throw new IllegalStateException("no rope at all");
    }

    @Override
    public int applyAsInt(String[] arguments) {
        return 0;
    }
}
