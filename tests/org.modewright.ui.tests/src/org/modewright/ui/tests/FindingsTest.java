package org.modewright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Set;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IResource;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.ide.IDE;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.modewright.testsupport.Workbench;
import org.modewright.testsupport.WorkbenchExtension;
import org.modewright.ui.AuditSession;
import org.modewright.ui.StructureEditorPart;
import org.modewright.workspace.FindingMarkers;

@ExtendWith(WorkbenchExtension.class)
class FindingsTest {

    @Test
    void theUnjoinedCanopyIsMarkedAndGoingThereSelectsItsNodes(Workbench workbench) throws Exception {
        workbench.openSample();
        StructureEditorPart editor = workbench.structureEditor();
        IFile file = workbench.ask(editor::getModelFile);
        workbench.waitForBuild();
        IMarker marker = workbench.ui().waitFor("the marker of the unjoined nodes", () -> marker(file));
        List<String> nodes = FindingMarkers.elementIds(marker);
        assertEquals(2, nodes.size());
        IWorkbenchPage page = workbench.ask(() -> editor.getSite().getPage());
        workbench.ui().get(() -> IDE.openEditor(page, marker));
        AuditSession session = workbench.session();
        workbench.ui().waitUntil("the nodes to be selected", () -> session.selection().elementIds().equals(Set.copyOf(nodes)));
    }

    @Test
    void theFindingGoesWhenTheNodesAreJoined(Workbench workbench) throws Exception {
        workbench.openSample();
        StructureEditorPart editor = workbench.structureEditor();
        IFile file = workbench.ask(editor::getModelFile);
        workbench.waitForBuild();
        IMarker marker = workbench.ui().waitFor("the marker of the unjoined nodes", () -> marker(file));
        assertTrue(marker.exists());
        assertFalse(marker.getAttribute(FindingMarkers.REMEDY, "").isBlank());
        workbench.ui().get(() -> IDE.openEditor(editor.getSite().getPage(), marker));
        workbench.ui().run(() -> editor.getSite().getPage().activate(editor));
        workbench.ui().waitUntil("joining to be possible", () -> workbench.isEnabled("org.modewright.ui.editor.joinNodes"));
        workbench.execute("org.modewright.ui.editor.joinNodes");
        workbench.ui().run(() -> editor.doSave(null));
        workbench.waitForBuild();
        workbench.ui().waitUntil("the marker to go", () -> marker(file) == null);
    }

    private static IMarker marker(IFile file) throws Exception {
        return Arrays.stream(file.findMarkers(FindingMarkers.MODEL_FINDING, true, IResource.DEPTH_ZERO))
                .filter(marker -> marker.getAttribute(FindingMarkers.FINDING_ID, "").equals("nodes-not-joined")).findFirst().orElse(null);
    }
}
