package ropewalk.collection;

import java.io.IOException;

/** A collection that cannot be read at all, or not further. Other files are not concerned. */
public final class UnreadableCollectionException extends IOException {

    private static final long serialVersionUID = 1L;

    private final transient Rejection rejection;

    UnreadableCollectionException(Rejection rejection, Throwable cause) {
        super(rejection.toString(), cause);
        this.rejection = rejection;
    }

    /** {@return the one line of rejected.csv that this file is worth} */
    public Rejection rejection() {
        return rejection;
    }
}
