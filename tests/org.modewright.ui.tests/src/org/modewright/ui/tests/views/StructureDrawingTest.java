package org.modewright.ui.tests.views;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.modewright.fem.Carrier;
import org.modewright.fem.Kind;
import org.modewright.fem.MassLedger;
import org.modewright.fem.NodePoint;
import org.modewright.modal.Character;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.Vector;
import org.modewright.render.Camera;
import org.modewright.render.ColourRamp;
import org.modewright.render.Deformation;
import org.modewright.render.Mark;
import org.modewright.render.Pick;
import org.modewright.render.PrimitiveKind;
import org.modewright.render.Raster;
import org.modewright.render.RenderOptions;
import org.modewright.render.Scene;
import org.modewright.render.SceneRenderer;
import org.modewright.render.StandardView;
import org.modewright.ui.canvas.drawing.StructureDrawing;

/** What a model's drawing holds, how it is marked and coloured, and how it moves. */
class StructureDrawingTest {

    /** Displacements are kept in single precision. */
    private static final double SINGLE = 1e-6;

    private final StructureFactory factory = StructureFactory.eINSTANCE;
    private final StructuralModel model = factory.createStructuralModel();
    private final List<Node> nodes = new ArrayList<>();

    /**
     * An L-shaped floor of eight nodes with a beam along every edge, over one column with a rigid zone and an offset; a bar, a link, a
     * spring between nodes, one to ground, a support and a mass. The floor's nodes stand at z = 3.
     */
    @BeforeEach
    void makeModel() {
        double[][] corners = {{0, 0}, {5, 0}, {10, 0}, {10, 4}, {5, 4}, {5, 8}, {0, 8}, {0, 4}};
        for (double[] corner : corners) {
            node(corner[0], corner[1], 3);
        }
        Node foot = node(0, 0, 0);
        Node aside = node(2, 2, 1);
        for (int i = 0; i < 8; i++) {
            member(nodes.get(i), nodes.get((i + 1) % 8));
        }
        Member column = member(foot, nodes.get(0));
        column.setEndRigid(0.4);
        Vector offset = factory.createVector();
        offset.setX(0.3);
        column.setStartOffset(offset);
        member(aside, nodes.get(7)).setAxialOnly(true);
        RigidFloor floor = factory.createRigidFloor();
        floor.setId("floor");
        floor.getNodes().addAll(nodes.subList(0, 8));
        model.getRigidFloors().add(floor);
        constraintsAndMasses(foot, aside);
    }

    private void constraintsAndMasses(Node foot, Node aside) {
        RigidLink link = factory.createRigidLink();
        link.setId("link");
        link.setFrom(aside);
        link.setTo(nodes.get(1));
        model.getRigidLinks().add(link);
        Spring between = factory.createSpring();
        between.setId("between");
        between.setNode(foot);
        between.setTo(aside);
        Spring grounded = factory.createSpring();
        grounded.setId("grounded");
        grounded.setNode(aside);
        model.getSprings().addAll(List.of(between, grounded));
        Support support = factory.createSupport();
        support.setId("support");
        support.setNode(foot);
        support.setUx(true);
        model.getSupports().add(support);
        NodalMass mass = factory.createNodalMass();
        mass.setId("mass");
        mass.setNode(nodes.get(3));
        model.getMasses().add(mass);
    }

    private Node node(double x, double y, double z) {
        Node node = factory.createNode();
        node.setId("n" + nodes.size());
        node.setX(x);
        node.setY(y);
        node.setZ(z);
        nodes.add(node);
        model.getNodes().add(node);
        return node;
    }

    private Member member(Node start, Node end) {
        Member member = factory.createMember();
        member.setId("m" + model.getMembers().size());
        member.setStart(start);
        member.setEnd(end);
        model.getMembers().add(member);
        return member;
    }

    private static Set<String> ids(StructureDrawing drawing, PrimitiveKind kind) {
        Set<String> ids = new HashSet<>();
        for (int i = 0; i < drawing.scene().count(kind); i++) {
            String id = drawing.id(new Pick(kind, i, drawing.scene().id(kind, i), 0, 0, 0));
            if (id != null) {
                ids.add(id);
            }
        }
        return ids;
    }

    @Test
    void everyObjectIsDrawnAndFoundByItsId() {
        StructureDrawing drawing = StructureDrawing.of(model);
        Set<String> lines = new HashSet<>(Set.of("link", "between"));
        model.getMembers().forEach(member -> lines.add(member.getId()));
        assertEquals(lines, ids(drawing, PrimitiveKind.MEMBER));
        Set<String> signs = new HashSet<>(Set.of("grounded", "support", "mass"));
        nodes.forEach(node -> signs.add(node.getId()));
        assertEquals(signs, ids(drawing, PrimitiveKind.MARKER));
        Pick pick = new Pick(PrimitiveKind.MEMBER, 0, drawing.scene().id(PrimitiveKind.MEMBER, 0), 0, 0, 0);
        assertSame(model.getMembers().get(0), drawing.object(pick));
        assertNull(drawing.id(null));
        assertNull(drawing.object(null));
    }

    @Test
    void whatCannotBeDrawnIsLeftOut() {
        model.getMembers().get(0).setEnd(null);
        nodes.get(9).setX(Double.NaN);
        StructureDrawing drawing = StructureDrawing.of(model);
        Set<String> lines = ids(drawing, PrimitiveKind.MEMBER);
        assertFalse(lines.contains("m0") || lines.contains("m9") || lines.contains("link") || lines.contains("between"), lines.toString());
        assertFalse(ids(drawing, PrimitiveKind.MARKER).contains("grounded"));
        assertTrue(StructureDrawing.of(factory.createStructuralModel()).isEmpty());
    }

    @Test
    void aSpringBetweenNodesAtOnePlaceIsASign() {
        Node twin = node(2, 2, 1);
        model.getSprings().get(0).setNode(twin);
        StructureDrawing drawing = StructureDrawing.of(model);
        assertTrue(ids(drawing, PrimitiveKind.MARKER).contains("between"));
        assertFalse(ids(drawing, PrimitiveKind.MEMBER).contains("between"));
    }

    @Test
    void marksFallOnAllThatStandsForAnObject() {
        StructureDrawing drawing = StructureDrawing.of(model);
        drawing.mark(Mark.SELECTED, Set.of("m8", "mass", "floor"));
        assertEquals(3, marked(drawing, PrimitiveKind.MEMBER, Mark.SELECTED, "m8"), "the column, its rigid zone and its offset");
        assertEquals(1, marked(drawing, PrimitiveKind.MARKER, Mark.SELECTED, "mass"));
        int floor = floorLine(drawing);
        assertTrue(drawing.scene().marked(PrimitiveKind.MEMBER, floor, Mark.SELECTED));
        assertTrue(drawing.scene().id(PrimitiveKind.MEMBER, floor) < 0, "a floor is never picked");
        drawing.mark(Mark.SELECTED, Set.of());
        assertEquals(0, IntStream.range(0, drawing.scene().memberCount())
                .filter(i -> drawing.scene().marked(PrimitiveKind.MEMBER, i, Mark.SELECTED)).count());
    }

    private static int marked(StructureDrawing drawing, PrimitiveKind kind, Mark mark, String id) {
        Scene scene = drawing.scene();
        return (int) IntStream.range(0, scene.count(kind)).filter(i -> scene.marked(kind, i, mark)
                && id.equals(drawing.id(new Pick(kind, i, scene.id(kind, i), 0, 0, 0)))).count();
    }

    private static int floorLine(StructureDrawing drawing) {
        return IntStream.range(0, drawing.scene().memberCount())
                .filter(i -> drawing.scene().id(PrimitiveKind.MEMBER, i) < 0).findFirst().orElseThrow();
    }

    @Test
    void theOutlineOfAFloorFollowsItsBeamsRoundARecess() {
        Scene scene = StructureDrawing.of(model).scene();
        int floor = floorLine(StructureDrawing.of(model));
        assertEquals(8, scene.segments(floor), "all eight nodes, the recess with them");
        assertEquals(60, area(scene, floor) / (0.95 * 0.95), 1e-3, "an area of 10 by 4 and 5 by 4, drawn five hundredths inside");
    }

    @Test
    void theOutlineOfAFloorWithoutBeamsIsTheHullOfItsNodes() {
        model.getMembers().clear();
        StructureDrawing drawing = StructureDrawing.of(model);
        assertEquals(5, drawing.scene().segments(floorLine(drawing)));
        assertEquals(70, area(drawing.scene(), floorLine(drawing)) / (0.95 * 0.95), 1e-3, "the recess is cut at an angle");
    }

    @Test
    void nodesOnOneLineMakeNoOutline() {
        model.getRigidFloors().get(0).getNodes().retainAll(List.of(nodes.get(0), nodes.get(1), nodes.get(2)));
        Scene scene = StructureDrawing.of(model).scene();
        assertTrue(IntStream.range(0, scene.memberCount()).allMatch(i -> scene.id(PrimitiveKind.MEMBER, i) >= 0));
    }

    /** Gauss's area formula in plan. */
    private static double area(Scene scene, int line) {
        double sum = 0;
        for (int i = 0; i < scene.segments(line); i++) {
            double[] p = scene.vertex(scene.firstVertex(line) + i);
            double[] q = scene.vertex(scene.firstVertex(line) + i + 1);
            sum += p[0] * q[1] - q[0] * p[1];
        }
        return Math.abs(sum / 2);
    }

    @Test
    void aRigidMotionMovesEverythingAsOneBody() {
        double[] shift = {0.3, -0.2, 0.1};
        double[] turn = {0.02, -0.03, 0.05};
        StructureDrawing drawing = StructureDrawing.of(model);
        Deformation shape = drawing.deformation(result(shift, turn), 0);
        for (int vertex = 0; vertex < drawing.scene().vertexCount(); vertex++) {
            double[] p = drawing.scene().vertex(vertex);
            double[] expected = {shift[0] + turn[1] * p[2] - turn[2] * p[1], shift[1] + turn[2] * p[0] - turn[0] * p[2],
                shift[2] + turn[0] * p[1] - turn[1] * p[0]};
            assertArrayEquals(expected, shape.at(vertex), SINGLE, "vertex " + vertex);
        }
    }

    @Test
    void aNodeThatTheRunDidNotKnowStaysAtRest() {
        ModalResult result = result(new double[] {1, 0, 0}, new double[3]);
        node(20, 20, 3);
        StructureDrawing drawing = StructureDrawing.of(model);
        Deformation shape = drawing.deformation(result, 0);
        assertArrayEquals(new double[] {1, 0, 0}, shape.at(0), SINGLE);
        assertArrayEquals(new double[3], shape.at(nodes.size() - 1), SINGLE);
    }

    @Test
    void coloursFollowTheSharesAndTheLargestIsTold() {
        StructureDrawing drawing = StructureDrawing.of(model);
        ModalResult result = result(new double[3], new double[3]);
        assertEquals(0.75, drawing.colour(result, 0, Energy.STRAIN, ColourRamp.energy()), 1e-12);
        assertEquals(0.6, drawing.colour(result, 0, Energy.KINETIC, ColourRamp.energy()), 1e-12);
        assertEquals(0, drawing.colour(result, 0, null, ColourRamp.energy()));
    }

    @Test
    void aMassTakesTheColourOfItsNode() {
        long withMass = darkPixels(StructureDrawing.of(model));
        model.getMasses().clear();
        assertTrue(withMass > 2 * darkPixels(StructureDrawing.of(model)), "the disc of the mass is larger than the node's square");
    }

    /** Pixels of the ramp's dark end in plan: those of the node with the largest share of the kinetic energy. */
    private long darkPixels(StructureDrawing drawing) {
        drawing.colour(result(new double[3], new double[3]), 0, Energy.KINETIC, ColourRamp.energy());
        Raster raster = new Raster(400, 300);
        Camera camera = Camera.standard(StandardView.PLAN, drawing.scene().bounds(), 400, 300);
        new SceneRenderer().render(drawing.scene(), camera, null, 0, new RenderOptions(), raster);
        int dark = ColourRamp.energy().argb(1);
        return IntStream.of(raster.colour()).filter(pixel -> pixel == dark).count();
    }

    /** All nodes move as one body; the first member holds 0.75 of the strain energy, the fourth node 0.6 of the kinetic energy. */
    private ModalResult result(double[] shift, double[] turn) {
        double[] shape = new double[6 * nodes.size()];
        List<NodePoint> points = new ArrayList<>();
        for (int i = 0; i < nodes.size(); i++) {
            Node node = nodes.get(i);
            points.add(new NodePoint(node.getId(), node.getId(), node.getX(), node.getY(), node.getZ()));
            shape[6 * i] = shift[0] + turn[1] * node.getZ() - turn[2] * node.getY();
            shape[6 * i + 1] = shift[1] + turn[2] * node.getX() - turn[0] * node.getZ();
            shape[6 * i + 2] = shift[2] + turn[0] * node.getY() - turn[1] * node.getX();
            System.arraycopy(turn, 0, shape, 6 * i + 3, 3);
        }
        List<Carrier> carriers = List.of(new Carrier(Kind.MEMBER, "m0", "m0", new int[] {0, 1}, null, null, null, null),
                new Carrier(Kind.MEMBER, "m1", "m1", new int[] {1, 2}, null, null, null, null),
                new Carrier(Kind.NODE, "n3", "n3", new int[] {3}, null, null, null, null));
        Mode mode = new Mode(1, 1, 1, 1, 0, 0, new double[6], new double[6], 1, new double[4], new Character(Character.Kind.MIXED, "any"));
        return ModalResult.builder().nodes(points).carriers(carriers)
                .mass(new MassLedger(new double[3], new double[3], new double[3], new double[3], List.of(), 0), 0)
                .mode(mode, shape, new double[] {0.75, 0.25, 0}, new double[] {0.3, 0.1, 0.6}).build();
    }
}
