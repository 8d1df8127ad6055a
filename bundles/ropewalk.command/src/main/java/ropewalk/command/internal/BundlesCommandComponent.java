package ropewalk.command.internal;

import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToIntFunction;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.invariant.catalogue.RankedMethod;

/** {@code bundles}: what is installed, and where it comes from. */
@Component(service = ToIntFunction.class, property = {
    "ropewalk.subcommand=bundles",
    "ropewalk.summary=list what is installed, and where a group's own bundles go"})
public final class BundlesCommandComponent extends Subcommand {

    private static final String USAGE = """
            ropewalk bundles list     the bundles that run, and the invariants and methods they bring
            ropewalk bundles where    the folders: guests (drop a bundle of your own there), data, product

            'bundles explain|add|remove|on|off' come with feature workbench.""";

    private static final List<String> LATER = List.of("explain", "add", "remove", "on", "off");

    private final BundleContext context;
    private final MethodCatalogue catalogue;

    /**
     * Made by the framework.
     *
     * @param context of this bundle
     * @param catalogue the installed invariants
     */
    @Activate
    public BundlesCommandComponent(BundleContext context, @Reference MethodCatalogue catalogue) {
        super("bundles", USAGE);
        this.context = context;
        this.catalogue = catalogue;
    }

    @Override
    int run(String[] arguments) throws UsageException {
        List<String> words = Arguments.of(arguments, List.of(), List.of()).plain();
        String what = words.isEmpty() ? "list" : words.get(0);
        if (words.size() > 1 && !LATER.contains(what)) {
            throw new UsageException("bundles " + what + " takes nothing more");
        }
        switch (what) {
            case "list" -> list();
            case "where" -> where();
            default -> {
                if (LATER.contains(what)) {
                    message("'bundles " + what + "' comes with feature workbench, which is not installed");
                    return WRONG_USAGE;
                }
                throw new UsageException("there is no 'bundles " + what + "'");
            }
        }
        return DONE;
    }

    private void list() {
        List<Bundle> bundles = Arrays.stream(context.getBundles()).filter(b -> b.getBundleId() != 0)
                .sorted(Comparator.comparing(Bundle::getSymbolicName)).toList();
        int width = bundles.stream().mapToInt(b -> b.getSymbolicName().length()).max().orElse(0);
        for (Bundle bundle : bundles) {
            String guest = bundle.getLocation().startsWith("guest:") ? "  guest" : "";
            System.out.println(padded(bundle.getSymbolicName(), width) + "  " + padded(bundle.getVersion().toString(), 18)
                    + state(bundle) + guest);
        }
        System.out.println();
        int ids = catalogue.entries().stream().mapToInt(e -> e.id().length()).max().orElse(0);
        for (CatalogueEntry entry : catalogue.entries()) {
            System.out.println(padded(entry.id(), ids + 1) + title(entry));
            for (RankedMethod method : entry.methods()) {
                System.out.println("    " + padded(method.id(), 28) + method.origin());
            }
        }
    }

    private static String title(CatalogueEntry entry) {
        return entry.definition().map(d -> d.title() + (d.needsOrientation() ? " (of the oriented link)" : ""))
                .orElse("(not defined)");
    }

    private static String state(Bundle bundle) {
        return switch (bundle.getState()) {
            case Bundle.ACTIVE -> "runs";
            case Bundle.STARTING -> "runs when needed";
            case Bundle.RESOLVED -> "stopped";
            default -> "cannot be resolved";
        };
    }

    private static String padded(String text, int width) {
        return text + " ".repeat(Math.max(0, width - text.length()) + 1);
    }

    private void where() {
        for (String name : List.of("guests", "data", "product")) {
            System.out.println(padded(name, 8)
                    + Optional.ofNullable(context.getProperty("ropewalk." + name)).orElse("(unknown)"));
        }
    }
}
