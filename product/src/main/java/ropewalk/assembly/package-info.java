/**
 * Runs in the build and is not shipped: turns {@code features/NAME.json} into the plain lists that the launcher reads,
 * gathers the licences of what is shipped, and stops the build when a feature names a bundle that is not there.
 */
package ropewalk.assembly;
