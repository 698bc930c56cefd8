package org.modewright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.core.runtime.preferences.InstanceScope;
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
import org.modewright.workspace.WorkspacePreferences;

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

    @Test
    void savingAModelWithAResultRunsItAgain(Workbench workbench) {
        AuditSession session = editedAfterRun(workbench);
        save(workbench);
        workbench.ui().waitUntil("the result of the saved model", () -> !session.isRunning() && !session.isStale());
    }

    @Test
    void savingRunsNothingIfTheUserDoesNotWantIt(Workbench workbench) {
        InstanceScope.INSTANCE.getNode(WorkspacePreferences.NODE).putBoolean(WorkspacePreferences.RUN_ON_SAVE, false);
        try {
            AuditSession session = editedAfterRun(workbench);
            save(workbench);
            workbench.waitForBuild();
            assertTrue(workbench.ask(session::isStale));
        } finally {
            InstanceScope.INSTANCE.getNode(WorkspacePreferences.NODE).remove(WorkspacePreferences.RUN_ON_SAVE);
        }
    }

    private static AuditSession editedAfterRun(Workbench workbench) {
        workbench.openSample();
        workbench.runAudit();
        StructureEditorPart editor = workbench.structureEditor();
        assertTrue(workbench.ask(() -> editor.reveal(editor.getLiveModel().getMembers().get(0).getId())));
        workbench.editor().type("field.Name", "another name");
        AuditSession session = workbench.session();
        workbench.ui().waitUntil("the result to be stale", session::isStale);
        return session;
    }

    private static void save(Workbench workbench) {
        StructureEditorPart editor = workbench.structureEditor();
        workbench.ui().run(() -> editor.doSave(new NullProgressMonitor()));
    }
}
