package org.modewright.model.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.net.URL;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;

import org.eclipse.emf.common.notify.Notification;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EClassifier;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.edit.provider.IItemLabelProvider;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.IItemPropertySource;
import org.eclipse.emf.edit.provider.ITreeItemContentProvider;
import org.eclipse.emf.edit.provider.IViewerNotification;
import org.junit.jupiter.api.Test;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.provider.StructureEditPlugin;

class TreeTest {

    private final Workshop shop = new Workshop();

    private ITreeItemContentProvider tree(Object object) {
        return (ITreeItemContentProvider) shop.factory.adapt(object, ITreeItemContentProvider.class);
    }

    private String label(Object object) {
        return ((IItemLabelProvider) shop.factory.adapt(object, IItemLabelProvider.class)).getText(object);
    }

    private CategoryItemProvider nodes() {
        return shop.factory.category(shop.model, StructurePackage.Literals.STRUCTURAL_MODEL__NODES);
    }

    @Test
    void aModelShowsOneCategoryAKindThenTheSettings() {
        List<String> labels = tree(shop.model).getChildren(shop.model).stream().map(this::label).toList();
        assertEquals(List.of("Materials (1)", "Sections (1)", "Groups (1)", "Levels (1)", "Nodes (6)", "Members (4)", "Springs (1)",
                "Supports (2)", "Nodal masses (1)", "Rigid floors (1)", "Rigid links (1)", "Ties (1)", "Gravity patterns (1)",
                "Analysis settings", "Audit settings"), labels);
    }

    @Test
    void parentsAndChildrenAgree() {
        for (Object category : tree(shop.model).getChildren(shop.model)) {
            for (Object child : tree(category).getChildren(category)) {
                assertSame(category, tree(child).getParent(child));
            }
            assertSame(shop.model, tree(category).getParent(category));
            assertEquals(!tree(category).getChildren(category).isEmpty(), tree(category).hasChildren(category));
        }
    }

    @Test
    void everyModelHasCategoriesOfItsOwn() {
        Workshop other = new Workshop();
        assertSame(shop.model, nodes().model());
        CategoryItemProvider foreign = shop.factory.category(other.model, StructurePackage.Literals.STRUCTURAL_MODEL__NODES);
        assertSame(other.model, foreign.model());
        assertSame(shop.model, nodes().model());
    }

    @Test
    void childrenAreTheListItselfAndCannotBeChanged() {
        Collection<?> children = nodes().getChildren(nodes());
        Node fresh = StructureFactory.eINSTANCE.createNode();
        shop.model.getNodes().add(fresh);
        assertTrue(children.contains(fresh));
        assertThrows(UnsupportedOperationException.class, () -> children.remove(fresh));
        assertEquals(List.of(), nodes().getPropertyDescriptors(nodes()));
    }

    @Test
    void viewersHearOfTheCategoryWhenItsListChanges() {
        CategoryItemProvider category = nodes();
        List<Object> refreshed = new ArrayList<>();
        shop.factory.addListener((Notification n) -> refreshed.add(((IViewerNotification) n).getElement()));
        shop.domain.getCommandStack().execute(shop.commands.create(StructureFactory.eINSTANCE.createNode()));
        assertEquals(List.of(category), refreshed);
        assertEquals("Nodes (7)", label(category));
        refreshed.clear();
        shop.model.setTitle("Changed");
        assertEquals(List.of(shop.model), refreshed);
    }

    @Test
    void viewersHearOfAMemberWhenItsEndsChange() {
        tree(shop.member("Left"));
        List<Object> refreshed = new ArrayList<>();
        shop.factory.addListener((Notification n) -> refreshed.add(((IViewerNotification) n).getElement()));
        shop.member("Left").setEnd(shop.node("D"));
        assertEquals(List.of(shop.member("Left")), refreshed);
    }

    @Test
    void labelsTellWhatIsWhere() {
        assertEquals("Gate", label(shop.model));
        assertEquals("Node F  (0.001, 0, 4)", label(shop.node("F")));
        assertEquals("Member Left  (A to C)", label(shop.member("Left")));
        assertEquals("Bar Strut  (A to D)", label(shop.member("Strut")));
        assertEquals("Material Steel", label(shop.model.getMaterials().get(0)));
        assertEquals("Section Profile  (A = 0.01 m²)", label(shop.model.getFrameSections().get(0)));
        assertEquals("Group Posts", label(shop.model.getGroups().get(0)));
        assertEquals("Level Top  (z = 4 m)", label(shop.model.getLevels().get(0)));
        assertEquals("Spring Pad  (C to F)", label(shop.model.getSprings().get(0)));
        assertEquals("Support Base A  (A: ux uz)", label(shop.model.getSupports().get(0)));
        assertEquals("Nodal mass Lamp  (D)", label(shop.model.getMasses().get(0)));
        assertEquals("Rigid floor Deck  (3 nodes)", label(shop.model.getRigidFloors().get(0)));
        assertEquals("Rigid link Arm  (C to E)", label(shop.model.getRigidLinks().get(0)));
        assertEquals("Tie Pair  (2 terms)", label(shop.model.getTies().get(0)));
        assertEquals("Tie term  (1 · uz C)", label(shop.model.getTies().get(0).getTerms().get(0)));
        assertEquals("Gravity pattern Crowd  (mass factor 0.3)", label(shop.model.getLoadPatterns().get(0)));
        assertEquals("Member load  (Beam: 5 kN/m)", label(shop.model.getLoadPatterns().get(0).getLoads().get(0)));
        assertEquals("Node load  (D: 12 kN)", label(shop.model.getLoadPatterns().get(0).getLoads().get(1)));
    }

    @Test
    void labelsOfUnfinishedObjects() {
        assertEquals("Member  (? to ?)", Labels.of(StructureFactory.eINSTANCE.createMember()));
        assertEquals("Node load  (?: 0)", Labels.of(StructureFactory.eINSTANCE.createNodeLoad()));
        shop.model.getSprings().get(0).setTo(null);
        assertEquals("Spring Pad  (C to ground)", label(shop.model.getSprings().get(0)));
        shop.node("A").setX(-2.5e9);
        assertEquals("Node A  (-2.5E9, 0, 0)", label(shop.node("A")));
    }

    @Test
    void everyClassHasItsIconInBothResolutions() throws IOException {
        for (EClassifier classifier : StructurePackage.eINSTANCE.getEClassifiers()) {
            if (classifier instanceof EClass kind && !kind.isAbstract()) {
                assertIcon(kind.getName(), StructureFactory.eINSTANCE.create(kind));
            }
        }
        assertIcon("Bar", shop.member("Strut"));
    }

    private void assertIcon(String name, Object object) throws IOException {
        Object image = ((IItemLabelProvider) shop.factory.adapt(object, IItemLabelProvider.class)).getImage(object);
        URL url = (URL) image;
        assertTrue(url.getPath().endsWith("/" + name + ".png"), url.toString());
        assertEquals(16, pngWidth(url));
        assertEquals(32, pngWidth(new URL(url.toString().replace(".png", "@2x.png"))));
    }

    /** Width in the header chunk of a PNG: bytes 16 to 19, big-endian. */
    private static int pngWidth(URL url) throws IOException {
        try (InputStream in = url.openStream()) {
            byte[] head = in.readNBytes(24);
            return (head[16] & 0xff) << 24 | (head[17] & 0xff) << 16 | (head[18] & 0xff) << 8 | head[19] & 0xff;
        }
    }

    @Test
    void categoriesHaveTheIconOfTheirKind() {
        assertTrue(((URL) nodes().getImage(nodes())).getPath().endsWith("/Node.png"));
    }

    @Test
    void everyFeatureThatCanBeEditedHasALabelAndADescription() {
        for (EClassifier classifier : StructurePackage.eINSTANCE.getEClassifiers()) {
            if (classifier instanceof EClass kind && !kind.isAbstract()) {
                EObject object = StructureFactory.eINSTANCE.create(kind);
                IItemPropertySource source = (IItemPropertySource) shop.factory.adapt(object, IItemPropertySource.class);
                for (IItemPropertyDescriptor descriptor : source.getPropertyDescriptors(object)) {
                    assertFalse(descriptor.getDisplayName(object).isBlank());
                    assertFalse(descriptor.getDescription(object).isBlank());
                    assertFalse(descriptor.getCategory(object).isBlank());
                }
                for (EStructuralFeature feature : kind.getEStructuralFeatures()) {
                    assertNotNull(StructureEditPlugin.INSTANCE.getString("_UI_" + kind.getName() + "_" + feature.getName() + "_feature"));
                }
            }
        }
    }

    @Test
    void propertySheetsCallReferredObjectsByName() {
        IItemPropertySource source = (IItemPropertySource) shop.factory.adapt(shop.member("Left"), IItemPropertySource.class);
        IItemPropertyDescriptor start = source.getPropertyDescriptor(shop.member("Left"), StructurePackage.Literals.MEMBER__START);
        assertEquals("A", start.getLabelProvider(shop.member("Left")).getText(shop.node("A")));
        assertEquals(6, start.getChoiceOfValues(shop.member("Left")).stream().filter(Node.class::isInstance).count());
        IItemPropertyDescriptor id = source.getPropertyDescriptor(shop.member("Left"), StructurePackage.Literals.IDENTIFIED__ID);
        assertFalse(id.canSetProperty(shop.member("Left")));
    }

    @Test
    void categoriesOfferTheirOwnKindAlone() {
        assertEquals(1, nodes().getNewChildDescriptors(nodes(), shop.domain, null).size());
    }
}
