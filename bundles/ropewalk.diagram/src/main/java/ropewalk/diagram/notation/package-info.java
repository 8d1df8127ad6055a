/**
 * Written forms of diagrams. {@link ropewalk.diagram.notation.Notations} lists them by name; a
 * {@link ropewalk.diagram.notation.CodeReader} turns a code into a diagram of a batch or says at which byte it fails,
 * a {@link ropewalk.diagram.notation.CodeWriter} writes a diagram.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.diagram.notation;
