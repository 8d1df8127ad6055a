package ropewalk.invariant.colouring.internal;

import org.osgi.service.component.annotations.Component;
import ropewalk.invariant.Invariant;

/** Defines the number of Fox 3-colourings. */
@Component(service = Invariant.class)
public final class Fox3InvariantComponent extends FoxInvariant {

    /** The definition. */
    public Fox3InvariantComponent() {
        super(3);
    }
}
