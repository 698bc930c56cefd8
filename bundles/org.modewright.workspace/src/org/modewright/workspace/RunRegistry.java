package org.modewright.workspace;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.List;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.ILog;

/**
 * Where runs are announced and held while the workbench is open: the one place from which every window learns of a new result. An OSGi
 * service. Safe for use from several threads; listeners are called on the thread that publishes.
 */
public final class RunRegistry {

    /** Told of runs, on the thread that runs them. */
    public interface Listener {

        /** A run has begun. */
        void runStarted(IFile model);

        /**
         * A run has ended.
         *
         * @param run what was found; null if the run was cancelled or failed
         * @param problem why there is no result, in one sentence; null if there is one or the user cancelled
         */
        void runEnded(IFile model, StoredRun run, String problem);
    }

    /** Results of big models are large: older ones are read from disk again when they are wanted. */
    private static final int HELD = 8;

    private final RunStore store;
    private final List<Listener> listeners = new CopyOnWriteArrayList<>();
    private final Set<IFile> running = ConcurrentHashMap.newKeySet();
    private final Map<IFile, StoredRun> held = new LinkedHashMap<>(16, 0.75f, true) {
        private static final long serialVersionUID = 1L;

        @Override
        protected boolean removeEldestEntry(Map.Entry<IFile, StoredRun> eldest) {
            return size() > HELD;
        }
    };

    public RunRegistry(RunStore store) {
        this.store = store;
    }

    /** Tells a listener of the runs from now on. */
    public void addListener(Listener listener) {
        listeners.add(listener);
    }

    /** Tells a listener no longer. */
    public void removeListener(Listener listener) {
        listeners.remove(listener);
    }

    /** Whether a run of a model is under way. */
    public boolean isRunning(IFile model) {
        return running.contains(model);
    }

    /** The last run of a model if it is held in memory; reads nothing. */
    public Optional<StoredRun> held(IFile model) {
        synchronized (held) {
            return Optional.ofNullable(held.get(model));
        }
    }

    /**
     * The last run of a model, read from disk if need be: not for the user interface's thread.
     *
     * @throws RunStoreException if the kept result cannot be read
     */
    public Optional<StoredRun> lastRun(IFile model) throws RunStoreException {
        Optional<StoredRun> inMemory = held(model);
        if (inMemory.isPresent()) {
            return inMemory;
        }
        Optional<StoredRun> loaded = store.load(model);
        loaded.ifPresent(run -> hold(model, run));
        return loaded;
    }

    /** Forgets what is held of a model, for instance because its file has gone. */
    public void forget(IFile model) {
        synchronized (held) {
            held.remove(model);
        }
    }

    RunStore store() {
        return store;
    }

    /** Marks the beginning of a run; false if one is under way already. */
    boolean begin(IFile model) {
        if (!running.add(model)) {
            return false;
        }
        listeners.forEach(listener -> safely(() -> listener.runStarted(model)));
        return true;
    }

    /** Publishes the end of a run, once. */
    void end(IFile model, StoredRun run, String problem) {
        if (run != null) {
            hold(model, run);
        }
        running.remove(model);
        listeners.forEach(listener -> safely(() -> listener.runEnded(model, run, problem)));
    }

    private void hold(IFile model, StoredRun run) {
        synchronized (held) {
            held.put(model, run);
        }
    }

    private static void safely(Runnable call) {
        try {
            call.run();
        } catch (RuntimeException failure) {
            ILog.of(RunRegistry.class).error("A listener of runs failed.", failure);
        }
    }
}
