package org.modewright.workspace;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IPath;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.modewright.workspace.internal.DamagedRunException;
import org.modewright.workspace.internal.RunFormat;

/**
 * Keeps the last run of a model beside it, in a file of the same name with the extension {@value #EXTENSION}, so that results survive a
 * restart. The file is written beside itself and renamed, so a crash leaves the old one or the new one.
 */
public final class RunStore {

    /** Extension of files with results, without the dot. */
    public static final String EXTENSION = "modes";

    /** The file that keeps, or would keep, the run of a model. */
    public IFile fileOf(IFile model) {
        IPath path = model.getFullPath().removeFileExtension().addFileExtension(EXTENSION);
        return model.getWorkspace().getRoot().getFile(path);
    }

    /**
     * Reads the last run.
     *
     * @param model the model's file
     * @return the run; empty if there is none
     * @throws RunStoreException if there is a file that is damaged, of a newer program or unreadable
     */
    public Optional<StoredRun> load(IFile model) throws RunStoreException {
        IFile file = fileOf(model);
        Path path = pathOf(file);
        if (path == null || !Files.exists(path)) {
            return Optional.empty();
        }
        try (InputStream in = Files.newInputStream(path)) {
            return Optional.of(RunFormat.read(in));
        } catch (DamagedRunException damaged) {
            throw new RunStoreException("The kept result " + file.getName() + " cannot be read: " + damaged.getMessage()
                    + " Run the audit again to replace it.", damaged);
        } catch (IOException failure) {
            throw new RunStoreException("The kept result " + file.getName() + " could not be read (" + failure.getMessage()
                    + "). Run the audit again to replace it.", failure);
        }
    }

    /**
     * Keeps a run in place of the last one.
     *
     * @param model the model's file
     * @param run what to keep
     * @throws RunStoreException if the file cannot be written; the last one then stays
     */
    public void save(IFile model, StoredRun run) throws RunStoreException {
        IFile file = fileOf(model);
        try {
            Path path = pathOf(file);
            if (path == null) {
                throw new IOException("the project is not on this computer's disk");
            }
            RunFormat.write(run, path);
            file.refreshLocal(IResource.DEPTH_ZERO, new NullProgressMonitor());
            if (file.exists()) {
                file.setDerived(true, new NullProgressMonitor());
            }
        } catch (IOException | CoreException failure) {
            throw new RunStoreException("The result could not be kept in " + file.getFullPath() + " (" + failure.getMessage()
                    + "). It stays on screen until the workbench is closed; make the folder writable and run again.", failure);
        }
    }

    private static Path pathOf(IFile file) {
        IPath location = file.getLocation();
        return location == null ? null : location.toPath();
    }
}
