package org.modewright.ui;

import org.eclipse.core.resources.IFile;
import org.modewright.audit.AuditResult;
import org.modewright.model.structure.StructuralModel;

/**
 * What one workbench window looks at: a model, its last run and the selection that all parts share. Got by
 * {@code site.getService(AuditSession.class)}; one a window; to be used on the user interface's thread only.
 */
public interface AuditSession {

    /** What has changed. */
    enum Change {
        /** Another model file, or the content of the model. */
        MODEL,
        /** Another result, or the result has become stale or fresh. */
        RESULT,
        /** The selected mode or elements. */
        SELECTION,
        /** A run has begun or ended. */
        RUNNING
    }

    /** Told of changes on the user interface's thread; several changes of one kind in one turn of the event loop arrive as one. */
    @FunctionalInterface
    interface Listener {
        void sessionChanged(Change change);
    }

    /** The file of the active structure editor, else the model selected in the explorer; null if there is none. */
    IFile modelFile();

    /** The editor's live model, or the loaded one (read only in that case); null if there is none or it cannot be read. */
    StructuralModel model();

    /** The last run of {@link #modelFile()}; null if it was never run. */
    AuditResult result();

    /** Whether the model has changed since the run; false without a result. */
    boolean isStale();

    /** Whether a run of {@link #modelFile()} is under way. */
    boolean isRunning();

    /** Why there is no model or no result although there is a file, in one sentence; null if there is nothing to say. */
    String problem();

    /** The selection; never null. */
    AuditSelection selection();

    /** Who made the selection last; compare with yourself so as not to react to your own. May be null. */
    Object selectionSource();

    /**
     * Selects.
     *
     * @param selection the new selection
     * @param source who selects: the caller passes itself
     */
    void select(AuditSelection selection, Object source);

    /** Starts a run of the current model in the background; without a model nothing happens. */
    void run();

    /** Asks the run under way to stop; it does within a second. */
    void cancelRun();

    /**
     * Opens the editor of the model, selects an element and shows its properties.
     *
     * @param elementId model id of the element
     */
    void revealProperties(String elementId);

    void addListener(Listener listener);

    void removeListener(Listener listener);
}
