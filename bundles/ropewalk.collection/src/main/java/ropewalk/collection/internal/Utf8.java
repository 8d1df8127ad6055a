package ropewalk.collection.internal;

/** UTF-8 as RFC 3629 (F. Yergeau, 2003), section 4, defines it: shortest forms only, no surrogates, at most U+10FFFF. */
public final class Utf8 {

    /** The bytes so far begin a character, but the range ends inside it. */
    public static final int CUT = -1;
    /** The bytes are not UTF-8. */
    public static final int INVALID = 0;

    private Utf8() {
    }

    /**
     * {@return the number of bytes of the character at {@code at}, or {@link #CUT} or {@link #INVALID}} Reads b[at..to).
     *
     * @param b the bytes
     * @param at the index
     * @param to index after the last
     */
    public static int length(byte[] b, int at, int to) {
        int lead = b[at] & 0xff;
        if (lead < 0x80) {
            return 1;
        }
        if (lead < 0xc2 || lead > 0xf4) {
            return INVALID;
        }
        int low = 0x80;
        int high = 0xbf;
        switch (lead) {
            case 0xe0 -> low = 0xa0;
            case 0xed -> high = 0x9f;
            case 0xf0 -> low = 0x90;
            case 0xf4 -> high = 0x8f;
            default -> { }
        }
        int length = lead < 0xe0 ? 2 : lead < 0xf0 ? 3 : 4;
        for (int i = 1; i < length; i++) {
            if (at + i >= to) {
                return CUT;
            }
            int next = b[at + i] & 0xff;
            if (next < low || next > high) {
                return INVALID;
            }
            low = 0x80;
            high = 0xbf;
        }
        return length;
    }

    /**
     * {@return the number of characters that begin in the range of valid UTF-8}
     *
     * @param b the bytes
     * @param from first index
     * @param to index after the last
     */
    public static int characters(byte[] b, int from, int to) {
        int count = 0;
        for (int i = from; i < to; i++) {
            count += (b[i] & 0xc0) == 0x80 ? 0 : 1;
        }
        return count;
    }
}
