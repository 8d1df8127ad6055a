/**
 * Moves on diagrams. {@link ropewalk.diagram.moves.Move} is one Reidemeister move that removes crossings, as a value
 * that can be written down and made again; {@link ropewalk.diagram.moves.Reduction} makes them while there is one.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.diagram.moves;
