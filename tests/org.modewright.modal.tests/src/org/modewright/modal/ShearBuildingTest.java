package org.modewright.modal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.modewright.modal.Structures.filled;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Published and closed-form frequencies and effective masses of shear buildings, made of springs and masses. */
class ShearBuildingTest {

    /** Round-off of a dense eigensolution of a well-conditioned pencil, with two orders in hand. */
    private static final double EXACT = 1e-11;

    private static double[] omegas(ModalResult result) {
        return result.modes().stream().mapToDouble(mode -> 2 * Math.PI * mode.frequency()).toArray();
    }

    private static double[] shares(ModalResult result, Direction direction) {
        return result.modes().stream().mapToDouble(mode -> mode.effectiveMassShare(direction)).toArray();
    }

    /**
     * Uniform building of N storeys: &omega;<sub>n</sub> = 2&radic;(k/m) sin(&alpha;/2), shapes &phi;<sub>j</sub> = sin(j&alpha;) with
     * &alpha; = (2n &minus; 1)&pi;/(2N + 1): closed form of the fixed-free chain (Humar; Newmark and Rosenblueth). The effective masses
     * are sums of these shapes.
     */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 15, 20, 30, 50, 100})
    void uniformBuildingHasClosedFormModes(int storeys) {
        ModalResult result = Structures.chain(filled(storeys, 1000), filled(storeys, 1e6)).allModes();
        assertEquals(storeys, result.modes().size());
        for (int n = 1; n <= storeys; n++) {
            double angle = (2 * n - 1) * Math.PI / (2 * storeys + 1);
            double omega = 2 * Math.sqrt(1e6 / 1000) * Math.sin(angle / 2);
            double sum = 0;
            double squares = 0;
            for (int j = 1; j <= storeys; j++) {
                sum += Math.sin(j * angle);
                squares += Math.sin(j * angle) * Math.sin(j * angle);
            }
            Mode mode = result.modes().get(n - 1);
            assertEquals(omega, 2 * Math.PI * mode.frequency(), 1e-10 * omega, "mode " + n);
            assertEquals(sum * sum / squares / storeys, mode.effectiveMassShare(Direction.X), EXACT, "mode " + n);
        }
        assertEquals(1, result.capture(Direction.X), 1e-12);
    }

    /** Table of effective modal masses of the uniform building in per cent, four decimals; recomputed from the closed form. */
    @ParameterizedTest
    @CsvSource({"2, 94.7214 5.2786", "3, 91.4079 7.4877 1.1044", "4, 89.3429 8.3333 1.9558 0.3680",
        "5, 87.9530 8.7177 2.4216 0.7509 0.1568", "6, 86.9582 8.9136 2.6909 1.0062 0.3532 0.0779",
        "10, 84.7925 9.1408 3.0915 1.4286 0.7488 0.4100 0.2214 0.1104 0.0453 0.0108",
        "100, 81.4589 9.0480 3.2552 1.6592 1.0024 0.6699"})
    void uniformBuildingHasTabulatedEffectiveMasses(int storeys, String percents) {
        ModalResult result = Structures.chain(filled(storeys, 1000), filled(storeys, 1e6)).allModes();
        double[] shares = shares(result, Direction.X);
        String[] expected = percents.split(" ");
        for (int i = 0; i < expected.length; i++) {
            assertEquals(Double.parseDouble(expected[i]), 100 * shares[i], 0.5e-4, "mode " + (i + 1));
        }
    }

    /** Number of modes that reach 90, 95 and 99 % of a uniform building's mass; recomputed from the closed form. */
    @ParameterizedTest
    @CsvSource({"1, 1, 1, 1", "2, 1, 2, 2", "3, 1, 2, 3", "4, 2, 2, 3", "5, 2, 2, 3", "8, 2, 3, 5", "20, 2, 3, 8", "50, 2, 4, 12",
        "100, 2, 4, 15"})
    void uniformBuildingNeedsTabulatedNumberOfModes(int storeys, int ninety, int ninetyFive, int ninetyNine) {
        double[] running = Structures.chain(filled(storeys, 1000), filled(storeys, 1e6)).allModes().running(Direction.X);
        assertEquals(ninety, reaching(running, 0.90));
        assertEquals(ninetyFive, reaching(running, 0.95));
        assertEquals(ninetyNine, reaching(running, 0.99));
    }

    private static int reaching(double[] running, double share) {
        int mode = 0;
        while (running[mode] < share) {
            mode++;
        }
        return mode + 1;
    }

    /**
     * Two storeys m, m, k, k: effective masses 1/2 &plusmn; 1/&radic;5 = 94.72 % and 5.28 %; closed form. The same numbers
     * for m = 1.5 kip s&sup2;/in, k = 200 kip/in in B. S. Taranath, Wind and Earthquake Resistant Buildings (2005), chapter 2: printed
     * &lambda;&#8322; = 349, shapes 0.618 and &minus;1.618, L&#8321; = 2.426.
     */
    @Test
    void twoEqualStoreys() {
        ModalResult result = Structures.chain(new double[] {1.5, 1.5}, new double[] {200, 200}).allModes();
        double[] shares = shares(result, Direction.X);
        assertEquals(0.5 + 1 / Math.sqrt(5), shares[0], EXACT);
        assertEquals(0.5 - 1 / Math.sqrt(5), shares[1], EXACT);
        assertEquals(349, result.modes().get(1).eigenvalue(), 0.5);
        assertEquals(50.928801500014, result.modes().get(0).eigenvalue(), 1e-9);
        assertEquals(0.618, relative(result, 0, 1, 2), 0.5e-3);
        assertEquals(-1.618, relative(result, 1, 1, 2), 0.5e-3);
        double top = result.shape(0)[6 * 2];
        assertEquals(2.426, result.modes().get(0).participation(Direction.X) / top, 2e-3);
    }

    private static double relative(ModalResult result, int mode, int node, int to) {
        double[] shape = result.shape(mode);
        return shape[6 * node] / shape[6 * to];
    }

    /**
     * Two-storey shear frame 2m, m, 2k, k: &omega; = &radic;(k/2m), &radic;(2k/m); shapes (1/2, 1) and (&minus;1, 1); effective masses 8m/3
     * and m/3: A. K. Chopra, Dynamics of Structures, example 10.4 and chapter 13 (from memory, recomputed).
     */
    @Test
    void twoStoreysOfUnequalMass() {
        ModalResult result = Structures.chain(new double[] {2, 1}, new double[] {2, 1}).allModes();
        assertArrayEquals(new double[] {Math.sqrt(0.5), Math.sqrt(2)}, omegas(result), EXACT);
        assertArrayEquals(new double[] {8.0 / 9, 1.0 / 9}, shares(result, Direction.X), EXACT);
        assertEquals(0.5, relative(result, 0, 1, 2), EXACT);
        assertEquals(-1, relative(result, 1, 1, 2), EXACT);
    }

    /**
     * Uniform five-storey frame, m = 100 kip/g, k = 31.54 kip/in, g = 386.4 in/s&sup2;: A. K. Chopra, Dynamics of Structures (2nd to 4th
     * ed.), chapter 13, tables 13.8.1 to 13.8.5 (from memory, recomputed). Printed: periods 2.0, 0.6852, 0.4346, 0.3383, 0.2966 s;
     * effective masses 4.398, 0.436, 0.121, 0.038, 0.008 m. With g = 386.4 the recomputed second period is 0.68504, 2e-4 off the print.
     */
    @Test
    void fiveStoreysOfTheTextbook() {
        double mass = 100 / 386.4;
        ModalResult result = Structures.chain(filled(5, mass), filled(5, 31.54)).allModes();
        double[] printedPeriods = {2.0, 0.6852, 0.4346, 0.3383, 0.2966};
        double[] printedMasses = {4.398, 0.436, 0.121, 0.038, 0.008};
        double[] recomputed = {1.9996329558555648, 0.6850437076457407, 0.43456177163661336, 0.3382778551440849, 0.29659147960874255};
        for (int i = 0; i < 5; i++) {
            Mode mode = result.modes().get(i);
            assertEquals(recomputed[i], mode.period(), 1e-11 * recomputed[i]);
            assertEquals(printedPeriods[i], mode.period(), 4e-4 * printedPeriods[i]);
            assertEquals(printedMasses[i], 5 * mode.effectiveMassShare(Direction.X), 0.5e-3 + 1e-9);
        }
    }

    /**
     * The same frame in a student's solution after Chopra with shapes rounded to three decimals: effective masses 87.94 % and 8.74 %.
     * Rounded shapes cost 0.3 % of the second.
     */
    @Test
    void fiveStoreysOfTheExercise() {
        double[] shares = shares(Structures.chain(filled(5, 1), filled(5, 1)).allModes(), Direction.X);
        assertEquals(4.39765, 5 * shares[0], 0.5e-5);
        assertEquals(0.43589, 5 * shares[1], 0.5e-5);
        assertEquals(87.94, 100 * shares[0], 0.02);
        assertEquals(8.74, 100 * shares[1], 0.03);
    }

    /**
     * Three storeys, masses 1.0, 1.5, 2.0 kip s&sup2;/in and stiffnesses 60, 120, 180 kip/in from the top: course handout CIVL 7119/8119,
     * University of Memphis (read, recomputed), after R. W. Clough and J. Penzien, Dynamics of Structures, example E11-1. Printed:
     * &lambda; = 21.088, 96.396, 212.516; shapes, L and M with the top at 1.
     */
    @Test
    void threeStoreysOfTheHandout() {
        ModalResult result = Structures.chain(new double[] {2, 1.5, 1}, new double[] {180, 120, 60}).allModes();
        double[] lambda = {21.088, 96.396, 212.516};
        double[][] shapes = {{1, 0.649, 0.302}, {1, -0.607, -0.679}, {1, -2.542, 2.44}};
        double[] modalMass = {1.813, 2.474, 22.596};
        double[] excitation = {2.577, -1.268, 2.066};
        double[] effective = {3.661287112577042, 0.649747688465971, 0.1889651989569875};
        for (int i = 0; i < 3; i++) {
            Mode mode = result.modes().get(i);
            double top = result.shape(i)[18];
            assertEquals(lambda[i], mode.eigenvalue(), 0.5e-3);
            assertEquals(shapes[i][1], relative(result, i, 2, 3), 0.5e-3);
            assertEquals(shapes[i][2], relative(result, i, 1, 3), 0.5e-3);
            assertEquals(modalMass[i], 1 / (top * top), 0.5e-3);
            assertEquals(excitation[i], mode.participation(Direction.X) / top, 0.5e-3);
            assertEquals(effective[i], 4.5 * mode.effectiveMassShare(Direction.X), 1e-10);
        }
    }

    /**
     * R. W. Clough and J. Penzien, Dynamics of Structures, example E11-1 (from memory, recomputed): ten times the stiffness. Printed
     * &omega; = 14.522, 31.048, 46.1; &lambda; = 210.88, 963.96, 2125.1 (the last cut, not rounded: 2125.16).
     */
    @Test
    void threeStoreysOfTheTextbook() {
        ModalResult result = Structures.chain(new double[] {2, 1.5, 1}, new double[] {1800, 1200, 600}).allModes();
        assertArrayEquals(new double[] {14.522, 31.048}, Arrays.copyOf(omegas(result), 2), 0.5e-3);
        assertEquals(46.1, omegas(result)[2], 0.05);
        assertEquals(210.88, result.modes().get(0).eigenvalue(), 0.5e-2);
        assertEquals(963.96, result.modes().get(1).eigenvalue(), 0.5e-2);
        assertEquals(2125.1, result.modes().get(2).eigenvalue(), 0.1);
    }

    /**
     * Modal contribution factors of the roof displacement and the base shear of the uniform five-storey frame under a roof load:
     * A. K. Chopra, Dynamics of Structures (2nd ed.), section 12.11, as reproduced in published course notes (read,
     * recomputed); printed with three decimals. Mode n: roof &phi;<sub>N</sub>&sup2;/&lambda; over N/k, base shear &Gamma;&phi;<sub>N</sub>.
     */
    @Test
    void modalContributionFactors() {
        ModalResult result = Structures.chain(filled(5, 1), filled(5, 1)).allModes();
        double[] roof = {0.880, 0.087, 0.024, 0.008, 0.002};
        double[] shear = {1.252, -0.362, 0.159, -0.063, 0.015};
        for (int i = 0; i < 5; i++) {
            double top = result.shape(i)[30];
            Mode mode = result.modes().get(i);
            assertEquals(roof[i], top * top / mode.eigenvalue() / 5, 0.5e-3 + 1e-6);
            assertEquals(shear[i], mode.participation(Direction.X) * top, 0.5e-3 + 1e-6);
        }
    }

    /**
     * Eight-storey block: floor weights in tonf, storey stiffness in tonf/cm, g = 981 cm/s&sup2;: inputs read in a report of the
     * Universidad Nacional Pedro Ruiz Gallo, "Analisis sismico dinamico 2018-I"; results recomputed.
     */
    @Test
    void eightStoreysOfTheReport() {
        double[] weights = {124.743, 121.019, 121.019, 121.019, 121.019, 121.019, 121.019, 81.099};
        double[] stiffness = {498.519, 770.48, 770.495, 770.495, 770.495, 770.495, 770.495, 770.495};
        double[] masses = Arrays.stream(weights).map(weight -> weight / 981).toArray();
        ModalResult result = Structures.chain(masses, stiffness).allModes();
        double[] periods = {0.44139452850642813, 0.14793799035028107, 0.09001914544152421, 0.06601728238723409, 0.05351986629257162,
            0.0464195282478298, 0.042389981946163724, 0.04035805796142986};
        double[] shares = {0.8913895893616223, 0.07970501642847153, 0.019600999436941016, 0.006158163470257369, 0.0021293391724435526,
            0.000742711751495096, 0.00022966112208895953, 4.451925668065605e-05};
        assertArrayEquals(periods, result.modes().stream().mapToDouble(Mode::period).toArray(), 1e-11);
        assertArrayEquals(shares, shares(result, Direction.X), 1e-10);
    }

    /** Three storeys 120, 120, 90 t and 150, 120, 90 MN/m: own case, recomputed. */
    @Test
    void threeStoreysInTonnes() {
        ModalResult result = Structures.chain(new double[] {120e3, 120e3, 90e3}, new double[] {150e6, 120e6, 90e6}).allModes();
        assertArrayEquals(new double[] {0.39738353063184423, 0.15834102019855337, 0.11150165042106266},
                result.modes().stream().mapToDouble(Mode::period).toArray(), 1e-11);
        assertArrayEquals(new double[] {0.8797653958944281, 0.09194743827348423, 0.0282871658320876}, shares(result, Direction.X), 1e-10);
        assertEquals(0.375, relative(result, 0, 1, 3), EXACT);
        assertEquals(0.75, relative(result, 0, 2, 3), EXACT);
    }

    /** Six storeys of unequal mass and stiffness: own case, recomputed. */
    @Test
    void sixStoreys() {
        ModalResult result = Structures.chain(new double[] {500e3, 480e3, 480e3, 480e3, 480e3, 400e3},
                new double[] {400e6, 380e6, 340e6, 300e6, 240e6, 180e6}).allModes();
        assertArrayEquals(new double[] {0.829415, 0.937064, 0.97258, 0.987519, 0.995777, 1.0}, result.running(Direction.X), 0.5e-6);
        assertArrayEquals(new double[] {0.946842, 0.358055, 0.228788, 0.176265, 0.145347, 0.123277},
                result.modes().stream().mapToDouble(Mode::period).toArray(), 0.5e-6 + 1e-9);
    }

    /** Five masses on two very stiff heavy storeys: three modes hold a third of the mass; own case, recomputed. */
    @Test
    void stiffHeavyLowerStoreys() {
        ModalResult result = Structures.chain(new double[] {400e3, 300e3, 100e3, 100e3, 80e3},
                new double[] {9000e6, 8000e6, 120e6, 100e6, 80e6}).allModes();
        assertArrayEquals(new double[] {0.2687249421527092, 0.3051857349232353, 0.3197246097414224, 0.9610990809119835, 1.0},
                result.running(Direction.X), 1e-10);
        assertEquals(16.287495601168374, result.modes().get(3).frequency(), 1e-10);
    }

    /**
     * The participation ratio of a uniform chain is (2N + 1)/3 in every mode: R. J. Bell and P. Dean, Discuss. Faraday Soc. 50 (1970)
     * 55-61.
     */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 5, 10})
    void spreadOfTheUniformChain(int storeys) {
        for (Mode mode : Structures.chain(filled(storeys, 3), filled(storeys, 7)).allModes().modes()) {
            assertEquals((2 * storeys + 1) / 3.0, mode.spread(), 1e-10);
        }
    }

    /** Strain energy shares by storey of the uniform five-storey frame; recomputed, definition standard. */
    @Test
    void strainEnergySharesOfStoreys() {
        ModalResult result = Structures.chain(filled(5, 1), filled(5, 100)).allModes();
        double[][] expected = {
            {0.3562714497480886, 0.30088376980823295, 0.20769360695877911, 0.10628817945420325, 0.028862994030694204},
            {0.30088376980823334, 0.028862994030694384, 0.1062881794542024, 0.35627144974809, 0.20769360695877886},
            {0.2076936069587791, 0.10628817945420248, 0.30088376980823345, 0.0288629940306943, 0.3562714497480905},
            {0.10628817945420246, 0.35627144974809044, 0.028862994030694318, 0.207693606958779, 0.30088376980823356},
            {0.02886299403069431, 0.20769360695877911, 0.35627144974809055, 0.3008837698082338, 0.10628817945420248}};
        for (int mode = 0; mode < 5; mode++) {
            double[] shares = result.strainShares(mode);
            for (int storey = 0; storey < 5; storey++) {
                assertEquals(expected[mode][storey], shares[storey], 1e-10);
            }
        }
    }

    /**
     * A light appendage (m = 0.01, k = 0.35) on floor 3 of the uniform five-storey frame (m = 1, k = 100): own case, recomputed. The
     * second mode is the appendage's own, with 99.5 % of the kinetic energy.
     */
    @Test
    void appendageHoldsTheKineticEnergyOfItsMode() {
        Structures structures = Structures.chain(filled(5, 1), filled(5, 100));
        structures.node("appendage", 1, 0, 9).support("appendage", "uy uz rx ry rz").mass("appendage", 0.01, 0, 0, 0, 0, 0)
                .spring("hanger", "floor 3", "appendage", 0.35, 0, 0, 0, 0, 0);
        ModalResult result = structures.allModes();
        assertArrayEquals(new double[] {2.8424597451329126, 5.9173254665964246, 8.312832690658729, 13.10226408693769, 16.825413181146764,
            19.193453093610312}, omegas(result), 1e-9);
        int appendage = indexOfCarrier(result, "appendage");
        assertEquals(0.0035018611400453, result.kineticShare(0, appendage), 1e-10);
        assertEquals(0.995138813059454, result.kineticShare(1, appendage), 1e-10);
        assertTrue(result.modes().get(1).spread() < 1.02);
    }

    private static int indexOfCarrier(ModalResult result, String name) {
        for (int i = 0; i < result.carriers().size(); i++) {
            if (result.carriers().get(i).name().equals(name)) {
                return i;
            }
        }
        throw new AssertionError("no carrier " + name);
    }
}
