package ropewalk.families;

/**
 * The generator splitmix64: a counter of step 0x9e3779b97f4a7c15, mixed (Steele, Lea, Flood 2014, "Fast splittable
 * pseudorandom number generators"; the mixing constants are Stafford's variant 13). Written out here because the same
 * seed must give the same diagrams on every machine and with every version of Java.
 */
final class SplitMix {

    private long state;

    SplitMix(long seed) {
        state = seed;
    }

    long next() {
        state += 0x9e3779b97f4a7c15L;
        long z = state;
        z = (z ^ (z >>> 30)) * 0xbf58476d1ce4e5b9L;
        z = (z ^ (z >>> 27)) * 0x94d049bb133111ebL;
        return z ^ (z >>> 31);
    }

    /** A number from 0 to bound - 1; the 32 upper bits scaled, so that none is likelier than another by over bound/2³². */
    int below(int bound) {
        return (int) ((next() >>> 32) * bound >>> 32);
    }

    boolean coin() {
        return next() < 0;
    }
}
