package ropewalk.command.internal;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Path;
import java.util.List;
import java.util.function.ToIntFunction;
import org.osgi.service.component.annotations.Component;
import ropewalk.collection.CollectionHeader;
import ropewalk.collection.CollectionReader;
import ropewalk.collection.CsvRows;
import ropewalk.collection.RecordBlock;
import ropewalk.collection.Rejection;
import ropewalk.collection.ReplacedFile;
import ropewalk.collection.UnreadableCollectionException;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.notation.CodeException;
import ropewalk.diagram.notation.CodeWriter;
import ropewalk.diagram.notation.Notations;

/** {@code convert}: writes collections anew in another notation. */
@Component(service = ToIntFunction.class, property = {
    "ropewalk.subcommand=convert",
    "ropewalk.summary=write collections in another notation"})
public final class ConvertCommandComponent extends Subcommand {

    private static final String USAGE = """
            ropewalk convert FILE… --to NOTATION [--out FILE]

            Writes the links of collections as one collection in NOTATION, to standard output or to a file, which then
            appears when it is finished. The kept columns of the first file come along. A bad row costs one line on
            standard error and exit status 1.""";

    /** Makes the component. */
    public ConvertCommandComponent() {
        super("convert", USAGE);
    }

    @Override
    int run(String[] arguments) throws UsageException, IOException {
        Arguments options = Arguments.of(arguments, List.of("--to", "--out"), List.of());
        String notation = options.value("--to").orElseThrow(() -> new UsageException("convert needs --to NOTATION"));
        CodeWriter writer = Notations.writer(notation).orElseThrow(() -> new UsageException("nothing writes '" + notation
                + "'; there are " + String.join(", ", Notations.writable())));
        List<Path> files = Arguments.paths(options.plain());
        if (files.isEmpty()) {
            throw new UsageException("convert needs a collection file");
        }
        if (options.value("--out").isEmpty()) {
            return new Conversion(notation, writer, System.out).run(files);
        }
        try (ReplacedFile file = ReplacedFile.begin(Arguments.path(options.value("--out").get()))) {
            int status = new Conversion(notation, writer, file.output()).run(files);
            file.finish();
            return status;
        }
    }

    /** One run: the first file that can be read gives the kept columns. */
    private static final class Conversion {

        private final String notation;
        private final CodeWriter writer;
        private final OutputStream out;
        private final CsvRows rows = new CsvRows();
        private List<String> kept;
        private int status = DONE;

        Conversion(String notation, CodeWriter writer, OutputStream out) {
            this.notation = notation;
            this.writer = writer;
            this.out = out;
        }

        int run(List<Path> files) throws IOException {
            for (Path file : files) {
                try (CollectionReader reader = CollectionReader.open(file)) {
                    header(reader.header());
                    for (RecordBlock block = reader.next(); block != null; block = reader.next()) {
                        block(block);
                    }
                } catch (UnreadableCollectionException e) {
                    reject(e.rejection());
                }
            }
            out.flush();
            return status;
        }

        private void header(CollectionHeader header) throws IOException {
            if (kept == null) {
                kept = keptNames(header);
                rows.field("name").field("notation").field("code");
                kept.forEach(rows::field);
                rows.endRow();
                flush();
            }
        }

        private static List<String> keptNames(CollectionHeader header) {
            return header.columns().stream().filter(c -> !List.of("name", "notation", "code").contains(c)).toList();
        }

        private void block(RecordBlock block) throws IOException {
            CollectionHeader header = block.header();
            for (Rejection rejection : block.rejections()) {
                reject(rejection);
            }
            for (int i = 0; i < block.size(); i++) {
                LinkDiagram diagram;
                try {
                    diagram = OneLink.read(block.notation(i).toString(), block.code(i));
                } catch (UsageException e) {
                    reject(block.rejectNotation(i, e.getMessage()));
                    continue;
                } catch (CodeException e) {
                    reject(block.rejectCode(i, e.offset() - block.code(i).from(), e.getMessage()));
                    continue;
                }
                rows.field(block, i, header.name()).field(notation).field(writer.write(diagram));
                for (String name : kept) {
                    int field = header.columns().indexOf(name);
                    if (field < 0) {
                        rows.empty();
                    } else {
                        rows.field(block, i, field);
                    }
                }
                rows.endRow();
            }
            flush();
        }

        private void flush() throws IOException {
            rows.writeTo(out);
            rows.clear();
        }

        private void reject(Rejection rejection) {
            message(rejection.toString());
            status = SOME_FAILED;
        }
    }
}
