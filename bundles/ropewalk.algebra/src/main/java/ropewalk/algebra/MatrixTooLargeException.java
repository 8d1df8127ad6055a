package ropewalk.algebra;

/**
 * Thrown where an exact value cannot be had within memory. The message names the matrix, the limit, and what to do.
 * It is never thrown in place of a value that was found; no value is ever guessed in place of it.
 */
public final class MatrixTooLargeException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /**
     * Creates the exception.
     *
     * @param message the value, the rule that it breaks, and the remedy
     */
    public MatrixTooLargeException(String message) {
        super(message);
    }
}
