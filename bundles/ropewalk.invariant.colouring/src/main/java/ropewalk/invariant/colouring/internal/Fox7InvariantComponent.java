package ropewalk.invariant.colouring.internal;

import org.osgi.service.component.annotations.Component;
import ropewalk.invariant.Invariant;

/** Defines the number of Fox 7-colourings. */
@Component(service = Invariant.class)
public final class Fox7InvariantComponent extends FoxInvariant {

    /** The definition. */
    public Fox7InvariantComponent() {
        super(7);
    }
}
