package org.modewright.modal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.modewright.fem.Assembly;
import org.modewright.numerics.Progress;

/** Further published effective masses, effective heights and bounds of the first frequency. */
class PublishedMassTest {

    private static final double LENGTH = 10;
    private static final double LINE_MASS = 7850 * 0.01;

    /** A beam along Z that bends in X alone, clamped at its foot. */
    private static Structures beam(int members, boolean clampedAtTheTop) {
        Structures structures = new Structures("beam").material("steel", 2.1e11, 0.3, 7850).section("bar", 0.01, 8e-6, 8e-6, 1e-5);
        structures.node("0", 0, 0, 0).support("0", "ux uy uz rx ry rz");
        for (int i = 1; i <= members; i++) {
            boolean clamped = i == members && clampedAtTheTop;
            structures.node("" + i, 0, 0, LENGTH * i / members).support("" + i, clamped ? "ux uy uz rx ry rz" : "uy uz rx rz");
            structures.with("m" + i, "" + (i - 1), "" + i);
        }
        return structures;
    }

    /**
     * Effective modal heights of the uniform cantilever, h/L = 1/(s<sub>n</sub>&beta;<sub>n</sub>L): A. K. Chopra, Dynamics of
     * Structures, distributed-mass systems; recomputed. The modal overturning moment over the modal base shear is the participation in
     * rotation about the base over that in X; the program's rotation is about the centre of mass, so the centre's height is added.
     */
    @Test
    void effectiveHeightsOfTheCantilever() {
        double[] expected = {0.7264773087612477, 0.20917095798960744, 0.1274101858935982, 0.09094290785558123, 0.07073562556747826,
            0.05787452134438726, 0.04897075184668297, 0.042441318153083635};
        int members = 120;
        ModalResult result = beam(members, false).modes(8);
        double centre = result.mass().centre()[2];
        for (int i = 0; i < expected.length; i++) {
            Mode mode = result.modes().get(i);
            double height = centre + mode.participation(Direction.RY) / mode.participation(Direction.X);
            // the mass coupled to the support is left out of the shear: phi at the first node, (beta L/120)^2/2 at most of the tip's
            double coupling = 0.5 * Math.pow((i + 0.5) * Math.PI / members, 2);
            assertEquals(expected[i], height / LENGTH, expected[i] * (1e-5 + coupling), "mode " + (i + 1));
        }
    }

    /** Sums over all modes: no moment about the centre of mass goes with a push through it. */
    @Test
    void heightsOfAllModesTogetherAreTheCentre() {
        ModalResult result = beam(12, false).allModes();
        double moment = 0;
        double size = 0;
        for (Mode mode : result.modes()) {
            double product = mode.participation(Direction.X) * mode.participation(Direction.RY);
            moment += product;
            size += Math.abs(product);
        }
        assertEquals(0, moment, 1e-9 * size);
        assertEquals(LINE_MASS * LENGTH, result.mass().movable()[0] + result.mass().onSupports()[0], 1e-9);
    }

    /**
     * Clamped beam shaken across at both ends: shares of the whole mass 69.03, 0, 13.23, 0, 5.36, 0, 2.88 %; closed form by quadrature,
     * recomputed.
     */
    @Test
    void clampedBeam() {
        double[] expected = {0.6903308708151186, 0, 0.1323281852847586, 0, 0.05359136275614746, 0, 0.028820247784567793};
        ModalResult result = beam(100, true).modes(7);
        for (int i = 0; i < expected.length; i++) {
            double share = result.modes().get(i).effectiveMassShare(Direction.X) * result.mass().movable()[0] / (LINE_MASS * LENGTH);
            // the mass coupled to the supports: as for the cantilever, at both ends
            assertEquals(expected[i], share, expected[i] * Math.pow((i + 1.5) * Math.PI / 100, 2) + 1e-9, "mode " + (i + 1));
        }
    }

    /** Uniform rod or shear beam fixed at one end: 8/((2n - 1)&sup2;&pi;&sup2;) of the whole mass; standard closed form, recomputed. */
    @Test
    void fixedFreeRod() {
        double[] expected = {0.8105694691387022, 0.09006327434874468, 0.03242277876554809, 0.016542234064055146, 0.010007030483193855,
            0.006698921232551258, 0.004796269048158001, 0.0036025309739497876, 0.002804738647538762, 0.0022453447898579007};
        int members = 300;
        Structures structures = new Structures("rod").material("unit", 1, 0, 1).section("unit", 1, 1, 1, 1);
        structures.node("0", 0, 0, 0).support("0", "ux uy uz rx ry rz");
        for (int i = 1; i <= members; i++) {
            structures.node("" + i, (double) i / members, 0, 0).support("" + i, "uy uz rx ry rz");
            structures.with("m" + i, "" + (i - 1), "" + i);
        }
        ModalResult result = structures.modes(10);
        double captured = 0;
        int ninety = 0;
        int ninetyFive = 0;
        for (int i = 0; i < expected.length; i++) {
            double effective = result.modes().get(i).effectiveMassShare(Direction.X) * result.mass().movable()[0];
            // linear shape functions and the coupling left out are both of the order of the square of x = (n - 1/2) pi h
            double x = (i + 0.5) * Math.PI / members;
            assertEquals(expected[i], effective, expected[i] * x * x, "mode " + (i + 1));
            captured += effective;
            ninety += captured < 0.90 ? 1 : 0;
            ninetyFive += captured < 0.95 ? 1 : 0;
        }
        assertEquals(2, ninety + 1);
        assertEquals(5, ninetyFive + 1);
    }

    /**
     * One-way eccentric storey, the rows of the table that {@link EffectiveMassTest} leaves out, here as a rigid floor on two rows of
     * springs: A. K. Chopra, Dynamics of Structures, section 13.3; C. L. Kan and A. K. Chopra (1977); from memory, recomputed.
     */
    @ParameterizedTest
    @CsvSource({"0.6, 0.1, 0.58714471, 1.00760165, 2.276001", "0.6, 0.2, 0.55012794, 1.02827975, 7.600085",
        "0.8, 0.05, 0.79572896, 1.00340192, 1.824105", "0.8, 0.1, 0.78363729, 1.01287344, 6.292136",
        "0.8, 0.4, 0.61754818, 1.12188870, 29.481766", "1.0, 0.1, 0.94868330, 1.04880885, 50.000000",
        "1.0, 0.2, 0.89442719, 1.09544512, 50.000000", "1.2, 0.05, 0.99719091, 1.20233535, 98.756643",
        "1.2, 0.2, 0.96056162, 1.23179600, 86.997004", "1.2, 0.4, 0.87378001, 1.29480056, 74.095937",
        "1.5, 0.05, 0.99900110, 1.50066546, 99.840764", "1.5, 0.1, 0.99601735, 1.50264748, 99.372032",
        "1.5, 0.2, 0.98426610, 1.51037089, 97.621207", "2.0, 0.05, 0.99958336, 2.00020826, 99.972245",
        "2.0, 0.1, 0.99833379, 2.00083224, 99.889258", "2.0, 0.4, 0.97343851, 2.01306172, 98.311747"})
    void eccentricFloorOnTwoRows(double ratio, double eccentricity, double first, double second, double share) {
        Structures s = new Structures("storey").node("centre", 0, 0, 3).support("centre", "ux uz rx ry").mass("centre", 1, 1, 0, 0, 0, 1);
        // rows at plus and minus the ratio have that ratio's square as stiffness about the centre
        s.node("east", ratio, 0, 3).node("west", -ratio, 0, 3).floor("floor", "centre", "east", "west");
        s.spring("row east", "east", null, 0, (1 + eccentricity / ratio) / 2, 0, 0, 0, 0);
        s.spring("row west", "west", null, 0, (1 - eccentricity / ratio) / 2, 0, 0, 0, 0);
        ModalResult result = s.allModes();
        assertEquals(2, result.modes().size());
        assertEquals(first, 2 * Math.PI * result.modes().get(0).frequency(), 0.5e-8 + 1e-11);
        assertEquals(second, 2 * Math.PI * result.modes().get(1).frequency(), 0.5e-8 + 1e-11);
        assertEquals(share, 100 * result.modes().get(0).effectiveMassShare(Direction.Y), 0.5e-6 + 1e-9);
    }

    /**
     * The first frequency of the uniform five-storey building, k = 100, m = 1, lies between Dunkerley's bound 2.581989 and Rayleigh's
     * quotients of the linear shape, 3.015113, and of the deflection under m times that shape, 2.848105; recomputed.
     */
    @Test
    void boundsOfTheFirstFrequency() {
        Structures building = Structures.chain(new double[] {1, 1, 1, 1, 1}, new double[] {100, 100, 100, 100, 100});
        double omega = 2 * Math.PI * building.allModes().modes().get(0).frequency();
        assertEquals(2.846296765465705, omega, 1e-12);
        Assembly assembly = Assembly.of(building.snapshot(), Progress.NONE);
        double[] linear = new double[5];
        double[] deflection = new double[5];
        for (int dof = 0; dof < 5; dof++) {
            linear[dof] = assembly.nodeOf(dof) / 5.0;
        }
        // storey shears under forces 0.2 to 1.0 from the top: 1.0, 1.8, 2.4, 2.8, 3.0; each storey gives way by a hundredth
        double[] shear = {3.0, 2.8, 2.4, 1.8, 1.0};
        for (int dof = 0; dof < 5; dof++) {
            for (int storey = 0; storey < assembly.nodeOf(dof); storey++) {
                deflection[dof] += shear[storey] / 100;
            }
        }
        double rayleigh = Math.sqrt(quotient(assembly, linear));
        double improved = Math.sqrt(quotient(assembly, deflection));
        assertEquals(3.015113445777637, rayleigh, 1e-12);
        assertEquals(2.8481050064313944, improved, 1e-12);
        assertTrue(2.581988897471611 < omega && omega < improved && improved < rayleigh);
    }

    private static double quotient(Assembly assembly, double[] shape) {
        return assembly.stiffness().quadratic(shape) / assembly.mass().quadratic(shape);
    }
}
