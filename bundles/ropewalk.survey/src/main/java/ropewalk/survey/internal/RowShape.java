package ropewalk.survey.internal;

import ropewalk.collection.CsvRows;
import ropewalk.collection.RecordBlock;
import ropewalk.diagram.LinkDiagram;

/** How the cells of a link become a row. */
interface RowShape {

    /** The header of the whole table. */
    Header header();

    /** What stands before the measured cells. */
    void begin(CsvRows rows, RecordBlock block, int record, LinkDiagram link);

    /** What stands after them. */
    void end(CsvRows rows, Job job, int record, long micros);

    /** Rows of results.csv as they will stand there. */
    record Whole(Header header) implements RowShape {

        @Override
        public void begin(CsvRows rows, RecordBlock block, int record, LinkDiagram link) {
            rows.field(block, record, block.header().name()).field(block, record, block.header().notation())
                    .field(link.components()).field(link.crossings());
        }

        @Override
        public void end(CsvRows rows, Job job, int record, long micros) {
            rows.decimal(micros, 6);
            for (int field : job.keptFields) {
                if (field < 0) {
                    rows.empty();
                } else {
                    rows.field(job.block, record, field);
                }
            }
        }
    }

    /** The measured cells alone, to be joined to rows that are there already. */
    record CellsAlone(Header header) implements RowShape {

        @Override
        public void begin(CsvRows rows, RecordBlock block, int record, LinkDiagram link) {
            // The row that it joins has all that.
        }

        @Override
        public void end(CsvRows rows, Job job, int record, long micros) {
            // Likewise.
        }
    }
}
