package ropewalk.invariant.catalogue;

import ropewalk.invariant.Method;

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
}
