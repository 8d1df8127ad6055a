package ropewalk.split.internal;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.split.Evidence;
import ropewalk.split.Findings;
import ropewalk.split.Partition;
import ropewalk.split.Verdict;

/**
 * Squeezes the pieces of one link between a lower and an upper partition. The relation "no sphere separates i from j" is
 * an equivalence; a sphere that misses the link misses every sublink, so inseparability passes from a sublink to the
 * link, and after a witnessed separation each piece is treated by itself.
 */
final class Squeeze {

    private final List<Stage> stages;
    private final Effort effort;
    private final int components;
    private final List<Verdict.Argument> arguments = new ArrayList<>();
    private final Set<String> tried = new LinkedHashSet<>();
    private final Deque<Part> open = new ArrayDeque<>();
    private final int[] piece;
    /** A forest over the components: those of one tree are proved inseparable. */
    private final int[] tied;
    private int pieces = 1;

    Squeeze(LinkDiagram link, List<Stage> stages, Effort effort) {
        this.stages = stages;
        this.effort = effort;
        this.components = link.components();
        this.tied = new int[components];
        Arrays.setAll(tied, i -> i);
        this.piece = new int[components];
        int[] all = new int[components];
        Arrays.setAll(all, i -> i);
        open.push(new Part(link, all, Partition.singles(components)));
    }

    Verdict run() {
        String limit = "";
        try {
            while (!open.isEmpty()) {
                open.pop().run();
            }
        } catch (Effort.SpentException e) {
            limit = e.getMessage();
        }
        int[] together = new int[components];
        Arrays.setAll(together, this::root);
        return new Verdict(Partition.of(together), Partition.of(piece), arguments, new ArrayList<>(tried), limit);
    }

    private int root(int component) {
        int r = component;
        while (tied[r] != r) {
            tied[r] = tied[tied[r]];
            r = tied[r];
        }
        return r;
    }

    /** A sublink that is not known to come apart, with the numbers its components have in the whole link. */
    private final class Part implements Findings {

        private final LinkDiagram link;
        private final int[] numbers;
        private Partition known;
        private boolean separated;

        Part(LinkDiagram link, int[] numbers, Partition known) {
            this.link = link;
            this.numbers = numbers;
            this.known = known;
        }

        void run() {
            for (Stage stage : stages) {
                if (separated || known.classes() == 1) {
                    return;
                }
                tried.add(stage.name());
                stage.work().on(link, this, effort);
            }
        }

        @Override
        public Partition together() {
            return known;
        }

        @Override
        public void together(Partition classes, Evidence evidence) {
            Partition joined = known.join(classes);
            if (joined.equals(known)) {
                return;
            }
            requireConnected(classes, evidence);
            known = joined;
            arguments.add(argument(false, classes, evidence));
            int[] representative = new int[classes.classes()];
            Arrays.fill(representative, -1);
            for (int i = 0; i < numbers.length; i++) {
                int c = classes.classOf(i);
                if (representative[c] < 0) {
                    representative[c] = numbers[i];
                } else {
                    tied[root(numbers[i])] = root(representative[c]);
                }
            }
        }

        /** The part with some of this part's components, with what is known of them. */
        private Part part(LinkDiagram diagram, List<Integer> chosen) {
            boolean[] keep = new boolean[numbers.length];
            int[] inside = new int[chosen.size()];
            int[] marks = new int[chosen.size()];
            for (int i = 0; i < inside.length; i++) {
                keep[chosen.get(i)] = true;
                inside[i] = numbers[chosen.get(i)];
                marks[i] = known.classOf(chosen.get(i));
            }
            return new Part(diagram.sublink(keep), inside, Partition.of(marks));
        }

        private Verdict.Argument argument(boolean isApart, Partition classes, Evidence evidence) {
            return new Verdict.Argument(isApart, classes, evidence, link, Arrays.stream(numbers).boxed().toList());
        }

        /** Whatever the order of the stages, what lies apart in the diagram itself is not inseparable. */
        private void requireConnected(Partition classes, Evidence evidence) {
            ConnectedPieces pieces = ConnectedPieces.of(link);
            int[] pieceOfClass = new int[classes.classes()];
            Arrays.fill(pieceOfClass, -1);
            for (int i = 0; i < numbers.length; i++) {
                int c = classes.classOf(i);
                if (pieceOfClass[c] >= 0 && pieceOfClass[c] != pieces.ofComponent(i)) {
                    throw new IllegalStateException("components that lie apart in the diagram were called inseparable: "
                            + classes + " by " + evidence.kind() + "; that argument is wrong");
                }
                pieceOfClass[c] = pieces.ofComponent(i);
            }
        }

        @Override
        public void apart(Partition found, LinkDiagram diagram, Evidence evidence) {
            if (separated || found.classes() < 2) {
                return;
            }
            if (!found.join(known).equals(found)) {
                throw new IllegalStateException("components proved inseparable were pulled apart: " + known + " against "
                        + found + " by " + evidence.kind() + "; one of the two arguments is wrong");
            }
            separated = true;
            arguments.add(argument(true, found, evidence));
            int[] sizes = new int[found.classes()];
            for (int i = 0; i < numbers.length; i++) {
                sizes[found.classOf(i)]++;
            }
            int[] marks = new int[sizes.length];
            List<List<Integer>> parts = new ArrayList<>();
            for (int c = 0; c < sizes.length; c++) {
                marks[c] = c == 0 ? piece[numbers[0]] : pieces++;
                // A single component has nothing to come apart.
                parts.add(sizes[c] > 1 ? new ArrayList<>(sizes[c]) : null);
            }
            for (int i = 0; i < numbers.length; i++) {
                int c = found.classOf(i);
                piece[numbers[i]] = marks[c];
                if (parts.get(c) != null) {
                    parts.get(c).add(i);
                }
            }
            for (int c = sizes.length - 1; c >= 0; c--) {
                if (parts.get(c) != null) {
                    effort.checkpoint();
                    open.push(part(diagram, parts.get(c)));
                }
            }
        }
    }
}
