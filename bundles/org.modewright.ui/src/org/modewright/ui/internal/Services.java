package org.modewright.ui.internal;

import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleException;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.ServiceReference;

/** The services of the layers below. */
public final class Services {

    private Services() {
    }

    /**
     * A service that is there as long as its bundle is.
     *
     * @throws IllegalStateException if it is not
     */
    public static <T> T get(Class<T> type) {
        BundleContext context = FrameworkUtil.getBundle(Services.class).getBundleContext();
        start(type);
        ServiceReference<T> reference = context.getServiceReference(type);
        if (reference == null) {
            throw new IllegalStateException("There is no service " + type.getName() + ".");
        }
        return context.getService(reference);
    }

    /** A lazily started bundle offers its services once a class of it has been used. */
    private static void start(Class<?> type) {
        try {
            FrameworkUtil.getBundle(type).start(Bundle.START_TRANSIENT);
        } catch (BundleException failure) {
            throw new IllegalStateException("The bundle of " + type.getName() + " does not start.", failure);
        }
    }
}
