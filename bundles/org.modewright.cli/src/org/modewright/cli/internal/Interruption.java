package org.modewright.cli.internal;

/**
 * Ctrl-C: the process is asked to end, the running work is told to stop, and the process waits a moment for it, so that nothing is left
 * half done.
 */
public final class Interruption implements AutoCloseable {

    private static final long LONGEST_WAIT = 2000;

    private final Thread worker = Thread.currentThread();
    private final Thread hook = new Thread(this::request, "interruption");
    private volatile boolean requested;
    private volatile boolean finished;

    /** Watches for the end of the process while the calling thread works. */
    public Interruption() {
        Runtime.getRuntime().addShutdownHook(hook);
    }

    /** Whether the work shall stop. */
    public boolean isRequested() {
        return requested;
    }

    private void request() {
        requested = true;
        long end = System.nanoTime() + LONGEST_WAIT * 1_000_000;
        while (!finished && worker.isAlive() && System.nanoTime() < end) {
            try {
                Thread.sleep(20);
            } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
                return;
            }
        }
    }

    /** The work is done. */
    @Override
    public void close() {
        finished = true;
        if (!requested) {
            try {
                Runtime.getRuntime().removeShutdownHook(hook);
            } catch (IllegalStateException e) {
                // the process ends already, and the hook with it
                requested = true;
            }
        }
    }
}
