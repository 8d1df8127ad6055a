/** Values from tables and closed formulas, each with its source, for tests to compare with. */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.published;
