/**
 * Starts the product: an embedded OSGi framework with the bundles of the chosen features, the group's own bundles
 * out of the guests folder, and one subcommand, whose status becomes that of the process.
 *
 * <p>Nothing here knows a bundle by its types. A subcommand is a service of the JDK type
 * {@link java.util.function.ToIntFunction} of {@code String[]} with the properties {@code ropewalk.subcommand} and
 * {@code ropewalk.summary}; what bundles want to know of their surroundings they read from framework properties
 * ({@code ropewalk.data}, {@code ropewalk.guests}, {@code ropewalk.product}, {@code ropewalk.features},
 * {@code ropewalk.version}).
 */
package ropewalk.launch;
