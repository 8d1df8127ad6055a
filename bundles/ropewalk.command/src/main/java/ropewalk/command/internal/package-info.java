/**
 * The command line. Each subcommand is a service of the JDK type {@code ToIntFunction<String[]>} with the properties
 * {@code ropewalk.subcommand} and {@code ropewalk.summary}; it returns the exit status. Nothing here is exported.
 */
package ropewalk.command.internal;
