package org.modewright.audit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import org.modewright.audit.detect.Detectors;
import org.modewright.fem.Assembly;
import org.modewright.fem.Snapshot;
import org.modewright.modal.CaptureTarget;
import org.modewright.modal.Certificate;
import org.modewright.modal.CharacterRules;
import org.modewright.modal.Figures;
import org.modewright.modal.ModalRequest;
import org.modewright.modal.ModalResult;
import org.modewright.modal.ModalRun;
import org.modewright.model.structure.StructuralModel;
import org.modewright.numerics.Progress;

/** Solves a model, judges its modes by a rule pack and looks for suspicious things. Immutable; may run several audits. */
public final class AuditRun {

    private static final double NANO = 1e-9;

    private final RulePacks packs;
    private final List<FindingDetector> detectors;

    /**
     * An audit with rule packs and, beside the built-in ones, further detectors.
     */
    public AuditRun(RulePacks packs, List<FindingDetector> further) {
        this.packs = packs;
        List<FindingDetector> all = new ArrayList<>(Detectors.builtIn());
        all.addAll(further);
        detectors = List.copyOf(all);
    }

    /** An audit with the built-in rule packs and detectors. */
    public static AuditRun standard() {
        return new AuditRun(RulePacks.builtIn(), List.of());
    }

    /**
     * Audits a model as it is now.
     *
     * @throws org.modewright.fem.ModelDefectsException if the model cannot be computed
     * @throws IllegalArgumentException if there is no such rule pack
     * @throws org.modewright.numerics.CancelledException on a cancel
     */
    public AuditResult run(StructuralModel model, AuditRequest request, Progress progress) {
        return run(Snapshot.of(model), request, progress);
    }

    /**
     * Audits a snapshot.
     *
     * @throws IllegalArgumentException if there is no such rule pack
     * @throws org.modewright.numerics.CancelledException on a cancel
     */
    public AuditResult run(Snapshot snapshot, AuditRequest request, Progress progress) {
        RulePack pack = packs.get(request.rulePack());
        long start = System.nanoTime();
        Assembly assembly = Assembly.of(snapshot, progress);
        double assembling = since(start);
        ModalResult modal = ModalRun.run(assembly, modalRequest(request, pack), progress);
        start = System.nanoTime();
        progress.report("looking for suspicious things", Double.NaN);
        List<Verdict> verdicts = modal.instabilities().isEmpty() ? new Judge(modal, pack).judge(request.directions()) : List.of();
        List<Finding> findings = findings(new AuditContext(snapshot, assembly, modal, verdicts, request), progress);
        ModalResult timed = modal.withSeconds("assemble", assembling).withSeconds("audit", since(start));
        AuditStatus status = status(timed, verdicts);
        return new AuditResult(timed, verdicts, findings, status, summary(timed, verdicts, status, request));
    }

    private static ModalRequest modalRequest(AuditRequest request, RulePack pack) {
        CaptureTarget target = new CaptureTarget(pack.capturedMass().required(), request.directions());
        CharacterRules rules = CharacterRules.withLocalNodes(request.thresholds().localNodes());
        return new ModalRequest(request.modes(), request.belowHz(), target, ModalRequest.DEFAULT_LIMIT, request.threads(), rules);
    }

    private List<Finding> findings(AuditContext context, Progress progress) {
        List<Finding> findings = new ArrayList<>();
        for (FindingDetector detector : detectors) {
            progress.checkCancelled();
            findings.addAll(detector.detect(context));
        }
        findings.sort(Comparator.comparing(Finding::severity));
        return findings;
    }

    private static AuditStatus status(ModalResult modal, List<Verdict> verdicts) {
        if (!modal.instabilities().isEmpty()) {
            return AuditStatus.UNSTABLE;
        }
        if (!modal.certificate().complete()) {
            return AuditStatus.INCOMPLETE;
        }
        boolean passed = !verdicts.isEmpty() && verdicts.stream().allMatch(Verdict::pass);
        return passed ? AuditStatus.PASSED : AuditStatus.NOT_PASSED;
    }

    private static String summary(ModalResult modal, List<Verdict> verdicts, AuditStatus status, AuditRequest request) {
        String nothingJudged = request.directions().isEmpty() ? "Nothing is judged: no direction is asked for."
                : "Nothing can be judged: no mass can move in the directions asked for.";
        Certificate certificate = modal.certificate();
        return switch (status) {
            case UNSTABLE -> "The structure is unstable. " + modal.instabilities().get(0).text();
            case INCOMPLETE -> "The modes are incomplete: " + certificate.found() + " of the " + certificate.counted()
                    + " below " + Figures.significant(certificate.belowHz(), 3) + " Hz were found, so nothing is proven.";
            case PASSED -> "The modes are enough: " + shares(verdicts) + " with "
                    + Figures.count(modal.modes().size(), "mode", "modes") + ".";
            case NOT_PASSED -> verdicts.isEmpty() ? nothingJudged
                    : "The modes are not enough: " + shares(verdicts.stream().filter(verdict -> !verdict.pass()).toList()) + " with "
                            + Figures.count(modal.modes().size(), "mode", "modes") + ".";
        };
    }

    private static String shares(List<Verdict> verdicts) {
        return verdicts.stream().map(verdict -> verdict.direction().label() + " " + Figures.percent(verdict.captured()) + " of the "
                + Figures.percent(verdict.required()) + " required").collect(Collectors.joining(", "));
    }

    private static double since(long start) {
        return (System.nanoTime() - start) * NANO;
    }
}
