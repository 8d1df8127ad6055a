package ropewalk.survey.internal;

import java.util.List;
import java.util.Map;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.catalogue.RankedMethod;

/** What stands in a cell. */
final class CellText {

    private CellText() {
    }

    static String of(Outcome<?> outcome) {
        if (outcome instanceof Outcome.Exact<?> exact) {
            return exact.value().text();
        }
        if (outcome instanceof Outcome.OutOfEffort<?> spent) {
            return "!effort: " + oneLine(spent.limit());
        }
        if (outcome instanceof Outcome.Failed<?> failed) {
            return "!failed: " + oneLine(failed.reason());
        }
        return outcome == null ? "!removed" : "";
    }

    /** Several rivals: the filler's cell, unless two exact values differ. */
    static String ofRivals(String filler, Map<RankedMethod, Outcome<?>[]> rivals, int link) {
        String first = null;
        boolean differ = false;
        StringBuilder all = new StringBuilder("!rivals differ: ");
        int count = 0;
        for (Map.Entry<RankedMethod, Outcome<?>[]> rival : rivals.entrySet()) {
            if (rival.getValue()[link] instanceof Outcome.Exact<?> exact) {
                String text = exact.value().text();
                differ |= first != null && !first.equals(text);
                first = first == null ? text : first;
                all.append(count++ == 0 ? "" : ", ").append(rival.getKey().id()).append('=').append(text);
            }
        }
        return differ ? all.toString() : filler;
    }

    /** Whether all exact values of the rivals are equal, as far as there are two. */
    static boolean agree(List<Outcome<?>> outcomes) {
        return outcomes.stream().filter(Outcome.Exact.class::isInstance).map(CellText::of).distinct().count() <= 1;
    }

    private static String oneLine(String text) {
        return text == null ? "" : text.replaceAll("\\p{Cntrl}+", " ");
    }
}
