package ropewalk.survey.internal;

import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;

/** The methods that hung once in this survey and are not asked again. */
final class Benches {

    private final Set<String> benched = ConcurrentHashMap.newKeySet();

    boolean holds(String task) {
        return !benched.isEmpty() && benched.contains(task);
    }

    /** Whether this is the first time. */
    boolean add(String task) {
        return benched.add(task);
    }
}
