package ropewalk.diagram;

import java.util.Arrays;
import java.util.function.Function;

/**
 * An oriented link diagram on the sphere: a 4-valent plane map with over- and under-strands, possibly disconnected,
 * and any number of components without crossings. Immutable and thread-safe.
 *
 * <p><b>Conventions.</b> Crossing c owns the darts 4c … 4c+3, which leave it counter-clockwise: dart 4c is the end at
 * which the under-strand comes in, 4c+2 the end at which it goes out; 4c+1 and 4c+3 belong to the over-strand. The
 * crossing is positive (right-handed, {@code sign == 1}) where the over-strand runs from 4c+3 to 4c+1, negative
 * ({@code sign == -1}) where it runs from 4c+1 to 4c+3. {@code mate(d)} is the other end of the edge at d, and
 * {@code across(d) == (d ^ 2)} the other end of the strand at d within its crossing. The corner of dart d lies between
 * d and the next dart counter-clockwise, which is to the left of somebody who leaves the crossing along d.
 *
 * <p>Components are numbered from 0 here and from 1 wherever people see them. Every component with crossings has a
 * <em>start</em>, an outgoing dart on its first edge: the edge that a code labels first.
 *
 * <p><b>Invariants</b>, checked once when a diagram is made: mates form an involution without fixed points that joins
 * outgoing to incoming darts; every strand belongs to one component; every connected piece with n crossings has n + 2
 * regions, so that it lies on the sphere (otherwise the code describes a virtual link).
 *
 * <p><b>Cost.</b> 25 bytes a crossing, in arrays that a {@link LinkBatch} shares among its diagrams; accessors O(1).
 */
public final class LinkDiagram {

    final int crossings;
    final int components;
    final int[] mates;
    final int dartOffset;
    final byte[] signs;
    final int crossingOffset;
    final int[] strandComponents;
    final int[] starts;
    final int startOffset;

    /** Pairs key, value; replaced, never changed. */
    private volatile Object[] derived = {};

    LinkDiagram(int crossings, int components, int[] mates, byte[] signs, int[] strandComponents, int crossingOffset,
            int[] starts, int startOffset) {
        this.crossings = crossings;
        this.components = components;
        this.mates = mates;
        this.dartOffset = 4 * crossingOffset;
        this.signs = signs;
        this.crossingOffset = crossingOffset;
        this.strandComponents = strandComponents;
        this.starts = starts;
        this.startOffset = startOffset;
    }

    /**
     * The diagram with the given darts.
     *
     * @param mates for each of the 4n darts the other end of its edge
     * @param signs for each of the n crossings 1 or -1
     * @param starts for each component, in order, an outgoing dart on its first edge, or -1 for one without crossings
     * @return the diagram
     * @throws NotADiagramException if these do not make a diagram on the sphere
     * @throws IllegalArgumentException if there are not four mates for each sign
     */
    public static LinkDiagram of(int[] mates, byte[] signs, int[] starts) throws NotADiagramException {
        if (mates.length != 4L * signs.length) {
            throw new IllegalArgumentException(mates.length + " mates for " + signs.length
                    + " crossings; give four for each");
        }
        LinkBatch.Builder batch = new LinkBatch.Builder();
        batch.add(signs.length, mates, signs, starts.length, starts);
        return batch.build().link(0);
    }

    /**
     * The size of the diagram.
     *
     * @return the number of crossings
     */
    public int crossings() {
        return crossings;
    }

    /**
     * The number of dart ends.
     *
     * @return four times the number of crossings
     */
    public int darts() {
        return 4 * crossings;
    }

    /**
     * How many closed curves the link has.
     *
     * @return the number of components, those without crossings included
     */
    public int components() {
        return components;
    }

    /**
     * The other end of an edge.
     *
     * @param dart 0 … 4n-1
     * @return the dart at the other end of its edge
     */
    public int mate(int dart) {
        return mates[dartOffset + dart];
    }

    /**
     * The sign of a crossing.
     *
     * @param crossing 0 … n-1
     * @return 1 for a positive (right-handed) crossing, -1 for a negative one
     */
    public int sign(int crossing) {
        return signs[crossingOffset + crossing];
    }

    /**
     * Whose strand a dart belongs to.
     *
     * @param dart 0 … 4n-1
     * @return the component, counted from 0
     */
    public int component(int dart) {
        return strandComponents[2 * (crossingOffset + (dart >> 2)) + (dart & 1)];
    }

    /**
     * Where a component begins.
     *
     * @param component counted from 0
     * @return an outgoing dart on its first edge, or -1 if it has no crossings
     */
    public int start(int component) {
        return starts[startOffset + component];
    }

    /**
     * Whether the orientation leaves the crossing along a dart.
     *
     * @param dart 0 … 4n-1
     * @return true if the dart is outgoing
     */
    public boolean isOutgoing(int dart) {
        return outgoing(dart & 3, sign(dart >> 2));
    }

    static boolean outgoing(int position, int sign) {
        return position == 2 || position == 2 - sign;
    }

    /**
     * The dart that follows along the orientation.
     *
     * @param outgoing an outgoing dart
     * @return the outgoing dart on the far side of the next crossing
     */
    public int next(int outgoing) {
        return mate(outgoing) ^ 2;
    }

    /**
     * Whether a dart belongs to the strand that passes over.
     *
     * @param dart 0 … 4n-1
     * @return true for the over-strand
     */
    public static boolean isOver(int dart) {
        return (dart & 1) == 1;
    }

    /**
     * The next dart counter-clockwise round the crossing.
     *
     * @param dart 0 … 4n-1
     * @return the dart a quarter turn further
     */
    public static int counterClockwise(int dart) {
        return (dart & ~3) | ((dart + 1) & 3);
    }

    /**
     * The next dart clockwise round the crossing.
     *
     * @param dart 0 … 4n-1
     * @return the dart a quarter turn back
     */
    public static int clockwise(int dart) {
        return (dart & ~3) | ((dart + 3) & 3);
    }

    /**
     * What somebody computes from this diagram, kept while the diagram lives, so that five methods shade it once.
     *
     * @param <T> its type
     * @param key under which it is kept
     * @param function pure: equal diagrams give equal results; may run twice when two threads ask at once
     * @return the kept result
     */
    @SuppressWarnings("unchecked")
    public <T> T derived(DerivedKey<T> key, Function<? super LinkDiagram, ? extends T> function) {
        Object[] known = derived;
        for (int i = 0; i < known.length; i += 2) {
            if (known[i] == key) {
                return (T) known[i + 1];
            }
        }
        T value = function.apply(this);
        Object[] now = derived;
        Object[] more = Arrays.copyOf(now, now.length + 2);
        more[now.length] = key;
        more[now.length + 1] = value;
        derived = more;
        return value;
    }

    /**
     * The mirror image: over and under exchanged at every crossing. O(n).
     *
     * @return the mirrored diagram, same component numbers and orientation
     */
    public LinkDiagram mirrored() {
        return Relabelling.mirrored(this);
    }

    /**
     * The same link with all components running backwards. O(n).
     *
     * @return the reversed diagram
     */
    public LinkDiagram reversed() {
        boolean[] all = new boolean[components];
        Arrays.fill(all, true);
        return Relabelling.reversed(this, all);
    }

    /**
     * The same link with some components running backwards. O(n).
     *
     * @param which for each component whether it is turned round
     * @return the diagram with those components reversed
     * @throws IllegalArgumentException unless there is one choice for each component
     */
    public LinkDiagram reversed(boolean[] which) {
        return Relabelling.reversed(this, which);
    }

    /**
     * The diagram of some components, the others rubbed out. O(n).
     *
     * @param keep for each component whether it stays
     * @return the sublink; its components are numbered in the order they had, and keep their orientation;
     *         keeping none gives the empty diagram
     * @throws IllegalArgumentException unless there is one choice for each component
     */
    public LinkDiagram sublink(boolean[] keep) {
        return Surgery.sublink(this, keep);
    }

    /**
     * The split union: two diagrams side by side. O(n).
     *
     * @param right the other diagram
     * @return this diagram's components, then the other's
     */
    public LinkDiagram splitUnion(LinkDiagram right) {
        return Surgery.splitUnion(this, right);
    }

    /**
     * Equality of numbered diagrams: the same darts, signs, component numbers and starts.
     */
    @Override
    public boolean equals(Object other) {
        if (!(other instanceof LinkDiagram that) || crossings != that.crossings || components != that.components) {
            return false;
        }
        return Arrays.equals(mates, dartOffset, dartOffset + 4 * crossings, that.mates, that.dartOffset,
                        that.dartOffset + 4 * crossings)
                && Arrays.equals(signs, crossingOffset, crossingOffset + crossings, that.signs, that.crossingOffset,
                        that.crossingOffset + crossings)
                && Arrays.equals(starts, startOffset, startOffset + components, that.starts, that.startOffset,
                        that.startOffset + components);
    }

    @Override
    public int hashCode() {
        int hash = 31 * crossings + components;
        for (int d = 0; d < 4 * crossings; d++) {
            hash = 31 * hash + mates[dartOffset + d];
        }
        return hash;
    }

    @Override
    public String toString() {
        return "diagram of " + crossings + " crossings, " + components + " components";
    }
}
