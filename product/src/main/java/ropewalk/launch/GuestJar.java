package ropewalk.launch;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.jar.JarFile;
import java.util.jar.Manifest;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleException;
import org.osgi.framework.Constants;

/** What can be wrong with somebody's jar, in words that follow its name: what it is, and what to do. */
final class GuestJar {
    private GuestJar() { }

    /** Why a file cannot be a bundle, or empty if it can be tried. */
    static Optional<String> fault(Path jar) {
        if (!Files.exists(jar)) {
            return Optional.of("does not exist; give the path of a jar");
        }
        try (JarFile file = new JarFile(jar.toFile())) {
            Manifest manifest = file.getManifest();
            String name = manifest == null ? null : manifest.getMainAttributes().getValue(Constants.BUNDLE_SYMBOLICNAME);
            if (name == null || name.isBlank()) {
                return Optional.of("is no bundle: its manifest lacks " + Constants.BUNDLE_SYMBOLICNAME
                        + "; build it as an OSGi bundle");
            }
            return Optional.empty();
        } catch (IOException unreadable) {
            return Optional.of("cannot be read: " + Console.reason(unreadable) + "; copy it again, or remove it");
        }
    }

    /** Why a jar could not be installed. */
    static String words(Exception fault) {
        if (fault instanceof BundleException refused && refused.getType() == BundleException.DUPLICATE_BUNDLE_ERROR) {
            return "is left out: a bundle of its name and version is there already; remove one of the two";
        }
        return "cannot be read: " + Console.reason(fault) + "; copy it again, or remove it";
    }

    /** Why an installed bundle could not be started. */
    static String words(BundleException fault, Bundle bundle, BundleContext system) {
        if (fault.getType() == BundleException.RESOLVE_ERROR) {
            return "cannot be started: " + new Unmet(system).requirement(bundle)
                    .map(need -> "it needs " + need + ", which nothing here offers; add a bundle that does, or remove it")
                    .orElseGet(() -> Console.reason(fault));
        }
        Throwable cause = fault.getCause() == null ? fault : fault.getCause();
        return "cannot be started: " + Console.reason(cause) + "; ask its author";
    }
}
