package org.modewright.numerics;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;

import org.junit.jupiter.api.Test;

/** The sparse path on problems of the size it is for. */
class LargeProblemTest {

    private static EigenPairs solve(EigenProblem problem, int count, double largestResidual) {
        try (EigenSession session = EigenSolvers.lanczos().open(problem, Progress.NONE)) {
            EigenPairs pairs = session.solve(EigenRequest.lowest(count), Progress.NONE);
            assertEquals(count, pairs.count());
            SpectrumCertificate certificate = session.certify(pairs, Progress.NONE);
            assertTrue(certificate.complete(), certificate.toString());
            assertTrue(certificate.worstOrthogonality() <= 1e-12, certificate.toString());
            assertTrue(certificate.worstResidual() <= largestResidual, certificate.toString());
            return pairs;
        }
    }

    @Test
    void shearBuildingOfTwentyThousandStoreys() {
        int masses = 20000;
        EigenPairs pairs = solve(Pencils.chain(masses, 3e8, 2e5, true, false), 30, 1e-6);
        for (int r = 1; r <= 30; r++) {
            double sine = Math.sin((2 * r - 1) * Math.PI / (2.0 * (2 * masses + 1)));
            double expected = 4.0 * 3e8 / 2e5 * sine * sine;
            // Round-off of the entries of K against the lowest value: eps 4 / (pi / 4e4)^2 = 1.4e-7.
            assertEquals(expected, pairs.values()[r - 1], 1.4e-7 * expected, "value " + r);
            double participation = Arrays.stream(pairs.vectors()[r - 1]).sum() * 2e5;
            double cotangent = 1.0 / Math.tan((2 * r - 1) * Math.PI / (2.0 * (2 * masses + 1)));
            double share = cotangent * cotangent / (masses * (2.0 * masses + 1.0));
            assertEquals(share, participation * participation / (2e5 * masses), 1e-6);
        }
    }

    /** Grid of n by n masses with springs along its lines, edges held: &lambda; = 4 sin^2(i a) + 4 sin^2(j a), a = &pi; / (2 (n + 1)). */
    @Test
    void squareMembraneHasItsDoubleRoots() {
        int n = 120;
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(n * n);
        double[] ones = new double[n * n];
        Arrays.fill(ones, 1.0);
        for (int at = 0; at < n * n; at++) {
            k.add(at, at, 4.0);
            if (at % n > 0) {
                k.add(at, at - 1, -1.0);
            }
            if (at >= n) {
                k.add(at, at - n, -1.0);
            }
        }
        double[] all = new double[n * n];
        for (int at = 0; at < n * n; at++) {
            all[at] = 4.0 * Math.pow(Math.sin((at % n + 1) * Math.PI / (2.0 * (n + 1))), 2)
                    + 4.0 * Math.pow(Math.sin((at / n + 1) * Math.PI / (2.0 * (n + 1))), 2);
        }
        Arrays.sort(all);
        EigenPairs pairs = solve(new EigenProblem(k.build(), Pencils.diagonal(ones)), 60, 1e-10);
        for (int i = 0; i < 60; i++) {
            // eps times the largest over the lowest value: 2e-16 * 8 / 1.3e-3.
            assertEquals(all[i], pairs.values()[i], 2e-12 * all[i], "value " + i);
        }
    }

    @Test
    void frameAgreesWithTheDenseSolution() {
        EigenProblem problem = FrameBuilding.problem(4, 3, 6, 1, 6.0, 5.0);
        EigenPairs sparse = solve(problem, 60, 1e-10);
        EigenPairs dense = EigenSolvers.dense().open(problem, Progress.NONE).solve(EigenRequest.lowest(60), Progress.NONE);
        for (int i = 0; i < 60; i++) {
            double tolerance = dense.errorBounds()[i] + sparse.errorBounds()[i];
            assertEquals(dense.values()[i], sparse.values()[i], tolerance, "value " + i);
            assertTrue(tolerance <= 1e-8 * dense.values()[i], "bounds of value " + i);
        }
    }

    /** Equal bays both ways: sway comes in pairs. */
    @Test
    void squareFrameHasPairsOfModes() {
        EigenPairs pairs = solve(FrameBuilding.problem(5, 5, 10, 2, 6.0, 6.0), 40, 1e-9);
        assertEquals(pairs.values()[0], pairs.values()[1], 1e-9 * pairs.values()[0]);
    }

    @Test
    void floatingFrameHasSixZeros() {
        EigenPairs pairs = solve(FrameBuilding.floating(4, 4, 8, 2), 30, 1e-9);
        assertArrayEquals(new double[6], Arrays.copyOf(pairs.values(), 6));
        assertTrue(pairs.values()[6] > 1.0);
    }
}
