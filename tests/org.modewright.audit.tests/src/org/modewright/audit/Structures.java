package org.modewright.audit;

import org.modewright.fem.Snapshot;
import org.modewright.testmodels.NamedStructure;

/** Builds small structures for tests, in N, m and kg. */
final class Structures extends NamedStructure<Structures> {

    private static final int NODES_A_LEVEL = 9;
    private static final int MIDDLE = 4;

    Structures(String name) {
        super(name);
    }

    /** A chain of masses (kg) on springs (N/m) along X from the ground, the nodes one above the other; nothing else can move. */
    static Structures chain(double[] masses, double[] stiffnesses) {
        return new Structures("chain").storeys(masses, stiffnesses);
    }

    /**
     * A frame building of 2 by 2 bays with rigid floors, stiffest round the perimeter, so that it sways before it twists; node
     * {@code n<level><0..8>}, columns {@code c}, beams {@code x} and {@code y}.
     */
    static Structures building(int storeys) {
        Structures building = new Structures("building").material("concrete", 3e10, 0.2, 2500);
        for (int level = 0; level <= storeys; level++) {
            for (int i = 0; i < NODES_A_LEVEL; i++) {
                String name = "n" + level + i;
                building.node(name, (i % 3) * 6.0, (i / 3) * 5.0, 3.5 * level);
                if (level == 0) {
                    building.support(name, "ux uy uz rx ry rz");
                } else {
                    building.column(level, i);
                }
            }
        }
        building.section("beam", 0.18, 5e-3, 2e-3, 2e-3);
        for (int level = 1; level <= storeys; level++) {
            building.floorOf(level);
        }
        return building;
    }

    private void column(int level, int i) {
        String name = "n" + level + i;
        boolean corner = i != MIDDLE && i % 2 == 0;
        section("column " + name, corner ? 0.25 : 0.09, corner ? 5e-3 : 7e-4, corner ? 8e-3 : 7e-4, corner ? 9e-3 : 1e-3);
        double horizontal = i == MIDDLE ? 24000 : 9000;
        with("c" + level + i, "n" + (level - 1) + i, name).mass(name, horizontal, horizontal, 9000);
    }

    private void floorOf(int level) {
        String[] names = new String[NODES_A_LEVEL];
        for (int i = 0; i < NODES_A_LEVEL; i++) {
            names[i] = "n" + level + i;
            if (i % 3 < 2) {
                with("x" + level + i, names[i], "n" + level + (i + 1));
            }
            if (i < 6) {
                with("y" + level + i, names[i], "n" + level + (i + 3));
            }
        }
        floor("floor " + level, names);
    }

    @Override
    protected Structures self() {
        return this;
    }

    Snapshot snapshot() {
        return Snapshot.of(model());
    }
}
