/**
 * Determinant, nullity, invariant factors and signature from the chessboard-coloured diagram. Thin components over
 * {@code ropewalk.structure} and {@code ropewalk.algebra}; nothing here is exported.
 */
package ropewalk.invariant.chessboard.internal;
