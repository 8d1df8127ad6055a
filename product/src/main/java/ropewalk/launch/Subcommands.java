package ropewalk.launch;

import java.util.Collection;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.ToIntFunction;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.Constants;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceReference;
import org.osgi.framework.wiring.BundleCapability;
import org.osgi.framework.wiring.BundleRevision;

/** The subcommands that started bundles offer as services. */
final class Subcommands {
    private static final String TYPE = ToIntFunction.class.getName();
    private static final long POLL_MILLIS = 10;

    private final BundleContext context;

    Subcommands(BundleContext context) {
        this.context = context;
    }

    /** What is offered now, by name; of two with one name the one with the higher service ranking. */
    Map<String, ServiceReference<?>> offered() {
        Map<String, ServiceReference<?>> offered = new TreeMap<>();
        try {
            ServiceReference<?>[] all = context.getAllServiceReferences(TYPE, "(ropewalk.subcommand=*)");
            for (ServiceReference<?> service : all == null ? new ServiceReference<?>[0] : all) {
                offered.merge(String.valueOf(service.getProperty("ropewalk.subcommand")), service,
                        (one, other) -> one.compareTo(other) > 0 ? one : other);
            }
        } catch (InvalidSyntaxException impossible) {
            throw new AssertionError(impossible);
        }
        return offered;
    }

    /**
     * Waits until a subcommand is offered. Returns at once when it is, or when every bundle that declares such a service
     * has registered one; otherwise gives a bundle time to, up to the limit.
     */
    Optional<ServiceReference<?>> await(String name, long limitMillis) throws InterruptedException {
        long end = System.nanoTime() + limitMillis * 1_000_000;
        while (true) {
            ServiceReference<?> service = offered().get(name);
            if (service != null || !pending() || System.nanoTime() > end) {
                return Optional.ofNullable(service);
            }
            Thread.sleep(POLL_MILLIS);
        }
    }

    /** Whether a started bundle that declares a subcommand has not registered it yet. */
    boolean pending() {
        for (Bundle bundle : context.getBundles()) {
            BundleRevision revision = bundle.adapt(BundleRevision.class);
            if (revision != null && bundle.getState() == Bundle.ACTIVE && declared(revision) > registered(bundle)) {
                return true;
            }
        }
        return false;
    }

    /** Runs a subcommand; empty when its service went away in the meantime. */
    Optional<Integer> run(ServiceReference<?> service, String[] arguments) {
        Object found = context.getService(service);
        if (found == null) {
            return Optional.empty();
        }
        try {
            @SuppressWarnings("unchecked")   // the contract of the property ropewalk.subcommand
            ToIntFunction<String[]> subcommand = (ToIntFunction<String[]>) found;
            return Optional.of(subcommand.applyAsInt(arguments));
        } finally {
            context.ungetService(service);
        }
    }

    private static int declared(BundleRevision revision) {
        int declared = 0;
        for (BundleCapability capability : revision.getDeclaredCapabilities("osgi.service")) {
            Object types = capability.getAttributes().get(Constants.OBJECTCLASS);
            if (TYPE.equals(types) || types instanceof Collection<?> several && several.contains(TYPE)) {
                declared++;
            }
        }
        return declared;
    }

    private static int registered(Bundle bundle) {
        ServiceReference<?>[] services = bundle.getRegisteredServices();
        int registered = 0;
        for (ServiceReference<?> service : services == null ? new ServiceReference<?>[0] : services) {
            for (String type : (String[]) service.getProperty(Constants.OBJECTCLASS)) {
                registered += type.equals(TYPE) ? 1 : 0;
            }
        }
        return registered;
    }
}
