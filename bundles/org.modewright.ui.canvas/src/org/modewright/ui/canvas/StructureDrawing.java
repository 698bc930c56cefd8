package org.modewright.ui.canvas;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.modewright.fem.Carrier;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.ModalResult;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.Support;
import org.modewright.render.ColourRamp;
import org.modewright.render.Deformation;
import org.modewright.render.Mark;
import org.modewright.render.MarkerShape;
import org.modewright.render.Pick;
import org.modewright.render.PrimitiveKind;
import org.modewright.render.Scene;
import org.modewright.render.SceneBuilder;

/**
 * A structural model as a scene: which primitive stands for which object of the model, and how the primitives move and are coloured in a
 * mode. Objects that lack what is needed to draw them are left out; the checks of the model report them.
 */
final class StructureDrawing {

    private static final double[] NO_ARM = new double[3];
    private static final int FEW_MEMBERS = 5_000;
    private static final int MANY_MEMBERS = 40_000;

    private record BentMember(int primitive, DrawnMember member) {
    }

    private record MovingPoint(int vertex, String node) {
    }

    /** A plain line between two points, each of which moves with a node as a rigid body. */
    private record MovingLine(int primitive, String from, double[] fromArm, String to, double[] toArm) {
    }

    private final List<String> lineIds = new ArrayList<>();
    private final List<String> markerIds = new ArrayList<>();
    private final Map<String, Identified> objects = new HashMap<>();
    private final List<BentMember> members = new ArrayList<>();
    private final List<MovingPoint> points = new ArrayList<>();
    private final List<MovingLine> lines = new ArrayList<>();
    private final Map<Node, Integer> vertices = new HashMap<>();
    private final SceneBuilder builder = Scene.builder();
    private final Scene scene;

    private StructureDrawing(StructuralModel model) {
        int count = model.getMembers().size();
        int segments = count <= FEW_MEMBERS ? 8 : count <= MANY_MEMBERS ? 4 : 2;
        model.getNodes().stream().filter(StructureDrawing::isPlaced).forEach(this::addNode);
        model.getMembers().forEach(member -> addMember(member, segments));
        model.getRigidLinks().forEach(this::addLink);
        model.getSprings().forEach(this::addSpring);
        model.getSupports().forEach(this::addSupport);
        model.getMasses().forEach(this::addMass);
        addLevels(model);
        scene = builder.build();
    }

    static StructureDrawing of(StructuralModel model) {
        return new StructureDrawing(model);
    }

    Scene scene() {
        return scene;
    }

    boolean isEmpty() {
        return vertices.isEmpty();
    }

    private static boolean isPlaced(Node node) {
        return Double.isFinite(node.getX() + node.getY() + node.getZ());
    }

    private void addNode(Node node) {
        int vertex = builder.vertex(node.getX(), node.getY(), node.getZ());
        vertices.put(node, vertex);
        points.add(new MovingPoint(vertex, node.getId()));
        marker(node, vertex, MarkerShape.NODE);
    }

    private void marker(Identified object, int vertex, MarkerShape shape) {
        objects.put(object.getId(), object);
        builder.marker(markerIds.size(), vertex, shape);
        markerIds.add(object.getId());
    }

    private int lineId(Identified object) {
        objects.put(object.getId(), object);
        lineIds.add(object.getId());
        return lineIds.size() - 1;
    }

    private boolean hasNodes(Node... nodes) {
        return Arrays.stream(nodes).allMatch(vertices::containsKey);
    }

    private void addMember(Member member, int segments) {
        DrawnMember drawn = hasNodes(member.getStart(), member.getEnd()) ? DrawnMember.of(member) : null;
        if (drawn == null) {
            return;
        }
        int id = lineId(member);
        double[] p = drawn.start();
        double[] q = drawn.end();
        double[] size = size(member.getSection());
        int pieces = drawn.isStraight() ? 1 : segments;
        int primitive = builder.member(id, p[0], p[1], p[2], q[0], q[1], q[2], pieces, drawn.localY(), size[0], size[1]);
        members.add(new BentMember(primitive, drawn));
        if (drawn.hasStartArm()) {
            addArm(id, member.getStart(), drawn.startArm());
        }
        if (drawn.hasEndArm()) {
            addArm(id, member.getEnd(), drawn.endArm());
        }
    }

    /** A rigid zone or offset: a plain line from the node to the flexible part. */
    private void addArm(int id, Node node, double[] arm) {
        int primitive = builder.line(id, node.getX(), node.getY(), node.getZ(), node.getX() + arm[0], node.getY() + arm[1],
                node.getZ() + arm[2]);
        lines.add(new MovingLine(primitive, node.getId(), NO_ARM, node.getId(), arm));
    }

    /** Width along local y and depth along local z of the rectangle with the section's area and second moments, at most ten to one. */
    private static double[] size(FrameSection section) {
        if (section == null || !(section.getArea() > 0)) {
            return new double[2];
        }
        double side = Math.sqrt(section.getArea());
        return new double[] {side(section.getIz(), section.getArea(), side), side(section.getIy(), section.getArea(), side)};
    }

    private static double side(double secondMoment, double area, double square) {
        double side = secondMoment > 0 ? Math.sqrt(12 * secondMoment / area) : square;
        return Math.max(square / 3, Math.min(3 * square, side));
    }

    private void addLink(RigidLink link) {
        if (hasNodes(link.getFrom(), link.getTo())) {
            line(lineId(link), link.getFrom(), link.getTo());
        }
    }

    private void line(int id, Node from, Node to) {
        int primitive = builder.line(id, from.getX(), from.getY(), from.getZ(), to.getX(), to.getY(), to.getZ());
        lines.add(new MovingLine(primitive, from.getId(), NO_ARM, to.getId(), NO_ARM));
    }

    private void addSpring(Spring spring) {
        if (!hasNodes(spring.getNode())) {
            return;
        }
        if (spring.getTo() == null) {
            marker(spring, vertices.get(spring.getNode()), MarkerShape.SPRING);
        } else if (hasNodes(spring.getTo())) {
            line(lineId(spring), spring.getNode(), spring.getTo());
        }
    }

    private void addSupport(Support support) {
        if (!hasNodes(support.getNode())) {
            return;
        }
        boolean translations = support.isUx() && support.isUy() && support.isUz();
        boolean any = support.isUx() || support.isUy() || support.isUz() || support.isRx() || support.isRy() || support.isRz();
        boolean all = translations && support.isRx() && support.isRy() && support.isRz();
        boolean turns = support.isRx() || support.isRy() || support.isRz();
        MarkerShape shape = all ? MarkerShape.HELD : translations && !turns ? MarkerShape.PINNED : any ? MarkerShape.GUIDED : MarkerShape.SPRING;
        marker(support, vertices.get(support.getNode()), shape);
    }

    private void addMass(NodalMass mass) {
        if (hasNodes(mass.getNode())) {
            marker(mass, vertices.get(mass.getNode()), MarkerShape.MASS);
        }
    }

    /** The name of each level beside the corner of the plan where all coordinates are least. */
    private void addLevels(StructuralModel model) {
        double x = vertices.keySet().stream().mapToDouble(Node::getX).min().orElse(0);
        double y = vertices.keySet().stream().mapToDouble(Node::getY).min().orElse(0);
        for (Level level : model.getLevels()) {
            if (Double.isFinite(level.getElevation()) && level.getName() != null) {
                builder.label(-1, builder.vertex(x, y, level.getElevation()), level.getName());
            }
        }
    }

    /** The object that a primitive stands for; null if it stands for none. */
    Identified object(Pick pick) {
        return pick == null ? null : objects.get(id(pick));
    }

    /** The id of the object that a primitive stands for; null if it stands for none. */
    String id(Pick pick) {
        if (pick == null || pick.id() < 0) {
            return null;
        }
        return switch (pick.kind()) {
            case MEMBER -> lineIds.get(pick.id());
            case MARKER -> markerIds.get(pick.id());
            default -> null;
        };
    }

    String lineId(int id) {
        return lineIds.get(id);
    }

    String markerId(int id) {
        return markerIds.get(id);
    }

    void mark(Mark mark, Set<String> ids) {
        scene.mark(PrimitiveKind.MEMBER, mark, id -> id >= 0 && ids.contains(lineIds.get(id)));
        scene.mark(PrimitiveKind.MARKER, mark, id -> id >= 0 && ids.contains(markerIds.get(id)));
    }

    /** The shape of a mode on this scene. */
    Deformation deformation(ModalResult result, int mode) {
        MotionOfNodes motion = new MotionOfNodes(result, mode);
        Deformation deformation = new Deformation(scene);
        for (BentMember bent : members) {
            double[] ends = bent.member.ends(motion);
            if (bent.member.isStraight()) {
                deformation.memberStraight(bent.primitive, ends);
            } else {
                deformation.member(bent.primitive, ends);
            }
        }
        double[] place = new double[6];
        for (MovingPoint point : points) {
            move(deformation, motion, point.vertex, point.node, NO_ARM, place);
        }
        for (MovingLine line : lines) {
            int first = scene.firstVertex(line.primitive);
            move(deformation, motion, first, line.from, line.fromArm, place);
            move(deformation, motion, first + 1, line.to, line.toArm, place);
        }
        return deformation;
    }

    private static void move(Deformation deformation, MotionOfNodes motion, int vertex, String node, double[] arm, double[] place) {
        motion.at(node, arm, place, 0);
        deformation.vertex(vertex, place[0], place[1], place[2]);
    }

    /**
     * Colours by energy share.
     *
     * @param energy null: no colour
     * @return the largest share, which stands at the end of the ramp; 0 without colour
     */
    double colour(ModalResult result, int mode, Energy energy, ColourRamp ramp) {
        if (energy == null) {
            scene.colourAll(PrimitiveKind.MEMBER, 0);
            scene.colourAll(PrimitiveKind.MARKER, 0);
            return 0;
        }
        Map<String, Double> shares = shares(result, energy == Energy.STRAIN ? result.strainShares(mode) : result.kineticShares(mode));
        double largest = shares.values().stream().mapToDouble(Double::doubleValue).max().orElse(0);
        if (largest > 0) {
            scene.colourByScalar(PrimitiveKind.MEMBER, values(PrimitiveKind.MEMBER, lineIds, shares), ramp, 0, largest);
            scene.colourByScalar(PrimitiveKind.MARKER, values(PrimitiveKind.MARKER, markerIds, shares), ramp, 0, largest);
        }
        return largest;
    }

    private static Map<String, Double> shares(ModalResult result, double[] values) {
        Map<String, Double> shares = new HashMap<>();
        List<Carrier> carriers = result.carriers();
        for (int i = 0; i < carriers.size(); i++) {
            shares.merge(carriers.get(i).id(), values[i], Double::sum);
        }
        return shares;
    }

    private double[] values(PrimitiveKind kind, List<String> ids, Map<String, Double> shares) {
        double[] values = new double[scene.count(kind)];
        for (int i = 0; i < values.length; i++) {
            int id = scene.id(kind, i);
            values[i] = id < 0 ? Double.NaN : shares.getOrDefault(ids.get(id), Double.NaN);
        }
        return values;
    }

    /** Ids of the objects behind primitives picked by a rectangle. */
    Set<String> ids(int[] lines, int[] markers) {
        Set<String> ids = new java.util.LinkedHashSet<>();
        BitSet seen = new BitSet();
        for (int line : lines) {
            if (line >= 0 && !seen.get(line)) {
                seen.set(line);
                ids.add(lineIds.get(line));
            }
        }
        for (int marker : markers) {
            if (marker >= 0) {
                ids.add(markerIds.get(marker));
            }
        }
        return ids;
    }
}
