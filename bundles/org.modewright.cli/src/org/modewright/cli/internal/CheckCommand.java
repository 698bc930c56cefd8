package org.modewright.cli.internal;

import java.io.IOException;
import java.util.concurrent.Callable;

import org.modewright.audit.AuditRequest;
import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditRun;
import org.modewright.cli.CommandContext;
import org.modewright.cli.ExitStatus;
import org.modewright.exchange.ResultFile;
import org.modewright.exchange.ResultTables;
import org.modewright.exchange.ShapesFile;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** The main job: solves a model, judges its modes, names what is suspicious. */
@Command(name = "check", sortOptions = false, header = {"Solves a model, audits its modes and prints the verdict.", ""},
        customSynopsis = "modewright check MODEL [OPTIONS]",
        footer = {"", "MODEL is a model file (.modewright), a table package (its folder, .zip or datapackage.json), or sample:NAME.",
            "Exit status: 0 the audit passes; 1 it does not; 2 bad input or options; 3 the run could not be completed",
            "(unstable structure, incomplete modes, out of memory)."})
public final class CheckCommand implements Callable<Integer> {

    private final CommandContext context;

    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "MODEL", arity = "0..1", hideParamSyntax = true, description = "The model.")
    private String model;

    @Mixin
    private RunOptions run;

    @Mixin
    private OutputOptions output;

    @Option(names = {"-h", "--help"}, usageHelp = true, description = "Shows this help.")
    private boolean help;

    public CheckCommand(CommandContext context) {
        this.context = context;
    }

    @Override
    public Integer call() throws Exception {
        if (run.isListRules()) {
            RuleList.print(context.out());
            return ExitStatus.PASSED;
        }
        if (model == null) {
            throw new ParameterException(spec.commandLine(), "Say which model: give MODEL.");
        }
        output.check();
        Input input = Input.read(model);
        input.warn(context);
        AuditResult result = audit(input);
        new CheckReport(context.out(), input, result).print();
        write(input, result);
        return result.status().exitStatus();
    }

    private AuditResult audit(Input input) {
        AuditRequest request = run.request(input.model());
        try (ConsoleProgress progress = new ConsoleProgress(context, run.isQuiet())) {
            AuditResult result = AuditRun.standard().run(input.model(), request, progress);
            return new AuditResult(result.modal().withSeconds("read", input.seconds()), result.verdicts(), result.findings(),
                    result.status(), result.summary());
        }
    }

    private void write(Input input, AuditResult result) throws IOException {
        if (output.json() != null) {
            ResultFile.write(result, input.facts(context.program()), output.json(), output.isAllElements());
        }
        if (output.csv() != null) {
            ResultTables.write(result, output.csv(), output.isAllElements());
        }
        if (output.shapes() != null) {
            ShapesFile.write(result.modal(), output.shapes());
        }
    }
}
