package ropewalk.diagram;

import java.util.Random;

/** Random link diagrams for tests: braid closures, plane maps, and unions of both, with circles between. */
public final class RandomDiagrams {

    private RandomDiagrams() {
    }

    /** A diagram of about the given size, of any kind. */
    public static LinkDiagram any(Random random, int size) throws NotADiagramException {
        return switch (random.nextInt(4)) {
            case 0 -> braid(random, size);
            case 1 -> map(random, size);
            case 2 -> braid(random, 1 + size / 2).splitUnion(map(random, 1 + size / 2));
            default -> map(random, 1 + size / 3).splitUnion(map(random, 1 + size / 3)).splitUnion(map(random, 1));
        };
    }

    public static LinkDiagram braid(Random random, int letters) throws NotADiagramException {
        int strands = 2 + random.nextInt(5);
        int[] word = random.ints(letters, 1, strands).toArray();
        return Shadow.braid(strands, word).diagram(random, random.nextInt(3));
    }

    public static LinkDiagram map(Random random, int vertices) throws NotADiagramException {
        return Shadow.uniform(random, vertices).diagram(random, random.nextInt(3));
    }

    /** A diagram of one component, of fewer crossings than the plane map that it comes from. */
    public static LinkDiagram knot(Random random, int vertices) throws NotADiagramException {
        return Shadow.uniform(random, vertices).joined().diagram(random, 0);
    }
}
