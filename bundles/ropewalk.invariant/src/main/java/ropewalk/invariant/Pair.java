package ropewalk.invariant;

/**
 * Two components of a link.
 *
 * @param first counted from 0
 * @param second counted from 0, above first
 */
public record Pair(int first, int second) {

    // Refuses equal or descending numbers.
    public Pair {
        if (first < 0 || second <= first) {
            throw new IllegalArgumentException("pair " + first + ", " + second + "; give the smaller one first");
        }
    }
}
