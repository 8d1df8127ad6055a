package ropewalk.collection;

/**
 * Tells whether a name occurred before among the first million names given. Keeps a fingerprint of 64 bits of each instead of
 * the name: that two different names of a million share one has a chance of about 3 · 10^-8 unless they were made to, and what
 * hangs on the answer is a warning, never a value.
 *
 * <p><b>Cost.</b> O(length) a name. Memory 8 bytes a slot, half of the slots free at least: 16 MiB for a million names and
 * never more, 32 KiB at first. Not thread-safe.
 *
 * <p><b>Source.</b> Open addressing with linear probing: D. E. Knuth, The Art of Computer Programming 3 (1973), section 6.4.
 */
public final class NameRegister {

    /** The number of names that are remembered. */
    public static final int CAPACITY = 1_000_000;

    // Odd constants with bits all over: the golden ratio, and square roots of 2 and 3, as fractions of 2^64.
    private static final long GOLDEN = 0x9e3779b97f4a7c15L;
    private static final long ROOT_2 = 0x6a09e667f3bcc909L;
    private static final long ROOT_3 = 0xbb67ae8584caa73bL;

    private long[] slots = new long[1 << 12];
    private int size;

    /**
     * Remembers a name. After a million names new ones are not remembered.
     *
     * @param name the bytes of the name
     * @param from first index
     * @param to index after the last
     * @return whether the name is known to have occurred before
     */
    public boolean occurred(byte[] name, int from, int to) {
        long fingerprint = fingerprint(name, from, to);
        // Zero marks a free slot.
        fingerprint = fingerprint == 0 ? 1 : fingerprint;
        int slot = slot(slots, fingerprint);
        if (slots[slot] != 0) {
            return true;
        }
        if (size < CAPACITY) {
            slots[slot] = fingerprint;
            size++;
            if (2L * size > slots.length) {
                grow();
            }
        }
        return false;
    }

    /**
     * As {@link #occurred(byte[], int, int)} for the name of a record.
     *
     * @param block the block that has the record
     * @param i the record
     * @return whether the name is known to have occurred before
     */
    public boolean occurred(RecordBlock block, int i) {
        Slice name = block.value(i, block.header().name());
        return occurred(name.bytes(), name.from(), name.to());
    }

    /** {@return the number of names remembered} */
    public int size() {
        return size;
    }

    private static int slot(long[] table, long fingerprint) {
        int mask = table.length - 1;
        int slot = (int) fingerprint & mask;
        while (table[slot] != 0 && table[slot] != fingerprint) {
            slot = slot + 1 & mask;
        }
        return slot;
    }

    private void grow() {
        long[] larger = new long[2 * slots.length];
        for (long fingerprint : slots) {
            if (fingerprint != 0) {
                larger[slot(larger, fingerprint)] = fingerprint;
            }
        }
        slots = larger;
    }

    /** Each word is mixed in by a multiplication to 128 bits of which both halves count. */
    private static long fingerprint(byte[] b, int from, int to) {
        long h = (to - from) * GOLDEN;
        int p = from;
        for (; p < to; ) {
            long word = 0;
            int stop = Math.min(to, p + 8);
            for (int shift = 0; p < stop; p++, shift += 8) {
                word |= (b[p] & 0xffL) << shift;
            }
            h = mixed(h ^ word, ROOT_2) + GOLDEN;
        }
        return mixed(mixed(h, ROOT_3), GOLDEN);
    }

    private static long mixed(long x, long factor) {
        return x * factor ^ Math.multiplyHigh(x, factor) ^ x >>> 29;
    }
}
