/**
 * Turns every installed invariant that declares a split law into an obstruction. Nothing here is exported, and no
 * invariant is named.
 */
package ropewalk.split.laws.internal;
