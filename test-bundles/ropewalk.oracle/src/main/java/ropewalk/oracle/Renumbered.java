package ropewalk.oracle;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.NotADiagramException;

/**
 * The same diagram under other numbers: crossings and components in another order, components starting elsewhere.
 *
 * @param diagram the renumbered one
 * @param newNumber for each old component its new number
 */
public record Renumbered(LinkDiagram diagram, int[] newNumber) {

    /**
     * A diagram with everything renumbered at random.
     *
     * @param old any diagram
     * @param random where the numbers come from
     * @return the same link
     */
    public static Renumbered all(LinkDiagram old, Random random) {
        return of(old, shuffled(old.crossings(), random), shuffled(old.components(), random), random);
    }

    /**
     * A diagram whose components alone are renumbered at random.
     *
     * @param old any diagram
     * @param random where the numbers come from
     * @return the same link
     */
    public static Renumbered components(LinkDiagram old, Random random) {
        int[] crossings = new int[old.crossings()];
        Arrays.setAll(crossings, c -> c);
        return of(old, crossings, shuffled(old.components(), random), null);
    }

    private static Renumbered of(LinkDiagram old, int[] crossing, int[] component, Random starting) {
        int[] mates = new int[old.darts()];
        byte[] signs = new byte[old.crossings()];
        for (int d = 0; d < mates.length; d++) {
            mates[moved(d, crossing)] = moved(old.mate(d), crossing);
            signs[crossing[d >> 2]] = (byte) old.sign(d >> 2);
        }
        int[] starts = new int[old.components()];
        for (int i = 0; i < starts.length; i++) {
            int start = old.start(i);
            int steps = starting == null || start < 0 ? 0 : starting.nextInt(2 * old.crossings() + 1);
            for (int s = 0; s < steps; s++) {
                start = old.mate(start) ^ 2;
            }
            starts[component[i]] = start < 0 ? -1 : moved(start, crossing);
        }
        try {
            return new Renumbered(LinkDiagram.of(mates, signs, starts), component);
        } catch (NotADiagramException e) {
            throw new IllegalStateException("other numbers make no diagram of a diagram", e);
        }
    }

    private static int moved(int dart, int[] crossing) {
        return 4 * crossing[dart >> 2] + (dart & 3);
    }

    private static int[] shuffled(int size, Random random) {
        List<Integer> numbers = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            numbers.add(i);
        }
        Collections.shuffle(numbers, random);
        return numbers.stream().mapToInt(i -> i).toArray();
    }
}
