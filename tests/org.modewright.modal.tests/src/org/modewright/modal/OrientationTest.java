package org.modewright.modal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.modewright.model.structure.Member;

/**
 * A structure turned in space as a whole is the same structure: members, bars, springs, a floor, a link and masses off their nodes. Its
 * sections are square and its springs equal in all directions, so that nothing of it refers to the global axes.
 */
class OrientationTest {

    private static final double[] IDENTITY = {1, 0, 0, 0, 1, 0, 0, 0, 1};

    /** A rotation from a random unit quaternion. */
    private static double[] rotation(Random random) {
        double[] q = random.doubles(4, -1, 1).toArray();
        double size = Math.sqrt(q[0] * q[0] + q[1] * q[1] + q[2] * q[2] + q[3] * q[3]);
        double w = q[0] / size;
        double x = q[1] / size;
        double y = q[2] / size;
        double z = q[3] / size;
        return new double[] {1 - 2 * (y * y + z * z), 2 * (x * y - w * z), 2 * (x * z + w * y), 2 * (x * y + w * z),
            1 - 2 * (x * x + z * z), 2 * (y * z - w * x), 2 * (x * z - w * y), 2 * (y * z + w * x), 1 - 2 * (x * x + y * y)};
    }

    private static double[] turned(double[] q, double... v) {
        double[] result = new double[3];
        for (int i = 0; i < 3; i++) {
            result[i] = q[3 * i] * v[0] + q[3 * i + 1] * v[1] + q[3 * i + 2] * v[2];
        }
        return result;
    }

    private static void node(Structures s, double[] q, String name, double x, double y, double z) {
        double[] at = turned(q, x, y, z);
        s.node(name, at[0], at[1], at[2]);
    }

    private static ModalResult solved(double[] q, boolean lumped) {
        Structures s = new Structures("turned").material("steel", 2.1e11, 0.3, 7850).section("square", 0.01, 8e-6, 8e-6, 1.3e-5);
        double[][] plan = {{0, 0}, {5, 0}, {5.5, 4}, {0, 4.5}};
        for (int corner = 0; corner < 4; corner++) {
            node(s, q, "foot" + corner, plan[corner][0], plan[corner][1], 0);
            node(s, q, "head" + corner, plan[corner][0], plan[corner][1], 3);
            s.support("foot" + corner, "ux uy uz rx ry rz").with("column" + corner, "foot" + corner, "head" + corner);
        }
        for (int corner = 0; corner < 4; corner++) {
            s.with("beam" + corner, "head" + corner, "head" + (corner + 1) % 4);
        }
        Member brace = s.member("brace", "foot0", "head1");
        brace.setAxialOnly(true);
        Member pressed = s.member("pressed", "foot2", "head3");
        pressed.setAxialForce(-2e4);
        pressed.setStartRigid(0.3);
        s.floor("floor", "head0", "head1", "head2", "head3");
        node(s, q, "arm", 2, 1.5, 3.7);
        s.link("arm", "head0", "arm").mass("arm", 400, 400, 400, 30, 30, 30);
        double[] offset = turned(q, 0.4, -0.2, 0.5);
        s.mass("head2", 900, 900, 900, 0, 0, 0).massOffset(offset[0], offset[1], offset[2]);
        node(s, q, "hung", 2.5, 2, 1.6);
        s.mass("hung", 250, 250, 250, 12, 12, 12);
        s.spring("hanger", "hung", "head3", 3e5, 3e5, 3e5, 2e4, 2e4, 2e4);
        s.spring("ground", "hung", null, 1e5, 1e5, 1e5, 5e3, 5e3, 5e3);
        return lumped ? s.lumped().allModes() : s.allModes();
    }

    private static double squares(Mode mode, Direction... directions) {
        double sum = 0;
        for (Direction direction : directions) {
            sum += mode.participation(direction) * mode.participation(direction);
        }
        return sum;
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6})
    void aTurnedStructureIsTheSame(long seed) {
        ModalResult upright = solved(IDENTITY, false);
        ModalResult turned = solved(rotation(new Random(seed)), false);
        assertSame(upright, turned);
        for (int i = 0; i < upright.modes().size(); i++) {
            double[] shares = upright.strainShares(i);
            double[] turnedShares = turned.strainShares(i);
            for (int carrier = 0; carrier < shares.length; carrier++) {
                assertEquals(shares[carrier], turnedShares[carrier], 1e-6, "strain share of " + upright.carriers().get(carrier).name());
            }
        }
    }

    /**
     * The centre turns with the structure where mass is the same in all directions, as lumped mass is. Of a consistent mass the part that
     * moves depends on the direction near a support, and with it, by its definition, the centre.
     */
    @ParameterizedTest
    @ValueSource(longs = {7, 8, 9, 10})
    void theCentreTurnsWithLumpedMass(long seed) {
        double[] q = rotation(new Random(seed));
        ModalResult upright = solved(IDENTITY, true);
        ModalResult turned = solved(q, true);
        assertSame(upright, turned);
        double[] centre = turned(q, upright.mass().centre()[0], upright.mass().centre()[1], upright.mass().centre()[2]);
        for (int i = 0; i < 3; i++) {
            assertEquals(upright.mass().movable()[0], turned.mass().movable()[i], 1e-9 * upright.mass().movable()[0]);
            assertEquals(centre[i], turned.mass().centre()[i], 1e-9);
        }
        double rotary = Arrays.stream(upright.mass().rotary()).sum();
        assertEquals(rotary, Arrays.stream(turned.mass().rotary()).sum(), 1e-9 * rotary);
        for (int i = 0; i < upright.modes().size(); i++) {
            assertEquals(squares(upright.modes().get(i), Direction.RX, Direction.RY, Direction.RZ),
                    squares(turned.modes().get(i), Direction.RX, Direction.RY, Direction.RZ), 1e-7 * rotary, "mode " + (i + 1));
        }
    }

    private static void assertSame(ModalResult upright, ModalResult turned) {
        assertEquals(upright.modes().size(), turned.modes().size());
        double mass = Arrays.stream(upright.mass().movable()).sum();
        assertEquals(mass, Arrays.stream(turned.mass().movable()).sum(), 1e-9 * mass);
        for (int i = 0; i < upright.modes().size(); i++) {
            Mode expected = upright.modes().get(i);
            Mode found = turned.modes().get(i);
            // round-off of K: 2e-16 times the ratio of the largest eigenvalue to this one, below 1e4 here, summed over some tens of terms
            assertEquals(expected.frequency(), found.frequency(), 1e-10 * expected.frequency(), "mode " + (i + 1));
            assertEquals(squares(expected, Direction.X, Direction.Y, Direction.Z), squares(found, Direction.X, Direction.Y, Direction.Z),
                    1e-7 * mass, "mass of mode " + (i + 1));
        }
    }
}
