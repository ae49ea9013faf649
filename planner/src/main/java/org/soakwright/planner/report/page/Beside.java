package org.soakwright.planner.report.page;

import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;

/** Work done beside other work, which it shares nothing with: drawing and printing take about as long as each other. */
final class Beside<T> {
    private final FutureTask<T> task;

    private Beside(FutureTask<T> task) {
        this.task = task;
    }

    static <T> Beside<T> begin(Callable<T> work) {
        FutureTask<T> task = new FutureTask<>(work);
        Thread thread = new Thread(task, "beside");
        thread.setDaemon(true);
        thread.start();
        return new Beside<>(task);
    }

    /** Waits for it; what it failed with is thrown here. */
    T result() {
        try {
            return task.get();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("interrupted", e);
        } catch (ExecutionException e) {
            if (e.getCause() instanceof RuntimeException failure) {
                throw failure;
            }
            if (e.getCause() instanceof Error failure) {
                throw failure;
            }
            throw new IllegalStateException(e.getCause());
        }
    }
}
