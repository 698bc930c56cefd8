package org.modewright.numerics;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.Arrays;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;

import org.junit.jupiter.api.Named;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Small pencils of a textbook with both solvers, and inertia counts of published matrices. */
class PublishedPencilTest {

    private static final double[] SHIFTS = {1e3, 1e4, 1e5, 1e6, 1e7, 1e8};

    static Stream<Named<EigenSolver>> solvers() {
        return Stream.of(Named.of("dense", EigenSolvers.dense()), Named.of("Lanczos", EigenSolvers.lanczos()));
    }

    private static SymmetricMatrix matrix(double[][] rows) {
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(rows.length);
        for (int i = 0; i < rows.length; i++) {
            for (int j = 0; j <= i; j++) {
                builder.add(i, j, rows[i][j]);
            }
        }
        return builder.build();
    }

    /** The vectors are compared up to their sign. */
    private static void check(EigenSolver solver, double[][] stiffness, double[] mass, double[] values, double[][] vectors) {
        EigenProblem problem = new EigenProblem(matrix(stiffness), Pencils.diagonal(mass));
        try (EigenSession session = solver.open(problem, Progress.NONE)) {
            EigenPairs pairs = session.solve(EigenRequest.lowest(values.length), Progress.NONE);
            for (int i = 0; i < values.length; i++) {
                // a few units of round-off of the largest entry, some 10
                assertEquals(values[i], pairs.values()[i], 1e-13, "value " + (i + 1));
                double[] found = pairs.vectors()[i];
                double sign = Math.signum(found[0] * vectors[0][i]);
                for (int row = 0; row < found.length; row++) {
                    assertEquals(vectors[row][i], sign * found[row], 1e-12, "component " + (row + 1) + " of vector " + (i + 1));
                }
            }
            assertTrue(session.certify(pairs, Progress.NONE).complete());
        }
    }

    // K.-J. Bathe, Finite Element Procedures, example of chapter 9; from memory, recomputed
    @ParameterizedTest
    @MethodSource("solvers")
    void twoByTwo(EigenSolver solver) {
        check(solver, new double[][] {{6, -2}, {-2, 4}}, new double[] {2, 1}, new double[] {2, 5},
                new double[][] {{0.5773502691896258, 0.408248290463863}, {0.5773502691896258, -0.8164965809277261}});
    }

    // Bathe, example of chapter 10; from memory, recomputed
    @ParameterizedTest
    @MethodSource("solvers")
    void threeByThree(EigenSolver solver) {
        double root = Math.sqrt(0.5);
        check(solver, new double[][] {{2, -1, 0}, {-1, 4, -1}, {0, -1, 2}}, new double[] {0.5, 1, 0.5}, new double[] {2, 4, 6},
                new double[][] {{root, 1, root}, {root, 0, -root}, {root, -1, root}});
    }

    private static final double[][] BEAM = {{5, -4, 1, 0}, {-4, 6, -4, 1}, {1, -4, 6, -4}, {0, 1, -4, 5}};

    // Bathe, example of chapter 11, closed form 16 sin^4(k pi/10); from memory, recomputed
    @ParameterizedTest
    @MethodSource("solvers")
    void fourByFour(EigenSolver solver) {
        double a = 0.37174803446018445;
        double b = 0.6015009550075456;
        check(solver, BEAM, new double[] {1, 1, 1, 1},
                new double[] {0.14589803375031507, 1.9098300562505264, 6.854101966249688, 13.090169943749476},
                new double[][] {{a, b, b, a}, {b, a, -a, -b}, {b, -a, -a, b}, {a, -b, b, -a}});
    }

    // Bathe, example of chapter 11 (printed 0.09654, 1.391, 4.374, 10.64); from memory, recomputed
    @ParameterizedTest
    @MethodSource("solvers")
    void fourByFourWithUnequalMasses(EigenSolver solver) {
        check(solver, BEAM, new double[] {2, 2, 1, 1},
                new double[] {0.09653732854936578, 1.3914654511583404, 4.373549554582958, 10.63844766570934},
                new double[][] {{0.3126295295553144, 0.4452661509554754, 0.43866985327143826, 0.10756203742089004},
                    {0.49547585884273315, 0.12443600544160684, -0.4167402933001872, -0.2556303616432649},
                    {0.47911662681218886, -0.48944180176135466, -0.023221756789398338, 0.7282545781609087},
                    {0.2897933039603701, -0.5770218309688661, 0.5169654974496757, -0.5619718160296644}});
    }

    private static int[] counts(SymmetricMatrix k, SymmetricMatrix m, double... shifts) {
        Factoriser factoriser = Factorisers.sparse(new EigenProblem(k, m), Progress.NONE);
        return Arrays.stream(shifts).mapToInt(shift -> factoriser.factorise(k, m, shift, Progress.NONE).inertia().negative()).toArray();
    }

    // BCSSTK01 alone: Harwell-Boeing collection (Duff, Grimes, Lewis 1989), read and recomputed (numpy); relative tolerance 1e-6
    @ParameterizedTest
    @MethodSource("solvers")
    void publishedStiffnessHasItsExtremeEigenvalues(EigenSolver solver) throws IOException {
        SymmetricMatrix k = PublishedPair.read().problem().stiffness();
        SymmetricMatrix identity = Pencils.diagonal(DoubleStream.generate(() -> 1.0).limit(k.order()).toArray());
        assertEquals(32433076216.79132, Arrays.stream(k.diagonal()).sum(), 1e-6 * 32433076216.79132);
        try (EigenSession session = solver.open(new EigenProblem(k, identity), Progress.NONE)) {
            double[] values = session.solve(EigenRequest.lowest(48), Progress.NONE).values();
            double[] lowest = {3417.2675627633043, 8970.009818301936, 10835.655483488446, 22326.99141490259, 51634.08923501627};
            for (int i = 0; i < lowest.length; i++) {
                assertEquals(lowest[i], values[i], 1e-6 * lowest[i], "value " + (i + 1));
            }
            assertEquals(3015179089.897687, values[47], 1e-6 * 3015179089.897687);
        }
        assertArrayEquals(new int[] {0, 2, 8, 12, 24, 24}, counts(k, identity, SHIFTS));
    }

    // the pair BCSSTK01, BCSSTM01: counts by Sylvester's law of inertia, recomputed; 24 motions have no mass
    @Test
    void publishedPairHasItsInertia() throws IOException {
        EigenProblem pair = PublishedPair.read().problem();
        assertArrayEquals(new int[] {8, 12, 24, 24, 24, 24}, counts(pair.stiffness(), pair.mass(), SHIFTS));
    }

    // uniform five-storey building, k = 100, m = 1: K. K. Gupta (1972); Bathe and Wilson (1976); from memory, recomputed
    @Test
    void shearBuildingHasItsInertia() {
        EigenProblem building = Pencils.chain(5, 100.0, 1.0, true, false);
        assertArrayEquals(new int[] {0, 1, 1, 2, 3, 4, 5},
                counts(building.stiffness(), building.mass(), 0.0, 10.0, 50.0, 100.0, 200.0, 300.0, 400.0));
    }
}
