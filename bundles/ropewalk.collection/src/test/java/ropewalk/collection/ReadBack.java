package ropewalk.collection;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** Everything a reader says about a text, in the order of the text. */
record ReadBack(List<String> header, List<Entry> entries) {

    /** A record (reason null) or a rejection. */
    record Entry(long line, int column, List<String> fields, String name, String reason) {

        boolean isRecord() {
            return reason == null;
        }

        /** Line and fields of a record, line and column of a rejection. */
        String shape() {
            return isRecord() ? line + " " + fields : line + ":" + column + " rejected";
        }
    }

    /** Sizes of blocks so small that every boundary falls everywhere, and the usual ones. */
    static List<ReadingLimits> allSizes(int rowBytes) {
        List<ReadingLimits> all = new ArrayList<>();
        for (int rows : new int[] {1, 3, 256}) {
            for (int bytes : new int[] {1, 2, 3, 5, 7, 11, 16, 33, 64, 1 << 17}) {
                all.add(new ReadingLimits(rows, bytes, rowBytes));
            }
        }
        return all;
    }

    static ReadBack of(InputStream in, ReadingLimits limits) throws IOException {
        List<Entry> entries = new ArrayList<>();
        try (CollectionReader reader = CollectionReader.open(in, "test.csv", limits)) {
            for (RecordBlock block = reader.next(); block != null; block = reader.next()) {
                addAll(entries, block);
            }
            return new ReadBack(reader.header().columns(), entries);
        }
    }

    static void addAll(List<Entry> entries, RecordBlock block) {
        if (block.size() + block.rejections().size() == 0) {
            throw new AssertionError("empty block");
        }
        int k = 0;
        for (int i = 0; i <= block.size(); i++) {
            for (; k < block.rejections().size() && block.recordsBefore(k) == i; k++) {
                Rejection r = block.rejections().get(k);
                entries.add(new Entry(r.line(), r.column(), List.of(), r.name(), r.reason()));
            }
            if (i < block.size()) {
                List<String> fields = new ArrayList<>();
                for (int f = 0; f < block.fieldCount(); f++) {
                    fields.add(block.text(i, f));
                }
                entries.add(new Entry(block.line(i), 0, fields, block.name(i), null));
            }
        }
        if (k != block.rejections().size()) {
            throw new AssertionError("rejections out of order");
        }
    }

    /** Reads with every size, asserts that all say the same, and returns it. */
    static ReadBack ofAllSizes(byte[] text, int rowBytes) {
        ReadBack first = null;
        for (ReadingLimits limits : allSizes(rowBytes)) {
            ReadBack read = of(text, limits);
            if (first != null && !first.equals(read)) {
                throw new AssertionError(limits + " reads\n" + read + "\nbut other sizes\n" + first);
            }
            first = read;
        }
        return first;
    }

    static ReadBack of(byte[] text, ReadingLimits limits) {
        try {
            return of(new ByteArrayInputStream(text), limits);
        } catch (IOException e) {
            throw new AssertionError(limits + ": " + e.getMessage(), e);
        }
    }

    static ReadBack ofAllSizes(String text) {
        return ofAllSizes(text.getBytes(StandardCharsets.UTF_8), 1 << 20);
    }

    List<String> shapes() {
        return entries.stream().map(Entry::shape).toList();
    }

    List<Entry> records() {
        return entries.stream().filter(Entry::isRecord).toList();
    }

    List<Entry> rejections() {
        return entries.stream().filter(e -> !e.isRecord()).toList();
    }
}
