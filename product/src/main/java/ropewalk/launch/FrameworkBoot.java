package ropewalk.launch;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.ServiceLoader;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleException;
import org.osgi.framework.Constants;
import org.osgi.framework.launch.Framework;
import org.osgi.framework.launch.FrameworkFactory;
import org.osgi.framework.wiring.BundleRevision;
import org.osgi.framework.wiring.FrameworkWiring;

/** The embedded framework with the product's bundles. */
final class FrameworkBoot implements AutoCloseable {
    private static final long STOP_MILLIS = 10_000;

    private final Framework framework;
    private final List<Bundle> installed = new ArrayList<>();

    private FrameworkBoot(Framework framework) {
        this.framework = framework;
    }

    /**
     * Starts an empty framework.
     *
     * @param storage an empty folder of this process alone
     * @param properties what bundles can read with {@code BundleContext.getProperty}
     */
    static FrameworkBoot open(Path storage, Map<String, String> properties) throws BundleException {
        Map<String, String> configuration = new HashMap<>(properties);
        configuration.put(Constants.FRAMEWORK_STORAGE, storage.toString());
        configuration.put("felix.log.level", "1");
        // The component runtime would print the stack traces of failed components; Components tells them in a line each.
        configuration.put("ds.loglevel", "0");
        Framework framework = ServiceLoader.load(FrameworkFactory.class).findFirst().orElseThrow()
                .newFramework(configuration);
        framework.start();
        return new FrameworkBoot(framework);
    }

    BundleContext context() {
        return framework.getBundleContext();
    }

    /** Installs a jar of the product where it lies, without a copy. */
    void install(Path jar) throws Refusal {
        // Felix decodes the address like a form field, where a plus sign means a blank.
        String location = "reference:" + jar.toUri().toString().replace("+", "%2B");
        try {
            installed.add(context().installBundle(location));
        } catch (BundleException fault) {
            throw new Refusal(Refusal.BROKEN,
                    jar + " cannot be read (" + Console.reason(fault) + "); unpack or build the product again");
        }
    }

    /** Installs a jar that the user named; a fault in it ends the run, since its results would lack what was asked for. */
    void installGuest(Path jar) throws Refusal {
        String fault = GuestJar.fault(jar).orElse(null);
        if (fault != null) {
            throw new Refusal(Refusal.USAGE, "--guest " + jar + " " + fault);
        }
        Bundle bundle;
        try (InputStream bytes = Files.newInputStream(jar)) {
            bundle = context().installBundle("guest:" + jar.toAbsolutePath(), bytes);
        } catch (IOException | BundleException wrong) {
            throw new Refusal(Refusal.USAGE, "--guest " + jar + " " + GuestJar.words(wrong));
        }
        try {
            start(bundle);
        } catch (BundleException wrong) {
            throw new Refusal(Refusal.USAGE, "--guest " + jar + " " + GuestJar.words(wrong, bundle, context()));
        }
    }

    /** Resolves what is installed, all at once, and starts it; one line for each bundle that cannot be started. */
    void startInstalled() {
        framework.adapt(FrameworkWiring.class).resolveBundles(null);
        for (Bundle bundle : installed) {
            try {
                start(bundle);
            } catch (BundleException fault) {
                Console.line("bundle " + bundle.getSymbolicName() + " " + GuestJar.words(fault, bundle, context()));
            }
        }
    }

    /** Starts a bundle, if it is one that can be started. */
    static void start(Bundle bundle) throws BundleException {
        boolean fragment = (bundle.adapt(BundleRevision.class).getTypes() & BundleRevision.TYPE_FRAGMENT) != 0;
        if (!fragment) {
            bundle.start(Bundle.START_ACTIVATION_POLICY);
        }
    }

    /** Stops the framework and waits for it. */
    @Override
    public void close() throws BundleException {
        framework.stop();
        try {
            framework.waitForStop(STOP_MILLIS);
        } catch (InterruptedException wish) {
            Thread.currentThread().interrupt();   // somebody wants the process to end now: leave the rest to its exit
        }
    }
}
