package org.modewright.fem;

/**
 * Inertia of a frame member per length, after the seismic mass rule; effective-stiffness factors do not touch it.
 *
 * @param mass &rho; A, kg/m
 * @param rotaryY &rho; I<sub>y</sub>, kg m; counts in the local x-z plane where that plane deforms in shear
 * @param rotaryZ &rho; I<sub>z</sub>, kg m; counts in the local x-y plane where that plane deforms in shear
 */
public record MemberInertia(double mass, double rotaryY, double rotaryZ) {

    /** Inertia in spin about the member's axis, &rho;(I<sub>y</sub> + I<sub>z</sub>), kg m. */
    public double spin() {
        return rotaryY + rotaryZ;
    }
}
