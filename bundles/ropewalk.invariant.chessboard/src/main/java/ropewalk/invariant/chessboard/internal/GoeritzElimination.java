package ropewalk.invariant.chessboard.internal;

import java.util.Optional;
import ropewalk.algebra.Determinant;
import ropewalk.algebra.Inertia;
import ropewalk.algebra.Rank;
import ropewalk.algebra.SmallMatrix;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.DerivedKey;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Value.IntegerValue;
import ropewalk.structure.GoeritzForms;

/**
 * What one elimination of small Goeritz forms tells: determinant, nullity and signature at once. A diagram whose forms
 * are not small has no such object; there each quantity goes its own way, since they differ in cost by orders of
 * magnitude.
 *
 * @param determinant of the link, not negative
 * @param nullity of the link
 * @param signature of the link
 */
record GoeritzElimination(long determinant, int nullity, int signature) {

    private static final DerivedKey<Optional<GoeritzElimination>> KEY = new DerivedKey<>("Goeritz elimination");

    /** Forms up to this many rows are tried in 64-bit arithmetic; {@link SmallMatrix} says whether it was enough. */
    private static final int SMALL = 24;

    static Optional<GoeritzElimination> of(LinkDiagram link) {
        return link.derived(KEY, GoeritzElimination::eliminate);
    }

    private static Optional<GoeritzElimination> eliminate(LinkDiagram link) {
        GoeritzForms forms = GoeritzForms.of(link);
        int largest = 0;
        for (int p = 0; p < forms.count(); p++) {
            largest = Math.max(largest, forms.dimension(p) - 1);
        }
        if (largest > SMALL) {
            return Optional.empty();
        }
        long[] scratch = new long[largest * largest];
        long[] result = new long[4];
        int pieces = ConnectedPieces.of(link).count();
        long determinant = pieces > 1 ? 0 : 1;      // 1 also for the circle alone
        int nullity = pieces - 1;
        int signature = 0;
        for (int p = 0; p < forms.count(); p++) {
            forms.fillReduced(p, scratch);
            if (!SmallMatrix.symmetric(scratch, forms.dimension(p) - 1, result)) {
                return Optional.empty();
            }
            determinant *= Math.abs(result[0]);
            nullity += (int) result[1];
            signature -= (int) (result[2] - result[3]) + forms.correction(p);
        }
        return Optional.of(new GoeritzElimination(determinant, nullity, signature));
    }

    static IntegerValue determinant(LinkDiagram link, Effort effort) {
        Optional<GoeritzElimination> small = of(link);
        if (small.isPresent()) {
            return IntegerValue.of(small.get().determinant());
        }
        if (ConnectedPieces.of(link).count() > 1) {
            return IntegerValue.of(0);
        }
        return new IntegerValue(Determinant.of(GoeritzForms.of(link).reduced(0), effort::checkpoint).abs());
    }

    static int nullity(LinkDiagram link, Effort effort) {
        Optional<GoeritzElimination> small = of(link);
        if (small.isPresent()) {
            return small.get().nullity();
        }
        GoeritzForms forms = GoeritzForms.of(link);
        int nullity = ConnectedPieces.of(link).count() - 1;
        for (int p = 0; p < forms.count(); p++) {
            nullity += forms.dimension(p) - 1 - Rank.of(forms.reduced(p), effort::checkpoint);
        }
        return nullity;
    }

    static int signature(LinkDiagram link, Effort effort) {
        Optional<GoeritzElimination> small = of(link);
        if (small.isPresent()) {
            return small.get().signature();
        }
        GoeritzForms forms = GoeritzForms.of(link);
        int signature = 0;
        for (int p = 0; p < forms.count(); p++) {
            signature -= Inertia.of(forms.reduced(p), effort::checkpoint).signature() + forms.correction(p);
        }
        return signature;
    }
}
