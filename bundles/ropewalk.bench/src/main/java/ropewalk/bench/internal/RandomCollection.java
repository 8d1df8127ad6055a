package ropewalk.bench.internal;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import ropewalk.families.RandomPlaneDiagrams;

/** Writes a collection of random plane diagrams of 12 to 16 crossings, the same for one seed on every machine. */
final class RandomCollection {

    private static final int FEWEST = 12;
    private static final int MOST = 16;

    private RandomCollection() {
    }

    static void write(Path file, int links, long seed) throws IOException {
        RandomPlaneDiagrams diagrams = new RandomPlaneDiagrams(seed);
        byte[] row = new byte[64 + RandomPlaneDiagrams.planarRoom(MOST)];
        try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(file), 1 << 16)) {
            out.write("name,notation,code\r\n".getBytes(StandardCharsets.US_ASCII));
            for (int i = 0; i < links; i++) {
                int crossings = FEWEST + Math.floorMod(mixed(seed + i), MOST - FEWEST + 1);
                byte[] head = ("plane-" + crossings + "-" + (i + 1) + ",planar,\"").getBytes(StandardCharsets.US_ASCII);
                System.arraycopy(head, 0, row, 0, head.length);
                int end = diagrams.nextPlanar(crossings, row, head.length);
                row[end++] = '"';
                row[end++] = '\r';
                row[end++] = '\n';
                out.write(row, 0, end);
            }
        }
    }

    /** Spreads consecutive numbers (the finaliser of splitmix64: Steele, Lea, Flood 2014). */
    private static int mixed(long x) {
        long z = (x ^ x >>> 30) * 0xbf58476d1ce4e5b9L;
        z = (z ^ z >>> 27) * 0x94d049bb133111ebL;
        return (int) (z >>> 32);
    }
}
