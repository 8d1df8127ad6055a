/**
 * Exact linear algebra over the integers, the rationals and prime fields, for the matrices of link diagrams.
 *
 * <p>There are two entrances. {@link ropewalk.algebra.SmallMatrix} works in place on the caller's {@code long[]},
 * allocates nothing, and says so when 64 bits do not suffice; it is meant for hundreds of thousands of matrices a
 * second. {@link ropewalk.algebra.IntegerMatrix} is an immutable sparse matrix of any size; {@code Determinant},
 * {@code Rank}, {@code Kernel}, {@code InvariantFactors} and {@code Inertia} take it and a checkpoint, a
 * {@link java.lang.Runnable} that is run about every millisecond and may throw to abort.
 *
 * <p>Every value that is returned is proved. What cannot be proved within memory is a
 * {@link ropewalk.algebra.MatrixTooLargeException}, never a guess.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.algebra;
