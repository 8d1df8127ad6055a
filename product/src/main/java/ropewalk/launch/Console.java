package ropewalk.launch;

/** Messages to the user: one line each, on standard error, never a stack trace. */
final class Console {
    private Console() { }

    static void line(String message) {
        System.err.println("ropewalk: " + message);
    }

    /** What went wrong, in the first line of its own words, or its kind if it has none. */
    static String reason(Throwable fault) {
        String message = fault.getMessage();
        if (message == null || message.isBlank()) {
            return fault.getClass().getSimpleName();
        }
        return message.strip().lines().findFirst().orElseThrow();
    }
}
