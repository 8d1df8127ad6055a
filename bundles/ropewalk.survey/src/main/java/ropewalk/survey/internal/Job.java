package ropewalk.survey.internal;

import java.util.Map;
import java.util.Set;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ConcurrentHashMap;
import ropewalk.collection.RecordBlock;
import ropewalk.invariant.Outcome;

/**
 * A block of rows on its way to be measured. If a method hangs on it, its worker is abandoned and another one takes the
 * job again; only the newest attempt may finish it.
 */
final class Job {

    final RecordBlock block;
    final int[] keptFields;
    final CompletableFuture<FinishedBlock> finished = new CompletableFuture<>();

    /** Outcomes that an abandoned attempt had reached, by method id. */
    final Map<String, Outcome<?>[]> salvaged = new ConcurrentHashMap<>();

    /** Cells that an abandoned attempt had finished, by column. */
    final Map<String, String[]> finishedCells = new ConcurrentHashMap<>();

    /** Links of the batch whose verdict hung. */
    final Set<Integer> hungVerdicts = ConcurrentHashMap.newKeySet();

    Job(RecordBlock block, int[] keptFields) {
        this.block = block;
        this.keptFields = keptFields;
    }
}
