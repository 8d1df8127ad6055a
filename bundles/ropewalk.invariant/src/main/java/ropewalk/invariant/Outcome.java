package ropewalk.invariant;

import java.util.Objects;

/**
 * What a method says of a link; the package document tells what each kind means.
 *
 * @param <V> the type of the value
 */
public sealed interface Outcome<V extends Value> {

    /**
     * The value, exact and proved.
     *
     * @param <V> the type of the value
     * @param value never null
     */
    record Exact<V extends Value>(V value) implements Outcome<V> {

        // A value that is missing is the method's fault, and must show there.
        public Exact {
            Objects.requireNonNull(value, "an exact outcome without a value");
        }
    }

    /**
     * The method does not cover such links.
     *
     * @param <V> the type of the value
     * @param reason which links it covers, one line
     */
    record NotApplicable<V extends Value>(String reason) implements Outcome<V> { }

    /**
     * The method stopped at a limit.
     *
     * @param <V> the type of the value
     * @param limit which limit, one line
     */
    record OutOfEffort<V extends Value>(String limit) implements Outcome<V> { }

    /**
     * The method broke.
     *
     * @param <V> the type of the value
     * @param reason what happened, one line
     */
    record Failed<V extends Value>(String reason) implements Outcome<V> { }
}
