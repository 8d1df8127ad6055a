package ropewalk.survey;

import java.nio.file.Path;

/**
 * What came of a survey.
 *
 * @param folder where the results are
 * @param links rows measured
 * @param rejected rows, or whole files, that could not be read
 * @param failedCells cells that begin with {@code !}
 * @param firstByteNanos {@link System#nanoTime} when the first byte was read
 * @param lastByteNanos {@link System#nanoTime} when the last byte was written
 * @param isComplete false if the survey was stopped before its end
 */
public record SurveyReport(Path folder, long links, long rejected, long failedCells, long firstByteNanos,
        long lastByteNanos, boolean isComplete) {

    /**
     * The time from the first byte read to the last byte written.
     *
     * @return seconds
     */
    public double seconds() {
        return (lastByteNanos - firstByteNanos) / 1e9;
    }
}
