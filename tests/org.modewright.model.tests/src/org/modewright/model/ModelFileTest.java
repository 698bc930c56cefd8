package org.modewright.model;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Iterator;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;

import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EClassifier;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.resource.Resource;
import org.eclipse.emf.ecore.resource.ResourceSet;
import org.eclipse.emf.ecore.resource.impl.ResourceSetImpl;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.UnitSystem;

class ModelFileTest {

    @TempDir
    Path folder;

    @Test
    void fixtureSetsEveryFeatureOfEveryClass() {
        Set<String> unset = new TreeSet<>();
        for (EClassifier classifier : StructurePackage.eINSTANCE.getEClassifiers()) {
            if (classifier instanceof EClass kind && !kind.isAbstract()) {
                kind.getEAllStructuralFeatures().forEach(f -> unset.add(kind.getName() + "." + f.getName()));
            }
        }
        for (Iterator<EObject> all = EcoreUtil.getAllContents(List.of(Fixtures.everyFeatureSet())); all.hasNext();) {
            EObject object = all.next();
            for (EStructuralFeature feature : object.eClass().getEAllStructuralFeatures()) {
                if (object.eIsSet(feature)) {
                    unset.remove(object.eClass().getName() + "." + feature.getName());
                }
            }
        }
        unset.remove("StructuralModel.formatVersion");
        assertEquals(Set.of(), unset);
    }

    @Test
    void everyFeatureComesBack() throws IOException {
        StructuralModel model = Fixtures.everyFeatureSet();
        Path file = folder.resolve("all.modewright");
        ModelFile.save(model, file);
        StructuralModel loaded = ModelFile.load(file);
        assertTrue(EcoreUtil.equals(model, loaded));
        assertArrayEquals(Files.readAllBytes(file), ModelFile.bytes(loaded));
    }

    @Test
    void defaultsComeBack() throws IOException {
        StructuralModel model = StructureFactory.eINSTANCE.createStructuralModel();
        Path file = folder.resolve("empty.modewright");
        ModelFile.save(model, file);
        StructuralModel loaded = ModelFile.load(file);
        assertTrue(EcoreUtil.equals(model, loaded));
        assertNull(loaded.getAnalysis());
    }

    @Test
    void numbersComeBackToTheLastBit() throws IOException {
        StructuralModel model = ModelFile.create("Numbers");
        double[] values = {Math.PI, 1.0 / 3, Double.MIN_VALUE, Double.MAX_VALUE, -1e-300, 0.1 + 0.2, Double.NaN, Double.NEGATIVE_INFINITY};
        for (double value : values) {
            Fixtures.node(model, value, 0, 0);
        }
        Ids.assignMissing(model);
        StructuralModel loaded = ModelFile.load(new ByteArrayInputStream(ModelFile.bytes(model)), "numbers");
        assertArrayEquals(values, loaded.getNodes().stream().mapToDouble(Node::getX).toArray());
    }

    @Test
    void fileStatesVersionAndUnitsEvenWhereTheyAreDefaults() throws IOException {
        String text = text(ModelFile.create("Hut"));
        assertTrue(text.startsWith("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<structure:StructuralModel "), text);
        assertTrue(text.contains(" formatVersion=\"1\""), text);
        assertTrue(text.contains(" units=\"kN-m-t\""), text);
        assertTrue(text.endsWith("</structure:StructuralModel>\n"), text);
        assertFalse(text.contains("\r"), text);
    }

    @Test
    void oneChangeIsOneLine() throws IOException {
        StructuralModel model = Fixtures.sound();
        List<String> before = text(model).lines().toList();
        model.getNodes().get(2).setX(4.25);
        List<String> after = text(model).lines().toList();
        assertEquals(before.size(), after.size());
        assertEquals(1, differences(before, after));
        assertEquals("  <nodes id=\"n3\" name=\"N3\" x=\"4.25\" y=\"4.0\"/>", after.stream().filter(l -> l.contains("\"n3\" ")).findFirst()
                .orElseThrow());
    }

    private static int differences(List<String> a, List<String> b) {
        int count = 0;
        for (int i = 0; i < a.size(); i++) {
            count += a.get(i).equals(b.get(i)) ? 0 : 1;
        }
        return count;
    }

    @Test
    void bytesAndHashDependOnContentAlone() throws IOException {
        StructuralModel model = Fixtures.sound();
        Path one = folder.resolve("one.modewright");
        Path two = folder.resolve("two.modewright");
        ModelFile.save(model, one);
        ModelFile.save(ModelFile.load(one), two);
        assertArrayEquals(Files.readAllBytes(one), Files.readAllBytes(two));
        assertEquals(Snapshots.sha256(Files.readAllBytes(one)), Snapshots.sha256(model));
        assertEquals(Snapshots.sha256(model), Snapshots.sha256(Snapshots.copy(model)));
        StructuralModel changed = Snapshots.copy(model);
        changed.getNodes().get(0).setZ(1e-9);
        assertNotEquals(Snapshots.sha256(model), Snapshots.sha256(changed));
        assertEquals(64, Snapshots.sha256(model).length());
    }

    @Test
    void writingDoesNotTakeTheModelOutOfItsPlace() throws IOException {
        StructuralModel model = Fixtures.sound();
        Resource elsewhere = new StructureResource(URI.createURI("elsewhere.modewright"));
        elsewhere.getContents().add(model);
        ModelFile.save(model, folder.resolve("copy.modewright"));
        assertSame(elsewhere, model.eResource());
        elsewhere.getContents().clear();
        ModelFile.bytes(model);
        assertNull(model.eResource());
    }

    @Test
    void savingGivesIdsThatStay() throws IOException {
        StructuralModel model = ModelFile.create("Ids");
        Node node = Fixtures.node(model, 0, 0, 0);
        Path file = folder.resolve("ids.modewright");
        ModelFile.save(model, file);
        assertEquals("n1", node.getId());
        node.setName("Renamed");
        ModelFile.save(model, file);
        assertEquals("n1", ModelFile.load(file).getNodes().get(0).getId());
    }

    @Test
    void resourceOfAnEditorWritesTheSameBytes() throws IOException {
        Path file = folder.resolve("edited.modewright");
        ModelFile.save(Fixtures.sound(), file);
        ResourceSet resources = new ResourceSetImpl();
        resources.getResourceFactoryRegistry().getExtensionToFactoryMap().put(ModelFile.EXTENSION, new StructureResourceFactory());
        Resource resource = resources.getResource(URI.createFileURI(file.toString()), true);
        byte[] before = Files.readAllBytes(file);
        resource.save(null);
        assertArrayEquals(before, Files.readAllBytes(file));
        ((StructuralModel) resource.getContents().get(0)).getNodes().get(0).setX(0.125);
        resource.save(null);
        assertEquals(0.125, ModelFile.load(file).getNodes().get(0).getX());
        assertEquals(List.of("edited.modewright"), names());
    }

    @Test
    void objectsAreFoundByTheirIds() throws IOException {
        Path file = folder.resolve("find.modewright");
        ModelFile.save(Fixtures.sound(), file);
        StructuralModel model = ModelFile.load(file);
        assertSame(model.getMembers().get(3), model.eResource().getEObject(model.getMembers().get(3).getId()));
    }

    @Test
    void aModelThatCannotBeWrittenLeavesTheOldFile() throws IOException {
        Path file = folder.resolve("kept.modewright");
        StructuralModel model = Fixtures.sound();
        ModelFile.save(model, file);
        byte[] before = Files.readAllBytes(file);

        model.getMembers().get(0).setStart(StructureFactory.eINSTANCE.createNode());
        ModelFileException dangling = assertThrows(ModelFileException.class, () -> ModelFile.save(model, file));
        assertTrue(dangling.getMessage().contains("The start of member M1"), dangling.getMessage());
        assertArrayEquals(before, Files.readAllBytes(file));

        model.getMembers().get(0).setStart(model.getNodes().get(0));
        model.setNotes("bell \u0007");
        ModelFileException control = assertThrows(ModelFileException.class, () -> ModelFile.save(model, file));
        assertTrue(control.getMessage().contains("U+0007"), control.getMessage());
        assertArrayEquals(before, Files.readAllBytes(file));

        model.setNotes(null);
        model.getNodes().get(1).setId(model.getNodes().get(0).getId());
        assertThrows(ModelFileException.class, () -> ModelFile.save(model, file));
        assertArrayEquals(before, Files.readAllBytes(file));
        assertEquals(List.of("kept.modewright"), names());
    }

    @Test
    void aFolderThatIsNotThereIsSaid() {
        Path file = folder.resolve("missing").resolve("a.modewright");
        ModelFileException e = assertThrows(ModelFileException.class, () -> ModelFile.save(Fixtures.sound(), file));
        assertTrue(e.getMessage().startsWith(file + ": The file cannot be written (no such file or folder)."), e.getMessage());
    }

    @Test
    void aTargetThatCannotBeReplacedStaysAndNothingIsLeftBehind() throws IOException {
        Path target = Files.createDirectory(folder.resolve("taken.modewright"));
        Files.writeString(target.resolve("content"), "in the way");
        assertThrows(ModelFileException.class, () -> ModelFile.save(Fixtures.sound(), target));
        assertEquals("in the way", Files.readString(target.resolve("content")));
        assertEquals(List.of("taken.modewright"), names());
    }

    /** Most file systems take names of 255 bytes. */
    @Test
    void longNamesCanBeSaved() throws IOException {
        Path file = folder.resolve("a".repeat(255 - 11) + ".modewright");
        ModelFile.save(ModelFile.create("long"), file);
        assertEquals("long", ModelFile.load(file).getName());
    }

    @Test
    void aFloorOfManyNodesKeepsTheirOrder() throws IOException {
        StructuralModel model = ModelFile.create("Slab");
        RigidFloor floor = Fixtures.FACTORY.createRigidFloor();
        floor.setName("Slab");
        for (int i = 0; i < 5000; i++) {
            floor.getNodes().add(0, Fixtures.node(model, i, 0, 0));
        }
        model.getRigidFloors().add(floor);
        Ids.assignMissing(model);
        StructuralModel loaded = ModelFile.load(new ByteArrayInputStream(ModelFile.bytes(model)), "slab");
        assertTrue(EcoreUtil.equals(model, loaded));
        assertEquals(4999, loaded.getRigidFloors().get(0).getNodes().get(0).getX());
    }

    @Test
    void permissionsAndLinksSurvive() throws IOException {
        Path real = folder.resolve("real.modewright");
        ModelFile.save(ModelFile.create("first"), real);
        Files.setPosixFilePermissions(real, PosixFilePermissions.fromString("rw-rw-r--"));
        Path link = Files.createSymbolicLink(folder.resolve("link.modewright"), real.getFileName());
        ModelFile.save(ModelFile.create("second"), link);
        assertTrue(Files.isSymbolicLink(link));
        assertEquals("second", ModelFile.load(real).getName());
        assertEquals("rw-rw-r--", PosixFilePermissions.toString(Files.getPosixFilePermissions(real)));
    }

    @Test
    void aFileThatIsNotThereIsSaid() {
        ModelFileException e = assertThrows(ModelFileException.class, () -> ModelFile.load(folder.resolve("none.modewright")));
        assertTrue(e.getMessage().contains("none.modewright: The file cannot be read (no such file or folder)."), e.getMessage());
    }

    @Test
    void aLargeModelComesBackWhole() throws IOException {
        StructuralModel model = ModelFile.create("Lattice");
        Fixtures.material(model, "Steel");
        Fixtures.section(model, "Strut");
        Node previous = Fixtures.node(model, 0, 0, 0);
        for (int i = 1; i <= 100_000; i++) {
            Node next = Fixtures.node(model, i, i % 7, i % 11);
            Fixtures.member(model, previous, next);
            previous = next;
        }
        Path file = folder.resolve("lattice.modewright");
        ModelFile.save(model, file);
        StructuralModel loaded = ModelFile.load(file);
        assertEquals(100_000, loaded.getMembers().size());
        assertSame(loaded.getNodes().get(77_777), loaded.getMembers().get(77_777).getStart());
        assertSame(loaded.getNodes().get(77_778), loaded.getMembers().get(77_777).getEnd());
    }

    @Test
    void unitsDefaultIsKilonewtonMetre() {
        assertEquals(UnitSystem.KILONEWTON_METRE, ModelFile.create("x").getUnits());
    }

    private List<String> names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(p -> p.getFileName().toString()).sorted().toList();
        }
    }

    private static String text(StructuralModel model) throws IOException {
        return new String(ModelFile.bytes(model), StandardCharsets.UTF_8);
    }
}
