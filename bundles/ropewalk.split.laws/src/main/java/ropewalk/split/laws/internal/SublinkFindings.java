package ropewalk.split.laws.internal;

import java.util.Arrays;
import ropewalk.diagram.LinkDiagram;
import ropewalk.split.Evidence;
import ropewalk.split.Findings;
import ropewalk.split.Partition;

/**
 * Passes what is found of a sublink on to the link: inseparability passes upwards, a separation never does.
 *
 * @param whole the findings of the link
 * @param size its number of components
 * @param numbers for each component of the sublink its number in the link
 */
record SublinkFindings(Findings whole, int size, int[] numbers) implements Findings {

    @Override
    public Partition together() {
        return Partition.singles(numbers.length);
    }

    @Override
    public void together(Partition classes, Evidence evidence) {
        int[] marks = new int[size];
        Arrays.setAll(marks, i -> numbers.length + i);
        StringBuilder sublink = new StringBuilder();
        for (int i = 0; i < numbers.length; i++) {
            marks[numbers[i]] = classes.classOf(i);
            sublink.append(i == 0 ? "[" : ",").append(numbers[i] + 1);
        }
        whole.together(Partition.of(marks), new Evidence(evidence.kind(), evidence.origin(),
                "{\"sublink\":" + sublink + "],\"argument\":" + evidence.detail() + "}"));
    }

    @Override
    public void apart(Partition pieces, LinkDiagram diagram, Evidence evidence) {
        throw new IllegalStateException("a sublink that comes apart says nothing of the link");
    }
}
