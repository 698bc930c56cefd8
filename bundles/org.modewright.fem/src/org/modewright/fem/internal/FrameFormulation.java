package org.modewright.fem.internal;

import org.modewright.fem.ElementFormulation;
import org.modewright.fem.ElementMatrices;
import org.modewright.fem.FrameElement;
import org.modewright.fem.MemberEnd;
import org.modewright.fem.MemberInertia;
import org.modewright.fem.Snapshot;
import org.modewright.fem.StructuralElement;

/**
 * Frame members and bars. The flexible part between the rigid zones is built in local axes, action by action: axial force, torsion
 * and bending in two planes. Releases are condensed there, then the zones and offsets carry the matrices to the nodes as rigid arms.
 *
 * <p>Sources: J. S. Przemieniecki, Theory of Matrix Structural Analysis (1968), sections 5.6, 11.3 and 15.2; W. Weaver and
 * J. M. Gere, Matrix Analysis of Framed Structures (1990), chapter 6 for offsets and releases.
 */
public final class FrameFormulation implements ElementFormulation {

    private static final int[] AXIAL = {0, 6};
    private static final int[] TORSION = {3, 9};
    private static final int[] PLANE_XY = {1, 5, 7, 11};
    private static final int[] PLANE_XZ = {2, 4, 8, 10};
    private static final boolean[] TRANSLATIONS = {true, true};
    private static final boolean[] ROTATIONS = {false, false};
    private static final boolean[] BENDING = {true, false, true, false};

    @Override
    public boolean accepts(StructuralElement element) {
        return element instanceof FrameElement;
    }

    @Override
    public ElementMatrices matrices(StructuralElement element, Snapshot snapshot) {
        FrameElement member = (FrameElement) element;
        double[] stiffness = new double[144];
        double[] mass = new double[144];
        if (member.axialOnly()) {
            addBar(member, stiffness, mass);
        } else {
            addMember(member, stiffness, mass);
        }
        double[][] motions = motions(member);
        double[] atNodes = toNodes(stiffness, motions);
        if (!member.axialOnly()) {
            addZoneStiffness(member, atNodes);
        }
        boolean massless = member.inertia().mass() == 0.0;
        return new ElementMatrices(PackedMatrix.pack(12, atNodes),
                massless ? new double[0] : PackedMatrix.pack(12, massAtNodes(member, mass, motions)));
    }

    private static void addMember(FrameElement member, double[] stiffness, double[] mass) {
        double length = member.flexibleLength();
        double force = member.axialForce();
        MemberInertia inertia = member.inertia();
        addAction(member, AXIAL, TRANSLATIONS, line(member.stiffness().axial() / length), linear(inertia.mass() * length), stiffness,
                mass);
        addAction(member, TORSION, ROTATIONS, line(member.stiffness().torsion() / length), linear(inertia.spin() * length), stiffness,
                mass);
        double shearY = member.stiffness().shearY();
        BendingPlane xy = new BendingPlane(member.stiffness().bendingZ(), shearY, length);
        addAction(member, PLANE_XY, BENDING, sum(xy.stiffness(), xy.geometricStiffness(force)),
                xy.mass(inertia.mass(), Double.isInfinite(shearY) ? 0.0 : inertia.rotaryZ()), stiffness, mass);
        double shearZ = member.stiffness().shearZ();
        BendingPlane xz = new BendingPlane(member.stiffness().bendingY(), shearZ, length);
        addAction(member, PLANE_XZ, BENDING, sum(xz.stiffness(), xz.geometricStiffness(force)),
                xz.mass(inertia.mass(), Double.isInfinite(shearZ) ? 0.0 : inertia.rotaryY()), stiffness, mass);
    }

    private static void addBar(FrameElement member, double[] stiffness, double[] mass) {
        double total = member.inertia().mass() * member.length();
        addAction(member, AXIAL, TRANSLATIONS, line(member.stiffness().axial() / member.flexibleLength()), linear(total), stiffness,
                mass);
        double[] across = line(member.axialForce() / member.length());
        for (int component = 1; component <= 2; component++) {
            int[] places = {component, component + 6};
            addAction(member, places, TRANSLATIONS, across.clone(), linear(total), stiffness, mass);
        }
    }

    private static double[] line(double value) {
        return new double[] {value, -value, -value, value};
    }

    private static double[] linear(double total) {
        return new double[] {total / 3.0, total / 6.0, total / 6.0, total / 3.0};
    }

    private static double[] sum(double[] a, double[] b) {
        double[] sum = new double[a.length];
        for (int i = 0; i < a.length; i++) {
            sum[i] = a[i] + b[i];
        }
        return sum;
    }

    private static void addAction(FrameElement member, int[] places, boolean[] translation, double[] actionStiffness,
            double[] actionMass, double[] stiffness, double[] mass) {
        boolean[] released = new boolean[places.length];
        for (int i = 0; i < places.length; i++) {
            MemberEnd end = places[i] < 6 ? member.atStart() : member.atEnd();
            released[i] = end.released()[places[i] % 6];
        }
        new EndReleases(released, translation, member.flexibleLength()).condense(actionStiffness, actionMass);
        scatter(places, actionStiffness, stiffness);
        scatter(places, actionMass, mass);
    }

    /** Adds the matrix of an action to the 12 x 12 matrix in local axes; in the x-z plane dw/dx is minus the rotation about y. */
    private static void scatter(int[] places, double[] action, double[] matrix) {
        int order = places.length;
        for (int i = 0; i < order; i++) {
            for (int j = 0; j < order; j++) {
                matrix[12 * places[i] + places[j]] += sign(places[i]) * sign(places[j]) * action[i * order + j];
            }
        }
    }

    private static double sign(int place) {
        return place % 6 == 4 ? -1.0 : 1.0;
    }

    /** For both ends, the motion of the end of the flexible part (of the member, for a bar) in local axes. */
    private static double[][] motions(FrameElement member) {
        double startZone = member.axialOnly() ? 0.0 : member.atStart().rigidLength();
        double endZone = member.axialOnly() ? 0.0 : member.atEnd().rigidLength();
        return new double[][] {
            RigidArm.motion(member.axes(), along(member, member.atStart().offset(), startZone)),
            RigidArm.motion(member.axes(), along(member, member.atEnd().offset(), -endZone))};
    }

    private static double[] along(FrameElement member, double[] offset, double distance) {
        double[] axes = member.axes();
        return new double[] {offset[0] + distance * axes[0], offset[1] + distance * axes[1], offset[2] + distance * axes[2]};
    }

    private static double[] toNodes(double[] local, double[][] motions) {
        double[] global = new double[144];
        double[] inner = new double[36];
        for (int a = 0; a < 2; a++) {
            for (int b = 0; b < 2; b++) {
                for (int i = 0; i < 6; i++) {
                    System.arraycopy(local, 12 * (6 * a + i) + 6 * b, inner, 6 * i, 6);
                }
                PackedMatrix.addProduct(global, 12, 6 * a, 6 * b, motions[a], inner, motions[b]);
            }
        }
        return global;
    }

    private static double[] massAtNodes(FrameElement member, double[] local, double[][] motions) {
        if (member.lumped()) {
            double[] lumped = new double[144];
            for (int component = 0; component < 3; component++) {
                lumped[13 * component] = 0.5 * member.ownMass();
                lumped[13 * (component + 6)] = 0.5 * member.ownMass();
            }
            return lumped;
        }
        double[] mass = toNodes(local, motions);
        if (!member.axialOnly()) {
            double startZone = member.atStart().rigidLength();
            double endZone = member.atEnd().rigidLength();
            addZoneMass(member, mass, 0, member.atStart().offset(), 0.0, startZone);
            addZoneMass(member, mass, 6, member.atEnd().offset(), -endZone, 0.0);
        }
        return mass;
    }

    private static void addZoneMass(FrameElement member, double[] mass, int place, double[] offset, double from, double to) {
        if (to == from) {
            return;
        }
        double[] zone = RigidArm.lineMass(member.inertia().mass(), member.inertia().spin(), from, to);
        double[] motion = RigidArm.motion(member.axes(), offset);
        PackedMatrix.addProduct(mass, 12, place, place, motion, zone, motion);
    }

    /** The axial force in a rigid zone of length a adds N a to the stiffness of the node's rotations across the member. */
    private static void addZoneStiffness(FrameElement member, double[] stiffness) {
        addZoneStiffness(member, stiffness, 3, member.axialForce() * member.atStart().rigidLength());
        addZoneStiffness(member, stiffness, 9, member.axialForce() * member.atEnd().rigidLength());
    }

    private static void addZoneStiffness(FrameElement member, double[] stiffness, int place, double value) {
        double[] axes = member.axes();
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                double across = (i == j ? 1.0 : 0.0) - axes[i] * axes[j];
                stiffness[12 * (place + i) + place + j] += value * across;
            }
        }
    }
}
