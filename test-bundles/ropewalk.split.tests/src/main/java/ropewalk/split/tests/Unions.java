package ropewalk.split.tests;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import ropewalk.diagram.LinkDiagram;
import ropewalk.families.RandomDiagrams;
import ropewalk.families.SplitUnion;
import ropewalk.families.TorusLink;
import ropewalk.families.TwoBridgeLink;
import ropewalk.families.WheelClosure;
import ropewalk.oracle.PlainLink;
import ropewalk.split.Partition;

/** Split unions whose pieces are known, since none of their parts splits. */
final class Unions {

    private Unions() {
    }

    /** A link and its pieces. */
    record Known(LinkDiagram link, Partition pieces) { }

    /** A split union of links that do not split: knots, and links of determinant not 0. */
    static Known random(long seed) {
        Random random = new Random(seed);
        List<LinkDiagram> blocks = new ArrayList<>();
        List<Integer> marks = new ArrayList<>();
        int count = 2 + random.nextInt(3);
        for (int b = 0; b < count; b++) {
            LinkDiagram block = block(random);
            blocks.add(block);
            for (int i = 0; i < block.components(); i++) {
                marks.add(b);
            }
        }
        return new Known(SplitUnion.of(blocks.toArray(LinkDiagram[]::new)),
                Partition.of(marks.stream().mapToInt(m -> m).toArray()));
    }

    private static LinkDiagram block(Random random) {
        return switch (random.nextInt(8)) {
            case 0 -> SplitUnion.ofCircles(1);
            case 1 -> TorusLink.of(2, random.nextBoolean() ? 3 : -4);
            case 2 -> TorusLink.of(2, 2);
            case 3 -> WheelClosure.of(2 + random.nextInt(2));
            case 4 -> TwoBridgeLink.of(8, 3);
            case 5 -> Hard.links().get("chain of rings");
            default -> nonSplit(random);
        };
    }

    static LinkDiagram nonSplit(Random random) {
        while (true) {
            LinkDiagram link = random.nextBoolean() ? RandomDiagrams.plane(random.nextLong(), 1 + random.nextInt(12))
                    : RandomDiagrams.braid(random.nextLong(), 2 + random.nextInt(3), 1 + random.nextInt(12));
            if (link.components() <= 4 && new PlainLink(link).determinant().signum() != 0) {
                return link;
            }
        }
    }

    static AssertionError at(String what, LinkDiagram link, Throwable e) {
        return new AssertionError(what + ": " + e.getMessage() + "; planar code " + Detection.code(link), e);
    }
}
