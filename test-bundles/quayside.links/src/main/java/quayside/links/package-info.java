/**
 * What the Quayside group adds: the determinant of alternating links by spanning trees, and the number of colourings by
 * the tetrahedral quandle.
 */
package quayside.links;
