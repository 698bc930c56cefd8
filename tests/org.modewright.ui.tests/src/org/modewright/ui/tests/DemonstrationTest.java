package org.modewright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.eclipse.swt.graphics.ImageData;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.modewright.audit.AuditStatus;
import org.modewright.modal.Dominance;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.Dominance.RollUp;
import org.modewright.modal.ModalResult;
import org.modewright.model.ModelFile;
import org.modewright.model.edit.Labels;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.StructuralModel;
import org.modewright.testsupport.TableObject;
import org.modewright.testsupport.ViewObject;
import org.modewright.testsupport.Workbench;
import org.modewright.testsupport.WorkbenchExtension;
import org.modewright.ui.AuditSession;
import org.modewright.ui.StructureEditorPart;
import org.modewright.ui.UiIds;

/** The main job on the demonstration model, from the start page to an undone change. */
@ExtendWith(WorkbenchExtension.class)
class DemonstrationTest {

    private static final String UNDO = "org.eclipse.ui.edit.undo";

    @Test
    void oneClickOpensTheDemonstrationModel(Workbench workbench) {
        workbench.startPage().clickLink("start.sample", "start.link");
        StructureEditorPart editor = workbench.structureEditor();
        assertEquals("demo.modewright", workbench.ask(() -> editor.getModelFile().getName()));
        assertTrue(workbench.ask(() -> editor.getLiveModel().getMembers().size()) > 300);
    }

    @Test
    void aRunFillsEveryView(Workbench workbench) {
        workbench.openSample();
        workbench.runAudit();
        AuditSession session = workbench.session();
        ModalResult modal = workbench.ask(() -> session.result().modal());
        assertNotEquals(AuditStatus.UNSTABLE, workbench.ask(() -> session.result().status()));
        ViewObject modes = workbench.view(UiIds.MODES_VIEW);
        assertEquals(modal.modes().size(), modes.table("modes.table").waitForRows().rowCount());
        assertTrue(modes.sentence().startsWith(modal.modes().size() + " modes"), modes.sentence());
        String capture = workbench.view(UiIds.CAPTURE_VIEW).sentence();
        assertTrue(capture.contains("X") && capture.contains("Y"), capture);
        assertTrue(workbench.view(UiIds.DOMINANCE_VIEW).emptySentence().startsWith("Select a mode"));
        assertTrue(workbench.view(UiIds.SHAPE_VIEW).emptySentence().startsWith("Select a mode"));
    }

    @Test
    void aSelectedModeMoves(Workbench workbench) {
        workbench.openSample();
        workbench.runAudit();
        workbench.view(UiIds.MODES_VIEW).table("modes.table").waitForRows().select(0);
        ViewObject shape = workbench.view(UiIds.SHAPE_VIEW);
        workbench.ui().waitUntil("the shape of mode 1", () -> shape.sentence() != null && shape.sentence().startsWith("Mode 1"));
        byte[] first = pixels(shape);
        assertTrue(distinct(first) > 20, "the picture shows a structure");
        workbench.ui().waitUntil("another frame", () -> !Arrays.equals(first, pixels(shape)));
    }

    @Test
    void dominanceListsTheMastAndPickingSelectsInTheTree(Workbench workbench) {
        workbench.openSample();
        workbench.runAudit();
        AuditSession session = workbench.session();
        ModalResult modal = workbench.ask(() -> session.result().modal());
        int mast = modeOfTheMast(modal);
        workbench.view(UiIds.MODES_VIEW).table("modes.table").waitForRows().select(mast);
        TableObject ranking = workbench.view(UiIds.DOMINANCE_VIEW).table("dominance.table").waitForRows();
        List<Dominance.Share> expected = new Dominance(modal).ranked(mast, Energy.STRAIN, RollUp.ELEMENT);
        StructuralModel model = workbench.ask(session::model);
        Set<String> groups = new HashSet<>();
        for (int row = 0; row < 5; row++) {
            Dominance.Share share = expected.get(row);
            assertTrue(String.join("|", ranking.row(row)).contains(share.label()), ranking.row(row) + " lists " + share.label());
            groups.add(((Member) object(model, share.elementId())).getGroup().getName());
        }
        assertTrue(groups.contains("roof mast"), () -> "the mast is among the leading elements of its mode: " + groups);
        workbench.view("org.eclipse.ui.views.ContentOutline");
        ranking.select(1);
        Identified picked = object(model, expected.get(1).elementId());
        ViewObject outline = workbench.view("org.eclipse.ui.views.ContentOutline");
        workbench.ui().waitUntil("the picked element to be selected in the tree",
                () -> outline.treeSelection("outline.tree").contains(Labels.of(picked)));
        assertEquals(Set.of(picked.getId()), workbench.ask(() -> session.selection().elementIds()));
        assertEquals(mast, workbench.ask(() -> session.selection().mode()), "the mode stays selected");
    }

    @Test
    void anEditMakesTheResultStaleAndUndoRestoresBoth(Workbench workbench) throws Exception {
        ViewObject editor = workbench.openSample();
        workbench.runAudit();
        AuditSession session = workbench.session();
        StructureEditorPart part = (StructureEditorPart) editor.part();
        byte[] before = ModelFile.bytes(workbench.ask(part::getLiveModel));
        Identified member = workbench.ask(() -> part.getLiveModel().getMembers().get(0));
        assertTrue(workbench.ask(() -> part.reveal(member.getId())));
        editor.type("field.Name", "renamed for the test");
        assertEquals("renamed for the test", workbench.ask(member::getName));
        assertTrue(workbench.ask(part::isDirty));
        workbench.ui().waitUntil("the result to be stale", session::isStale);
        ViewObject modes = workbench.view(UiIds.MODES_VIEW);
        workbench.ui().waitUntil("the view to say so", modes::isMarkedStale);
        workbench.ui().run(() -> part.getSite().getPage().activate(part));
        workbench.execute(UNDO);
        assertArrayEquals(before, ModelFile.bytes(workbench.ask(part::getLiveModel)));
        assertFalse(workbench.ask(part::isDirty));
        workbench.ui().waitUntil("the result to be fresh again", () -> !session.isStale());
        workbench.ui().waitUntil("the view to say so", () -> !modes.isMarkedStale());
    }

    @Test
    void theResultIsThereAgainWhenTheModelIsOpenedAgain(Workbench workbench) {
        workbench.openSample();
        workbench.runAudit();
        AuditSession session = workbench.session();
        StructureEditorPart editor = workbench.structureEditor();
        int modes = workbench.ask(() -> session.result().modal().modes().size());
        workbench.waitForBuild();
        workbench.ui().run(() -> editor.getSite().getPage().closeEditor(editor, false));
        workbench.open(workbench.ask(editor::getModelFile));
        workbench.ui().waitUntil("the kept result", () -> session.result() != null);
        assertEquals(modes, workbench.ask(() -> session.result().modal().modes().size()));
    }

    private static int modeOfTheMast(ModalResult modal) {
        Dominance dominance = new Dominance(modal);
        for (int mode = 0; mode < modal.modes().size(); mode++) {
            if ("roof mast".equals(dominance.ranked(mode, Energy.STRAIN, RollUp.GROUP).get(0).label())) {
                return mode;
            }
        }
        throw new AssertionError("No mode of the demonstration model is that of its mast.");
    }

    private static Identified object(StructuralModel model, String id) {
        return (Identified) model.eResource().getEObject(id);
    }

    private static byte[] pixels(ViewObject shape) {
        ImageData picture = shape.picture("canvas");
        return picture.data;
    }

    private static long distinct(byte[] bytes) {
        return IntStream.range(0, bytes.length).map(i -> bytes[i]).distinct().count();
    }
}
