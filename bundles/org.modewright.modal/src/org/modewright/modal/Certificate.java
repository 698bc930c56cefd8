package org.modewright.modal;

import java.util.Locale;

/**
 * Evidence that no mode is missing: the inertia of K &minus; &sigma;M counts the eigenvalues below &sigma;, by Sylvester's law.
 *
 * @param complete whether as many modes were found as there are
 * @param belowHz the frequency of the shift, just above the last mode, Hz
 * @param counted eigenvalues below it by the inertia count
 * @param found modes found below it
 * @param worstResidual largest residual of the modes
 * @param worstOrthogonality largest |&phi;<sub>i</sub><sup>T</sup>M&phi;<sub>j</sub> &minus; &delta;<sub>ij</sub>|
 */
public record Certificate(boolean complete, double belowHz, int counted, int found, double worstResidual, double worstOrthogonality) {

    /** The certificate of a structure without a free motion. */
    public static final Certificate EMPTY = new Certificate(true, 0, 0, 0, 0, 0);

    /** The line that a reviewer reads: "complete: 60 of 60 below 14.2 Hz; worst residual 3e-11". */
    public String line() {
        String verdict = complete ? "complete" : "incomplete";
        return String.format(Locale.ROOT, "%s: %d of %d below %s Hz; worst residual %s", verdict, found, counted,
                Figures.significant(belowHz, 3), Figures.scientific(worstResidual));
    }
}
