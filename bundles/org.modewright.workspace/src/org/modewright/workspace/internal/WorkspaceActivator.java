package org.modewright.workspace.internal;

import org.modewright.workspace.RunRegistry;
import org.modewright.workspace.RunStore;
import org.osgi.framework.BundleActivator;
import org.osgi.framework.BundleContext;

/** Offers the run store and the run registry as services. */
public final class WorkspaceActivator implements BundleActivator {

    @Override
    public void start(BundleContext context) {
        RunStore store = new RunStore();
        context.registerService(RunStore.class, store, null);
        context.registerService(RunRegistry.class, new RunRegistry(store), null);
    }

    @Override
    public void stop(BundleContext context) {
        // The framework withdraws the services of a bundle that stops.
    }
}
