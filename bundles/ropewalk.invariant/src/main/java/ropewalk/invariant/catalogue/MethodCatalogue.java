package ropewalk.invariant.catalogue;

import java.util.List;
import org.osgi.annotation.versioning.ProviderType;

/** The installed invariants and their methods. A service; what it returns is a snapshot. */
@ProviderType
public interface MethodCatalogue {

    /**
     * The invariants that are defined or measured by somebody: the standard ones in the order of the results table,
     * then the others by id.
     *
     * @return the entries
     */
    List<CatalogueEntry> entries();
}
