package irreproof.server;

import java.time.Duration;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.ThreadFactory;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;

/** The server's own threads, all of them daemons: two that analyse, and one that waits for pauses in the typing. */
final class Workers {
    /** The readers of nested input recurse; the bounds they keep are far inside this stack. */
    private static final long STACK_BYTES = 16L << 20;

    private static final int ANALYSTS = 2;

    private final ExecutorService analysts = Executors.newFixedThreadPool(ANALYSTS, named("irreproof-analysis"));
    private final ScheduledExecutorService timer = Executors.newSingleThreadScheduledExecutor(named("irreproof-timer"));

    void run(Runnable work) {
        analysts.execute(work);
    }

    void runAfter(Duration pause, Runnable work) {
        timer.schedule(() -> run(work), pause.toMillis(), TimeUnit.MILLISECONDS);
    }

    /** Lets all work come to its end, those that wait for a pause included; gives up after the time limit. */
    void finish(Duration limit) {
        try {
            timer.shutdown();
            timer.awaitTermination(limit.toMillis(), TimeUnit.MILLISECONDS);
            analysts.shutdown();
            analysts.awaitTermination(limit.toMillis(), TimeUnit.MILLISECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    void stop() {
        timer.shutdownNow();
        analysts.shutdownNow();
    }

    static ThreadFactory named(String name) {
        AtomicInteger count = new AtomicInteger();
        return work -> {
            Thread thread = new Thread(null, work, name + "-" + count.incrementAndGet(), STACK_BYTES);
            thread.setDaemon(true);
            return thread;
        };
    }
}
