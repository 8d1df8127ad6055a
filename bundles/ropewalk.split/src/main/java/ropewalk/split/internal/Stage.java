package ropewalk.split.internal;

import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.split.Findings;

/**
 * An obstruction or a separator: the squeeze treats both alike.
 *
 * @param name what to call it among the things tried
 * @param work what it does
 */
record Stage(String name, Work work) {

    interface Work {
        void on(LinkDiagram link, Findings findings, Effort effort);
    }
}
