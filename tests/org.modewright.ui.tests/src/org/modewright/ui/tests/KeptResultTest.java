package org.modewright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.eclipse.core.resources.IFile;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.modewright.model.structure.StructuralModel;
import org.modewright.testsupport.ViewObject;
import org.modewright.testsupport.Workbench;
import org.modewright.testsupport.WorkbenchExtension;
import org.modewright.ui.AuditSession;
import org.modewright.ui.StructureEditorPart;
import org.modewright.ui.UiIds;
import org.modewright.workspace.RunStore;

@ExtendWith(WorkbenchExtension.class)
class KeptResultTest {

    @Test
    void aDamagedResultIsASentenceWithALinkThatRunsAgain(Workbench workbench) throws Exception {
        workbench.openSample();
        StructureEditorPart editor = workbench.structureEditor();
        IFile file = workbench.ask(editor::getModelFile);
        workbench.ui().run(() -> editor.getSite().getPage().closeEditor(editor, false));
        Path kept = new RunStore().fileOf(file).getLocation().toPath();
        Files.write(kept, "damaged".getBytes(StandardCharsets.UTF_8));
        workbench.open(file);
        ViewObject modes = workbench.view(UiIds.MODES_VIEW);
        workbench.ui().waitUntil("the sentence", () -> modes.emptySentence() != null && modes.emptySentence().contains("demo.modes"));
        modes.clickEmptyLink();
        AuditSession session = workbench.session();
        workbench.ui().waitUntil("the result of the run", () -> session.result() != null);
        assertNull(workbench.ask(session::problem));
    }

    @Test
    void aResultOfTheUnsavedModelIsStaleOnceTheEditIsGivenUp(Workbench workbench) {
        workbench.openSample();
        StructureEditorPart editor = workbench.structureEditor();
        IFile file = workbench.ask(editor::getModelFile);
        StructuralModel model = workbench.ask(editor::getLiveModel);
        assertTrue(workbench.ask(() -> editor.reveal(model.getMembers().get(0).getId())));
        workbench.editor().type("field.Name", "another name");
        workbench.runAudit();
        AuditSession session = workbench.session();
        workbench.waitForBuild();
        workbench.ui().run(() -> editor.getSite().getPage().closeEditor(editor, false));
        workbench.open(file);
        workbench.ui().waitUntil("the result of the edited model to be stale", session::isStale);
        assertEquals(file, workbench.ask(session::modelFile));
    }
}
