package org.modewright.numerics;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.Arrays;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;

import org.junit.jupiter.api.Named;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What every eigen solver must do. */
class EigenSolverContractTest {

    /** What well-conditioned problems reach. */
    private static final double RESIDUAL_AIM = 1e-10;
    /** What every problem must reach. */
    private static final double RESIDUAL_LIMIT = 1e-8;

    static Stream<Named<EigenSolver>> solvers() {
        return Stream.of(Named.of("dense", EigenSolvers.dense()), Named.of("Lanczos", EigenSolvers.lanczos()));
    }

    /** Solves and checks what must hold for any problem. */
    private static EigenPairs solve(EigenSolver solver, EigenProblem problem, EigenRequest request) {
        try (EigenSession session = solver.open(problem, Progress.NONE)) {
            EigenPairs pairs = session.solve(request, Progress.NONE);
            check(session, problem, pairs);
            return pairs;
        }
    }

    private static void check(EigenSession session, EigenProblem problem, EigenPairs pairs) {
        check(session, problem, pairs, RESIDUAL_AIM, 1e-12);
    }

    private static void check(EigenSession session, EigenProblem problem, EigenPairs pairs, double largestResidual,
            double largestOrthogonality) {
        for (int i = 0; i < pairs.count(); i++) {
            assertTrue(i == 0 || pairs.values()[i - 1] <= pairs.values()[i], "ascending at " + i);
            assertEquals(1.0, problem.mass().quadratic(pairs.vectors()[i]), largestOrthogonality);
            // Where K is nearly singular the rounding of the vector's components cannot be got below, about eps || |K||phi| ||.
            assertTrue(pairs.residuals()[i] <= Math.max(largestResidual, 32.0 * Math.ulp(1.0) * cancellation(problem, pairs, i)),
                    "residual " + pairs.residuals()[i] + " of value " + pairs.values()[i]);
        }
        SpectrumCertificate certificate = session.certify(pairs, Progress.NONE);
        assertTrue(certificate.complete(), certificate.toString());
        assertTrue(certificate.worstOrthogonality() <= largestOrthogonality, certificate.toString());
        assertTrue(pairs.count() == 0 || certificate.shift() > pairs.values()[pairs.count() - 1], certificate.toString());
    }

    /** || |K||phi| || / ||K phi||. */
    private static double cancellation(EigenProblem problem, EigenPairs pairs, int i) {
        SymmetricMatrix k = problem.stiffness();
        double[] sizes = new double[k.entries()];
        double[] components = new double[k.order()];
        for (int p = 0; p < sizes.length; p++) {
            sizes[p] = Math.abs(k.value()[p]);
        }
        for (int c = 0; c < components.length; c++) {
            components[c] = Math.abs(pairs.vectors()[i][c]);
        }
        double absolute = norm(new SymmetricMatrix(k.order(), k.columnStart(), k.row(), sizes).multiply(components));
        return pairs.values()[i] == 0.0 ? 1.0 : absolute / norm(k.multiply(pairs.vectors()[i]));
    }

    private static double norm(double[] x) {
        return Math.sqrt(Arrays.stream(x).map(component -> component * component).sum());
    }

    private static EigenPairs solveAll(EigenSolver solver, EigenProblem problem) {
        return solve(solver, problem, EigenRequest.lowest(Integer.MAX_VALUE));
    }

    private static void assertRelative(double[] expected, double[] actual, double tolerance) {
        assertEquals(expected.length, actual.length);
        for (int i = 0; i < expected.length; i++) {
            assertEquals(expected[i], actual[i], tolerance * Math.abs(expected[i]), "value " + i);
        }
    }

    /** Fixed-free chain: 4 k/m sin<sup>2</sup>((2r - 1) &pi; / (2 (2N + 1))); textbook, e.g. Humar, Dynamics of Structures. */
    private static double[] fixedFree(int masses, double ratio) {
        double[] values = new double[masses];
        for (int r = 1; r <= masses; r++) {
            double sine = Math.sin((2 * r - 1) * Math.PI / (2.0 * (2 * masses + 1)));
            values[r - 1] = 4.0 * ratio * sine * sine;
        }
        return values;
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void chainsHaveTheirClosedForms(EigenSolver solver) {
        for (int masses : new int[] {1, 2, 3, 7, 50, 150}) {
            // Lowest to highest eigenvalue is 1e4 apart at 150 masses; eps times that.
            assertRelative(fixedFree(masses, 2.5e6 / 1.3e3), solveAll(solver, Pencils.chain(masses, 2.5e6, 1.3e3, true, false)).values(),
                    1e-11);
            double[] fixedFixed = new double[masses];
            for (int r = 1; r <= masses; r++) {
                fixedFixed[r - 1] = 4.0 * Math.pow(Math.sin(r * Math.PI / (2.0 * (masses + 1))), 2);
            }
            assertRelative(fixedFixed, solveAll(solver, Pencils.chain(masses, 1.0, 1.0, true, true)).values(), 1e-11);
        }
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void nineStoreyShearBuildingHasItsEffectiveMasses(EigenSolver solver) {
        // Closed form of the fixed-free chain (Humar; Newmark and Rosenblueth), recomputed; tolerance of the record 1e-10.
        double[] omega = {0.16515869094466465, 0.4909709742815983, 0.8033908493059388, 1.0938963162448536, 1.3545631432514822,
            1.5782810187927871, 1.7589475024129781, 1.8916344834012693, 1.9727226068054449};
        double[] share = {0.8517051384099268, 0.0911923724373869, 0.030393876826206107, 0.013700462280807315, 0.00690073123391223,
            0.0035426872635868963, 0.0017126792271487104, 0.0006892116241303001, 0.00016284069689498175};
        EigenPairs pairs = solveAll(solver, Pencils.chain(9, 1.0, 1.0, true, false));
        for (int i = 0; i < 9; i++) {
            double participation = Arrays.stream(pairs.vectors()[i]).sum();
            assertEquals(omega[i], Math.sqrt(pairs.values()[i]), 1e-10);
            assertEquals(share[i], participation * participation / 9.0, 1e-10);
        }
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void freeChainHasOneValueOfExactlyZero(EigenSolver solver) {
        for (int masses : new int[] {1, 5, 120}) {
            double[] values = solveAll(solver, Pencils.chain(masses, 7.0, 2.0, false, false)).values();
            assertEquals(0.0, values[0]);
            for (int r = 1; r < masses; r++) {
                // Textbook: 4 k/m sin^2(r pi / (2 N)).
                assertEquals(14.0 * Math.pow(Math.sin(r * Math.PI / (2.0 * masses)), 2), values[r], 1e-12 * 14.0);
            }
        }
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void ringOfMassesHasDoubleRoots(EigenSolver solver) {
        for (int masses : new int[] {6, 90}) {
            SymmetricMatrix.Builder k = SymmetricMatrix.builder(masses);
            for (int i = 0; i < masses; i++) {
                Pencils.addSpring(k, i, (i + 1) % masses, 1.0);
            }
            double[] ones = new double[masses];
            Arrays.fill(ones, 1.0);
            double[] expected = new double[masses];
            for (int r = 0; r < masses; r++) {
                // Born and von Karman, textbook: 2 sin(r pi / N), each twice but the extreme ones.
                expected[r] = 4.0 * Math.pow(Math.sin((r + 1) / 2 * Math.PI / masses), 2);
            }
            double[] values = solveAll(solver, new EigenProblem(k.build(), Pencils.diagonal(ones))).values();
            assertEquals(0.0, values[0]);
            assertArrayEquals(expected, values, 4e-12);
        }
    }

    /** Disjoint copies of a chain, the spring of each stiffer than the last by a relative step. */
    private static EigenProblem copies(int copies, int masses, double step) {
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(copies * masses);
        SymmetricMatrix.Builder m = SymmetricMatrix.builder(copies * masses);
        for (int c = 0; c < copies; c++) {
            double stiffness = 100.0 * (1.0 + c * step);
            for (int i = 0; i < masses; i++) {
                int at = c * masses + i;
                m.add(at, at, 2.0);
                if (i == 0) {
                    k.add(at, at, stiffness);
                } else {
                    Pencils.addSpring(k, at - 1, at, stiffness);
                }
            }
        }
        return new EigenProblem(k.build(), m.build());
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void multipleRootsAndClustersAreComplete(EigenSolver solver) {
        double[] single = fixedFree(40, 50.0);
        for (double step : new double[] {0.0, 1e-9, 1e-6}) {
            EigenProblem problem = copies(9, 40, step);
            for (int count : new int[] {1, 9, 14, 40}) {
                double[] values = solve(solver, problem, EigenRequest.lowest(count)).values();
                assertEquals(count, values.length);
                for (int i = 0; i < count; i++) {
                    double expected = single[i / 9] * (1.0 + i % 9 * step);
                    // The gap of 1e-9 itself must be seen: eps times lambda_max / lambda_1 is 1e-16 * 3e3.
                    assertEquals(expected, values[i], 1e-11 * expected, "step " + step + ", value " + i);
                }
            }
        }
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void massMayBeZeroAlmostEverywhere(EigenSolver solver) {
        Random random = new Random(5);
        for (double share : new double[] {0.5, 0.2, 0.05}) {
            int n = 300;
            SymmetricMatrix k = Pencils.sum(Pencils.randomSemidefinite(n, n, 5, random), 0.5, identity(n));
            double[] mass = new double[n];
            int massive = 0;
            for (int i = 0; i < n; i++) {
                if (i == 0 || random.nextDouble() < share) {
                    mass[i] = 0.5 + random.nextDouble();
                    massive++;
                }
            }
            EigenProblem problem = new EigenProblem(k, Pencils.diagonal(mass));
            EigenPairs pairs = solveAll(solver, problem);
            assertEquals(massive, pairs.count());
            assertTrue(pairs.exhausted());
            assertEquals(traceOfFlexibilityTimesMass(problem), Arrays.stream(pairs.values()).map(value -> 1.0 / value).sum(), 1e-9);
        }
    }

    /** The sum of 1/&lambda; over all finite eigenvalues. */
    private static double traceOfFlexibilityTimesMass(EigenProblem problem) {
        Factorisation factorisation = Factorisers.sparse(problem.stiffness(), Progress.NONE)
                .factorise(problem.stiffness(), null, 0.0, Progress.NONE);
        double trace = 0.0;
        for (int i = 0; i < problem.order(); i++) {
            double[] column = new double[problem.order()];
            column[i] = 1.0;
            double[] massColumn = problem.mass().multiply(column);
            factorisation.solve(massColumn);
            trace += massColumn[i];
        }
        return trace;
    }

    private static SymmetricMatrix identity(int n) {
        double[] ones = new double[n];
        Arrays.fill(ones, 1.0);
        return Pencils.diagonal(ones);
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void massMayBeSingularWithoutZeroRows(EigenSolver solver) {
        // Point masses on rigid arms couple a translation and a rotation with a block of rank one.
        int n = 200;
        SymmetricMatrix.Builder mass = SymmetricMatrix.builder(n);
        Random random = new Random(8);
        for (int i = 0; i < n; i += 2) {
            double arm = 0.3 + random.nextDouble();
            mass.add(i, i, 3.0);
            mass.add(i, i + 1, 3.0 * arm);
            mass.add(i + 1, i + 1, 3.0 * arm * arm);
        }
        SymmetricMatrix k = Pencils.sum(Pencils.randomSemidefinite(n, n, 4, random), 0.5, identity(n));
        EigenProblem problem = new EigenProblem(k, mass.build());
        EigenPairs pairs = solveAll(solver, problem);
        assertEquals(n / 2, pairs.count());
        assertEquals(traceOfFlexibilityTimesMass(problem), Arrays.stream(pairs.values()).map(value -> 1.0 / value).sum(), 1e-9);
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void nearlySingularStiffnessIsNoMechanism(EigenSolver solver) {
        int masses = 100;
        SymmetricMatrix soft = Pencils.diagonal(1e-9);
        SymmetricMatrix.Builder ground = SymmetricMatrix.builder(masses);
        ground.add(0, 0, soft.get(0, 0));
        EigenProblem chain = Pencils.chain(masses, 1.0, 1.0, false, false);
        EigenProblem problem = new EigenProblem(Pencils.sum(chain.stiffness(), 1.0, ground.build()), chain.mass());
        double[] values = solve(solver, problem, EigenRequest.lowest(5)).values();
        // The whole chain on the soft spring: 1e-9 / 100, lowered by the chain's own flexibility by less than 1e-7 of it.
        // Round-off of the entries of K is eps against the 1e-11 sought.
        assertEquals(1e-11, values[0], 1e-11 * 1e-4);
        assertEquals(4.0 * Math.pow(Math.sin(Math.PI / 200.0), 2), values[1], 1e-10);
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void floatingTrussHasSixRigidMotions(EigenSolver solver) {
        EigenProblem problem = Pencils.freeTruss(4, 3, 5);
        EigenPairs pairs = solve(solver, problem, EigenRequest.lowest(20));
        for (int i = 0; i < 6; i++) {
            assertEquals(0.0, pairs.values()[i]);
        }
        assertTrue(pairs.values()[6] > 1.0);
        assertEquals(20, pairs.count());
        assertEquals(6, solve(solver, problem, EigenRequest.lowest(6)).count());
        assertEquals(3, solve(solver, problem, EigenRequest.lowest(3)).count());
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void buckledStructureHasNegativeValues(EigenSolver solver) {
        int masses = 120;
        double lowering = 0.05;
        EigenProblem chain = Pencils.chain(masses, 1.0, 1.0, true, true);
        EigenProblem problem = new EigenProblem(Pencils.sum(chain.stiffness(), -lowering, identity(masses)), chain.mass());
        EigenPairs pairs = solve(solver, problem, EigenRequest.lowest(20));
        for (int r = 1; r <= 20; r++) {
            double expected = 4.0 * Math.pow(Math.sin(r * Math.PI / (2.0 * (masses + 1))), 2) - lowering;
            assertEquals(expected, pairs.values()[r - 1], 1e-12);
        }
        assertEquals(8, solve(solver, problem, EigenRequest.allBelow(0.0)).count());
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void negativeStiffnessWithoutMassAddsNoEigenvalues(EigenSolver solver) {
        // Two masses in series through a massless point that has buckled: k = 1 to each mass, -3 to ground.
        // Condensed: [[1, 0], [0, 1]] - 1/(2 - 3) [[1, 1], [1, 1]] = [[2, 1], [1, 2]], eigenvalues 1 and 3.
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(3);
        Pencils.addSpring(k, 0, 1, 1.0);
        Pencils.addSpring(k, 1, 2, 1.0);
        k.add(1, 1, -3.0);
        EigenPairs pairs = solveAll(solver, new EigenProblem(k.build(), Pencils.diagonal(1.0, 0.0, 1.0)));
        assertArrayEquals(new double[] {1.0, 3.0}, pairs.values(), 1e-13);
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void publishedPairHasItsFiniteEigenvalues(EigenSolver solver) throws IOException {
        PublishedPair pair = PublishedPair.read();
        EigenPairs pairs = solveAll(solver, pair.problem());
        assertTrue(pairs.exhausted());
        assertRelative(pair.eigenvalues(), pairs.values(), 1e-8);
        // Eigenvalues below 1e3, 1e4, 1e5: 8, 12, 24 by Sylvester's law, recomputed.
        assertEquals(8, solve(solver, pair.problem(), EigenRequest.allBelow(1e3)).count());
        assertEquals(12, solve(solver, pair.problem(), EigenRequest.allBelow(1e4)).count());
        assertEquals(24, solve(solver, pair.problem(), EigenRequest.allBelow(1e5)).count());
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void randomPairsOfEverySmallOrder(EigenSolver solver) {
        Random random = new Random(17);
        int solved = 0;
        for (int trial = 0; trial < 300; trial++) {
            int n = 1 + random.nextInt(40);
            SymmetricMatrix k = Pencils.randomSemidefinite(n, 1 + random.nextInt(n), 4, random);
            SymmetricMatrix m = trial % 2 == 0 ? identity(n) : Pencils.randomSemidefinite(n, 1 + random.nextInt(n), 4, random);
            EigenProblem problem = PencilReduction.of(new EigenProblem(k, m), Progress.NONE).reduced();
            if (problem.order() > 0 && isDefinite(problem)) {
                solveRandom(solver, problem, 1 + random.nextInt(n));
                solved++;
            }
        }
        assertTrue(solved > 150, "solved " + solved);
    }

    private static void solveRandom(EigenSolver solver, EigenProblem problem, int count) {
        try (EigenSession session = solver.open(problem, Progress.NONE)) {
            EigenPairs pairs = session.solve(EigenRequest.lowest(count), Progress.NONE);
            // |phi|^2 is at most 1e3 (1 + lambda) / ||K + M||: the products phi^T M phi round by n eps times that.
            double highest = pairs.count() == 0 ? 0.0 : pairs.values()[pairs.count() - 1];
            check(session, problem, pairs, RESIDUAL_LIMIT, problem.order() * Math.ulp(1.0) * 1e3 * (1.0 + highest));
        }
    }

    /** Whether K and M are far from a common null vector; else no method has vectors that are M-orthonormal. */
    private static boolean isDefinite(EigenProblem problem) {
        double[] eigenvalues = FactorisationTest.denseEigenvalues(Pencils.sum(problem.stiffness(), 1.0, problem.mass()));
        return eigenvalues[0] > 1e-3 * eigenvalues[eigenvalues.length - 1];
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void requestsLimitByCountAndByValue(EigenSolver solver) {
        EigenProblem problem = Pencils.chain(150, 1.0, 1.0, true, false);
        double[] expected = fixedFree(150, 1.0);
        assertEquals(0, solve(solver, problem, EigenRequest.lowest(0)).count());
        assertEquals(0, solve(solver, problem, EigenRequest.allBelow(0.5 * expected[0])).count());
        assertEquals(7, solve(solver, problem, EigenRequest.lowest(7)).count());
        assertEquals(12, solve(solver, problem, EigenRequest.allBelow(0.5 * (expected[11] + expected[12]))).count());
        assertEquals(5, solve(solver, problem, new EigenRequest(5, expected[11])).count());
        assertFalse(solve(solver, problem, EigenRequest.lowest(149)).exhausted());
        assertTrue(solve(solver, problem, EigenRequest.lowest(150)).exhausted());
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void askingForMoreGoesOnFromWhatIsKnown(EigenSolver solver) {
        EigenProblem problem = Pencils.freeTruss(5, 4, 5);
        try (EigenSession session = solver.open(problem, Progress.NONE)) {
            double[] first = session.solve(EigenRequest.lowest(8), Progress.NONE).values();
            EigenPairs more = session.solve(EigenRequest.lowest(50), Progress.NONE);
            check(session, problem, more);
            double[] again = session.solve(EigenRequest.lowest(8), Progress.NONE).values();
            check(session, problem, session.solve(EigenRequest.lowest(30), Progress.NONE));
            assertArrayEquals(first, Arrays.copyOf(more.values(), 8), 1e-9 * more.values()[7]);
            assertArrayEquals(Arrays.copyOf(more.values(), 8), again);
        }
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void sameInputGivesTheSameBits(EigenSolver solver) {
        EigenProblem problem = Pencils.freeTruss(4, 4, 4);
        EigenPairs first = solve(solver, problem, EigenRequest.lowest(25));
        EigenPairs second = solve(solver, problem, EigenRequest.lowest(25));
        assertArrayEquals(first.values(), second.values());
        assertArrayEquals(first.vectors(), second.vectors());
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void errorBoundsHold(EigenSolver solver) {
        double[] expected = fixedFree(140, 1.0);
        EigenPairs pairs = solve(solver, Pencils.chain(140, 1.0, 1.0, true, false), EigenRequest.lowest(30));
        for (int i = 0; i < 30; i++) {
            double error = Math.abs(expected[i] - pairs.values()[i]);
            // The bound is for the matrices as stored; the closed form itself is rounded.
            assertTrue(error <= pairs.errorBounds()[i] + 8.0 * Math.ulp(1.0) * expected[i] * 4.0 / expected[0],
                    "value " + i + ": " + error + " against " + pairs.errorBounds()[i]);
            assertTrue(pairs.errorBounds()[i] <= 1e-9 * expected[i], "bound of value " + i + ": " + pairs.errorBounds()[i] / expected[i]);
        }
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void certificateRefusesWhatIsWrong(EigenSolver solver) {
        EigenProblem problem = Pencils.freeTruss(3, 4, 3);
        try (EigenSession session = solver.open(problem, Progress.NONE)) {
            EigenPairs pairs = session.solve(EigenRequest.lowest(15), Progress.NONE);
            assertTrue(session.certify(pairs, Progress.NONE).complete());
            for (int missing = 0; missing < 14; missing++) {
                SpectrumCertificate certificate = session.certify(without(pairs, missing), Progress.NONE);
                assertFalse(certificate.complete(), "without " + missing);
                assertEquals(certificate.counted() - 1, certificate.found());
            }
            EigenPairs spoiled = without(pairs, 99);
            spoiled.vectors()[9] = spoiled.vectors()[9].clone();
            spoiled.vectors()[9][4] += 1e-3;
            assertFalse(session.certify(spoiled, Progress.NONE).complete());
        }
    }

    private static EigenPairs without(EigenPairs pairs, int missing) {
        int[] kept = IntStream.range(0, pairs.count()).filter(i -> i != missing).toArray();
        return new EigenPairs(Arrays.stream(kept).mapToDouble(i -> pairs.values()[i]).toArray(),
                Arrays.stream(kept).mapToObj(i -> pairs.vectors()[i]).toArray(double[][]::new),
                Arrays.stream(kept).mapToDouble(i -> pairs.residuals()[i]).toArray(),
                Arrays.stream(kept).mapToDouble(i -> pairs.errorBounds()[i]).toArray(), pairs.exhausted());
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void commonNullVectorsAreRefusedByName(EigenSolver solver) {
        EigenProblem problem = new EigenProblem(Pencils.diagonal(2.0, 0.0, 3.0), Pencils.diagonal(1.0, 0.0, 0.0));
        SingularPencilException refusal = assertThrows(SingularPencilException.class, () -> solver.open(problem, Progress.NONE));
        assertArrayEquals(new int[] {1}, refusal.degreesOfFreedom());
        assertArrayEquals(new double[] {0.0, 1.0, 0.0}, refusal.nullVectors()[0]);
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void nothingMovesWithoutMass(EigenSolver solver) {
        EigenPairs pairs = solveAll(solver, new EigenProblem(Pencils.diagonal(2.0, 1.0), Pencils.diagonal(0.0, 0.0)));
        assertEquals(0, pairs.count());
        assertTrue(pairs.exhausted());
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void emptyProblemHasNoModes(EigenSolver solver) {
        EigenPairs pairs = solveAll(solver, new EigenProblem(Pencils.diagonal(), Pencils.diagonal()));
        assertEquals(0, pairs.count());
        assertTrue(pairs.exhausted());
    }

    @ParameterizedTest
    @MethodSource("solvers")
    void negativeMassIsRefused(EigenSolver solver) {
        EigenProblem problem = new EigenProblem(Pencils.diagonal(2.0, 1.0), Pencils.diagonal(1.0, -1.0));
        assertThrows(IllegalArgumentException.class, () -> solver.open(problem, Progress.NONE));
    }

    /**
     * A lever of round-off makes a stiff spring resist a motion by 1e-34 of its stiffness: the matrix is positive definite, but the other
     * eigenvalues must not drown beside that of the motion, and it counts as zero.
     */
    @ParameterizedTest
    @MethodSource("solvers")
    void aStiffnessOfRoundOffSpoilsNoOtherMode(EigenSolver solver) {
        int n = 60;
        double spring = 1e7;
        double mass = 1000;
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(n + 1);
        SymmetricMatrix.Builder m = SymmetricMatrix.builder(n + 1);
        for (int i = 0; i < n; i++) {
            k.add(i, i, i + 1 < n ? 2 * spring : spring);
            m.add(i, i, mass);
            if (i > 0) {
                k.add(i, i - 1, -spring);
            }
        }
        double stiff = 1e9;
        double lever = 1e-17;
        k.add(n - 1, n - 1, stiff).add(n, n - 1, stiff * lever).add(n, n, stiff * lever * lever);
        m.add(n, n, 500);
        EigenPairs pairs = solve(solver, new EigenProblem(k.build(), m.build()), EigenRequest.lowest(6));
        assertEquals(6, pairs.count());
        assertEquals(0.0, pairs.values()[0], 0.0);
        // The springs in series, the last mass all but held: a spring of 1e9 beside one of 1e7 shifts the values by less than 1e-3.
        for (int j = 1; j < 6; j++) {
            double held = 4 * spring / mass * Math.pow(Math.sin(j * Math.PI / (2.0 * n)), 2);
            assertEquals(held, pairs.values()[j], 1e-3 * held);
        }
    }

    /** The same, but the round-off makes the matrix indefinite, as the sum of rounded products does. */
    @ParameterizedTest
    @MethodSource("solvers")
    void aNegativeStiffnessOfRoundOffSpoilsNoOtherMode(EigenSolver solver) {
        int n = 60;
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(n + 1);
        SymmetricMatrix.Builder m = SymmetricMatrix.builder(n + 1);
        for (int i = 0; i < n; i++) {
            k.add(i, i, i + 1 < n ? 2e7 : 1e7);
            m.add(i, i, 1000);
            if (i > 0) {
                k.add(i, i - 1, -1e7);
            }
        }
        k.add(n, n - 1, 1e-8).add(n, n, 1e-25);
        m.add(n, n, 500);
        EigenPairs pairs = solve(solver, new EigenProblem(k.build(), m.build()), EigenRequest.lowest(6));
        assertEquals(6, pairs.count());
        assertEquals(0.0, pairs.values()[0], 1e-15);
        for (int j = 1; j < 6; j++) {
            double chain = 4e4 * Math.pow(Math.sin((2 * j - 1) * Math.PI / (2.0 * (2 * n + 1))), 2);
            assertEquals(chain, pairs.values()[j], 1e-9 * chain);
        }
    }

    /** Motions without stiffness beside a buckled one: the estimate of the lowest elastic value is the negative one, and no shift. */
    @ParameterizedTest
    @MethodSource("solvers")
    void aBuckledMotionAmongFreeOnesSpoilsNoOtherMode(EigenSolver solver) {
        int n = 40;
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(n + 3);
        SymmetricMatrix.Builder m = SymmetricMatrix.builder(n + 3);
        for (int i = 0; i < n + 3; i++) {
            m.add(i, i, 1000);
        }
        for (int i = 0; i < n; i++) {
            k.add(i, i, i + 1 < n ? 2e7 : 1e7);
            if (i > 0) {
                k.add(i, i - 1, -1e7);
            }
        }
        k.add(n, n, -400);
        EigenPairs pairs = solve(solver, new EigenProblem(k.build(), m.build()), EigenRequest.lowest(9));
        assertEquals(-0.4, pairs.values()[0], 1e-12);
        assertEquals(0.0, pairs.values()[1], 0.0);
        assertEquals(0.0, pairs.values()[2], 0.0);
        for (int j = 3; j < 9; j++) {
            double chain = 4e4 * Math.pow(Math.sin((2 * j - 5) * Math.PI / (2.0 * (2 * n + 1))), 2);
            assertEquals(chain, pairs.values()[j], 1e-9 * chain);
        }
    }
}
