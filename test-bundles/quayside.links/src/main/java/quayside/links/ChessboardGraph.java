package quayside.links;

import java.math.BigInteger;
import java.util.Arrays;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.Shading;

/**
 * The chessboard graph of a connected diagram: a vertex for each unshaded region, an edge for each crossing between the
 * two unshaded regions that meet there. Kept as its Laplacian with one row and the same column struck out.
 */
final class ChessboardGraph {

    private final BigInteger[][] laplacian;

    private ChessboardGraph(BigInteger[][] laplacian) {
        this.laplacian = laplacian;
    }

    /** The graph of a diagram, in O(n + v²) for v unshaded regions. */
    static ChessboardGraph of(LinkDiagram link) {
        if (link.crossings() == 0) {
            return new ChessboardGraph(new BigInteger[0][0]);   // a circle: one vertex, the disc on one side
        }
        Shading shading = Shading.of(link);
        int[] vertex = new int[shading.regions().count()];
        int vertices = 0;
        for (int region = 0; region < vertex.length; region++) {
            vertex[region] = shading.isShaded(region) ? -1 : vertices++;
        }
        int[][] entries = new int[vertices][vertices];
        for (int c = 0; c < link.crossings(); c++) {
            int corner = shading.isShadedAt(4 * c) ? 4 * c + 1 : 4 * c;
            int a = vertex[shading.regions().ofCorner(corner)];
            int b = vertex[shading.regions().ofCorner(corner ^ 2)];
            if (a != b) {                                       // a loop is in no spanning tree
                entries[a][a]++;
                entries[b][b]++;
                entries[a][b]--;
                entries[b][a]--;
            }
        }
        BigInteger[][] struck = new BigInteger[vertices - 1][];
        for (int i = 0; i < struck.length; i++) {
            struck[i] = Arrays.stream(entries[i], 0, vertices - 1).mapToObj(BigInteger::valueOf)
                    .toArray(BigInteger[]::new);
        }
        return new ChessboardGraph(struck);
    }

    /**
     * The number of spanning trees: the determinant of the struck Laplacian (Kirchhoff 1847), by elimination without
     * fractions (Bareiss 1968). The graph is connected, so the struck Laplacian is positive definite and no pivot is 0.
     *
     * @param checkpoint called before each row
     */
    BigInteger spanningTrees(Runnable checkpoint) {
        int n = laplacian.length;
        BigInteger[][] a = new BigInteger[n][];
        Arrays.setAll(a, i -> laplacian[i].clone());
        BigInteger before = BigInteger.ONE;
        for (int k = 0; k < n; k++) {
            BigInteger pivot = a[k][k];
            for (int i = k + 1; i < n; i++) {
                checkpoint.run();
                for (int j = k + 1; j < n; j++) {
                    a[i][j] = a[i][j].multiply(pivot).subtract(a[i][k].multiply(a[k][j])).divide(before);
                }
            }
            before = pivot;
        }
        return before;
    }
}
