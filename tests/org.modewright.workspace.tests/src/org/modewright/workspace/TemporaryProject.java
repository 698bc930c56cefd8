package org.modewright.workspace;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IncrementalProjectBuilder;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.core.runtime.jobs.Job;
import org.modewright.model.Ids;
import org.modewright.model.ModelFile;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.testmodels.Parts;

/** A project that goes away with the test, and a small sound model to put into it. */
final class TemporaryProject implements AutoCloseable {

    private final IProject project;

    TemporaryProject(String name) throws Exception {
        project = new ModelProjects(ResourcesPlugin.getWorkspace()).open(name, new NullProgressMonitor());
    }

    IProject project() {
        return project;
    }

    IFile write(String name, StructuralModel model) throws Exception {
        IFile file = project.getFile(name);
        ModelFiles.save(model, file);
        return file;
    }

    IFile write(String name, String text) throws Exception {
        IFile file = project.getFile(name);
        byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
        if (file.exists()) {
            file.setContents(new ByteArrayInputStream(bytes), true, false, null);
        } else {
            file.create(new ByteArrayInputStream(bytes), true, null);
        }
        return file;
    }

    void build() throws Exception {
        Job.getJobManager().join(ResourcesPlugin.FAMILY_AUTO_BUILD, null);
        project.build(IncrementalProjectBuilder.INCREMENTAL_BUILD, new NullProgressMonitor());
    }

    static IMarker[] markers(IFile file, String type) throws Exception {
        return file.findMarkers(type, true, IResource.DEPTH_ZERO);
    }

    @Override
    public void close() throws Exception {
        Job.getJobManager().join(AuditJob.FAMILY, null);
        Job.getJobManager().join(ResourcesPlugin.FAMILY_AUTO_BUILD, null);
        project.delete(true, true, new NullProgressMonitor());
    }

    /** A cantilever of three members along z with a section and a material; well formed, with mass. */
    static StructuralModel cantilever() {
        StructuralModel model = ModelFile.create("cantilever");
        Parts parts = new Parts(model);
        Material steel = parts.material("steel", 210e6, 0.3, 7.85);
        FrameSection tube = parts.section("tube", 0.01, 1e-4, 2e-4, 3e-4);
        Node below = parts.node("N0", 0, 0, 0);
        parts.support("base", below, "ux uy uz rx ry rz");
        for (int i = 1; i <= 3; i++) {
            Node above = parts.node("N" + i, 0, 0, 3.0 * i);
            parts.member("M" + i, below, above, tube, steel);
            below = above;
        }
        Ids.assignMissing(model);
        return model;
    }

    static byte[] bytes(IFile file) throws Exception {
        return Files.readAllBytes(file.getLocation().toPath());
    }
}
