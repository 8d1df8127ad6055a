package ropewalk.invariant.chessboard.internal;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** Invariant factors of a direct sum of cyclic groups. */
final class DirectSum {

    private DirectSum() {
    }

    /**
     * Brings a sum of cyclic groups to invariant factors: Z/a ⊕ Z/b = Z/gcd ⊕ Z/lcm, pair by pair until each divides
     * the next. O(m²) for m finite summands.
     *
     * @param orders of the summands, 0 for Z
     * @param free how many further summands Z
     * @param checkpoint called now and then; may throw to end the work
     */
    static List<BigInteger> of(List<BigInteger> orders, int free, Runnable checkpoint) {
        List<BigInteger> finite = new ArrayList<>();
        for (BigInteger d : orders) {
            if (d.signum() != 0) {
                finite.add(d);
            }
        }
        int zeros = orders.size() - finite.size() + free;
        for (int i = 0; i < finite.size(); i++) {
            if (i > 0 && (i & 15) == 0) {
                checkpoint.run();
            }
            for (int j = i + 1; j < finite.size(); j++) {
                BigInteger low = finite.get(i);
                BigInteger high = finite.get(j);
                if (!low.equals(high)) {
                    BigInteger gcd = low.gcd(high);
                    finite.set(j, low.divide(gcd).multiply(high));
                    finite.set(i, gcd);
                }
            }
        }
        finite.removeIf(BigInteger.ONE::equals);
        finite.addAll(Collections.nCopies(zeros, BigInteger.ZERO));
        return finite;
    }
}
