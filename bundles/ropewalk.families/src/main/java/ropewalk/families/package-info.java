/**
 * Constructions of link diagrams: the families of the literature, satellites, seeded random models and scrambled split
 * unions.
 *
 * <p><b>Conventions.</b> A tangle has the ends NW, NE, SW, SE. The crossing +1 is the one whose over-strand runs from NW
 * to SE; so a row of positive crossings, closed up, is the positive (right-handed) torus link T(2, n), and a tangle
 * built of positive crossings alone is alternating. Fractions of tangles add up from left to right (Conway 1970). In
 * braids a positive letter is a positive crossing, all strands running down.
 *
 * <p><b>Orientation and numbering.</b> Closed braids, and what is built of them, run down every strand and are numbered
 * by the leftmost strand at the top. Everywhere else a component is numbered by its first crossing in the order of
 * construction and leaves it along the first of its ends; that is the same in every run, and nothing more is promised.
 *
 * <p><b>Random models</b> draw from a generator whose algorithm is written down here, so that one seed gives the same
 * diagrams on every machine and with every version of Java.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.families;
