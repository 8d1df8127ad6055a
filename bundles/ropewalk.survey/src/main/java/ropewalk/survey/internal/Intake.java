package ropewalk.survey.internal;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.Semaphore;
import ropewalk.collection.CollectionHeader;
import ropewalk.collection.CollectionReader;
import ropewalk.collection.RecordBlock;
import ropewalk.collection.Rejection;
import ropewalk.collection.UnreadableCollectionException;

/**
 * Reads the files one after another and hands their blocks to the workers, a bounded number ahead of the writer, so that
 * memory does not grow with the collection.
 */
final class Intake implements Runnable {

    /**
     * The next thing for the writer, in input order: a block that is being measured, a file that could not be read, or
     * the end.
     *
     * @param block the rows to come, or null
     * @param unreadable why a file was left out, or null
     * @param broken why the survey cannot go on, or null
     */
    record Item(CompletableFuture<FinishedBlock> block, Rejection unreadable, Throwable broken) {

        static final Item END = new Item(null, null, null);
    }

    /** Rows that are read and not yet written may take so much, or one block more if that is larger. */
    private static final int BYTES_AHEAD = 32 << 20;

    private final List<Source> sources = new ArrayList<>();
    private final BlockingQueue<Item> inOrder;
    private final Semaphore bytesAhead = new Semaphore(BYTES_AHEAD);
    private volatile boolean stopped;
    private BlockingQueue<Job> jobs;
    private Header header;

    /** A file that was opened, or why it could not be. */
    private record Source(CollectionReader reader, Rejection unreadable) { }

    Intake(List<Path> files, int threads) {
        this.inOrder = new ArrayBlockingQueue<>(8 + 8 * threads);
        for (Path file : files) {
            try {
                sources.add(new Source(CollectionReader.open(file), null));
            } catch (UnreadableCollectionException e) {
                sources.add(new Source(null, e.rejection()));
            }
        }
    }

    List<CollectionHeader> headers() {
        return sources.stream().filter(s -> s.reader() != null).map(s -> s.reader().header()).toList();
    }

    static long bytesInAll(List<Path> files) {
        long sum = 0;
        for (Path file : files) {
            try {
                sum += Files.size(file);
            } catch (IOException e) {
                return 0;       // a pipe has no size
            }
        }
        return sum;
    }

    void start(Header forHeader, BlockingQueue<Job> forJobs) {
        header = forHeader;
        jobs = forJobs;
        Thread thread = new Thread(this, "survey intake");
        thread.setDaemon(true);
        thread.start();
    }

    /** The next item; {@link Item#END} at the end. */
    Item next() throws InterruptedException {
        return inOrder.take();
    }

    /** To be called when a block is written and forgotten. */
    void written(RecordBlock block) {
        bytesAhead.release(weight(block));
    }

    private static int weight(RecordBlock block) {
        return Math.min(block.bytes().length, BYTES_AHEAD);
    }

    void stop() {
        stopped = true;
    }

    @Override
    public void run() {
        try {
            for (Source source : sources) {
                if (source.unreadable() != null) {
                    inOrder.put(new Item(null, source.unreadable(), null));
                } else {
                    read(source.reader());
                }
            }
            inOrder.put(Item.END);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        } catch (Throwable e) {
            inOrder.offer(new Item(null, null, e));
        }
    }

    private void read(CollectionReader reader) throws InterruptedException {
        int[] kept = header.fields(reader.header());
        try (reader) {
            RecordBlock block = reader.next();
            while (block != null && !stopped) {
                bytesAhead.acquire(weight(block));
                Job job = new Job(block, kept);
                inOrder.put(new Item(job.finished, null, null));
                jobs.add(job);
                block = reader.next();
            }
        } catch (UnreadableCollectionException e) {
            inOrder.put(new Item(null, e.rejection(), null));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
