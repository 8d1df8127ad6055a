package ropewalk.testkit.tests;

import java.util.function.UnaryOperator;
import org.osgi.service.component.annotations.Component;

/** A service for the tests to wait for. */
@Component(service = UnaryOperator.class, property = "kind=echo")
public final class EchoComponent implements UnaryOperator<String> {
    /** For the component runtime. */
    public EchoComponent() { }

    @Override
    public String apply(String word) {
        return word + " " + word;
    }
}
