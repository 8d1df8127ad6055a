package ropewalk.algebra.internal;

import java.util.Arrays;

/**
 * Things 0 … n-1 in lists by a small key, first in, first out within a key. First out, because the pivots of an elimination
 * then come in rounds over the whole matrix (J. W. H. Liu's multiple minimum degree, ACM TOMS 11 (1985) 141–153), which keeps
 * the elimination tree shallow.
 */
final class Queue {
    private final int[] next;
    private final int[] before;
    private final int[] key;
    private int[] first;
    private int[] last;
    private int least;

    Queue(int things) {
        next = new int[things];
        before = new int[things];
        key = new int[things];
        Arrays.fill(key, -1);
        first = new int[16];
        last = new int[16];
        Arrays.fill(first, -1);
        Arrays.fill(last, -1);
    }

    /** Puts a thing at the end of the list of a key, taking it from where it was. */
    void put(int thing, int newKey) {
        remove(thing);
        if (newKey >= first.length) {
            int old = first.length;
            int length = Math.max(newKey + 1, 2 * old);
            first = Arrays.copyOf(first, length);
            last = Arrays.copyOf(last, length);
            Arrays.fill(first, old, length, -1);
            Arrays.fill(last, old, length, -1);
        }
        key[thing] = newKey;
        next[thing] = -1;
        before[thing] = last[newKey];
        if (last[newKey] < 0) {
            first[newKey] = thing;
        } else {
            next[last[newKey]] = thing;
        }
        last[newKey] = thing;
        least = Math.min(least, newKey);
    }

    void remove(int thing) {
        int k = key[thing];
        if (k < 0) {
            return;
        }
        key[thing] = -1;
        int b = before[thing];
        int n = next[thing];
        if (b < 0) {
            first[k] = n;
        } else {
            next[b] = n;
        }
        if (n < 0) {
            last[k] = b;
        } else {
            before[n] = b;
        }
    }

    /** The least key in use, or the number of keys if nothing is left. */
    int leastKey() {
        while (least < first.length && first[least] < 0) {
            least++;
        }
        return least;
    }

    /** One more than the largest key ever used, at least. */
    int keys() {
        return first.length;
    }

    /** The first thing with a key, or -1. */
    int first(int k) {
        return k < first.length ? first[k] : -1;
    }

    /** The thing after another with the same key, or -1. */
    int after(int thing) {
        return next[thing];
    }
}
