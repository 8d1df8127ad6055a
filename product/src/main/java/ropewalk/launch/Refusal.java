package ropewalk.launch;

/** An end before a subcommand could run, with the line that tells the user why and the status of the process. */
final class Refusal extends Exception {
    /** Wrong usage, or a feature that is not there. */
    static final int USAGE = 2;
    /** The product itself is at fault. */
    static final int BROKEN = 3;

    private final int status;

    Refusal(int status, String line) {
        super(line);
        this.status = status;
    }

    int status() {
        return status;
    }
}
