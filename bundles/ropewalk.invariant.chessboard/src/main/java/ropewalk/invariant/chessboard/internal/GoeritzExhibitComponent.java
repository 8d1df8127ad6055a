package ropewalk.invariant.chessboard.internal;

import java.util.ArrayList;
import java.util.List;
import org.osgi.service.component.annotations.Component;
import ropewalk.algebra.IntegerMatrix;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.Regions;
import ropewalk.invariant.Exhibit;
import ropewalk.invariant.Value.IntegerMatrixValue;
import ropewalk.structure.GoeritzForms;

/** Shows the unreduced Goeritz forms, with the regions named by the crossings at their corners. */
@Component
public final class GoeritzExhibitComponent implements Exhibit.Source {

    /** Larger matrices are for programs, not for the eye. */
    private static final int LARGEST = 200;

    @Override
    public List<Exhibit> exhibits(LinkDiagram link) {
        GoeritzForms forms = GoeritzForms.of(link);
        List<Exhibit> exhibits = new ArrayList<>();
        for (int p = 0; p < forms.count(); p++) {
            if (forms.dimension(p) <= LARGEST) {
                exhibits.add(exhibit(link, forms, p));
            }
        }
        return exhibits;
    }

    private static Exhibit exhibit(LinkDiagram link, GoeritzForms forms, int piece) {
        int n = forms.dimension(piece);
        Regions regions = forms.shading().regions();
        String[] labels = new String[n];
        StringBuilder[] corners = new StringBuilder[n];
        StringBuilder signs = new StringBuilder();
        for (int d = 0; d < link.darts(); d++) {
            if (ConnectedPieces.of(link).ofCrossing(d >> 2) != piece) {
                continue;
            }
            int region = regions.ofCorner(d);
            int row = forms.row(region);
            if (row >= 0) {
                if (labels[row] == null) {
                    labels[row] = "r" + (region + 1);
                    corners[row] = new StringBuilder(labels[row] + " meets");
                }
                corners[row].append(" c").append((d >> 2) + 1);
            }
            if ((d & 3) == 0) {
                signs.append(" c").append((d >> 2) + 1).append(forms.chessboardSign(d >> 2) > 0 ? "+" : "-");
            }
        }
        List<String> notes = new ArrayList<>();
        notes.add("unshaded regions by the crossings at their corners:");
        for (StringBuilder corner : corners) {
            notes.add("  " + corner);
        }
        notes.add("chessboard signs:" + signs);
        notes.add("correction term (Gordon-Litherland): " + forms.correction(piece));
        notes.add("the Goeritz matrix is this one without its last row and column");
        IntegerMatrix matrix = forms.unreduced(piece);
        long[][] rows = new long[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                rows[i][j] = matrix.get(i, j);
            }
        }
        String title = "Unreduced Goeritz matrix" + (forms.count() > 1 ? " of diagram piece " + (piece + 1) : "");
        return new Exhibit(title, List.of(labels), List.of(labels), IntegerMatrixValue.of(rows), notes);
    }
}
