/**
 * The colouring matrix: Fox colourings, and the determinant by a second route. Nothing here is exported.
 */
package ropewalk.invariant.colouring.internal;
