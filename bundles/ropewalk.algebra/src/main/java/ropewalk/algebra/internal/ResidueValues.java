package ropewalk.algebra.internal;

import java.math.BigInteger;

/** Values modulo a number that need not be prime. */
interface ResidueValues extends PlaceValues {
    /** The residue at a place, at least 0. */
    BigInteger get(int place);

    /** Values modulo a number above 1, in the shortest arithmetic that suffices. */
    static ResidueValues of(ropewalk.algebra.IntegerMatrix matrix, BigInteger modulus) {
        return modulus.bitLength() <= 50 && modulus.bitLength() > 0 && modulus.longValue() < 1L << 50
            ? new UnitValues(matrix, modulus.longValue()) : new BigUnitValues(matrix, modulus);
    }
}
