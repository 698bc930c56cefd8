package org.modewright.ui.tests.editor;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.swt.custom.CLabel;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.ide.IDE;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.modewright.model.ModelFile;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage.Literals;
import org.modewright.testsupport.DialogObject;
import org.modewright.testsupport.Workbench;
import org.modewright.testsupport.WorkbenchExtension;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.StructureEditor;
import org.modewright.ui.editor.pages.AnalysisPage;
import org.modewright.ui.editor.pages.TablesPage;
import org.modewright.ui.widgets.EmptyState;
import org.modewright.workspace.FindingMarkers;

/** The editor and its file: save, changes from outside, files that cannot be read, and markers. */
@ExtendWith(WorkbenchExtension.class)
class FilesTest {

    private EditorDriver driver;
    private IFile file;
    private StructureEditor editor;

    private void open(Workbench workbench) throws Exception {
        driver = new EditorDriver(workbench);
        file = driver.file("frame.modewright", Frames.small());
        editor = driver.open(file);
    }

    private void rename(String name) {
        driver.run(() -> editor.execute(editor.commands().rename(editor.getLiveModel().getNodes().get(0), name)));
    }

    private String firstName() {
        return driver.ask(() -> editor.getLiveModel().getNodes().get(0).getName());
    }

    /** Another program writes the file, and the workspace is told. */
    private void changeOutside(String name) throws Exception {
        Path path = file.getLocation().toFile().toPath();
        StructuralModel other = ModelFile.load(path);
        other.getNodes().get(0).setName(name);
        ModelFile.save(other, path);
        file.refreshLocal(IResource.DEPTH_ZERO, new NullProgressMonitor());
    }

    @Test
    void whatIsSavedIsReadAgain(Workbench workbench) throws Exception {
        open(workbench);
        rename("first");
        assertTrue(driver.ask(editor::isDirty));
        driver.run(() -> editor.doSave(new NullProgressMonitor()));
        assertFalse(driver.ask(editor::isDirty));
        assertArrayEquals(driver.bytes(), Files.readAllBytes(file.getLocation().toFile().toPath()));
        driver.run(() -> editor.getSite().getPage().closeEditor(editor, false));
        editor = driver.open(file);
        assertEquals("first", firstName());
    }

    @Test
    void theEditorsOwnSaveIsNoChangeFromOutside(Workbench workbench) throws Exception {
        open(workbench);
        StructuralModel before = driver.ask(editor::getLiveModel);
        rename("first");
        driver.run(() -> editor.doSave(new NullProgressMonitor()));
        workbench.waitForBuild();
        assertEquals(before, driver.ask(editor::getLiveModel), "the model was not read again");
        changeOutside("outside");
        driver.until("the change from outside", () -> "outside".equals(firstName()));
    }

    @Test
    void aChangeFromOutsideIsTakenOverWhereNothingIsLost(Workbench workbench) throws Exception {
        open(workbench);
        changeOutside("outside");
        driver.until("the change from outside", () -> "outside".equals(firstName()));
        assertFalse(driver.ask(editor::isDirty));
    }

    @Test
    void aConflictIsForTheUserToSettle(Workbench workbench) throws Exception {
        open(workbench);
        driver.run(() -> editor.getSite().getPage().activate(editor));
        rename("mine");
        changeOutside("theirs");
        DialogObject question = workbench.dialog(Messages.Changed_title);
        question.press(Messages.Changed_keep);
        question.waitUntilClosed();
        assertEquals("mine", firstName());
        changeOutside("theirs again");
        question = workbench.dialog(Messages.Changed_title);
        question.press(Messages.Changed_reload);
        question.waitUntilClosed();
        driver.until("the file", () -> "theirs again".equals(firstName()));
        assertFalse(driver.ask(editor::isDirty));
    }

    @Test
    void aFileThatGoesClosesItsEditorUnlessItHasChanges(Workbench workbench) throws Exception {
        open(workbench);
        driver.run(() -> editor.getSite().getPage().activate(editor));
        rename("mine");
        file.delete(true, new NullProgressMonitor());
        DialogObject question = workbench.dialog(Messages.Gone_title);
        question.press(Messages.Gone_keep);
        question.waitUntilClosed();
        driver.run(() -> editor.doSave(new NullProgressMonitor()));
        assertTrue(file.exists(), "saving brings the file back");
        file.delete(true, new NullProgressMonitor());
        driver.until("the editor to close", () -> page().getEditorReferences().length == 0);
    }

    @Test
    void aBrokenFileSaysWhereAndIsReadOnceItIsMended(Workbench workbench) throws Exception {
        driver = new EditorDriver(workbench);
        byte[] good = ModelFile.bytes(Frames.small());
        String text = new String(good, StandardCharsets.UTF_8);
        int line = text.substring(0, text.indexOf("<nodes")).split("\n", -1).length;
        file = driver.file("broken.modewright", text.replaceFirst("<nodes", "<nodes <").getBytes(StandardCharsets.UTF_8));
        driver.ask(() -> IDE.openEditor(page(), file, true));
        EmptyState page = driver.find(EmptyState.class, "emptyState");
        assertTrue(driver.ask(page::sentence).contains("line " + line), () -> driver.ask(page::sentence));
        file.setContents(new ByteArrayInputStream(good), true, false, new NullProgressMonitor());
        editor = driver.editor();
        assertEquals("N0", firstName());
    }

    private static IWorkbenchPage page() {
        return PlatformUI.getWorkbench().getWorkbenchWindows()[0].getActivePage();
    }

    @Test
    void aMarkerLeadsToItsObjects(Workbench workbench) throws Exception {
        open(workbench);
        String id = driver.ask(() -> editor.getLiveModel().getMaterials().get(0).getId());
        IMarker marker = file.createMarker(IMarker.PROBLEM);
        marker.setAttribute(FindingMarkers.ELEMENT_IDS, id);
        driver.run(() -> editor.gotoMarker(marker));
        assertEquals(Set.of(id), driver.ask(() -> workbench.session().selection().elementIds()));
        assertTrue(driver.ask(() -> editor.activePage() instanceof TablesPage), "a material has its place in the tables");
        marker.setAttribute(FindingMarkers.ELEMENT_IDS, "");
        driver.run(() -> editor.gotoMarker(marker));
        assertTrue(driver.ask(() -> editor.activePage() instanceof AnalysisPage), "what is about no object is about the settings");
    }

    @Test
    void defectsAreShownWhileTheModelIsEdited(Workbench workbench) throws Exception {
        open(workbench);
        driver.run(() -> editor.execute(editor.commands().set(editor.getLiveModel().getMembers().get(0),
                Literals.MEMBER__END, editor.getLiveModel().getMembers().get(0).getStart())));
        driver.until("the defect", () -> !editor.checks().all().isEmpty()
                && editor.checks().all().get(0).id().equals("member-ends-coincide"));
        assertNotNull(driver.find(CLabel.class, "editor.checks"));
        assertTrue(driver.ask(() -> driver.find(CLabel.class, "editor.checks").getText()).startsWith("1 error"));
        workbench.execute(EditorDriver.UNDO);
        driver.until("no defect", () -> editor.checks().all().isEmpty());
    }

    @Test
    void aSaveOverAnUnseenChangeIsAskedFor(Workbench workbench) throws Exception {
        open(workbench);
        rename("mine");
        Path path = file.getLocation().toFile().toPath();
        StructuralModel other = ModelFile.load(path);
        other.getNodes().get(0).setName("theirs, and the workspace does not know yet");
        ModelFile.save(other, path);
        workbench.ui().later(() -> editor.doSave(new NullProgressMonitor()));
        DialogObject question = workbench.dialog(Messages.Changed_title);
        question.press(Messages.Changed_overwrite);
        question.waitUntilClosed();
        driver.until("the save", () -> !editor.isDirty());
        assertEquals("mine", ModelFile.load(path).getNodes().get(0).getName());
        assertEquals("mine", firstName());
    }

    @Test
    void theEditorFollowsItsFile(Workbench workbench) throws Exception {
        open(workbench);
        rename("mine");
        file.move(file.getProject().getFile("other.modewright").getFullPath(), true, new NullProgressMonitor());
        driver.until("the new name", () -> "other.modewright".equals(editor.getTitle()));
        assertEquals("mine", firstName(), "what was not saved is still there");
        driver.run(() -> editor.doSave(new NullProgressMonitor()));
        IFile moved = driver.ask(editor::getModelFile);
        assertEquals("mine", ModelFile.load(moved.getLocation().toFile().toPath()).getNodes().get(0).getName());
        assertFalse(file.exists());
    }

    @Test
    void saveAsGoesOnWithTheNewFile(Workbench workbench) throws Exception {
        open(workbench);
        rename("mine");
        workbench.ui().later(editor::doSaveAs);
        DialogObject dialog = workbench.dialog("Save As");
        driver.run(() -> {
            Text name = (Text) workbench.ui().display().getFocusControl();
            name.setText("copy");
        });
        dialog.press("OK");
        dialog.waitUntilClosed();
        driver.until("the new file", () -> "copy.modewright".equals(editor.getTitle()));
        assertFalse(driver.ask(editor::isDirty));
        StructuralModel first = ModelFile.load(file.getLocation().toFile().toPath());
        assertEquals("N0", first.getNodes().get(0).getName(), "the first file stays as it was");
        driver.until("the session to be about the new file", () -> editor.getModelFile().equals(workbench.session().modelFile()));
    }
}
