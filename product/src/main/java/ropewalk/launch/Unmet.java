package ropewalk.launch;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.Constants;
import org.osgi.framework.namespace.PackageNamespace;
import org.osgi.framework.wiring.BundleRequirement;
import org.osgi.framework.wiring.BundleRevision;
import org.osgi.framework.wiring.FrameworkWiring;

/** What a bundle needs and does not find, in words, read from what the bundles themselves declare. */
final class Unmet {
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

    private static String words(BundleRequirement need) {
        String filter = need.getDirectives().getOrDefault(Constants.FILTER_DIRECTIVE, "");
        if (!need.getNamespace().equals(PackageNamespace.PACKAGE_NAMESPACE)) {
            return need.getNamespace() + " " + filter;
        }
        Matcher name = Pattern.compile(Pattern.quote(PackageNamespace.PACKAGE_NAMESPACE) + "=([^)]*)").matcher(filter);
        return filter.contains("version") || !name.find() ? "package " + filter : "package " + name.group(1);
    }
}
