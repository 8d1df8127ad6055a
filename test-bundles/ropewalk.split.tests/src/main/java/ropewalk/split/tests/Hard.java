package ropewalk.split.tests;

import java.util.LinkedHashMap;
import java.util.Map;
import ropewalk.diagram.LinkDiagram;
import ropewalk.families.BraidClosure;
import ropewalk.families.MontesinosLink;
import ropewalk.families.PretzelLink;
import ropewalk.families.Satellite;
import ropewalk.families.TorusLink;
import ropewalk.families.TwoBridgeLink;
import ropewalk.families.WheelClosure;

/** Links that do not split, many of them with determinant 0. */
final class Hard {

    private Hard() {
    }

    /**
     * The untwisted Bing double of the trefoil does not split (Cimasoni 2006), and nothing that is installed can say so:
     * determinant, H₁ and linking numbers are those of the unlink.
     */
    static LinkDiagram undecided() {
        return Satellite.bingDouble(TorusLink.of(2, 3), 0);
    }

    static Map<String, LinkDiagram> links() {
        LinkDiagram trefoil = TorusLink.of(2, 3);
        LinkDiagram eight = WheelClosure.of(2);
        Map<String, LinkDiagram> links = new LinkedHashMap<>();
        // At least three rational tangles: irreducible double branched cover (Montesinos 1973).
        links.put("pretzel (3,6,-2)", PretzelLink.of(3, 6, -2));
        links.put("pretzel (4,4,-2)", PretzelLink.of(4, 4, -2));
        links.put("pretzel (6,12,-4)", PretzelLink.of(6, 12, -4));
        links.put("Montesinos 1/2 + 1/2 - 1/3 - 2/3", MontesinosLink.empty().plus(1, 2).plus(1, 2).plus(-1, 3).plus(-2, 3)
                .closure());
        // 0-framed cables and Bing doubles of knots that are not trivial: irreducible exterior (Cimasoni 2006).
        links.put("cable of the trefoil", Satellite.cable(trefoil, 0));
        links.put("cable of the figure-eight knot", Satellite.cable(eight, 0));
        links.put("cable of the knot T(3,5) of determinant 1", Satellite.cable(TorusLink.of(3, 5), 0));
        links.put("Bing double of the trefoil", undecided());
        links.put("Bing double of the figure-eight knot", Satellite.bingDouble(eight, 0));
        // Brunnian, linking numbers 0, alternating: Menasco 1984.
        links.put("Whitehead link", TwoBridgeLink.of(8, 3));
        links.put("Borromean rings", WheelClosure.of(3));
        links.put("six-spoked wheel", WheelClosure.of(6));
        // Connected sum of Hopf links of both signs, determinant not 0, a chain of linked rings.
        links.put("chain of rings", BraidClosure.of(4, 1, 1, -2, -2, 3, 3));
        links.put("T(4,4)", TorusLink.of(4, 4));
        links.put("T(3,3) and its mirror image, summed", BraidClosure.of(5, 1, 2, 1, 2, 1, 2, -3, -4, -3, -4, -3, -4));
        return links;
    }
}
