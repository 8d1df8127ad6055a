/**
 * Which components of a link come apart. {@link ropewalk.split.SplitDetection} keeps, for each link, a lower partition
 * (<em>together</em>: proved inseparable) and an upper one (<em>apart</em>: witnessed), asks the installed
 * {@link ropewalk.split.Obstruction}s and {@link ropewalk.split.Separator}s from cheap to dear, and stops where the two
 * partitions meet. No invariant is named here.
 *
 * <p>Components are counted from 0 in this package and shown from 1 in every file and message.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.split;
