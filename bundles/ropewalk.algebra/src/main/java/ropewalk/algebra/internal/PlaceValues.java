package ropewalk.algebra.internal;

/** The values of an elimination by place, in some ring. */
interface PlaceValues {
    /** Whether a place may be a pivot: false if its value is no unit; true may be too hopeful where a test is dear. */
    boolean isPivot(int place);

    /** Whether a place that may be a pivot is one; after false, {@link #isPivot} is false as well. */
    default boolean confirm(int place) {
        return true;
    }

    /** Makes room for places up to, not including, a number; new ones are 0. */
    void room(int places);

    /** Prepares for the step with a pivot. */
    void startStep(int pivot);

    /** Sets the factor for one row: minus the value below the pivot over the pivot. */
    void startRow(int below);

    /** Adds the factor times the value at {@code beside} to the value at {@code target}. */
    void add(int target, int beside);
}
