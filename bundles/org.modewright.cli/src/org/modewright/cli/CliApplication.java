package org.modewright.cli;

import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.runtime.IConfigurationElement;
import org.eclipse.core.runtime.Platform;
import org.eclipse.equinox.app.IApplication;
import org.eclipse.equinox.app.IApplicationContext;
import org.modewright.cli.internal.Interruption;
import org.osgi.framework.Bundle;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.Version;

/** The command line as an Equinox application: its exit status is the result of {@link #start}. */
public final class CliApplication implements IApplication {

    private static final String COMMANDS = "org.modewright.cli.command";
    private static final String TERMINAL = "modewright.terminal";

    @Override
    public Object start(IApplicationContext context) {
        String[] arguments = (String[]) context.getArguments().get(IApplicationContext.APPLICATION_ARGS);
        try (Interruption interruption = new Interruption()) {
            CommandContext commands = new CommandContext(program(), writer(System.out, "stdout"), writer(System.err, "stderr"),
                    isTerminal(), interruption::isRequested);
            return new ModewrightProgram(commands, offered()).run(arguments);
        }
    }

    private static PrintWriter writer(PrintStream stream, String name) {
        return new PrintWriter(stream, false, charset(name));
    }

    /** The encoding of the console; a locale without one, which Java takes for ASCII, gets UTF-8, of which ASCII is a part. */
    private static Charset charset(String stream) {
        String told = System.getProperty(stream + ".encoding", System.getProperty("sun." + stream + ".encoding"));
        Charset charset = told == null ? Charset.defaultCharset() : Charset.forName(told);
        return charset.equals(StandardCharsets.US_ASCII) ? StandardCharsets.UTF_8 : charset;
    }

    /** The start script knows whether standard error is a terminal; without its word the console decides. */
    private static boolean isTerminal() {
        String told = System.getProperty(TERMINAL);
        return told == null ? System.console() != null : Boolean.parseBoolean(told);
    }

    private static String program() {
        Bundle bundle = FrameworkUtil.getBundle(CliApplication.class);
        Version version = bundle.getVersion();
        return "Modewright " + version.getMajor() + "." + version.getMinor() + "." + version.getMicro();
    }

    private static List<OfferedCommand> offered() {
        List<OfferedCommand> commands = new ArrayList<>();
        for (IConfigurationElement element : Platform.getExtensionRegistry().getConfigurationElementsFor(COMMANDS)) {
            commands.add(new OfferedCommand(element.getAttribute("name"), element.getAttribute("summary"),
                    () -> (HeadlessCommand) element.createExecutableExtension("class")));
        }
        return commands;
    }

    @Override
    public void stop() {
        // a command ends by itself, or by the interruption of the process
    }
}
