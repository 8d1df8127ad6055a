package ropewalk.diagram;

import java.util.Arrays;

/**
 * A few hundred link diagrams in flat arrays; each {@link LinkDiagram} is a view on them. Immutable.
 *
 * <p><b>Cost.</b> Adding a diagram of n crossings checks it in O(n) and copies about 25 n bytes.
 */
public final class LinkBatch {

    private final LinkDiagram[] links;

    private LinkBatch(LinkDiagram[] links) {
        this.links = links;
    }

    /**
     * A batch of given diagrams, for those who have them one by one.
     *
     * @param diagrams the diagrams, in order
     * @return the batch
     */
    public static LinkBatch of(LinkDiagram... diagrams) {
        return new LinkBatch(diagrams.clone());
    }

    /**
     * The number of diagrams.
     *
     * @return how many diagrams there are
     */
    public int size() {
        return links.length;
    }

    /**
     * One diagram of the batch.
     *
     * @param index 0 … size-1
     * @return the diagram
     */
    public LinkDiagram link(int index) {
        return links[index];
    }

    /** Collects diagrams for a batch. Not thread-safe; may be used again after {@link #build}. */
    public static final class Builder {

        private int[] mates = new int[256];
        private byte[] signs = new byte[64];
        private int[] strands = new int[128];
        private int[] starts = new int[64];
        private int[] ends = new int[32];       // per diagram: crossings so far, components so far
        private int size;
        private int crossings;
        private int components;
        private final SphereCheck sphere = new SphereCheck();

        /** An empty builder. */
        public Builder() {
        }

        /**
         * Adds a diagram after checking that it is one.
         *
         * @param n number of crossings
         * @param newMates for each of the 4n darts the other end of its edge; longer arrays are let pass
         * @param newSigns for each of the n crossings 1 or -1
         * @param k number of components
         * @param newStarts for each component an outgoing dart on its first edge, or -1 for one without crossings
         * @throws NotADiagramException if it is none; the batch is then as before
         * @throws IllegalArgumentException if an array is too short, or the batch would grow too large
         */
        public void add(int n, int[] newMates, byte[] newSigns, int k, int[] newStarts) throws NotADiagramException {
            if (newSigns.length < n || newMates.length >> 2 < n || newStarts.length < k) {
                throw new IllegalArgumentException(newMates.length + " mates, " + newSigns.length + " signs and "
                        + newStarts.length + " starts for " + n + " crossings and " + k
                        + " components; give four mates and a sign a crossing, and a start a component");
            }
            room(n, k);
            checkPairs(n, newMates, newSigns);
            int strandBase = 2 * crossings;
            walkComponents(n, newMates, newSigns, k, newStarts, strandBase);
            sphere.check(n, newMates);
            System.arraycopy(newMates, 0, mates, 4 * crossings, 4 * n);
            System.arraycopy(newSigns, 0, signs, crossings, n);
            System.arraycopy(newStarts, 0, starts, components, k);
            crossings += n;
            components += k;
            if (2 * size == ends.length) {
                ends = Arrays.copyOf(ends, 2 * ends.length);
            }
            ends[2 * size] = crossings;
            ends[2 * size + 1] = components;
            size++;
        }

        /**
         * How many diagrams were added.
         *
         * @return the number so far
         */
        public int size() {
            return size;
        }

        /**
         * Makes the batch and empties the builder.
         *
         * @return the diagrams added so far
         */
        public LinkBatch build() {
            int[] m = Arrays.copyOf(mates, 4 * crossings);
            byte[] s = Arrays.copyOf(signs, crossings);
            int[] c = Arrays.copyOf(strands, 2 * crossings);
            int[] b = Arrays.copyOf(starts, components);
            LinkDiagram[] links = new LinkDiagram[size];
            int from = 0;
            int first = 0;
            for (int i = 0; i < size; i++) {
                int to = ends[2 * i];
                int last = ends[2 * i + 1];
                links[i] = new LinkDiagram(to - from, last - first, m, s, c, from, b, first);
                from = to;
                first = last;
            }
            size = 0;
            crossings = 0;
            components = 0;
            return new LinkBatch(links);
        }

        private void room(int n, int k) {
            if ((long) 4 * (crossings + (long) n) > Integer.MAX_VALUE - 16) {
                throw new IllegalArgumentException("a batch holds at most 536,870,000 crossings; "
                        + ((long) crossings + n) + " were given: build it earlier");
            }
            mates = grown(mates, 4 * (crossings + n));
            strands = grown(strands, 2 * (crossings + n));
            starts = grown(starts, components + k);
            if (signs.length < crossings + n) {
                signs = Arrays.copyOf(signs, Math.max(crossings + n, signs.length + (signs.length >> 1)));
            }
        }

        private static int[] grown(int[] array, int length) {
            return length <= array.length ? array
                    : Arrays.copyOf(array, (int) Math.min(Integer.MAX_VALUE - 16,
                            Math.max(length, array.length + (long) (array.length >> 1))));
        }

        private static void checkPairs(int n, int[] mates, byte[] signs) throws NotADiagramException {
            for (int c = 0; c < n; c++) {
                if (signs[c] != 1 && signs[c] != -1) {
                    throw strandFault(c, "the sign of crossing " + (c + 1) + " is " + signs[c]
                            + "; it must be 1 or -1");
                }
            }
            for (int d = 0; d < 4 * n; d++) {
                int e = mates[d];
                if (e < 0 || e >= 4 * n || e == d || mates[e] != d) {
                    throw strandFault(d >> 2, "dart " + d + " has no partner that has it as partner");
                }
                if (LinkDiagram.outgoing(d & 3, signs[d >> 2]) == LinkDiagram.outgoing(e & 3, signs[e >> 2])) {
                    throw strandFault(d >> 2, "the edge between darts " + d + " and " + e + " runs both ways at once");
                }
            }
        }

        /** Follows every component from its start; each strand must be met once. */
        private void walkComponents(int n, int[] mates, byte[] signs, int k, int[] starts, int base)
                throws NotADiagramException {
            Arrays.fill(strands, base, base + 2 * n, -1);
            int met = 0;
            for (int i = 0; i < k; i++) {
                int d = starts[i];
                if (d == -1) {
                    continue;
                }
                if (d < 0 || d >= 4 * n) {
                    throw strandFault(0, "component " + (i + 1) + " starts at dart " + d + ", which does not exist");
                }
                if (!LinkDiagram.outgoing(d & 3, signs[d >> 2])) {
                    throw strandFault(d >> 2, "component " + (i + 1) + " starts at dart " + d
                            + ", which is incoming; give the other end of that edge");
                }
                int other = strands[base + 2 * (d >> 2) + (d & 1)];
                if (other >= 0) {
                    throw strandFault(d >> 2, "component " + (i + 1) + " starts on component " + (other + 1)
                            + "; every component has one start");
                }
                while (strands[base + 2 * (d >> 2) + (d & 1)] < 0) {
                    strands[base + 2 * (d >> 2) + (d & 1)] = i;
                    met++;
                    d = mates[d] ^ 2;
                }
            }
            if (met != 2 * n) {
                int c = 0;
                while (strands[base + 2 * c] >= 0 && strands[base + 2 * c + 1] >= 0) {
                    c++;
                }
                throw strandFault(c, (2 * n - met) + " strands belong to no component; give every component a start");
            }
        }

        private static NotADiagramException strandFault(int crossing, String message) {
            return new NotADiagramException(NotADiagramException.Kind.STRANDS, crossing, message);
        }
    }
}
