package ropewalk.measures.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.LinkDiagram;
import ropewalk.families.BraidClosure;
import ropewalk.families.RandomDiagrams;
import ropewalk.families.Scrambled;
import ropewalk.invariant.catalogue.RankedMethod;
import ropewalk.oracle.BraidSurface;
import ropewalk.oracle.ExactMatrix;

/** Signature, nullity and determinant of V + Vᵀ on the Seifert surface of a closed braid, against every method. */
class SeifertRouteTest {

    private final Installed installed = new Installed();

    /** The second route itself, on values that need no computer. */
    @Test
    void theSurfaceOfKnownLinks() {
        // Right-handed trefoil -2, figure-eight knot 0 (Trotter 1962); T(3,5) is the E8 plumbing, -8 and determinant 1
        // (Brieskorn 1966); Hopf link ∓1; the closure of 1 -1 has the form (0).
        assertForm(-2, 0, 3, 2, 1, 1, 1);
        assertForm(2, 0, 3, 2, -1, -1, -1);
        assertForm(0, 0, 5, 3, 1, -2, 1, -2);
        assertForm(-8, 0, 1, 3, 1, 2, 1, 2, 1, 2, 1, 2, 1, 2);
        assertForm(-6, 0, 3, 3, 1, 2, 1, 2, 1, 2, 1, 2);
        assertForm(-1, 0, 2, 2, 1, 1);
        assertForm(0, 1, 0, 2, 1, -1);
    }

    private static void assertForm(int signature, int nullity, int determinant, int strands, int... word) {
        ExactMatrix form = new BraidSurface(strands, word).symmetrised();
        assertEquals(new ExactMatrix.Form(signature, nullity), form.form(), Arrays.toString(word));
        assertEquals(determinant, form.determinant().abs().intValueExact(), Arrays.toString(word));
    }

    @Test
    void randomBraids() {
        int connected = 0;
        for (long seed = 1; seed <= 400; seed++) {
            int strands = 2 + (int) (seed % 6);
            int letters = 1 + (int) (seed * 7 % 50);
            int[] word = RandomDiagrams.braidWord(seed, strands, letters);
            BraidSurface surface = new BraidSurface(strands, word);
            connected += surface.pieces() == 1 ? 1 : 0;
            agree("braid(" + seed + ", " + strands + ", " + letters + ")", BraidClosure.of(strands, word), surface);
        }
        assertTrue(connected > 250, connected + " connected ones");
    }

    /** No diagram looks like a braid after this, with all kinds of crossings for the correction term. */
    @Test
    void scrambledBraids() {
        for (long seed = 1; seed <= 200; seed++) {
            int strands = 2 + (int) (seed % 4);
            int letters = 2 + (int) (seed % 20);
            int[] word = RandomDiagrams.braidWord(seed, strands, letters);
            agree("scrambled(" + seed + ", braid(" + seed + ", " + strands + ", " + letters + "), 30)",
                    Scrambled.of(seed, BraidClosure.of(strands, word), 30), new BraidSurface(strands, word));
        }
    }

    /** Words with long runs and few signs, where signatures are large. */
    @Test
    void onesidedBraids() {
        Random random = new Random(31);
        for (int i = 0; i < 60; i++) {
            int strands = 2 + random.nextInt(5);
            int[] word = new int[10 + random.nextInt(50)];
            for (int k = 0; k < word.length; k++) {
                word[k] = (1 + random.nextInt(strands - 1)) * (random.nextInt(6) == 0 ? -1 : 1);
            }
            agree("round " + i + ", " + strands + ": " + Arrays.toString(word), BraidClosure.of(strands, word),
                    new BraidSurface(strands, word));
        }
    }

    private void agree(String how, LinkDiagram link, BraidSurface surface) {
        ExactMatrix matrix = surface.symmetrised();
        ExactMatrix.Form form = matrix.form();
        String determinant = surface.pieces() > 1 ? "0" : matrix.determinant().abs().toString();
        Sample.each(List.of(new Sample(how, link)), d -> {
            for (RankedMethod method : installed.entry("signature").methods()) {
                assertEquals(Integer.toString(form.signature()), Installed.exact(method, d).text(), method.id());
            }
            for (RankedMethod method : installed.entry("nullity").methods()) {
                assertEquals(Integer.toString(form.nullity() + surface.pieces() - 1), Installed.exact(method, d).text(),
                        method.id());
            }
            for (RankedMethod method : installed.entry("determinant").methods()) {
                assertEquals(determinant, Installed.exact(method, d).text(), method.id());
            }
        });
    }
}
