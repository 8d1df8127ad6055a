package ropewalk.invariant.colouring.internal;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.osgi.service.component.annotations.Component;
import ropewalk.algebra.IntegerMatrix;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Exhibit;
import ropewalk.invariant.Value.IntegerMatrixValue;
import ropewalk.structure.ColouringMatrix;

/**
 * Shows the unreduced colouring matrix with the pieces of the diagram in order, so that its blocks lie on the diagonal,
 * and an actual colouring for each of the smallest primes that have one which is not constant.
 */
@Component
public final class ColouringExhibitComponent implements Exhibit.Source {

    /** Larger matrices are for programs, not for the eye. */
    private static final int LARGEST = 200;

    private static final int[] PRIMES = {3, 5, 7, 11, 13, 17, 19, 23, 29, 31, 37, 41, 43, 47, 53, 59, 61, 67, 71, 73, 79,
        83, 89, 97};
    private static final int MOST_COLOURINGS = 3;

    @Override
    public List<Exhibit> exhibits(LinkDiagram link) {
        ColouringMatrix matrix = ColouringMatrix.of(link);
        if (matrix.rows() > LARGEST || matrix.columns() > LARGEST) {
            return List.of();
        }
        List<Exhibit> exhibits = new ArrayList<>();
        exhibits.add(blocks(link, matrix.unreduced()));
        for (int prime : PRIMES) {
            if (exhibits.size() <= MOST_COLOURINGS) {
                colouring(link, prime).ifPresent(exhibits::add);
            }
        }
        return exhibits;
    }

    private static Exhibit blocks(LinkDiagram link, IntegerMatrix matrix) {
        BlockOrder order = BlockOrder.of(link);
        List<String> rows = order.crossings().stream().map(c -> "c" + (c + 1)).toList();
        List<String> columns = order.arcs().stream().map(a -> "a" + (a + 1)).toList();
        List<List<BigInteger>> entries = new ArrayList<>();
        for (int c : order.crossings()) {
            entries.add(order.arcs().stream().map(a -> BigInteger.valueOf(matrix.get(c, a))).toList());
        }
        List<String> notes = new ArrayList<>();
        for (BlockOrder.Block block : order.blocks()) {
            notes.add("block " + block.crossings() + "×" + block.arcs() + ": components " + block.components());
        }
        return new Exhibit("Unreduced colouring matrix", rows, columns, new IntegerMatrixValue(entries), notes);
    }

    private static Optional<Exhibit> colouring(LinkDiagram link, int prime) {
        return FoxColourings.example(link, prime, Effort.ofSeconds(5)::checkpoint).map(colours -> {
            List<String> columns = new ArrayList<>();
            List<BigInteger> row = new ArrayList<>();
            for (int a = 0; a < colours.length; a++) {
                columns.add("a" + (a + 1));
                row.add(BigInteger.valueOf(colours[a]));
            }
            return new Exhibit("A colouring modulo " + prime, List.of("colour"), columns,
                    new IntegerMatrixValue(List.of(row)), List.of());
        });
    }
}
