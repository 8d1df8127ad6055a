package ropewalk.command.internal;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** The arguments of a subcommand: options with a value, switches, and what is left. {@code --} ends the options. */
final class Arguments {

    private final Map<String, String> values = new HashMap<>();
    private final Set<String> switches = new HashSet<>();
    private final List<String> plain = new ArrayList<>();

    private Arguments() {
    }

    /**
     * Splits arguments.
     *
     * @param arguments what follows the subcommand
     * @param withValue names of the options that take a value, with their dashes
     * @param without names of the switches
     */
    static Arguments of(String[] arguments, List<String> withValue, List<String> without) throws UsageException {
        Arguments result = new Arguments();
        for (int i = 0; i < arguments.length; i++) {
            String argument = arguments[i];
            if (argument.equals("--")) {
                result.plain.addAll(List.of(arguments).subList(i + 1, arguments.length));
                break;
            }
            if (!argument.startsWith("--")) {
                result.plain.add(argument);
                continue;
            }
            int equals = argument.indexOf('=');
            String name = equals < 0 ? argument : argument.substring(0, equals);
            if (without.contains(name) && equals < 0) {
                result.switches.add(name);
            } else if (withValue.contains(name)) {
                if (equals < 0 && i + 1 == arguments.length) {
                    throw new UsageException(name + " needs a value");
                }
                result.values.put(name, equals < 0 ? arguments[++i] : argument.substring(equals + 1));
            } else {
                List<String> known = new ArrayList<>(withValue);
                known.addAll(without);
                throw new UsageException("there is no option " + Visible.text(name) + " here; there are "
                        + String.join(", ", known));
            }
        }
        return result;
    }

    boolean has(String name) {
        return switches.contains(name);
    }

    Optional<String> value(String name) {
        return Optional.ofNullable(values.get(name));
    }

    /** A value that is a list of ids with commas between. */
    List<String> ids(String name) {
        return value(name).map(v -> Arrays.stream(v.split(",")).map(String::trim).filter(s -> !s.isEmpty()).toList())
                .orElse(List.of());
    }

    List<String> plain() {
        return plain;
    }

    static Path path(String text) throws UsageException {
        try {
            return Path.of(text);
        } catch (InvalidPathException e) {
            throw new UsageException("'" + Visible.text(text) + "' is no file name: " + e.getReason());
        }
    }

    static List<Path> paths(List<String> texts) throws UsageException {
        List<Path> paths = new ArrayList<>();
        for (String text : texts) {
            paths.add(path(text));
        }
        return paths;
    }
}
