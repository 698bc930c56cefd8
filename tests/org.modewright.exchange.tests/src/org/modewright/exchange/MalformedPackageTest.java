package org.modewright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Every fault of a package is named with its file, row, column and value. */
class MalformedPackageTest {

    @TempDir
    Path temporary;

    private static Arguments fault(String file, String old, String replacement, int row, String column, String value, String text) {
        return Arguments.of(file, old, replacement, row, column, value, text);
    }

    static Stream<Arguments> faults() {
        return Stream.of(
                fault("nodes.csv", "N3,4", "N3,four", 4, "x", "four", "not a number"),
                fault("nodes.csv", "N3,4", "N3,NaN", 4, "x", "NaN", "not finite"),
                fault("nodes.csv", "N3,4", "N3,-Infinity", 4, "x", "-Infinity", "not finite"),
                fault("nodes.csv", "N3,4", "N3,1e999", 4, "x", "1e999", "not finite"),
                fault("nodes.csv", "N3,4", "N3,\"4,5\"", 4, "x", "4,5", "decimal point"),
                fault("nodes.csv", "N3,4", "N3,0x10", 4, "x", "0x10", "not a number"),
                fault("nodes.csv", "N3,4", "N3,4 m", 4, "x", "4 m", "not a number"),
                fault("nodes.csv", "N3,4", "N3,", 4, "x", "", "blank"),
                fault("nodes.csv", "N3,4", "N2,4", 4, "id", "N2", "there twice"),
                fault("nodes.csv", "N4,4,0,0", "N4,4,0,0,7", 5, "5", "7", "more cells than the header"),
                fault("nodes.csv", "id,x,y,z", "id,x,y", 1, "z", "", "column is missing"),
                fault("nodes.csv", "id,x,y,z", "id,x,y,z,x", 1, "x", "x", "there twice"),
                fault("nodes.csv", "N4,4,0,0", "\"N4,4,0,0", 5, "", "", "not closed"),
                fault("materials.csv", "210e6", "0", 2, "young", "0", "greater than 0"),
                fault("materials.csv", "210e6", "-210e6", 2, "young", "-210e6", "greater than 0"),
                fault("materials.csv", "0.3", "-0.1", 2, "poisson", "-0.1", "0 or more"),
                fault("materials.csv", "0.3", "0.5", 2, "poisson", "0.5", "below 0.5"),
                fault("materials.csv", "7.85,", "0,", 2, "density", "0", "greater than 0"),
                fault("materials.csv", "7.85,", "7.85,0", 2, "shear", "0", "greater than 0"),
                fault("frame_sections.csv", "0.01,", "-0.01,", 2, "area", "-0.01", "greater than 0"),
                fault("frame_sections.csv", "1e-4", "0", 2, "iy", "0", "greater than 0"),
                fault("frame_sections.csv", "1e-6", "0", 2, "torsion", "0", "greater than 0"),
                fault("frame_sections.csv", "0.004", "-0.004", 2, "shear_area_z", "-0.004", "0 or more"),
                fault("members.csv", "M1,N1", "M1,N9", 2, "start", "N9", "no node"),
                fault("members.csv", "M1,N1", "M1,", 2, "start", "", "blank"),
                fault("members.csv", "M1,N1", "M1,N2", 2, "end", "N2", "node at which it starts"),
                fault("members.csv", "N2,C,steel", "N2,D,steel", 2, "section", "D", "no frame section"),
                fault("members.csv", "N2,C,steel", "N2,C,stone", 2, "material", "stone", "no material"),
                fault("members.csv", "M2,", "M1,", 3, "id", "M1", "there twice"),
                fault("members.csv", "ry rz", "ry my", 3, "end_free", "ry my", "\"my\" is no component"),
                fault("members.csv", "ry rz", "ry ry", 3, "end_free", "ry ry", "there twice"),
                fault("members.csv", "0.1,0.2", "-0.1,0.2", 3, "start_rigid", "-0.1", "0 or more"),
                fault("members.csv", "0.1,0.2", "3.9,0.2", 3, "start_rigid", "3.9", "whole member"),
                fault("members.csv", "-12.5", "inf", 3, "axial_force", "inf", "not finite"),
                fault("members.csv", ",1,,columns", ",yes,,columns", 4, "axial_only", "yes", "1 or 0"),
                fault("supports.csv", "N4,1", "N1,1", 3, "node", "N1", "has a support already"),
                fault("supports.csv", "N4,1", "N5,1", 3, "node", "N5", "no node"),
                fault("supports.csv", "N4,1", "N4,2", 3, "ux", "2", "1 or 0"),
                fault("supports.csv", "N4,1", "N4,x", 3, "ux", "x", "1 or 0"),
                fault("masses.csv", "N2,5", "N2,-5", 2, "ux", "-5", "0 or more"),
                fault("masses.csv", "N2,5", "N7,5", 2, "node", "N7", "no node"),
                fault("springs.csv", "100", "-100", 2, "ux", "-100", "0 or more"),
                fault("springs.csv", "S1,N2,N3", "S1,N2,N2", 2, "to", "N2", "to itself"),
                fault("springs.csv", "S1,N2,N3", "S1,N2,N8", 2, "to", "N8", "no node"),
                fault("springs.csv", "S2", "S1", 3, "id", "S1", "there twice"),
                fault("rigid_floors.csv", "\nF1,N3", "", 2, "floor", "F1", "two or more nodes"),
                fault("rigid_floors.csv", "F1,N3", "F1,N33", 3, "node", "N33", "no node"),
                fault("rigid_links.csv", "L1,N2,N3", "L1,N2,N2", 2, "to", "N2", "to itself"),
                fault("rigid_links.csv", "ux uy", "ux,uy", 2, "5", "uy", "more cells than the header"),
                fault("levels.csv", "first,3", "fi\u0007rst,3", 2, "id", "fi\u0007rst", "control character"),
                fault("datapackage.json", "A portal", "A\\u0007portal", 0, "title", "A\u0007portal", "control character"),
                fault("levels.csv", "first,3", "first,", 2, "elevation", "", "blank"),
                fault("gravity_loads.csv", "dead,member,M2", "dead,member,M9", 2, "target", "M9", "no member"),
                fault("gravity_loads.csv", "dead,member,M2", "dead,panel,P1", 2, "kind", "panel", "not yet supported"),
                fault("gravity_loads.csv", "dead,member,M2", "dead,beam,M2", 2, "kind", "beam", "not known"),
                fault("gravity_loads.csv", "dead,member,M2", "self,member,M2", 2, "pattern", "self", "own mass"),
                fault("gravity_loads.csv", "N3,40", "N3,-4e9", 3, "value", "-4e9", "negative mass"),
                fault("mass_rule.csv", "live,0.3", "live,-0.3", 4, "factor", "-0.3", "0 or more"),
                fault("mass_rule.csv", "live,0.3", "dead,0.3", 4, "pattern", "dead", "already"),
                fault("datapackage.json", "\"kN-m-t\"", "\"kN-m-kg\"", 0, "structure/units", "kN-m-kg", "N-mm-t"),
                fault("datapackage.json", "\"kN-m-t\"", "\"kN-m-t\", \"gravity\": -1", 0, "structure/gravity", "-1", "positive"),
                fault("datapackage.json", "\"kN-m-t\"", "\"kN-m-t\", \"massMatrix\": \"thick\"", 0, "structure/massMatrix", "thick",
                        "lumped"),
                fault("datapackage.json", "\"kN-m-t\"", "\"kN-m-t\", \"shearDeformation\": \"no\"", 0, "structure/shearDeformation", "no",
                        "true or false"),
                fault("datapackage.json", "\"version\": 1", "\"version\": 2", 0, "structure/version", "2", "version 1"),
                fault("datapackage.json", "\"nodes.csv\"", "\"../nodes.csv\"", 0, "resources/0/path", "../nodes.csv", "leaves the package"),
                fault("datapackage.json", "\"nodes.csv\"", "\"/etc/hosts\"", 0, "resources/0/path", "/etc/hosts", "leaves the package"),
                fault("datapackage.json", "\"nodes.csv\"", "\"file:nodes.csv\"", 0, "resources/0/path", "file:nodes.csv",
                        "leaves the package"),
                fault("datapackage.json", "\"nodes.csv\"", "\"C:\\\\nodes.csv\"", 0, "resources/0/path", "C:\\nodes.csv", "backslash"),
                fault("datapackage.json", "\"name\": \"levels\"", "\"name\": \"masses\"", 0, "resources/9/name", "masses", "given twice"),
                fault("datapackage.json", "\"resources\": [", "\"resources\": ]", 3, "15", "", "not valid JSON"));
    }

    @ParameterizedTest(name = "{0}: {1} -> {2}")
    @MethodSource("faults")
    void faultIsNamedWithItsPlace(String file, String old, String replacement, int row, String column, String value, String text)
            throws IOException {
        Path folder = new PackageFixture().replace(file, old, replacement).folder(temporary);
        List<Problem> problems = assertThrows(PackageException.class, () -> TablePackage.read(folder)).problems();
        Problem problem = problems.stream().filter(p -> p.file().equals(file) && p.row() == row && p.column().equals(column)).findFirst()
                .orElseThrow(() -> new AssertionError(problems.toString()));
        assertEquals(value, problem.value());
        assertTrue(problem.text().contains(text), problem.text());
    }

    /** Repeated ids and lost columns are left aside: what they hide is missing elsewhere too. */
    @Test
    void oneFaultIsOneProblem() throws IOException {
        for (Arguments arguments : faults().toList()) {
            Object[] fault = arguments.get();
            boolean others = fault[0].equals("datapackage.json") || fault[4].equals("id") || fault[1].equals("id,x,y,z");
            if (others) {
                continue;
            }
            Path folder = new PackageFixture().replace((String) fault[0], (String) fault[1], (String) fault[2])
                    .folder(Files.createTempDirectory(temporary, "p"));
            PackageException exception = assertThrows(PackageException.class, () -> TablePackage.read(folder));
            assertEquals(1, exception.total(), exception.getMessage());
        }
    }

    @Test
    void everyFaultOfThePackageComesInOneGo() throws IOException {
        Path folder = new PackageFixture().replace("nodes.csv", "N3,4", "N3,x").replace("materials.csv", "7.85", "-1")
                .replace("supports.csv", "N4,1", "N9,5").replace("datapackage.json", "kN-m-t", "parsec").folder(temporary);
        PackageException exception = assertThrows(PackageException.class, () -> TablePackage.read(folder));
        assertEquals(List.of("datapackage.json", "nodes.csv", "materials.csv", "supports.csv", "supports.csv"),
                exception.problems().stream().map(Problem::file).toList(), exception.getMessage());
        assertTrue(exception.getMessage().contains("nodes.csv, row 4, column x, value \"x\": this is not a number"),
                exception.getMessage());
    }

    @Test
    void aHundredProblemsAreKeptAndTheRestCounted() throws IOException {
        StringBuilder nodes = new StringBuilder("id,x,y,z\n");
        IntStream.range(0, 250).forEach(i -> nodes.append("K").append(i).append(",a,0,0\n"));
        Path folder = new PackageFixture().put("nodes.csv", nodes.toString()).folder(temporary);
        PackageException exception = assertThrows(PackageException.class, () -> TablePackage.read(folder));
        assertEquals(100, exception.problems().size());
        assertTrue(exception.total() > 250);
        assertTrue(exception.getMessage().endsWith("more)"));
    }

    @Test
    void aMissingFileIsOneProblemWithoutItsConsequences() throws IOException {
        Path folder = new PackageFixture().remove("nodes.csv").folder(temporary);
        PackageException exception = assertThrows(PackageException.class, () -> TablePackage.read(folder));
        assertEquals(1, exception.total(), exception.getMessage());
        assertEquals("nodes.csv", exception.problems().get(0).file());
    }

    @Test
    void aPackageWithoutNodesOrDescriptionIsRefused() throws IOException {
        Path folder = new PackageFixture().remove("datapackage.json").folder(Files.createDirectory(temporary.resolve("a")));
        assertEquals("datapackage.json", only(folder).file());
        Path other = Files.createDirectory(temporary.resolve("b"));
        Files.writeString(other.resolve("datapackage.json"), "{\"structure\": {\"units\": \"N-m-kg\"}, \"resources\": []}");
        assertTrue(only(other).text().contains("nodes is missing"));
        assertTrue(only(temporary.resolve("nowhere")).text().contains("no such file"));
    }

    @Test
    void otherDelimitersGiveOneClearProblem() throws IOException {
        for (String delimiter : List.of(";", "\t", "|")) {
            Path folder = new PackageFixture().put("nodes.csv", "id,x,y,z\nN1,0,0,0\n".replace(",", delimiter))
                    .folder(Files.createTempDirectory(temporary, "d"));
            Problem problem = only(folder);
            assertEquals(1, problem.row());
            assertTrue(problem.text().contains("separate them by commas"), problem.text());
        }
    }

    @Test
    void otherEncodingsAreRefused() throws IOException {
        Path folder = new PackageFixture().folder(temporary);
        Files.write(folder.resolve("levels.csv"), "id,elevation\nétage,3\n".getBytes(StandardCharsets.ISO_8859_1));
        assertTrue(only(folder).text().contains("not UTF-8"));
        Files.write(folder.resolve("levels.csv"), "id,elevation\nF,3\n".getBytes(StandardCharsets.UTF_16));
        assertTrue(only(folder).text().contains("not UTF-8"));
    }

    @Test
    void panelsAreNamedAsNotYetSupported() throws IOException {
        Path folder = new PackageFixture().put("panels.csv", "id,n1,n2,n3,n4,section,material,group\nP1,N1,N2,N3,,T,steel,\n")
                .put("plate_sections.csv", "id,thickness\nT,0.2\n").describe().folder(temporary);
        PackageException exception = assertThrows(PackageException.class, () -> TablePackage.read(folder));
        assertEquals(2, exception.total());
        exception.problems().forEach(problem -> assertTrue(problem.text().contains("not yet supported"), problem.text()));
        Path empty = new PackageFixture().put("panels.csv", "id,n1,n2,n3,section,material\n").describe()
                .folder(Files.createDirectory(temporary.resolve("empty")));
        assertEquals(List.of(), TablePackage.read(empty).warnings());
    }

    @Test
    void floorsMustBeCoplanar() throws IOException {
        PackageFixture fixture = new PackageFixture().put("rigid_floors.csv", "floor,node\nF1,N1\nF1,N2\nF1,N3\nF1,N5\n");
        Path folder = fixture.replace("nodes.csv", "N4,4,0,0", "N4,4,0,0\nN5,4,1e-3,0").folder(temporary);
        Problem problem = only(folder);
        assertEquals("rigid_floors.csv", problem.file());
        assertEquals("node", problem.column());
        assertTrue(problem.text().contains("not coplanar"), problem.text());
        // within 1e-6 of the floor's size of 5 m
        Path near = fixture.replace("nodes.csv", "1e-3", "1e-6").folder(Files.createDirectory(temporary.resolve("near")));
        assertEquals(List.of(), TablePackage.read(near).warnings());
    }

    @Test
    void zeroIsAllowedWhereTheConventionsSaySo() throws IOException {
        PackageFixture fixture = new PackageFixture().replace("materials.csv", "0.3", "0").replace("frame_sections.csv", ",,0.004", ",0,0")
                .replace("masses.csv", "N2,5,5,5", "N2,0,0,0").replace("springs.csv", "100", "0")
                        .replace("mass_rule.csv", "self,0.5", "self,0");
        assertEquals(0, TablePackage.read(fixture.folder(temporary)).model().getSelfMassFactor());
    }

    private static Problem only(Path location) {
        PackageException exception = assertThrows(PackageException.class, () -> TablePackage.read(location));
        assertEquals(1, exception.total(), exception.getMessage());
        return exception.problems().get(0);
    }
}
