package quayside.faulty;

import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import org.osgi.service.component.annotations.Component;
import ropewalk.diagram.LinkDiagram;
import ropewalk.invariant.Bipartition;
import ropewalk.invariant.Effort;
import ropewalk.invariant.Invariant;
import ropewalk.invariant.InvariantBase;
import ropewalk.invariant.Method;
import ropewalk.invariant.Outcome;
import ropewalk.invariant.SplitLaw;
import ropewalk.invariant.Value.IntegerValue;

/** Definitions and laws that are not as they should be. */
public final class Claims {

    private Claims() {
    }

    private static final String A = Method.ID + "=";
    private static final String B = Method.INVARIANT + "=";

    /** Somebody else's determinant. */
    @Component(service = Invariant.class)
    public static final class OtherDeterminant extends InvariantBase<IntegerValue> {

        /** Made by the framework. */
        public OtherDeterminant() {
            super("determinant", "Signed determinant", "A determinant with a sign (made by a test).", IntegerValue.class);
        }
    }

    /** A method that says not which invariant it measures. */
    @Component(service = Method.class, property = A + "faulty.orphan.m")
    public static final class Orphan implements Method<IntegerValue> {

        @Override
        public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
            return new Outcome.Exact<>(IntegerValue.of(0));
        }
    }

    /** A method without an id. */
    @Component(service = Method.class, property = B + "determinant")
    public static final class Nameless implements Method<IntegerValue> {

        @Override
        public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
            return new Outcome.Exact<>(IntegerValue.of(0));
        }
    }

    /** An invariant with a law that throws. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.law.m", B + "faulty.law"})
    public static final class ThrowingLaw extends FaultyInvariant {

        /** Made by the framework. */
        public ThrowingLaw() {
            super("faulty.law");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            return new Outcome.Exact<>(IntegerValue.of(3));
        }

        @Override
        public Optional<SplitLaw<IntegerValue>> splitLaw() {
            return Optional.of(new SplitLaw<>() {
                @Override
                public IntegerValue union(IntegerValue left, IntegerValue right, Bipartition which) {
                    throw new ArithmeticException("the law fails");
                }
            });
        }
    }

    /** A law with a method that hangs on every link of two components. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.hanginglaw.m", B + "faulty.hanginglaw"})
    public static final class HangingLaw extends InvariantBase<IntegerValue> implements Method<IntegerValue> {

        /** Made by the framework. */
        public HangingLaw() {
            super("faulty.hanginglaw", "Hangs", "Nothing of interest (made by a test).", IntegerValue.class);
        }

        @Override
        public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
            if (link.components() < 2) {
                return new Outcome.Exact<>(IntegerValue.of(1));
            }
            CountDownLatch never = new CountDownLatch(1);
            while (true) {
                try {
                    never.await();
                } catch (InterruptedException deaf) {
                    continue;
                }
            }
        }

        @Override
        public Optional<SplitLaw<IntegerValue>> splitLaw() {
            return Optional.of((left, right, which) -> left);
        }
    }

    /** A definition that gives null where it should give an empty answer. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "faulty.nulllaw.m", B + "faulty.nulllaw"})
    public static final class NullLaw extends FaultyInvariant {

        /** Made by the framework. */
        public NullLaw() {
            super("faulty.nulllaw");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            return new Outcome.Exact<>(IntegerValue.of(3));
        }

        @Override
        public Optional<SplitLaw<IntegerValue>> splitLaw() {
            return null;
        }
    }

    /** A definition without an id. */
    @Component(service = Invariant.class)
    public static final class NullId extends InvariantBase<IntegerValue> {

        /** Made by the framework. */
        public NullId() {
            super(null, null, null, null);
        }
    }

    /** A component that cannot be made. */
    @Component(service = Method.class, property = {A + "faulty.unmade.m", B + "determinant", "service.ranking:Integer=500"})
    public static final class Unmade implements Method<IntegerValue> {

        /** Made by the framework, which does not succeed. */
        public Unmade() {
            throw new IllegalStateException("the tables are missing");
        }

        @Override
        public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
            return new Outcome.Exact<>(IntegerValue.of(0));
        }
    }

    /** A method of an invariant that nobody defines. */
    @Component(service = Method.class, property = {A + "faulty.undefined.m", B + "faulty.undefined"})
    public static final class Undefined implements Method<IntegerValue> {

        @Override
        public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
            return new Outcome.Exact<>(IntegerValue.of(0));
        }
    }

    /** An id that is a column of the results already. */
    @Component(service = {Invariant.class, Method.class}, property = {A + "verdict.m", B + "verdict"})
    public static final class TakenId extends FaultyInvariant {

        /** Made by the framework. */
        public TakenId() {
            super("verdict");
        }

        @Override
        Outcome<IntegerValue> fail(LinkDiagram link, Effort effort) {
            return new Outcome.Exact<>(IntegerValue.of(3));
        }
    }

    /** A rival of the determinant that is wrong on links of 3 crossings. */
    @Component(service = Method.class, property = {A + "faulty.rival.m", B + "determinant", "service.ranking:Integer=-20"})
    public static final class WrongRival implements Method<IntegerValue> {

        @Override
        public Outcome<IntegerValue> measure(LinkDiagram link, Effort effort) {
            return link.crossings() == 3 ? new Outcome.Exact<>(IntegerValue.of(4))
                    : new Outcome.NotApplicable<>("covers links of 3 crossings");
        }
    }
}
