package ropewalk.split.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.moves.Move;
import ropewalk.diagram.moves.Reduction;
import ropewalk.oracle.JsonTree;
import ropewalk.oracle.PlainLink;
import ropewalk.split.Partition;
import ropewalk.split.Verdict;

/**
 * Repeats every argument of a verdict. An argument after a separation speaks of one part; which one, and on which
 * diagram, follows from the separations before it, and must be what the argument says.
 */
final class EvidenceCheck {

    private record Part(List<Integer> numbers, LinkDiagram diagram) { }

    private final LinkDiagram link;
    private final List<Part> parts = new ArrayList<>();
    private Partition together;

    EvidenceCheck(LinkDiagram link) {
        this.link = link;
        List<Integer> all = new ArrayList<>();
        for (int i = 0; i < link.components(); i++) {
            all.add(i);
        }
        parts.add(new Part(all, link));
        together = Partition.singles(link.components());
    }

    void check(Verdict verdict) {
        for (Verdict.Argument argument : verdict.arguments()) {
            assertTrue(argument.evidence().grade().matches("relies on ropewalk[.a-z]+ [0-9].*"), argument.evidence().grade());
            if (argument.isApart()) {
                apart(argument);
            } else {
                together(argument);
                together = together.join(argument.ofWhole(together.size()));
            }
        }
    }

    private static boolean cuts(Partition classes, List<Integer> numbers) {
        return numbers.stream().map(classes::classOf).distinct().count() > 1;
    }

    private static Partition restricted(Partition classes, List<Integer> numbers) {
        return Partition.of(numbers.stream().mapToInt(classes::classOf).toArray());
    }

    private void apart(Verdict.Argument argument) {
        List<Part> cut = parts.stream().filter(p -> cuts(argument.ofWhole(together.size()), p.numbers())
                && p.numbers().stream().noneMatch(i -> sharesClassOutside(argument.ofWhole(together.size()), i, p))).toList();
        assertEquals(1, cut.size(), () -> "the separation " + argument.ofWhole(together.size()) + " cuts one part of " + parts);
        Part part = cut.get(0);
        assertSpeaksOf(part, argument);
        Partition claimed = restricted(argument.ofWhole(together.size()), part.numbers());
        Map<?, ?> detail = JsonTree.object(argument.evidence().detail());
        assertEquals(claimed.text(), compact(detail.get("pieces")), "pieces in the evidence");
        LinkDiagram loose = part.diagram();
        if (argument.evidence().kind().equals("reduction")) {
            loose = replayed(part.diagram(), (List<?>) detail.get("moves"));
        } else {
            assertEquals("disconnected", argument.evidence().kind());
        }
        assertEquals(claimed, Partition.of(new PlainLink(loose).pieceOfComponents()), "pieces after the moves");
        parts.remove(part);
        for (int c = 0; c < claimed.classes(); c++) {
            boolean[] members = claimed.members(c);
            List<Integer> numbers = new ArrayList<>();
            for (int i = 0; i < members.length; i++) {
                if (members[i]) {
                    numbers.add(part.numbers().get(i));
                }
            }
            parts.add(new Part(numbers, loose.sublink(members)));
        }
    }

    /** Crossings and components in the evidence are those of the diagram that the argument names. */
    private static void assertSpeaksOf(Part part, Verdict.Argument argument) {
        assertEquals(part.numbers(), argument.components());
        assertEquals(part.diagram(), argument.diagram());
    }

    private static boolean sharesClassOutside(Partition classes, int component, Part part) {
        for (int j = 0; j < classes.size(); j++) {
            if (!part.numbers().contains(j) && classes.classOf(j) == classes.classOf(component)) {
                return true;
            }
        }
        return false;
    }

    private static String compact(Object tree) {
        return String.valueOf(tree).replace(" ", "");
    }

    /** Both ways to make the moves: all at once on Gauss words, and one by one on the plane map. */
    private static LinkDiagram replayed(LinkDiagram diagram, List<?> texts) {
        List<Move> moves = texts.stream().map(text -> Move.parse((String) text)).toList();
        LinkDiagram atOnce = new Reduction(diagram, moves).replay(diagram);
        LinkDiagram byOne = diagram;
        TreeSet<Integer> gone = new TreeSet<>();
        for (Move move : moves) {
            if (move instanceof Move.R1Removal r1) {
                byOne = new Move.R1Removal(now(r1.crossing(), gone)).apply(byOne);
                gone.add(r1.crossing());
            } else if (move instanceof Move.R2Removal r2) {
                byOne = new Move.R2Removal(now(r2.first(), gone), now(r2.second(), gone)).apply(byOne);
                gone.add(r2.first());
                gone.add(r2.second());
            }
        }
        assertEquals(atOnce, byOne, "both replays");
        return atOnce;
    }

    private static int now(int crossing, TreeSet<Integer> gone) {
        return crossing - gone.headSet(crossing).size();
    }

    private void together(Verdict.Argument argument) {
        Partition classes = argument.ofWhole(together.size());
        List<Part> touched = parts.stream().filter(p -> p.numbers().stream().anyMatch(i -> p.numbers().stream()
                .anyMatch(j -> !i.equals(j) && classes.classOf(i) == classes.classOf(j)))).toList();
        assertEquals(1, touched.size(), () -> classes + " ties components of one part of " + parts);
        Part part = touched.get(0);
        assertSpeaksOf(part, argument);
        for (int i = 0; i < classes.size(); i++) {
            for (int j = 0; j < i; j++) {
                assertTrue(classes.classOf(i) != classes.classOf(j)
                        || part.numbers().contains(i) && part.numbers().contains(j), "tied across a separation");
            }
        }
        // The diagram of the part may have been reduced; the link that it shows is this sublink of the original.
        boolean[] keep = new boolean[classes.size()];
        part.numbers().forEach(i -> keep[i] = true);
        Map<?, ?> detail = JsonTree.object(argument.evidence().detail());
        argue(argument.evidence().kind(), detail, link.sublink(keep), restricted(classes, part.numbers()),
                restricted(together, part.numbers()));
    }

    private static void argue(String kind, Map<?, ?> detail, LinkDiagram subject, Partition claimed, Partition known) {
        if (detail.containsKey("sublink")) {
            boolean[] keep = new boolean[subject.components()];
            List<Integer> numbers = numbers(detail.get("sublink"));
            numbers.forEach(i -> keep[i] = true);
            for (int i = 0; i < keep.length; i++) {
                for (int j = 0; j < i; j++) {
                    assertTrue(claimed.classOf(i) != claimed.classOf(j) || keep[i] && keep[j], "tied outside the sublink");
                }
            }
            argue(kind, (Map<?, ?>) detail.get("argument"), subject.sublink(keep), restricted(claimed, numbers),
                    Partition.singles(numbers.size()));
        } else if (detail.containsKey("bipartitions")) {
            bipartitions(kind, (List<?>) detail.get("bipartitions"), subject, claimed, known);
        } else {
            whole(kind, detail, subject, claimed);
        }
    }

    private static List<Integer> numbers(Object list) {
        return ((List<?>) list).stream().map(n -> (int) ((Long) n - 1)).toList();
    }

    private static void whole(String kind, Map<?, ?> detail, LinkDiagram subject, Partition claimed) {
        String invariant = kind.substring("law.".length());
        assertTrue(((String) detail.get("method")).startsWith(invariant + "."), detail.toString());
        String value = (String) detail.get("value");
        assertEquals(PlainLaws.value(invariant, subject), value, invariant);
        assertEquals(PlainLaws.tiedBy(invariant, value, subject.components()), claimed, () -> kind + " " + value);
    }

    private static void bipartitions(String kind, List<?> listed, LinkDiagram subject, Partition claimed, Partition known) {
        List<boolean[]> excluded = new ArrayList<>();
        TreeSet<String> kinds = new TreeSet<>();
        for (Object each : listed) {
            Map<?, ?> one = (Map<?, ?>) each;
            String method = (String) one.get("method");
            String invariant = method.substring(0, method.indexOf('.'));
            kinds.add("law." + invariant);
            boolean[] left = new boolean[subject.components()];
            numbers(one.get("left")).forEach(i -> left[i] = true);
            boolean[] right = new boolean[left.length];
            for (int i = 0; i < left.length; i++) {
                right[i] = !left[i];
            }
            List<?> sides = (List<?>) one.get("sides");
            assertEquals(PlainLaws.value(invariant, subject), one.get("whole"), invariant);
            assertEquals(PlainLaws.value(invariant, subject.sublink(left)), sides.get(0), invariant + " left");
            assertEquals(PlainLaws.value(invariant, subject.sublink(right)), sides.get(1), invariant + " right");
            assertFalse(PlainLaws.couldSplit(invariant, (String) one.get("whole"), (String) sides.get(0),
                    (String) sides.get(1), left), () -> invariant + " excludes nothing: " + one);
            excluded.add(left);
            excluded.add(right);
        }
        assertEquals(kinds, new TreeSet<>(Arrays.asList(kind.split("\\+"))), "the kind lists the laws that were used");
        int k = subject.components();
        for (int set = 1; set < (1 << k) - 1; set++) {
            boolean[] side = new boolean[k];
            for (int i = 0; i < k; i++) {
                side[i] = (set >> i & 1) == 1;
            }
            if (separates(side, claimed) && !separates(side, known)
                    && excluded.stream().noneMatch(e -> Arrays.equals(e, side))) {
                fail("nothing excludes " + Arrays.toString(side) + ", which separates components of " + claimed);
            }
        }
    }

    private static boolean separates(boolean[] side, Partition classes) {
        for (int i = 0; i < side.length; i++) {
            for (int j = 0; j < i; j++) {
                if (side[i] != side[j] && classes.classOf(i) == classes.classOf(j)) {
                    return true;
                }
            }
        }
        return false;
    }
}
