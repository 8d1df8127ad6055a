package ropewalk.diagram.moves;

import ropewalk.diagram.LinkDiagram;

/**
 * A Reidemeister move that removes crossings (K. Reidemeister, 1927). It names the crossings that vanish; in a given
 * diagram they determine the move, since in each of them the strands are passed straight through.
 *
 * <p>Crossings are counted from 0 here and from 1 in the written form: {@code R1 5} removes the crossing 4,
 * {@code R2 1 3} the crossings 0 and 2.
 *
 * <p>A diagram does not say in which region of one connected piece another piece lies, so a piece never stands in the
 * way of a move.
 */
public sealed interface Move {

    /**
     * Removes a kink: a crossing at which one region has its only corner.
     *
     * @param crossing the crossing that vanishes, counted from 0
     */
    record R1Removal(int crossing) implements Move {

        /** Checks the crossing's number. */
        public R1Removal {
            if (crossing < 0) {
                throw new IllegalArgumentException("crossing " + crossing + "; crossings are counted from 0");
            }
        }

        @Override
        public LinkDiagram apply(LinkDiagram diagram) {
            return Removal.kink(diagram, crossing);
        }

        @Override
        public String toString() {
            return "R1 " + (crossing + 1L);
        }
    }

    /**
     * Pulls one strand off another: two crossings, the only corners of one region, where one strand is over at both.
     *
     * @param first the lower of the two crossings that vanish, counted from 0
     * @param second the higher one
     */
    record R2Removal(int first, int second) implements Move {

        /** Checks the crossings' numbers. */
        public R2Removal {
            if (first < 0 || second <= first) {
                throw new IllegalArgumentException("crossings " + first + " and " + second
                        + "; give two different ones, the lower first, counted from 0");
            }
        }

        @Override
        public LinkDiagram apply(LinkDiagram diagram) {
            return Removal.bigon(diagram, first, second);
        }

        @Override
        public String toString() {
            return "R2 " + (first + 1L) + " " + (second + 1L);
        }
    }

    /**
     * Makes the move. O(n): the new diagram is checked from scratch. The crossings that stay keep their order, components
     * keep their numbers and directions, and a component starts on the edge that holds its old first edge.
     *
     * @param diagram in which the crossings are numbered as in this move
     * @return the diagram after the move
     * @throws IllegalArgumentException if the move cannot be made there, with the reason
     */
    LinkDiagram apply(LinkDiagram diagram);

    /**
     * Reads the written form, as {@code toString} gives it.
     *
     * @param text {@code R1 c} or {@code R2 c d}, crossings counted from 1
     * @return the move
     * @throws IllegalArgumentException if the text is no move
     */
    static Move parse(String text) {
        return MoveText.parse(text);
    }
}
