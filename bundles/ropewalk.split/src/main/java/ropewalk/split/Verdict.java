package ropewalk.split;

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
     * One piece of evidence and what it says of the whole link.
     *
     * @param isApart true for a witness, false for an obstruction
     * @param classes its partition of the components of the whole link
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
