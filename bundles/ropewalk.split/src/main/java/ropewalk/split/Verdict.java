package ropewalk.split;

import java.util.Arrays;
import java.util.List;
import ropewalk.diagram.LinkDiagram;

/**
 * What is known about the pieces of a link.
 *
 * @param together the lower partition: components of one class are proved inseparable
 * @param apart the upper partition: components of different classes are witnessed to come apart
 * @param arguments the evidence, in the order it was found
 * @param tried what was tried, in order; for the reader of an undecided verdict
 * @param limit the effort limit that ended the search, or empty
 */
public record Verdict(Partition together, Partition apart, List<Argument> arguments, List<String> tried, String limit) {

    // Keeps copies.
    public Verdict {
        arguments = List.copyOf(arguments);
        tried = List.copyOf(tried);
    }

    /**
     * One piece of evidence and what it says.
     *
     * @param isApart true for a witness, false for an obstruction
     * @param classes the partition it claims of the components of the diagram that it speaks of
     * @param evidence the argument
     * @param diagram the diagram that the evidence speaks of: the given one, or after a separation one of its parts
     * @param components the number in the whole link of each component of that diagram, counted from 0
     */
    public record Argument(boolean isApart, Partition classes, Evidence evidence, LinkDiagram diagram,
            List<Integer> components) {

        // Keeps a copy.
        public Argument {
            components = List.copyOf(components);
        }

        /**
         * The claim as a JSON list of lists of component numbers of the whole link, counted from 1; components that the
         * argument does not speak of are missing.
         *
         * @return one line
         */
        public String claim() {
            return classes.text(i -> components.get(i) + 1);
        }

        /**
         * What the argument alone says of all components: those it does not speak of are not told apart by a witness, and
         * not called inseparable by an obstruction.
         *
         * @param size the number of components of the whole link
         * @return a partition of all of them
         */
        public Partition ofWhole(int size) {
            int[] marks = new int[size];
            Arrays.setAll(marks, i -> isApart ? -1 : classes.classes() + i);
            for (int i = 0; i < components.size(); i++) {
                marks[components.get(i)] = classes.classOf(i);
            }
            return Partition.of(marks);
        }
    }

    /**
     * Whether the pieces are known: the two partitions meet.
     *
     * @return true if they do
     */
    public boolean isDecided() {
        return together.equals(apart);
    }

    /**
     * The word for the table.
     *
     * @return {@code split} as soon as one separation is witnessed, {@code not split} when all components are proved
     *         inseparable, else {@code undecided}
     */
    public String word() {
        if (apart.classes() > 1) {
            return "split";
        }
        return together.classes() == 1 ? "not split" : "undecided";
    }
}
