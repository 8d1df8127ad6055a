package ropewalk.families;

/**
 * A tangle within a {@link Wiring}: its four free ends. The crossing +1 has the over-strand from NW to SE; the fraction
 * of a sum is the sum of the fractions, and the numerator closure joins NW to NE and SW to SE (Conway 1970, in
 * "Computational problems in abstract algebra", 329–358).
 */
final class Tangle {

    private final Wiring wiring;
    private int nw;
    private int ne;
    private int sw;
    private int se;

    private Tangle(Wiring wiring, int nw, int ne, int sw, int se) {
        this.wiring = wiring;
        this.nw = nw;
        this.ne = ne;
        this.sw = sw;
        this.se = se;
    }

    /** The fraction 0: two strands from left to right. */
    static Tangle zero(Wiring w) {
        int north = w.joint();
        int south = w.joint();
        return new Tangle(w, north, north ^ 2, south, south ^ 2);
    }

    /** The fraction 1/0: two strands from top to bottom. */
    static Tangle infinite(Wiring w) {
        int west = w.joint();
        int east = w.joint();
        return new Tangle(w, west, east, west ^ 2, east ^ 2);
    }

    /**
     * The rational tangle a₁ + 1/(a₂ + 1/(… + 1/aₙ)): twists at the right for the terms of odd number, at the bottom
     * for the others, innermost first.
     */
    static Tangle rational(Wiring w, int... terms) {
        Tangle t = terms.length % 2 == 1 ? zero(w) : infinite(w);
        for (int i = terms.length - 1; i >= 0; i--) {
            for (int k = Math.abs(terms[i]); k > 0; k--) {
                t.twist(Integer.signum(terms[i]), i % 2 == 0);
            }
        }
        return t;
    }

    private void twist(int sign, boolean atTheRight) {
        int c = wiring.crossing();
        int turn = sign > 0 ? 3 : 0;        // the under-strand is 0, 2: SW to NE for +1, NW to SE for -1
        int cnw = c | turn;
        int csw = c | (turn + 1 & 3);
        int cse = c | (turn + 2 & 3);
        int cne = c | (turn + 3 & 3);
        wiring.join(se, atTheRight ? csw : cne);
        wiring.join(atTheRight ? ne : sw, cnw);
        if (atTheRight) {
            ne = cne;
        } else {
            sw = csw;
        }
        se = cse;
    }

    /** Puts another tangle of the same wiring at the right of this one. */
    Tangle plus(Tangle right) {
        wiring.join(ne, right.nw);
        wiring.join(se, right.sw);
        return new Tangle(wiring, nw, right.ne, sw, right.se);
    }

    /** Joins the ends to others, as an inset in two parallel strands. */
    void fill(int toNorthWest, int toSouthWest, int toNorthEast, int toSouthEast) {
        wiring.join(nw, toNorthWest);
        wiring.join(sw, toSouthWest);
        wiring.join(ne, toNorthEast);
        wiring.join(se, toSouthEast);
    }

    /** Joins NW to NE and SW to SE. */
    void closeNumerator() {
        wiring.join(nw, ne);
        wiring.join(sw, se);
    }
}
