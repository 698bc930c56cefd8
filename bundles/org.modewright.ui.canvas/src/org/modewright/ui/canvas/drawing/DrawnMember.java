package org.modewright.ui.canvas.drawing;

import java.util.EnumSet;
import java.util.Set;
import org.modewright.fem.LocalAxes;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.Vector;

/**
 * A frame member as it is drawn: the flexible part between its rigid zones, with what is needed to bend it with its nodes.
 */
public final class DrawnMember {

    private static final int DIMENSIONS = 3;

    /** Bars that carry axial force alone are drawn slender beside the members that bend. */
    private static final double BAR = 0.5;

    private final String startNode;
    private final String endNode;
    private final double[] startArm = new double[DIMENSIONS];
    private final double[] endArm = new double[DIMENSIONS];
    private final double[] start = new double[DIMENSIONS];
    private final double[] end = new double[DIMENSIONS];
    private final double[] axes;
    private final double length;
    private final boolean straight;
    private final double width;
    private final double depth;
    private final Set<Component> startFree = EnumSet.noneOf(Component.class);
    private final Set<Component> endFree = EnumSet.noneOf(Component.class);

    private DrawnMember(Member member) {
        startNode = member.getStart().getId();
        endNode = member.getEnd().getId();
        straight = member.isAxialOnly();
        width = straight ? BAR * SectionSize.width(member.getSection()) : SectionSize.width(member.getSection());
        depth = straight ? BAR * SectionSize.depth(member.getSection()) : SectionSize.depth(member.getSection());
        startFree.addAll(member.getStartFree());
        endFree.addAll(member.getEndFree());
        double[] p = offset(member.getStart(), member.getStartOffset());
        double[] q = offset(member.getEnd(), member.getEndOffset());
        double[] along = {q[0] - p[0], q[1] - p[1], q[2] - p[2]};
        double whole = Math.sqrt(along[0] * along[0] + along[1] * along[1] + along[2] * along[2]);
        double startShare = share(member.getStartRigid(), whole);
        double endShare = share(member.getEndRigid(), whole);
        boolean zonesFit = startShare + endShare < 1;
        for (int i = 0; i < DIMENSIONS; i++) {
            start[i] = p[i] + (zonesFit ? startShare * along[i] : 0);
            end[i] = q[i] - (zonesFit ? endShare * along[i] : 0);
            startArm[i] = start[i] - coordinate(member.getStart(), i);
            endArm[i] = end[i] - coordinate(member.getEnd(), i);
        }
        length = zonesFit ? whole * (1 - startShare - endShare) : whole;
        axes = whole > 0 ? LocalAxes.of(along, Math.toRadians(member.getRoll())) : null;
    }

    /** The member as drawn; null where it lacks a node or has no length, which the checks of the model report. */
    public static DrawnMember of(Member member) {
        if (member.getStart() == null || member.getEnd() == null) {
            return null;
        }
        DrawnMember drawn = new DrawnMember(member);
        return drawn.axes == null || !Double.isFinite(drawn.length) ? null : drawn;
    }

    private static double share(double zone, double whole) {
        return whole > 0 && zone > 0 ? zone / whole : 0;
    }

    private static double[] offset(Node node, Vector offset) {
        return offset == null ? new double[] {node.getX(), node.getY(), node.getZ()}
                : new double[] {node.getX() + offset.getX(), node.getY() + offset.getY(), node.getZ() + offset.getZ()};
    }

    private static double coordinate(Node node, int axis) {
        return axis == 0 ? node.getX() : axis == 1 ? node.getY() : node.getZ();
    }

    /** Start of the flexible part. */
    public double[] start() {
        return start;
    }

    /** End of the flexible part. */
    public double[] end() {
        return end;
    }

    double[] localY() {
        return new double[] {axes[3], axes[4], axes[5]};
    }

    /** Whether it stays straight, as a bar does. */
    public boolean isStraight() {
        return straight;
    }

    /** Outer size along local y. */
    double width() {
        return width;
    }

    /** Outer size along local z. */
    double depth() {
        return depth;
    }

    /** Whether the start of the flexible part lies apart from its node. */
    boolean hasStartArm() {
        return isLong(startArm);
    }

    boolean hasEndArm() {
        return isLong(endArm);
    }

    private boolean isLong(double[] arm) {
        return Math.abs(arm[0]) + Math.abs(arm[1]) + Math.abs(arm[2]) > 1e-9 * length;
    }

    double[] startArm() {
        return startArm;
    }

    double[] endArm() {
        return endArm;
    }

    /**
     * The displacements and rotations of the ends of the flexible part, global, start then end. Where an end is released in bending, its
     * rotation is the one that leaves it free of moment in the Euler&ndash;Bernoulli member: 3/2 of the chord's slope less half of the
     * other end's; with both ends released the chord's.
     */
    public double[] ends(MotionOfNodes motion) {
        double[] ends = new double[12];
        motion.at(startNode, startArm, ends, 0);
        motion.at(endNode, endArm, ends, 6);
        if (straight || startFree.isEmpty() && endFree.isEmpty()) {
            return ends;
        }
        double[] chord = new double[DIMENSIONS];
        for (int row = 0; row < DIMENSIONS; row++) {
            chord[row] = (local(ends, 6, row) - local(ends, 0, row)) / length;
        }
        double[] startTurn = {local(ends, 3, 0), local(ends, 3, 1), local(ends, 3, 2)};
        double[] endTurn = {local(ends, 9, 0), local(ends, 9, 1), local(ends, 9, 2)};
        release(startTurn, endTurn, 0, Component.RX, Double.NaN);
        release(startTurn, endTurn, 1, Component.RY, -chord[2]);
        release(startTurn, endTurn, 2, Component.RZ, chord[1]);
        for (int axis = 0; axis < DIMENSIONS; axis++) {
            ends[3 + axis] = axes[axis] * startTurn[0] + axes[3 + axis] * startTurn[1] + axes[6 + axis] * startTurn[2];
            ends[9 + axis] = axes[axis] * endTurn[0] + axes[3 + axis] * endTurn[1] + axes[6 + axis] * endTurn[2];
        }
        return ends;
    }

    private double local(double[] ends, int at, int row) {
        return axes[3 * row] * ends[at] + axes[3 * row + 1] * ends[at + 1] + axes[3 * row + 2] * ends[at + 2];
    }

    /** Replaces released end rotations about one local axis; a slope that is not a number stands for twist, which follows the other end. */
    private void release(double[] startTurn, double[] endTurn, int axis, Component component, double slope) {
        boolean first = startFree.contains(component);
        boolean second = endFree.contains(component);
        boolean twist = Double.isNaN(slope);
        if (first && second && !twist) {
            startTurn[axis] = slope;
            endTurn[axis] = slope;
        } else if (first && !second) {
            startTurn[axis] = twist ? endTurn[axis] : 1.5 * slope - 0.5 * endTurn[axis];
        } else if (second && !first) {
            endTurn[axis] = twist ? startTurn[axis] : 1.5 * slope - 0.5 * startTurn[axis];
        }
    }
}
