package ropewalk.product.tests;

import java.util.function.ToIntFunction;

/** A guest's subcommand that throws. */
public final class BrokenGuest implements ToIntFunction<String[]> {
    /** For the component runtime. */
    public BrokenGuest() { }

    @Override
    public int applyAsInt(String[] arguments) {
        throw new IllegalStateException("out of rope\nsecond line");
    }
}
