package ropewalk.algebra.internal;

/** The values of an elimination by place, in some ring. */
interface PlaceValues {
    /** Whether a place can be a pivot: whether its value is a unit. */
    boolean isPivot(int place);

    /** Makes room for places up to, not including, a number; new ones are 0. */
    void room(int places);

    /** Prepares for the step with a pivot. */
    void startStep(int pivot);

    /** Sets the factor for one row: minus the value below the pivot over the pivot. */
    void startRow(int below);

    /** Adds the factor times the value at {@code beside} to the value at {@code target}. */
    void add(int target, int beside);
}
