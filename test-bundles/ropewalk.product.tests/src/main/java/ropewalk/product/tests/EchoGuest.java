package ropewalk.product.tests;

import java.util.function.ToIntFunction;

/** A guest's subcommand: prints each argument in brackets; its status is the number of them. */
public final class EchoGuest implements ToIntFunction<String[]> {
    /** For the component runtime. */
    public EchoGuest() { }

    @Override
    public int applyAsInt(String[] arguments) {
        for (String argument : arguments) {
            System.out.print("[" + argument + "]");
        }
        System.out.println();
        return arguments.length;
    }
}
