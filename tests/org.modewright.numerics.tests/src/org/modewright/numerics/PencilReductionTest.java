package org.modewright.numerics;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class PencilReductionTest {

    @Test
    void nothingIsDroppedFromAProperPencil() {
        EigenProblem floating = Pencils.freeTruss(3, 3, 3);
        PencilReduction reduction = PencilReduction.of(floating, Progress.NONE);
        assertTrue(reduction.isEmpty());
        assertSame(floating, reduction.reduced());
    }

    /** A lattice without masses in z of some joints: nothing to drop, because they have stiffness; then joints with neither. */
    @Test
    void motionsWithNeitherStiffnessNorMassAreDropped() {
        int n = 9;
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(n);
        SymmetricMatrix.Builder m = SymmetricMatrix.builder(n);
        for (int joint = 0; joint < 2; joint++) {
            Pencils.addBar(k, joint, joint + 1, new double[] {1.0, 2.0, 2.0}, 9e5);
        }
        for (int held : new int[] {0, 1, 2, 6, 7, 8}) {
            k.add(held, held, 1e6);
        }
        m.add(3, 3, 2.0);
        EigenProblem problem = new EigenProblem(k.build(), m.build());
        PencilReduction reduction = PencilReduction.of(problem, Progress.NONE);
        // Joint 1 has stiffness along the bars and mass in x: one of its three motions has neither.
        assertEquals(1, reduction.droppedDegreesOfFreedom().length);
        double[] motion = reduction.nullVectors()[0];
        assertEquals(0.0, problem.mass().quadratic(motion), 1e-20);
        assertEquals(0.0, problem.stiffness().quadratic(motion), 1e-9);
        assertEquals(n - 1, reduction.reduced().order());
        EigenPairs pairs = EigenSolvers.dense().open(reduction.reduced(), Progress.NONE)
                .solve(EigenRequest.lowest(3), Progress.NONE);
        assertEquals(1, pairs.count());
        double[] vector = reduction.expand(pairs.vectors()[0]);
        assertEquals(1.0, problem.mass().quadratic(vector), 1e-12);
        assertEquals(0.0, vector[reduction.droppedDegreesOfFreedom()[0]]);
    }

    @Test
    void reducedMatricesKeepTheirEntries() {
        SymmetricMatrix.Builder k = SymmetricMatrix.builder(4);
        k.add(0, 0, 4.0).add(2, 0, -1.0).add(2, 2, 5.0).add(3, 2, -2.0).add(3, 3, 6.0);
        PencilReduction reduction = PencilReduction.of(new EigenProblem(k.build(), Pencils.diagonal(1.0, 0.0, 0.0, 1.0)), Progress.NONE);
        assertArrayEquals(new int[] {1}, reduction.droppedDegreesOfFreedom());
        assertArrayEquals(new int[] {0, 2, 3}, reduction.keptDegreesOfFreedom());
        SymmetricMatrix reduced = reduction.reduced().stiffness();
        assertEquals(-1.0, reduced.get(0, 1));
        assertEquals(-2.0, reduced.get(1, 2));
        assertEquals(6.0, reduced.get(2, 2));
    }

    @Test
    void indefiniteStiffnessDoesNotCancelMassByAccident() {
        // K + M is singular, but no motion is free of both.
        EigenProblem problem = new EigenProblem(Pencils.diagonal(-1.0, 2.0), Pencils.diagonal(1.0, 1.0));
        assertTrue(PencilReduction.of(problem, Progress.NONE).isEmpty());
        EigenProblem single = new EigenProblem(Pencils.diagonal(-3.0), Pencils.diagonal(2.0));
        assertTrue(PencilReduction.of(single, Progress.NONE).isEmpty());
    }
}
