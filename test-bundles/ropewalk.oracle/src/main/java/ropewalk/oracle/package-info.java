/**
 * Second routes to what the product measures: slow, short, by the textbook, and sharing nothing with it but the diagram
 * itself. For tests alone.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.oracle;
