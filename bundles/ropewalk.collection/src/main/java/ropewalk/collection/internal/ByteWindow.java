package ropewalk.collection.internal;

import java.io.IOException;
import java.io.InputStream;
import java.util.Arrays;

/**
 * The part of a stream that is in memory: {@code bytes[start..end)}. Grows only on request. An error of the stream is kept
 * until everything read before it is used up.
 */
public final class ByteWindow {

    private final InputStream in;
    private final int usual;
    private byte[] bytes;
    private int start;
    private int end;
    private boolean last;
    private IOException failure;

    /**
     * A window of the given usual size.
     *
     * @param in the stream
     * @param usual bytes
     */
    public ByteWindow(InputStream in, int usual) {
        this.in = in;
        this.usual = usual;
        this.bytes = new byte[usual];
    }

    /** {@return the array; changes with {@link #refill()} and {@link #widen(int)}} */
    public byte[] bytes() {
        return bytes;
    }

    /** {@return the index of the first byte not yet used} */
    public int start() {
        return start;
    }

    /** {@return the index after the last byte in memory} */
    public int end() {
        return end;
    }

    /** {@return whether no byte follows those in memory} */
    public boolean last() {
        return last;
    }

    /** {@return the error that ended the stream, or null} */
    public IOException failure() {
        return failure;
    }

    /**
     * Marks everything before the index as used.
     *
     * @param upTo index after the last used byte
     */
    public void use(int upTo) {
        start = upTo;
    }

    /** Moves the unused bytes to the front, returns to the usual size if they fit twice, and reads until full. */
    public void refill() {
        int kept = end - start;
        byte[] target = bytes.length > usual && kept <= usual / 2 ? new byte[usual] : bytes;
        System.arraycopy(bytes, start, target, 0, kept);
        bytes = target;
        start = 0;
        end = kept;
        fill();
    }

    /**
     * Makes room for more bytes behind the unused ones, up to {@code most} in all, and reads until full.
     *
     * @param most bytes
     */
    public void widen(int most) {
        if (start > 0) {
            refill();
        } else {
            if (end == bytes.length) {
                int size = (int) Math.min(Math.max(most, (long) usual), 2L * bytes.length);
                bytes = Arrays.copyOf(bytes, Math.max(size, bytes.length));
            }
            fill();
        }
    }

    /**
     * Drops everything up to and including the next line break, without keeping it.
     *
     * @return whether there was one
     */
    public boolean dropLine() {
        int p = start;
        while (true) {
            while (p < end && bytes[p] != '\n' && bytes[p] != '\r') {
                p++;
            }
            if (p < end && (bytes[p] == '\n' || p + 1 < end || last)) {
                boolean pair = bytes[p] == '\r' && p + 1 < end && bytes[p + 1] == '\n';
                start = pair ? p + 2 : p + 1;
                return true;
            }
            start = p;
            if (last) {
                return false;
            }
            refill();
            p = start;
        }
    }

    private void fill() {
        try {
            while (end < bytes.length && !last) {
                int n = in.read(bytes, end, bytes.length - end);
                if (n < 0) {
                    last = true;
                } else {
                    end += n;
                }
            }
        } catch (IOException e) {
            failure = e;
            last = true;
        }
    }
}
