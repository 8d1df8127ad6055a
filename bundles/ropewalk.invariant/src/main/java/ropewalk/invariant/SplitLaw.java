package ropewalk.invariant;

import java.util.Set;
import org.osgi.annotation.versioning.ConsumerType;

/**
 * How an invariant behaves on a split union, two links with a sphere between them. If the value of a link is not what
 * the law makes of the values of its sublinks on the two sides of a bipartition, no sphere realises that bipartition.
 *
 * @param <V> the type of the value
 */
@ConsumerType
public interface SplitLaw<V extends Value> {

    /**
     * The value of a split union.
     *
     * @param left the value of the sublink on the left side
     * @param right the value of the sublink on the right side
     * @param which which components of the whole lie on which side; both sublinks number theirs in the same order
     * @return the value of the whole if a sphere separates the two sides
     */
    V union(V left, V right, Bipartition which);

    /**
     * Components that this value alone proves inseparable.
     *
     * @param whole the value of a link
     * @return pairs that no sphere separates; empty unless the value shows some
     */
    default Set<Pair> ties(V whole) {
        return Set.of();
    }

    /**
     * Whether a link with this value can split at all. A law whose union has a fixed value, such as 0, says no for
     * every other value, and spares the sublinks.
     *
     * @param whole the value of a link
     * @return false only if the value alone proves that no sphere separates any components
     */
    default boolean admitsSplit(V whole) {
        return true;
    }
}
