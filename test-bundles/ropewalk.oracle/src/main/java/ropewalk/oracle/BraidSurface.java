package ropewalk.oracle;

import java.util.ArrayList;
import java.util.List;

/**
 * The Seifert surface of a closed braid: a disc for each strand, a half-twisted band for each letter, and the
 * symmetrised Seifert form V + Vᵀ on it (Seifert 1934; generators as in Collins 2012, "An algorithm for computing the
 * Seifert matrix of a link from a braid representation").
 *
 * <p>A generator runs down one band and up the next one between the same two discs. It turns as often as its two bands:
 * V + Vᵀ has minus the sum of their signs there. Two generators with a band in common have its sign. Two generators over
 * a common disc, whose bands alternate along its edge, meet there once: they have 1 or -1, as the upper one begins first
 * or second. All others have 0. If some two neighbouring discs have no band between them the surface is disconnected.
 */
public final class BraidSurface {

    private record Generator(int left, int from, int to, int first, int second) { }

    private final int strands;
    private final int[] word;
    private final List<Generator> generators = new ArrayList<>();

    /**
     * The surface of a closed braid.
     *
     * @param strands how many
     * @param word letters, a positive one for a positive crossing
     */
    public BraidSurface(int strands, int... word) {
        this.strands = strands;
        this.word = word.clone();
        for (int left = 1; left < strands; left++) {
            int last = -1;
            for (int k = 0; k < word.length; k++) {
                if (Math.abs(word[k]) == left) {
                    if (last >= 0) {
                        generators.add(new Generator(left, last, k, Integer.signum(word[last]), Integer.signum(word[k])));
                    }
                    last = k;
                }
            }
        }
    }

    /**
     * The pieces of the surface.
     *
     * @return how many
     */
    public int pieces() {
        int pieces = 1;
        for (int left = 1; left < strands; left++) {
            boolean joined = false;
            for (int letter : word) {
                joined |= Math.abs(letter) == left;
            }
            pieces += joined ? 0 : 1;
        }
        return pieces;
    }

    /**
     * The form V + Vᵀ.
     *
     * @return a symmetric matrix, a row for each generator
     */
    public ExactMatrix symmetrised() {
        int n = generators.size();
        long[][] form = new long[n][n];
        for (int i = 0; i < n; i++) {
            Generator a = generators.get(i);
            form[i][i] = -a.first() - a.second();
            for (int j = 0; j < n; j++) {
                Generator b = generators.get(j);
                int value = 0;
                if (a.left() == b.left() && a.to() == b.from()) {
                    value = a.second();
                } else if (a.left() + 1 == b.left()) {
                    if (a.from() < b.from() && b.from() < a.to() && a.to() < b.to()) {
                        value = 1;
                    } else if (b.from() < a.from() && a.from() < b.to() && b.to() < a.to()) {
                        value = -1;
                    }
                }
                if (value != 0) {
                    form[i][j] = value;
                    form[j][i] = value;
                }
            }
        }
        return new ExactMatrix(form, n);
    }
}
