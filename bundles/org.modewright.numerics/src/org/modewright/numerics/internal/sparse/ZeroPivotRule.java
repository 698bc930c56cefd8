package org.modewright.numerics.internal.sparse;

/**
 * When a pivot counts as zero. A pivot d<sub>k</sub> is the energy x<sup>T</sup>Ax of the motion x with 1 at k, 0 at all later
 * equations and the earlier ones free. In floating point it carries an error of a small multiple of &epsilon; s, where
 * s = |x|<sup>T</sup>|L||D||L<sup>T</sup>||x| (N. J. Higham, Accuracy and Stability of Numerical Algorithms, SIAM 2002, theorem 10.3).
 * The pivot vanishes if |d<sub>k</sub>| &le; 16 &epsilon; s: the energy of the motion cannot be told from round-off. The rule does
 * not depend on the units of the equations, and a soft spring is no mechanism as long as its energy stands out of the round-off.
 */
final class ZeroPivotRule {

    static final double UNIT = 16.0 * Math.ulp(1.0);
    /** Pivots above this share of the scaled diagonal are not examined. */
    static final double SUSPICIOUS = 1e-5;

    private ZeroPivotRule() {
    }

    /** Evaluates s for a pivot candidate of the front being eliminated. */
    interface EnergyScale {
        double of(Front front, int eliminated, int candidate);
    }
}
