package ropewalk.algebra.internal;

import ropewalk.algebra.MatrixTooLargeException;

/** The part of the virtual machine's memory that one elimination may take, asked before arrays grow. */
final class Memory {
    private static final long LARGEST_ARRAYS = Runtime.getRuntime().maxMemory() / 4;

    private Memory() {
    }

    /**
     * Refuses what does not fit into a quarter of the memory.
     *
     * @param count the number of things to keep
     * @param bytes the size of one
     * @param what their name, for the message
     * @throws MatrixTooLargeException if they do not fit
     */
    static void check(long count, int bytes, String what) {
        if (count > LARGEST_ARRAYS / bytes) {
            throw new MatrixTooLargeException(count + " " + what + " of " + bytes + " bytes do not fit into a quarter of the memory, "
                + LARGEST_ARRAYS + " bytes: the matrix fills in too much; start the virtual machine with a larger -Xmx, or split the"
                + " matrix into blocks");
        }
    }
}
