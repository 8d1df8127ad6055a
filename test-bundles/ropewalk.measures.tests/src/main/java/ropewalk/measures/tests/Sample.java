package ropewalk.measures.tests;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.notation.Notations;
import ropewalk.families.BraidClosure;
import ropewalk.families.RandomDiagrams;
import ropewalk.families.Satellite;
import ropewalk.families.Scrambled;
import ropewalk.families.SplitUnion;
import ropewalk.families.TorusLink;
import ropewalk.families.WheelClosure;

/**
 * A diagram and how to make it again.
 *
 * @param how the construction with its seed
 * @param diagram the result
 */
record Sample(String how, LinkDiagram diagram) {

    private static final int[] SIZES = {1, 2, 3, 4, 5, 6, 8, 10, 13, 17, 22, 30, 40, 60};
    private static final int SEEDS = 5;

    /** Random and awkward diagrams of all sizes up to 60 crossings and a little more. */
    static List<Sample> all() {
        List<Sample> samples = new ArrayList<>(awkward());
        for (int size : SIZES) {
            for (int i = 0; i < SEEDS; i++) {
                long seed = 1000L * size + i;
                LinkDiagram plane = RandomDiagrams.plane(seed, size);
                samples.add(new Sample("plane(" + seed + ", " + size + ")", plane));
                int strands = 2 + i;
                LinkDiagram braid = RandomDiagrams.braid(seed, strands, size);
                samples.add(new Sample("braid(" + seed + ", " + strands + ", " + size + ")", braid));
                if (i == 0) {
                    samples.add(new Sample("plane(" + seed + ", " + size + ") beside circles",
                            SplitUnion.of(SplitUnion.ofCircles(1 + size % 3), plane)));
                    samples.add(new Sample("plane(" + seed + ", " + size + ") beside braid(" + seed + ", 2, " + size + ")",
                            SplitUnion.of(plane, braid)));
                    samples.add(new Sample("scrambled(" + seed + ", braid(" + seed + ", 2, " + size + "), " + size + ")",
                            Scrambled.of(seed, braid, size)));
                }
            }
        }
        return samples;
    }

    /** Few crossings: for what takes all pairs of rows, or tries all colourings. */
    static List<Sample> small(int crossings) {
        List<Sample> samples = new ArrayList<>();
        for (int size = 1; size <= crossings; size++) {
            for (int i = 0; i < 12; i++) {
                long seed = 77_000L + 100 * size + i;
                samples.add(new Sample("plane(" + seed + ", " + size + ")", RandomDiagrams.plane(seed, size)));
                samples.add(new Sample("braid(" + seed + ", " + (2 + i % 3) + ", " + size + ")",
                        RandomDiagrams.braid(seed, 2 + i % 3, size)));
            }
        }
        awkward().stream().filter(s -> s.diagram().crossings() <= crossings).forEach(samples::add);
        return samples;
    }

    private static List<Sample> awkward() {
        LinkDiagram trefoil = TorusLink.of(2, 3);
        return List.of(
                new Sample("one circle", SplitUnion.ofCircles(1)),
                new Sample("five circles", SplitUnion.ofCircles(5)),
                new Sample("one kink", BraidClosure.of(2, 1)),
                new Sample("kinks only", BraidClosure.of(5, 1, -2, 3, -4)),
                new Sample("one circle lies on the other", BraidClosure.of(2, 1, -1)),
                new Sample("clasp over a circle", BraidClosure.of(3, 1, 1, 2, -2)),
                new Sample("Hopf link", BraidClosure.of(2, 1, 1)),
                new Sample("six crossings, a circle over everything", BraidClosure.of(3, 1, -1, 2, -2, 1, -1)),
                new Sample("Borromean rings", WheelClosure.of(3)),
                new Sample("trefoil, 0-framed cable", Satellite.cable(trefoil, 0)),
                new Sample("trefoil, untwisted Bing double", Satellite.bingDouble(trefoil, 0)),
                new Sample("trefoil, untwisted Whitehead double", Satellite.whiteheadDouble(trefoil, 0)),
                new Sample("a wheel of 60 crossings beside another and a circle",
                        SplitUnion.of(WheelClosure.of(30), WheelClosure.of(33), SplitUnion.ofCircles(1))),
                new Sample("plane(9, 120) beside plane(10, 90)",
                        SplitUnion.of(RandomDiagrams.plane(9, 120), RandomDiagrams.plane(10, 90))),
                new Sample("trefoil beside its mirror image beside a circle",
                        SplitUnion.of(trefoil, TorusLink.of(2, -3), SplitUnion.ofCircles(1))));
    }

    /** Runs a check on each; a failure names the construction and the planar code. */
    static void each(List<Sample> samples, Consumer<LinkDiagram> check) {
        for (Sample sample : samples) {
            try {
                check.accept(sample.diagram());
            } catch (AssertionError | RuntimeException e) {
                throw new AssertionError(sample.how() + ": " + e.getMessage() + "; planar code "
                        + code(sample.diagram()), e);
            }
        }
    }

    static String code(LinkDiagram link) {
        return Notations.writer("planar").orElseThrow().write(link);
    }
}
