package ropewalk.collection;

import java.util.ArrayList;
import java.util.List;

/**
 * The columns of a collection. Three of them have a meaning, {@code name}, {@code notation} and {@code code}, wherever they
 * stand; the others are kept columns, which come out again beside the results.
 */
public final class CollectionHeader {

    /** The columns that every collection has. */
    static final List<String> REQUIRED = List.of("name", "notation", "code");

    private final List<String> columns;
    private final int name;
    private final int notation;
    private final int code;
    private final int[] kept;

    /** Columns that are known to be distinct and to contain the required ones. */
    CollectionHeader(List<String> columns) {
        this.columns = List.copyOf(columns);
        this.name = columns.indexOf("name");
        this.notation = columns.indexOf("notation");
        this.code = columns.indexOf("code");
        List<Integer> others = new ArrayList<>();
        for (int f = 0; f < columns.size(); f++) {
            if (!REQUIRED.contains(columns.get(f))) {
                others.add(f);
            }
        }
        this.kept = others.stream().mapToInt(Integer::intValue).toArray();
    }

    /** {@return all columns in the order of the file} */
    public List<String> columns() {
        return columns;
    }

    /** {@return the number of columns} */
    public int size() {
        return columns.size();
    }

    /** {@return the index of the column {@code name}} */
    public int name() {
        return name;
    }

    /** {@return the index of the column {@code notation}} */
    public int notation() {
        return notation;
    }

    /** {@return the index of the column {@code code}} */
    public int code() {
        return code;
    }

    /** {@return the number of kept columns} */
    public int keptSize() {
        return kept.length;
    }

    /**
     * {@return the index of the k-th kept column, in the order of the file}
     *
     * @param k which, from 0
     */
    public int kept(int k) {
        return kept[k];
    }
}
