package org.modewright.audit;

/**
 * Limits from which something is worth a finding. Our own convention, unless a source is named.
 *
 * @param coincidence nodes closer than this, m, and not joined are reported; 0: a thousandth of the model's size
 * @param localNodes a mode that effectively moves fewer nodes than this share of all, and little mass, is local
 * @param closeModes modes whose frequencies differ by no more than this share of the lower one are close; a tenth, as in the grouping and
 *        ten-percent methods of USNRC Regulatory Guide 1.92 Rev. 1 (from memory)
 * @param significantMass a close mode counts if its effective mass share in some judged direction is at least this
 * @param massOnSupports share of the total mass that may sit on supports without a word
 * @param massBalance relative mismatch of mass in and mass out that counts as round-off
 */
public record Thresholds(double coincidence, double localNodes, double closeModes, double significantMass, double massOnSupports,
        double massBalance) {

    /** A thousandth of the size, a tenth of the nodes, 10 % apart, 1 % of the mass, 10 % on supports, 1e-9. */
    public static final Thresholds DEFAULT = new Thresholds(0, 0.1, 0.1, 0.01, 0.1, 1e-9);
}
