package ropewalk.algebra.internal;

import java.util.Arrays;

/**
 * An order for the steps of an elimination that keeps what is live small and lets many steps share one inversion.
 *
 * <p>A step must come after the steps that change what it reads. In a symmetric elimination the neighbours of a vertex become a
 * clique, so all that depends on it lies on one path of the elimination tree (R. Schreiber, ACM TOMS 8 (1982) 256–276). Subtrees that fit into a processor's cache are done one after the
 * other, neighbouring small ones together, then the top of the tree; within such a block the steps are sorted by level, and
 * those of a level do not depend on each other.
 */
final class Schedule {
    /** Places read by the steps of a block: with 32 lanes of 8 bytes about half a megabyte. */
    private static final int BLOCK = 2000;

    /** The steps in order. */
    final int[] order;
    /** Group g holds the steps {@code order[start[g]]} to {@code order[start[g + 1] - 1]}. */
    final int[] start;

    private Schedule(int[] order, int[] start) {
        this.order = order;
        this.start = start;
    }

    /**
     * The order by levels only, for eliminations that have no tree.
     *
     * @param level for each step a number larger than those of the steps it depends on
     */
    static Schedule of(int[] level) {
        return sorted(new int[level.length], level);
    }

    /**
     * The order by subtrees and levels.
     *
     * @param level for each step a number larger than those of the steps it depends on
     * @param parent for each step a later one, an ancestor of which is every other step that depends on it; or -1
     * @param weight for each step the number of places it reads
     */
    static Schedule of(int[] level, int[] parent, int[] weight) {
        int steps = parent.length;
        int[] size = new int[steps];
        long[] heavy = new long[steps];
        for (int s = 0; s < steps; s++) {
            size[s]++;
            heavy[s] += weight[s];
            if (parent[s] >= 0) {
                size[parent[s]] += size[s];
                heavy[parent[s]] += heavy[s];
            }
        }
        int[] atPost = postorder(parent, size);
        int[] block = blocks(parent, size, heavy, atPost);
        return sorted(block, level);
    }

    /** The step at each position of a postorder. A step's subtree lies directly before it. */
    private static int[] postorder(int[] parent, int[] size) {
        int steps = parent.length;
        int[] free = new int[steps];
        int[] atPost = new int[steps];
        int rootsFree = 0;
        for (int s = steps - 1; s >= 0; s--) {
            int begin;
            if (parent[s] < 0) {
                begin = rootsFree;
                rootsFree += size[s];
            } else {
                begin = free[parent[s]];
                free[parent[s]] += size[s];
            }
            free[s] = begin;
            atPost[begin + size[s] - 1] = s;
        }
        return atPost;
    }

    private static int[] blocks(int[] parent, int[] size, long[] heavy, int[] atPost) {
        int[] block = new int[parent.length];
        Arrays.fill(block, -1);
        int current = 0;
        long load = 0;
        for (int k = 0; k < atPost.length; k++) {
            int s = atPost[k];
            if (heavy[s] > BLOCK || parent[s] >= 0 && heavy[parent[s]] <= BLOCK) {
                continue;
            }
            if (load + heavy[s] > BLOCK) {
                current++;
                load = 0;
            }
            load += heavy[s];
            for (int j = k - size[s] + 1; j <= k; j++) {
                block[atPost[j]] = current;
            }
        }
        for (int s = 0; s < block.length; s++) {
            block[s] = block[s] < 0 ? current + 1 : block[s];
        }
        return block;
    }

    /** Sorts by block, then by level; two stable counting sorts. */
    private static Schedule sorted(int[] block, int[] level) {
        int[] byLevel = countingSort(null, level);
        int[] order = countingSort(byLevel, block);
        IntList start = new IntList(order.length);
        for (int k = 0; k < order.length; k++) {
            if (k == 0 || block[order[k]] != block[order[k - 1]] || level[order[k]] != level[order[k - 1]]) {
                start.add(k);
            }
        }
        start.add(order.length);
        return new Schedule(order, start.toArray());
    }

    private static int[] countingSort(int[] before, int[] key) {
        int keys = 0;
        for (int k : key) {
            keys = Math.max(keys, k + 1);
        }
        int[] next = new int[keys + 1];
        for (int k : key) {
            next[k + 1]++;
        }
        for (int k = 0; k < keys; k++) {
            next[k + 1] += next[k];
        }
        int[] order = new int[key.length];
        for (int k = 0; k < key.length; k++) {
            int s = before == null ? k : before[k];
            order[next[key[s]]++] = s;
        }
        return order;
    }
}
