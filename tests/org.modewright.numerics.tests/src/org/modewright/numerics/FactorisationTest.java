package org.modewright.numerics;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Random;

import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.DecompositionFactory_DDRM;
import org.ejml.interfaces.decomposition.EigenDecomposition_F64;
import org.junit.jupiter.api.Test;

class FactorisationTest {

    private static final double EPSILON = Math.ulp(1.0);

    @Test
    void inertiaAgreesWithDenseEigenvaluesOnTwoThousandPencils() {
        Random random = new Random(20250101);
        for (int trial = 0; trial < 2000; trial++) {
            int n = 2 + random.nextInt(40);
            SymmetricMatrix k = Pencils.randomInteger(n, 0.05 + 0.4 * random.nextDouble(), 3, random);
            SymmetricMatrix m = Pencils.randomSemidefinite(n, 1 + random.nextInt(n), 3, random);
            double shift = trial % 3 == 0 ? 0.0 : random.nextGaussian();
            Factorisation factorisation = Factorisers.sparse(new EigenProblem(k, m), Progress.NONE)
                    .factorise(k, m, shift, Progress.NONE);
            double[] eigenvalues = denseEigenvalues(Pencils.sum(k, -shift, m));
            double largest = Math.max(Math.abs(eigenvalues[0]), Math.abs(eigenvalues[n - 1]));
            // Round-off of a dense symmetric eigenvalue is a small multiple of n eps times the largest one.
            double zero = 100.0 * n * EPSILON * Math.max(largest, 1.0);
            int negative = (int) Arrays.stream(eigenvalues).filter(value -> value < -zero).count();
            int positive = (int) Arrays.stream(eigenvalues).filter(value -> value > zero).count();
            assertEquals(new Inertia(negative, n - negative - positive, positive), factorisation.inertia(), "trial " + trial);
        }
    }

    static double[] denseEigenvalues(SymmetricMatrix matrix) {
        int n = matrix.order();
        DMatrixRMaj full = new DMatrixRMaj(n, n);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                full.set(i, j, matrix.get(i, j));
            }
        }
        EigenDecomposition_F64<DMatrixRMaj> eigen = DecompositionFactory_DDRM.eig(n, false, true);
        assertTrue(eigen.decompose(full));
        double[] values = new double[n];
        for (int i = 0; i < n; i++) {
            values[i] = eigen.getEigenvalue(i).getReal();
        }
        Arrays.sort(values);
        return values;
    }

    @Test
    void solutionsSatisfyTheEquationsForDefiniteAndIndefiniteShifts() {
        EigenProblem problem = Pencils.freeTruss(6, 5, 4);
        Factoriser factoriser = Factorisers.sparse(problem, Progress.NONE);
        for (double shift : new double[] {-10.0, 37.0, 400.0, 2000.0}) {
            Factorisation factorisation = factoriser.factorise(problem.stiffness(), problem.mass(), shift, Progress.NONE);
            SymmetricMatrix shifted = Pencils.sum(problem.stiffness(), -shift, problem.mass());
            Random random = new Random(3);
            double[][] exact = new double[7][];
            double[][] x = new double[7][];
            for (int c = 0; c < 7; c++) {
                exact[c] = random.doubles(problem.order(), -1.0, 1.0).toArray();
                x[c] = shifted.multiply(exact[c]);
            }
            double[] single = x[2].clone();
            double[] rightHandSide = x[2].clone();
            factorisation.solve(single);
            factorisation.solve(x);
            assertArrayEquals(single, x[2], 1e-9);
            double[] back = shifted.multiply(x[2]);
            for (int i = 0; i < back.length; i++) {
                // Backward stability: the residual is a small multiple of eps |A| |x|, here about 1e4 * 10.
                assertEquals(rightHandSide[i], back[i], 1e5 * 100.0 * EPSILON * (1.0 + factorisation.pivotGrowth()));
            }
        }
    }

    @Test
    void solutionOfIntegersIsAccurate() {
        Random random = new Random(11);
        for (int trial = 0; trial < 200; trial++) {
            int n = 1 + random.nextInt(120);
            SymmetricMatrix a = Pencils.sum(Pencils.randomInteger(n, 0.05, 4, random), 40.0 * (trial % 2 == 0 ? 1.0 : -1.0),
                    Pencils.diagonal(alternating(n, trial % 3 == 0)));
            Factorisation factorisation = Factorisers.sparse(a, Progress.NONE).factorise(a, null, 0.0, Progress.NONE);
            double[] exact = random.doubles(n, -1.0, 1.0).toArray();
            double[] x = a.multiply(exact);
            factorisation.solve(x);
            // Diagonally dominant: condition below 100.
            assertArrayEquals(exact, x, 1e-12, "trial " + trial);
        }
    }

    private static double[] alternating(int n, boolean alternate) {
        double[] values = new double[n];
        for (int i = 0; i < n; i++) {
            values[i] = alternate && i % 2 == 1 ? -1.0 : 1.0;
        }
        return values;
    }

    @Test
    void indefiniteMatrixWithZeroDiagonalNeedsPairsOfPivots() {
        int n = 60;
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(n);
        for (int i = 0; i + 1 < n; i++) {
            builder.add(i, i + 1, 1.0 + i % 3);
        }
        SymmetricMatrix a = builder.build();
        Factorisation factorisation = Factorisers.sparse(a, Progress.NONE).factorise(a, null, 0.0, Progress.NONE);
        // Bipartite graph with a perfect matching on a path: eigenvalues come in pairs of opposite sign, none is zero.
        assertEquals(new Inertia(n / 2, 0, n / 2), factorisation.inertia());
    }

    /** The chain of ten masses has the eigenvalue 1, its fourth: 2 sin(7 pi / 42) = 1. Its matrices are integers, so the shift is exact. */
    @Test
    void shiftOnAnEigenvalueIsSeen() {
        EigenProblem chain = Pencils.chain(10, 1.0, 1.0, true, false);
        Factorisation factorisation = Factorisers.sparse(chain, Progress.NONE)
                .factorise(chain.stiffness(), chain.mass(), 1.0, Progress.NONE);
        assertEquals(new Inertia(3, 1, 6), factorisation.inertia());
        assertEquals(1, factorisation.zeroPivots().length);
    }

    @Test
    void refusesAForeignPattern() {
        SymmetricMatrix a = Pencils.diagonal(1.0, 2.0);
        SymmetricMatrix b = Pencils.diagonal(1.0, 0.0);
        Factoriser factoriser = Factorisers.sparse(a, Progress.NONE);
        assertThrows(IllegalArgumentException.class, () -> factoriser.factorise(b, null, 0.0, Progress.NONE));
        assertThrows(IllegalArgumentException.class, () -> factoriser.factorise(a, null, 1.0, Progress.NONE));
    }
}
