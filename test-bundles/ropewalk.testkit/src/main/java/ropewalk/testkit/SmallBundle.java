package ropewalk.testkit;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.jar.Attributes;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;
import java.util.zip.ZipEntry;

/** A bundle made by a test, as the bytes of its jar. Immutable; each method gives a new one. */
public final class SmallBundle {
    private final Map<String, String> headers;
    private final Map<String, byte[]> files;

    private SmallBundle(Map<String, String> headers, Map<String, byte[]> files) {
        this.headers = headers;
        this.files = files;
    }

    /**
     * A bundle of version 1.0.0 that holds nothing.
     *
     * @param symbolicName its name
     * @return the bundle
     */
    public static SmallBundle named(String symbolicName) {
        return new SmallBundle(Map.of("Bundle-ManifestVersion", "2", "Bundle-SymbolicName", symbolicName,
                "Bundle-Version", "1.0.0"), Map.of());
    }

    /**
     * The same with a header.
     *
     * @param name name of the header
     * @param value its value
     * @return the new bundle
     */
    public SmallBundle header(String name, String value) {
        Map<String, String> more = new LinkedHashMap<>(headers);
        more.put(name, value);
        return new SmallBundle(more, files);
    }

    /**
     * The same with a file.
     *
     * @param path its path in the jar
     * @param contents its contents
     * @return the new bundle
     */
    public SmallBundle file(String path, byte[] contents) {
        Map<String, byte[]> more = new LinkedHashMap<>(files);
        more.put(path, contents);
        return new SmallBundle(headers, more);
    }

    /**
     * The same with a class, taken from the class path of the test.
     *
     * @param type a top-level class
     * @return the new bundle
     */
    public SmallBundle type(Class<?> type) {
        String path = type.getName().replace('.', '/') + ".class";
        try (InputStream in = type.getClassLoader().getResourceAsStream(path)) {
            return file(path, in.readAllBytes());
        } catch (IOException fault) {
            throw new UncheckedIOException(path, fault);
        }
    }

    /**
     * The same with a component that offers a subcommand.
     *
     * @param type a class that implements {@code ToIntFunction<String[]>}, with a public constructor without parameters
     * @param subcommand name of the subcommand
     * @return the new bundle
     */
    public SmallBundle subcommand(Class<?> type, String subcommand) {
        String path = "OSGI-INF/" + type.getName() + ".xml";
        String component = """
                <scr:component xmlns:scr="http://www.osgi.org/xmlns/scr/v1.3.0" name="%1$s">
                  <implementation class="%1$s"/>
                  <service><provide interface="java.util.function.ToIntFunction"/></service>
                  <property name="ropewalk.subcommand" value="%2$s"/>
                  <property name="ropewalk.summary" value="made by a test"/>
                </scr:component>
                """.formatted(type.getName(), subcommand);
        return type(type).file(path, component.getBytes(StandardCharsets.UTF_8)).header("Service-Component", path)
                .header("Provide-Capability",
                        "osgi.service;objectClass:List<String>=\"java.util.function.ToIntFunction\";effective:=active")
                .header("Require-Capability",
                        "osgi.extender;filter:=\"(&(osgi.extender=osgi.component)(version>=1.3.0)(!(version>=2.0.0)))\"");
    }

    /**
     * The jar.
     *
     * @return its bytes
     */
    public byte[] jar() {
        Manifest manifest = new Manifest();
        manifest.getMainAttributes().put(Attributes.Name.MANIFEST_VERSION, "1.0");
        headers.forEach((name, value) -> manifest.getMainAttributes().put(new Attributes.Name(name), value));
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (JarOutputStream jar = new JarOutputStream(bytes, manifest)) {
            for (Map.Entry<String, byte[]> file : files.entrySet()) {
                jar.putNextEntry(new ZipEntry(file.getKey()));
                ((OutputStream) jar).write(file.getValue());
            }
        } catch (IOException impossible) {
            throw new UncheckedIOException(impossible);   // memory does not fail
        }
        return bytes.toByteArray();
    }
}
