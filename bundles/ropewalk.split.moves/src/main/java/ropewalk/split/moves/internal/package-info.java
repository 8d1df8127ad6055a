/** Separations that can be seen or that come by simplifying the diagram. Nothing here is exported. */
package ropewalk.split.moves.internal;
