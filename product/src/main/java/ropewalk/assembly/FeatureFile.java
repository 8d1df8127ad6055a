package ropewalk.assembly;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/**
 * The bundles of a feature file in the shape of the OSGi Feature Service (OSGi Compendium 8.1, chapter 159): a JSON
 * object whose member {@code bundles} lists objects with an {@code id} of the form {@code group:artifact:version}.
 * Other members are let pass.
 */
final class FeatureFile {
    private static final JsonFactory JSON = JsonFactory.builder().build();

    private FeatureFile() { }

    /** The ids of the bundles, in order. */
    static List<String> bundles(Path file) throws IOException {
        List<String> ids = new ArrayList<>();
        boolean found = false;
        try (JsonParser json = JSON.createParser(file.toFile())) {
            expect(json.nextToken() == JsonToken.START_OBJECT, file, json, "a feature is a JSON object");
            while (json.nextToken() == JsonToken.FIELD_NAME) {
                boolean bundles = json.currentName().equals("bundles");
                json.nextToken();
                if (bundles) {
                    found = true;
                    expect(json.currentToken() == JsonToken.START_ARRAY, file, json, "bundles is a list");
                    while (json.nextToken() != JsonToken.END_ARRAY) {
                        ids.add(id(file, json));
                    }
                } else {
                    json.skipChildren();
                }
            }
        }
        if (!found) {
            throw new IOException(file + " has no member bundles");
        }
        return ids;
    }

    private static String id(Path file, JsonParser json) throws IOException {
        expect(json.currentToken() == JsonToken.START_OBJECT, file, json, "a bundle is {\"id\": \"group:artifact:version\"}");
        String id = null;
        while (json.nextToken() == JsonToken.FIELD_NAME) {
            boolean wanted = json.currentName().equals("id");
            json.nextToken();
            if (wanted) {
                id = json.getText();
            } else {
                json.skipChildren();
            }
        }
        expect(id != null && id.matches("[^:${}]+:[^:${}]+:[^:${}]+"), file, json,
                "a bundle's id is group:artifact:version with known properties, not " + id);
        return id;
    }

    private static void expect(boolean held, Path file, JsonParser json, String rule) throws IOException {
        if (!held) {
            throw new IOException(file + ", line " + json.currentLocation().getLineNr() + ": " + rule);
        }
    }
}
