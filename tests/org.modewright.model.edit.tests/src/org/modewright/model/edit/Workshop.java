package org.modewright.model.edit;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;

import org.eclipse.emf.common.command.BasicCommandStack;
import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.edit.domain.AdapterFactoryEditingDomain;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.modewright.model.Ids;
import org.modewright.model.ModelFile;
import org.modewright.model.StructureResource;
import org.modewright.model.edit.commands.StructureCommands;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.TieTerm;

/**
 * A model with an editing domain. Nodes A, B at the ground, C above A, D above B, E in the middle of C and D, F beside C.
 * Members: Left A-C, Right B-D, Beam C-D, Strut A-D (bar).
 */
public final class Workshop {

    static final StructureFactory FACTORY = StructureFactory.eINSTANCE;

    public final StructuralModel model = ModelFile.create("Gate");
    public final StructureEditAdapterFactory factory = new StructureEditAdapterFactory();
    public final EditingDomain domain = new AdapterFactoryEditingDomain(factory, new BasicCommandStack());
    public final StructureCommands commands = new StructureCommands(domain, model);

    public Workshop() {
        model.getMaterials().add(FACTORY.createMaterial());
        model.getMaterials().get(0).setName("Steel");
        model.getFrameSections().add(FACTORY.createFrameSection());
        model.getFrameSections().get(0).setName("Profile");
        model.getFrameSections().get(0).setArea(0.01);
        node("A", 0, 0, 0);
        node("B", 6, 0, 0);
        node("C", 0, 0, 4);
        node("D", 6, 0, 4);
        node("E", 3, 0, 4);
        node("F", 0.001, 0, 4);
        Group group = FACTORY.createGroup();
        group.setName("Posts");
        model.getGroups().add(group);
        member("Left", "A", "C").setGroup(group);
        member("Right", "B", "D").setGroup(group);
        member("Beam", "C", "D");
        member("Strut", "A", "D").setAxialOnly(true);
        Level level = FACTORY.createLevel();
        level.setName("Top");
        level.setElevation(4);
        model.getLevels().add(level);
        support("A");
        support("B");
        addSpringAndMass();
        addConstraints();
        addLoads();
        Ids.assignMissing(model);
        new StructureResource(URI.createURI("gate.modewright")).getContents().add(model);
    }

    private void addSpringAndMass() {
        Spring spring = FACTORY.createSpring();
        spring.setName("Pad");
        spring.setNode(node("C"));
        spring.setTo(node("F"));
        spring.setUx(7);
        model.getSprings().add(spring);
        NodalMass mass = FACTORY.createNodalMass();
        mass.setName("Lamp");
        mass.setNode(node("D"));
        mass.setUx(0.2);
        model.getMasses().add(mass);
    }

    private void addConstraints() {
        RigidFloor floor = FACTORY.createRigidFloor();
        floor.setName("Deck");
        floor.getNodes().addAll(List.of(node("C"), node("D"), node("F")));
        model.getRigidFloors().add(floor);
        RigidLink link = FACTORY.createRigidLink();
        link.setName("Arm");
        link.setFrom(node("C"));
        link.setTo(node("E"));
        model.getRigidLinks().add(link);
        MultiPointTie tie = FACTORY.createMultiPointTie();
        tie.setName("Pair");
        for (String name : List.of("C", "D")) {
            TieTerm term = FACTORY.createTieTerm();
            term.setNode(node(name));
            term.setComponent(Component.UZ);
            tie.getTerms().add(term);
        }
        model.getTies().add(tie);
    }

    private void addLoads() {
        LoadPattern pattern = FACTORY.createLoadPattern();
        pattern.setName("Crowd");
        pattern.setMassFactor(0.3);
        MemberLoad onBeam = FACTORY.createMemberLoad();
        onBeam.setMember(member("Beam"));
        onBeam.setValue(5);
        NodeLoad onNode = FACTORY.createNodeLoad();
        onNode.setNode(node("D"));
        onNode.setValue(12);
        pattern.getLoads().add(onBeam);
        pattern.getLoads().add(onNode);
        model.getLoadPatterns().add(pattern);
    }

    private void node(String name, double x, double y, double z) {
        Node node = FACTORY.createNode();
        node.setName(name);
        node.setX(x);
        node.setY(y);
        node.setZ(z);
        model.getNodes().add(node);
    }

    private Member member(String name, String start, String end) {
        Member member = FACTORY.createMember();
        member.setName(name);
        member.setStart(node(start));
        member.setEnd(node(end));
        member.setSection(model.getFrameSections().get(0));
        member.setMaterial(model.getMaterials().get(0));
        model.getMembers().add(member);
        return member;
    }

    private void support(String name) {
        Support support = FACTORY.createSupport();
        support.setName("Base " + name);
        support.setNode(node(name));
        support.setUx(true);
        support.setUz(true);
        model.getSupports().add(support);
    }

    public Node node(String name) {
        return model.getNodes().stream().filter(n -> n.getName().equals(name)).findFirst().orElseThrow();
    }

    public Member member(String name) {
        return model.getMembers().stream().filter(m -> m.getName().equals(name)).findFirst().orElseThrow();
    }

    public String text() {
        try {
            return new String(ModelFile.bytes(model), java.nio.charset.StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
