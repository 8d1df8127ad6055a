package ropewalk.invariant;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import org.osgi.annotation.versioning.ConsumerType;

/**
 * The plain parts of an invariant, given once to the constructor. A component extends it and adds what is special: by
 * default the orientation does not count, and nothing is claimed of mirror image, reversal or split union.
 *
 * @param <V> the type of the value
 */
@ConsumerType
public abstract class InvariantBase<V extends Value> implements Invariant<V> {

    private final String id;
    private final String title;
    private final String definition;
    private final Class<V> valueType;

    /**
     * The plain parts.
     *
     * @param id see {@link #id}
     * @param title see {@link #title}
     * @param definition see {@link #definition}
     * @param valueType see {@link #valueType}
     */
    protected InvariantBase(String id, String title, String definition, Class<V> valueType) {
        this.id = id;
        this.title = title;
        this.definition = definition;
        this.valueType = valueType;
    }

    @Override
    public final String id() {
        return id;
    }

    @Override
    public final String title() {
        return title;
    }

    @Override
    public final String definition() {
        return definition;
    }

    @Override
    public final Class<V> valueType() {
        return valueType;
    }

    @Override
    public boolean needsOrientation() {
        return false;
    }

    @Override
    public Optional<UnaryOperator<V>> underMirrorImage() {
        return Optional.empty();
    }

    @Override
    public Optional<UnaryOperator<V>> underReversal() {
        return Optional.empty();
    }

    @Override
    public String latex(V value) {
        return value instanceof Value.IntegerValue ? value.text() : Invariant.super.latex(value);
    }

    @Override
    public OptionalDouble number(V value) {
        return value instanceof Value.IntegerValue integer ? OptionalDouble.of(integer.value().doubleValue())
                : OptionalDouble.empty();
    }
}
