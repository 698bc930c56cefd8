package org.modewright.model.edit.commands;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNotSame;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.stream.Collectors;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.common.command.CommandStack;
import org.eclipse.emf.ecore.EObject;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.modewright.model.Defect;
import org.modewright.model.WellFormedness;
import org.modewright.model.edit.Labels;
import org.modewright.model.edit.Workshop;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.Vector;

/**
 * Every command is one step on the stack; undo gives back the very bytes from before, redo the very bytes from after.
 */
class StructureCommandsTest {

    private Workshop shop;
    private StructuralModel model;

    @BeforeEach
    void open() {
        shop = new Workshop();
        model = shop.model;
    }

    private void run(Command command) {
        String before = shop.text();
        CommandStack stack = shop.domain.getCommandStack();
        assertEquals(before, shop.text(), "making a command changes nothing");
        assertTrue(command.canExecute());
        stack.execute(command);
        String after = shop.text();
        assertNotEquals(before, after);
        stack.undo();
        assertEquals(before, shop.text());
        assertFalse(stack.canUndo(), "one act is one step");
        stack.redo();
        assertEquals(after, shop.text());
        stack.undo();
        assertEquals(before, shop.text());
        stack.redo();
        assertEquals(after, shop.text());
    }

    private static String names(Collection<? extends Identified> objects) {
        return objects.stream().map(Identified::getName).collect(Collectors.joining(" "));
    }

    private void assertNoDanglingReference() {
        List<String> ids = WellFormedness.check(model).stream().map(Defect::id).filter(id -> id.startsWith("reference")).toList();
        assertEquals(List.of(), ids);
    }

    @Test
    void createGivesIdAndName() {
        Node node = StructureFactory.eINSTANCE.createNode();
        Command command = shop.commands.create(node);
        run(command);
        assertEquals("n7", node.getId());
        assertEquals("N1", node.getName());
        assertEquals(List.of(node), List.copyOf(command.getResult()));
        assertEquals("Create Node", command.getLabel());
    }

    @Test
    void createKeepsAGivenNameAndServesSeveralKinds() {
        Node one = StructureFactory.eINSTANCE.createNode();
        one.setName("N1");
        Node two = StructureFactory.eINSTANCE.createNode();
        Member member = StructureFactory.eINSTANCE.createMember();
        member.setStart(one);
        member.setEnd(two);
        run(shop.commands.create(List.of(one, two, member)));
        assertEquals("A B C D E F N1 N2", names(model.getNodes()));
        assertEquals("Left Right Beam Strut M1", names(model.getMembers()));
    }

    @Test
    void createLoad() {
        NodeLoad load = StructureFactory.eINSTANCE.createNodeLoad();
        load.setNode(shop.node("E"));
        load.setValue(3);
        run(shop.commands.create(model.getLoadPatterns().get(0), load));
        assertEquals(3, model.getLoadPatterns().get(0).getLoads().size());
    }

    @Test
    void deletingANodeTakesItsDependants() {
        Deletion deletion = shop.commands.deletion(List.of(shop.node("D")));
        assertEquals("Node D  (6, 0, 4)", Labels.of(deletion.objects().get(0)));
        run(deletion.command());
        assertEquals("A B C E F", names(model.getNodes()));
        assertEquals("Left", names(model.getMembers()));
        assertEquals("", names(model.getMasses()));
        assertEquals("", names(model.getTies()));
        assertEquals("C F", names(model.getRigidFloors().get(0).getNodes()));
        assertEquals(0, model.getLoadPatterns().get(0).getLoads().size());
        assertNoDanglingReference();
    }

    @Test
    void deletionSaysWhatGoesWithIt() {
        Deletion deletion = shop.commands.deletion(List.of(shop.node("D")));
        assertEquals(1 + deletion.dependants().size(), deletion.objects().size());
        assertEquals(List.of("Beam", "Strut", "Right", "Lamp", "Pair").stream().sorted().toList(),
                deletion.dependants().stream().filter(Identified.class::isInstance).map(o -> ((Identified) o).getName()).sorted().toList());
    }

    @Test
    void aFloorThatLosesAllButOneNodeGoes() {
        run(shop.commands.delete(List.of(shop.node("D"), shop.node("F"))));
        assertEquals(0, model.getRigidFloors().size());
        assertEquals(0, model.getSprings().size());
        assertNoDanglingReference();
    }

    @Test
    void deletingAMemberTakesItsLoads() {
        run(shop.commands.delete(List.of(shop.member("Beam"))));
        assertEquals("Left Right Strut", names(model.getMembers()));
        assertTrue(model.getLoadPatterns().get(0).getLoads().get(0) instanceof NodeLoad);
        assertNoDanglingReference();
    }

    @Test
    void deletingAGroupLeavesItsElements() {
        run(shop.commands.delete(model.getGroups()));
        assertEquals(4, model.getMembers().size());
        assertNull(shop.member("Left").getGroup());
        assertNoDanglingReference();
    }

    @Test
    void deletingASectionTakesItsMembers() {
        run(shop.commands.delete(model.getFrameSections()));
        assertEquals(0, model.getMembers().size());
        assertEquals(6, model.getNodes().size());
        assertNoDanglingReference();
    }

    @Test
    void deletingManyAtOnceAndAPatternWithItsLoads() {
        List<EObject> all = new ArrayList<>(model.getNodes());
        all.add(model.getLoadPatterns().get(0));
        all.add(model.getLoadPatterns().get(0).getLoads().get(0));
        run(shop.commands.delete(all));
        assertEquals(0, model.getNodes().size() + model.getMembers().size() + model.getSupports().size() + model.getSprings().size()
                + model.getRigidLinks().size() + model.getRigidFloors().size() + model.getTies().size() + model.getLoadPatterns().size());
    }

    @Test
    void deletingPartsOfParts() {
        run(shop.commands.delete(List.of(model.getTies().get(0).getTerms().get(0), model.getLoadPatterns().get(0).getLoads().get(1))));
        assertEquals(1, model.getTies().get(0).getTerms().size());
        assertEquals(1, model.getLoadPatterns().get(0).getLoads().size());
    }

    @Test
    void theModelItselfCannotBeDeleted() {
        assertThrows(IllegalArgumentException.class, () -> shop.commands.delete(List.of(model)));
    }

    @Test
    void rename() {
        run(shop.commands.rename(shop.node("A"), " Anchor "));
        assertEquals("Anchor", model.getNodes().get(0).getName());
        assertEquals("The name B is taken. Enter a name that no other object of the kind has.",
                assertThrows(IllegalArgumentException.class, () -> shop.commands.rename(shop.node("C"), "B")).getMessage());
        assertThrows(IllegalArgumentException.class, () -> shop.commands.rename(shop.node("C"), " "));
    }

    @Test
    void aNameMayBeTakenByAnotherKind() {
        run(shop.commands.rename(shop.node("C"), "Beam"));
    }

    @Test
    void setOneAndMany() {
        run(shop.commands.set(model.getMembers(), StructurePackage.Literals.MEMBER__ROLL, 30.0));
        assertTrue(model.getMembers().stream().allMatch(m -> m.getRoll() == 30));
        open();
        run(shop.commands.set(shop.member("Left"), StructurePackage.Literals.MEMBER__START_FREE, List.of(Component.RY, Component.RZ)));
        assertEquals(List.of(Component.RY, Component.RZ), shop.member("Left").getStartFree());
        open();
        run(shop.commands.set(shop.member("Left"), StructurePackage.Literals.GROUPED__GROUP, null));
        assertNull(shop.member("Left").getGroup());
        open();
        Vector offset = StructureFactory.eINSTANCE.createVector();
        offset.setZ(-0.25);
        run(shop.commands.set(shop.member("Beam"), StructurePackage.Literals.MEMBER__START_OFFSET, offset));
        assertEquals(-0.25, shop.member("Beam").getStartOffset().getZ());
    }

    @Test
    void settingWhatIsSetAlreadyIsNoEdit() {
        Command command = shop.commands.set(shop.member("Left"), StructurePackage.Literals.MEMBER__ROLL, 0.0);
        String before = shop.text();
        shop.domain.getCommandStack().execute(command);
        assertEquals(before, shop.text());
        assertFalse(shop.domain.getCommandStack().canUndo());
    }

    @Test
    void moveAndPlaceNodes() {
        run(shop.commands.moveNodes(List.of(shop.node("C"), shop.node("D")), 0.5, -1, 0));
        assertEquals(0.5, shop.node("C").getX());
        assertEquals(-1, shop.node("D").getY());
        open();
        run(shop.commands.placeNode(shop.node("E"), 1, 2, 3));
        assertEquals(3, shop.node("E").getZ());
    }

    @Test
    void joinNodesRedirectsAndDropsWhatLiesBetween() {
        Node kept = shop.node("C");
        run(shop.commands.joinNodes(kept, shop.node("F")));
        assertEquals("A B C D E", names(model.getNodes()));
        assertEquals("C D", names(model.getRigidFloors().get(0).getNodes()));
        assertEquals(0, model.getSprings().size());
        assertNoDanglingReference();
    }

    @Test
    void joinNodesAtTheEndsOfAMember() {
        Node kept = shop.node("C");
        run(shop.commands.joinNodes(kept, shop.node("D")));
        assertEquals("Left Right Strut", names(model.getMembers()));
        assertSame(kept, shop.member("Right").getEnd());
        assertSame(kept, shop.member("Strut").getEnd());
        assertSame(kept, model.getMasses().get(0).getNode());
        assertEquals("C F", names(model.getRigidFloors().get(0).getNodes()));
        assertEquals(1, model.getLoadPatterns().get(0).getLoads().size());
        assertNoDanglingReference();
    }

    @Test
    void joinNodesKeepsThePlaceInAFloorThatLacksTheKeptNode() {
        run(shop.commands.joinNodes(shop.node("E"), shop.node("D")));
        assertEquals("C E F", names(model.getRigidFloors().get(0).getNodes()));
        assertEquals(1, model.getRigidLinks().size());
    }

    @Test
    void joinNodesPutsTwoSupportsIntoOne() {
        Support a = model.getSupports().get(0);
        Support b = model.getSupports().get(1);
        b.setRy(true);
        a.setElasticRx(2);
        b.setElasticRx(3);
        run(shop.commands.joinNodes(shop.node("A"), shop.node("B")));
        assertEquals("Base A", names(model.getSupports()));
        assertTrue(a.isUx() && a.isUz() && a.isRy());
        assertFalse(a.isUy());
        assertEquals(5, a.getElasticRx());
        assertNoDanglingReference();
    }

    @Test
    void joinNodesMovesASupport() {
        run(shop.commands.joinNodes(shop.node("E"), shop.node("A")));
        assertEquals("E", model.getSupports().get(0).getNode().getName());
    }

    @Test
    void aNodeCannotBeJoinedWithItself() {
        assertThrows(IllegalArgumentException.class, () -> shop.commands.joinNodes(shop.node("A"), shop.node("A")));
    }

    @Test
    void splitMemberSharesItsEndsOut() {
        Member beam = shop.member("Beam");
        beam.getStartFree().add(Component.RZ);
        beam.getEndFree().add(Component.RY);
        beam.setStartRigid(0.2);
        beam.setEndRigid(0.3);
        beam.setRoll(15);
        Vector up = StructureFactory.eINSTANCE.createVector();
        beam.setEndOffset(up);
        run(shop.commands.splitMember(beam, shop.node("E")));
        assertEquals("Left Right Beam Beam.2 Strut", names(model.getMembers()));
        Member rest = shop.member("Beam.2");
        assertEquals("m5", rest.getId());
        assertEquals("C E E D", String.join(" ", beam.getStart().getName(), beam.getEnd().getName(), rest.getStart().getName(),
                rest.getEnd().getName()));
        assertEquals(List.of(Component.RZ), beam.getStartFree());
        assertEquals(List.of(), beam.getEndFree());
        assertEquals(List.of(), rest.getStartFree());
        assertEquals(List.of(Component.RY), rest.getEndFree());
        assertEquals("0.2 0.0 0.0 0.3", beam.getStartRigid() + " " + beam.getEndRigid() + " " + rest.getStartRigid() + " "
                + rest.getEndRigid());
        assertNull(beam.getEndOffset());
        assertEquals(15, rest.getRoll());
        assertNotSame(beam.getSection(), null);
        assertSame(beam.getSection(), rest.getSection());
        assertEquals(2, model.getLoadPatterns().get(0).getLoads().stream().filter(MemberLoad.class::isInstance).count());
        assertSame(rest, ((MemberLoad) model.getLoadPatterns().get(0).getLoads().get(1)).getMember());
    }

    @Test
    void splitMemberRefusesNodesOffItsFlexiblePart() {
        Member beam = shop.member("Beam");
        for (String name : List.of("A", "C", "D")) {
            assertThrows(IllegalArgumentException.class, () -> shop.commands.splitMember(beam, shop.node(name)), name);
        }
        beam.setStartRigid(3.5);
        assertThrows(IllegalArgumentException.class, () -> shop.commands.splitMember(beam, shop.node("E")));
        beam.setStartRigid(0);
        beam.setEnd(null);
        assertThrows(IllegalArgumentException.class, () -> shop.commands.splitMember(beam, shop.node("E")));
    }

    @Test
    void assignGroup() {
        run(shop.commands.assignGroup(List.of(shop.member("Beam"), shop.member("Strut"), (Spring) model.getSprings().get(0)),
                model.getGroups().get(0)));
        assertSame(model.getGroups().get(0), model.getSprings().get(0).getGroup());
        open();
        run(shop.commands.assignGroup(List.of(shop.member("Left")), null));
        assertNull(shop.member("Left").getGroup());
    }

    @Test
    void duplicateTakesNodesAlongAndSharesProperties() {
        Command command = shop.commands.duplicate(List.of(shop.member("Beam"), shop.member("Left")), 0, 5, 1);
        run(command);
        assertEquals("A B C D E F N1 N2 N3", names(model.getNodes()));
        assertEquals("Left Right Beam Strut M1 M2", names(model.getMembers()));
        Member beam = shop.member("M1");
        assertEquals("0.0 5.0 5.0", beam.getStart().getX() + " " + beam.getStart().getY() + " " + beam.getStart().getZ());
        assertSame(beam.getStart(), shop.member("M2").getEnd());
        assertSame(model.getFrameSections().get(0), beam.getSection());
        assertSame(model.getGroups().get(0), shop.member("M2").getGroup());
        assertEquals(5, command.getResult().size());
        assertNoDanglingReference();
    }

    @Test
    void duplicateConstraintsSupportsLoadsAndLevels() {
        List<EObject> objects = new ArrayList<>(model.getRigidFloors());
        objects.addAll(model.getTies());
        objects.addAll(model.getSupports());
        objects.addAll(model.getLevels());
        objects.addAll(model.getLoadPatterns());
        objects.add(model.getLoadPatterns().get(0).getLoads().get(0));
        run(shop.commands.duplicate(objects, 0, 0, 4));
        assertEquals("Deck Deck.2", names(model.getRigidFloors()));
        assertEquals(8, model.getRigidFloors().get(1).getNodes().get(0).getZ());
        assertEquals("Top Top.2", names(model.getLevels()));
        assertEquals(8, model.getLevels().get(1).getElevation());
        assertEquals("Crowd Crowd.2", names(model.getLoadPatterns()));
        assertEquals(2, model.getLoadPatterns().get(1).getLoads().size());
        assertSame(shop.member("Beam"), ((MemberLoad) model.getLoadPatterns().get(1).getLoads().get(0)).getMember());
        assertNoDanglingReference();
    }

    @Test
    void duplicateASingleLoad() {
        run(shop.commands.duplicate(List.of(model.getLoadPatterns().get(0).getLoads().get(0)), 0, 0, 0));
        assertEquals(3, model.getLoadPatterns().get(0).getLoads().size());
    }

    @Test
    void settingsCannotBeCopied() {
        assertThrows(IllegalArgumentException.class, () -> shop.commands.duplicate(List.of(model.getAudit()), 0, 0, 0));
    }

    @Test
    void severalActsAreUndoneOneByOne() {
        CommandStack stack = shop.domain.getCommandStack();
        List<String> states = new ArrayList<>();
        states.add(shop.text());
        stack.execute(shop.commands.splitMember(shop.member("Beam"), shop.node("E")));
        states.add(shop.text());
        stack.execute(shop.commands.joinNodes(shop.node("C"), shop.node("F")));
        states.add(shop.text());
        stack.execute(shop.commands.delete(List.of(shop.node("E"))));
        for (int i = states.size() - 1; i >= 0; i--) {
            stack.undo();
            assertEquals(states.get(i), shop.text());
        }
        assertFalse(stack.canUndo());
    }
}
