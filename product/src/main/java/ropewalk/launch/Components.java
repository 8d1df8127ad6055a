package ropewalk.launch;

import java.lang.reflect.Array;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.ServiceReference;

/**
 * What the component runtime says of components that do not work: which wait for a service, and which could not be
 * made. Its type comes with its bundle, which may not be started, and is not shared with the launcher; so its public
 * methods and fields (OSGi Compendium 8.1, 112.6) are called by name.
 */
final class Components {
    private static final String RUNTIME = "org.osgi.service.component.runtime.ServiceComponentRuntime";
    private static final int UNSATISFIED_CONFIGURATION = 1;
    private static final int UNSATISFIED_REFERENCE = 2;
    private static final int FAILED_ACTIVATION = 16;

    private final BundleContext system;

    Components(BundleContext system) {
        this.system = system;
    }

    /** Components that could not be made when they were asked for, each with its reason; a few milliseconds. */
    List<String> failed() {
        return tell(FAILED_ACTIVATION);
    }

    /** Components that wait for something, each with what it waits for. */
    List<String> waiting() {
        return tell(UNSATISFIED_CONFIGURATION | UNSATISFIED_REFERENCE);
    }

    private List<String> tell(int states) {
        List<String> told = new ArrayList<>();
        ServiceReference<?> reference = system.getServiceReference(RUNTIME);
        if (reference == null) {
            return told;
        }
        Object runtime = system.getService(reference);
        try {
            Class<?> type = runtime.getClass().getClassLoader().loadClass(RUNTIME);
            Class<?> descriptionType = type.getClassLoader().loadClass(
                    "org.osgi.service.component.runtime.dto.ComponentDescriptionDTO");
            Object all = type.getMethod("getComponentDescriptionDTOs", Bundle[].class)
                    .invoke(runtime, (Object) new Bundle[0]);
            for (Object description : (Collection<?>) all) {
                Object configurations = type.getMethod("getComponentConfigurationDTOs", descriptionType)
                        .invoke(runtime, description);
                for (Object configuration : (Collection<?>) configurations) {
                    int state = (int) field(configuration, "state");
                    if ((state & states) != 0) {
                        told.add(words(description, configuration, state));
                    }
                }
            }
        } catch (ReflectiveOperationException strange) {
            told.add("components cannot be looked at: " + strange);
        } finally {
            system.ungetService(reference);
        }
        return told;
    }

    private static String words(Object description, Object configuration, int state) throws ReflectiveOperationException {
        String who = "component " + field(description, "name") + " of " + field(field(description, "bundle"), "symbolicName");
        if (state == FAILED_ACTIVATION) {
            return who + " could not be made: " + reason(String.valueOf(field(configuration, "failure")));
        }
        if (state == UNSATISFIED_CONFIGURATION) {
            return who + " waits for its configuration";
        }
        List<String> missing = new ArrayList<>();
        Object references = field(configuration, "unsatisfiedReferences");
        for (int at = 0; at < Array.getLength(references); at++) {
            missing.add(interfaceOf(description, String.valueOf(field(Array.get(references, at), "name"))));
        }
        return who + " waits for " + String.join(" and ", missing);
    }

    private static String interfaceOf(Object description, String reference) throws ReflectiveOperationException {
        Object declared = field(description, "references");
        for (int at = 0; at < Array.getLength(declared); at++) {
            if (reference.equals(field(Array.get(declared, at), "name"))) {
                return String.valueOf(field(Array.get(declared, at), "interfaceName"));
            }
        }
        return reference;
    }

    /** The innermost cause in a printed stack trace. */
    private static String reason(String trace) {
        String first = trace.lines().findFirst().orElse("no reason given");
        return trace.lines().filter(line -> line.startsWith("Caused by: ")).reduce((outer, inner) -> inner)
                .map(line -> line.substring("Caused by: ".length())).orElse(first);
    }

    private static Object field(Object of, String name) throws ReflectiveOperationException {
        return of.getClass().getField(name).get(of);
    }
}
