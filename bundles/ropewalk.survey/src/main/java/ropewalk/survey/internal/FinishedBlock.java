package ropewalk.survey.internal;

import java.util.List;
import ropewalk.collection.CsvRows;
import ropewalk.collection.RecordBlock;
import ropewalk.collection.Rejection;

/**
 * The rows of a block, ready to be written.
 *
 * @param block the rows as they were read
 * @param results rows of results.csv
 * @param rivals rows of rivals.csv
 * @param evidence lines of evidence.jsonl
 * @param rejections in input order
 * @param links how many rows results holds
 * @param failedCells cells that begin with {@code !}
 */
record FinishedBlock(RecordBlock block, CsvRows results, CsvRows rivals, byte[] evidence, List<Rejection> rejections,
        int links, int failedCells) {
}
