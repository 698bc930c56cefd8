package org.modewright.ui.canvas.drawing;

import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.modewright.fem.Carrier;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.ModalResult;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidFloor;
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
public final class StructureDrawing {

    private static final int FEW_MEMBERS = 5_000;
    private static final int MANY_MEMBERS = 40_000;

    private final DrawnObjects objects = new DrawnObjects();
    private final MovingParts moving = new MovingParts();
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
        addFloors(model);
        model.getSupports().forEach(this::addSupport);
        model.getMasses().forEach(this::addMass);
        addLevels(model);
        scene = builder.build();
        scene.mark(PrimitiveKind.MEMBER, Mark.MUTED, number -> number < 0);
    }

    /** The drawing of a model as it stands. */
    public static StructureDrawing of(StructuralModel model) {
        return new StructureDrawing(model);
    }

    public Scene scene() {
        return scene;
    }

    /** Whether there is nothing to draw. */
    public boolean isEmpty() {
        return vertices.isEmpty();
    }

    private static boolean isPlaced(Node node) {
        return Double.isFinite(node.getX() + node.getY() + node.getZ());
    }

    private void addNode(Node node) {
        int vertex = builder.vertex(node.getX(), node.getY(), node.getZ());
        vertices.put(node, vertex);
        moving.point(vertex, node);
        marker(node, node, MarkerShape.NODE);
    }

    private void marker(Identified object, Node at, MarkerShape shape) {
        builder.marker(objects.marker(object), vertices.get(at), shape);
    }

    private boolean hasNodes(Node... nodes) {
        return Arrays.stream(nodes).allMatch(vertices::containsKey);
    }

    private void addMember(Member member, int segments) {
        DrawnMember drawn = hasNodes(member.getStart(), member.getEnd()) ? DrawnMember.of(member) : null;
        if (drawn == null) {
            return;
        }
        int number = objects.line(member);
        double[] p = drawn.start();
        double[] q = drawn.end();
        int pieces = drawn.isStraight() ? 1 : segments;
        moving.member(builder.member(number, p[0], p[1], p[2], q[0], q[1], q[2], pieces, drawn.localY(), drawn.width(), drawn.depth()),
                drawn);
        addArm(number, member.getStart(), drawn.startArm(), drawn.hasStartArm());
        addArm(number, member.getEnd(), drawn.endArm(), drawn.hasEndArm());
    }

    /** A rigid zone or offset: a plain line from the node to the flexible part. */
    private void addArm(int number, Node node, double[] arm, boolean isLong) {
        if (isLong) {
            moving.arm(builder.line(number, node.getX(), node.getY(), node.getZ(), node.getX() + arm[0], node.getY() + arm[1],
                    node.getZ() + arm[2]), node, arm);
        }
    }

    private void addLink(RigidLink link) {
        if (hasNodes(link.getFrom(), link.getTo())) {
            line(link, link.getFrom(), link.getTo());
        }
    }

    private void line(Identified object, Node from, Node to) {
        moving.line(builder.line(objects.line(object), from.getX(), from.getY(), from.getZ(), to.getX(), to.getY(), to.getZ()), from, to);
    }

    /** A spring to ground, or between nodes at one place, is a sign; one between places is a line. */
    private void addSpring(Spring spring) {
        Node from = spring.getNode();
        Node to = spring.getTo();
        if (!hasNodes(from) || to != null && !hasNodes(to)) {
            return;
        }
        if (to == null || from.getX() == to.getX() && from.getY() == to.getY() && from.getZ() == to.getZ()) {
            marker(spring, from, MarkerShape.SPRING);
        } else {
            line(spring, from, to);
        }
    }

    private void addFloors(StructuralModel model) {
        Map<Node, Set<Node>> joined = new HashMap<>();
        for (Member member : model.getMembers()) {
            if (hasNodes(member.getStart(), member.getEnd())) {
                joined.computeIfAbsent(member.getStart(), node -> new HashSet<>()).add(member.getEnd());
                joined.computeIfAbsent(member.getEnd(), node -> new HashSet<>()).add(member.getStart());
            }
        }
        model.getRigidFloors().forEach(floor -> addFloor(floor, joined));
    }

    private void addFloor(RigidFloor floor, Map<Node, Set<Node>> joined) {
        FloorOutline outline = FloorOutline.of(floor.getNodes().stream().filter(vertices::containsKey).toList(), joined);
        if (outline.isDrawn()) {
            moving.floor(builder.line(objects.floor(floor), outline.line()), outline);
        }
    }

    private void addSupport(Support support) {
        if (!hasNodes(support.getNode())) {
            return;
        }
        boolean translations = support.isUx() && support.isUy() && support.isUz();
        boolean turns = support.isRx() && support.isRy() && support.isRz();
        boolean anyTurn = support.isRx() || support.isRy() || support.isRz();
        boolean any = anyTurn || support.isUx() || support.isUy() || support.isUz();
        MarkerShape some = any ? MarkerShape.GUIDED : MarkerShape.SPRING;
        MarkerShape pinned = translations && !anyTurn ? MarkerShape.PINNED : some;
        marker(support, support.getNode(), translations && turns ? MarkerShape.HELD : pinned);
    }

    private void addMass(NodalMass mass) {
        if (hasNodes(mass.getNode())) {
            marker(mass, mass.getNode(), MarkerShape.MASS);
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
    public Identified object(Pick pick) {
        return objects.object(objects.id(pick));
    }

    /** The id of the object that a primitive stands for; null if it stands for none. */
    public String id(Pick pick) {
        return objects.id(pick);
    }

    /** Ids of the objects behind primitives picked by a rectangle. */
    public Set<String> ids(int[] lines, int[] markers) {
        return objects.ids(lines, markers);
    }

    /** Sets a mark on all that stands for some objects, and clears it from the rest. */
    public void mark(Mark mark, Set<String> ids) {
        for (PrimitiveKind kind : List.of(PrimitiveKind.MEMBER, PrimitiveKind.MARKER)) {
            scene.mark(kind, mark, number -> isOneOf(ids, objects.id(kind, number)));
        }
    }

    private static boolean isOneOf(Set<String> ids, String id) {
        return id != null && ids.contains(id);
    }

    /** The shape of a mode on this scene. */
    public Deformation deformation(ModalResult result, int mode) {
        return moving.deformation(scene, result, mode);
    }

    /**
     * Colours by energy share.
     *
     * @param energy null: no colour
     * @return the largest share, which stands at the end of the ramp; 0 without colour
     */
    public double colour(ModalResult result, int mode, Energy energy, ColourRamp ramp) {
        scene.colourAll(PrimitiveKind.MEMBER, 0);
        scene.colourAll(PrimitiveKind.MARKER, 0);
        if (energy == null) {
            return 0;
        }
        Map<String, Double> shares = shares(result, energy == Energy.STRAIN ? result.strainShares(mode) : result.kineticShares(mode));
        double largest = shares.values().stream().mapToDouble(Double::doubleValue).max().orElse(0);
        if (largest > 0) {
            for (PrimitiveKind kind : List.of(PrimitiveKind.MEMBER, PrimitiveKind.MARKER)) {
                scene.colourByScalar(kind, values(kind, shares), ramp, 0, largest);
            }
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

    private double[] values(PrimitiveKind kind, Map<String, Double> shares) {
        double[] values = new double[scene.count(kind)];
        for (int i = 0; i < values.length; i++) {
            String id = carrierId(objects.id(kind, scene.id(kind, i)));
            values[i] = id == null ? Double.NaN : shares.getOrDefault(id, Double.NaN);
        }
        return values;
    }

    /** A mass is coloured as the node that carries its energy. */
    private String carrierId(String id) {
        return objects.object(id) instanceof NodalMass mass ? mass.getNode().getId() : id;
    }
}
