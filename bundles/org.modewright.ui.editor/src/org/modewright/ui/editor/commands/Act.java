package org.modewright.ui.editor.commands;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.function.BiConsumer;
import java.util.function.Consumer;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import org.eclipse.emf.common.command.Command;
import org.eclipse.jface.dialogs.InputDialog;
import org.eclipse.jface.window.Window;
import org.eclipse.osgi.util.NLS;
import org.eclipse.ui.dialogs.ElementListSelectionDialog;
import org.eclipse.jface.viewers.LabelProvider;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.Grouped;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.Messages;

/** The acts of the Structure menu: each one command on what is selected. */
enum Act {

    ADD_NODE(Act::addNode), ADD_MEMBER(Act::addMember), ADD_SUPPORT(Act::addSupports), ADD_MASS(Act::addMasses),
    ADD_SPRING(Act::addSprings), DUPLICATE(Act::duplicate), JOIN_NODES(Act::joinNodes), SPLIT_MEMBER(Act::splitMember),
    ASSIGN_GROUP(Act::assignGroup);

    private final Consumer<EditorContext> body;

    Act(Consumer<EditorContext> body) {
        this.body = body;
    }

    /**
     * Does it.
     *
     * @throws IllegalArgumentException if what is selected does not suit; the message says what would
     */
    void run(EditorContext editor) {
        body.accept(editor);
    }

    private static <T> List<T> selected(EditorContext editor, Class<T> kind) {
        return editor.selected().stream().filter(kind::isInstance).map(kind::cast).toList();
    }

    private static void create(EditorContext editor, List<? extends Identified> objects) {
        editor.execute(editor.commands().create(objects));
        editor.select(objects.stream().map(Identified::getId).collect(Collectors.toSet()), editor);
    }

    private static double[] askTriple(EditorContext editor, String title, String prompt, String first) {
        String unit = Units.of(editor.model()).symbol(Quantity.LENGTH);
        InputDialog dialog = new InputDialog(editor.shell(), title, NLS.bind(prompt, unit), first, Triple::fault);
        return dialog.open() == Window.OK ? Triple.parse(dialog.getValue()) : null;
    }

    private static void addNode(EditorContext editor) {
        List<Node> nodes = selected(editor, Node.class);
        String first = nodes.isEmpty() ? "0 0 0" : Triple.text(nodes.get(0).getX(), nodes.get(0).getY(), nodes.get(0).getZ());
        double[] place = askTriple(editor, Messages.Act_coordinates, Messages.Act_coordinatesPrompt, first);
        if (place != null) {
            Node node = StructureFactory.eINSTANCE.createNode();
            node.setX(place[0]);
            node.setY(place[1]);
            node.setZ(place[2]);
            create(editor, List.of(node));
        }
    }

    private static List<Node> twoNodes(EditorContext editor) {
        List<Node> nodes = selected(editor, Node.class);
        if (nodes.size() != 2) {
            throw new IllegalArgumentException(Messages.Act_needsTwoNodes);
        }
        return nodes;
    }

    /** The new member takes section, material and group from the last one, so that a row of members is quickly drawn. */
    private static void addMember(EditorContext editor) {
        List<Node> nodes = twoNodes(editor);
        if (editor.model().getFrameSections().isEmpty() || editor.model().getMaterials().isEmpty()) {
            throw new IllegalArgumentException(Messages.Act_needsSection);
        }
        List<Member> members = editor.model().getMembers();
        Member last = members.isEmpty() ? null : members.get(members.size() - 1);
        Member member = StructureFactory.eINSTANCE.createMember();
        member.setStart(nodes.get(0));
        member.setEnd(nodes.get(1));
        member.setSection(last == null ? editor.model().getFrameSections().get(0) : last.getSection());
        member.setMaterial(last == null ? editor.model().getMaterials().get(0) : last.getMaterial());
        member.setGroup(last == null ? null : last.getGroup());
        create(editor, List.of(member));
    }

    private static <T extends Identified> void createAtNodes(EditorContext editor, Supplier<T> maker, BiConsumer<T, Node> place) {
        List<Node> nodes = selected(editor, Node.class);
        if (nodes.isEmpty()) {
            throw new IllegalArgumentException(Messages.Act_needsNodes);
        }
        List<T> made = new ArrayList<>();
        for (Node node : nodes) {
            T object = maker.get();
            place.accept(object, node);
            made.add(object);
        }
        create(editor, made);
    }

    private static void addSupports(EditorContext editor) {
        Set<Node> supported = editor.model().getSupports().stream().map(Support::getNode).collect(Collectors.toSet());
        if (selected(editor, Node.class).stream().anyMatch(supported::contains)) {
            throw new IllegalArgumentException(Messages.Act_supportedAlready);
        }
        createAtNodes(editor, StructureFactory.eINSTANCE::createSupport, (support, node) -> {
            support.setNode(node);
            support.setUx(true);
            support.setUy(true);
            support.setUz(true);
            support.setRx(true);
            support.setRy(true);
            support.setRz(true);
        });
    }

    private static void addMasses(EditorContext editor) {
        createAtNodes(editor, StructureFactory.eINSTANCE::createNodalMass, NodalMass::setNode);
    }

    /** Between two selected nodes, else to ground at each. */
    private static void addSprings(EditorContext editor) {
        List<Node> nodes = selected(editor, Node.class);
        if (nodes.size() != 2) {
            createAtNodes(editor, StructureFactory.eINSTANCE::createSpring, Spring::setNode);
            return;
        }
        Spring spring = StructureFactory.eINSTANCE.createSpring();
        spring.setNode(nodes.get(0));
        spring.setTo(nodes.get(1));
        create(editor, List.of(spring));
    }

    private static void duplicate(EditorContext editor) {
        if (editor.selected().isEmpty()) {
            throw new IllegalArgumentException(Messages.Act_needsSomething);
        }
        double[] offset = askTriple(editor, Messages.Act_offset, Messages.Act_offsetPrompt, "0 0 0");
        if (offset != null) {
            Command command = editor.commands().duplicate(editor.selected(), offset[0], offset[1], offset[2]);
            editor.execute(command);
            editor.select(command.getResult().stream().filter(Identified.class::isInstance).map(copy -> ((Identified) copy).getId())
                    .collect(Collectors.toSet()), editor);
        }
    }

    private static void joinNodes(EditorContext editor) {
        List<Node> nodes = twoNodes(editor);
        Node kept = nodes.get(0);
        editor.execute(editor.commands().joinNodes(kept, nodes.get(1)));
        editor.select(Set.of(kept.getId()), editor);
    }

    private static void splitMember(EditorContext editor) {
        List<Member> members = selected(editor, Member.class);
        List<Node> nodes = selected(editor, Node.class);
        if (members.size() != 1 || nodes.size() != 1) {
            throw new IllegalArgumentException(Messages.Act_needsMemberAndNode);
        }
        editor.execute(editor.commands().splitMember(members.get(0), nodes.get(0)));
    }

    private static void assignGroup(EditorContext editor) {
        List<Grouped> elements = selected(editor, Grouped.class);
        if (elements.isEmpty()) {
            throw new IllegalArgumentException(Messages.Act_needsElements);
        }
        ElementListSelectionDialog dialog = new ElementListSelectionDialog(editor.shell(),
                LabelProvider.createTextProvider(any -> any instanceof Group group ? group.getName() : any.toString()));
        dialog.setTitle(Messages.Act_group);
        dialog.setMessage(Messages.Act_groupPrompt);
        List<Object> choices = new ArrayList<>(editor.model().getGroups());
        choices.add(Messages.Act_noGroup);
        dialog.setElements(choices.toArray());
        Group now = elements.get(0).getGroup();
        dialog.setInitialSelections(now == null ? Messages.Act_noGroup : now);
        if (dialog.open() == Window.OK && dialog.getFirstResult() != null) {
            Group group = dialog.getFirstResult() instanceof Group chosen ? chosen : null;
            editor.execute(editor.commands().assignGroup(elements, group));
        }
    }
}
