package ropewalk.diagram.notation;

import ropewalk.diagram.LinkBatch;

/**
 * Reads one notation. A reader keeps its scratch arrays from one code to the next, so it serves one thread at a time;
 * take one for each thread.
 */
public interface CodeReader {

    /**
     * Reads one code and adds its diagram to a batch.
     *
     * @param text bytes in UTF-8
     * @param from where the code begins
     * @param to where it ends (exclusive)
     * @param batch takes the diagram; unchanged if the code is bad
     * @throws CodeException if the code describes no link diagram
     */
    void read(byte[] text, int from, int to, LinkBatch.Builder batch) throws CodeException;
}
