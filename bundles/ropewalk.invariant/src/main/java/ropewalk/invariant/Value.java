package ropewalk.invariant;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;

/**
 * A measured value: one of a closed set of records. Each writes and reads one canonical one-line text
 * ({@link ValueText}); equality is equality of that text.
 */
public sealed interface Value {

    /**
     * The canonical text: the cell in results.csv.
     *
     * @return one line
     */
    String text();

    /**
     * A whole number; text {@code -12}.
     *
     * @param value any size
     */
    record IntegerValue(BigInteger value) implements Value {

        // A number that is missing is the method's fault, and must show there.
        public IntegerValue {
            Objects.requireNonNull(value, "a whole number that is null");
        }

        private static final IntegerValue[] SMALL = new IntegerValue[512];

        static {
            for (int i = 0; i < SMALL.length; i++) {
                SMALL[i] = new IntegerValue(BigInteger.valueOf(i - 64L));
            }
        }

        /**
         * A whole number; small ones are shared.
         *
         * @param value any number
         * @return its value
         */
        public static IntegerValue of(long value) {
            return value >= -64 && value < SMALL.length - 64 ? SMALL[(int) value + 64]
                    : new IntegerValue(BigInteger.valueOf(value));
        }

        @Override
        public String text() {
            return value.toString();
        }
    }

    /**
     * A rational number in lowest terms; text {@code 3/4}, whole numbers {@code 3}.
     *
     * @param numerator any
     * @param denominator above 0, coprime to the numerator
     */
    record RationalValue(BigInteger numerator, BigInteger denominator) implements Value {

        // Brings the fraction to lowest terms.
        public RationalValue {
            if (denominator.signum() == 0) {
                throw new IllegalArgumentException("denominator 0");
            }
            BigInteger common = numerator.gcd(denominator);
            if (denominator.signum() < 0) {
                common = common.negate();
            }
            numerator = numerator.divide(common);
            denominator = denominator.divide(common);
        }

        @Override
        public String text() {
            return denominator.equals(BigInteger.ONE) ? numerator.toString() : numerator + "/" + denominator;
        }
    }

    /**
     * A list of whole numbers; text {@code [3,3,0]}.
     *
     * @param values in order
     */
    record IntegerList(List<BigInteger> values) implements Value {

        // Keeps a copy.
        public IntegerList {
            values = List.copyOf(values);
        }

        @Override
        public String text() {
            return ValueText.list(values);
        }
    }

    /**
     * A matrix of whole numbers; text {@code [[0,1],[1,0]]}.
     *
     * @param rows the rows, all of one length
     */
    record IntegerMatrixValue(List<List<BigInteger>> rows) implements Value {

        // Keeps a copy.
        public IntegerMatrixValue {
            // Plain loops: every link of several components has such a value.
            List<List<BigInteger>> copies = new ArrayList<>(rows.size());
            for (List<BigInteger> row : rows) {
                copies.add(List.copyOf(row));
            }
            rows = List.copyOf(copies);
            for (List<BigInteger> row : rows) {
                if (row.size() != rows.get(0).size()) {
                    throw new IllegalArgumentException("rows of " + rows.get(0).size() + " and " + row.size()
                            + " entries; a matrix has rows of one length");
                }
            }
        }

        /**
         * A matrix of small numbers.
         *
         * @param rows its rows
         * @return the value
         */
        public static IntegerMatrixValue of(long[][] rows) {
            List<List<BigInteger>> lists = new ArrayList<>(rows.length);
            for (long[] row : rows) {
                BigInteger[] entries = new BigInteger[row.length];
                for (int j = 0; j < row.length; j++) {
                    entries[j] = BigInteger.valueOf(row[j]);
                }
                lists.add(List.of(entries));
            }
            return new IntegerMatrixValue(lists);
        }

        @Override
        public String text() {
            StringBuilder out = new StringBuilder("[");
            for (int i = 0; i < rows.size(); i++) {
                out.append(i == 0 ? "" : ",").append(ValueText.list(rows.get(i)));
            }
            return out.append(']').toString();
        }
    }

    /**
     * The terms of a polynomial in several variables; text {@code [[[2,0],3],[[4,1],-1]]}: exponents, coefficient.
     * Exponents ascend in dictionary order, no coefficient is 0.
     *
     * @param terms in order
     */
    record PolynomialValue(List<Term> terms) implements Value {

        // Keeps a copy; refuses what is not in order, so that no polynomial has two texts.
        public PolynomialValue {
            terms = List.copyOf(terms);
            for (int i = 0; i < terms.size(); i++) {
                if (terms.get(i).coefficient().signum() == 0) {
                    throw new IllegalArgumentException("the coefficient of term " + (i + 1) + " is 0; leave it out");
                }
                if (i > 0 && !terms.get(i - 1).isBefore(terms.get(i))) {
                    throw new IllegalArgumentException("the exponents " + terms.get(i).exponents() + " come after "
                            + terms.get(i - 1).exponents() + "; give as many for each term, ascending in dictionary order");
                }
            }
        }

        @Override
        public String text() {
            StringBuilder out = new StringBuilder("[");
            for (int i = 0; i < terms.size(); i++) {
                out.append(i == 0 ? "[" : ",[").append(ValueText.list(terms.get(i).exponents())).append(',')
                        .append(terms.get(i).coefficient()).append(']');
            }
            return out.append(']').toString();
        }
    }

    /**
     * One term.
     *
     * @param exponents one for each variable
     * @param coefficient not 0
     */
    record Term(List<BigInteger> exponents, BigInteger coefficient) {

        // Keeps a copy.
        public Term {
            exponents = List.copyOf(exponents);
        }

        /** Whether this term comes first in dictionary order; false for equal exponents and for other numbers of them. */
        private boolean isBefore(Term other) {
            if (exponents.size() != other.exponents.size()) {
                return false;
            }
            for (int i = 0; i < exponents.size(); i++) {
                int order = exponents.get(i).compareTo(other.exponents.get(i));
                if (order != 0) {
                    return order < 0;
                }
            }
            return false;
        }
    }

    /**
     * A step function on an interval; text {@code [v0,[x1,a1,v1],[x2,a2,v2]]}: the value at the left end, then for each
     * jump where it is, the value at it and the value after it, as texts that the invariant defines.
     *
     * @param first the value at the left end
     * @param jumps in ascending order
     */
    record StepsValue(String first, List<Jump> jumps) implements Value {

        // Keeps a copy.
        public StepsValue {
            jumps = List.copyOf(jumps);
        }

        @Override
        public String text() {
            StringBuilder out = new StringBuilder("[").append(ValueText.quoted(first));
            for (Jump jump : jumps) {
                out.append(",[").append(ValueText.quoted(jump.where())).append(',').append(ValueText.quoted(jump.at()))
                        .append(',').append(ValueText.quoted(jump.after())).append(']');
            }
            return out.append(']').toString();
        }
    }

    /**
     * A jump of a step function.
     *
     * @param where its place
     * @param at the value there
     * @param after the value to the right of it
     */
    record Jump(String where, String at, String after) { }

    /**
     * A table with named columns; text {@code [["rank","degree"],["1","3"]]}.
     *
     * @param columns names
     * @param rows cells, as many in each row as there are columns
     */
    record TableValue(List<String> columns, List<List<String>> rows) implements Value {

        // Keeps a copy.
        public TableValue {
            columns = List.copyOf(columns);
            rows = rows.stream().map(List::copyOf).toList();
            for (List<String> row : rows) {
                if (row.size() != columns.size()) {
                    throw new IllegalArgumentException("a row of " + row.size() + " cells under " + columns.size()
                            + " columns");
                }
            }
        }

        @Override
        public String text() {
            StringBuilder out = new StringBuilder("[").append(ValueText.texts(columns));
            for (List<String> row : rows) {
                out.append(',').append(ValueText.texts(row));
            }
            return out.append(']').toString();
        }
    }

    /**
     * A text on one line.
     *
     * @param value without line breaks; not beginning with {@code !}, which marks a failed cell
     */
    record TextValue(String value) implements Value {

        // Refuses what would not be one line, or would look like a failure.
        public TextValue {
            if (value.startsWith("!") || value.chars().anyMatch(TextValue::endsALine)) {
                throw new IllegalArgumentException("a text value is one line and does not begin with '!'");
            }
        }

        private static boolean endsALine(int c) {
            return Character.isISOControl(c) || c == '\u2028' || c == '\u2029';
        }

        @Override
        public String text() {
            return value;
        }
    }
}
