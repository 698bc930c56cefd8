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
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.testmodels.Parts;

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

    private final Parts parts = new Parts(model);

    public Workshop() {
        model.getMaterials().add(FACTORY.createMaterial());
        model.getMaterials().get(0).setName("Steel");
        model.getFrameSections().add(FACTORY.createFrameSection());
        model.getFrameSections().get(0).setName("Profile");
        model.getFrameSections().get(0).setArea(0.01);
        parts.node("A", 0, 0, 0);
        parts.node("B", 6, 0, 0);
        parts.node("C", 0, 0, 4);
        parts.node("D", 6, 0, 4);
        parts.node("E", 3, 0, 4);
        parts.node("F", 0.001, 0, 4);
        Group group = parts.group("Posts");
        member("Left", "A", "C").setGroup(group);
        member("Right", "B", "D").setGroup(group);
        member("Beam", "C", "D");
        member("Strut", "A", "D").setAxialOnly(true);
        parts.level("Top", 4);
        parts.support("Base A", node("A"), "ux uz");
        parts.support("Base B", node("B"), "ux uz");
        parts.spring("Pad", node("C"), node("F"), 7);
        parts.mass("Lamp", node("D"), 0.2);
        addConstraints();
        addLoads();
        Ids.assignMissing(model);
        new StructureResource(URI.createURI("gate.modewright")).getContents().add(model);
    }

    private void addConstraints() {
        parts.floor("Deck", List.of(node("C"), node("D"), node("F")));
        parts.link("Arm", node("C"), node("E"));
        MultiPointTie tie = parts.tie("Pair");
        Parts.term(tie, node("C"), Component.UZ, 1);
        Parts.term(tie, node("D"), Component.UZ, 1);
    }

    private void addLoads() {
        LoadPattern pattern = parts.pattern("Crowd", 0.3);
        Parts.load(pattern, member("Beam"), 5);
        Parts.load(pattern, node("D"), 12);
    }

    private Member member(String name, String start, String end) {
        return parts.member(name, node(start), node(end), model.getFrameSections().get(0), model.getMaterials().get(0));
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
