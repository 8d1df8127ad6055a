package ropewalk.invariant.internal;

import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;
import ropewalk.invariant.Invariant;

/** What a definition must have before anything may rely on it. */
final class Definitions {

    /** Columns of results.csv that are no invariants. */
    private static final Set<String> TAKEN = Set.of("name", "notation", "components", "crossings", "verdict", "pieces",
            "apart", "together", "evidence", "seconds");
    private static final Pattern ID = Pattern.compile("[a-z0-9]+(\\.[a-z0-9]+)*");

    private Definitions() {
    }

    /** What is wrong with a definition, in words that follow "an invariant"; asks everything once, so it may not throw. */
    static Optional<String> fault(Invariant<?> invariant) {
        try {
            String id = invariant.id();
            if (id == null || !ID.matcher(id).matches()) {
                return Optional.of("with the id '" + id + "'; an id is made of lower case letters, digits and dots");
            }
            if (TAKEN.contains(id)) {
                return Optional.of("with the id '" + id + "', which is another column of results.csv; put your group's "
                        + "name and a dot before it");
            }
            if (invariant.title() == null || invariant.definition() == null || invariant.valueType() == null
                    || invariant.splitLaw() == null || invariant.underMirrorImage() == null
                    || invariant.underReversal() == null) {
                return Optional.of("'" + id + "' with null for its title, definition, value type, law or symmetries; "
                        + "give Optional.empty() where there is none");
            }
            return Optional.empty();
        } catch (Throwable e) {         // somebody else's code
            return Optional.of("that breaks when it is asked: " + e);
        }
    }
}
