package org.modewright.ui.tests.editor;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.eclipse.core.resources.IFile;
import org.eclipse.swt.widgets.Table;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage.Literals;
import org.modewright.testsupport.Workbench;
import org.modewright.testsupport.WorkbenchExtension;
import org.modewright.ui.editor.StructureEditor;

/** A model of some twenty thousand members can be opened, selected as a whole and edited. */
@ExtendWith(WorkbenchExtension.class)
class LargeModelTest {

    private static final String OUTLINE = "org.eclipse.ui.views.ContentOutline";

    @Test
    void twentyThousandMembersAreEditedTogether(Workbench workbench) throws Exception {
        EditorDriver driver = new EditorDriver(workbench);
        IFile file = driver.file("large.modewright", Frames.grid(40, 28, 6));
        StructureEditor editor = driver.open(file);
        workbench.view(OUTLINE);
        driver.run(() -> editor.getSite().getPage().activate(editor));
        StructuralModel model = driver.ask(editor::getLiveModel);
        int members = driver.ask(() -> model.getMembers().size());
        assertTrue(members > 19_000, () -> members + " members");
        byte[] before = driver.bytes();
        driver.showTables();
        Member first = driver.ask(() -> model.getMembers().get(0));
        driver.select(List.of(first.getId()));
        driver.until("the members to be shown", () -> driver.find(Table.class, EditorDriver.TABLE).getItemCount() == members);
        workbench.execute(EditorDriver.SELECT_ALL);
        driver.until("all members to be selected", () -> workbench.session().selection().elementIds().size() == members);
        driver.run(() -> editor.execute(editor.commands().set(model.getMembers(), Literals.MEMBER__ROLL, 45.0)));
        assertEquals(45, driver.ask(() -> model.getMembers().get(members - 1).getRoll()));
        workbench.execute(EditorDriver.UNDO);
        driver.run(() -> { });
        assertArrayEquals(before, driver.bytes());
        driver.select(List.of(first.getId()));
        driver.until("one row to be selected", () -> driver.find(Table.class, EditorDriver.TABLE).getSelectionCount() == 1);
        driver.run(() -> editor.execute(editor.commands().rename(first, "renamed")));
        driver.until("the name to be shown", () -> driver.find(Table.class, EditorDriver.TABLE).getItem(0).getText().equals("renamed"));
    }
}
