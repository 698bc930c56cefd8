package org.modewright.ui.tests.views;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.modewright.fem.LocalAxes;
import org.modewright.fem.MassLedger;
import org.modewright.fem.NodePoint;
import org.modewright.modal.Character;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Vector;
import org.modewright.ui.canvas.drawing.DrawnMember;
import org.modewright.ui.canvas.drawing.MotionOfNodes;

/**
 * The end rotations with which a released member is drawn against static condensation of the Euler&ndash;Bernoulli stiffness: where an end
 * is released, the moment of the drawn shape vanishes. Twelve by twelve local stiffness after J. S. Przemieniecki, Theory of Matrix
 * Structural Analysis (1968), ch. 5 (from memory); E = I = 1.
 */
class CondensedHermiteTest {

    /** Twelve solved numbers of order one by elimination in double precision. */
    private static final double TOLERANCE = 1e-11;
    private static final double[] START = {1, -2, 0.5};
    private static final double[] END = {4, 2, 2.5};
    private static final double ROLL_DEGREES = 35;

    private final double[] motion = new Random(7).doubles(12, -1, 1).toArray();

    static Stream<Arguments> releases() {
        return Stream.of(Arguments.of(List.of(), List.of()), Arguments.of(List.of(Component.RY), List.of()),
                Arguments.of(List.of(Component.RZ), List.of()), Arguments.of(List.of(), List.of(Component.RY, Component.RZ)),
                Arguments.of(List.of(Component.RY, Component.RZ), List.of(Component.RY, Component.RZ)),
                Arguments.of(List.of(Component.RZ), List.of(Component.RY)), Arguments.of(List.of(Component.RX), List.of()),
                Arguments.of(List.of(Component.RX, Component.RZ), List.of(Component.RZ)));
    }

    @ParameterizedTest
    @MethodSource("releases")
    void releasedEndsTurnAsCondensationSays(List<Component> startFree, List<Component> endFree) {
        Member member = member();
        member.getStartFree().addAll(startFree);
        member.getEndFree().addAll(endFree);
        double[] drawn = local(DrawnMember.of(member).ends(motionOfNodes()));
        double[] expected = condensed(local(motion), startFree, endFree);
        for (int i = 0; i < 12; i++) {
            assertEquals(expected[i], drawn[i], TOLERANCE, "component " + i);
        }
    }

    @Test
    void zonesAndOffsetsMoveAsRigidBodies() {
        Member member = member();
        Vector offset = StructureFactory.eINSTANCE.createVector();
        offset.setX(0.1);
        offset.setY(0.2);
        offset.setZ(-0.3);
        member.setStartOffset(offset);
        member.setEndRigid(0.5);
        DrawnMember drawn = DrawnMember.of(member);
        double[] ends = drawn.ends(motionOfNodes());
        rigid(motion, 0, START, drawn.start(), ends, 0);
        rigid(motion, 6, END, drawn.end(), ends, 6);
        double[] whole = minus(END, new double[] {START[0] + 0.1, START[1] + 0.2, START[2] - 0.3});
        double[] last = minus(END, drawn.end());
        assertEquals(0.5, norm(last), TOLERANCE, "the zone is as long as was given");
        assertEquals(norm(whole) * norm(last), dot(whole, last), TOLERANCE, "the zone lies along the member");
    }

    /** u + theta x r, theta. */
    private static void rigid(double[] node, int at, double[] from, double[] to, double[] ends, int put) {
        double[] r = minus(to, from);
        double[] expected = {node[at] + node[at + 4] * r[2] - node[at + 5] * r[1], node[at + 1] + node[at + 5] * r[0] - node[at + 3] * r[2],
            node[at + 2] + node[at + 3] * r[1] - node[at + 4] * r[0], node[at + 3], node[at + 4], node[at + 5]};
        for (int i = 0; i < 6; i++) {
            assertEquals(expected[i], ends[put + i], TOLERANCE, "component " + i);
        }
    }

    private static Member member() {
        Member member = StructureFactory.eINSTANCE.createMember();
        member.setStart(node("a", START));
        member.setEnd(node("b", END));
        member.setRoll(ROLL_DEGREES);
        return member;
    }

    private static Node node(String id, double[] at) {
        Node node = StructureFactory.eINSTANCE.createNode();
        node.setId(id);
        node.setX(at[0]);
        node.setY(at[1]);
        node.setZ(at[2]);
        return node;
    }

    private MotionOfNodes motionOfNodes() {
        Mode mode = new Mode(1, 1, 1, 1, 0, 0, new double[6], new double[6], 1, new double[4], new Character(Character.Kind.MIXED, "any"));
        ModalResult result = ModalResult.builder().nodes(List.of(point("a", START), point("b", END)))
                .mass(new MassLedger(new double[3], new double[3], new double[3], new double[3], List.of(), 0), 0)
                .mode(mode, motion, new double[0], new double[0]).build();
        return new MotionOfNodes(result, 0);
    }

    private static NodePoint point(String id, double[] at) {
        return new NodePoint(id, id, at[0], at[1], at[2]);
    }

    private static double[] local(double[] global) {
        double[] axes = LocalAxes.of(minus(END, START), Math.toRadians(ROLL_DEGREES));
        double[] local = new double[12];
        for (int block = 0; block < 12; block += 3) {
            for (int row = 0; row < 3; row++) {
                for (int column = 0; column < 3; column++) {
                    local[block + row] += axes[3 * row + column] * global[block + column];
                }
            }
        }
        return local;
    }

    /** Replaces the released components by those that leave them without moment: u_r = -K_rr^-1 K_rk u_k. */
    private static double[] condensed(double[] ends, List<Component> startFree, List<Component> endFree) {
        List<Integer> released = new ArrayList<>();
        startFree.forEach(component -> released.add(component.getValue()));
        endFree.forEach(component -> released.add(6 + component.getValue()));
        double[][] k = stiffness(norm(minus(END, START)));
        int n = released.size();
        double[][] system = new double[n][n + 1];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                system[i][j] = k[released.get(i)][released.get(j)];
            }
            for (int j = 0; j < 12; j++) {
                system[i][n] -= released.contains(j) ? 0 : k[released.get(i)][j] * ends[j];
            }
        }
        double[] solution = solve(system);
        double[] result = ends.clone();
        for (int i = 0; i < n; i++) {
            result[released.get(i)] = solution[i];
        }
        return result;
    }

    private static double[][] stiffness(double length) {
        double[][] k = new double[12][12];
        put(k, new int[] {0, 6}, new double[][] {{1 / length, -1 / length}, {-1 / length, 1 / length}}, 1);
        put(k, new int[] {3, 9}, new double[][] {{1 / length, -1 / length}, {-1 / length, 1 / length}}, 1);
        double l = length;
        double c = 1 / (l * l * l);
        double[][] bending = {{12 * c, 6 * l * c, -12 * c, 6 * l * c}, {6 * l * c, 4 * l * l * c, -6 * l * c, 2 * l * l * c},
            {-12 * c, -6 * l * c, 12 * c, -6 * l * c}, {6 * l * c, 2 * l * l * c, -6 * l * c, 4 * l * l * c}};
        put(k, new int[] {1, 5, 7, 11}, bending, 1);
        put(k, new int[] {2, 4, 8, 10}, bending, -1);
        return k;
    }

    /** Rotations about y have the other sign than slopes in z. */
    private static void put(double[][] k, int[] at, double[][] part, int signOfTurns) {
        for (int i = 0; i < at.length; i++) {
            for (int j = 0; j < at.length; j++) {
                int sign = (i % 2 == 1 ? signOfTurns : 1) * (j % 2 == 1 ? signOfTurns : 1);
                k[at[i]][at[j]] += at.length == 2 ? part[i][j] : sign * part[i][j];
            }
        }
    }

    /** Gauss elimination with row exchange. */
    private static double[] solve(double[][] system) {
        int n = system.length;
        for (int column = 0; column < n; column++) {
            int pivot = column;
            for (int row = column + 1; row < n; row++) {
                pivot = Math.abs(system[row][column]) > Math.abs(system[pivot][column]) ? row : pivot;
            }
            double[] swapped = system[pivot];
            system[pivot] = system[column];
            system[column] = swapped;
            for (int row = 0; row < n; row++) {
                double factor = row == column ? 0 : system[row][column] / system[column][column];
                for (int i = 0; i <= n; i++) {
                    system[row][i] -= factor * system[column][i];
                }
            }
        }
        double[] solution = new double[n];
        Arrays.setAll(solution, i -> system[i][n] / system[i][i]);
        return solution;
    }

    private static double[] minus(double[] a, double[] b) {
        return new double[] {a[0] - b[0], a[1] - b[1], a[2] - b[2]};
    }

    private static double dot(double[] a, double[] b) {
        return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    }

    private static double norm(double[] a) {
        return Math.sqrt(dot(a, a));
    }
}
