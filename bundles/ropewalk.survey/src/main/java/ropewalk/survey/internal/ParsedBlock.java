package ropewalk.survey.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import ropewalk.collection.RecordBlock;
import ropewalk.collection.Rejection;
import ropewalk.collection.Slice;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.notation.CodeException;
import ropewalk.diagram.notation.CodeReader;
import ropewalk.diagram.notation.Notations;

/**
 * A block whose codes were read.
 *
 * @param batch the links
 * @param records for each link its record in the block
 * @param rejections of rows and codes, in input order
 */
record ParsedBlock(LinkBatch batch, int[] records, List<Rejection> rejections) {

    static ParsedBlock of(RecordBlock block, CodeReaders readers, LinkBatch.Builder builder) {
        int[] records = new int[block.size()];
        int links = 0;
        List<Rejection> rejections = new ArrayList<>();
        int earlier = 0;
        for (int i = 0; i < block.size(); i++) {
            while (earlier < block.rejections().size() && block.recordsBefore(earlier) <= i) {
                rejections.add(block.rejections().get(earlier++));
            }
            Rejection rejection = read(block, i, readers, builder);
            if (rejection == null) {
                records[links++] = i;
            } else {
                rejections.add(rejection);
            }
        }
        while (earlier < block.rejections().size()) {
            rejections.add(block.rejections().get(earlier++));
        }
        return new ParsedBlock(builder.build(), Arrays.copyOf(records, links), rejections);
    }

    private static Rejection read(RecordBlock block, int i, CodeReaders readers, LinkBatch.Builder builder) {
        CodeReader reader = readers.of(block.notation(i));
        if (reader == null) {
            return block.rejectNotation(i, "no notation is called '" + shortened(block.notation(i).toString())
                    + "'; there are " + String.join(", ", Notations.readable()));
        }
        Slice code = block.code(i);
        try {
            reader.read(code.bytes(), code.from(), code.to(), builder);
            return null;
        } catch (CodeException e) {
            return block.rejectCode(i, Math.min(e.offset(), code.to()) - code.from(), e.getMessage());
        } catch (RuntimeException | StackOverflowError e) {
            // A fault of ours; it must not cost the other rows.
            return block.rejectCode(i, 0, "the reader of '" + block.notation(i) + "' broke on this code (" + e
                    + "); please report it with the row");
        } catch (OutOfMemoryError e) {
            return block.rejectCode(i, 0, "a code of " + code.length() + " bytes does not fit into memory; give the "
                    + "program more, for example with ROPEWALK_JAVA_OPTS=-Xmx8g");
        }
    }

    private static String shortened(String text) {
        return text.length() <= 40 ? text : text.substring(0, 40) + "…";
    }
}
