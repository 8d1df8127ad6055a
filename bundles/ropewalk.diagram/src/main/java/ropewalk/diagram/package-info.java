/**
 * The model: link diagrams as immutable plane maps.
 *
 * <p>{@link ropewalk.diagram.LinkDiagram} says what a diagram is, how its darts are numbered and which way they turn;
 * {@link ropewalk.diagram.LinkBatch} holds a few hundred of them in flat arrays. What follows from a diagram alone,
 * without a convention of any one invariant, is here too: {@link ropewalk.diagram.Regions},
 * {@link ropewalk.diagram.Shading}, {@link ropewalk.diagram.Arcs}, {@link ropewalk.diagram.ConnectedPieces}.
 *
 * <p>Components are counted from 0 in this package and shown from 1 in every file and message.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.diagram;
