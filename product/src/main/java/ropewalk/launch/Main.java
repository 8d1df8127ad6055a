package ropewalk.launch;

import java.io.File;
import java.net.URISyntaxException;
import java.nio.file.Path;

/** Entry of the process. */
public final class Main {
    private Main() { }

    /**
     * Runs the product and ends the process with the status of the subcommand; 2 for wrong usage, 3 when the product is
     * at fault.
     *
     * @param arguments as the user gave them
     */
    public static void main(String[] arguments) {
        String mark = System.getProperty("ropewalk.mark");
        if (mark != null) {
            new File(mark).deleteOnExit();   // the shell launcher's sign that this process uses its build
        }
        int status;
        try {
            String version = Main.class.getPackage().getImplementationVersion();
            Launcher launcher = new Launcher(product(), version == null ? "unknown" : version, DataFolder.ofThisProcess());
            status = launcher.run(CommandLine.of(arguments));
        } catch (Refusal refusal) {
            Console.line(refusal.getMessage());
            status = refusal.status();
        }
        System.out.flush();
        System.exit(status);   // threads that a bundle left behind must not keep the process
    }

    /** The folder of the product: this class lies in {@code boot/ropewalk.launch.jar} below it. */
    private static Path product() throws Refusal {
        try {
            Path jar = Path.of(Main.class.getProtectionDomain().getCodeSource().getLocation().toURI());
            return jar.toAbsolutePath().getParent().getParent();
        } catch (URISyntaxException | IllegalArgumentException fault) {
            throw new Refusal(Refusal.BROKEN,
                    "the product cannot find its own folder (" + Console.reason(fault) + "); move it to another path");
        }
    }
}
