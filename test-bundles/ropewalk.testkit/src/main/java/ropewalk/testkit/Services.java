package ropewalk.testkit;

import java.time.Duration;
import java.util.function.BooleanSupplier;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.Filter;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.util.tracker.ServiceTracker;

/** Waits, with a bound, for what a framework does in its own time. */
public final class Services {
    private static final Duration LIMIT = Duration.ofSeconds(60);

    private final BundleContext context;

    /**
     * Services as a test class sees them.
     *
     * @param testClass a class that was loaded from a started bundle
     */
    public Services(Class<?> testClass) {
        Bundle bundle = FrameworkUtil.getBundle(testClass);
        if (bundle == null) {
            throw new IllegalStateException(testClass + " was not loaded from a bundle; is " + "ropewalk.test.bundle"
                    + " set in the module's pom?");
        }
        context = bundle.getBundleContext();
    }

    /**
     * The bundle context of the test bundle.
     *
     * @return the context
     */
    public BundleContext context() {
        return context;
    }

    /**
     * Waits for a service.
     *
     * @param <S> its type
     * @param type its type
     * @param properties a filter over its properties, such as {@code (ropewalk.method=x)}, or the empty text for any
     * @return the service
     * @throws AssertionError when none comes within a minute; the message names the bundles that are not active
     */
    public <S> S await(Class<S> type, String properties) {
        try {
            Filter filter = context.createFilter("(&(objectClass=" + type.getName() + ")" + properties + ")");
            // The tracker stays open as long as the test bundle runs: a component that nobody holds any more is taken
            // down, and the test would go on with an object whose references have been taken away.
            ServiceTracker<S, S> tracker = new ServiceTracker<>(context, filter, null);
            tracker.open();
            S service = tracker.waitForService(LIMIT.toMillis());
            if (service == null) {
                tracker.close();
                throw new AssertionError("no service " + filter + " within " + LIMIT.toSeconds() + " s; " + states());
            }
            return service;
        } catch (InvalidSyntaxException wrong) {
            throw new IllegalArgumentException("not a filter: " + properties, wrong);
        } catch (InterruptedException stop) {
            Thread.currentThread().interrupt();
            throw new AssertionError("interrupted while waiting for " + type.getName(), stop);
        }
    }

    /**
     * An installed bundle.
     *
     * @param symbolicName its name
     * @return the bundle
     * @throws AssertionError when there is none of this name
     */
    public Bundle bundle(String symbolicName) {
        for (Bundle bundle : context.getBundles()) {
            if (symbolicName.equals(bundle.getSymbolicName())) {
                return bundle;
            }
        }
        throw new AssertionError("no bundle " + symbolicName + "; is it a dependency of the test module? " + states());
    }

    /**
     * Waits until something holds.
     *
     * @param what it in words, for the message
     * @param holds asked every 20 ms
     * @throws AssertionError when it does not hold within a minute
     */
    public static void until(String what, BooleanSupplier holds) {
        long end = System.nanoTime() + LIMIT.toNanos();
        while (!holds.getAsBoolean()) {
            if (System.nanoTime() > end) {
                throw new AssertionError("not within " + LIMIT.toSeconds() + " s: " + what);
            }
            try {
                Thread.sleep(20);
            } catch (InterruptedException stop) {
                Thread.currentThread().interrupt();
                throw new AssertionError("interrupted while waiting until " + what, stop);
            }
        }
    }

    private String states() {
        StringBuilder states = new StringBuilder("bundles not active:");
        for (Bundle bundle : context.getBundles()) {
            if (bundle.getState() != Bundle.ACTIVE) {
                states.append(' ').append(bundle.getSymbolicName());
            }
        }
        return states.toString();
    }
}
