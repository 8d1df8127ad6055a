package ropewalk.invariant.chessboard.internal;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/** Invariant factors of a direct sum of finitely generated abelian groups. */
final class DirectSum {

    private DirectSum() {
    }

    /**
     * Brings a sum of cyclic groups to invariant factors: Z/a ⊕ Z/b = Z/gcd ⊕ Z/lcm, pair by pair until each divides
     * the next.
     *
     * @param free how many further summands Z
     */
    static List<BigInteger> of(List<BigInteger> left, List<BigInteger> right, int free) {
        List<BigInteger> finite = new ArrayList<>();
        int zeros = free;
        for (List<BigInteger> part : List.of(left, right)) {
            for (BigInteger d : part) {
                if (d.signum() == 0) {
                    zeros++;
                } else {
                    finite.add(d);
                }
            }
        }
        for (int i = 0; i < finite.size(); i++) {
            for (int j = i + 1; j < finite.size(); j++) {
                BigInteger gcd = finite.get(i).gcd(finite.get(j));
                finite.set(j, finite.get(i).divide(gcd).multiply(finite.get(j)));
                finite.set(i, gcd);
            }
        }
        finite.removeIf(BigInteger.ONE::equals);
        for (int i = 0; i < zeros; i++) {
            finite.add(BigInteger.ZERO);
        }
        return finite;
    }
}
