package org.modewright.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.Set;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EClassifier;
import org.junit.jupiter.api.Test;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage;

class IdsAndNamesTest {

    @Test
    void idsContinueAfterTheHighestOfTheirKind() {
        StructuralModel model = ModelFile.create("m");
        Fixtures.node(model, 0, 0, 0).setId("n41");
        Fixtures.node(model, 0, 0, 0).setId("n7");
        Fixtures.node(model, 0, 0, 0).setId("north");
        Node fresh = StructureFactory.eINSTANCE.createNode();
        Ids ids = new Ids(model);
        assertEquals("n42", ids.assign(fresh));
        assertEquals("n42", ids.assign(fresh));
        assertEquals("n43", ids.next(StructurePackage.Literals.NODE));
        assertEquals("m1", ids.next(StructurePackage.Literals.MEMBER));
    }

    @Test
    void anIdIsUniqueAcrossKinds() {
        StructuralModel model = ModelFile.create("m");
        Fixtures.node(model, 0, 0, 0).setId("m1");
        assertEquals("m2", new Ids(model).next(StructurePackage.Literals.MEMBER));
    }

    @Test
    void assignedIdsAreAllDifferentAndStorable() {
        StructuralModel model = Fixtures.sound();
        Set<String> seen = new HashSet<>();
        model.eAllContents().forEachRemaining(o -> {
            if (o instanceof org.modewright.model.structure.Identified i) {
                assertTrue(seen.add(i.getId()), i.getId());
                assertTrue(Ids.isWellFormed(i.getId()));
            }
        });
        assertFalse(seen.isEmpty());
    }

    @Test
    void everyIdentifiedKindHasAPrefixOfItsOwn() {
        Set<String> prefixes = new HashSet<>();
        for (EClassifier classifier : StructurePackage.eINSTANCE.getEClassifiers()) {
            if (classifier instanceof EClass kind && !kind.isAbstract() && StructurePackage.Literals.IDENTIFIED.isSuperTypeOf(kind)) {
                assertTrue(prefixes.add(Ids.prefix(kind)), kind.getName());
                assertFalse(Ids.prefix(kind).equals("x"), kind.getName());
            }
        }
        assertEquals(13, prefixes.size());
    }

    @Test
    void wellFormedIds() {
        for (String good : new String[] {"n1", "_a", "7", "N-1.b", "träger_2"}) {
            assertTrue(Ids.isWellFormed(good), good);
        }
        for (String bad : new String[] {"", " ", "a b", "a:b", "a#b", "/a", ".a", "-a", "a\n", null}) {
            assertFalse(Ids.isWellFormed(bad), bad);
        }
    }

    @Test
    void namesAreNextFreeInTheirKind() {
        StructuralModel model = ModelFile.create("m");
        Fixtures.node(model, 0, 0, 0);
        Fixtures.node(model, 0, 0, 0).setName("N3");
        Names names = new Names(model);
        assertEquals("N2", names.next(StructurePackage.Literals.NODE));
        assertEquals("N4", names.next(StructurePackage.Literals.NODE));
        assertEquals("M1", names.next(StructurePackage.Literals.MEMBER));
        assertFalse(names.isFree(StructurePackage.Literals.NODE, "N3"));
        assertTrue(names.isFree(StructurePackage.Literals.MEMBER, "N3"));
    }

    @Test
    void derivedNamesTellWhereTheyComeFrom() {
        Names names = new Names(ModelFile.create("m"));
        assertEquals("B12.2", names.derived(StructurePackage.Literals.MEMBER, "B12"));
        assertEquals("B12.3", names.derived(StructurePackage.Literals.MEMBER, "B12"));
        assertEquals("M1", names.derived(StructurePackage.Literals.MEMBER, " "));
    }

    @Test
    void sentencesCallObjectsByKindAndName() {
        StructuralModel model = Fixtures.sound();
        assertEquals("member M1", Names.describe(model.getMembers().get(0)));
        assertEquals("rigid floor Deck", Names.describe(model.getRigidFloors().get(0)));
        assertEquals("the tie term of tie Slide", Names.describe(model.getTies().get(0).getTerms().get(0)));
        assertEquals("node n1", Names.describe(named(model.getNodes().get(0), null)));
        assertEquals("the model Pavilion", Names.describe(model));
    }

    private static Node named(Node node, String name) {
        node.setName(name);
        return node;
    }
}
