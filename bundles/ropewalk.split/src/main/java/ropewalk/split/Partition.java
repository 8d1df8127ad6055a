package ropewalk.split;

import java.util.Arrays;
import java.util.function.IntUnaryOperator;

/**
 * A partition of the components of a link. Classes are numbered from 0 by their smallest component. Immutable.
 */
public final class Partition {

    private final int[] classOf;
    private final int classes;

    private Partition(int[] classOf, int classes) {
        this.classOf = classOf;
        this.classes = classes;
    }

    /**
     * The partition in which components with equal marks share a class.
     *
     * @param marks any numbers, one for each component
     * @return the partition
     */
    public static Partition of(int... marks) {
        int n = marks.length;
        // Sorted by mark, then by component: equal marks stand together, their first component in front.
        long[] sorted = new long[n];
        for (int i = 0; i < n; i++) {
            sorted[i] = (long) marks[i] << 32 | i;
        }
        Arrays.sort(sorted);
        int[] first = new int[n];
        for (int k = 0; k < n; k++) {
            boolean same = k > 0 && sorted[k] >> 32 == sorted[k - 1] >> 32;
            first[(int) sorted[k]] = same ? first[(int) sorted[k - 1]] : (int) sorted[k];
        }
        int[] classOf = new int[n];
        int classes = 0;
        for (int i = 0; i < n; i++) {
            classOf[i] = first[i] == i ? classes++ : classOf[first[i]];
        }
        return new Partition(classOf, classes);
    }

    /**
     * All components in one class.
     *
     * @param components how many
     * @return the coarsest partition
     */
    public static Partition whole(int components) {
        return new Partition(new int[components], Math.min(1, components));
    }

    /**
     * Every component alone.
     *
     * @param components how many
     * @return the finest partition
     */
    public static Partition singles(int components) {
        int[] classOf = new int[components];
        Arrays.setAll(classOf, i -> i);
        return new Partition(classOf, components);
    }

    /**
     * The finest partition that is coarser than both: classes that share a component are merged.
     *
     * @param other a partition of the same components
     * @return the join
     * @throws IllegalArgumentException if the other one is of another number of components
     */
    public Partition join(Partition other) {
        if (other.size() != size()) {
            throw new IllegalArgumentException("partitions of " + size() + " and " + other.size()
                    + " components cannot be joined; give one of the same link");
        }
        int[] parent = new int[classes];
        Arrays.setAll(parent, i -> i);
        int[] representative = new int[other.classes];
        Arrays.fill(representative, -1);
        for (int i = 0; i < classOf.length; i++) {
            int c = other.classOf[i];
            if (representative[c] < 0) {
                representative[c] = classOf[i];
            } else {
                parent[root(parent, classOf[i])] = root(parent, representative[c]);
            }
        }
        int[] marks = new int[classOf.length];
        for (int i = 0; i < marks.length; i++) {
            marks[i] = root(parent, classOf[i]);
        }
        return of(marks);
    }

    private static int root(int[] parent, int x) {
        int r = x;
        while (parent[r] != r) {
            parent[r] = parent[parent[r]];
            r = parent[r];
        }
        return r;
    }

    /**
     * The number of components.
     *
     * @return how many there are in all
     */
    public int size() {
        return classOf.length;
    }

    /**
     * The number of classes.
     *
     * @return how many there are
     */
    public int classes() {
        return classes;
    }

    /**
     * The class of a component.
     *
     * @param component counted from 0
     * @return its class, counted from 0
     */
    public int classOf(int component) {
        return classOf[component];
    }

    /**
     * The components of a class.
     *
     * @param index the class, counted from 0
     * @return for each component whether it belongs to the class
     */
    public boolean[] members(int index) {
        boolean[] members = new boolean[classOf.length];
        for (int i = 0; i < members.length; i++) {
            members[i] = classOf[i] == index;
        }
        return members;
    }

    /**
     * The partition as a JSON list of lists of component numbers, counted from 1: {@code [[1],[2,3]]}.
     *
     * @return one line
     */
    public String text() {
        return text(i -> i + 1);
    }

    /**
     * The same with other numbers.
     *
     * @param numbers what to write for each component, counted from 0
     * @return one line
     */
    public String text(IntUnaryOperator numbers) {
        int[] begin = new int[classes + 1];
        for (int c : classOf) {
            begin[c + 1]++;
        }
        for (int c = 0; c < classes; c++) {
            begin[c + 1] += begin[c];
        }
        int[] next = begin.clone();
        int[] byClass = new int[classOf.length];
        for (int i = 0; i < classOf.length; i++) {
            byClass[next[classOf[i]]++] = i;
        }
        StringBuilder out = new StringBuilder("[");
        for (int c = 0; c < classes; c++) {
            out.append(c == 0 ? "[" : ",[");
            for (int k = begin[c]; k < begin[c + 1]; k++) {
                out.append(k == begin[c] ? "" : ",").append(numbers.applyAsInt(byClass[k]));
            }
            out.append(']');
        }
        return out.append(']').toString();
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Partition that && Arrays.equals(classOf, that.classOf);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(classOf);
    }

    @Override
    public String toString() {
        return text();
    }
}
