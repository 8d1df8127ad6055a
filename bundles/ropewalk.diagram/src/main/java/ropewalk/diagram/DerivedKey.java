package ropewalk.diagram;

/**
 * The name under which {@link LinkDiagram#derived} keeps what somebody computed from a diagram. Keys are compared by
 * identity: make one, keep it in a constant.
 *
 * @param <T> the type of what is kept; it must be immutable
 */
public final class DerivedKey<T> {

    private final String name;

    /**
     * A new key, different from every other.
     *
     * @param name shown in messages only
     */
    public DerivedKey(String name) {
        this.name = name;
    }

    @Override
    public String toString() {
        return name;
    }
}
