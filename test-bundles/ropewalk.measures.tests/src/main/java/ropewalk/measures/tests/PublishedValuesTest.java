package ropewalk.measures.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;
import ropewalk.diagram.notation.CodeException;
import ropewalk.diagram.notation.Notations;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value;
import ropewalk.invariant.ValueText;
import ropewalk.invariant.catalogue.CatalogueEntry;
import ropewalk.invariant.catalogue.RankedMethod;
import ropewalk.published.PublishedValue;
import ropewalk.published.PublishedValues;
import ropewalk.testkit.Services;

/** Every published value against every installed method. The sources stand in the rows. */
class PublishedValuesTest {

    private final Installed installed = new Installed();

    @Test
    void everyMethodAgreesWithEveryPublishedValue() {
        List<String> wrong = new ArrayList<>();
        Map<String, LinkDiagram> diagrams = new HashMap<>();
        int compared = 0;
        for (PublishedValue row : PublishedValues.all()) {
            LinkDiagram link = diagrams.computeIfAbsent(row.notation() + " " + row.code(), k -> read(row));
            for (RankedMethod method : installed.entry(row.invariant()).methods()) {
                Outcome<?> outcome = method.measure(link, Effort.ofSeconds(60));
                String found = outcome instanceof Outcome.Exact<?> exact ? exact.value().text() : outcome.toString();
                compared++;
                if (!found.equals(row.value())) {
                    wrong.add(row.place() + ": " + method.id() + " gives " + found + ", published is " + row.value() + " ("
                            + row.source() + ")");
                }
            }
        }
        assertTrue(compared > 1500, "only " + compared + " comparisons");
        assertEquals(List.of(), wrong);
    }

    @Test
    void everyInvariantIsCheckedAgainstSomethingPublished() {
        Set<String> published = new TreeSet<>(PublishedValues.all().stream().map(PublishedValue::invariant).toList());
        assertEquals(new TreeSet<>(installed.entries().stream().map(CatalogueEntry::id).toList()), published);
    }

    @Test
    void everyRowNamesItsSource() {
        for (PublishedValue row : PublishedValues.all()) {
            assertFalse(row.source().isBlank(), row.place() + " has no source");
            assertTrue(row.source().matches(".*(1[89]|20)[0-9][0-9].*")
                    || row.source().replace("recalled", "").chars().filter(Character::isLetter).count() >= 12,
                    row.place() + ": '" + row.source() + "' does not say where the value is from");
        }
    }

    @Test
    void everyRowIsOfAnInstalledInvariantAndInItsNormalForm() {
        for (PublishedValue row : PublishedValues.all()) {
            Class<? extends Value> type = installed.definition(row.invariant()).valueType();
            assertEquals(row.value(), ValueText.read(type, row.value()).text(), row.place());
        }
    }

    @Test
    void noRowOccursTwice() {
        Set<List<String>> met = new HashSet<>();
        for (PublishedValue row : PublishedValues.all()) {
            assertTrue(met.add(List.of(row.notation(), row.code(), row.invariant(), row.name())),
                    row.place() + ": " + row.invariant() + " is given twice for this code");
        }
    }

    /** A table of knots names a knot and its mirror image alike; so the signature counts up to sign. */
    @Test
    void oneNameHasOneValueInEveryNotation() {
        Map<List<String>, PublishedValue> met = new HashMap<>();
        for (PublishedValue row : PublishedValues.all()) {
            PublishedValue before = met.putIfAbsent(List.of(row.name(), row.invariant()), row);
            if (before != null) {
                boolean mirrored = row.invariant().equals("signature") && !row.notation().equals(before.notation())
                        && new BigInteger(row.value()).equals(new BigInteger(before.value()).negate());
                assertTrue(before.value().equals(row.value()) || mirrored, row.place() + " against " + before.place());
            }
        }
    }

    @Test
    void everyFileOfTheBundleIsRead() {
        List<String> files = new ArrayList<>();
        Collections.list(new Services(getClass()).bundle("ropewalk.published")
                .findEntries("/ropewalk/published", "*.csv", false))
                .forEach(url -> files.add(url.getPath().replaceAll(".*/", "")));
        Collections.sort(files);
        assertEquals(PublishedValues.FILES, files);
    }

    @Test
    void aBadTableIsRefused() {
        String header = "name,notation,code,invariant,value,source\n";
        assertThrows(IllegalStateException.class, () -> PublishedValues.parse("x", "name,code\n"));
        assertThrows(IllegalStateException.class, () -> PublishedValues.parse("x", header + "a,b,c,d,e\n"));
        assertThrows(IllegalStateException.class, () -> PublishedValues.parse("x", header + "a,b,c,d,e,f"));
        assertThrows(IllegalStateException.class, () -> PublishedValues.parse("x", header + "a,b,c,d,e,\"f\n"));
        assertEquals("a, \"b\"", PublishedValues.parse("x", header + "\"a, \"\"b\"\"\",b,c,d,e,f\n").get(0).name());
    }

    private static LinkDiagram read(PublishedValue row) {
        byte[] code = row.code().getBytes(StandardCharsets.UTF_8);
        LinkBatch.Builder batch = new LinkBatch.Builder();
        try {
            Notations.reader(row.notation()).orElseThrow(() -> new AssertionError(row.place() + ": no notation "
                    + row.notation())).read(code, 0, code.length, batch);
        } catch (CodeException e) {
            throw new AssertionError(row.place() + ": " + e.getMessage(), e);
        }
        return batch.build().link(0);
    }
}
