/**
 * Helps tests that need more than a class: {@link ropewalk.testkit.FrameworkSession} runs a module's tests inside a
 * framework, {@link ropewalk.testkit.Services} waits for services there, {@link ropewalk.testkit.Distribution} and
 * {@link ropewalk.testkit.Run} start the packed product as a process of its own, and
 * {@link ropewalk.testkit.SmallBundle} makes jars to drop into it.
 */
package ropewalk.testkit;
