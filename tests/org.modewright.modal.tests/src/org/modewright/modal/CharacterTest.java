package org.modewright.modal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.modewright.fem.Kind;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.Member;
import org.modewright.numerics.Progress;

/** Modes in plain words. */
class CharacterTest {

    /**
     * A frame building of so many bays in X and Y and storeys, columns bending in X with one second moment and in Y with another, floors
     * rigid and loaded.
     */
    static Structures building(int storeys, double iy, double iz) {
        Structures s = new Structures("building").material("concrete", 3e10, 0.2, 2500).section("column", 0.16, iy, iz, 1e-3);
        for (int level = 0; level <= storeys; level++) {
            for (int i = 0; i < 9; i++) {
                String name = "n" + level + i;
                s.node(name, (i % 3) * 6.0, (i / 3) * 5.0, 3.5 * level);
                if (level == 0) {
                    s.support(name, "ux uy uz rx ry rz");
                } else {
                    s.with("c" + level + i, "n" + (level - 1) + i, name).mass(name, 9000, 9000, 9000, 0, 0, 0);
                }
            }
        }
        s.section("beam", 0.18, 5e-3, 2e-3, 2e-3);
        for (int level = 1; level <= storeys; level++) {
            String[] names = new String[9];
            for (int i = 0; i < 9; i++) {
                names[i] = "n" + level + i;
                if (i % 3 < 2) {
                    s.with("x" + level + i, names[i], "n" + level + (i + 1));
                }
                if (i < 6) {
                    s.with("y" + level + i, names[i], "n" + level + (i + 3));
                }
            }
            s.floor("floor " + level, names);
        }
        return s;
    }

    private static String text(ModalResult result, int mode) {
        return result.modes().get(mode - 1).character().text();
    }

    @Test
    void regularBuildingSwaysAndTwists() {
        ModalResult result = building(4, 2e-3, 4e-3).modes(9);
        assertEquals("sway X", text(result, 1));
        assertEquals(Character.Kind.SWAY_X, result.modes().get(0).character().kind());
        assertEquals("torsion", text(result, 2));
        assertEquals("sway Y", text(result, 3));
        assertTrue(result.modes().get(1).effectiveMassShare(Direction.RZ) > 0.7);
    }

    /** High modes of a tall building have small effective masses and are sway all the same. */
    @Test
    void highModesAreSwayToo() {
        ModalResult result = building(8, 2e-3, 4e-3).modes(9);
        for (Mode mode : result.modes()) {
            assertTrue(mode.character().text().matches("sway X|sway Y|torsion"), mode.number() + " " + mode.character().text());
        }
        assertTrue(result.modes().get(7).effectiveMassShare(Direction.X) < 0.05);
    }

    @Test
    void eccentricMassCouplesSwayAndTorsion() {
        Structures s = building(3, 2e-3, 6e-3);
        for (int level = 1; level <= 3; level++) {
            s.mass("n" + level + "6", 60000, 60000, 60000, 0, 0, 0);
        }
        ModalResult result = s.modes(3);
        assertTrue(result.modes().stream().anyMatch(mode -> mode.character().text().matches("sway .* with torsion|torsion with sway .*")),
                result.modes().stream().map(mode -> mode.character().text()).toList().toString());
    }

    /** A single post turned in plan by 34 degrees bends about its own axes. */
    @Test
    void swayAtAnAngle() {
        Structures s = new Structures("post").material("steel", 2.1e11, 0.3, 7850).section("post", 0.01, 2e-5, 9e-5, 1e-5);
        s.node("foot", 0, 0, 0).support("foot", "ux uy uz rx ry rz").node("top", 0, 0, 5).mass("top", 3000, 3000, 3000, 0, 0, 0);
        s.member("post", "foot", "top").setRoll(34);
        ModalResult result = s.modes(2);
        assertEquals("sway at 34° to X", text(result, 1));
        assertEquals("sway at \u221256° to X", text(result, 2));
        assertEquals(Character.Kind.SWAY, result.modes().get(0).character().kind());
    }

    @Test
    void floorBeamMovesVertically() {
        Structures s = new Structures("beam").material("steel", 2.1e11, 0.3, 7850).section("beam", 0.01, 2e-5, 9e-5, 1e-5);
        s.node("a", 0, 0, 0).support("a", "ux uy uz rx").node("m", 4, 0, 0).node("b", 8, 0, 0).support("b", "uy uz").with("am", "a", "m")
                .with("mb", "m", "b");
        assertEquals("vertical", text(s.modes(1), 1));
    }

    private static Structures withMast() {
        Structures s = building(4, 2e-3, 4e-3).section("pole", 0.002, 1e-6, 1e-6, 2e-6);
        Group mast = s.group("roof mast");
        s.node("m1", 6, 5, 16.5).node("m2", 6, 5, 19).node("m3", 6, 5, 21.5);
        String below = "n44";
        for (int i = 1; i <= 3; i++) {
            Member pole = s.member("pole " + i, below, "m" + i);
            pole.setGroup(mast);
            below = "m" + i;
        }
        return s;
    }

    @Test
    void mastMakesLocalModes() {
        ModalResult result = withMast().modes(12);
        long local = result.modes().stream().filter(Mode::isLocal).count();
        assertTrue(local >= 2, "" + local);
        for (Mode mode : result.modes()) {
            if (mode.isLocal()) {
                assertTrue(mode.character().text().matches("local: [1-3] members? of group roof mast"), mode.character().text());
                assertTrue(mode.spread() < 3.5);
            }
        }
        assertTrue(building(4, 2e-3, 4e-3).modes(12).modes().stream().noneMatch(Mode::isLocal));
    }

    /** The share of nodes below which a mode may be local is the user's to set. */
    @Test
    void limitOfLocalModesCanBeSet() {
        ModalRequest strict = new ModalRequest(12, 0, null, 500, 1, CharacterRules.withLocalNodes(1e-3));
        ModalResult result = ModalRun.run(withMast().snapshot(), strict, Progress.NONE);
        assertTrue(result.modes().stream().noneMatch(Mode::isLocal));
    }

    @Test
    void localModeWithoutGroupNamesItsMembers() {
        Structures s = withMast();
        s.model().getMembers().forEach(member -> member.setGroup(null));
        ModalResult result = s.modes(12);
        Mode local = result.modes().stream().filter(Mode::isLocal).findFirst().orElseThrow();
        assertTrue(local.character().text().startsWith("local: member pole 1"), local.character().text());
    }

    /** Masses in a row at one height: what moves as one is sway, what does not is said so. */
    @Test
    void massesInARow() {
        Structures s = new Structures("row").node("0", 0, 0, 0).support("0", "ux uy uz rx ry rz");
        for (int i = 1; i <= 3; i++) {
            s.node("" + i, i, 0, 0).support("" + i, "uy uz rx ry rz").mass("" + i, 1, 0, 0, 0, 0, 0)
                    .spring("s" + i, "" + (i - 1), "" + i, 1, 0, 0, 0, 0, 0);
        }
        ModalResult result = s.allModes();
        assertEquals("sway X", text(result, 1));
        assertEquals("in X, parts against each other", text(result, 3));
    }

    /** Split of the kinetic energy of a single mass that moves in X and turns. */
    @Test
    void splitOfTheKineticEnergy() {
        Structures s = new Structures("block").node("base", 0, 0, 0).support("base", "uy uz rx rz").mass("base", 3, 0, 0, 0, 5, 0)
                .spring("x", "base", null, 10, 0, 0, 0, 0, 0).spring("turn", "base", null, 0, 0, 0, 0, 900, 0);
        ModalResult result = s.allModes();
        assertEquals(1, result.modes().get(0).split()[0], 1e-12);
        assertEquals(1, result.modes().get(1).split()[3], 1e-12);
        assertEquals("mixed: 100 % rotation", text(result, 2));
        assertTrue(result.carriers().stream().anyMatch(carrier -> carrier.kind() == Kind.NODE));
    }
}
