package ropewalk.invariant.colouring.internal;

import java.util.ArrayList;
import java.util.List;
import ropewalk.diagram.Arcs;
import ropewalk.diagram.ConnectedPieces;
import ropewalk.diagram.LinkDiagram;

/**
 * Crossings and arcs piece by piece, so that the colouring matrix is block diagonal. Pieces are in the order of their
 * first component.
 *
 * @param crossings all crossings, counted from 0
 * @param arcs all arcs, counted from 0
 * @param blocks the pieces
 */
record BlockOrder(List<Integer> crossings, List<Integer> arcs, List<Block> blocks) {

    /**
     * One piece.
     *
     * @param crossings how many rows
     * @param arcs how many columns
     * @param components numbers of its components, counted from 1
     */
    record Block(int crossings, int arcs, List<Integer> components) { }

    static BlockOrder of(LinkDiagram link) {
        ConnectedPieces pieces = ConnectedPieces.of(link);
        Arcs arcs = Arcs.of(link);
        List<Integer> rows = new ArrayList<>();
        List<Integer> columns = new ArrayList<>();
        List<Block> blocks = new ArrayList<>();
        boolean[] done = new boolean[pieces.count()];
        for (int first = 0; first < link.components(); first++) {
            int piece = pieces.ofComponent(first);
            if (done[piece]) {
                continue;
            }
            done[piece] = true;
            int rowsBefore = rows.size();
            int columnsBefore = columns.size();
            List<Integer> components = new ArrayList<>();
            for (int i = first; i < link.components(); i++) {
                if (pieces.ofComponent(i) == piece) {
                    components.add(i + 1);
                    for (int a = arcs.firstOf(i); a < arcs.firstOf(i + 1); a++) {
                        columns.add(a);
                    }
                }
            }
            for (int c = 0; c < link.crossings(); c++) {
                if (pieces.ofCrossing(c) == piece) {
                    rows.add(c);
                }
            }
            blocks.add(new Block(rows.size() - rowsBefore, columns.size() - columnsBefore, components));
        }
        return new BlockOrder(rows, columns, blocks);
    }
}
