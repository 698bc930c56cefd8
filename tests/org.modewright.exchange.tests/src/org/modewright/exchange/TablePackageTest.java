package org.modewright.exchange;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.modewright.model.Ids;
import org.modewright.model.ModelFile;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.MassFormulation;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.MemberMass;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.UnitSystem;
import org.modewright.model.structure.Vector;

/** What a sound package becomes, and that nothing is lost on the way in and out. */
class TablePackageTest {

    private static final StructureFactory FACTORY = StructureFactory.eINSTANCE;

    @TempDir
    Path temporary;

    @Test
    void everyCellArrives() throws IOException {
        Imported imported = TablePackage.read(new PackageFixture().folder(temporary));
        StructuralModel model = imported.model();
        assertEquals(List.of(), imported.warnings());
        assertEquals("portal", model.getName());
        assertEquals("A portal", model.getTitle());
        assertEquals("kN-m-t", model.getUnits().getLiteral());
        assertEquals(0, model.getGravity());
        assertEquals(MassFormulation.CONSISTENT, model.getMassFormulation());
        assertTrue(model.isShearDeformation());
        assertEquals(List.of("N1", "N2", "N3", "N4"), model.getNodes().stream().map(Node::getName).toList());
        assertEquals(4, model.getNodes().get(2).getX());
        assertEquals(210e6, model.getMaterials().get(0).getYoung());
        assertEquals(0, model.getMaterials().get(0).getShear());
        assertEquals(0.004, model.getFrameSections().get(0).getShearAreaZ());
        Member beam = model.getMembers().get(1);
        assertSame(model.getNodes().get(1), beam.getStart());
        assertEquals(90, beam.getRoll());
        assertEquals(List.of(Component.RY, Component.RZ), beam.getEndFree());
        assertEquals(0.1, beam.getStartRigid());
        assertEquals(0.2, beam.getEndRigid());
        assertEquals(-12.5, beam.getAxialForce());
        assertFalse(beam.isAxialOnly());
        assertTrue(model.getMembers().get(2).isAxialOnly());
        assertEquals("beams", beam.getGroup().getName());
        assertSame(model.getMembers().get(0).getGroup(), model.getMembers().get(2).getGroup());
        assertEquals(List.of("columns", "beams", "dampers"), model.getGroups().stream().map(group -> group.getName()).toList());
        assertSame(model.getNodes().get(2), model.getSprings().get(0).getTo());
        assertNull(model.getSprings().get(1).getTo());
        assertEquals(50, model.getSprings().get(1).getUy());
        assertTrue(model.getSupports().get(1).isUz());
        assertFalse(model.getSupports().get(1).isRy());
        assertEquals(2, model.getMasses().size());
        assertEquals(0.5, model.getMasses().get(1).getRx());
        assertEquals(2, model.getRigidFloors().get(0).getNodes().size());
        assertEquals(List.of(Component.UX, Component.UY), model.getRigidLinks().get(0).getComponents());
        assertEquals(3, model.getLevels().get(0).getElevation());
        assertEquals(0.5, model.getSelfMassFactor());
        assertEquals(0.3, model.getLoadPatterns().get(1).getMassFactor());
        assertSame(beam, ((MemberLoad) model.getLoadPatterns().get(0).getLoads().get(0)).getMember());
        assertEquals(40, model.getLoadPatterns().get(1).getLoads().get(0).getValue());
    }

    @Test
    void folderZipAndDescriptionAreTheSame() throws IOException {
        Path folder = new PackageFixture().folder(Files.createDirectory(temporary.resolve("a")));
        byte[] expected = ModelFile.bytes(TablePackage.read(folder).model());
        assertArrayEquals(expected, ModelFile.bytes(TablePackage.read(folder.resolve("datapackage.json")).model()));
        assertArrayEquals(expected, ModelFile.bytes(TablePackage.read(new PackageFixture().zip(temporary.resolve("a.zip"))).model()));
    }

    @Test
    void writtenAgainThePackageIsTheSame() throws IOException {
        StructuralModel model = TablePackage.read(new PackageFixture().folder(Files.createDirectory(temporary.resolve("in")))).model();
        Path first = temporary.resolve("first");
        Path second = temporary.resolve("second");
        assertEquals(List.of(), TablePackage.write(model, first));
        StructuralModel again = TablePackage.read(first).model();
        assertEquals(text(model), text(again));
        assertEquals(List.of(), TablePackage.write(again, second));
        assertEquals(files(first), files(second));
        assertEquals(13, files(first).size());
    }

    @Test
    void zipsOfTheSameModelAreIdentical() throws IOException {
        StructuralModel model = TablePackage.read(new PackageFixture().folder(temporary)).model();
        Path first = temporary.resolve("1.zip");
        Path second = temporary.resolve("2.zip");
        TablePackage.write(model, first);
        TablePackage.write(model, second);
        assertArrayEquals(Files.readAllBytes(first), Files.readAllBytes(second));
        assertEquals(text(model), text(TablePackage.read(first).model()));
    }

    @Test
    void settingsAreKept() throws IOException {
        PackageFixture fixture = new PackageFixture().replace("datapackage.json", "\"kN-m-t\"",
                "\"kip-in\", \"gravity\": 386.4, \"massMatrix\": \"lumped\", \"shearDeformation\": false");
        StructuralModel model = TablePackage.read(fixture.folder(temporary)).model();
        assertEquals(UnitSystem.get("kip-in"), model.getUnits());
        assertEquals(386.4, model.getGravity());
        assertEquals(MassFormulation.LUMPED, model.getMassFormulation());
        assertFalse(model.isShearDeformation());
        Path out = temporary.resolve("out.zip");
        TablePackage.write(model, out);
        assertEquals(text(model), text(TablePackage.read(out).model()));
    }

    @Test
    void blankSettingsTakeTheirDefaults() throws IOException {
        PackageFixture fixture = new PackageFixture().replace("datapackage.json", "\"version\": 1, \"units\": \"kN-m-t\"",
                "\"units\": \"kN-m-t\", \"gravity\": null");
        StructuralModel model = TablePackage.read(fixture.folder(temporary)).model();
        assertEquals(0, model.getGravity());
        assertEquals(1, TablePackage.read(new PackageFixture().remove("mass_rule.csv").describe()
                .folder(Files.createDirectory(temporary.resolve("b")))).model().getSelfMassFactor());
    }

    @Test
    void byteOrderMarkCarriageReturnsQuotesAndBlankLinesAreTolerated() throws IOException {
        PackageFixture fixture = new PackageFixture().put("nodes.csv",
                "\uFEFFid, x ,y,z\r\n\"N1\",0,0,0\r\n N2 ,0,0, 3 \r\n\r\n\"N3\",\"4\",0,3\r\nN4,4,0,0,,\r\n,,,\r\n");
        fixture.put("datapackage.json", "\uFEFF" + Files.readString(new PackageFixture().folder(temporary).resolve("datapackage.json")));
        StructuralModel model = TablePackage.read(fixture.folder(temporary.resolve("b"))).model();
        assertEquals(List.of("N1", "N2", "N3", "N4"), model.getNodes().stream().map(Node::getName).toList());
        assertEquals(3, model.getNodes().get(1).getZ());
    }

    @Test
    void columnsMayComeInAnyOrderAndOptionalOnesMayBeAbsent() throws IOException {
        PackageFixture fixture = new PackageFixture().put("members.csv",
                "material,section,end,start,id\nsteel,C,N2,N1,M1\nsteel,C,N3,N2,M2\n");
        StructuralModel model = TablePackage.read(fixture.folder(temporary)).model();
        assertEquals("N2", model.getMembers().get(0).getEnd().getName());
        assertNull(model.getMembers().get(0).getGroup());
    }

    @Test
    void unknownColumnsResourcesAndFilesAreNamedInWarnings() throws IOException {
        PackageFixture fixture = new PackageFixture().put("nodes.csv", "id,x,y,z,colour\nN1,0,0,0,red\nN2,0,0,3,\nN3,4,0,3,\nN4,4,0,0,\n")
                .put("weather.csv", "a\n1\n").describe().put("stray.csv", "x\n")
                        .replace("datapackage.json", "\"version\": 1", "\"version\": 1, \"soil\": 2");
        List<String> warnings = TablePackage.read(fixture.folder(temporary)).warnings();
        assertTrue(warnings.contains("nodes.csv: the column colour is not known and was ignored"), warnings.toString());
        assertTrue(warnings.contains("datapackage.json: the resource weather is not known and was ignored"), warnings.toString());
        assertTrue(warnings.contains("datapackage.json: the property structure/soil is not known and was ignored"), warnings.toString());
        assertTrue(warnings.stream().anyMatch(warning -> warning.startsWith("stray.csv: ")), warnings.toString());
    }

    @Test
    void numbersKeepEveryDigit() throws IOException {
        StructuralModel model = TablePackage.read(new PackageFixture().folder(temporary)).model();
        double[] values = {0.1, 1.0 / 3.0, Math.PI * 1e-7, -2.5e17, Double.MIN_NORMAL, 1e15, 123456789012345.0};
        Path out = temporary.resolve("out");
        for (double value : values) {
            model.getMembers().get(0).setAxialForce(value);
            TablePackage.write(model, out);
            assertEquals(value, TablePackage.read(out).model().getMembers().get(0).getAxialForce());
        }
    }

    @Test
    void namesThatASpreadsheetMightRunReadBackUnchanged() throws IOException {
        StructuralModel model = TablePackage.read(new PackageFixture().folder(temporary)).model();
        String[] names = {"=SUM(A1)", "+plus", "-minus", "@at", "'=quoted", "''@twice", "'plain", "-5", "a,b", "say \"hi\"", "two\nlines",
                "Ünïcödé"};
        Path out = temporary.resolve("out");
        for (String name : names) {
            model.getNodes().get(0).setName(name);
            model.getSupports().get(0).setName(name);
            assertEquals(List.of(), TablePackage.write(model, out));
            assertEquals(name, TablePackage.read(out).model().getNodes().get(0).getName());
        }
        model.getNodes().get(0).setName("=cmd");
        TablePackage.write(model, out);
        assertTrue(Files.readString(out.resolve("nodes.csv")).contains("\r\n'=cmd,"));
        model.getNodes().get(0).setName("-5");
        TablePackage.write(model, out);
        assertTrue(Files.readString(out.resolve("nodes.csv")).contains("\r\n-5,"));
    }

    @Test
    void whatAPackageCannotHoldIsNamed() throws IOException {
        StructuralModel model = TablePackage.read(new PackageFixture().folder(temporary)).model();
        Vector offset = FACTORY.createVector();
        offset.setZ(0.2);
        model.getMembers().get(0).setStartOffset(offset);
        model.getMembers().get(1).setBendingYFactor(0.5);
        model.getMembers().get(2).setMass(MemberMass.LUMPED);
        SpringCoupling coupling = FACTORY.createSpringCoupling();
        coupling.setSecond(Component.RY);
        coupling.setStiffness(1);
        model.getSprings().get(0).setRy(100);
        model.getSprings().get(0).getCouplings().add(coupling);
        model.getMasses().get(0).setOffset(FACTORY.createVector());
        model.getMasses().get(0).getOffset().setX(1);
        MultiPointTie tie = FACTORY.createMultiPointTie();
        tie.setName("T1");
        tie.getTerms().add(FACTORY.createTieTerm());
        tie.getTerms().get(0).setNode(model.getNodes().get(2));
        model.getTies().add(tie);
        Support elastic = model.getSupports().get(1);
        elastic.setElasticRy(750);
        model.getGroups().get(0).setDescription("all columns");
        model.getGroups().add(FACTORY.createGroup());
        model.getGroups().get(3).setName("nobody");
        model.getAnalysis().setModes(7);
        Ids.assignMissing(model);
        Path out = temporary.resolve("out");
        String warnings = String.join("\n", TablePackage.write(model, out));
        for (String expected : List.of("Offsets of members are not part of a table package and were left out: M1.", "were left out: M2.",
                "the one of the model was written: M3.", "Couplings of springs are not part of a table package and were left out: S1.",
                "springs to ground: N4.", "put at their nodes: N2.",
                        "Multi-point ties are not part of a table package and were left out: T1.",
                "Groups without elements are not part of a table package and were left out: nobody.", "left out: columns.",
                "The settings of the analysis are not part of a table package")) {
            assertTrue(warnings.contains(expected), expected + " in " + warnings);
        }
        StructuralModel again = TablePackage.read(out).model();
        assertEquals(750, again.getSprings().get(2).getRy());
        assertEquals("support N4", again.getSprings().get(2).getName());
    }

    @Test
    void aModelWithErrorsIsNotWritten() throws IOException {
        StructuralModel model = TablePackage.read(new PackageFixture().folder(temporary)).model();
        model.getMaterials().get(0).setYoung(-1);
        Path out = temporary.resolve("out");
        assertThrows(PackageException.class, () -> TablePackage.write(model, out));
        assertFalse(Files.exists(out));
    }

    @Test
    void thereIsOneWayToReadAnyModel() throws IOException {
        StructuralModel model = ModelSource.read(new PackageFixture().folder(temporary));
        Path file = temporary.resolve("portal.modewright");
        ModelFile.save(model, file);
        assertEquals(text(model), text(ModelSource.read(file)));
        assertThrows(IOException.class, () -> ModelSource.read(temporary.resolve("missing.modewright")));
    }

    private static String text(StructuralModel model) throws IOException {
        return new String(ModelFile.bytes(model), StandardCharsets.UTF_8);
    }

    private static Map<String, String> files(Path folder) throws IOException {
        Map<String, String> files = new TreeMap<>();
        try (Stream<Path> list = Files.list(folder)) {
            for (Path file : list.toList()) {
                files.put(file.getFileName().toString(), Files.readString(file));
            }
        }
        return files;
    }
}
