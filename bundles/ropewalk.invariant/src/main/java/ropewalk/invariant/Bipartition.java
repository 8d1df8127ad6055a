package ropewalk.invariant;

/** The components of a link on two sides, neither of them empty. Immutable. */
public final class Bipartition {

    private final boolean[] left;

    /**
     * A bipartition.
     *
     * @param left for each component whether it is on the left side
     * @throws IllegalArgumentException if a side is empty
     */
    public Bipartition(boolean[] left) {
        this.left = left.clone();
        if (leftSize() == 0 || leftSize() == left.length) {
            throw new IllegalArgumentException("a bipartition with an empty side");
        }
    }

    /**
     * The number of components of the whole link.
     *
     * @return both sides together
     */
    public int size() {
        return left.length;
    }

    /**
     * The number of components on the left.
     *
     * @return at least 1
     */
    public int leftSize() {
        int count = 0;
        for (boolean isLeft : left) {
            count += isLeft ? 1 : 0;
        }
        return count;
    }

    /**
     * On which side a component is.
     *
     * @param component counted from 0
     * @return true for the left side
     */
    public boolean isLeft(int component) {
        return left[component];
    }

    /**
     * The left side, or the right one.
     *
     * @return for each component whether it is on the left
     */
    public boolean[] left() {
        return left.clone();
    }

    /**
     * The right side.
     *
     * @return for each component whether it is on the right
     */
    public boolean[] right() {
        boolean[] right = new boolean[left.length];
        for (int i = 0; i < right.length; i++) {
            right[i] = !left[i];
        }
        return right;
    }
}
