package ropewalk.diagram.notation;

/** A code that describes no link diagram: what is wrong, at which byte, and what would be right. */
public final class CodeException extends Exception {

    private static final long serialVersionUID = 1L;

    private final int offset;

    /**
     * A fault in a code.
     *
     * @param offset the byte at which it shows, counted in the array that was read
     * @param reason what is wrong and what would be right, one line
     */
    public CodeException(int offset, String reason) {
        super(reason, null, false, false);
        this.offset = offset;
    }

    /**
     * Where the fault shows.
     *
     * @return a byte offset in the array that was read
     */
    public int offset() {
        return offset;
    }
}
