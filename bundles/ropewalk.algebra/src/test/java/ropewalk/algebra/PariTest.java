package ropewalk.algebra;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.fail;
import static org.junit.jupiter.api.Assumptions.abort;

import java.io.IOException;
import java.math.BigInteger;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import java.util.function.BiFunction;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/**
 * PARI/GP, if it is installed, as an outside reference on random matrices of ours. Without it the tests are aborted, or fail
 * with {@code -Dropewalk.pari=required}.
 */
class PariTest {
    private static final long SEED = 314159;
    private static final Runnable NONE = () -> { };

    @BeforeAll
    static void gpIsThere() {
        try {
            assertEquals(List.of("2"), answers("print(1+1);\n"));
        } catch (IOException e) {
            if ("required".equals(System.getProperty("ropewalk.pari"))) {
                fail("PARI/GP is required, but gp could not be started: " + e.getMessage() + "; install the package pari-gp");
            }
            abort("gp is not on the PATH; install the package pari-gp to compare with PARI/GP");
        }
    }

    private static List<String> answers(String input) throws IOException {
        Process gp = new ProcessBuilder("gp", "-q", "-s", "400M").redirectErrorStream(true).start();
        Thread writer = new Thread(() -> {
            try (var out = gp.getOutputStream()) {
                out.write(input.getBytes(StandardCharsets.US_ASCII));
            } catch (IOException e) {
                throw new java.io.UncheckedIOException("gp did not take its input", e);
            }
        });
        writer.start();
        List<String> lines = new String(gp.getInputStream().readAllBytes(), StandardCharsets.US_ASCII).lines().toList();
        try {
            writer.join();
            if (!gp.waitFor(60, TimeUnit.SECONDS)) {
                gp.destroy();
                throw new IOException("gp did not end");
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IOException("interrupted while waiting for gp", e);
        }
        return lines;
    }

    private static String text(IntegerMatrix m) {
        if (m.rows() == 0 || m.columns() == 0) {
            return "matrix(" + m.rows() + "," + m.columns() + ")";
        }
        StringBuilder text = new StringBuilder(m.rows() == 1 ? "Mat([" : "[");
        for (int i = 0; i < m.rows(); i++) {
            for (int j = 0; j < m.columns(); j++) {
                text.append(m.get(i, j)).append(j + 1 < m.columns() ? "," : i + 1 < m.rows() ? ";" : "]");
            }
        }
        return text + (m.rows() == 1 ? ")" : "");
    }

    private static void compare(List<IntegerMatrix> matrices, String expression, BiFunction<IntegerMatrix, String, String> ours)
        throws IOException {
        StringBuilder input = new StringBuilder();
        for (IntegerMatrix m : matrices) {
            input.append("m=").append(text(m)).append(";print(").append(expression).append(");\n");
        }
        List<String> lines = answers(input.toString());
        assertEquals(matrices.size(), lines.size(), () -> "gp said " + lines);
        for (int k = 0; k < lines.size(); k++) {
            int at = k;
            assertEquals(lines.get(k), ours.apply(matrices.get(k), lines.get(k)),
                () -> "seed " + SEED + ", matrix " + at + ": " + matrices.get(at));
        }
    }

    private static List<IntegerMatrix> squares() {
        Random random = new Random(SEED);
        List<IntegerMatrix> all = new ArrayList<>();
        for (int n : new int[] {1, 2, 5, 10, 15, 20, 30, 45, 60}) {
            all.add(Samples.any(n, n, 1, 9, random));
            all.add(Samples.any(n, n, 4.0 / n, 3, random));
            all.add(Samples.any(n, n, 0.5, 1 << 29, random));
            all.add(Samples.symmetric(n, 3.0 / n, 2, random));
            all.add(Samples.ofRank(n, n, n - n / 4, random));
        }
        for (int side = 3; side < 13; side += 2) {
            all.add(Samples.planarLaplacian(side, random, false));
            all.add(Samples.planarLaplacian(side, random, true));
            all.add(Samples.colouring(side, random));
        }
        return all;
    }

    private static List<IntegerMatrix> adversaries(int from, int... sizes) {
        Random random = new Random(SEED);
        List<IntegerMatrix> all = new ArrayList<>();
        for (int kind = from; kind < Adversaries.KINDS; kind++) {
            for (int n : sizes) {
                all.add(Adversaries.square(kind, n, random));
            }
        }
        return all;
    }

    @Test
    void determinants() throws IOException {
        List<IntegerMatrix> all = squares();
        all.addAll(adversaries(0, 27, 50));
        compare(all, "matdet(m)", (m, theirs) -> Determinant.of(m, NONE).toString());
    }

    @Test
    void ranks() throws IOException {
        Random random = new Random(SEED);
        List<IntegerMatrix> all = new ArrayList<>(squares());
        for (int c = 0; c < 40; c++) {
            all.add(Samples.ofRank(1 + random.nextInt(60), 1 + random.nextInt(60), random.nextInt(40), random));
        }
        all.addAll(adversaries(0, 33, 40));
        compare(all, "matrank(m)", (m, theirs) -> Integer.toString(Rank.of(m, NONE)));
    }

    @Test
    void ranksModuloPrimes() throws IOException {
        for (int p : new int[] {2, 3, 7, 101}) {
            compare(squares(), "matrank(m*Mod(1," + p + "))", (m, theirs) -> Integer.toString(Rank.modulo(m, p, NONE)));
        }
    }

    @Test
    void invariantFactors() throws IOException {
        List<IntegerMatrix> all = new ArrayList<>(squares());
        Random random = new Random(SEED);
        for (int c = 0; c < 30; c++) {
            int n = 5 + random.nextInt(40);
            all.add(Samples.ofRank(n, n, n - random.nextInt(4), random));
            all.add(Samples.any(n, n, 2.5 / n, 6, random));
        }
        all.addAll(adversaries(0, 10, 21));
        compare(all, "matsnf(m)", (m, theirs) -> {
            List<BigInteger> factors = new ArrayList<>(InvariantFactors.of(m, NONE));
            while (factors.size() < m.columns()) {
                factors.add(0, BigInteger.ONE);
            }
            // gp lists the zeros first, then the factors descending.
            List<BigInteger> zerosFirst = new ArrayList<>();
            for (int k = factors.size() - 1; k >= 0; k--) {
                zerosFirst.add(factors.get(k));
            }
            return zerosFirst.toString();
        });
    }

    @Test
    void inertias() throws IOException {
        Random random = new Random(SEED);
        List<IntegerMatrix> all = new ArrayList<>();
        for (int n : new int[] {1, 2, 5, 10, 20, 40, 60}) {
            for (int c = 0; c < 6; c++) {
                all.add(Samples.symmetric(n, (1.0 + c) / n, 1 + c, random));
            }
        }
        for (int side = 3; side < 13; side++) {
            all.add(Samples.planarLaplacian(side, random, false));
        }
        all.addAll(adversaries(10, 25, 26, 32, 40));
        compare(all, "qfsign(m)", (m, theirs) -> {
            Inertia inertia = Inertia.of(m, NONE);
            assertEquals(m.rows(), inertia.positive() + inertia.negative() + inertia.zero());
            return Arrays.toString(new int[] {inertia.positive(), inertia.negative()});
        });
    }
}
