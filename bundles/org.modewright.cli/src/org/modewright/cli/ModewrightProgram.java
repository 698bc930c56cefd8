package org.modewright.cli;

import java.util.List;
import java.util.concurrent.Callable;

import org.modewright.cli.internal.CheckCommand;
import org.modewright.cli.internal.ConvertCommand;
import org.modewright.cli.internal.FaultReport;
import org.modewright.cli.internal.RootCommand;
import org.modewright.cli.internal.SolveCommand;

import picocli.CommandLine;
import picocli.CommandLine.Help.Ansi;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.ISetter;
import picocli.CommandLine.Model.PositionalParamSpec;

/** The command line: takes arguments, writes to the writers it was given and returns the exit status. It never ends the process. */
public final class ModewrightProgram {

    private static final int HELP_WIDTH = 110;

    private final CommandContext context;
    private final List<OfferedCommand> offered;

    /**
     * @param offered commands of other bundles
     */
    public ModewrightProgram(CommandContext context, List<OfferedCommand> offered) {
        this.context = context;
        this.offered = List.copyOf(offered);
    }

    /** Runs one command. */
    public int run(String... arguments) {
        FaultReport faults = new FaultReport(context);
        try {
            return commandLine(faults).execute(arguments);
        } catch (OutOfMemoryError e) {
            return faults.outOfMemory();
        } catch (LinkageError | StackOverflowError e) {
            return faults.unexpected(e);
        } finally {
            context.out().flush();
            context.err().flush();
        }
    }

    private CommandLine commandLine(FaultReport faults) {
        CommandLine line = new CommandLine(new RootCommand(context));
        line.addSubcommand(new CheckCommand(context)).addSubcommand(new SolveCommand(context)).addSubcommand(new ConvertCommand(context));
        offered.forEach(command -> line.addSubcommand(command.name(), spec(command)));
        line.setOut(context.out()).setErr(context.err()).setUsageHelpWidth(HELP_WIDTH)
                .setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF)).setParameterExceptionHandler(faults)
                .setExecutionExceptionHandler(faults);
        return line;
    }

    /** A command whose arguments are its own affair. */
    private CommandLine spec(OfferedCommand command) {
        Offered call = new Offered(command, context);
        CommandSpec spec = CommandSpec.wrapWithoutInspection(call);
        spec.usageMessage().description(command.summary());
        spec.addPositional(PositionalParamSpec.builder().index("0..*").arity("0..*").type(List.class).auxiliaryTypes(String.class)
                .setter(call).paramLabel("ARGUMENT").hideParamSyntax(true).build());
        spec.parser().unmatchedOptionsArePositionalParams(true);
        return new CommandLine(spec);
    }

    /** Calls an offered command with the arguments that were parsed for it. */
    private static final class Offered implements Callable<Integer>, ISetter {

        private final OfferedCommand command;
        private final CommandContext context;
        private List<String> arguments = List.of();

        Offered(OfferedCommand command, CommandContext context) {
            this.command = command;
            this.context = context;
        }

        @SuppressWarnings("unchecked")
        @Override
        public <T> T set(T value) {
            List<String> old = arguments;
            arguments = value == null ? List.of() : List.copyOf((List<String>) value);
            return (T) old;
        }

        @Override
        public Integer call() throws Exception {
            return command.maker().call().run(arguments, context);
        }
    }
}
