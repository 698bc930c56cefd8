package org.modewright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotSame;
import static org.junit.jupiter.api.Assertions.assertSame;

import java.util.Set;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.ide.IDE;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.modewright.testsupport.Workbench;
import org.modewright.testsupport.WorkbenchExtension;
import org.modewright.ui.AuditSelection;
import org.modewright.ui.AuditSession;
import org.modewright.ui.UiIds;

/** Every window has a session of its own; runs are known to all. */
@ExtendWith(WorkbenchExtension.class)
class WindowsTest {

    @Test
    void selectionsAreOfTheWindowAndRunsOfAll(Workbench workbench) {
        workbench.openSample();
        IFile file = workbench.ask(() -> workbench.structureEditor().getModelFile());
        AuditSession first = workbench.session();
        IWorkbenchWindow other = workbench.ask(() -> PlatformUI.getWorkbench().openWorkbenchWindow(UiIds.PERSPECTIVE,
                ResourcesPlugin.getWorkspace().getRoot()));
        try {
            AuditSession second = workbench.ask(() -> other.getService(AuditSession.class));
            assertNotSame(first, second);
            assertSame(second, workbench.ask(() -> other.getActivePage().showView(UiIds.MODES_VIEW).getSite()
                    .getService(AuditSession.class)));
            workbench.ui().get(() -> IDE.openEditor(other.getActivePage(), file));
            workbench.ui().waitUntil("the model in the second window", () -> file.equals(second.modelFile()) && second.model() != null);
            workbench.ui().run(first::run);
            workbench.ui().waitUntil("the result in both windows", () -> first.result() != null && second.result() != null);
            workbench.ui().run(() -> first.select(new AuditSelection(0, Set.of()), this));
            assertEquals(AuditSelection.NONE, workbench.ask(second::selection));
        } finally {
            workbench.ui().run(other::close);
        }
    }

    @Test
    void commandsFollowTheActiveWindow(Workbench workbench) {
        workbench.openSample();
        IWorkbenchWindow first = workbench.ask(() -> PlatformUI.getWorkbench().getActiveWorkbenchWindow());
        workbench.ui().waitUntil("the run command to be enabled", () -> workbench.isEnabled(UiIds.RUN_COMMAND));
        IWorkbenchWindow other = workbench.ask(() -> PlatformUI.getWorkbench().openWorkbenchWindow(UiIds.PERSPECTIVE,
                ResourcesPlugin.getWorkspace().getRoot()));
        try {
            workbench.ui().run(() -> other.getShell().forceActive());
            workbench.ui().waitUntil("the second window without a model", () -> PlatformUI.getWorkbench().getActiveWorkbenchWindow() == other
                    && !workbench.isEnabled(UiIds.RUN_COMMAND));
            workbench.ui().run(() -> first.getShell().forceActive());
            workbench.ui().waitUntil("the first window with its model", () -> PlatformUI.getWorkbench().getActiveWorkbenchWindow() == first
                    && workbench.isEnabled(UiIds.RUN_COMMAND));
        } finally {
            workbench.ui().run(other::close);
        }
    }
}
