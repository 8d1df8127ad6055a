package ropewalk.algebra.internal;

import java.util.Arrays;

/**
 * Turns a recording into a program: takes the steps in the order of a {@link Schedule} and gives every place a slot for the
 * time between its first and its last use. Linear in the recording.
 */
final class Compiler {
    private final Recording recording;
    private final int[] in;
    private final int[] slotOf;
    private final IntList free = new IntList(256);
    private final IntList out;
    private final Runnable checkpoint;
    private int slots;

    private Compiler(Recording recording, int places, Runnable checkpoint) {
        this.recording = recording;
        this.checkpoint = checkpoint;
        this.in = recording.code();
        this.out = new IntList(in.length + in.length / 4);
        this.slotOf = new int[places];
        Arrays.fill(slotOf, -1);
    }

    /**
     * Compiles.
     *
     * @param recording the steps
     * @param places the number of places
     * @param initial the values of the first places
     * @param rest the places left at the end
     * @param checkpoint called now and then
     */
    static Program compile(Recording recording, int places, long[] initial, int[] rest, Runnable checkpoint) {
        return new Compiler(recording, places, checkpoint).compile(places, initial, rest);
    }

    private Program compile(int places, long[] initial, int[] rest) {
        int[] level = levels(places);
        Schedule schedule = recording.isSymmetric() ? Schedule.of(level, parents(places), weights()) : Schedule.of(level);
        int[] order = schedule.order;
        int groups = schedule.start.length - 1;
        int widest = 0;
        for (int g = 0; g < groups; g++) {
            int from = schedule.start[g];
            int to = schedule.start[g + 1];
            widest = Math.max(widest, to - from);
            header(order, from, to);
            for (int k = from; k < to; k++) {
                body(order[k]);
                pause(k);
            }
        }
        int[] code = out.toArray();
        out.clear();
        load(rest, 0, rest.length);
        for (int place : rest) {
            out.add(slotOf[place]);
        }
        return new Program(code, groups, widest, slots, initial, out.toArray(), rest.length);
    }

    /** A step reads its pivot and the places beside it: it comes after all steps that changed one of them. */
    private int[] levels(int places) {
        int[] level = new int[recording.steps()];
        int[] changed = new int[places];
        for (int s = 0; s < level.length; s++) {
            pause(s);
            int targetsFrom = targetsFrom(s);
            int mine = 0;
            for (int k = recording.start(s); k < recording.start(s) + pivotPlaces(s); k++) {
                mine = Math.max(mine, changed[in[k]]);
            }
            for (int k = readFrom(s); k < targetsFrom; k++) {
                mine = Math.max(mine, changed[in[k]]);
            }
            level[s] = mine;
            for (int k = targetsFrom; k < targetsFrom + targets(s); k++) {
                changed[in[k]] = Math.max(changed[in[k]], mine + 1);
            }
        }
        return level;
    }

    /** The first step that reads what a step changes; every place is read by one step at most. */
    private int[] parents(int places) {
        int[] reader = new int[places];
        Arrays.fill(reader, Integer.MAX_VALUE);
        int[] parent = new int[recording.steps()];
        for (int s = parent.length - 1; s >= 0; s--) {
            pause(s);
            int first = Integer.MAX_VALUE;
            int targetsFrom = targetsFrom(s);
            for (int k = targetsFrom; k < targetsFrom + targets(s); k++) {
                first = Math.min(first, reader[in[k]]);
            }
            parent[s] = first == Integer.MAX_VALUE ? -1 : first;
            for (int k = recording.start(s); k < recording.start(s) + pivotPlaces(s); k++) {
                reader[in[k]] = s;
            }
            for (int k = readFrom(s); k < targetsFrom; k++) {
                reader[in[k]] = s;
            }
        }
        return parent;
    }

    private void pause(int step) {
        if ((step & 63) == 0) {
            checkpoint.run();
        }
    }

    private int[] weights() {
        int[] weight = new int[recording.steps()];
        for (int s = 0; s < weight.length; s++) {
            weight[s] = pivotPlaces(s) + targetsFrom(s) - readFrom(s);
        }
        return weight;
    }

    private int pivotPlaces(int s) {
        return recording.kind(s) == Recording.BLOCK ? 3 : 1;
    }

    private int readFrom(int s) {
        return recording.start(s) + pivotPlaces(s) + (recording.kind(s) == Recording.GENERAL ? 2 : 1);
    }

    private int targetsFrom(int s) {
        int at = recording.start(s) + pivotPlaces(s);
        int m = in[at];
        return readFrom(s) + switch (recording.kind(s)) {
            case Recording.GENERAL -> m + in[at + 1];
            case Recording.DIAGONAL -> m;
            default -> 2 * m;
        };
    }

    private int targets(int s) {
        int at = recording.start(s) + pivotPlaces(s);
        int m = in[at];
        return recording.kind(s) == Recording.GENERAL ? Math.multiplyExact(m, in[at + 1]) : Recording.pairs(m);
    }

    private void header(int[] order, int from, int to) {
        out.add(to - from);
        int countAt = out.extend(1);
        int loads = 0;
        for (int k = from; k < to; k++) {
            int at = recording.start(order[k]);
            loads += loadMissing(in, at, pivotPlaces(order[k]));
        }
        out.set(countAt, loads);
        for (int k = from; k < to; k++) {
            int s = order[k];
            out.add(recording.kind(s));
            for (int p = 0; p < pivotPlaces(s); p++) {
                out.add(slotOf[in[recording.start(s) + p]]);
            }
        }
    }

    private void body(int s) {
        int from = readFrom(s);
        int end = targetsFrom(s) + targets(s);
        load(in, from, end - from);
        int sizes = recording.start(s) + pivotPlaces(s);
        for (int k = sizes; k < from; k++) {
            out.add(in[k]);
        }
        int at = out.extend(end - from);
        int[] raw = out.raw();
        for (int k = from; k < end; k++) {
            raw[at + k - from] = slotOf[in[k]];
        }
        for (int k = recording.start(s); k < sizes; k++) {
            free.add(slotOf[in[k]]);
        }
        for (int k = from; k < targetsFrom(s); k++) {
            free.add(slotOf[in[k]]);
        }
    }

    private void load(int[] placesToLoad, int from, int count) {
        int countAt = out.extend(1);
        out.set(countAt, loadMissing(placesToLoad, from, count));
    }

    private int loadMissing(int[] placesToLoad, int from, int count) {
        int loads = 0;
        for (int k = from; k < from + count; k++) {
            int place = placesToLoad[k];
            if (slotOf[place] < 0) {
                slotOf[place] = free.size() > 0 ? free.removeLast() : slots++;
                out.add(slotOf[place]);
                out.add(place);
                loads++;
            }
        }
        return loads;
    }
}
