package ropewalk.command.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.ToIntFunction;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.osgi.service.component.annotations.ReferenceCardinality;
import org.osgi.service.component.annotations.ReferencePolicyOption;
import ropewalk.invariant.Exhibit;
import ropewalk.invariant.catalogue.MethodCatalogue;
import ropewalk.split.SplitDetection;

/** {@code show}: one link with its values, matrices, verdict and argument. */
@Component(service = ToIntFunction.class, property = {
    "ropewalk.subcommand=show",
    "ropewalk.summary=show a link: values, matrices, verdict and argument"})
public final class ShowCommandComponent extends Subcommand {

    private static final String USAGE = """
            ropewalk show FILE[#NAME] [--as text] [--out FILE]
            ropewalk show --code 'NOTATION:CODE' [--as text] [--out FILE]

            Shows the link called NAME of a collection (all of them, at most 100, without #NAME), or the one whose code
            is given: its values, its matrices with labelled rows and columns, the verdict and the argument for it.""";

    private static final int MOST = 100;

    private final MethodCatalogue catalogue;
    private final SplitDetection detection;
    private final List<Exhibit.Source> exhibits;

    /**
     * Made by the framework.
     *
     * @param catalogue the installed invariants
     * @param exhibits who has matrices to show
     * @param detection split detection, or null where it is not installed
     */
    @Activate
    public ShowCommandComponent(@Reference MethodCatalogue catalogue,
            @Reference(policyOption = ReferencePolicyOption.GREEDY) List<Exhibit.Source> exhibits,
            @Reference(cardinality = ReferenceCardinality.OPTIONAL,
                    policyOption = ReferencePolicyOption.GREEDY) SplitDetection detection) {
        super("show", USAGE);
        this.catalogue = catalogue;
        this.exhibits = List.copyOf(exhibits);
        this.detection = detection;
    }

    @Override
    int run(String[] arguments) throws UsageException, IOException {
        Arguments options = Arguments.of(arguments, List.of("--code", "--as", "--out"), List.of());
        String form = options.value("--as").orElse("text");
        if (List.of("html", "svg", "tikz").contains(form)) {
            throw new UsageException("--as " + form + " comes with feature drawing, which is not installed");
        }
        if (!form.equals("text")) {
            throw new UsageException("--as takes text, html, svg or tikz, not '" + form + "'");
        }
        boolean byCode = options.value("--code").isPresent();
        if (options.plain().size() != (byCode ? 0 : 1)) {
            throw new UsageException("show takes one FILE[#NAME], or --code 'NOTATION:CODE'");
        }
        List<OneLink> links = byCode ? List.of(OneLink.ofCode(options.value("--code").get()))
                : OneLink.ofFile(options.plain().get(0), MOST);
        LinkSheet sheet = new LinkSheet(catalogue.entries(), exhibits, detection);
        StringBuilder out = new StringBuilder();
        for (OneLink link : links) {
            out.append(out.isEmpty() ? "" : "\n").append(sheet.of(link));
        }
        if (options.value("--out").isPresent()) {
            Path file = Arguments.path(options.value("--out").get());
            Files.writeString(file, out, StandardCharsets.UTF_8);
        } else {
            System.out.write(out.toString().getBytes(StandardCharsets.UTF_8));
            System.out.flush();
        }
        return DONE;
    }
}
