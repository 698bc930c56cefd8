package org.modewright.cli.internal;

import java.io.IOException;

import org.modewright.audit.AuditRequest;
import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditRun;
import org.modewright.cli.CommandContext;
import org.modewright.exchange.ResultFile;
import org.modewright.exchange.ResultTables;
import org.modewright.exchange.ShapesFile;

import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** The main job: solves a model, judges its modes, names what is suspicious. */
@Command(name = "check", sortOptions = false, header = {"Solves a model, audits its modes and prints the verdict.", ""},
        customSynopsis = "modewright check MODEL [OPTIONS]",
        footer = {"", "MODEL is a model file (.modewright), a table package (its folder, .zip or datapackage.json), or sample:NAME.",
            "Exit status: 0 the audit passes; 1 it does not; 2 bad input or options; 3 the run could not be completed",
            "(unstable structure, incomplete modes, out of memory)."})
public final class CheckCommand extends RunCommand {

    @Parameters(paramLabel = "MODEL", arity = "0..1", hideParamSyntax = true, description = "The model.")
    private String model;

    public CheckCommand(CommandContext context) {
        super(context);
    }

    @Override
    protected void checkArguments() {
        if (model == null) {
            throw wrong("Say which model: give MODEL.");
        }
    }

    @Override
    protected int solve() throws IOException {
        Input input = Input.read(model);
        input.warn(context);
        AuditResult result = audit(input);
        new CheckReport(context.out(), input, result).print();
        write(input, result);
        return result.status().exitStatus();
    }

    private AuditResult audit(Input input) {
        AuditRequest request = run.request(input.model());
        try (ConsoleProgress progress = progress()) {
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
