package org.modewright.testsupport;

import org.eclipse.ui.PlatformUI;
import org.junit.jupiter.api.extension.AfterAllCallback;
import org.junit.jupiter.api.extension.AfterEachCallback;
import org.junit.jupiter.api.extension.BeforeAllCallback;
import org.junit.jupiter.api.extension.BeforeEachCallback;
import org.junit.jupiter.api.extension.ExtensionContext;
import org.junit.jupiter.api.extension.ParameterContext;
import org.junit.jupiter.api.extension.ParameterResolver;
import org.junit.jupiter.api.extension.TestExecutionExceptionHandler;

/**
 * Gives tests the running {@link Workbench}, in the same state before each; saves a picture of the screen when one fails; and fails a
 * class of tests that leaves resources of the window system undisposed.
 */
public final class WorkbenchExtension implements BeforeAllCallback, AfterAllCallback, BeforeEachCallback, AfterEachCallback,
        TestExecutionExceptionHandler, ParameterResolver {

    private final ResourceLeaks leaks = new ResourceLeaks();
    private Workbench workbench;

    @Override
    public void beforeAll(ExtensionContext context) {
        UiThread ui = new UiThread(PlatformUI.getWorkbench().getDisplay());
        ui.waitUntil("the workbench's window", () -> PlatformUI.getWorkbench().getWorkbenchWindowCount() > 0
                && PlatformUI.getWorkbench().getWorkbenchWindows()[0].getActivePage() != null);
        workbench = new Workbench(ui);
        leaks.watch();
    }

    @Override
    public void beforeEach(ExtensionContext context) throws Exception {
        workbench.reset();
    }

    @Override
    public void handleTestExecutionException(ExtensionContext context, Throwable failure) throws Throwable {
        workbench.screenshot(context.getRequiredTestClass().getSimpleName() + "." + context.getRequiredTestMethod().getName());
        throw failure;
    }

    @Override
    public void afterEach(ExtensionContext context) throws Exception {
        workbench.reset();
    }

    @Override
    public void afterAll(ExtensionContext context) {
        String found = leaks.found();
        if (!found.isEmpty()) {
            throw new AssertionError("Resources of the window system were not disposed of:\n" + found);
        }
    }

    @Override
    public boolean supportsParameter(ParameterContext parameter, ExtensionContext context) {
        return parameter.getParameter().getType() == Workbench.class;
    }

    @Override
    public Object resolveParameter(ParameterContext parameter, ExtensionContext context) {
        return workbench;
    }
}
