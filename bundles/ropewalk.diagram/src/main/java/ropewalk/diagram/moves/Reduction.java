package ropewalk.diagram.moves;

import java.util.List;
import java.util.Objects;
import java.util.stream.IntStream;
import ropewalk.diagram.LinkDiagram;

/**
 * What is left of a diagram when kinks and bigons have been removed until there is none, and the moves that did it.
 *
 * <p><b>Numbers.</b> All moves name crossings by their numbers in the <em>original</em> diagram; a crossing keeps its
 * number until it vanishes. {@link #replay} makes the list again. To make a single one with {@link Move#apply},
 * subtract from each crossing the number of lower ones that the moves before it removed.
 *
 * <p>The crossings that stay keep their order, components keep their numbers and directions, and a component starts on
 * the edge that holds its old first edge. Another order of moves may leave another diagram of the same link; the one
 * taken depends on the diagram alone.
 *
 * @param result the diagram without a kink and without a bigon that one strand bounds from above
 * @param moves in the order in which they were made, crossings numbered as in the original
 */
public record Reduction(LinkDiagram result, List<Move> moves) {

    /** Copies the list. */
    public Reduction {
        Objects.requireNonNull(result, "result");
        moves = List.copyOf(moves);
    }

    /**
     * Removes kinks (R1) and bigons (R2) until none is left. O(n) time and memory.
     *
     * @param diagram any diagram
     * @return what is left and how it came about
     */
    public static Reduction of(LinkDiagram diagram) {
        return new Reducer(diagram).reduce();
    }

    /**
     * Makes the moves again, one by one, each checked on the signed Gauss words of the components and not on the
     * plane map that {@link #of} works on. O(n + moves).
     *
     * @param original the diagram that was reduced
     * @return the diagram after all moves, to be compared with {@link #result}
     * @throws IllegalArgumentException at the first move that does not apply, with its place in the list and the reason
     */
    public LinkDiagram replay(LinkDiagram original) {
        Replay replay = new Replay(original);
        for (int i = 0; i < moves.size(); i++) {
            try {
                replay.make(moves.get(i));
            } catch (IllegalArgumentException e) {
                throw new IllegalArgumentException("move " + (i + 1) + ", " + moves.get(i) + ": " + e.getMessage(), e);
            }
        }
        return replay.diagram();
    }

    /**
     * The components without crossings in the result. Each bounds a disc apart from everything else: it is an unknot,
     * split from the rest.
     *
     * @return their numbers, counted from 0, ascending
     */
    public List<Integer> circles() {
        return IntStream.range(0, result.components()).filter(i -> result.start(i) < 0).boxed().toList();
    }
}
