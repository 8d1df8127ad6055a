package ropewalk.algebra.internal;

import java.util.Arrays;

/** A growing flat array of ints, for recordings of unknown length. Not thread-safe. */
final class IntList {
    private int[] data;
    private int size;

    IntList(int capacity) {
        data = new int[Math.max(16, capacity)];
    }

    void add(int v) {
        if (size == data.length) {
            grow(1);
        }
        data[size++] = v;
    }

    /** Makes room for more values and returns the place of the first; they are 0 or stale until {@link #set}. */
    int extend(int count) {
        if (data.length - size < count) {
            grow(count);
        }
        int at = size;
        size += count;
        return at;
    }

    private void grow(int count) {
        long wanted = Math.max((long) size + count, size + (long) (size >> 1));
        if (wanted > Integer.MAX_VALUE - 8) {
            wanted = Math.max((long) size + count, Integer.MAX_VALUE - 8);
        }
        if (wanted > Integer.MAX_VALUE - 8) {
            throw new ropewalk.algebra.MatrixTooLargeException("an elimination needs more than " + (Integer.MAX_VALUE - 8)
                + " steps on record; the matrix fills in too much for sparse elimination, split it into blocks");
        }
        Memory.check(wanted, Integer.BYTES, "recorded steps");
        data = Arrays.copyOf(data, (int) wanted);
    }

    void set(int at, int v) {
        data[at] = v;
    }

    int get(int at) {
        return data[at];
    }

    int removeLast() {
        return data[--size];
    }

    int size() {
        return size;
    }

    void clear() {
        size = 0;
    }

    /** The array itself, valid up to {@link #size} and until the next growth. */
    int[] raw() {
        return data;
    }

    int[] toArray() {
        return Arrays.copyOf(data, size);
    }
}
