package org.modewright.workspace.internal;

import org.eclipse.core.resources.IResourceChangeEvent;
import org.eclipse.core.resources.IWorkspace;
import org.eclipse.core.resources.ResourcesPlugin;
import org.modewright.workspace.RunRegistry;
import org.modewright.workspace.RunStore;
import org.osgi.framework.BundleActivator;
import org.osgi.framework.BundleContext;

/** Offers the run store and the run registry as services, and has kept runs follow their models. */
public final class WorkspaceActivator implements BundleActivator {

    private final IWorkspace workspace = ResourcesPlugin.getWorkspace();
    private KeptRunFollower follower;

    @Override
    public void start(BundleContext context) {
        RunStore store = new RunStore();
        RunRegistry registry = new RunRegistry(store);
        context.registerService(RunStore.class, store, null);
        context.registerService(RunRegistry.class, registry, null);
        follower = new KeptRunFollower(store, registry);
        workspace.addResourceChangeListener(follower, IResourceChangeEvent.POST_CHANGE);
    }

    @Override
    public void stop(BundleContext context) {
        workspace.removeResourceChangeListener(follower);
    }
}
