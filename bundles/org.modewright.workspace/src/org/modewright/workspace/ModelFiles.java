package org.modewright.workspace;

import java.nio.file.Path;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IPath;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.modewright.model.ModelFile;
import org.modewright.model.ModelFileException;
import org.modewright.model.structure.StructuralModel;

/** Structural models as files of the workspace. */
public final class ModelFiles {

    private ModelFiles() {
    }

    /** Whether a resource is a model file, by its extension. */
    public static boolean isModel(IResource resource) {
        return resource instanceof IFile && ModelFile.EXTENSION.equalsIgnoreCase(resource.getFileExtension());
    }

    /**
     * Reads a model file.
     *
     * @throws ModelFileException if it cannot be read; the message says where, what and how to mend it
     */
    public static StructuralModel load(IFile file) throws ModelFileException {
        return ModelFile.load(path(file));
    }

    /**
     * Writes a model file and lets the workspace know.
     *
     * @throws ModelFileException if it cannot be written
     * @throws CoreException if the workspace cannot take notice of it
     */
    public static void save(StructuralModel model, IFile file) throws ModelFileException, CoreException {
        ModelFile.save(model, path(file));
        file.refreshLocal(IResource.DEPTH_ZERO, new NullProgressMonitor());
    }

    private static Path path(IFile file) throws ModelFileException {
        IPath location = file.getLocation();
        if (location == null) {
            throw new ModelFileException(file.getFullPath().toString(), 0, 0, "The file is not on this computer's disk.",
                    "Move the project into a folder of this computer.", null);
        }
        return location.toPath();
    }
}
