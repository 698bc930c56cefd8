package org.modewright.testsupport;

import java.util.concurrent.Callable;
import java.util.concurrent.atomic.AtomicReference;
import org.eclipse.swt.widgets.Display;

/** Runs parts of a test on the user interface's thread and waits for what it brings about. */
public final class UiThread {

    private static final long PATIENCE_MILLISECONDS = 60_000;
    private static final long PAUSE_MILLISECONDS = 20;

    private final Display display;

    UiThread(Display display) {
        this.display = display;
    }

    public Display display() {
        return display;
    }

    /** A value from the user interface's thread; what is thrown there is thrown here. */
    public <T> T get(Callable<T> question) {
        AtomicReference<T> answer = new AtomicReference<>();
        AtomicReference<Throwable> failure = new AtomicReference<>();
        display.syncExec(() -> {
            try {
                answer.set(question.call());
            } catch (Throwable thrown) {
                failure.set(thrown);
            }
        });
        if (failure.get() instanceof Error error) {
            throw error;
        }
        if (failure.get() instanceof RuntimeException exception) {
            throw exception;
        }
        if (failure.get() != null) {
            throw new IllegalStateException(failure.get());
        }
        return answer.get();
    }

    /** Does something on the user interface's thread and returns when it is done. */
    public void run(Runnable action) {
        get(() -> {
            action.run();
            return null;
        });
    }

    /** Does something on the user interface's thread without waiting, such as opening a dialogue that stays open. */
    public void later(Runnable action) {
        display.asyncExec(action);
    }

    /**
     * Waits until a condition holds on the user interface's thread.
     *
     * @param what what is waited for, for the message of a failure
     * @throws AssertionError if it does not hold within a minute
     */
    public void waitUntil(String what, Callable<Boolean> condition) {
        long end = System.currentTimeMillis() + PATIENCE_MILLISECONDS;
        while (!get(condition)) {
            if (System.currentTimeMillis() > end) {
                throw new AssertionError("Waited a minute in vain for: " + what);
            }
            pause();
        }
    }

    /** Waits for a value that is not null. */
    public <T> T waitFor(String what, Callable<T> question) {
        AtomicReference<T> found = new AtomicReference<>();
        waitUntil(what, () -> {
            found.set(question.call());
            return found.get() != null;
        });
        return found.get();
    }

    private static void pause() {
        try {
            Thread.sleep(PAUSE_MILLISECONDS);
        } catch (InterruptedException interrupted) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("The test was interrupted.", interrupted);
        }
    }
}
