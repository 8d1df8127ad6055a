package ropewalk.diagram.notation;

import ropewalk.diagram.LinkDiagram;

/** Writes one notation. Stateless. */
public interface CodeWriter {

    /**
     * Writes a diagram.
     *
     * @param diagram any diagram
     * @return its code, on one line
     */
    String write(LinkDiagram diagram);
}
