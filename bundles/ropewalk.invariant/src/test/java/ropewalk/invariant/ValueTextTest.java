package ropewalk.invariant;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import ropewalk.invariant.Value.IntegerList;
import ropewalk.invariant.Value.IntegerMatrixValue;
import ropewalk.invariant.Value.IntegerValue;
import ropewalk.invariant.Value.Jump;
import ropewalk.invariant.Value.PolynomialValue;
import ropewalk.invariant.Value.RationalValue;
import ropewalk.invariant.Value.StepsValue;
import ropewalk.invariant.Value.TableValue;
import ropewalk.invariant.Value.Term;
import ropewalk.invariant.Value.TextValue;

class ValueTextTest {

    private static BigInteger big(long n) {
        return BigInteger.valueOf(n);
    }

    private static void assertRoundTrip(String text, Value value) {
        assertEquals(text, value.text());
        Value read = ValueText.read(value.getClass(), text);
        assertEquals(value, read);
        assertEquals(value.hashCode(), read.hashCode());
        assertFalse(text.contains("\n"));
    }

    private static void assertRefused(Class<? extends Value> type, String text) {
        assertThrows(IllegalArgumentException.class, () -> ValueText.read(type, text), text);
    }

    @Test
    void everyRecordByHand() {
        assertRoundTrip("-12", IntegerValue.of(-12));
        assertRoundTrip("0", IntegerValue.of(0));
        assertRoundTrip("3/4", new RationalValue(big(-6), big(-8)));
        assertRoundTrip("-3/4", new RationalValue(big(6), big(-8)));
        assertRoundTrip("3", new RationalValue(big(9), big(3)));
        assertRoundTrip("0", new RationalValue(big(0), big(-7)));
        assertRoundTrip("[3,3,0]", new IntegerList(List.of(big(3), big(3), big(0))));
        assertRoundTrip("[]", new IntegerList(List.of()));
        assertRoundTrip("[[0,1],[1,0]]", IntegerMatrixValue.of(new long[][] {{0, 1}, {1, 0}}));
        assertRoundTrip("[]", IntegerMatrixValue.of(new long[0][0]));
        assertRoundTrip("[[],[]]", IntegerMatrixValue.of(new long[2][0]));
        assertRoundTrip("[[[2,0],3],[[4,1],-1]]", new PolynomialValue(List.of(
                new Term(List.of(big(2), big(0)), big(3)), new Term(List.of(big(4), big(1)), big(-1)))));
        assertRoundTrip("[]", new PolynomialValue(List.of()));
        assertRoundTrip("[\"0\",[\"1/2\",\"-1\",\"-2\"]]", new StepsValue("0", List.of(new Jump("1/2", "-1", "-2"))));
        assertRoundTrip("[\"0\"]", new StepsValue("0", List.of()));
        assertRoundTrip("[[\"rank\",\"degree\"],[\"1\",\"3\"]]",
                new TableValue(List.of("rank", "degree"), List.of(List.of("1", "3"))));
        assertRoundTrip("[[]]", new TableValue(List.of(), List.of()));
        assertRoundTrip("a \"b\", [c", new TextValue("a \"b\", [c"));
    }

    @Test
    void hugeIntegers() {
        BigInteger huge = BigInteger.TEN.pow(3000).subtract(BigInteger.ONE).negate();
        assertRoundTrip("-" + "9".repeat(3000), new IntegerValue(huge));
        assertRoundTrip("[-" + "9".repeat(3000) + ",1]", new IntegerList(List.of(huge, BigInteger.ONE)));
        assertRoundTrip("-" + "9".repeat(3000) + "/2", new RationalValue(huge, big(2)));
        for (long n : new long[] {Long.MIN_VALUE, Long.MAX_VALUE, -65, -64, 447, 448, Integer.MIN_VALUE}) {
            assertRoundTrip(Long.toString(n), IntegerValue.of(n));
            assertEquals(new IntegerValue(big(n)), IntegerValue.of(n));
        }
    }

    @Test
    void awkwardTexts() {
        String awkward = "\"\\\n\r\t\u0000\u001f\u007f\u0085/é漢\uD83D\uDE00\u2028]";
        assertRoundTrip("[" + ValueText.quoted(awkward) + "]", new StepsValue(awkward, List.of()));
        assertRoundTrip("[[\"a,b\",\"[]\"],[\"\",\"\\\\\"]]",
                new TableValue(List.of("a,b", "[]"), List.of(List.of("", "\\"))));
    }

    @Test
    void randomValues() {
        for (int seed = 0; seed < 300; seed++) {
            Random random = new Random(seed);
            List<Value> values = List.of(
                    new IntegerValue(new BigInteger(random.nextInt(200), random).subtract(big(random.nextInt()))),
                    new RationalValue(new BigInteger(90, random).subtract(BigInteger.TWO.pow(89)),
                            new BigInteger(60, random).add(BigInteger.ONE)),
                    new IntegerList(numbers(random, random.nextInt(6))),
                    matrix(random),
                    new StepsValue(text(random), jumps(random)),
                    table(random));
            for (Value value : values) {
                assertEquals(value, ValueText.read(value.getClass(), value.text()), "seed " + seed);
            }
        }
    }

    private static List<BigInteger> numbers(Random random, int size) {
        List<BigInteger> numbers = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            numbers.add(new BigInteger(random.nextInt(80), random).multiply(big(random.nextInt(3) - 1)));
        }
        return numbers;
    }

    private static IntegerMatrixValue matrix(Random random) {
        int columns = random.nextInt(4);
        List<List<BigInteger>> rows = new ArrayList<>();
        for (int i = random.nextInt(4); i > 0; i--) {
            rows.add(numbers(random, columns));
        }
        return new IntegerMatrixValue(rows);
    }

    private static String text(Random random) {
        StringBuilder out = new StringBuilder();
        for (int i = random.nextInt(8); i > 0; i--) {
            out.append((char) (random.nextInt(4) == 0 ? random.nextInt(0xd800) : random.nextInt(128)));
        }
        return out.toString();
    }

    private static List<Jump> jumps(Random random) {
        List<Jump> jumps = new ArrayList<>();
        for (int i = random.nextInt(4); i > 0; i--) {
            jumps.add(new Jump(text(random), text(random), text(random)));
        }
        return jumps;
    }

    private static TableValue table(Random random) {
        int columns = random.nextInt(3);
        List<List<String>> rows = new ArrayList<>();
        for (int i = 1 + random.nextInt(3); i > 0; i--) {
            List<String> row = new ArrayList<>();
            for (int j = 0; j < columns; j++) {
                row.add(text(random));
            }
            rows.add(row);
        }
        return new TableValue(rows.get(0), rows.subList(1, rows.size()));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " 1", "1 ", "+1", "-0", "01", "1.0", "1e3", "٣", "0x1", "--1", "1/1", "[1]", "null"})
    void integersThatAreNotCanonical(String text) {
        assertRefused(IntegerValue.class, text);
    }

    @ParameterizedTest
    @ValueSource(strings = {"2/4", "1/-2", "-1/-2", "3/1", "0/5", "1/0", "/2", "1/", "1/2/3", "1 /2", "", "+1/2"})
    void rationalsThatAreNotCanonical(String text) {
        assertRefused(RationalValue.class, text);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"IntegerList|[1, 2]", "IntegerList|[1,2", "IntegerList|[1,2]]", "IntegerList|[1,]",
        "IntegerList|[,1]", "IntegerList|[\"1\"]", "IntegerList|[[1]]", "IntegerList|1", "IntegerList|[-0]",
        "IntegerList|[01]", "IntegerList|[1.5]", "IntegerList|[-]", "IntegerList|\"[1]\"", "IntegerList|{}",
        "IntegerMatrixValue|[1,2]", "IntegerMatrixValue|[[1],[1,2]]", "IntegerMatrixValue|[[\"1\"]]",
        "IntegerMatrixValue|[[1] ,[2]]", "PolynomialValue|[[1,2]]", "PolynomialValue|[[[1],2,3]]",
        "PolynomialValue|[[[1],\"2\"]]", "PolynomialValue|[[[1]]]", "StepsValue|[]", "StepsValue|[0]",
        "StepsValue|[\"0\",[\"1\",\"2\"]]", "StepsValue|[\"0\",\"1\"]", "StepsValue|[\"\\u0041\"]",
        "StepsValue|[\"\\/\"]", "StepsValue|[\"\\u00\"]", "StepsValue|[\"\\\"]", "StepsValue|[\"a]", "TableValue|[]",
        "TableValue|[[\"a\"],[]]", "TableValue|[[\"a\"],[\"b\",\"c\"]]", "TableValue|[[1]]", "TableValue|\"a\""})
    void textsThatAreNotCanonical(String type, String text) throws ClassNotFoundException {
        assertRefused(Class.forName("ropewalk.invariant.Value$" + type).asSubclass(Value.class), text);
    }

    @Test
    void deepNestingIsRefusedAndNotFollowed() {
        assertRefused(IntegerList.class, "[".repeat(200_000));
        assertRefused(IntegerList.class, "[".repeat(200_000) + "]".repeat(200_000));
    }

    /** Equality is equality of text: one polynomial must not have two texts. */
    @Test
    void polynomialsHaveOneText() {
        assertRefused(PolynomialValue.class, "[[[0],0]]");
        assertRefused(PolynomialValue.class, "[[[1],2],[[0],3]]");
        assertRefused(PolynomialValue.class, "[[[0],2],[[0],3]]");
        assertRefused(PolynomialValue.class, "[[[0],2],[[0,1],3]]");
    }

    @Test
    void textsAreOneLineAndNoFailure() {
        for (String bad : List.of("!x", "a\nb", "a\rb", "\t", "\u0000", "a\u0085b", "a\u2028b", "a\u2029b")) {
            assertThrows(IllegalArgumentException.class, () -> new TextValue(bad));
        }
        assertEquals("a!", new TextValue("a!").text());
    }

    @Test
    void matricesAndTablesAreRectangular() {
        assertThrows(IllegalArgumentException.class, () -> IntegerMatrixValue.of(new long[][] {{1}, {1, 2}}));
        assertThrows(IllegalArgumentException.class, () -> new TableValue(List.of("a"), List.of(List.of())));
        assertThrows(IllegalArgumentException.class, () -> new RationalValue(BigInteger.ONE, BigInteger.ZERO));
    }

    @Test
    void callersCannotChangeAValue() {
        List<BigInteger> row = new ArrayList<>(List.of(BigInteger.ONE));
        List<List<BigInteger>> rows = new ArrayList<>(List.of(row));
        IntegerList list = new IntegerList(row);
        IntegerMatrixValue matrix = new IntegerMatrixValue(rows);
        row.add(BigInteger.TEN);
        rows.clear();
        assertEquals("[1]", list.text());
        assertEquals("[[1]]", matrix.text());
    }

    @Test
    void quotedTextsHaveNoControlCharacters() {
        assertEquals("\"a\\u007f\\u009f\\n\"", ValueText.quoted("a\u007f\u009f\n"));
        assertTrue(ValueText.quoted("é").contains("é"));
    }
}
