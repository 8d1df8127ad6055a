package ropewalk.invariant;

import org.osgi.annotation.versioning.ConsumerType;
import ropewalk.diagram.LinkBatch;
import ropewalk.diagram.LinkDiagram;

/**
 * One implementation of an invariant: a Declarative Services component with the properties {@link #ID} and
 * {@link #INVARIANT}. Several methods of one invariant are rivals; the applicable one with the highest
 * {@code service.ranking} fills the cell, ties by id.
 *
 * <p>A method is stateless, thread-safe and deterministic: equal diagrams give equal outcomes, on every machine.
 *
 * @param <V> the type of the value
 */
@ConsumerType
public interface Method<V extends Value> {

    /** Service property: the method's own id, for example {@code determinant.goeritz}. Required. */
    String ID = "ropewalk.method";

    /** Service property: the id of the invariant that it measures, for example {@code determinant}. Required. */
    String INVARIANT = "ropewalk.invariant";

    /**
     * Measures one link.
     *
     * @param link any diagram
     * @param effort call {@link Effort#checkpoint} at least every few milliseconds of work and let through what it
     *        throws
     * @return the value, or why there is none
     */
    Outcome<V> measure(LinkDiagram link, Effort effort);

    /**
     * Measures a batch; the survey calls only this one. Override it for speed alone: the outcomes are those of
     * {@link #measure}.
     *
     * @param batch a few hundred links
     * @param effort bounds each link by itself; call {@link Effort#restart} before each
     * @param sink takes one outcome for each link, in order
     */
    default void measureAll(LinkBatch batch, Effort effort, Sink<V> sink) {
        for (int i = 0; i < batch.size(); i++) {
            effort.restart();
            Outcome<V> outcome;
            try {
                outcome = measure(batch.link(i), effort);
            } catch (Effort.SpentException e) {
                outcome = new Outcome.OutOfEffort<>(e.getMessage());
            }
            sink.accept(i, outcome);
        }
    }

    /**
     * Takes the outcomes of a batch.
     *
     * @param <V> the type of the value
     */
    @FunctionalInterface
    interface Sink<V extends Value> {
        /**
         * Takes one outcome.
         *
         * @param index the link's place in the batch
         * @param outcome its outcome
         */
        void accept(int index, Outcome<V> outcome);
    }
}
