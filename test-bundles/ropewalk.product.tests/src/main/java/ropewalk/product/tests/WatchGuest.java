package ropewalk.product.tests;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.TreeSet;
import java.util.function.ToIntFunction;
import org.osgi.framework.BundleContext;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceReference;

/**
 * A guest's subcommand that runs until the file named by its argument exists, and prints the subcommands that are
 * offered whenever they change. Stopped from outside, it still needs a class of its bundle after a while.
 */
public final class WatchGuest implements ToIntFunction<String[]> {
    /** For the component runtime. */
    public WatchGuest() { }

    @Override
    public int applyAsInt(String[] arguments) {
        Thread save = new Thread(() -> {
            try {
                Thread.sleep(300);
                System.out.println("saved by " + new EchoGuest().getClass().getSimpleName());
            } catch (InterruptedException stop) {
                Thread.currentThread().interrupt();
            }
        });
        Runtime.getRuntime().addShutdownHook(save);
        BundleContext context = FrameworkUtil.getBundle(WatchGuest.class).getBundleContext();
        String last = "";
        try {
            while (!Files.exists(Path.of(arguments[0]))) {
                TreeSet<String> names = new TreeSet<>();
                ServiceReference<?>[] all = context.getAllServiceReferences(ToIntFunction.class.getName(), null);
                for (ServiceReference<?> service : all) {
                    names.add(service.getProperty("ropewalk.subcommand") + "@" + service.getBundle().getVersion()
                            + " from " + service.getBundle().getLocation().replaceAll(".*[:/]", ""));
                }
                if (!names.toString().equals(last)) {
                    last = names.toString();
                    System.out.println(last);
                }
                Thread.sleep(20);
            }
        } catch (InterruptedException | InvalidSyntaxException stop) {
            return 9;
        }
        Runtime.getRuntime().removeShutdownHook(save);
        return 0;
    }
}
