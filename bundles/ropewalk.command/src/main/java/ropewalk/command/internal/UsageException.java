package ropewalk.command.internal;

/** Wrong usage: exit status 2, one line that says what to write instead. */
final class UsageException extends Exception {

    private static final long serialVersionUID = 1L;

    UsageException(String message) {
        super(message, null, false, false);
    }
}
