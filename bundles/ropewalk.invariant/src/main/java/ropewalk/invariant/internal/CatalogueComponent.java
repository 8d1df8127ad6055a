package ropewalk.invariant.internal;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ConcurrentMap;
import org.osgi.framework.Bundle;
import org.osgi.framework.Constants;
import org.osgi.framework.ServiceReference;
import org.osgi.framework.wiring.BundleWiring;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.osgi.service.component.annotations.ReferenceCardinality;
import org.osgi.service.component.annotations.ReferencePolicy;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.Method;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.invariant.catalogue.RankedMethod;

/** Offers the catalogue; follows the services as they come and go. */
@Component
public final class CatalogueComponent implements MethodCatalogue {

    private final ConcurrentMap<Long, RankedMethod> methods = new ConcurrentHashMap<>();
    private final ConcurrentMap<Long, Definition> definitions = new ConcurrentHashMap<>();
    private final Ordering ordering = new Ordering();

    /** The entries as they were put in order last; null after a change. */
    private volatile List<CatalogueEntry> current;

    record Definition(long order, Invariant<?> invariant, String origin) { }

    @Override
    public List<CatalogueEntry> entries() {
        List<CatalogueEntry> known = current;
        return known != null ? known : ordered();
    }

    private synchronized List<CatalogueEntry> ordered() {
        List<CatalogueEntry> entries = List.copyOf(ordering.entries(methods.values(), definitions.values()));
        current = entries;
        return entries;
    }

    private synchronized void changed() {
        current = null;
    }

    @Override
    public boolean isInstalled(RankedMethod method) {
        return methods.containsValue(method);
    }

    @Override
    public void setAside(RankedMethod method) {
        methods.values().remove(method);
        changed();
    }

    @Reference(cardinality = ReferenceCardinality.MULTIPLE, policy = ReferencePolicy.DYNAMIC)
    void addMethod(ServiceReference<Method<?>> reference, Method<?> method) {
        String id = text(reference, Method.ID);
        String invariant = text(reference, Method.INVARIANT);
        Bundle bundle = reference.getBundle();
        if (id == null || invariant == null) {
            System.err.println("ropewalk: " + bundle.getSymbolicName() + " registers a method without the property "
                    + (id == null ? Method.ID : Method.INVARIANT) + "; it is left out until its component names one");
            return;
        }
        int ranking = reference.getProperty(Constants.SERVICE_RANKING) instanceof Integer r ? r : 0;
        methods.put(serviceId(reference), new RankedMethod(id, invariant, method, ranking, bundle.getSymbolicName(),
                bundle.getVersion().toString(), bundle.adapt(BundleWiring.class).getClassLoader()));
        changed();
    }

    void removeMethod(ServiceReference<Method<?>> reference) {
        methods.remove(serviceId(reference));
        changed();
    }

    @Reference(cardinality = ReferenceCardinality.MULTIPLE, policy = ReferencePolicy.DYNAMIC)
    void addInvariant(ServiceReference<Invariant<?>> reference, Invariant<?> invariant) {
        Bundle bundle = reference.getBundle();
        Optional<String> fault = Definitions.fault(invariant);
        if (fault.isPresent()) {
            System.err.println("ropewalk: " + bundle.getSymbolicName() + " " + bundle.getVersion()
                    + " defines an invariant " + fault.get() + "; it is left out until that is changed");
            return;
        }
        definitions.put(serviceId(reference), new Definition(serviceId(reference), invariant,
                bundle.getSymbolicName() + " " + bundle.getVersion()));
        changed();
    }

    void removeInvariant(ServiceReference<Invariant<?>> reference) {
        definitions.remove(serviceId(reference));
        changed();
    }

    private static String text(ServiceReference<?> reference, String key) {
        return reference.getProperty(key) instanceof String s && !s.isBlank() ? s : null;
    }

    private static long serviceId(ServiceReference<?> reference) {
        return (Long) reference.getProperty(Constants.SERVICE_ID);
    }
}
