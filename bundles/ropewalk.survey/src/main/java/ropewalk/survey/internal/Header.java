package ropewalk.survey.internal;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import ropewalk.collection.CollectionHeader;

/**
 * The header of results.csv: our columns, then the kept columns of all files in the order in which they are met.
 *
 * @param results the names of our columns
 * @param kept the names of the kept columns as they stand in the collections
 */
record Header(List<String> results, List<String> kept) {

    private static final List<String> FIRST = List.of("name", "notation", "components", "crossings");
    private static final List<String> VERDICT = List.of("verdict", "pieces", "apart", "together", "evidence");

    static Header of(Columns columns, List<CollectionHeader> files) {
        List<String> results = new ArrayList<>(FIRST);
        columns.measured().forEach(column -> results.add(column.id()));
        if (columns.hasVerdict()) {
            results.addAll(VERDICT);
        }
        results.add("seconds");
        Set<String> kept = new LinkedHashSet<>();
        for (CollectionHeader file : files) {
            for (int k = 0; k < file.keptSize(); k++) {
                kept.add(file.columns().get(file.kept(k)));
            }
        }
        return new Header(List.copyOf(results), List.copyOf(kept));
    }

    /** All names as they are written: a kept column whose name is taken comes out as {@code given.NAME}. */
    List<String> names() {
        List<String> names = new ArrayList<>(results);
        Set<String> taken = new HashSet<>(results);
        taken.addAll(kept);
        for (String name : kept) {
            String out = name;
            while (names.contains(out) || !out.equals(name) && taken.contains(out)) {
                out = "given." + out;
            }
            names.add(out);
        }
        return names;
    }

    /** For each kept column its field in a file, or -1 where the file has none. */
    int[] fields(CollectionHeader file) {
        return kept.stream().mapToInt(name -> file.columns().indexOf(name)).toArray();
    }
}
