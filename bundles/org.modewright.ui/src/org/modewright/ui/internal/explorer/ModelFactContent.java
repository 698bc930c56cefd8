package org.modewright.ui.internal.explorer;

import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.ICoreRunnable;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.jface.viewers.ITreeContentProvider;
import org.eclipse.jface.viewers.StructuredViewer;
import org.eclipse.jface.viewers.Viewer;
import org.eclipse.swt.widgets.Display;
import org.modewright.ui.internal.Messages;
import org.modewright.ui.internal.Services;
import org.modewright.ui.widgets.Images;
import org.modewright.workspace.ModelFiles;
import org.modewright.workspace.RunRegistry;
import org.modewright.workspace.StoredRun;

/** What the explorer shows below a model file, read in the background when it is first looked at. */
public final class ModelFactContent implements ITreeContentProvider, RunRegistry.Listener {

    private record Known(long stamp, List<ModelFact> facts) {
    }

    private final RunRegistry registry = Services.get(RunRegistry.class);
    private final Map<IFile, Known> known = new ConcurrentHashMap<>();
    private StructuredViewer viewer;

    public ModelFactContent() {
        registry.addListener(this);
    }

    @Override
    public void inputChanged(Viewer shown, Object before, Object after) {
        viewer = (StructuredViewer) shown;
    }

    @Override
    public Object[] getElements(Object input) {
        return getChildren(input);
    }

    @Override
    public boolean hasChildren(Object element) {
        return element instanceof IFile file && ModelFiles.isModel(file);
    }

    @Override
    public Object[] getChildren(Object parent) {
        if (!(parent instanceof IFile file) || !ModelFiles.isModel(file)) {
            return new Object[0];
        }
        Known facts = known.get(file);
        if (facts == null || facts.stamp() != file.getModificationStamp()) {
            read(file);
        }
        List<ModelFact> reading = List.of(new ModelFact(file, 0, Messages.Explorer_reading, Images.INFORMATION));
        return (facts == null ? reading : facts.facts()).toArray();
    }

    @Override
    public Object getParent(Object element) {
        return element instanceof ModelFact fact ? fact.file() : null;
    }

    @Override
    public void dispose() {
        registry.removeListener(this);
        known.clear();
        viewer = null;
    }

    @Override
    public void runStarted(IFile model) {
        // The explorer shows ended runs alone.
    }

    @Override
    public void runEnded(IFile model, StoredRun run, String problem) {
        if (run != null && known.remove(model) != null) {
            refresh(model);
        }
    }

    private void read(IFile file) {
        Job job = Job.createSystem(Messages.Explorer_reading, (ICoreRunnable) monitor -> {
            long stamp = file.getModificationStamp();
            known.put(file, new Known(stamp, new ModelFactReading(registry).read(file)));
            refresh(file);
        });
        job.setPriority(Job.DECORATE);
        job.schedule();
    }

    private void refresh(IFile file) {
        StructuredViewer shown = viewer;
        if (shown == null || shown.getControl().isDisposed()) {
            return;
        }
        Display display = shown.getControl().getDisplay();
        display.asyncExec(() -> {
            if (!shown.getControl().isDisposed()) {
                shown.refresh(file);
            }
        });
    }
}
