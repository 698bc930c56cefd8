package org.modewright.audit;

import java.util.Collections;
import java.util.EnumSet;
import java.util.Objects;
import java.util.Set;
import org.modewright.modal.Direction;
import org.modewright.model.Units;
import org.modewright.model.structure.AnalysisSettings;
import org.modewright.model.structure.AuditSettings;
import org.modewright.model.structure.StructuralModel;

/**
 * What an audit is asked for.
 *
 * @param rulePack id of the rule pack
 * @param directions the directions judged
 * @param modes number of modes, exact; 0: as many as the rule pack needs
 * @param belowHz only modes below this frequency, Hz; 0: no such limit
 * @param threads threads that may be used
 * @param thresholds limits of the findings
 */
public record AuditRequest(String rulePack, Set<Direction> directions, int modes, double belowHz, int threads, Thresholds thresholds) {

    /** Id of the rule pack that counts where none is named. */
    public static final String DEFAULT_RULE_PACK = "common-90";

    public AuditRequest {
        Objects.requireNonNull(rulePack, "rulePack");
        Objects.requireNonNull(thresholds, "thresholds");
        EnumSet<Direction> copy = EnumSet.noneOf(Direction.class);
        copy.addAll(directions);
        directions = Collections.unmodifiableSet(copy);
    }

    /** A request with the default thresholds. */
    public AuditRequest(String rulePack, Set<Direction> directions, int modes, double belowHz, int threads) {
        this(rulePack, directions, modes, belowHz, threads, Thresholds.DEFAULT);
    }

    /** Common practice in x and y, as many modes as that needs. */
    public static AuditRequest standard() {
        return new AuditRequest(DEFAULT_RULE_PACK, EnumSet.of(Direction.X, Direction.Y), 0, 0, 1);
    }

    /** What the model's own settings ask for; where it has none, {@link #standard()}. */
    public static AuditRequest of(StructuralModel model) {
        return new SettingsReader(model).request();
    }

    /** The same request of another rule pack. */
    public AuditRequest withRulePack(String id) {
        return new AuditRequest(id, directions, modes, belowHz, threads, thresholds);
    }

    /** The same request in other directions. */
    public AuditRequest withDirections(Set<Direction> others) {
        return new AuditRequest(rulePack, others, modes, belowHz, threads, thresholds);
    }

    /** The same request for a number of modes, or 0 for as many as needed. */
    public AuditRequest withModes(int number) {
        return new AuditRequest(rulePack, directions, number, belowHz, threads, thresholds);
    }

    /** The same request below a frequency in Hz, or 0 for no limit. */
    public AuditRequest withBelowHz(double frequency) {
        return new AuditRequest(rulePack, directions, modes, frequency, threads, thresholds);
    }

    /** The same request with so many threads. */
    public AuditRequest withThreads(int number) {
        return new AuditRequest(rulePack, directions, modes, belowHz, number, thresholds);
    }

    /** Reads a model's settings. */
    private record SettingsReader(StructuralModel model) {

        AuditRequest request() {
            AuditRequest request = standard();
            AnalysisSettings analysis = model.getAnalysis();
            if (analysis != null) {
                request = request.withModes(Math.max(0, analysis.getModes())).withBelowHz(Math.max(0, analysis.getBelow()));
            }
            AuditSettings audit = model.getAudit();
            return audit == null ? request : judged(request, audit);
        }

        private AuditRequest judged(AuditRequest request, AuditSettings audit) {
            String pack = audit.getRulePack() == null || audit.getRulePack().isBlank() ? DEFAULT_RULE_PACK : audit.getRulePack();
            return new AuditRequest(pack, directions(audit), request.modes, request.belowHz, request.threads, thresholds(audit));
        }

        private Thresholds thresholds(AuditSettings audit) {
            Thresholds standard = Thresholds.DEFAULT;
            double localNodes = audit.getLocalNodes() > 0 ? audit.getLocalNodes() : standard.localNodes();
            double coincidence = Math.max(0, audit.getCoincidence()) * Units.of(model).length();
            return new Thresholds(coincidence, localNodes, standard.closeModes(), standard.significantMass(),
                    standard.massOnSupports(), standard.massBalance());
        }

        private static Set<Direction> directions(AuditSettings audit) {
            EnumSet<Direction> directions = EnumSet.noneOf(Direction.class);
            if (audit.isX()) {
                directions.add(Direction.X);
            }
            if (audit.isY()) {
                directions.add(Direction.Y);
            }
            if (audit.isZ()) {
                directions.add(Direction.Z);
            }
            return directions;
        }
    }
}
