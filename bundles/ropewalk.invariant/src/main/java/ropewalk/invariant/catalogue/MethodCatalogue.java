package ropewalk.invariant.catalogue;

import java.util.List;
import org.osgi.annotation.versioning.ProviderType;

/** The installed invariants and their methods. A service; thread-safe. */
@ProviderType
public interface MethodCatalogue {

    /**
     * The invariants that are defined or measured by somebody: the standard ones in the order of the results table,
     * then the others by id.
     *
     * @return the entries as they are now; the same list as before while nothing has come or gone
     */
    List<CatalogueEntry> entries();

    /**
     * Whether a method is still there.
     *
     * @param method a method that was listed before
     * @return false once its bundle was stopped or removed
     */
    boolean isInstalled(RankedMethod method);

    /**
     * Leaves a method out of {@link #entries} from now on, because it hangs; until its service comes anew.
     *
     * @param method a method that was listed before
     */
    void setAside(RankedMethod method);
}
