package quayside.faulty;

import java.math.BigInteger;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.Value;
import ropewalk.invariant.Value.IntegerValue;

/** What can go wrong in a method that somebody else wrote. */
public final class Faults {

    private Faults() {
    }

    private static final String A = Method.ID + "=";
    private static final String B = Method.INVARIANT + "=";

    /** Throws. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.throws.m", B + "faulty.throws"})
    public static final class Throws extends FaultyInvariant {

        /** Made by the framework. */
        public Throws() {
            super("faulty.throws");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            throw new IllegalStateException("the table\nhas no row for this");
        }
    }

    /** Throws what is neither an exception nor an error of the JVM. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.error.m", B + "faulty.error"})
    public static final class ThrowsError extends FaultyInvariant {

        /** Made by the framework. */
        public ThrowsError() {
            super("faulty.error");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            throw new Error("an error of its own");
        }
    }

    /** Throws a checked exception that it did not declare, as methods in other languages do. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.checked.m", B + "faulty.checked"})
    public static final class ThrowsChecked extends FaultyInvariant {

        /** Made by the framework. */
        public ThrowsChecked() {
            super("faulty.checked");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            throw sneaky(new java.io.IOException("no such table"));
        }

        @SuppressWarnings("unchecked")
        private static <T extends Throwable> RuntimeException sneaky(Throwable fault) throws T {
            throw (T) fault;
        }
    }

    /** Returns no outcome. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.null.m", B + "faulty.null"})
    public static final class ReturnsNull extends FaultyInvariant {

        /** Made by the framework. */
        public ReturnsNull() {
            super("faulty.null");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            return null;
        }
    }

    /** Returns an outcome without a value. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.novalue.m", B + "faulty.novalue"})
    public static final class ReturnsNoValue extends FaultyInvariant {

        /** Made by the framework. */
        public ReturnsNoValue() {
            super("faulty.novalue");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            return new Outcome.Exact<>(null);
        }
    }

    /** Returns a number that is none. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.hollow.m", B + "faulty.hollow"})
    public static final class ReturnsHollowValue extends FaultyInvariant {

        /** Made by the framework. */
        public ReturnsHollowValue() {
            super("faulty.hollow");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            return new Outcome.Exact<>(new IntegerValue(null));
        }
    }

    /** Returns a value of another type than its invariant declares. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.type.m", B + "faulty.type"})
    public static final class ReturnsWrongType extends FaultyInvariant {

        /** Made by the framework. */
        public ReturnsWrongType() {
            super("faulty.type");
        }

        @Override
        @SuppressWarnings({"unchecked", "rawtypes"})
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            return (Outcome) new Outcome.Exact<Value>(new Value.IntegerList(List.of(BigInteger.ONE)));
        }
    }

    /** Calls itself without end. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.deep.m", B + "faulty.deep"})
    public static final class Recurses extends FaultyInvariant {

        /** Made by the framework. */
        public Recurses() {
            super("faulty.deep");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            return measure(link, effort);
        }
    }

    /** Wants more memory than there is. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.huge.m", B + "faulty.huge"})
    public static final class Allocates extends FaultyInvariant {

        /** Made by the framework. */
        public Allocates() {
            super("faulty.huge");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            long[][] rows = new long[1 << 10][];
            for (int i = 0; i < rows.length; i++) {
                rows[i] = new long[1 << 28];
            }
            return new Outcome.Exact<>(IntegerValue.of(rows[link.crossings()].length));
        }
    }

    /** Calculates without end and never looks at its effort. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.spins.m", B + "faulty.spins"})
    public static final class Spins extends FaultyInvariant {

        /** Made by the framework. */
        public Spins() {
            super("faulty.spins");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            long x = link.crossings();
            while (x != 0) {
                x = x * 6_364_136_223_846_793_005L + 1 | 1;
            }
            return new Outcome.Exact<>(IntegerValue.of(x));
        }
    }

    /** Calculates without end and looks at its effort, as it should. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.slow.m", B + "faulty.slow"})
    public static final class Slow extends FaultyInvariant {

        /** Made by the framework. */
        public Slow() {
            super("faulty.slow");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            while (true) {
                effort.checkpoint();
            }
        }
    }

    /** Waits for what never comes. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.sleeps.m", B + "faulty.sleeps"})
    public static final class Sleeps extends FaultyInvariant {

        /** Made by the framework. */
        public Sleeps() {
            super("faulty.sleeps");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            CountDownLatch never = new CountDownLatch(1);
            while (never.getCount() > 0) {
                try {
                    never.await();
                } catch (InterruptedException deaf) {
                    continue;
                }
            }
            return null;
        }
    }

    /** Waits in the operating system, where Java takes the thread for one that runs. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.blocks.m", B + "faulty.blocks"})
    public static final class Blocks extends FaultyInvariant {

        /** Made by the framework. */
        public Blocks() {
            super("faulty.blocks");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            try {
                Process quiet = new ProcessBuilder("sleep", "60").start();
                try (java.io.InputStream output = quiet.getInputStream()) {
                    return new Outcome.Exact<>(IntegerValue.of(output.read()));
                }
            } catch (java.io.IOException fault) {
                return new Outcome.Failed<>(fault.toString());
            }
        }
    }

    /** Leaves its thread interrupted. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.interrupts.m", B + "faulty.interrupts"})
    public static final class Interrupts extends FaultyInvariant {

        /** Made by the framework. */
        public Interrupts() {
            super("faulty.interrupts");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("left interrupted");
        }
    }

    /** Takes batches, tells nothing of the link it cannot measure, and something of links that are not there. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.batch.m", B + "faulty.batch"})
    public static final class SkipsInBatch extends FaultyInvariant {

        /** Made by the framework. */
        public SkipsInBatch() {
            super("faulty.batch");
        }

        @Override
        public void measureAll(LinkBatch batch, Effort effort, Method.Sink<IntegerValue> sink) {
            for (int i = 0; i < batch.size(); i++) {
                if (batch.link(i).crossings() != 3) {
                    sink.accept(i, measure(batch.link(i), effort));
                }
            }
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            return new Outcome.Failed<>("not reached");
        }
    }
}
