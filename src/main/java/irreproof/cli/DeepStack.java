package irreproof.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;

/**
 * Runs work on threads whose stack has an explicit size, so that nesting which works on one machine works on all; as many
 * at a time as there are processors.
 */
final class DeepStack {
    private static final long STACK_BYTES = 4 << 20;

    private DeepStack() {}

    /**
     * @return the results in the order of the tasks
     * @throws Exception what the first task that failed threw
     */
    static <T> List<T> runAll(List<? extends Callable<T>> tasks) throws Exception {
        int threads = Math.max(1, Math.min(tasks.size(), Runtime.getRuntime().availableProcessors()));
        ExecutorService pool = Executors.newFixedThreadPool(threads, work -> {
            Thread thread = new Thread(null, work, "check", STACK_BYTES);
            thread.setDaemon(true);
            return thread;
        });
        try {
            List<Future<T>> running = new ArrayList<>();
            tasks.forEach(task -> running.add(pool.submit(task)));
            List<T> results = new ArrayList<>();
            for (Future<T> future : running) {
                results.add(future.get());
            }
            return results;
        } catch (ExecutionException e) {
            if (e.getCause() instanceof Error fatal) {
                throw fatal;
            }
            throw (Exception) e.getCause();
        } finally {
            pool.shutdownNow();
        }
    }
}
