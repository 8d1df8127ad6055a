/**
 * What a group writes against to add an invariant of its own: an {@link ropewalk.invariant.Invariant} says what is
 * measured, a {@link ropewalk.invariant.Method} measures it. Both are Declarative Services components; a bundle that
 * registers them appears as a column of every survey, beside the others.
 *
 * <table>
 * <caption>What an outcome says</caption>
 * <tr><th>outcome</th><th>of the link</th><th>of the method</th><th>in the table</th></tr>
 * <tr><td>{@code Exact}</td><td>this is its value, proved</td><td>done</td><td>the value</td></tr>
 * <tr><td>{@code NotApplicable}</td><td>nothing</td><td>does not cover such links; the next method is asked</td>
 *     <td>empty</td></tr>
 * <tr><td>{@code OutOfEffort}</td><td>nothing</td><td>stopped at a limit; a larger effort may do</td>
 *     <td>{@code !effort: …}</td></tr>
 * <tr><td>{@code Failed}</td><td>nothing</td><td>broken; tell its author</td><td>{@code !failed: …}</td></tr>
 * </table>
 *
 * <p>Components are counted from 0 in this package and shown from 1 in every file and message.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.invariant;
