package ropewalk.survey.internal;

import java.util.Set;
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
    private final Activity activity;
    private final Effort effort;
    private volatile int current;

    VerdictMeasurer(SplitDetection detection, Activity activity, Effort effort) {
        this.detection = detection;
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

    Cell[] decide(LinkBatch batch, Set<Integer> hung, Clock clock) {
        Cell[] cells = new Cell[batch.size()];
        clock.begin();
        activity.begin(TASK);
        for (int i = 0; i < cells.length; i++) {
            current = i;
            cells[i] = hung.contains(i) ? new Cell(null, "!effort: the verdict did not stop at its effort")
                    : decide(batch, i);
            clock.tick(i);
            activity.nextCell();
        }
        activity.end();
        return cells;
    }

    /** The link whose verdict is sought now; for the watch. */
    int current() {
        return current;
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
