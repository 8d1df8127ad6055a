package ropewalk.launch;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.Constants;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.namespace.PackageNamespace;
import org.osgi.framework.wiring.BundleRequirement;
import org.osgi.framework.wiring.BundleRevision;
import org.osgi.framework.wiring.FrameworkWiring;

/**
 * What a bundle needs and does not find, in words. Everything is read from the bundles' own declarations: the packages
 * they import, and the services that their mandatory component references ask for (the build writes both into the
 * manifest), so that no type of the component runtime is needed here.
 */
final class Unmet {
    private static final String SERVICE = "osgi.service";
    private static final Pattern OBJECT_CLASS = Pattern.compile("objectClass=([\\w.$]+)");

    private final BundleContext system;

    Unmet(BundleContext system) {
        this.system = system;
    }

    /** The first import or other requirement of an unresolved bundle that nothing here meets, or empty if each is met. */
    Optional<String> requirement(Bundle bundle) {
        FrameworkWiring wiring = system.getBundle().adapt(FrameworkWiring.class);
        for (BundleRequirement need : bundle.adapt(BundleRevision.class).getDeclaredRequirements(null)) {
            boolean optional = Constants.RESOLUTION_OPTIONAL.equals(need.getDirectives().get(Constants.RESOLUTION_DIRECTIVE));
            boolean active = Constants.EFFECTIVE_ACTIVE.equals(need.getDirectives().get(Constants.EFFECTIVE_DIRECTIVE));
            if (!optional && !active && wiring.findProviders(need).isEmpty()) {
                return Optional.of(words(need));
            }
        }
        return Optional.empty();
    }

    /** The service types that started bundles wait for, as {@code BUNDLE waits for SERVICE}. */
    List<String> services() {
        List<String> waiting = new ArrayList<>();
        for (Bundle bundle : system.getBundles()) {
            BundleRevision revision = bundle.adapt(BundleRevision.class);
            if (revision == null || bundle.getState() != Bundle.ACTIVE) {
                continue;
            }
            for (BundleRequirement need : revision.getDeclaredRequirements(SERVICE)) {
                String filter = need.getDirectives().get(Constants.FILTER_DIRECTIVE);
                boolean optional = Constants.RESOLUTION_OPTIONAL.equals(need.getDirectives().get(Constants.RESOLUTION_DIRECTIVE));
                if (filter != null && !optional && !offered(filter)) {
                    Matcher type = OBJECT_CLASS.matcher(filter);
                    waiting.add(bundle.getSymbolicName() + " waits for service " + (type.find() ? type.group(1) : filter));
                }
            }
        }
        return waiting;
    }

    private boolean offered(String filter) {
        try {
            return system.getAllServiceReferences(null, filter) != null;
        } catch (InvalidSyntaxException wrong) {
            return false;   // a filter that nobody can read is met by nobody: it is shown to the user as it stands
        }
    }

    private static String words(BundleRequirement need) {
        String filter = need.getDirectives().getOrDefault(Constants.FILTER_DIRECTIVE, "");
        if (!need.getNamespace().equals(PackageNamespace.PACKAGE_NAMESPACE)) {
            return need.getNamespace() + " " + filter;
        }
        Matcher name = Pattern.compile(Pattern.quote(PackageNamespace.PACKAGE_NAMESPACE) + "=([^)]*)").matcher(filter);
        return filter.contains("version") || !name.find() ? "package " + filter : "package " + name.group(1);
    }
}
