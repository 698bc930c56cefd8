package org.modewright.model;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EcorePackage;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.TieTerm;
import org.modewright.model.structure.Vector;

/**
 * Models for the tests of this bundle.
 */
final class Fixtures {

    static final StructureFactory FACTORY = StructureFactory.eINSTANCE;

    private Fixtures() {
    }

    /** A one-storey, one-bay square frame with every kind of object in it, and no defect. */
    static StructuralModel sound() {
        StructuralModel model = ModelFile.create("Pavilion");
        material(model, "Steel");
        section(model, "Post");
        Group group = FACTORY.createGroup();
        group.setName("Frame");
        model.getGroups().add(group);
        Level level = FACTORY.createLevel();
        level.setName("Roof");
        level.setElevation(3);
        model.getLevels().add(level);
        double[][] corners = {{0, 0}, {4, 0}, {4, 4}, {0, 4}};
        for (double[] corner : corners) {
            node(model, corner[0], corner[1], 0);
        }
        for (double[] corner : corners) {
            node(model, corner[0], corner[1], 3);
        }
        for (int i = 0; i < 4; i++) {
            member(model, model.getNodes().get(i), model.getNodes().get(i + 4)).setGroup(group);
            member(model, model.getNodes().get(i + 4), model.getNodes().get(4 + (i + 1) % 4));
            support(model, model.getNodes().get(i));
        }
        addSpringAndMass(model);
        addConstraints(model);
        addLoads(model);
        Ids.assignMissing(model);
        return model;
    }

    private static void addSpringAndMass(StructuralModel model) {
        Spring spring = FACTORY.createSpring();
        spring.setName("Bearing");
        spring.setNode(model.getNodes().get(4));
        spring.setTo(model.getNodes().get(5));
        spring.setUx(10);
        spring.setRy(20);
        SpringCoupling coupling = FACTORY.createSpringCoupling();
        coupling.setFirst(Component.UX);
        coupling.setSecond(Component.RY);
        coupling.setStiffness(5);
        spring.getCouplings().add(coupling);
        model.getSprings().add(spring);
        NodalMass mass = FACTORY.createNodalMass();
        mass.setName("Tank");
        mass.setNode(model.getNodes().get(6));
        mass.setUx(2);
        mass.setUy(2);
        mass.setUz(2);
        mass.setOffset(vector(0, 0, 0.5));
        model.getMasses().add(mass);
    }

    private static void addConstraints(StructuralModel model) {
        RigidFloor floor = FACTORY.createRigidFloor();
        floor.setName("Deck");
        floor.getNodes().addAll(model.getNodes().subList(4, 8));
        model.getRigidFloors().add(floor);
        RigidLink link = FACTORY.createRigidLink();
        link.setName("Outrigger");
        link.setFrom(model.getNodes().get(4));
        link.setTo(node(model, 0, 0, 3.5));
        link.getComponents().add(Component.UX);
        link.getComponents().add(Component.UZ);
        model.getRigidLinks().add(link);
        MultiPointTie tie = FACTORY.createMultiPointTie();
        tie.setName("Slide");
        tie.getTerms().add(term(model.getNodes().get(5), Component.UZ, 1));
        tie.getTerms().add(term(model.getNodes().get(6), Component.UZ, -1));
        model.getTies().add(tie);
    }

    private static void addLoads(StructuralModel model) {
        LoadPattern pattern = FACTORY.createLoadPattern();
        pattern.setName("Live");
        pattern.setMassFactor(0.3);
        NodeLoad atNode = FACTORY.createNodeLoad();
        atNode.setNode(model.getNodes().get(5));
        atNode.setValue(12);
        MemberLoad onMember = FACTORY.createMemberLoad();
        onMember.setMember(model.getMembers().get(1));
        onMember.setValue(5);
        pattern.getLoads().add(atNode);
        pattern.getLoads().add(onMember);
        model.getLoadPatterns().add(pattern);
    }

    static Material material(StructuralModel model, String name) {
        Material material = FACTORY.createMaterial();
        material.setName(name);
        material.setYoung(210e6);
        material.setPoisson(0.3);
        material.setDensity(7.85);
        model.getMaterials().add(material);
        return material;
    }

    static FrameSection section(StructuralModel model, String name) {
        FrameSection section = FACTORY.createFrameSection();
        section.setName(name);
        section.setArea(0.01);
        section.setIy(1e-4);
        section.setIz(2e-4);
        section.setTorsion(1e-5);
        model.getFrameSections().add(section);
        return section;
    }

    static Node node(StructuralModel model, double x, double y, double z) {
        Node node = FACTORY.createNode();
        node.setName("N" + (model.getNodes().size() + 1));
        node.setX(x);
        node.setY(y);
        node.setZ(z);
        model.getNodes().add(node);
        return node;
    }

    static Member member(StructuralModel model, Node start, Node end) {
        Member member = FACTORY.createMember();
        member.setName("M" + (model.getMembers().size() + 1));
        member.setStart(start);
        member.setEnd(end);
        member.setSection(model.getFrameSections().get(0));
        member.setMaterial(model.getMaterials().get(0));
        model.getMembers().add(member);
        return member;
    }

    static Support support(StructuralModel model, Node node) {
        Support support = FACTORY.createSupport();
        support.setName("Base " + (model.getSupports().size() + 1));
        support.setNode(node);
        support.setUx(true);
        support.setUy(true);
        support.setUz(true);
        model.getSupports().add(support);
        return support;
    }

    static TieTerm term(Node node, Component component, double factor) {
        TieTerm term = FACTORY.createTieTerm();
        term.setNode(node);
        term.setComponent(component);
        term.setFactor(factor);
        return term;
    }

    static Vector vector(double x, double y, double z) {
        Vector vector = FACTORY.createVector();
        vector.setX(x);
        vector.setY(y);
        vector.setZ(z);
        return vector;
    }

    /** Sets every attribute of every object to something that is not its default, and every unset single reference that has a target. */
    static StructuralModel everyFeatureSet() {
        StructuralModel model = sound();
        Filler filler = new Filler(model);
        EcoreUtil.getAllContents(java.util.List.of(model)).forEachRemaining(o -> filler.containments((EObject) o));
        EcoreUtil.getAllContents(java.util.List.of(model)).forEachRemaining(o -> filler.fill((EObject) o));
        return model;
    }

    private static final class Filler {

        private final StructuralModel model;
        private int number;

        Filler(StructuralModel model) {
            this.model = model;
        }

        void containments(EObject object) {
            for (EReference reference : object.eClass().getEAllContainments()) {
                if (!reference.isMany() && object.eGet(reference) == null) {
                    object.eSet(reference, FACTORY.create((EClass) reference.getEType()));
                }
            }
        }

        void fill(EObject object) {
            for (EAttribute attribute : object.eClass().getEAllAttributes()) {
                if (!attribute.isID() && !attribute.getName().equals("formatVersion")) {
                    attribute(object, attribute);
                }
            }
            for (EReference reference : object.eClass().getEAllReferences()) {
                if (!reference.isContainment() && !reference.isMany() && object.eGet(reference) == null) {
                    object.eSet(reference, reference.getEType().getName().equals("Group") ? model.getGroups().get(0)
                            : model.getNodes().get(number++ % model.getNodes().size()));
                }
            }
        }

        private void attribute(EObject object, EAttribute attribute) {
            if (attribute.isMany()) {
                if (((java.util.List<?>) object.eGet(attribute)).isEmpty()) {
                    object.eSet(attribute, java.util.List.of(Component.RZ, Component.UY));
                }
                return;
            }
            object.eSet(attribute, value(attribute));
        }

        private Object value(EAttribute attribute) {
            number++;
            if (attribute.getEAttributeType() instanceof EEnum choices) {
                Object last = choices.getELiterals().get(choices.getELiterals().size() - 1).getInstance();
                return last;
            }
            if (attribute.getEAttributeType() == EcorePackage.Literals.EDOUBLE) {
                return number / 7.0 * 1e-3;
            }
            if (attribute.getEAttributeType() == EcorePackage.Literals.EINT) {
                return 1000 + number;
            }
            if (attribute.getEAttributeType() == EcorePackage.Literals.EBOOLEAN) {
                return !(Boolean) attribute.getDefaultValue();
            }
            return "Text " + number + " <&\"'> grün \u6f22\ttab\nline\r\nend ";
        }
    }
}
