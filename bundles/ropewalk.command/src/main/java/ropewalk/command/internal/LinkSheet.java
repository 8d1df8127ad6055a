package ropewalk.command.internal;

import java.math.BigInteger;
import java.util.List;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.notation.Notations;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Exhibit;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.RankedMethod;
import ropewalk.split.SplitDetection;
import ropewalk.split.Verdict;

/** One link as a sheet of text. */
final class LinkSheet {

    private static final double EFFORT_SECONDS = 5;
    private static final int LONGEST_CODE = 4000;

    private final List<CatalogueEntry> entries;
    private final List<Exhibit.Source> sources;
    private final SplitDetection detection;
    private StringBuilder out = new StringBuilder();

    LinkSheet(List<CatalogueEntry> entries, List<Exhibit.Source> sources, SplitDetection detection) {
        this.entries = entries;
        this.sources = sources;
        this.detection = detection;
    }

    String of(OneLink link) {
        out = new StringBuilder();
        LinkDiagram diagram = link.diagram();
        line(Visible.text(link.name()) + ": " + diagram.components() + " component" + (diagram.components() == 1 ? "" : "s")
                + ", " + diagram.crossings() + " crossing" + (diagram.crossings() == 1 ? "" : "s"));
        String code = Notations.writer("planar").orElseThrow().write(diagram);
        line("planar code: " + (code.length() <= LONGEST_CODE ? code : code.substring(0, LONGEST_CODE) + " … ("
                + code.length() + " characters in all; 'ropewalk convert' writes them)"));
        values(diagram);
        verdict(diagram);
        for (Exhibit.Source source : sources) {
            source.exhibits(diagram).forEach(this::exhibit);
        }
        return out.toString();
    }

    private void line(String text) {
        out.append(text).append('\n');
    }

    private void values(LinkDiagram diagram) {
        line("");
        int width = entries.stream().mapToInt(e -> title(e).length()).max().orElse(0);
        for (CatalogueEntry entry : entries) {
            for (RankedMethod method : entry.methods()) {
                String title = method == entry.methods().get(0) ? title(entry) : "";
                line("  " + title + " ".repeat(width - title.length() + 2) + cell(method, diagram) + "   ("
                        + method.id() + ")");
            }
        }
    }

    private static String title(CatalogueEntry entry) {
        return entry.definition().map(d -> d.title()).orElse(entry.id());
    }

    private static String cell(RankedMethod method, LinkDiagram diagram) {
        Outcome<?> outcome;
        try {
            outcome = method.measure(diagram, Effort.ofSeconds(EFFORT_SECONDS));
        } catch (Effort.SpentException e) {
            outcome = new Outcome.OutOfEffort<>(e.getMessage());
        }
        if (outcome instanceof Outcome.Exact<?> exact) {
            return exact.value().text();
        }
        if (outcome instanceof Outcome.NotApplicable<?> not) {
            return "not applicable: " + not.reason();
        }
        return outcome instanceof Outcome.OutOfEffort<?> spent ? "out of effort: " + spent.limit()
                : "failed: " + ((Outcome.Failed<?>) outcome).reason();
    }

    private void verdict(LinkDiagram diagram) {
        line("");
        if (detection == null) {
            line("verdict: none, since split detection is not installed");
            return;
        }
        Verdict verdict = detection.decide(diagram, Effort.ofSeconds(EFFORT_SECONDS));
        line("verdict: " + verdict.word());
        if (verdict.isDecided()) {
            line("  pieces   " + verdict.apart().text());
        } else {
            line("  apart    " + verdict.apart().text() + "   (witnessed)");
            line("  together " + verdict.together().text() + "   (proved inseparable)");
            line("  tried    " + String.join(", ", verdict.tried())
                    + (verdict.limit().isEmpty() ? "" : "; stopped: " + verdict.limit()));
        }
        if (diagram.components() == 1) {
            line("  a link of one component has nothing to come apart");
        }
        for (Verdict.Argument argument : verdict.arguments()) {
            line("  " + (argument.isApart() ? "apart    " : "together ") + argument.claim() + " by "
                    + argument.evidence().kind() + " (" + argument.evidence().grade() + ")");
            line("           " + Visible.text(argument.evidence().detail()));
        }
    }

    private void exhibit(Exhibit exhibit) {
        line("");
        line(exhibit.title());
        List<List<BigInteger>> rows = exhibit.matrix().rows();
        int label = exhibit.rows().stream().mapToInt(String::length).max().orElse(0);
        int[] widths = new int[exhibit.columns().size()];
        for (int j = 0; j < widths.length; j++) {
            int column = j;
            widths[j] = Math.max(exhibit.columns().get(j).length(),
                    rows.stream().mapToInt(row -> row.get(column).toString().length()).max().orElse(0));
        }
        StringBuilder head = new StringBuilder(" ".repeat(label + 2));
        for (int j = 0; j < widths.length; j++) {
            head.append("  ").append(padded(exhibit.columns().get(j), widths[j]));
        }
        line(head.toString());
        for (int i = 0; i < rows.size(); i++) {
            StringBuilder row = new StringBuilder("  ").append(exhibit.rows().get(i))
                    .append(" ".repeat(label - exhibit.rows().get(i).length()));
            for (int j = 0; j < widths.length; j++) {
                row.append("  ").append(padded(rows.get(i).get(j).toString(), widths[j]));
            }
            line(row.toString());
        }
        exhibit.notes().forEach(note -> line("  " + note));
    }

    private static String padded(String text, int width) {
        return " ".repeat(width - text.length()) + text;
    }
}
