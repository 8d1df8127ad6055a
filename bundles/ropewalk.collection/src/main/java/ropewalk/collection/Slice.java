package ropewalk.collection;

import java.nio.charset.StandardCharsets;

/**
 * A range of UTF-8 bytes: the value of one field. The array may be shared and must not be written to.
 *
 * @param bytes the array
 * @param from  first index
 * @param to    index after the last
 */
public record Slice(byte[] bytes, int from, int to) {

    /** {@return the number of bytes} */
    public int length() {
        return to - from;
    }

    /** The bytes as text. */
    @Override
    public String toString() {
        return new String(bytes, from, to - from, StandardCharsets.UTF_8);
    }
}
