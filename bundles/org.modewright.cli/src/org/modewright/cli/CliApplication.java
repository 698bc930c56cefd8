package org.modewright.cli;

import org.eclipse.equinox.app.IApplication;
import org.eclipse.equinox.app.IApplicationContext;

/** The command line as an Equinox application: its exit status is the result of {@link #start}. */
public final class CliApplication implements IApplication {

    @Override
    public Object start(IApplicationContext context) {
        String[] arguments = (String[]) context.getArguments().get(IApplicationContext.APPLICATION_ARGS);
        System.out.println(String.join(" ", arguments));
        return EXIT_OK;
    }

    @Override
    public void stop() {
        // a command ends by itself
    }
}
