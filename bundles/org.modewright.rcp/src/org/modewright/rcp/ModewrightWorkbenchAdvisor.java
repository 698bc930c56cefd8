package org.modewright.rcp;

import org.eclipse.core.resources.IWorkspace;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IAdaptable;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.jface.preference.IPreferenceNode;
import org.eclipse.jface.preference.PreferenceManager;
import org.eclipse.ui.application.IWorkbenchConfigurer;
import org.eclipse.ui.application.IWorkbenchWindowConfigurer;
import org.eclipse.ui.application.WorkbenchAdvisor;
import org.eclipse.ui.application.WorkbenchWindowAdvisor;
import org.eclipse.ui.ide.IDE;

/** Sets the workbench up for work on the files of a workspace. */
final class ModewrightWorkbenchAdvisor extends WorkbenchAdvisor {

    private static final String PERSPECTIVE = "org.modewright.ui.perspective";

    private final Runnable whenStarted;

    /** @param whenStarted called once the first window is open */
    ModewrightWorkbenchAdvisor(Runnable whenStarted) {
        this.whenStarted = whenStarted;
    }

    @Override
    public void initialize(IWorkbenchConfigurer configurer) {
        super.initialize(configurer);
        configurer.setSaveAndRestore(true);
        IDE.registerAdapters();
        new ResourceImages(configurer).declare();
    }

    @Override
    public WorkbenchWindowAdvisor createWorkbenchWindowAdvisor(IWorkbenchWindowConfigurer configurer) {
        return new ModewrightWindowAdvisor(configurer);
    }

    @Override
    public String getInitialWindowPerspectiveId() {
        return PERSPECTIVE;
    }

    @Override
    public String getMainPreferencePageId() {
        return "org.modewright.ui.preferences";
    }

    @Override
    public IAdaptable getDefaultPageInput() {
        return ResourcesPlugin.getWorkspace().getRoot();
    }

    @Override
    public void postStartup() {
        whenStarted.run();
        keepKeysPage(getWorkbenchConfigurer().getWorkbench().getPreferenceManager());
    }

    /** The page of key bindings stands in a branch of the platform's preferences that the product does not show. */
    private static void keepKeysPage(PreferenceManager preferences) {
        IPreferenceNode general = preferences.find("org.eclipse.ui.preferencePages.Workbench");
        IPreferenceNode keys = general == null ? null : general.remove("org.eclipse.ui.preferencePages.Keys");
        if (keys != null) {
            preferences.addToRoot(keys);
        }
    }

    @Override
    public void postShutdown() {
        IWorkspace workspace = ResourcesPlugin.getWorkspace();
        try {
            IStatus status = workspace.save(true, new NullProgressMonitor());
            if (!status.isOK()) {
                ILog.of(ModewrightWorkbenchAdvisor.class).log(status);
            }
        } catch (CoreException failure) {
            ILog.of(ModewrightWorkbenchAdvisor.class).error("The state of the workspace could not be saved.", failure);
        }
    }
}
