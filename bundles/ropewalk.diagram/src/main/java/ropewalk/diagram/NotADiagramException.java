package ropewalk.diagram;

/** Darts and signs that do not make a link diagram on the sphere; {@link #crossing} says where to look. */
public final class NotADiagramException extends Exception {

    private static final long serialVersionUID = 1L;

    /** What is wrong. */
    public enum Kind {
        /** The darts do not pair up, or a strand meets itself head to head. */
        STRANDS,
        /** The faces of a connected piece are too few for the sphere: a diagram of a virtual link. */
        NOT_PLANAR
    }

    private final Kind kind;
    private final int crossing;

    NotADiagramException(Kind kind, int crossing, String message) {
        super(message, null, false, false);
        this.kind = kind;
        this.crossing = crossing;
    }

    /**
     * What is wrong.
     *
     * @return the kind of fault
     */
    public Kind kind() {
        return kind;
    }

    /**
     * Where it is wrong.
     *
     * @return a crossing of the piece or strand at fault, counted from 0
     */
    public int crossing() {
        return crossing;
    }
}
