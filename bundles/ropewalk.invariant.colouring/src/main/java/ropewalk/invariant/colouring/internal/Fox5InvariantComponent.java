package ropewalk.invariant.colouring.internal;

import org.osgi.service.component.annotations.Component;
import ropewalk.invariant.Invariant;

/** Defines the number of Fox 5-colourings. */
@Component(service = Invariant.class)
public final class Fox5InvariantComponent extends FoxInvariant {

    /** The definition. */
    public Fox5InvariantComponent() {
        super(5);
    }
}
