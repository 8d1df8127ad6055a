package ropewalk.launch;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.osgi.framework.BundleException;
import org.osgi.framework.ServiceReference;

/** One run of the product: framework up, guests in, subcommand, framework down. */
final class Launcher {
    private static final long SERVICE_MILLIS = 5_000;

    private final Path product;
    private final String version;
    private final Path data;

    /**
     * A launcher of one product.
     *
     * @param product the folder that holds {@code bundles} and {@code features}
     * @param version version of the product
     * @param data the user's data folder, which need not exist
     */
    Launcher(Path product, String version, Path data) {
        this.product = product;
        this.version = version;
        this.data = data;
    }

    /** Does what the command line asks for and returns the status of the process. */
    int run(CommandLine line) throws Refusal {
        if (line.request() == CommandLine.Request.VERSION) {
            System.out.println("ropewalk " + version);
            return 0;
        }
        FeatureSet features = FeatureSet.read(product, line.features());
        Path guests = data.resolve("guests");
        Map<String, String> properties = Map.of(
                "ropewalk.data", data.toString(),
                "ropewalk.guests", guests.toString(),
                "ropewalk.product", product.toString(),
                "ropewalk.features", String.join(",", features.started()),
                "ropewalk.version", version);
        try (Storage storage = Storage.create();
                FrameworkBoot framework = FrameworkBoot.open(storage.folder(), properties)) {
            for (Path jar : features.jars(product)) {
                framework.install(jar);
            }
            framework.startInstalled();
            for (Path jar : line.guests()) {
                framework.installGuest(jar);
            }
            try (GuestFolder folder = new GuestFolder(framework.context(), guests)) {
                folder.scan(GuestFolder.Trust.AT_ONCE);
                folder.watch();
                return answer(line, features, framework);
            }
        } catch (IOException | BundleException | InterruptedException fault) {
            throw new Refusal(Refusal.BROKEN, "the product cannot be started or stopped: " + Console.reason(fault)
                    + "; is there room in the temporary folder " + System.getProperty("java.io.tmpdir") + "?");
        }
    }

    private int answer(CommandLine line, FeatureSet features, FrameworkBoot framework)
            throws Refusal, InterruptedException {
        Subcommands subcommands = new Subcommands(framework.context());
        if (line.request() == CommandLine.Request.HELP) {
            return help(subcommands, framework);
        }
        String name = line.subcommand().orElseThrow();
        ServiceReference<?> service = subcommands.await(name, SERVICE_MILLIS)
                .orElseThrow(() -> missing(name, features, subcommands, framework));
        int status;
        try {
            status = subcommands.run(service, line.arguments().toArray(String[]::new)).orElse(Refusal.BROKEN);
        } catch (RuntimeException | Error fault) {
            status = broken(name, fault);
        }
        // Told at the end, since a component is made when it is first asked for. The subcommand's own may be among them.
        new Components(framework.context()).failed().forEach(Console::line);
        return status;
    }

    private static int help(Subcommands subcommands, FrameworkBoot framework) throws InterruptedException {
        subcommands.await("", SERVICE_MILLIS);   // nobody is called so: this waits until all have arrived
        Map<String, ServiceReference<?>> offered = subcommands.offered();
        System.out.println("usage: ropewalk [--features A,B,...] [--guest JAR]... SUBCOMMAND [ARGUMENT]...");
        System.out.println();
        int width = offered.keySet().stream().mapToInt(String::length).max().orElse(0);
        offered.forEach((name, service) -> System.out.printf("  %-" + Math.max(width, 1) + "s  %s%n", name,
                Optional.ofNullable(service.getProperty("ropewalk.summary")).orElse("")));
        if (offered.isEmpty()) {
            System.out.println("  (no started feature offers a subcommand)");
        }
        Components components = new Components(framework.context());
        components.waiting().forEach(Console::line);
        return 0;
    }

    private static Refusal missing(String name, FeatureSet features, Subcommands subcommands, FrameworkBoot framework) {
        Optional<String> feature;
        try {
            feature = KnownSubcommands.feature(name);
        } catch (Refusal unreadable) {
            return unreadable;
        }
        List<String> waiting = new Components(framework.context()).waiting();
        String reasons = waiting.isEmpty() ? "" : " (" + String.join("; ", waiting) + ")";
        if (feature.isEmpty()) {
            return new Refusal(Refusal.USAGE,
                    "unknown subcommand '" + name + "'; 'ropewalk --help' lists them" + reasons);
        }
        String from = "'" + name + "' comes with feature " + feature.get();
        if (!features.installed().containsKey(feature.get())) {
            return new Refusal(Refusal.USAGE, from + ", which is not installed");
        }
        if (!features.started().contains(feature.get())) {
            return new Refusal(Refusal.USAGE, from + ", which is not started; started: "
                    + String.join(", ", features.started()));
        }
        return new Refusal(Refusal.BROKEN, from + ", which is started but does not offer it"
                + (subcommands.pending() ? " after " + SERVICE_MILLIS / 1000 + " s" : "") + reasons
                + "; start all features, or look for messages above");
    }

    /** One line for the user; the whole story goes to the log, if the data folder takes one. */
    private int broken(String name, Throwable fault) {
        String where = "";
        Path log = data.resolve("ropewalk.log");
        try {
            Files.createDirectories(data);
            FaultLog.append(log, "subcommand " + name + ", version " + version, fault);
            where = "; details in " + log;
        } catch (IOException unwritable) {
            where = "; its details could not be written to " + log + ": " + Console.reason(unwritable);
        }
        Console.line(name + " broke: " + fault.getClass().getSimpleName() + ": " + Console.reason(fault) + where);
        return Refusal.BROKEN;
    }
}
