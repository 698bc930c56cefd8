package org.modewright.ui.tests.editor;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.Text;
import org.eclipse.swt.widgets.Tree;
import org.eclipse.swt.widgets.TreeItem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.modewright.model.edit.Labels;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.UnitSystem;
import org.modewright.testsupport.DialogObject;
import org.modewright.testsupport.ViewObject;
import org.modewright.testsupport.Workbench;
import org.modewright.testsupport.WorkbenchExtension;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.StructureEditor;

/** Edits in forms, tables, the outline and with the commands of the Structure menu: each is one step of undo. */
@ExtendWith(WorkbenchExtension.class)
class EditingTest {

    private static final String OUTLINE = "org.eclipse.ui.views.ContentOutline";
    private static final String COMMANDS = "org.modewright.ui.editor.";
    private static final int NAME = 0;
    private static final int X = 1;

    private EditorDriver driver;
    private StructureEditor editor;
    private StructuralModel model;

    private void open(Workbench workbench) throws Exception {
        driver = new EditorDriver(workbench);
        editor = driver.open(driver.file("small.modewright", Frames.small()));
        model = driver.ask(editor::getLiveModel);
    }

    private Node node(int index) {
        return driver.ask(() -> model.getNodes().get(index));
    }

    private void activate() {
        driver.run(() -> editor.getSite().getPage().activate(editor));
    }

    @Test
    void aPropertyIsSetUndoneAndSetAgain(Workbench workbench) throws Exception {
        open(workbench);
        byte[] before = driver.bytes();
        driver.run(() -> editor.reveal(node(5).getId()));
        workbench.editor().type("field.x m", "7.25");
        assertEquals(7.25, driver.ask(() -> node(5).getX()));
        assertTrue(driver.ask(editor::isDirty));
        activate();
        workbench.execute(EditorDriver.UNDO);
        assertArrayEquals(before, driver.bytes());
        assertFalse(driver.ask(editor::isDirty));
        driver.until("the form to show the old value", () -> "6".equals(driver.find(Text.class, "field.x m").getText()));
        workbench.execute(EditorDriver.REDO);
        assertEquals(7.25, driver.ask(() -> node(5).getX()));
    }

    @Test
    void aFieldSaysWhatIsWrongWhileItIsTypedAndKeepsTheModel(Workbench workbench) throws Exception {
        open(workbench);
        driver.run(() -> editor.reveal(model.getFrameSections().get(0).getId()));
        Text area = driver.find(Text.class, "field.Area m²");
        driver.run(() -> area.setText("two"));
        Label fault = driver.find(Label.class, "fault.Area m²");
        assertTrue(driver.ask(fault::getText).contains("\"two\" is not a number"), () -> driver.ask(fault::getText));
        driver.run(() -> area.notifyListeners(SWT.DefaultSelection, new Event()));
        assertEquals(0.02, driver.ask(() -> model.getFrameSections().get(0).getArea()));
        driver.run(() -> area.setText("-0.02"));
        assertTrue(driver.ask(fault::getText).contains("must be positive"), () -> driver.ask(fault::getText));
        driver.key(area, SWT.ESC);
        assertEquals("0.02", driver.ask(area::getText));
        assertNull(driver.find(Label.class, "fault.Area m²"), "nothing is wrong any more");
        assertFalse(driver.ask(editor::isDirty));
    }

    @Test
    void severalObjectsAreEditedTogetherInOneStep(Workbench workbench) throws Exception {
        open(workbench);
        byte[] before = driver.bytes();
        driver.showTables();
        driver.select(driver.ask(() -> model.getMembers().stream().map(Member::getId).toList()));
        driver.run(() -> editor.activePage().showProperties());
        driver.until("the form of all members", () -> driver.find(Text.class, "field.Roll °") != null);
        workbench.editor().type("field.Roll °", "30");
        assertTrue(driver.ask(() -> model.getMembers().stream().allMatch(member -> member.getRoll() == 30)));
        activate();
        workbench.execute(EditorDriver.UNDO);
        assertArrayEquals(before, driver.bytes());
    }

    @Test
    void aCellIsEditedWithEnterAndGivenUpWithEscape(Workbench workbench) throws Exception {
        open(workbench);
        driver.showTables();
        driver.openCell(EditorDriver.TABLE, 3, X);
        driver.typeIntoCell("6.5");
        driver.traverse(driver.find(Text.class, EditorDriver.CELL), SWT.TRAVERSE_RETURN);
        assertEquals(6.5, driver.ask(() -> node(3).getX()));
        assertNull(driver.find(Text.class, EditorDriver.CELL), "Enter closes the cell");
        driver.openCell(EditorDriver.TABLE, 3, X);
        driver.typeIntoCell("9");
        driver.traverse(driver.find(Text.class, EditorDriver.CELL), SWT.TRAVERSE_ESCAPE);
        assertEquals(6.5, driver.ask(() -> node(3).getX()));
        driver.openCell(EditorDriver.TABLE, 3, NAME);
        driver.typeIntoCell("N0");
        driver.traverse(driver.find(Text.class, EditorDriver.CELL), SWT.TRAVERSE_RETURN);
        assertEquals("N3", driver.ask(() -> node(3).getName()), "the name of another node is refused");
        assertNotNull(driver.find(Text.class, EditorDriver.CELL), "what is refused stays open");
        driver.traverse(driver.find(Text.class, EditorDriver.CELL), SWT.TRAVERSE_ESCAPE);
    }

    @Test
    void tabSetsACellAndGoesOnToTheNext(Workbench workbench) throws Exception {
        open(workbench);
        driver.showTables();
        driver.openCell(EditorDriver.TABLE, 2, X);
        driver.typeIntoCell("1");
        driver.traverse(driver.find(Text.class, EditorDriver.CELL), SWT.TRAVERSE_TAB_NEXT);
        driver.typeIntoCell("2");
        driver.traverse(driver.find(Text.class, EditorDriver.CELL), SWT.TRAVERSE_RETURN);
        assertEquals(1, driver.ask(() -> node(2).getX()));
        assertEquals(2, driver.ask(() -> node(2).getY()));
    }

    @Test
    void whatCannotBeWithoutANodeGoesWithItAfterAQuestion(Workbench workbench) throws Exception {
        open(workbench);
        byte[] before = driver.bytes();
        driver.showTables();
        driver.selectRows(EditorDriver.TABLE, 0);
        activate();
        DialogObject question = workbench.executeForDialog(EditorDriver.DELETE, Messages.Delete_title);
        question.press("Yes");
        question.waitUntilClosed();
        assertEquals(7, driver.ask(() -> model.getNodes().size()));
        assertEquals(7, driver.ask(() -> model.getMembers().size()), "its column went with it");
        assertEquals(3, driver.ask(() -> model.getSupports().size()), "its support went with it");
        workbench.execute(EditorDriver.UNDO);
        assertArrayEquals(before, driver.bytes());
    }

    @Test
    void deleteInATextFieldDeletesTextAndNoObject(Workbench workbench) throws Exception {
        open(workbench);
        driver.run(() -> editor.reveal(node(0).getId()));
        Text name = driver.find(Text.class, "field.Name");
        driver.run(() -> {
            editor.getSite().getPage().activate(editor);
            name.forceFocus();
            name.setSelection(0, 1);
        });
        workbench.execute(EditorDriver.DELETE);
        assertEquals("0", driver.ask(name::getText));
        assertEquals(8, driver.ask(() -> model.getNodes().size()));
    }

    @Test
    void rowsAreCopiedAndPastedAsText(Workbench workbench) throws Exception {
        open(workbench);
        driver.showTables();
        driver.selectRows(EditorDriver.TABLE, 0, 1);
        activate();
        workbench.execute(EditorDriver.COPY);
        assertEquals("Name\tx m\ty m\tz m\nN0\t0\t0\t0\nN1\t6\t0\t0\n", driver.clipboard());
        driver.clipboard("N1\t6.25\t0\t0\nnew\t1\t2\t3\n");
        driver.run(() -> driver.find(Table.class, EditorDriver.TABLE).setFocus());
        workbench.execute(EditorDriver.PASTE);
        assertEquals(6.25, driver.ask(() -> node(1).getX()));
        assertEquals("new", driver.ask(() -> node(8).getName()));
        assertEquals(3, driver.ask(() -> node(8).getZ()));
        workbench.execute(EditorDriver.UNDO);
        assertEquals(8, driver.ask(() -> model.getNodes().size()));
        assertEquals(6, driver.ask(() -> node(1).getX()));
    }

    @Test
    void anotherKindOfTableKeepsNothingSelectedOutOfSight(Workbench workbench) throws Exception {
        open(workbench);
        driver.showTables();
        driver.selectRows(EditorDriver.TABLE, 0);
        workbench.editor().choose("tables.kinds", "Supports (4)");
        assertEquals(4, workbench.editor().table(EditorDriver.TABLE).rowCount());
        assertEquals("✓", workbench.editor().table(EditorDriver.TABLE).text(0, "Holds ux"));
        driver.until("an empty selection", () -> workbench.session().selection().elementIds().isEmpty());
        activate();
        workbench.execute(EditorDriver.DELETE);
        assertFalse(driver.ask(editor::isDirty));
    }

    @Test
    void everyKindOfTableTakesANewRow(Workbench workbench) throws Exception {
        open(workbench);
        driver.showTables();
        Combo kinds = driver.find(Combo.class, "tables.kinds");
        for (int kind = 0; kind < driver.ask(kinds::getItemCount); kind++) {
            int index = kind;
            driver.run(() -> {
                kinds.select(index);
                kinds.notifyListeners(SWT.Selection, new Event());
            });
            int rows = workbench.editor().table(EditorDriver.TABLE).rowCount();
            clickTool("tables.add");
            assertEquals(rows + 1, workbench.editor().table(EditorDriver.TABLE).rowCount(), () -> driver.ask(kinds::getText));
            driver.traverse(driver.find(Text.class, EditorDriver.CELL), SWT.TRAVERSE_ESCAPE);
            clickTool("tables.duplicate");
            assertTrue(workbench.editor().table(EditorDriver.TABLE).rowCount() >= rows + 2, () -> driver.ask(kinds::getText));
        }
    }

    @Test
    void theTableIsSortedAndFiltered(Workbench workbench) throws Exception {
        open(workbench);
        driver.showTables();
        workbench.editor().table(EditorDriver.TABLE).clickHeader("z m");
        workbench.editor().table(EditorDriver.TABLE).clickHeader("z m");
        assertEquals("3.5", workbench.editor().table(EditorDriver.TABLE).text(0, "z m"), "the highest first");
        Text filter = driver.find(Text.class, "tables.filter");
        driver.run(() -> filter.setText("n7"));
        assertEquals(1, workbench.editor().table(EditorDriver.TABLE).rowCount());
        assertEquals("N7", workbench.editor().table(EditorDriver.TABLE).text(0, "Name"));
    }

    @Test
    void theOutlineFollowsAndMakesTheSelection(Workbench workbench) throws Exception {
        open(workbench);
        ViewObject outline = workbench.view(OUTLINE);
        Member member = driver.ask(() -> model.getMembers().get(2));
        driver.select(List.of(member.getId()));
        driver.until("the member in the outline", () -> outline.treeSelection("outline.tree").equals(List.of(Labels.of(member))));
        driver.run(() -> {
            Tree tree = driver.find(Tree.class, "outline.tree");
            TreeItem item = tree.getSelection()[0].getParentItem().getItem(4);
            tree.setSelection(item);
            tree.notifyListeners(SWT.Selection, new Event());
        });
        String fifth = driver.ask(() -> model.getMembers().get(4).getId());
        driver.until("the selection to be that of the outline", () -> workbench.session().selection().elementIds().equals(Set.of(fifth)));
    }

    @Test
    void f2RenamesInTheOutline(Workbench workbench) throws Exception {
        open(workbench);
        workbench.view(OUTLINE);
        driver.select(List.of(node(2).getId()));
        driver.until("the node in the outline", () -> driver.find(Tree.class, "outline.tree").getSelectionCount() == 1);
        workbench.execute(EditorDriver.RENAME);
        Text name = driver.find(Text.class, "outline.rename");
        driver.run(() -> name.setText("corner"));
        driver.traverse(name, SWT.TRAVERSE_RETURN);
        assertEquals("corner", driver.ask(() -> node(2).getName()));
        workbench.execute(EditorDriver.UNDO);
        assertEquals("N2", driver.ask(() -> node(2).getName()));
    }

    @Test
    void aMemberIsDrawnBetweenTwoNodesAndSplit(Workbench workbench) throws Exception {
        open(workbench);
        driver.select(List.of(node(4).getId(), node(7).getId()));
        activate();
        workbench.execute(COMMANDS + "addMember");
        Member added = driver.ask(() -> model.getMembers().get(8));
        assertSame(node(4), driver.ask(added::getStart), "it starts at the node that comes first in the model");
        assertSame(node(7), driver.ask(added::getEnd));
        driver.until("the new member to be selected", () -> workbench.session().selection().elementIds().equals(Set.of(added.getId())));
        DialogObject dialog = workbench.executeForDialog(COMMANDS + "addNode", Messages.Act_coordinates);
        driver.run(() -> focusText().setText("3 3 3.5"));
        dialog.press("OK");
        dialog.waitUntilClosed();
        driver.select(List.of(node(8).getId(), added.getId()));
        workbench.execute(COMMANDS + "splitMember");
        assertEquals(10, driver.ask(() -> model.getMembers().size()));
        assertSame(node(8), driver.ask(added::getEnd));
        for (int step = 0; step < 3; step++) {
            workbench.execute(EditorDriver.UNDO);
        }
        assertEquals(8, driver.ask(() -> model.getMembers().size()));
        assertFalse(driver.ask(editor::isDirty));
    }

    private Text focusText() {
        return (Text) driver.ask(() -> editor.getSite().getShell().getDisplay().getFocusControl());
    }

    @Test
    void anActThatDoesNotSuitSaysWhatIsNeeded(Workbench workbench) throws Exception {
        open(workbench);
        driver.select(List.of());
        activate();
        DialogObject refusal = workbench.executeForDialog(COMMANDS + "joinNodes", Messages.Act_refused);
        refusal.press("OK");
        refusal.waitUntilClosed();
        assertFalse(driver.ask(editor::isDirty));
    }

    @Test
    void anotherUnitSystemConvertsTheNumbersInOneStep(Workbench workbench) throws Exception {
        open(workbench);
        byte[] before = driver.bytes();
        driver.showAnalysis();
        workbench.ui().later(() -> workbench.editor().choose("analysis.units", UnitSystem.NEWTON_MILLIMETRE.getLiteral()));
        DialogObject question = workbench.dialog(Messages.Units_title);
        question.press(Messages.Units_convert);
        question.waitUntilClosed();
        driver.until("millimetres", () -> model.getUnits() == UnitSystem.NEWTON_MILLIMETRE);
        assertEquals(6000, driver.ask(() -> node(1).getX()), 1e-9);
        activate();
        workbench.execute(EditorDriver.UNDO);
        assertArrayEquals(before, driver.bytes());
    }

    @Test
    void aPatternGetsLoadsThatAreSortedAndEdited(Workbench workbench) throws Exception {
        open(workbench);
        driver.showLoads();
        driver.run(() -> editor.execute(editor.commands().create(StructureFactory.eINSTANCE.createLoadPattern())));
        driver.select(List.of(node(6).getId()));
        clickTool("loads.addNodeLoad");
        driver.until("a row", () -> driver.find(Table.class, "loads.loads").getItemCount() == 1);
        driver.openCell("loads.loads", 0, 2);
        driver.typeIntoCell("12.5");
        driver.traverse(driver.find(Text.class, EditorDriver.CELL), SWT.TRAVERSE_RETURN);
        clickTool("loads.addMemberLoad");
        assertEquals(12.5, driver.ask(() -> model.getLoadPatterns().get(0).getLoads().get(0).getValue()));
        workbench.editor().table("loads.loads").clickHeader("Value");
        assertEquals("member", workbench.editor().table("loads.loads").text(0, "On"), "the load of 0 comes first");
        assertEquals("N6", workbench.editor().table("loads.loads").text(1, "Name"));
        assertEquals("kN", workbench.editor().table("loads.loads").text(1, "Unit"));
    }

    private void clickTool(String id) {
        driver.run(() -> driver.tool(id).notifyListeners(SWT.Selection, new Event()));
    }
}
