package ropewalk.survey.internal;

import java.io.BufferedOutputStream;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import ropewalk.survey.Survey.RequestException;
import ropewalk.survey.SurveyRequest;

/** The folder of results: its name, and that nothing else is overwritten. */
final class OutputFolder {

    static final String RESULTS = "results.csv";
    static final String REJECTED = "rejected.csv";
    static final String EVIDENCE = "evidence.jsonl";
    static final String RIVALS = "rivals.csv";

    private final Path path;

    private OutputFolder(Path path) {
        this.path = path;
    }

    static OutputFolder of(SurveyRequest request) throws RequestException {
        Path path = request.out().orElseGet(() -> Path.of(baseName(request.files().get(0)) + ".survey"));
        if (Files.exists(path) && !isOurs(path)) {
            throw new RequestException(path + " exists and no survey wrote it; name another folder with --out");
        }
        return new OutputFolder(path);
    }

    private static String baseName(Path file) {
        Path last = file.getFileName();
        String name = last == null ? "collection" : last.toString();
        return name.toLowerCase(Locale.ROOT).endsWith(".csv") && name.length() > 4
                ? name.substring(0, name.length() - 4) : name;
    }

    /** Ours if it is empty or holds results that begin like ours. */
    private static boolean isOurs(Path path) throws RequestException {
        if (!Files.isDirectory(path)) {
            return false;
        }
        try (Stream<Path> entries = Files.list(path)) {
            if (entries.findAny().isEmpty()) {
                return true;
            }
        } catch (IOException e) {
            throw new RequestException(path + " cannot be read: " + e.getMessage() + "; name another folder with --out");
        }
        return beginsWith(path.resolve(RESULTS), "name,notation,components,crossings")
                && beginsWith(path.resolve(REJECTED), "file,line,column,name,reason");
    }

    private static boolean beginsWith(Path file, String header) {
        try (BufferedReader reader = Files.newBufferedReader(file)) {
            char[] start = new char[header.length()];
            return reader.read(start) == start.length && new String(start).equals(header);
        } catch (IOException e) {
            return false;       // no such file, or none of ours
        }
    }

    /** Makes the folder and takes away what an earlier survey left there. */
    void prepare() throws IOException {
        Files.createDirectories(path);
        for (String name : List.of(RESULTS, REJECTED, EVIDENCE, RIVALS)) {
            Files.deleteIfExists(path.resolve(name));
        }
    }

    OutputStream open(String name) throws IOException {
        return new BufferedOutputStream(Files.newOutputStream(path.resolve(name)), 1 << 16);
    }

    Path path() {
        return path;
    }
}
