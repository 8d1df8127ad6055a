package ropewalk.survey.internal;

import java.nio.charset.StandardCharsets;
import java.util.stream.Collectors;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.notation.CodeWriter;
import ropewalk.diagram.notation.Notations;
import ropewalk.invariant.ValueText;
import ropewalk.split.Verdict;

/**
 * Lines of evidence.jsonl, one for each argument: {@code format} (1), {@code link} (its name), {@code code} (planar code of
 * the diagram that the argument speaks of), {@code numbers} (the numbers in the link of that diagram's components; all of
 * them until a separation leaves parts), {@code claim} ({@code together} or {@code apart}), {@code components} (the
 * classes that are claimed, in the link's numbers), {@code kind}, {@code grade}, {@code argument}.
 */
final class EvidenceLines {

    private final CodeWriter planar = Notations.writer("planar").orElseThrow();
    private final StringBuilder lines = new StringBuilder();

    void add(String name, LinkDiagram link, Verdict verdict) {
        if (verdict.arguments().isEmpty()) {
            return;
        }
        String code = planar.write(link);
        String quotedName = ValueText.quoted(name);
        for (Verdict.Argument argument : verdict.arguments()) {
            lines.append("{\"format\":1,\"link\":").append(quotedName).append(",\"code\":\"")
                    .append(argument.diagram() == link ? code : planar.write(argument.diagram()))
                    .append("\",\"numbers\":").append(numbers(argument))
                    .append(",\"claim\":\"").append(argument.isApart() ? "apart" : "together")
                    .append("\",\"components\":").append(argument.claim())
                    .append(",\"kind\":").append(ValueText.quoted(argument.evidence().kind()))
                    .append(",\"grade\":").append(ValueText.quoted(argument.evidence().grade()))
                    .append(",\"argument\":").append(argument.evidence().detail()).append("}\n");
        }
    }

    private static String numbers(Verdict.Argument argument) {
        return argument.components().stream().map(i -> Integer.toString(i + 1)).collect(Collectors.joining(",", "[", "]"));
    }

    byte[] take() {
        byte[] bytes = lines.toString().getBytes(StandardCharsets.UTF_8);
        lines.setLength(0);
        return bytes;
    }
}
