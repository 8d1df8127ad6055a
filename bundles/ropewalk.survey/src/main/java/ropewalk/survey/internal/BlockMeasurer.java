package ropewalk.survey.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import ropewalk.collection.CsvRows;
import ropewalk.collection.RecordBlock;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.catalogue.RankedMethod;
import ropewalk.split.Partition;
import ropewalk.split.Verdict;

/** Reads, measures and writes out one block after another; belongs to one worker. */
final class BlockMeasurer {

    private final Columns columns;
    private final RowShape shape;
    private final boolean strict;
    private final ColumnMeasurer measurer;
    private final Activity activity;
    private final VerdictMeasurer verdicts;
    private final CodeReaders readers = new CodeReaders();
    private final LinkBatch.Builder builder = new LinkBatch.Builder();
    private final EvidenceLines evidence = new EvidenceLines();
    private int failedCells;

    BlockMeasurer(Columns columns, RowShape shape, boolean strict, ColumnMeasurer measurer,
            VerdictMeasurer verdicts, Activity activity) {
        this.columns = columns;
        this.shape = shape;
        this.strict = strict;
        this.measurer = measurer;
        this.verdicts = verdicts;
        this.activity = activity;
    }

    FinishedBlock measure(Job job) {
        ParsedBlock parsed = ParsedBlock.of(job.block, readers, builder);
        LinkBatch batch = parsed.batch();
        Clock clock = new Clock(batch.size());
        CsvRows rivalRows = new CsvRows();
        List<String[]> cells = new ArrayList<>();
        for (Column column : columns.measured()) {
            cells.add(cells(column, job, parsed, clock, rivalRows));
        }
        VerdictMeasurer.Cell[] decided = columns.hasVerdict() ? verdicts.decide(batch, job.hungVerdicts, clock) : null;
        failedCells = 0;
        CsvRows rows = new CsvRows();
        for (int i = 0; i < batch.size(); i++) {
            int record = parsed.records()[i];
            LinkDiagram link = batch.link(i);
            shape.begin(rows, job.block, record, link);
            for (String[] column : cells) {
                rows.field(column[i]);
                failedCells += column[i].startsWith("!") ? 1 : 0;
            }
            if (decided != null) {
                verdict(rows, decided[i], link.components());
                if (decided[i].verdict() != null && !decided[i].verdict().arguments().isEmpty()) {
                    evidence.add(job.block.name(record), link, decided[i].verdict());
                }
            }
            shape.end(rows, job, record, clock.micros(i));
            rows.endRow();
        }
        return new FinishedBlock(job.block, rows, rivalRows, evidence.take(), parsed.rejections(), batch.size(),
                failedCells);
    }

    private String[] cells(Column column, Job job, ParsedBlock parsed, Clock clock, CsvRows rivalRows) {
        LinkBatch batch = parsed.batch();
        String[] texts = job.finishedCells.get(column.id());
        if (texts != null) {
            return texts;
        }
        texts = new String[batch.size()];
        if (column.rivals().isEmpty()) {
            Outcome<?>[] filled = measurer.fill(column, batch, job.salvaged, clock);
            for (int i = 0; i < texts.length; i++) {
                texts[i] = CellText.of(filled[i]);
            }
            activity.requireWanted();
            job.finishedCells.put(column.id(), texts);
            return texts;
        }
        List<Clock> clocks = new ArrayList<>();
        Map<RankedMethod, Outcome<?>[]> rivals = measurer.rivals(column, batch, job.salvaged, clocks);
        clocks.forEach(clock::add);
        Outcome<?>[] first = rivals.get(column.fillers().get(0));
        Outcome<?>[] filled = first == null ? measurer.fill(column, batch, job.salvaged, clock)
                : measurer.fill(column, first, batch, clock);
        for (int i = 0; i < texts.length; i++) {
            texts[i] = CellText.ofRivals(CellText.of(filled[i]), rivals, i);
        }
        rivalRows(column, job, parsed, rivals, clocks, rivalRows);
        return texts;
    }

    private static void rivalRows(Column column, Job job, ParsedBlock parsed, Map<RankedMethod, Outcome<?>[]> rivals,
            List<Clock> clocks, CsvRows rows) {
        RecordBlock block = job.block;
        for (int i = 0; i < parsed.batch().size(); i++) {
            int link = i;
            List<Outcome<?>> outcomes = new ArrayList<>();
            rivals.values().forEach(all -> outcomes.add(all[link]));
            String agrees = CellText.agree(outcomes) ? "yes" : "no";
            int m = 0;
            for (Map.Entry<RankedMethod, Outcome<?>[]> rival : rivals.entrySet()) {
                Outcome<?> outcome = rival.getValue()[i];
                rows.field(block, parsed.records()[i], block.header().name()).field(column.id())
                        .field(rival.getKey().id()).field(rival.getKey().origin()).field(CellText.of(outcome))
                        .decimal(clocks.get(m++).micros(i), 6)
                        .field(outcome instanceof Outcome.Exact ? agrees : "").endRow();
            }
        }
    }

    private void verdict(CsvRows rows, VerdictMeasurer.Cell cell, int components) {
        Verdict verdict = cell.verdict();
        if (verdict == null) {
            failedCells++;
            rows.field(cell.fault()).empty().empty().empty().empty();
            return;
        }
        boolean trusted = !strict || components == 1;
        boolean decided = trusted && verdict.isDecided();
        Partition together = trusted ? verdict.together() : Partition.singles(components);
        Partition apart = trusted ? verdict.apart() : Partition.whole(components);
        rows.field(trusted ? verdict.word() : "undecided").field(decided ? apart.text() : "").field(apart.text())
                .field(together.text()).field(kinds(verdict));
    }

    /** Each kind and grade once; evidence.jsonl has every argument. */
    private static String kinds(Verdict verdict) {
        return verdict.arguments().stream().map(a -> a.evidence().kind() + ":" + a.evidence().grade()).distinct()
                .collect(Collectors.joining(";"));
    }
}
