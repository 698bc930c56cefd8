package org.modewright.workspace.internal;

import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.SubMonitor;
import org.modewright.numerics.Progress;

/**
 * Shows a computation's progress on a monitor. How many stages there will be is not known beforehand, so every new stage takes a fixed
 * part of what is left. Safe for calls from several threads.
 */
public final class MonitorProgress implements Progress {

    private static final int WHOLE = 1000;
    private static final int STAGE = 250;

    private final IProgressMonitor root;
    private final SubMonitor whole;
    private SubMonitor part;
    private String stage;
    private int shown;

    public MonitorProgress(IProgressMonitor monitor, String task) {
        root = monitor;
        whole = SubMonitor.convert(monitor, task, WHOLE);
    }

    @Override
    public synchronized void report(String newStage, double fraction) {
        if (!newStage.equals(stage)) {
            begin(newStage);
        }
        int reached = Double.isNaN(fraction) ? shown : (int) Math.round(WHOLE * Math.min(1, Math.max(0, fraction)));
        if (reached > shown) {
            part.worked(reached - shown);
            shown = reached;
        }
    }

    @Override
    public boolean isCancelled() {
        return root.isCanceled();
    }

    private void begin(String newStage) {
        stage = newStage;
        shown = 0;
        whole.setWorkRemaining(WHOLE);
        part = whole.newChild(STAGE, SubMonitor.SUPPRESS_NONE).setWorkRemaining(WHOLE);
        root.subTask(newStage);
    }
}
