package ropewalk.invariant;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import org.osgi.annotation.versioning.ConsumerType;

/**
 * What is measured: a definition with a normal form. An invariant is its id: the first definition registered counts, a
 * different one later is refused with one warning. Ids from outside the product contain a dot.
 *
 * @param <V> the type of its value
 */
@ConsumerType
public interface Invariant<V extends Value> {

    /**
     * The id: the column's name in results.csv.
     *
     * @return lower case letters, digits and dots
     */
    String id();

    /**
     * The title for people.
     *
     * @return a few words
     */
    String title();

    /**
     * What it is and who says so.
     *
     * @return a sentence with author and year
     */
    String definition();

    /**
     * The type of its value.
     *
     * @return one of the records of {@link Value}
     */
    Class<V> valueType();

    /**
     * Whether the value depends on the orientation of the components.
     *
     * @return true if reversing some (not all) of the components may change it
     */
    boolean needsOrientation();

    /**
     * What the mirror image does to the value.
     *
     * @return the rule, or nothing if the value of the mirror image does not follow from this one
     */
    Optional<UnaryOperator<V>> underMirrorImage();

    /**
     * What reversing all components does to the value.
     *
     * @return the rule, or nothing if the value of the reverse does not follow from this one
     */
    Optional<UnaryOperator<V>> underReversal();

    /**
     * What a split union does. That alone makes the invariant an obstruction to splitting.
     *
     * @return the law, or nothing if it has none
     */
    default Optional<SplitLaw<V>> splitLaw() {
        return Optional.empty();
    }

    /**
     * The value for a paper.
     *
     * @param value a value of this invariant
     * @return LaTeX, to be set in mathematics mode
     */
    default String latex(V value) {
        return "\\texttt{" + value.text() + "}";
    }

    /**
     * A number to sort and plot by.
     *
     * @param value a value of this invariant
     * @return the number where there is one
     */
    default OptionalDouble number(V value) {
        return OptionalDouble.empty();
    }
}
