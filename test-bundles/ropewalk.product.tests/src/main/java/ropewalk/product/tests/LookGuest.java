package ropewalk.product.tests;

import java.util.function.ToIntFunction;
import org.osgi.framework.BundleContext;
import org.osgi.framework.FrameworkUtil;

/** A guest's subcommand that prints the framework properties named by its arguments, a line each. */
public final class LookGuest implements ToIntFunction<String[]> {
    /** For the component runtime. */
    public LookGuest() { }

    @Override
    public int applyAsInt(String[] names) {
        BundleContext context = FrameworkUtil.getBundle(LookGuest.class).getBundleContext();
        for (String name : names) {
            System.out.println(context.getProperty(name));
        }
        return 0;
    }
}
