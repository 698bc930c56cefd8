package org.modewright.bench;

import java.io.PrintWriter;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;

import org.modewright.cli.CommandContext;
import org.modewright.cli.ExitStatus;
import org.modewright.cli.HeadlessCommand;
import org.modewright.numerics.CancelledException;
import org.modewright.numerics.Progress;
import org.modewright.render.bench.FrameBenchmark;

import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Help.Ansi;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** Prints the benchmark figures. */
public final class BenchCommand implements HeadlessCommand {

    private static final int HELP_WIDTH = 110;

    @Override
    public int run(List<String> arguments, CommandContext context) {
        CommandLine line = new CommandLine(new Figures(context));
        line.setOut(context.out()).setErr(context.err()).setUsageHelpWidth(HELP_WIDTH)
                .setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF)).setParameterExceptionHandler((fault, given) -> {
                    context.err().println(fault.getMessage());
                    context.err().println("Help: modewright bench --help");
                    return ExitStatus.BAD_INPUT;
                }).setExecutionExceptionHandler((fault, command, parsed) -> {
                    throw fault;
                });
        return line.execute(arguments.toArray(String[]::new));
    }

    /** What is measured. */
    enum Part {
        /** Milliseconds a frame of the renderer. */
        frames,
        /** Seconds of the parts of a modal run. */
        modes
    }

    /** The command with its options. */
    @Command(name = "modewright bench", sortOptions = false, customSynopsis = "modewright bench [OPTIONS]",
            header = {"Prints the benchmark figures: how fast a mode is drawn, and how fast frame buildings are solved.", ""},
            footer = {"", "Other work on the machine shows in the figures: compare figures, and ratios, of one run only.",
                "Exit status: 0 done; 2 wrong options; 3 the run could not be completed."})
    static final class Figures implements Callable<Integer> {

        private final CommandContext context;
        private final PrintWriter out;

        @Spec
        private CommandSpec spec;

        @Option(names = "--only", paramLabel = "frames|modes", description = "One part alone. Without it: both.")
        private Part only;

        @Option(names = "--members", paramLabel = "N,N", split = ",", hideParamSyntax = true,
                description = "About how many members are drawn. Without it: 2000,20000,100000.")
        private List<Integer> members = List.of(2_000, 20_000, 100_000);

        @Option(names = "--dofs", paramLabel = "N,N", split = ",", hideParamSyntax = true,
                description = "About how many degrees of freedom the frames have. Without it: 3000,12000,20000.")
        private List<Integer> degreesOfFreedom = List.of(3_000, 12_000, 20_000);

        @Option(names = "--threads", paramLabel = "N", description = "Threads of the renderer. Without it: one, then all.")
        private Integer threads;

        @Option(names = {"-h", "--help"}, usageHelp = true, description = "Shows this help.")
        private boolean help;

        Figures(CommandContext context) {
            this.context = context;
            out = context.out();
        }

        @Override
        public Integer call() throws Exception {
            checkSizes("--members", members);
            checkSizes("--dofs", degreesOfFreedom);
            if (threads != null) {
                checkSizes("--threads", List.of(threads));
            }
            out.printf(Locale.ROOT, "%s, %d processors, Java %s, %,d MiB of memory at most%n", context.program(),
                    Runtime.getRuntime().availableProcessors(), System.getProperty("java.version"), Runtime.getRuntime().maxMemory() >> 20);
            if (only != Part.modes) {
                frames();
            }
            if (only != Part.frames) {
                modes();
            }
            return ExitStatus.PASSED;
        }

        private void checkSizes(String option, List<Integer> sizes) {
            for (int size : sizes) {
                if (size < 1) {
                    throw new ParameterException(spec.commandLine(), "Invalid value for " + option + ": " + size + " must be 1 or more.");
                }
            }
        }

        private void frames() {
            out.printf("%nOne frame of an animated mode, 1280 x 800 pixels, warm%n");
            out.flush();
            int all = Runtime.getRuntime().availableProcessors();
            List<Integer> used = threads != null ? List.of(threads) : all == 1 ? List.of(1) : List.of(1, all);
            for (int strips : used) {
                for (int size : members) {
                    frame(size, strips, false);
                    frame(size, strips, true);
                }
            }
        }

        private void frame(int size, int strips, boolean walking) {
            if (context.cancelled().getAsBoolean()) {
                throw new CancelledException();
            }
            out.println("  " + FrameBenchmark.measure(size, strips, walking).toString().strip());
            out.flush();
        }

        private void modes() throws Exception {
            out.printf("%nModes of frame buildings, consistent mass%n");
            ModesBenchmark benchmark = new ModesBenchmark(out, progress());
            for (int size : degreesOfFreedom) {
                benchmark.frame(size);
            }
            benchmark.sparseAgainstDense();
        }

        private Progress progress() {
            return new Progress() {
                @Override
                public void report(String stage, double fraction) {
                    // lines of progress would stand between the figures
                }

                @Override
                public boolean isCancelled() {
                    return context.cancelled().getAsBoolean();
                }
            };
        }
    }
}
