package org.modewright.workspace;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ModelProjectsTest {

    private final ModelProjects projects = new ModelProjects(ResourcesPlugin.getWorkspace());

    @Test
    void aProjectHasTheNatureAndTheBuilder() throws Exception {
        try (TemporaryProject project = new TemporaryProject("nature")) {
            assertTrue(project.project().hasNature(ModewrightNature.ID));
            assertEquals(1, project.project().getDescription().getBuildSpec().length);
            assertEquals(ModewrightNature.BUILDER, project.project().getDescription().getBuildSpec()[0].getBuilderName());
            projects.open("nature", new NullProgressMonitor());
            assertEquals(1, project.project().getDescription().getBuildSpec().length, "opening again changes nothing");
        }
    }

    @Test
    void namesThatAreTakenGetANumber() throws Exception {
        try (TemporaryProject project = new TemporaryProject("names")) {
            assertEquals("tower.modewright", projects.freeFile(project.project(), "tower").getName());
            project.write("tower.modewright", TemporaryProject.cantilever());
            assertEquals("tower-2.modewright", projects.freeFile(project.project(), "tower").getName());
        }
    }

    @ParameterizedTest
    @CsvSource({"Quay House,Quay House", "a/b:c,a-b-c", "...,model", "' x. ',x", "'a<b>|c',a-b-c"})
    void fileNamesSuitEverySystem(String wanted, String expected) {
        assertEquals(expected, ModelProjects.fileName(wanted));
    }
}
