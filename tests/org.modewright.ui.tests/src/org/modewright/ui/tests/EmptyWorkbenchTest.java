package org.modewright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.ui.IViewReference;
import org.eclipse.ui.PlatformUI;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.modewright.testsupport.ViewObject;
import org.modewright.testsupport.Workbench;
import org.modewright.testsupport.WorkbenchExtension;
import org.modewright.ui.UiIds;

@ExtendWith(WorkbenchExtension.class)
class EmptyWorkbenchTest {

    @Test
    void theStartPageSaysTheCautionAndTheKernel(Workbench workbench) {
        ViewObject start = workbench.startPage();
        assertTrue(start.text("start.caution").contains("licensed engineer"));
        assertTrue(start.has("start.sample"));
        assertTrue(start.has("start.new"));
        assertTrue(start.has("start.import"));
    }

    @ParameterizedTest
    @ValueSource(strings = {UiIds.MODES_VIEW, UiIds.CAPTURE_VIEW, UiIds.SHAPE_VIEW, UiIds.DOMINANCE_VIEW, UiIds.EXPLORER})
    void anEmptyViewSaysWhatToDoAndItsLinkDoesIt(String view, Workbench workbench) {
        ViewObject empty = workbench.view(view);
        assertNotNull(empty.emptySentence());
        empty.clickEmptyLink();
        assertEquals("demo.modewright", workbench.ask(() -> workbench.structureEditor().getModelFile().getName()));
    }

    @Test
    void nothingCanBeRunOrExportedWithoutAModel(Workbench workbench) {
        assertFalse(workbench.isEnabled(UiIds.RUN_COMMAND));
        assertFalse(workbench.isEnabled(UiIds.CANCEL_COMMAND));
        assertFalse(workbench.isEnabled(UiIds.EXPORT_COMMAND));
        assertTrue(workbench.isEnabled(UiIds.IMPORT_COMMAND));
        workbench.openSample();
        workbench.ui().waitUntil("the run command to be enabled", () -> workbench.isEnabled(UiIds.RUN_COMMAND));
        assertTrue(workbench.isEnabled(UiIds.EXPORT_COMMAND));
    }

    @Test
    void everyViewOfThePerspectiveCanBeMade(Workbench workbench) {
        IViewReference[] references = workbench.ask(() -> PlatformUI.getWorkbench().getActiveWorkbenchWindow()
                .getActivePage().getViewReferences());
        assertTrue(references.length >= 7);
        for (IViewReference reference : references) {
            assertNotNull(workbench.ask(() -> reference.getView(true)), reference.getId());
            assertFalse(workbench.ask(() -> reference.getView(true).getClass().getName()).contains("Error"), reference.getId());
        }
    }
}
