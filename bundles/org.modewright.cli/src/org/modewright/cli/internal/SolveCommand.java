package org.modewright.cli.internal;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;

import org.modewright.audit.AuditRequest;
import org.modewright.audit.RulePacks;
import org.modewright.cli.CommandContext;
import org.modewright.cli.ExitStatus;
import org.modewright.exchange.MatrixMarket;
import org.modewright.exchange.ResultFile;
import org.modewright.exchange.ResultTables;
import org.modewright.exchange.ShapesFile;
import org.modewright.fem.Assembly;
import org.modewright.fem.Snapshot;
import org.modewright.modal.CaptureTarget;
import org.modewright.modal.Certificate;
import org.modewright.modal.MatrixRun;
import org.modewright.modal.ModalRequest;
import org.modewright.modal.ModalResult;
import org.modewright.modal.ModalRun;
import org.modewright.numerics.SymmetricMatrix;

import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** Modes and certificate, of a model or of a pair of matrices. */
@Command(name = "solve", sortOptions = false, header = {"Solves a model, or a pair of matrices, and prints modes and certificate.", ""},
        customSynopsis = {"modewright solve MODEL [OPTIONS]", "       modewright solve K.mtx M.mtx [OPTIONS]"},
        footer = {"", "MODEL is a model file (.modewright), a table package (its folder, .zip or datapackage.json), or sample:NAME.",
            "K.mtx M.mtx is a pair of MatrixMarket files (coordinate, real, symmetric); without --modes its first 50 modes.",
            "The rigid-body modes of a free structure stand at 0 Hz.",
            "Exit status: 0 done; 2 bad input or options; 3 the run could not be completed."})
public final class SolveCommand extends RunCommand {

    private static final int MODES_OF_A_PAIR = 50;
    private static final double NANO = 1e-9;

    @Parameters(paramLabel = "MODEL, or K.mtx M.mtx", arity = "0..2", hideParamSyntax = true,
            description = "The model, or the stiffness and the mass matrix.")
    private List<String> arguments = List.of();

    public SolveCommand(CommandContext context) {
        super(context);
    }

    @Override
    protected void checkArguments() {
        if (arguments.isEmpty()) {
            throw wrong("Say which model: give MODEL, or K.mtx M.mtx.");
        }
    }

    @Override
    protected int solve() throws IOException {
        return isPair() ? solvePair() : solveModel();
    }

    private boolean isPair() {
        long matrices = arguments.stream().filter(argument -> MatrixMarket.isNamedBy(Path.of(argument))).count();
        if (matrices == 2 && arguments.size() == 2) {
            return true;
        }
        if (matrices > 0 || arguments.size() > 1) {
            throw wrong("Give one MODEL, or the two matrices K.mtx M.mtx.");
        }
        return false;
    }

    private int solveModel() throws IOException {
        Input input = Input.read(arguments.get(0));
        input.warn(context);
        ModalResult result = modes(input).withSeconds("read", input.seconds());
        new SolveReport(context.out()).print(input, result);
        if (output.json() != null) {
            ResultFile.write(result, input.facts(context.program()), output.json(), output.isAllElements());
        }
        if (output.csv() != null) {
            ResultTables.write(result, output.csv(), output.isAllElements());
        }
        if (output.shapes() != null) {
            ShapesFile.write(result, output.shapes());
        }
        return status(result.certificate());
    }

    private ModalResult modes(Input input) {
        AuditRequest request = run.request(input.model());
        double required = RulePacks.builtIn().get(request.rulePack()).capturedMass().required();
        ModalRequest modal = new ModalRequest(request.modes(), request.belowHz(), new CaptureTarget(required, request.directions()),
                ModalRequest.DEFAULT_LIMIT, request.threads());
        try (ConsoleProgress progress = progress()) {
            long start = System.nanoTime();
            Assembly assembly = Assembly.of(Snapshot.of(input.model()), progress);
            double assembling = (System.nanoTime() - start) * NANO;
            return ModalRun.run(assembly, modal, progress).withSeconds("assemble", assembling);
        }
    }

    private int solvePair() throws IOException {
        if (run.isJudging() || output.shapes() != null || output.isAllElements()) {
            throw wrong("A pair of matrices has no directions, nodes and elements: "
                    + "--rules, --directions, --shapes and --all-elements need a model.");
        }
        long start = System.nanoTime();
        SymmetricMatrix stiffness = MatrixMarket.read(Path.of(arguments.get(0)));
        SymmetricMatrix mass = MatrixMarket.read(Path.of(arguments.get(1)));
        double reading = (System.nanoTime() - start) * NANO;
        int modes = run.modes() > 0 ? run.modes() : run.below() > 0 ? 0 : MODES_OF_A_PAIR;
        ModalRequest request = new ModalRequest(modes, run.below(), null, ModalRequest.DEFAULT_LIMIT, run.threads());
        start = System.nanoTime();
        MatrixRun.Result result;
        try (ConsoleProgress progress = progress()) {
            result = MatrixRun.run(stiffness, mass, request, progress);
        }
        Map<String, Double> seconds = Map.of("read", reading, "eigen", (System.nanoTime() - start) * NANO);
        new SolveReport(context.out()).print(result);
        if (output.json() != null) {
            ResultFile.write(result, context.program(), seconds, output.json());
        }
        if (output.csv() != null) {
            ResultTables.write(result, output.csv());
        }
        return status(result.certificate());
    }

    private static int status(Certificate certificate) {
        return certificate.complete() ? ExitStatus.PASSED : ExitStatus.NOT_COMPLETED;
    }
}
