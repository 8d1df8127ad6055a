package ropewalk.launch;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.nio.file.attribute.BasicFileAttributes;
import java.nio.file.attribute.FileTime;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleException;
import org.osgi.framework.wiring.FrameworkWiring;

/**
 * Keeps the framework in step with the folder where a group drops its own bundles: a jar that arrives is installed and
 * started, one that changes is updated, one that goes is uninstalled. A jar that is no good costs one line and nothing
 * else; it is tried again when it changes, and without a further line when another guest comes or goes.
 *
 * <p>Not thread-safe: one first {@link #scan} before {@link #watch}, and the watching thread alone afterwards.
 */
final class GuestFolder implements AutoCloseable {
    private static final long PAUSE_MILLIS = 500;
    private static final long REFRESH_SECONDS = 5;

    /** When the first look at a file counts: at once, or only when a second look finds it unchanged. */
    enum Trust { AT_ONCE, WHEN_SETTLED }

    private record Stamp(long size, FileTime modified) { }

    private final BundleContext system;
    private final Path folder;
    private final Map<String, Bundle> guests = new TreeMap<>();
    private final Map<String, Stamp> taken = new HashMap<>();
    private final Set<String> complained = new HashSet<>();
    private Map<String, Stamp> before = Map.of();
    private Thread watcher;

    GuestFolder(BundleContext system, Path folder) {
        this.system = system;
        this.folder = folder;
    }

    /** Compares the folder with what is installed, once, and acts on the differences. */
    void scan(Trust trust) {
        Map<String, Stamp> now = look();
        Set<Bundle> stale = new HashSet<>();
        boolean moved = dropGone(now, stale);
        for (Map.Entry<String, Stamp> file : now.entrySet()) {
            boolean settled = trust == Trust.AT_ONCE || file.getValue().equals(before.get(file.getKey()));
            if (settled && !file.getValue().equals(taken.get(file.getKey()))) {
                taken.put(file.getKey(), file.getValue());
                complained.remove(file.getKey());
                moved |= take(file.getKey(), stale);
            }
        }
        before = now;
        if (moved) {
            for (String name : taken.keySet()) {
                if (!guests.containsKey(name)) {
                    take(name, stale);   // a duplicate whose twin has gone
                }
            }
            refresh(stale);
            startAll();
        }
    }

    /** Scans every half second from now on, on a thread of its own. */
    void watch() {
        watcher = new Thread(() -> {
            try {
                while (true) {
                    Thread.sleep(PAUSE_MILLIS);
                    scan(Trust.WHEN_SETTLED);
                }
            } catch (InterruptedException closed) {
                Thread.currentThread().interrupt();
            }
        }, "ropewalk guests");
        watcher.setDaemon(true);
        watcher.start();
    }

    /** Ends the watch and waits for a scan that is under way. The guests stay. */
    @Override
    public void close() {
        if (watcher != null) {
            watcher.interrupt();
            try {
                watcher.join(TimeUnit.SECONDS.toMillis(REFRESH_SECONDS));
            } catch (InterruptedException wish) {
                Thread.currentThread().interrupt();
            }
        }
    }

    private Map<String, Stamp> look() {
        Map<String, Stamp> found = new TreeMap<>();
        try (DirectoryStream<Path> jars = Files.newDirectoryStream(folder, "*.jar")) {
            for (Path jar : jars) {
                String name = jar.getFileName().toString();
                if (!name.startsWith(".")) {   // copying programs use such names until the file is whole
                    stamp(jar, found);
                }
            }
        } catch (NoSuchFileException | NotDirectoryException none) {
            return found;   // a group that has no guests needs no folder
        } catch (IOException | java.nio.file.DirectoryIteratorException fault) {
            complain("", "cannot be looked through: " + Console.reason(fault) + "; check its permissions");
            return before;
        }
        return found;
    }

    private static void stamp(Path jar, Map<String, Stamp> found) throws IOException {
        try {
            BasicFileAttributes attributes = Files.readAttributes(jar, BasicFileAttributes.class);
            found.put(jar.getFileName().toString(), new Stamp(attributes.size(), attributes.lastModifiedTime()));
        } catch (NoSuchFileException gone) {
            return;   // removed while we looked, or a link to nothing
        }
    }

    private boolean dropGone(Map<String, Stamp> now, Set<Bundle> stale) {
        boolean moved = false;
        for (String name : Set.copyOf(taken.keySet())) {
            if (!now.containsKey(name)) {
                taken.remove(name);
                complained.remove(name);
                Bundle bundle = guests.remove(name);
                if (bundle != null) {
                    moved = true;
                    stale.add(bundle);
                    try {
                        bundle.uninstall();
                    } catch (BundleException fault) {
                        complain(name, "cannot be taken out: " + Console.reason(fault) + "; start again without it");
                    }
                }
            }
        }
        return moved;
    }

    /** Installs or updates one jar; true if that went well. */
    private boolean take(String name, Set<Bundle> stale) {
        Path jar = folder.resolve(name);
        String fault = GuestJar.fault(jar).orElse(null);
        if (fault != null) {
            complain(name, fault);
            return false;
        }
        Bundle known = guests.get(name);
        try (InputStream bytes = Files.newInputStream(jar)) {
            if (known == null) {
                guests.put(name, system.installBundle("guest:" + name, bytes));
            } else {
                known.update(bytes);
                stale.add(known);
            }
            return true;
        } catch (IOException | BundleException wrong) {
            complain(name, GuestJar.words(wrong));
            return false;
        }
    }

    private void startAll() {
        guests.forEach((name, bundle) -> {
            if (bundle.getState() != Bundle.ACTIVE && bundle.getState() != Bundle.STARTING) {
                try {
                    FrameworkBoot.start(bundle);
                } catch (BundleException wrong) {
                    complain(name, GuestJar.words(wrong, bundle, system));
                }
            }
        });
    }

    /** Rewires whoever used a class of the given bundles, and waits until that is done. */
    private void refresh(Set<Bundle> stale) {
        if (stale.isEmpty()) {
            return;
        }
        CountDownLatch done = new CountDownLatch(1);
        system.getBundle().adapt(FrameworkWiring.class).refreshBundles(stale, event -> done.countDown());
        try {
            done.await(REFRESH_SECONDS, TimeUnit.SECONDS);
        } catch (InterruptedException closed) {
            Thread.currentThread().interrupt();
        }
    }

    private void complain(String name, String fault) {
        if (complained.add(name)) {
            Console.line("guests/" + name + " " + fault);
        }
    }
}
