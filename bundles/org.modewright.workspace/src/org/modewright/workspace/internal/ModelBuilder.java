package org.modewright.workspace.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IResourceDelta;
import org.eclipse.core.resources.IncrementalProjectBuilder;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.SubMonitor;
import org.modewright.model.ModelFileException;
import org.modewright.workspace.FindingMarkers;
import org.modewright.workspace.ModelChecks;
import org.modewright.workspace.ModelFiles;

/** Checks the models that have changed and marks what it finds. */
public final class ModelBuilder extends IncrementalProjectBuilder {

    @Override
    protected IProject[] build(int kind, Map<String, String> arguments, IProgressMonitor monitor) throws CoreException {
        List<IFile> changed = changed(kind);
        SubMonitor progress = SubMonitor.convert(monitor, "Checking models", changed.size());
        for (IFile file : changed) {
            progress.split(1).subTask(file.getName());
            check(file);
        }
        return new IProject[0];
    }

    @Override
    protected void clean(IProgressMonitor monitor) throws CoreException {
        getProject().deleteMarkers(FindingMarkers.MODEL_FINDING, true, IResource.DEPTH_INFINITE);
    }

    private List<IFile> changed(int kind) throws CoreException {
        List<IFile> files = new ArrayList<>();
        IResourceDelta delta = kind == FULL_BUILD ? null : getDelta(getProject());
        if (delta == null) {
            getProject().accept(resource -> collect(resource, files));
        } else {
            delta.accept(part -> part.getKind() == IResourceDelta.REMOVED || !touched(part) || collect(part.getResource(), files));
        }
        return files;
    }

    private static boolean touched(IResourceDelta delta) {
        boolean onlyMarkers = delta.getKind() == IResourceDelta.CHANGED && delta.getResource().getType() == IResource.FILE
                && (delta.getFlags() & (IResourceDelta.CONTENT | IResourceDelta.REPLACED | IResourceDelta.TYPE)) == 0;
        return !onlyMarkers;
    }

    private static boolean collect(IResource resource, List<IFile> files) {
        if (ModelFiles.isModel(resource)) {
            files.add((IFile) resource);
        }
        return true;
    }

    private static void check(IFile file) throws CoreException {
        try {
            FindingMarkers.replaceModelFindings(file, ModelChecks.check(ModelFiles.load(file)));
        } catch (ModelFileException broken) {
            FindingMarkers.replaceByFault(file, broken.getMessage(), broken.line());
        } catch (RuntimeException failure) {
            ILog.of(ModelBuilder.class).error("The model " + file.getFullPath() + " could not be checked.", failure);
            FindingMarkers.replaceByFault(file, "The model could not be checked because of a fault in the program; the log has more.", 0);
        }
    }
}
