package ropewalk.command.internal;

import java.io.IOException;
import java.util.function.ToIntFunction;

/** What all subcommands share: one line on standard error for what went wrong, and the exit status that goes with it. */
abstract class Subcommand implements ToIntFunction<String[]> {

    static final int DONE = 0;
    static final int SOME_FAILED = 1;
    static final int WRONG_USAGE = 2;
    static final int BROKE = 3;

    private final String name;
    private final String usage;

    Subcommand(String name, String usage) {
        this.name = name;
        this.usage = usage;
    }

    @Override
    public final int applyAsInt(String[] arguments) {
        if (arguments.length == 1 && (arguments[0].equals("--help") || arguments[0].equals("-h"))) {
            System.out.println(usage);
            return DONE;
        }
        try {
            return run(arguments);
        } catch (UsageException e) {
            message(e.getMessage() + "; see 'ropewalk " + name + " --help'");
            return WRONG_USAGE;
        } catch (IOException e) {
            String reason = e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
            message(name + " broke off: " + reason);
            return BROKE;
        }
    }

    abstract int run(String[] arguments) throws UsageException, IOException;

    static void message(String line) {
        System.err.println("ropewalk: " + Visible.text(line));
    }
}
