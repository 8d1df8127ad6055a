package ropewalk.collection;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Collects the rows of one block while their bytes stay where they are, then copies those bytes once. */
final class BlockBuilder {

    private final String file;
    private final CollectionHeader header;
    private long[] lines = new long[64];
    private int[] rowStarts = new int[64];
    private int[] bounds;
    private int size;
    private int contentEnd;
    private final List<Rejection> rejections = new ArrayList<>();
    private int[] recordsBefore = new int[8];

    BlockBuilder(String file, CollectionHeader header) {
        this.file = file;
        this.header = header;
        this.bounds = new int[2 * header.size() * 16];
    }

    int rows() {
        return size + rejections.size();
    }

    void add(long line, int start, int end, int[] rowBounds) {
        if (size == lines.length) {
            lines = Arrays.copyOf(lines, 2 * size);
            rowStarts = Arrays.copyOf(rowStarts, 2 * size);
        }
        int width = 2 * header.size();
        if ((size + 1) * width > bounds.length) {
            bounds = Arrays.copyOf(bounds, Math.max((size + 1) * width, 2 * bounds.length));
        }
        lines[size] = line;
        rowStarts[size] = start;
        System.arraycopy(rowBounds, 0, bounds, size * width, width);
        contentEnd = end;
        size++;
    }

    void add(Rejection rejection) {
        if (rejections.size() == recordsBefore.length) {
            recordsBefore = Arrays.copyOf(recordsBefore, 2 * recordsBefore.length);
        }
        recordsBefore[rejections.size()] = size;
        rejections.add(rejection);
    }

    /** The block; its bytes run from the first record to the last, so its indices are shifted by the start of the first. */
    RecordBlock build(byte[] bytes) {
        int shift = size == 0 ? 0 : rowStarts[0];
        byte[] own = size == 0 ? new byte[0] : Arrays.copyOfRange(bytes, shift, contentEnd);
        int[] starts = Arrays.copyOf(rowStarts, size);
        int[] shifted = Arrays.copyOf(bounds, 2 * header.size() * size);
        for (int i = 0; i < size; i++) {
            starts[i] -= shift;
        }
        for (int k = 0; k < shifted.length; k++) {
            // A complemented end moves the other way: ~(x - s) == ~x + s.
            shifted[k] += shifted[k] < 0 ? shift : -shift;
        }
        return new RecordBlock(file, header, own, Arrays.copyOf(lines, size), starts, shifted, rejections,
                Arrays.copyOf(recordsBefore, rejections.size()));
    }
}
