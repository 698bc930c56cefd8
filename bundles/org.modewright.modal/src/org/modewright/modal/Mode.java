package org.modewright.modal;

import java.util.Objects;

/**
 * One natural mode of vibration, &phi; scaled to &phi;<sup>T</sup>M&phi; = 1, the largest translation of any node positive.
 *
 * @param number 1 for the lowest
 * @param eigenvalue &lambda; = &omega;&sup2;, rad&sup2;/s&sup2;; 0 for a motion without resistance, negative for one that the axial
 *        forces drive out
 * @param frequency &radic;&lambda;/2&pi;, Hz; 0 where the eigenvalue is 0 or negative
 * @param period 1/frequency, s; infinite where the frequency is 0
 * @param residual &#8214;K&phi; &minus; &lambda;M&phi;&#8214;&#8322; / &#8214;K&phi;&#8214;&#8322;
 * @param errorBound bound of the frequency's relative error
 * @param participation &Gamma; = &phi;<sup>T</sup>M&iota; for the six {@link Direction directions}; &radic;kg, for rotations
 *        &radic;kg&middot;m
 * @param effectiveMassShare &Gamma;&sup2; over the movable mass of the direction, or over the rotary mass about its centre
 * @param spread 1/&Sigma;p&sup2; over the nodes' shares p of the kinetic energy: how many nodes effectively move
 * @param split shares of the kinetic energy in X, Y, Z and in the nodes' rotations
 * @param character what the mode does, in words
 */
public record Mode(int number, double eigenvalue, double frequency, double period, double residual, double errorBound,
        double[] participation, double[] effectiveMassShare, double spread, double[] split, Character character) {

    public Mode {
        participation = participation.clone();
        effectiveMassShare = effectiveMassShare.clone();
        split = split.clone();
        Objects.requireNonNull(character, "character");
    }

    /** A copy of the six participation factors. */
    @Override
    public double[] participation() {
        return participation.clone();
    }

    /** A copy of the six effective mass shares. */
    @Override
    public double[] effectiveMassShare() {
        return effectiveMassShare.clone();
    }

    /** A copy of the four shares of kinetic energy. */
    @Override
    public double[] split() {
        return split.clone();
    }

    /** Participation factor of one direction. */
    public double participation(Direction direction) {
        return participation[direction.ordinal()];
    }

    /** Effective mass share of one direction. */
    public double effectiveMassShare(Direction direction) {
        return effectiveMassShare[direction.ordinal()];
    }

    /** Whether the mode moves without resistance or is driven out. */
    public boolean isUnstable() {
        return eigenvalue <= 0;
    }

    /** Whether the mode is a local one. */
    public boolean isLocal() {
        return character.kind() == Character.Kind.LOCAL;
    }
}
