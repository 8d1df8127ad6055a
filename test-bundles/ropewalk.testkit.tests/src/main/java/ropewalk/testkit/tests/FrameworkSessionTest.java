package ropewalk.testkit.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleException;
import org.osgi.framework.FrameworkUtil;
import ropewalk.testkit.Services;
import ropewalk.testkit.SmallBundle;

class FrameworkSessionTest {
    private final Services services = new Services(FrameworkSessionTest.class);

    @Test
    void testClassesComeFromTheBundle() {
        assertEquals("ropewalk.testkit.tests", FrameworkUtil.getBundle(getClass()).getSymbolicName());
    }

    @ParameterizedTest
    @ValueSource(strings = {"round", "up"})
    void componentsAreFoundAsServices(String word) {
        assertEquals(word + " " + word, services.<UnaryOperator<String>>await(typed(), "(kind=echo)").apply(word));
    }

    @Test
    void serviceGoesAndComesWithTheComponentRuntime() throws BundleException {
        Bundle runtime = services.bundle("org.apache.felix.scr");
        assertNotNull(services.await(UnaryOperator.class, "(kind=echo)"));
        runtime.stop();
        try {
            Services.until("the service has gone", () -> services.context().getServiceReference(UnaryOperator.class) == null);
        } finally {
            runtime.start();
        }
        assertNotNull(services.await(UnaryOperator.class, "(kind=echo)"));
    }

    @Test
    void unresolvableBundleIsRefused() throws BundleException {
        byte[] jar = SmallBundle.named("needs.nothing.there").header("Import-Package", "no.such.thing").jar();
        Bundle bundle = services.context().installBundle("test:unresolvable", new ByteArrayInputStream(jar));
        try {
            BundleException refused = assertThrows(BundleException.class, bundle::start);
            assertEquals(BundleException.RESOLVE_ERROR, refused.getType());
        } finally {
            bundle.uninstall();
        }
    }

    @Test
    void missingBundleIsNamed() {
        AssertionError error = assertThrows(AssertionError.class, () -> services.bundle("nobody"));
        assertTrue(error.getMessage().contains("nobody"), error.getMessage());
    }

    @SuppressWarnings({"unchecked", "rawtypes"})   // a class literal has no type arguments
    private static Class<UnaryOperator<String>> typed() {
        return (Class) UnaryOperator.class;
    }
}
