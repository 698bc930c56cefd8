package org.modewright.modal;

import java.util.List;
import org.modewright.fem.Assembly;
import org.modewright.fem.Snapshot;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.Progress;

/** Finds the modes of a structure. */
public final class ModalRun {

    private static final double NANO = 1e-9;

    private final Assembly assembly;
    private final ModalRequest request;
    private final Progress progress;
    private final ModalResult.Builder builder = ModalResult.builder();

    private ModalRun(Assembly assembly, ModalRequest request, Progress progress) {
        this.assembly = assembly;
        this.request = request;
        this.progress = progress;
    }

    /**
     * Assembles and solves a model. An unstable structure is no failure: its rigid-body motions and mechanisms come as modes at 0 Hz, and
     * {@link ModalResult#instabilities()} names them.
     *
     * @param progress told of the stages; a cancel is obeyed within a second
     * @throws org.modewright.numerics.CancelledException on a cancel
     */
    public static ModalResult run(Snapshot snapshot, ModalRequest request, Progress progress) {
        long start = System.nanoTime();
        Assembly assembly = Assembly.of(snapshot, progress);
        return run(assembly, request, progress).withSeconds("assemble", since(start) - 0);
    }

    /** Solves a model that is assembled already. */
    public static ModalResult run(Assembly assembly, ModalRequest request, Progress progress) {
        return new ModalRun(assembly, request, progress).solve();
    }

    private ModalResult solve() {
        Snapshot snapshot = assembly.snapshot();
        builder.model(snapshot.name(), snapshot.members().size(), 0, assembly.freeDofs()).nodes(snapshot.nodes())
                .carriers(assembly.carriers()).mass(assembly.ledger(), assembly.planCoupling());
        ModeFigures figures = new ModeFigures(assembly, request.rules());
        long start = System.nanoTime();
        try (Spectrum spectrum = Spectrum.open(assembly.stiffness(), assembly.mass(), progress)) {
            builder.seconds("factor", since(start));
            start = System.nanoTime();
            spectrum.solve(new SolveOn(request), pairs -> isEnough(figures, pairs), progress);
            builder.certificate(spectrum.certify(progress), spectrum.pairs().exhausted());
            spectrum.remarks().forEach(builder::remark);
            collect(figures, spectrum.pairs());
            builder.seconds("eigen", since(start));
        }
        return builder.build();
    }

    private boolean isEnough(ModeFigures figures, EigenPairs pairs) {
        CaptureTarget target = request.target();
        for (Direction direction : target.directions()) {
            if (!target.isMetBy(figures.capture(pairs, direction))) {
                return false;
            }
        }
        return true;
    }

    private void collect(ModeFigures figures, EigenPairs pairs) {
        for (int i = 0; i < pairs.count(); i++) {
            progress.checkCancelled();
            ModeFigures.Figured figured = figures.figure(i, pairs);
            builder.mode(figured.mode(), figured.shape(), figured.strainShares(), figured.kineticShares());
        }
        builder.instabilities(instabilities(pairs));
    }

    private List<Instability> instabilities(EigenPairs pairs) {
        return new InstabilityFinder(assembly, pairs).find();
    }

    private static double since(long start) {
        return (System.nanoTime() - start) * NANO;
    }
}
