package org.modewright.numerics.internal.eigen;

import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;

import org.modewright.numerics.CancelledException;
import org.modewright.numerics.Progress;

/** Runs a computation that cannot be interrupted on a thread of its own; after a cancel its result is dropped. */
final class CancellableCall {

    private static final int POLL_MILLISECONDS = 50;

    private CancellableCall() {
    }

    static <T> T run(Callable<T> computation, Progress progress) {
        progress.checkCancelled();
        FutureTask<T> task = new FutureTask<>(computation);
        Thread thread = new Thread(task, "dense eigenvalues");
        thread.setDaemon(true);
        thread.start();
        while (true) {
            try {
                return task.get(POLL_MILLISECONDS, TimeUnit.MILLISECONDS);
            } catch (TimeoutException stillRunning) {
                progress.checkCancelled();
            } catch (InterruptedException interrupted) {
                Thread.currentThread().interrupt();
                throw new CancelledException();
            } catch (ExecutionException failed) {
                if (failed.getCause() instanceof RuntimeException cause) {
                    throw cause;
                }
                throw new IllegalStateException(failed.getCause());
            }
        }
    }
}
