package ropewalk.survey.internal;

import ropewalk.diagram.LinkBatch;
import ropewalk.invariant.Effort;
import ropewalk.invariant.catalogue.RankedMethod;
import ropewalk.invariant.Outcome;
import ropewalk.split.SplitDetection;
import ropewalk.split.Verdict;

/** The verdicts of a batch. What fails is that link's verdict and nothing else's. */
final class VerdictMeasurer {

    /** What the watch calls the work on verdicts. */
    static final String TASK = "verdict";

    private final SplitDetection detection;
    private final Benches benches;
    private final Activity activity;
    private final Effort effort;

    VerdictMeasurer(SplitDetection detection, Benches benches, Activity activity, Effort effort) {
        this.detection = detection;
        this.benches = benches;
        this.activity = activity;
        this.effort = effort;
    }

    /**
     * A verdict, or why there is none.
     *
     * @param verdict null where there is none
     * @param fault the text of the cell then
     */
    record Cell(Verdict verdict, String fault) { }

    Cell[] decide(LinkBatch batch, Clock clock) {
        Cell[] cells = new Cell[batch.size()];
        clock.begin();
        activity.begin(TASK);
        for (int i = 0; i < cells.length; i++) {
            cells[i] = benches.holds(TASK)
                    ? new Cell(null, "!effort: the verdict hung and is not asked for again in this survey")
                    : decide(batch, i);
            clock.tick(i);
            activity.nextCell();
        }
        activity.end();
        return cells;
    }

    private Cell decide(LinkBatch batch, int i) {
        effort.restart();
        try {
            return new Cell(detection.decide(batch.link(i), effort), null);
        } catch (Throwable e) {
            Outcome<?> failure = RankedMethod.failed(e);
            return new Cell(null, CellText.of(failure));
        }
    }
}
