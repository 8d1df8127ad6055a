package ropewalk.invariant.catalogue;

import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;

/**
 * A method as it is installed.
 *
 * @param id its own id
 * @param invariant the id of the invariant it measures
 * @param method the service
 * @param ranking its {@code service.ranking}
 * @param bundle the symbolic name of the bundle that brought it
 * @param version that bundle's version
 * @param loader that bundle's class loader, the context loader while the method runs
 */
public record RankedMethod(String id, String invariant, Method<?> method, int ranking, String bundle, String version,
        ClassLoader loader) {

    /**
     * Where a value of this method comes from, for evidence.
     *
     * @return bundle and version
     */
    public String origin() {
        return bundle + " " + version;
    }

    /**
     * Measures one link and keeps whatever goes wrong inside this outcome.
     *
     * @param link any diagram
     * @param effort for this link; {@link Effort.SpentException} is let through
     * @return what the method says, or {@code Failed} where it throws
     */
    public Outcome<?> measure(LinkDiagram link, Effort effort) {
        Thread thread = Thread.currentThread();
        ClassLoader before = thread.getContextClassLoader();
        thread.setContextClassLoader(loader);
        try {
            Outcome<?> outcome = method.measure(link, effort);
            return outcome == null ? new Outcome.Failed<>("returned null") : outcome;
        } catch (Effort.SpentException e) {
            throw e;
        } catch (Throwable e) {
            return failed(e);
        } finally {
            thread.setContextClassLoader(before);
        }
    }

    /**
     * The outcome of a method that threw.
     *
     * @param thrown what it threw
     * @return the failure, on one line
     */
    public static Outcome<?> failed(Throwable thrown) {
        String message = thrown.getMessage();
        String text = thrown.getClass().getSimpleName() + (message == null ? "" : ": " + message);
        return new Outcome.Failed<>(text.replaceAll("\\p{Cntrl}+", " "));
    }
}
