package org.modewright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Path;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.modewright.fem.Snapshot;
import org.modewright.modal.Direction;
import org.modewright.modal.ModalRequest;
import org.modewright.modal.ModalResult;
import org.modewright.modal.ModalRun;
import org.modewright.modal.Mode;
import org.modewright.numerics.Progress;

/** The same structure in each of the six unit systems has the same frequencies and the same masses. */
class UnitSystemsTest {

    @TempDir
    Path temporary;

    private int count;

    /**
     * The factors are exact: international foot 0.3048 m, inch 0.0254 m, pound-force 4.4482216152605 N (NIST Special Publication 811;
     * from memory).
     */
    @ParameterizedTest
    @CsvSource({"N-m-kg, 1, 1", "kN-m-t, 1, 1000", "N-mm-t, 0.001, 1", "kip-ft, 0.3048, 4448.2216152605", "kip-in, 0.0254, 4448.2216152605",
        "lbf-in, 0.0254, 4.4482216152605"})
    void frequenciesAndMassesAreTheSame(String units, double length, double force) throws IOException {
        ModalResult expected = modes("N-m-kg", 1, 1, "");
        ModalResult actual = modes(units, length, force, "");
        for (int i = 0; i < expected.modes().size(); i++) {
            // conversion rounds each number once or twice: some 1e-15; stiffness sums amplify that by their condition, below 1e5 here
            Mode mode = expected.modes().get(i);
            assertEquals(mode.frequency(), actual.modes().get(i).frequency(), 1e-10 * mode.frequency());
            assertEquals(mode.effectiveMassShare(Direction.X), actual.modes().get(i).effectiveMassShare(Direction.X), 1e-9);
        }
        for (int i = 0; i < 3; i++) {
            assertEquals(expected.mass().movable()[i], actual.mass().movable()[i], 1e-10 * expected.mass().movable()[i]);
            assertEquals(expected.mass().centre()[i], actual.mass().centre()[i], 1e-10 * 5);
        }
    }

    @Test
    void gravityIsInThePackagesOwnLengthUnit() throws IOException {
        ModalResult standard = modes("N-mm-t", 0.001, 1, "");
        ModalResult given = modes("N-mm-t", 0.001, 1, ", \"gravity\": 9806.65");
        ModalResult half = modes("N-mm-t", 0.001, 1, ", \"gravity\": 4903.325");
        assertEquals(standard.mass().movable()[0], given.mass().movable()[0], 1e-9);
        double loads = 12_000 * 4 / 9.80665;
        assertEquals(standard.mass().movable()[0] + loads, half.mass().movable()[0], 1e-6);
    }

    /** A portal given in SI, written with every number in the unit system of these factors to metre and newton. */
    private ModalResult modes(String units, double length, double force, String settings) throws IOException {
        double mass = force / length;
        double stress = force / (length * length);
        double density = mass / Math.pow(length, 3);
        double area = length * length;
        double second = area * area;
        PackageFixture fixture = new PackageFixture()
                .put("nodes.csv", table("id,x,y,z\n", "A", 0., 0., 0., "B", 0., 0., 3 / length, "C", 4 / length, 0., 3 / length, "D",
                        4 / length, 0., 0.))
                .put("materials.csv", "id,young,poisson,density\nsteel," + 210e9 / stress + ",0.3," + 7850 / density + "\n")
                .put("frame_sections.csv", "id,area,iy,iz,torsion,shear_area_z\nS," + 0.01 / area + "," + 1e-4 / second + ","
                        + 5e-5 / second + "," + 1e-6 / second + "," + 0.004 / area + "\n")
                .put("members.csv", "id,start,end,section,material,axial_force\nM1,A,B,S,steel," + -1e5 / force
                        + "\nM2,B,C,S,steel,\nM3,D,C,S,steel,\n")
                .put("supports.csv", "node,ux,uy,uz,rx,ry,rz\nA,1,1,1,1,1,1\nD,1,1,1,1,1,1\n")
                .put("masses.csv", "node,ux,uy,uz,rx\nB," + 500 / mass + "," + 500 / mass + "," + 500 / mass + "," + 20 / (mass * area)
                        + "\n")
                .put("springs.csv", "id,node,ux,ry\nK," + "C," + 2e5 / (force / length) + "," + 3e5 / (force * length) + "\n")
                .put("gravity_loads.csv", "pattern,kind,target,value\ndead,member,M2," + 12_000 / (force / length) + "\n")
                .put("mass_rule.csv", "pattern,factor\ndead,1\n")
                .remove("rigid_floors.csv").remove("rigid_links.csv").remove("levels.csv").describe()
                .replace("datapackage.json", "\"kN-m-t\"", "\"" + units + "\"" + settings);
        Path folder = temporary.resolve("p" + count++);
        return ModalRun.run(Snapshot.of(TablePackage.read(fixture.folder(folder)).model()), ModalRequest.ofModes(6), Progress.NONE);
    }

    private static String table(String header, Object... cells) {
        StringBuilder text = new StringBuilder(header);
        for (int i = 0; i < cells.length; i++) {
            text.append(cells[i]).append(i % 4 == 3 ? '\n' : ',');
        }
        return text.toString();
    }
}
