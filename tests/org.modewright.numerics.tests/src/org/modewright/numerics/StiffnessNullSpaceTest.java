package org.modewright.numerics;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Mechanisms must be found, near mechanisms must not be taken for them. */
class StiffnessNullSpaceTest {

    private static int motions(SymmetricMatrix stiffness) {
        StiffnessNullSpace space = StiffnessNullSpace.of(stiffness, Progress.NONE);
        assertEquals(0, space.inertia().negative());
        for (int z = 0; z < space.count(); z++) {
            double[] vector = space.vector(z);
            assertEquals(1.0, vector[space.degreesOfFreedom()[z]]);
            assertNoForce(stiffness, vector);
            for (int other = 0; other < z; other++) {
                assertEquals(0.0, vector[space.degreesOfFreedom()[other]]);
            }
        }
        return space.count();
    }

    /** The rule bounds the energy by some 16 eps of |z||K||z|, so the forces by the root of that at worst; for these, by far less. */
    private static void assertNoForce(SymmetricMatrix stiffness, double[] vector) {
        double[] force = stiffness.multiply(vector);
        double[] size = sizes(stiffness, vector);
        double total = 0.0;
        double reference = 0.0;
        for (int i = 0; i < force.length; i++) {
            total += force[i] * force[i];
            reference += size[i] * size[i];
        }
        assertTrue(Math.sqrt(total) <= 1e-10 * Math.sqrt(reference), "force " + Math.sqrt(total) + " of " + Math.sqrt(reference));
    }

    private static double[] sizes(SymmetricMatrix stiffness, double[] vector) {
        double[] values = new double[stiffness.entries()];
        for (int p = 0; p < values.length; p++) {
            values[p] = Math.abs(stiffness.value()[p]);
        }
        double[] components = new double[vector.length];
        for (int i = 0; i < vector.length; i++) {
            components[i] = Math.abs(vector[i]);
        }
        return new SymmetricMatrix(stiffness.order(), stiffness.columnStart(), stiffness.row(), values).multiply(components);
    }

    /** Bars in line along a skew direction, held at both ends: every joint between can move in two directions across. */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 10, 100})
    void pinnedBarsInLineAreMechanisms(int bars) {
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(3 * (bars + 1));
        for (int b = 0; b < bars; b++) {
            Pencils.addBar(builder, b, b + 1, new double[] {0.31, -0.77, 1.93}, 2.1e8 * (1.0 + 0.37 * (b % 5)));
        }
        for (int end : new int[] {0, bars}) {
            for (int c = 0; c < 3; c++) {
                builder.add(3 * end + c, 3 * end + c, 1e9);
            }
        }
        assertEquals(2 * (bars - 1), motions(builder.build()));
    }

    /** Pinned square without a diagonal sways; with a diagonal of a billionth of the stiffness it does not. */
    @Test
    void softDiagonalHoldsThePinnedSquare() {
        for (double diagonal : new double[] {0.0, 1e-9, 1e-6, 1.0}) {
            SymmetricMatrix.Builder builder = SymmetricMatrix.builder(12);
            Pencils.addBar(builder, 0, 2, new double[] {0, 0, 3.1}, 1e9);
            Pencils.addBar(builder, 1, 3, new double[] {0, 0, 3.1}, 1e9);
            Pencils.addBar(builder, 2, 3, new double[] {4.7, 0, 0}, 1e9);
            Pencils.addBar(builder, 0, 3, new double[] {4.7, 0, 3.1}, 1e9 * diagonal);
            for (int held : new int[] {0, 1, 2, 3, 4, 5, 7, 10}) {
                builder.add(held, held, 1e9);
            }
            assertEquals(diagonal == 0.0 ? 1 : 0, motions(builder.build()), "diagonal " + diagonal);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 30, 1000, 20000})
    void chainOnASoftSpringIsHeld(int masses) {
        EigenProblem chain = Pencils.chain(masses, 1.0, 1.0, false, false);
        assertEquals(1, motions(chain.stiffness()));
        SymmetricMatrix.Builder ground = SymmetricMatrix.builder(masses);
        ground.add(masses / 2, masses / 2, 1e-9);
        assertEquals(0, motions(Pencils.sum(chain.stiffness(), 1.0, ground.build())));
    }

    /** Plane bending: translation and rotation at every node. */
    private static SymmetricMatrix beam(int elements, boolean held) {
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(2 * (elements + 1));
        double l = 0.7;
        double ei = 3.3e7;
        double[][] k = {{12, 6 * l, -12, 6 * l}, {6 * l, 4 * l * l, -6 * l, 2 * l * l}, {-12, -6 * l, 12, -6 * l},
            {6 * l, 2 * l * l, -6 * l, 4 * l * l}};
        for (int e = 0; e < elements; e++) {
            for (int i = 0; i < 4; i++) {
                for (int j = 0; j <= i; j++) {
                    builder.add(2 * e + i, 2 * e + j, k[i][j] * ei / (l * l * l));
                }
            }
        }
        if (held) {
            builder.add(0, 0, 1e9);
            builder.add(1, 1, 1e9);
        }
        return builder.build();
    }

    /** The tip of the longest cantilever is 4e-9 as stiff as an element: round-off of the entries of K is a 1e-7 of that. */
    @ParameterizedTest
    @ValueSource(ints = {1, 10, 100, 400})
    void freeBeamMovesInTwoWaysAndACantileverInNone(int elements) {
        assertEquals(2, motions(beam(elements, false)));
        assertEquals(0, motions(beam(elements, true)));
    }

    @Test
    void floatingBodiesHaveSixMotions() {
        assertEquals(6, motions(Pencils.freeTruss(6, 5, 4).stiffness()));
        assertEquals(6, motions(FrameBuilding.floating(4, 3, 5, 2).stiffness()));
        assertEquals(0, motions(FrameBuilding.problem(4, 3, 5, 2, 6.0, 5.0).stiffness()));
    }

    @Test
    void theRuleDoesNotDependOnUnits() {
        SymmetricMatrix stiffness = FrameBuilding.floating(3, 3, 3, 1).stiffness();
        Random random = new Random(6);
        double[] unit = random.doubles(stiffness.order(), -9.0, 9.0).map(exponent -> Math.pow(10.0, exponent)).toArray();
        SymmetricMatrix.Builder scaled = SymmetricMatrix.builder(stiffness.order());
        for (int column = 0; column < stiffness.order(); column++) {
            for (int p = stiffness.columnStart()[column]; p < stiffness.columnStart()[column + 1]; p++) {
                scaled.add(stiffness.row()[p], column, stiffness.value()[p] * unit[column] * unit[stiffness.row()[p]]);
            }
        }
        assertEquals(6, StiffnessNullSpace.of(scaled.build(), Progress.NONE).degreesOfFreedom().length);
    }

    @Test
    void degreesOfFreedomWithoutStiffnessAreNamed() {
        StiffnessNullSpace space = StiffnessNullSpace.of(Pencils.diagonal(1e12, 0.0, 3.0, 0.0, 1e-9), Progress.NONE);
        assertArrayEquals(new int[] {1, 3}, space.degreesOfFreedom());
    }

    @Test
    void mechanismOfABuckledStructureIsFoundToo() {
        // Two joined masses that float, and a buckled point: eigenvalues 0, 2 k and -1.
        SymmetricMatrix.Builder builder = SymmetricMatrix.builder(3);
        Pencils.addSpring(builder, 0, 1, 5.0);
        builder.add(2, 2, -1.0);
        StiffnessNullSpace space = StiffnessNullSpace.of(builder.build(), Progress.NONE);
        assertEquals(new Inertia(1, 1, 1), space.inertia());
    }
}
