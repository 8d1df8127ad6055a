package ropewalk.diagram.notation;

import java.util.List;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.jgrapht.Graph;
import org.jgrapht.alg.planar.BoyerMyrvoldPlanarityInspector;
import org.jgrapht.graph.DefaultEdge;
import org.jgrapht.graph.SimpleGraph;

/**
 * Lays a closed curve, given by its Gauss word, on the sphere. Every crossing becomes a wheel of a hub and four rim
 * vertices, one for each end of a strand, so that opposite ends stay opposite: a wheel has only two embeddings, mirror
 * images (H. Whitney, 1932). The curve can be drawn if and only if this graph is planar (J. M. Boyer, W. J. Myrvold,
 * 2004, for the test and the embedding).
 */
final class ShadowEmbedding {

    private static final int MOST_NAMED = 6;

    private ShadowEmbedding() {
    }

    /**
     * How the strands cross at each crossing: true where the ends follow counter-clockwise as odd passage in, even
     * passage in, odd passage out, even passage out, in one of the embeddings.
     *
     * @param crossingAt the crossing of each passage, counted from 0; each crossing has an even and an odd passage
     * @param offsets of the crossings in the text
     * @throws CodeException if no curve has this word, at the first crossing of an obstruction
     */
    static boolean[] turns(int[] crossingAt, int[] offsets) throws CodeException {
        int n = crossingAt.length / 2;
        Graph<Integer, DefaultEdge> graph = wheels(crossingAt);
        BoyerMyrvoldPlanarityInspector<Integer, DefaultEdge> inspector = new BoyerMyrvoldPlanarityInspector<>(graph);
        if (!inspector.isPlanar()) {
            throw obstruction(inspector.getKuratowskiSubdivision(), offsets);
        }
        boolean[] turns = new boolean[n];
        for (int c = 0; c < n; c++) {
            List<DefaultEdge> spokes = inspector.getEmbedding().getEdgesAround(hub(c));
            turns[c] = rimAfter(graph, spokes, rim(c, 0)) == rim(c, 1);
        }
        return turns;
    }

    private static int rim(int crossing, int end) {
        return 5 * crossing + end;
    }

    private static int hub(int crossing) {
        return 5 * crossing + 4;
    }

    private static Graph<Integer, DefaultEdge> wheels(int[] crossingAt) {
        Graph<Integer, DefaultEdge> graph = new SimpleGraph<>(DefaultEdge.class);
        for (int v = 0; v < 5 * crossingAt.length / 2; v++) {
            graph.addVertex(v);
        }
        for (int c = 0; c < crossingAt.length / 2; c++) {
            for (int end = 0; end < 4; end++) {
                graph.addEdge(rim(c, end), rim(c, (end + 1) & 3));
                graph.addEdge(rim(c, end), hub(c));
            }
        }
        int passages = crossingAt.length;
        for (int p = 0; p < passages; p++) {
            int q = p + 1 == passages ? 0 : p + 1;
            // Rim: odd passage in, even passage in, odd out, even out. Passage p is the odd-numbered one if p is even.
            int tail = rim(crossingAt[p], 2 + (p & 1));
            int head = rim(crossingAt[q], q & 1);
            if (!graph.containsEdge(tail, head)) {      // a kink runs beside the rim
                graph.addEdge(tail, head);
            }
        }
        return graph;
    }

    private static int rimAfter(Graph<Integer, DefaultEdge> graph, List<DefaultEdge> spokes, int rim) {
        for (int i = 0; i < 4; i++) {
            if (end(graph, spokes.get(i)) == rim) {
                return end(graph, spokes.get((i + 1) & 3));
            }
        }
        throw new IllegalStateException("a hub has lost a spoke");
    }

    private static int end(Graph<Integer, DefaultEdge> graph, DefaultEdge spoke) {
        return Math.min(graph.getEdgeSource(spoke), graph.getEdgeTarget(spoke));       // the hub has the larger number
    }

    private static CodeException obstruction(Graph<Integer, DefaultEdge> kuratowski, int[] offsets) {
        TreeSet<Integer> crossings = new TreeSet<>();
        boolean five = false;
        for (Integer v : kuratowski.vertexSet()) {
            crossings.add(v / 5);
            five |= kuratowski.degreeOf(v) == 4;
        }
        String names = crossings.stream().limit(MOST_NAMED).map(c -> String.valueOf(2 * c + 1))
                .collect(Collectors.joining(", "));
        return new CodeException(offsets[crossings.first()], "no closed curve in the plane has this sequence: its crossings "
                + names + (crossings.size() > MOST_NAMED ? ", …" : "") + " (odd numbers) hold a subdivision of "
                + (five ? "K5" : "K3,3") + ", which is not planar; at least one of their numbers must be another");
    }
}
