package org.modewright.bench;

import java.io.PrintWriter;
import java.util.Locale;
import java.util.concurrent.Callable;

import org.modewright.fem.Assembly;
import org.modewright.fem.Snapshot;
import org.modewright.model.structure.StructuralModel;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.EigenRequest;
import org.modewright.numerics.EigenSession;
import org.modewright.numerics.EigenSolver;
import org.modewright.numerics.EigenSolvers;
import org.modewright.numerics.Factorisation;
import org.modewright.numerics.Factorisers;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SpectrumCertificate;

/** Times the parts of a modal run on frame buildings of several sizes. */
final class ModesBenchmark {

    private static final int MODES = 50;
    /** Dense matrices of this order are solved in well under a second. */
    private static final int DENSE_ORDER = 600;
    /** The general library's factorisation has no fill-reducing order for this matrix, so it is timed on small frames only. */
    private static final int LIBRARY_ORDER = 4000;

    private final PrintWriter out;
    private final Progress progress;

    ModesBenchmark(PrintWriter out, Progress progress) {
        this.out = out;
        this.progress = progress;
    }

    /** Times one building. */
    void frame(int wantedDegreesOfFreedom) throws Exception {
        FrameBuilding building = FrameBuilding.withDegreesOfFreedom(wantedDegreesOfFreedom);
        StructuralModel model = building.model();
        header(String.format(Locale.ROOT, "Frame, %,d degrees of freedom, %,d members", building.degreesOfFreedom(), building.members()));
        Timing assembling = timed("assemble K and M", () -> Assembly.of(Snapshot.of(model), progress));
        Assembly assembly = Assembly.of(Snapshot.of(model), progress);
        EigenProblem problem = new EigenProblem(assembly.stiffness(), assembly.mass());
        Timing factorising = timed("order and factorise K", () -> factorise(problem));
        Timing solving = timed(MODES + " modes with certificate", () -> solve(EigenSolvers.lanczos(), problem));
        out.printf(Locale.ROOT, "      %.2f factorisations to assemble, %.1f factorisations to solve, in processor time%n",
                assembling.ratioTo(factorising), solving.ratioTo(factorising));
        if (problem.order() <= LIBRARY_ORDER) {
            GeneralLibrary library = new GeneralLibrary(problem.stiffness());
            Timing general = timed("factorise K with EJML's sparse Cholesky", library::factorise);
            out.printf(Locale.ROOT, "      %.1f times the processor time of ours%n", general.ratioTo(factorising));
        }
        out.flush();
    }

    /** Compares the sparse solver with the dense one where both run. */
    void sparseAgainstDense() throws Exception {
        FrameBuilding building = FrameBuilding.withDegreesOfFreedom(DENSE_ORDER);
        Assembly assembly = Assembly.of(Snapshot.of(building.model()), progress);
        EigenProblem problem = new EigenProblem(assembly.stiffness(), assembly.mass());
        header(String.format(Locale.ROOT, "Both solvers, %,d degrees of freedom", problem.order()));
        Timing sparse = timed("sparse: " + MODES + " modes with certificate", () -> solve(EigenSolvers.lanczos(), problem));
        Timing dense = timed("dense (EJML): " + MODES + " modes with certificate", () -> solve(EigenSolvers.dense(), problem));
        out.printf(Locale.ROOT, "      dense takes %.1f times the processor time of sparse%n", dense.ratioTo(sparse));
        out.flush();
    }

    private void header(String title) {
        out.println();
        out.println(Timing.header(title));
    }

    private Timing timed(String what, Callable<?> work) throws Exception {
        Timing timing = Timing.of(work);
        out.println(timing.row(what));
        out.flush();
        return timing;
    }

    private Factorisation factorise(EigenProblem problem) {
        return Factorisers.sparse(problem, progress).factorise(problem.stiffness(), problem.mass(), 0.0, progress);
    }

    private EigenPairs solve(EigenSolver solver, EigenProblem problem) {
        try (EigenSession session = solver.open(problem, progress)) {
            EigenPairs pairs = session.solve(EigenRequest.lowest(MODES), progress);
            SpectrumCertificate certificate = session.certify(pairs, progress);
            if (!certificate.complete()) {
                throw new IllegalStateException("The benchmark's modes are incomplete: " + certificate);
            }
            return pairs;
        }
    }
}
