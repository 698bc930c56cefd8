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
import org.modewright.model.ModelFile;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;
import org.modewright.model.Ids;

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
        StructureFactory factory = StructureFactory.eINSTANCE;
        StructuralModel model = ModelFile.create("cantilever");
        Material steel = factory.createMaterial();
        steel.setName("steel");
        steel.setYoung(210e6);
        steel.setPoisson(0.3);
        steel.setDensity(7.85);
        model.getMaterials().add(steel);
        FrameSection section = factory.createFrameSection();
        section.setName("tube");
        section.setArea(0.01);
        section.setIy(1e-4);
        section.setIz(2e-4);
        section.setTorsion(3e-4);
        model.getFrameSections().add(section);
        for (int i = 0; i <= 3; i++) {
            Node node = factory.createNode();
            node.setName("N" + i);
            node.setZ(3.0 * i);
            model.getNodes().add(node);
        }
        for (int i = 0; i < 3; i++) {
            Member member = factory.createMember();
            member.setName("M" + (i + 1));
            member.setStart(model.getNodes().get(i));
            member.setEnd(model.getNodes().get(i + 1));
            member.setSection(section);
            member.setMaterial(steel);
            model.getMembers().add(member);
        }
        Support support = factory.createSupport();
        support.setName("base");
        support.setNode(model.getNodes().get(0));
        support.setUx(true);
        support.setUy(true);
        support.setUz(true);
        support.setRx(true);
        support.setRy(true);
        support.setRz(true);
        model.getSupports().add(support);
        Ids.assignMissing(model);
        return model;
    }

    static byte[] bytes(IFile file) throws Exception {
        return Files.readAllBytes(file.getLocation().toPath());
    }
}
