package org.modewright.cli.internal;

import java.io.IOException;
import java.util.concurrent.Callable;

import org.modewright.cli.CommandContext;
import org.modewright.cli.ExitStatus;

import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** A command that solves something: options of the run and of its output. */
abstract class RunCommand implements Callable<Integer> {

    protected final CommandContext context;

    @Mixin
    protected RunOptions run;

    @Mixin
    protected OutputOptions output;

    @Spec
    private CommandSpec spec;

    @Option(names = {"-h", "--help"}, usageHelp = true, description = "Shows this help.")
    private boolean help;

    RunCommand(CommandContext context) {
        this.context = context;
    }

    @Override
    public final Integer call() throws IOException {
        if (run.isListRules()) {
            RuleList.print(context.out());
            return ExitStatus.PASSED;
        }
        checkArguments();
        output.check();
        return solve();
    }

    /**
     * Refuses arguments that name nothing to solve, before anything is read.
     *
     * @throws ParameterException as {@link #wrong} makes it
     */
    protected abstract void checkArguments();

    /** Solves, prints, writes what was asked for and returns the exit status. */
    protected abstract int solve() throws IOException;

    /** The complaint about options or arguments that this command cannot use. */
    protected final ParameterException wrong(String sentence) {
        return new ParameterException(spec.commandLine(), sentence);
    }

    protected final ConsoleProgress progress() {
        return new ConsoleProgress(context, run.isQuiet());
    }
}
