package ropewalk.survey.internal;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;

/** Reads rows that {@link ropewalk.collection.CsvRows} wrote, field by field as they stand, quotes and all. */
final class RawRows {

    private final InputStream in;

    RawRows(InputStream in) {
        this.in = in;
    }

    /** The raw fields of the next row, or null at the end. */
    List<byte[]> next() throws IOException {
        List<byte[]> fields = new ArrayList<>();
        ByteArrayOutputStream field = new ByteArrayOutputStream();
        boolean quoted = false;
        for (int b = in.read(); b >= 0; b = in.read()) {
            if (b == '"') {
                quoted = !quoted;       // a doubled quote leaves and enters again
            }
            if (!quoted && b == ',') {
                fields.add(field.toByteArray());
                field.reset();
            } else if (!quoted && b == '\r') {
                if (in.read() != '\n') {
                    throw new IOException("a row of the results does not end in CR LF; somebody else wrote to them");
                }
                fields.add(field.toByteArray());
                return fields;
            } else {
                field.write(b);
            }
        }
        if (!fields.isEmpty() || field.size() > 0) {
            throw new IOException("the last row of the results is cut off");
        }
        return null;
    }
}
