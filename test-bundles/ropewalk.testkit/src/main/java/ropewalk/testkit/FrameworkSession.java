package ropewalk.testkit;

import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.ServiceLoader;
import java.util.jar.Attributes;
import java.util.jar.JarFile;
import java.util.jar.Manifest;
import org.junit.platform.launcher.LauncherSession;
import org.junit.platform.launcher.LauncherSessionListener;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleException;
import org.osgi.framework.Constants;
import org.osgi.framework.launch.Framework;
import org.osgi.framework.launch.FrameworkFactory;
import org.osgi.framework.wiring.BundleRevision;
import org.osgi.framework.wiring.BundleWiring;

/**
 * Runs the tests of a module inside an OSGi framework, by plain Surefire. JUnit calls this before it looks for tests:
 * every bundle on the module's class path is installed and started, the packages of JUnit are shared with them, and the
 * thread's class loader becomes that of the test bundle, so that JUnit loads each test class from the bundle.
 *
 * <p>The module's pom sets the system property {@code ropewalk.test.bundle} to the symbolic name of the bundle that holds
 * the tests; without it nothing happens here.
 */
public final class FrameworkSession implements LauncherSessionListener {
    private static final String TEST_BUNDLE = "ropewalk.test.bundle";
    private static final long STOP_MILLIS = 10_000;

    private Framework framework;
    private Path storage;
    private ClassLoader before;

    /** For the service loader. */
    public FrameworkSession() { }

    @Override
    public void launcherSessionOpened(LauncherSession session) {
        String testBundle = System.getProperty(TEST_BUNDLE);
        if (testBundle == null) {
            return;
        }
        try {
            ClassPath path = ClassPath.ofThisProcess();
            storage = Files.createTempDirectory("ropewalk-tests-");
            framework = start(path.shared());
            Bundle tests = installAll(path.bundles(), testBundle);
            before = Thread.currentThread().getContextClassLoader();
            Thread.currentThread().setContextClassLoader(tests.adapt(BundleWiring.class).getClassLoader());
        } catch (IOException | BundleException fault) {
            // Surefire shows nothing but the message of what is thrown here.
            throw new IllegalStateException("the framework for " + testBundle + " cannot be started: " + fault, fault);
        }
    }

    @Override
    public void launcherSessionClosed(LauncherSession session) {
        if (framework == null) {
            return;
        }
        Thread.currentThread().setContextClassLoader(before);
        try {
            framework.stop();
            framework.waitForStop(STOP_MILLIS);
            Folders.delete(storage);
        } catch (BundleException | IOException fault) {
            throw new IllegalStateException("the framework of the tests cannot be stopped: " + fault, fault);
        } catch (InterruptedException wish) {
            Thread.currentThread().interrupt();
        }
    }

    private Framework start(String shared) throws BundleException {
        Map<String, String> configuration = new HashMap<>();
        configuration.put(Constants.FRAMEWORK_STORAGE, storage.toString());
        configuration.put(Constants.FRAMEWORK_SYSTEMPACKAGES_EXTRA, shared + ",ropewalk.testkit;version=1.0");
        configuration.put("felix.log.level", "1");
        Framework started = ServiceLoader.load(FrameworkFactory.class).findFirst().orElseThrow()
                .newFramework(configuration);
        started.start();
        return started;
    }

    private Bundle installAll(List<Path> bundles, String testBundle) throws BundleException {
        Bundle tests = null;
        List<Bundle> installed = new ArrayList<>();
        for (Path bundle : bundles) {
            String location = "reference:" + bundle.toUri().toString().replace("+", "%2B");
            Bundle one = framework.getBundleContext().installBundle(location);
            installed.add(one);
            tests = testBundle.equals(one.getSymbolicName()) ? one : tests;
        }
        if (tests == null) {
            throw new IllegalStateException("no bundle " + testBundle + " on the class path: its pom needs the "
                    + "bnd-maven-plugin and testClassesDirectory = ${project.build.outputDirectory}");
        }
        for (Bundle one : installed) {
            if ((one.adapt(BundleRevision.class).getTypes() & BundleRevision.TYPE_FRAGMENT) == 0) {
                one.start(Bundle.START_ACTIVATION_POLICY);
            }
        }
        return tests;
    }

    /** The class path of the process, sorted into bundles to install and packages to share. */
    private record ClassPath(List<Path> bundles, String shared) {

        static ClassPath ofThisProcess() throws IOException {
            List<Path> bundles = new ArrayList<>();
            List<String> shared = new ArrayList<>();
            String path = System.getProperty("surefire.test.class.path", System.getProperty("java.class.path"));
            for (String entry : path.split(File.pathSeparator)) {
                Attributes manifest = manifest(Path.of(entry));
                String name = manifest.getValue(Constants.BUNDLE_SYMBOLICNAME);
                String plain = name == null ? "" : name.split(";")[0].strip();
                if (plain.startsWith("junit-") || plain.startsWith("org.opentest4j") || plain.startsWith("org.apiguardian")) {
                    String exports = manifest.getValue(Constants.EXPORT_PACKAGE);
                    if (exports != null) {   // junit-jupiter itself exports nothing
                        shared.add(exports.replaceAll(";(uses|status|mandatory|x-[a-z]+):?=(\"[^\"]*\"|[^;,]*)", ""));
                    }
                } else if (!plain.isEmpty() && !plain.equals("org.apache.felix.framework")) {
                    bundles.add(Path.of(entry));
                }
            }
            return new ClassPath(bundles, String.join(",", shared));
        }

        private static Attributes manifest(Path entry) throws IOException {
            if (Files.isDirectory(entry)) {
                Path file = entry.resolve(JarFile.MANIFEST_NAME);
                if (!Files.exists(file)) {
                    return new Attributes();
                }
                try (InputStream in = Files.newInputStream(file)) {
                    return new Manifest(in).getMainAttributes();
                }
            }
            if (!Files.exists(entry)) {
                return new Attributes();   // Maven names folders that a module does not have
            }
            try (JarFile jar = new JarFile(entry.toFile())) {
                Manifest manifest = jar.getManifest();
                return manifest == null ? new Attributes() : manifest.getMainAttributes();
            }
        }
    }
}
