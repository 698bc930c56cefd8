package org.modewright.workspace;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IProjectDescription;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IWorkspace;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.SubMonitor;
import org.modewright.model.ModelFile;
import org.modewright.model.ModelFileException;
import org.modewright.model.structure.StructuralModel;

/** Creates projects of structural models and puts models into them. */
public final class ModelProjects {

    private final IWorkspace workspace;

    public ModelProjects(IWorkspace workspace) {
        this.workspace = workspace;
    }

    /**
     * Creates and opens a project, or opens the one that there is.
     *
     * @param name name of the project
     */
    public IProject open(String name, IProgressMonitor monitor) throws CoreException {
        SubMonitor progress = SubMonitor.convert(monitor, 3);
        IProject project = workspace.getRoot().getProject(name);
        if (!project.exists()) {
            project.create(progress.split(1));
        }
        project.open(progress.split(1));
        if (!project.hasNature(ModewrightNature.ID)) {
            addNature(project, progress.split(1));
        }
        return project;
    }

    /**
     * A file name in a project that is not taken yet.
     *
     * @param stem wanted name without extension
     */
    public IFile freeFile(IProject project, String stem) {
        String base = fileName(stem);
        IFile file = project.getFile(base + '.' + ModelFile.EXTENSION);
        for (int i = 2; file.exists(); i++) {
            file = project.getFile(base + '-' + i + '.' + ModelFile.EXTENSION);
        }
        return file;
    }

    /** Writes a model into a new file. */
    public void add(StructuralModel model, IFile file) throws ModelFileException, CoreException {
        ModelFiles.save(model, file);
    }

    /** Writes the bytes of a model file, such as a sample's, into a new file; an existing one stays. */
    public void add(InputStream bytes, IFile file, IProgressMonitor monitor) throws IOException, CoreException {
        if (!file.exists()) {
            file.create(new ByteArrayInputStream(bytes.readAllBytes()), IResource.FORCE, monitor);
        }
    }

    /** A name that every file system takes, near to a wanted one. */
    public static String fileName(String wanted) {
        String name = wanted.strip().replaceAll("[\\\\/:*?\"<>|\\p{Cntrl}]+", "-").replaceAll("^[.\\s]+|[.\\s]+$", "");
        return name.isEmpty() ? "model" : name;
    }

    private static void addNature(IProject project, IProgressMonitor monitor) throws CoreException {
        IProjectDescription description = project.getDescription();
        String[] natures = description.getNatureIds();
        String[] more = new String[natures.length + 1];
        System.arraycopy(natures, 0, more, 1, natures.length);
        more[0] = ModewrightNature.ID;
        description.setNatureIds(more);
        project.setDescription(description, monitor);
    }
}
