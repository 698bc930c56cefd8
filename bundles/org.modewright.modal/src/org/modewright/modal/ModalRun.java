package org.modewright.modal;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.modewright.fem.Assembly;
import org.modewright.fem.NodePoint;
import org.modewright.fem.Snapshot;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.IndefiniteMassException;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SingularPencilException;

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
     * @throws IndefiniteMassException if loads take away so much mass that some motion would have a negative kinetic energy
     * @throws org.modewright.numerics.CancelledException on a cancel
     */
    public static ModalResult run(Snapshot snapshot, ModalRequest request, Progress progress) {
        long start = System.nanoTime();
        Assembly assembly = Assembly.of(snapshot, progress);
        double assembling = since(start);
        return run(assembly, request, progress).withSeconds("assemble", assembling);
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
        try {
            solve(figures);
        } catch (SingularPencilException e) {
            builder.certificate(new Certificate(false, 0, 0, 0, 0, 0), false).instabilities(List.of(withoutStiffnessOrMass(e)));
        } catch (IndefiniteMassException e) {
            throw NegativeLoads.sentence(snapshot).map(IndefiniteMassException::new).orElse(e);
        }
        return builder.build();
    }

    private void solve(ModeFigures figures) {
        long start = System.nanoTime();
        try (Spectrum spectrum = Spectrum.open(assembly.stiffness(), assembly.mass(), progress)) {
            builder.seconds("factor", since(start));
            start = System.nanoTime();
            spectrum.solve(new SolveOn(request), pairs -> isEnough(figures, pairs), progress);
            builder.certificate(spectrum.certify(progress), spectrum.pairs().exhausted());
            spectrum.remarks().forEach(builder::remark);
            collect(figures, spectrum.pairs());
            builder.instabilities(instabilities(spectrum.throughZero(progress)));
            builder.seconds("eigen", since(start));
        }
    }

    /** Assembling drops such motions; what is left of them is at the limit of round-off. */
    private Instability withoutStiffnessOrMass(SingularPencilException singular) {
        int[] nodes = IntStream.of(singular.degreesOfFreedom()).map(assembly::nodeOf).distinct().sorted().toArray();
        List<NodePoint> points = assembly.snapshot().nodes();
        boolean[] able = new boolean[6];
        IntStream.of(singular.degreesOfFreedom()).forEach(dof -> able[assembly.componentOf(dof)] = true);
        List<String> directions = NodeWords.directions(able);
        return new Instability(Instability.Kind.MECHANISM, NodeWords.ids(nodes, points), NodeWords.names(nodes, points), directions,
                NodeWords.list(nodes, points) + " can move with hardly any stiffness and mass (" + String.join(", ", directions)
                        + "), too little to tell from round-off, so no mode can be found.",
                "Hold these motions, or give them a stiffness that compares with the rest of the structure.");
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
    }

    private List<Instability> instabilities(EigenPairs pairs) {
        List<Instability> instabilities = new ArrayList<>(new InstabilityFinder(assembly, pairs).find());
        new HiddenBuckling(assembly, pairs).find(progress).ifPresent(instabilities::add);
        return instabilities;
    }

    private static double since(long start) {
        return (System.nanoTime() - start) * NANO;
    }
}
