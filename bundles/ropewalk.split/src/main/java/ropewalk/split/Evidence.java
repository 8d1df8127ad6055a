package ropewalk.split;

/**
 * Why components are inseparable, or how they come apart.
 *
 * @param kind what sort of argument, for example {@code law.determinant} or {@code reduction}
 * @param origin the bundle and version whose word it is, where nobody else has repeated the argument
 * @param detail the argument itself, a JSON object on one line; numbers of components and crossings are those of the
 *        diagram it speaks of, counted from 1
 */
public record Evidence(String kind, String origin, String detail) {

    /**
     * The grade that goes with the kind in the results table.
     *
     * @return {@code relies on BUNDLE VERSION}
     */
    public String grade() {
        return "relies on " + origin;
    }
}
