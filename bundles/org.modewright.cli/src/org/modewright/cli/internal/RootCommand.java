package org.modewright.cli.internal;

import org.modewright.cli.CommandContext;

import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The program itself: says what commands there are. */
@Command(name = "modewright", customSynopsis = {"modewright COMMAND [OPTIONS]", "       modewright COMMAND --help"}, sortOptions = false,
        subcommands = CommandLine.HelpCommand.class,
        description = {"Proves that the modes of a finite element model are right, enough and understood.", ""},
        commandListHeading = "%nCommands:%n",
        footer = {"", "MODEL is a model file (.modewright), a table package (its folder, .zip or datapackage.json), or sample:NAME.",
            "Exit status: 0 the audit passes; 1 it does not; 2 bad input or options; 3 the run could not be completed.", "",
            Caution.TEXT})
public final class RootCommand implements Runnable {

    private final CommandContext context;

    @Spec
    private CommandSpec spec;

    @Option(names = {"-h", "--help"}, usageHelp = true, description = "Shows this help.")
    private boolean help;

    @Option(names = "--version", description = "Prints the version.")
    private boolean version;

    @Option(names = "--list-rules", description = "Lists the rule packs.")
    private boolean listRules;

    public RootCommand(CommandContext context) {
        this.context = context;
    }

    @Override
    public void run() {
        if (version) {
            context.out().println(context.program());
        } else if (listRules) {
            RuleList.print(context.out());
        } else {
            throw new ParameterException(spec.commandLine(), "Say what to do: give a command.");
        }
    }
}
