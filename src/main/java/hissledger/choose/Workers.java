package hissledger.choose;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.IntFunction;

/** Independent pieces of work on several threads, results in their order; interrupting the caller ends them all. */
final class Workers {
    private Workers() {}

    /**
     * The results of {@code work} for 0 to {@code count} − 1.
     *
     * @throws CancellationException if the calling thread is interrupted; its interrupt stays set
     */
    static <T> List<T> map(int count, int threads, IntFunction<T> work) {
        ExecutorService pool = Executors.newFixedThreadPool(threads, task -> {
            Thread thread = new Thread(task, "hissledger worker");
            thread.setDaemon(true);
            return thread;
        });
        try {
            List<Future<T>> futures = new ArrayList<>();
            for (int k = 0; k < count; k++) {
                int piece = k;
                futures.add(pool.submit(() -> unlessInterrupted(piece, work)));
            }
            List<T> results = new ArrayList<>();
            for (Future<T> future : futures) {
                results.add(future.get());
            }
            return results;
        } catch (InterruptedException interrupted) {
            Thread.currentThread().interrupt();
            throw cancelled();
        } catch (ExecutionException failed) {
            if (failed.getCause() instanceof RuntimeException mistake) {
                throw mistake;
            }
            throw new IllegalStateException(failed.getCause());
        } finally {
            pool.shutdownNow();
        }
    }

    private static <T> T unlessInterrupted(int piece, IntFunction<T> work) {
        if (Thread.interrupted()) {
            throw cancelled();
        }
        return work.apply(piece);
    }

    private static CancellationException cancelled() {
        return new CancellationException("the computation was cancelled");
    }
}
