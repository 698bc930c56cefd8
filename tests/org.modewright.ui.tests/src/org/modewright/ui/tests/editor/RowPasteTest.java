package org.modewright.ui.tests.editor;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.emf.common.command.BasicCommandStack;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.edit.domain.AdapterFactoryEditingDomain;
import org.junit.jupiter.api.Test;
import org.modewright.model.edit.StructureEditAdapterFactory;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage.Literals;
import org.modewright.ui.editor.fields.FieldContext;
import org.modewright.ui.editor.pages.RowPaste;

/** Rows from a spreadsheet. */
class RowPasteTest {

    private final StructuralModel model = Frames.small();
    private final FieldContext context = new FieldContext(
            new AdapterFactoryEditingDomain(new StructureEditAdapterFactory(), new BasicCommandStack()), model);

    private void paste(EReference list, String text) {
        context.domain().getCommandStack().execute(new RowPaste(context, list).command(text));
    }

    private String refusal(EReference list, String text) {
        return assertThrows(IllegalArgumentException.class, () -> new RowPaste(context, list).command(text)).getMessage();
    }

    @Test
    void rowsMakeObjectsOrChangeThoseOfThatName() {
        paste(Literals.STRUCTURAL_MODEL__NODES, "N1\t6.5\t0\t0\r\ntop\t1\t2\t9\r\n");
        assertEquals(9, model.getNodes().size());
        assertEquals(6.5, model.getNodes().get(1).getX());
        assertEquals("top", model.getNodes().get(8).getName());
        assertEquals(9, model.getNodes().get(8).getZ());
        assertTrue(model.getNodes().get(8).getId() != null);
        context.domain().getCommandStack().undo();
        assertEquals(8, model.getNodes().size());
        assertEquals(6, model.getNodes().get(1).getX(), "one step of undo for all rows");
    }

    @Test
    void headersNameTheColumnsInAnyOrder() {
        paste(Literals.STRUCTURAL_MODEL__NODES, "z m\tName\n7\tN0\n");
        assertEquals(7, model.getNodes().get(0).getZ());
        assertEquals(0, model.getNodes().get(0).getX());
    }

    @Test
    void rowsWithoutANameGetOne() {
        paste(Literals.STRUCTURAL_MODEL__NODES, "x m\n1\n2\n");
        assertEquals(10, model.getNodes().size());
        assertEquals(2, model.getNodes().get(9).getX());
        assertTrue(!model.getNodes().get(8).getName().equals(model.getNodes().get(9).getName()));
    }

    @Test
    void emptyCellsLeaveWhatIsThere() {
        paste(Literals.STRUCTURAL_MODEL__NODES, "N7\t\t1\t\n");
        assertEquals(6, model.getNodes().get(7).getX());
        assertEquals(1, model.getNodes().get(7).getY());
    }

    @Test
    void referencesAndFlags() {
        paste(Literals.STRUCTURAL_MODEL__MEMBERS, "diagonal\tN0\tN7\tbeam\tsteel\n");
        Member diagonal = model.getMembers().get(8);
        assertSame(model.getNodes().get(7), diagonal.getEnd());
        assertSame(model.getFrameSections().get(1), diagonal.getSection());
        paste(Literals.STRUCTURAL_MODEL__SUPPORTS, "Name\tNode\tHolds uz\tHolds rx\nSN0\tN0\t✓\tno\n");
        Support support = model.getSupports().get(0);
        assertTrue(support.isUz());
        assertEquals(false, support.isRx());
    }

    @Test
    void aBadCellIsNamedAndNothingIsPasted() {
        assertEquals("Row 2, column y m: \"a\" is not a number. Write it like 12.5 or 2.1e8. Nothing was pasted.",
                refusal(Literals.STRUCTURAL_MODEL__NODES, "N0\t1\t2\t3\nN1\t1\ta\t3\n"));
        assertEquals("Row 3, column Start: There is no node named \"N99\". Nothing was pasted.",
                refusal(Literals.STRUCTURAL_MODEL__MEMBERS, "Name\tStart\nC0\tN0\nC1\tN99\n"));
        assertEquals(0, model.getNodes().get(0).getX());
    }

    @Test
    void nothingToPasteIsNoCommand() {
        assertNull(new RowPaste(context, Literals.STRUCTURAL_MODEL__NODES).command(" \n\n"));
        assertNull(new RowPaste(context, Literals.STRUCTURAL_MODEL__NODES).command("Name\tx m\n"));
    }
}
