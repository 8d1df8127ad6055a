package ropewalk.families;

import ropewalk.diagram.LinkDiagram;

/**
 * Closed braids. The word is read from the top down, all strands run down, and a letter i &gt; 0 is a positive crossing
 * of the strands i and i+1 counted from the left, -i a negative one: {@code of(2, 1, 1, 1)} is the right-handed trefoil.
 * Components are numbered by their leftmost strand at the top. Every link is a closed braid (Alexander 1923).
 */
public final class BraidClosure {

    private BraidClosure() {
    }

    /**
     * The closure of a braid word. O(strands + letters).
     *
     * @param strands number of strands, at least 1
     * @param letters the word; each between 1 and strands - 1 in absolute value
     * @return its diagram; a strand that meets no letter is a component without crossings
     * @throws IllegalArgumentException for a letter out of range or no strand at all
     */
    public static LinkDiagram of(int strands, int... letters) {
        if (strands < 1) {
            throw new IllegalArgumentException(strands + " strands; a braid has at least 1");
        }
        Wiring w = new Wiring();
        int[] tops = new int[strands];
        int[] ends = new int[strands];
        for (int i = 0; i < strands; i++) {
            int top = w.joint();
            tops[i] = top;
            ends[i] = top;
        }
        for (int k = 0; k < letters.length; k++) {
            int left = Math.abs(letters[k]) - 1;
            if (left < 0 || left + 1 >= strands) {
                throw new IllegalArgumentException("letter " + letters[k] + " at place " + (k + 1) + " of a braid of "
                        + strands + " strands; letters lie between 1 and " + (strands - 1) + " in absolute value");
            }
            int c = w.crossing();
            int turn = letters[k] > 0 ? 0 : 1;      // upper left is 0 (under) or 1 (over), then counter-clockwise
            w.join(ends[left], c | turn);
            w.join(ends[left + 1], c | (turn + 3 & 3));
            ends[left] = c | turn + 1;
            ends[left + 1] = c | turn + 2;
        }
        for (int i = 0; i < strands; i++) {
            w.join(ends[i], tops[i] ^ 2);
        }
        return w.diagram(tops);
    }
}
