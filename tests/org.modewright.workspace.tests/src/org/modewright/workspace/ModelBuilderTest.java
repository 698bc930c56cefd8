package org.modewright.workspace;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IncrementalProjectBuilder;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;

class ModelBuilderTest {

    private TemporaryProject project;

    @BeforeEach
    void create() throws Exception {
        project = new TemporaryProject("builder");
    }

    @AfterEach
    void remove() throws Exception {
        project.close();
    }

    @Test
    void aSoundModelHasNoMarkerAboveInformation() throws Exception {
        IFile file = project.write("sound.modewright", TemporaryProject.cantilever());
        project.build();
        for (IMarker marker : TemporaryProject.markers(file, FindingMarkers.FINDING)) {
            assertEquals(IMarker.SEVERITY_INFO, marker.getAttribute(IMarker.SEVERITY, -1), marker.getAttribute(IMarker.MESSAGE, ""));
        }
    }

    @Test
    void aDefectIsMarkedWithItsElementAndGoesWhenMended() throws Exception {
        StructuralModel model = TemporaryProject.cantilever();
        model.getMaterials().get(0).setYoung(-1);
        IFile file = project.write("defect.modewright", model);
        project.build();
        List<IMarker> errors = errors(file);
        assertEquals(1, errors.size());
        assertEquals(List.of(model.getMaterials().get(0).getId()), FindingMarkers.elementIds(errors.get(0)));
        assertTrue(errors.get(0).getAttribute(IMarker.LOCATION, "").contains("steel"));
        assertFalse(errors.get(0).getAttribute(FindingMarkers.REMEDY, "").isBlank());

        model.getMaterials().get(0).setYoung(210e6);
        project.write("defect.modewright", model);
        project.build();
        assertEquals(List.of(), errors(file));
    }

    @Test
    void aSuspiciousModelIsMarkedWithoutARun() throws Exception {
        StructuralModel model = TemporaryProject.cantilever();
        Node stray = StructureFactory.eINSTANCE.createNode();
        stray.setId("stray");
        stray.setName("stray");
        stray.setX(5);
        model.getNodes().add(stray);
        IFile file = project.write("stray.modewright", model);
        project.build();
        IMarker[] markers = TemporaryProject.markers(file, FindingMarkers.MODEL_FINDING);
        assertTrue(Arrays.stream(markers).anyMatch(marker -> FindingMarkers.elementIds(marker).contains("stray")));
    }

    @Test
    void aBrokenFileIsMarkedAtItsLine() throws Exception {
        IFile file = project.write("broken.modewright", "<?xml version=\"1.0\"?>\n<oops");
        project.build();
        List<IMarker> errors = errors(file);
        assertEquals(1, errors.size());
        assertTrue(errors.get(0).getAttribute(IMarker.LINE_NUMBER, 0) > 0);
        assertTrue(errors.get(0).getAttribute(IMarker.MESSAGE, "").contains("broken.modewright"));
    }

    @Test
    void otherFilesAreLeftAlone() throws Exception {
        IFile file = project.write("notes.txt", "<oops");
        project.build();
        assertEquals(0, TemporaryProject.markers(file, FindingMarkers.FINDING).length);
    }

    @Test
    void aFullBuildMarksOnce() throws Exception {
        StructuralModel model = TemporaryProject.cantilever();
        model.getMaterials().get(0).setYoung(0);
        IFile file = project.write("defect.modewright", model);
        project.build();
        assertEquals(1, errors(file).size());
        project.project().build(IncrementalProjectBuilder.FULL_BUILD, new NullProgressMonitor());
        assertEquals(1, errors(file).size());
    }

    private static List<IMarker> errors(IFile file) throws Exception {
        return Arrays.stream(TemporaryProject.markers(file, FindingMarkers.FINDING))
                .filter(marker -> marker.getAttribute(IMarker.SEVERITY, -1) == IMarker.SEVERITY_ERROR).toList();
    }
}
