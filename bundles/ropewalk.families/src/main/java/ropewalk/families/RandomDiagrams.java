package ropewalk.families;

import ropewalk.diagram.LinkDiagram;

/** Single diagrams of the random models, by seed. For many of one kind take a stream. */
public final class RandomDiagrams {

    private RandomDiagrams() {
    }

    /**
     * The first diagram of {@link RandomPlaneDiagrams} with this seed.
     *
     * @param seed any number
     * @param crossings n, at least 1
     * @return a connected diagram of n crossings
     * @throws IllegalArgumentException if there is no crossing
     */
    public static LinkDiagram plane(long seed, int crossings) {
        return new RandomPlaneDiagrams(seed).next(crossings);
    }

    /**
     * The closure of a braid word of independent letters, each of ±1 … ±(strands - 1) with the same probability.
     *
     * @param seed any number
     * @param strands at least 2
     * @param letters length of the word, not negative
     * @return the closed braid
     * @throws IllegalArgumentException if a number is out of range
     */
    public static LinkDiagram braid(long seed, int strands, int letters) {
        return BraidClosure.of(strands, braidWord(seed, strands, letters));
    }

    /**
     * The word of {@link #braid}.
     *
     * @param seed any number
     * @param strands at least 2
     * @param letters length of the word, not negative
     * @return the letters
     * @throws IllegalArgumentException if a number is out of range
     */
    public static int[] braidWord(long seed, int strands, int letters) {
        if (strands < 2 || letters < 0) {
            throw new IllegalArgumentException(letters + " letters on " + strands
                    + " strands; a random braid has at least 2 strands and no negative length");
        }
        SplitMix random = new SplitMix(seed);
        int[] word = new int[letters];
        for (int i = 0; i < letters; i++) {
            int letter = 1 + random.below(strands - 1);
            word[i] = random.coin() ? letter : -letter;
        }
        return word;
    }
}
