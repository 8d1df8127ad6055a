/**
 * Which invariants are installed and who measures them, in the order of the results table. Survey and split detection
 * read it; nobody registers here by hand.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.invariant.catalogue;
