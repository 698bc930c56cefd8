package org.modewright.exchange;

import java.util.List;
import java.util.Map;

/**
 * The content of a result file, as it stands there; SI.
 *
 * @param version version of the format
 * @param program the program that wrote it
 * @param model the model; null for a pair of matrices
 * @param mass the mass; null for a pair of matrices
 * @param certificate the evidence that no mode is missing
 * @param modes the modes by ascending frequency
 * @param capture captured share by direction; empty for a pair of matrices
 * @param verdicts the verdicts
 * @param findings the findings
 * @param seconds seconds spent by stage
 */
public record StoredResult(int version, String program, Model model, Mass mass, Certificate certificate, List<Mode> modes,
        Map<String, Double> capture, List<Verdict> verdicts, List<Finding> findings, Map<String, Double> seconds) {

    /** The model: its name, the file it was read from with its SHA-256, and its size. */
    public record Model(String name, String file, String sha256, int nodes, int members, int panels, int freeDofs) {
    }

    /** Movable mass and mass on supports by direction (kg), centre of the movable mass (m), rotary inertia about it (kg m2). */
    public record Mass(Map<String, Double> movable, Map<String, Double> onSupports, List<Double> centre, Map<String, Double> rotary) {
    }

    /** The count of eigenvalues below a frequency (Hz) and the accuracy of the modes found. */
    public record Certificate(boolean complete, double belowHz, int counted, int found, double worstResidual, double worstOrthogonality) {
    }

    /**
     * A mode; what a pair of matrices cannot have is null.
     *
     * @param period s; null for a rigid-body mode
     */
    public record Mode(int number, double frequency, Double period, Double residual, Double errorBound, Map<String, Double> participation,
            Map<String, Double> effectiveMassShare, Double spread, String character, List<EnergyShare> strainEnergy,
            List<EnergyShare> kineticEnergy) {
    }

    /** The share of a mode's energy in one element. */
    public record EnergyShare(String kind, String element, double share) {
    }

    /** What a clause of a rule pack says of one direction. */
    public record Verdict(String rulePack, String clause, String direction, double captured, double required, boolean pass,
            int reachedAtMode, String text) {
    }

    /** Something that the audit found. */
    public record Finding(String id, String severity, List<String> objects, String text, String remedy) {
    }
}
