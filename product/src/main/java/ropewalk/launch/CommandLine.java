package ropewalk.launch;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * The arguments of the process, split at the subcommand: what stands before it is the launcher's, what follows is
 * handed on as it is.
 *
 * @param features names after {@code --features}, or empty for all that are installed
 * @param guests jars after {@code --guest}, in order
 * @param request what to do
 * @param subcommand the subcommand, present exactly if the request is {@link Request#RUN}
 * @param arguments what follows the subcommand
 */
record CommandLine(Optional<List<String>> features, List<Path> guests, Request request, Optional<String> subcommand,
        List<String> arguments) {

    /** What the arguments ask for. */
    enum Request { HELP, VERSION, RUN }

    /**
     * Reads the arguments.
     *
     * @throws Refusal when an option before the subcommand is unknown or lacks its value
     */
    static CommandLine of(String... arguments) throws Refusal {
        Optional<List<String>> features = Optional.empty();
        List<Path> guests = new ArrayList<>();
        for (int at = 0; at < arguments.length; at++) {
            String argument = arguments[at];
            if (!argument.startsWith("-")) {
                return new CommandLine(features, List.copyOf(guests), Request.RUN, Optional.of(argument),
                        List.of(arguments).subList(at + 1, arguments.length));
            }
            int equals = argument.indexOf('=');
            String option = equals < 0 ? argument : argument.substring(0, equals);
            switch (option) {
                case "--help", "-h" -> {
                    return new CommandLine(features, List.copyOf(guests), Request.HELP, Optional.empty(), List.of());
                }
                case "--version" -> {
                    return new CommandLine(features, List.copyOf(guests), Request.VERSION, Optional.empty(), List.of());
                }
                case "--features", "--guest" -> {
                    if (equals < 0 && ++at == arguments.length) {
                        throw usage(option + " needs a value, for example "
                                + (option.equals("--guest") ? "--guest mine.jar" : "--features core"));
                    }
                    String value = equals < 0 ? arguments[at] : argument.substring(equals + 1);
                    if (option.equals("--guest")) {
                        guests.add(path(value));
                    } else {
                        features = Optional.of(names(value));
                    }
                }
                default -> throw usage("unknown option " + option
                        + " before the subcommand; possible are --features A,B, --guest JAR, --help, --version");
            }
        }
        return new CommandLine(features, List.copyOf(guests), Request.HELP, Optional.empty(), List.of());
    }

    private static List<String> names(String list) throws Refusal {
        List<String> names = Arrays.stream(list.split(",")).map(String::strip).filter(name -> !name.isEmpty()).toList();
        if (names.isEmpty()) {
            throw usage("--features names no feature; give for example --features core");
        }
        return names;
    }

    private static Path path(String text) throws Refusal {
        try {
            return Path.of(text);
        } catch (InvalidPathException wrong) {
            throw usage("--guest " + text + " is no file name: " + Console.reason(wrong));
        }
    }

    private static Refusal usage(String line) {
        return new Refusal(Refusal.USAGE, line);
    }
}
