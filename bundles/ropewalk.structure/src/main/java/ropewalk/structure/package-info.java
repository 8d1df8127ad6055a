/**
 * What several bundles need of a diagram: its Goeritz forms and its colouring matrix, with rows and columns tied to
 * regions, crossings and arcs. Pure functions of the diagram, kept with it.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.structure;
