package org.modewright.ui.canvas.drawing;

import java.util.ArrayList;
import java.util.List;
import org.modewright.modal.ModalResult;
import org.modewright.model.structure.Node;
import org.modewright.render.Deformation;
import org.modewright.render.Scene;

/** How the primitives of a drawing move with the nodes. */
final class MovingParts {

    static final double[] NO_ARM = new double[3];

    private record BentMember(int primitive, DrawnMember member) {
    }

    private record MovingPoint(int vertex, String node) {
    }

    /** A plain line between two points, each of which moves with a node as a rigid body. */
    private record MovingLine(int primitive, String from, double[] fromArm, String to, double[] toArm) {
    }

    private record MovingFloor(int primitive, List<String> corners) {
    }

    private final List<BentMember> members = new ArrayList<>();
    private final List<MovingPoint> points = new ArrayList<>();
    private final List<MovingLine> lines = new ArrayList<>();
    private final List<MovingFloor> floors = new ArrayList<>();

    void member(int primitive, DrawnMember member) {
        members.add(new BentMember(primitive, member));
    }

    void point(int vertex, Node node) {
        points.add(new MovingPoint(vertex, node.getId()));
    }

    void line(int primitive, Node from, Node to) {
        lines.add(new MovingLine(primitive, from.getId(), NO_ARM, to.getId(), NO_ARM));
    }

    /** A line that sticks out of a node and moves with it. */
    void arm(int primitive, Node node, double[] arm) {
        lines.add(new MovingLine(primitive, node.getId(), NO_ARM, node.getId(), arm));
    }

    void floor(int primitive, FloorOutline outline) {
        floors.add(new MovingFloor(primitive, outline.corners().stream().map(Node::getId).toList()));
    }

    /** The shape of a mode. */
    Deformation deformation(Scene scene, ModalResult result, int mode) {
        MotionOfNodes motion = new MotionOfNodes(result, mode);
        Deformation deformation = new Deformation(scene);
        members.forEach(bent -> bend(deformation, bent, motion));
        double[] place = new double[6];
        for (MovingPoint point : points) {
            move(deformation, motion, point.vertex, point.node, NO_ARM, place);
        }
        for (MovingLine line : lines) {
            int first = scene.firstVertex(line.primitive);
            move(deformation, motion, first, line.from, line.fromArm, place);
            move(deformation, motion, first + 1, line.to, line.toArm, place);
        }
        floors.forEach(floor -> move(deformation, motion, scene.firstVertex(floor.primitive), floor.corners));
        return deformation;
    }

    private static void bend(Deformation deformation, BentMember bent, MotionOfNodes motion) {
        double[] ends = bent.member.ends(motion);
        if (bent.member.isStraight()) {
            deformation.memberStraight(bent.primitive, ends);
        } else {
            deformation.member(bent.primitive, ends);
        }
    }

    private static void move(Deformation deformation, MotionOfNodes motion, int vertex, String node, double[] arm, double[] place) {
        motion.at(node, arm, place, 0);
        deformation.vertex(vertex, place[0], place[1], place[2]);
    }

    private static void move(Deformation deformation, MotionOfNodes motion, int firstVertex, List<String> corners) {
        double[] place = new double[6];
        double[] moved = new double[3 * corners.size()];
        for (int i = 0; i < corners.size(); i++) {
            motion.at(corners.get(i), NO_ARM, place, 0);
            System.arraycopy(place, 0, moved, 3 * i, 3);
        }
        double[] line = FloorOutline.inset(moved);
        for (int i = 0; i < line.length / 3; i++) {
            deformation.vertex(firstVertex + i, line[3 * i], line[3 * i + 1], line[3 * i + 2]);
        }
    }
}
