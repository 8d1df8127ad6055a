package ropewalk.survey.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import ropewalk.collection.CollectionHeader;
import ropewalk.collection.CollectionReader;
import ropewalk.collection.ReadingLimits;

class HeaderTest {

    private static final Columns NONE = new Columns(List.of(), false);

    private static CollectionHeader header(String line) throws IOException {
        try (CollectionReader reader = CollectionReader.open(
                new ByteArrayInputStream(line.getBytes(StandardCharsets.UTF_8)), "x", ReadingLimits.standard())) {
            return reader.header();
        }
    }

    @Test
    void keptColumnsComeLastInTheOrderInWhichTheFilesHaveThem() throws IOException {
        CollectionHeader one = header("b,name,notation,code,a\n");
        CollectionHeader two = header("name,notation,code,c,a\n");
        Header all = Header.of(NONE, List.of(one, two));
        assertEquals(List.of("name", "notation", "components", "crossings", "seconds", "b", "a", "c"), all.names());
        assertArrayEquals(new int[] {0, 4, -1}, all.fields(one));
        assertArrayEquals(new int[] {-1, 4, 3}, all.fields(two));
    }

    @Test
    void aKeptColumnWhoseNameIsTakenComesOutAsGiven() throws IOException {
        Header all = Header.of(NONE, List.of(header("name,notation,code,crossings,given.crossings,seconds\n")));
        assertEquals(List.of("name", "notation", "components", "crossings", "seconds", "given.given.crossings",
                "given.crossings", "given.seconds"), all.names());
    }
}
