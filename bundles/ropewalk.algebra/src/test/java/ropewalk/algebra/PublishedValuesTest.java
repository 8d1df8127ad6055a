package ropewalk.algebra;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.math.BigInteger;
import java.util.stream.Collectors;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** Values of the literature; the table names the source of each. */
class PublishedValuesTest {
    private static final Runnable NONE = () -> { };

    @ParameterizedTest(name = "{0} {1}: {2}")
    @CsvFileSource(resources = "published.csv", numLinesToSkip = 1)
    void published(String family, int size, String quantity, String expected, String source) {
        assertFalse(source.isBlank());
        IntegerMatrix m = matrix(family, size);
        String value = switch (quantity) {
            case "determinant" -> Determinant.of(m, NONE).toString();
            case "factors" -> InvariantFactors.of(m, NONE).stream().map(BigInteger::toString).collect(Collectors.joining(" "));
            case "inertia" -> {
                Inertia inertia = Inertia.of(m, NONE);
                yield inertia.positive() + " " + inertia.negative() + " " + inertia.zero();
            }
            default -> throw new IllegalArgumentException(quantity);
        };
        assertEquals(expected, value, source);
    }

    private static IntegerMatrix matrix(String family, int n) {
        return switch (family) {
            case "wheel" -> laplacian(n + 1, (i, j) -> i == n || j == n || Math.floorMod(i - j, n) == 1 || Math.floorMod(j - i, n) == 1);
            case "complete" -> laplacian(n, (i, j) -> true);
            case "grid" -> laplacian(n * n, (i, j) -> Math.abs(i / n - j / n) + Math.abs(i % n - j % n) == 1);
            case "cube" -> laplacian(1 << n, (i, j) -> Integer.bitCount(i ^ j) == 1);
            case "gcd" -> symmetric(n, (i, j) -> BigInteger.valueOf(i + 1).gcd(BigInteger.valueOf(j + 1)).longValue());
            case "adjacency.complete" -> symmetric(n, (i, j) -> i == j ? 0 : 1);
            case "adjacency.path" -> symmetric(n, (i, j) -> Math.abs(i - j) == 1 ? 1 : 0);
            default -> throw new IllegalArgumentException(family);
        };
    }

    private interface Adjacent {
        boolean test(int i, int j);
    }

    private interface Value {
        long at(int i, int j);
    }

    private static IntegerMatrix symmetric(int n, Value value) {
        IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                long v = value.at(i, j);
                if (v != 0) {
                    builder.add(i, j, v);
                }
            }
        }
        return builder.build();
    }

    /** The Laplacian without the last vertex. */
    private static IntegerMatrix laplacian(int n, Adjacent adjacent) {
        IntegerMatrix.Builder builder = IntegerMatrix.builder(n, n);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < i; j++) {
                if (adjacent.test(i, j)) {
                    builder.add(i, j, -1).add(j, i, -1).add(i, i, 1).add(j, j, 1);
                }
            }
        }
        return builder.build().without(n - 1, n - 1);
    }
}
