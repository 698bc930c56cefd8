package org.modewright.exchange.samples;

import java.util.ArrayList;
import java.util.List;

import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;

/**
 * The demonstration model: an irregular five-storey steel frame of an invented place, with an L-shaped plan, a set-back at the fourth
 * floor, braces, a lattice mast on the roof and an entrance canopy whose corner was meant to hang on the building and was not joined.
 */
final class DemoModel {

    private static final double[] LINES_X = {0, 6, 12, 18, 24, 30};
    private static final double[] LINES_Y = {0, 5.5, 12, 17.5};
    private static final double[] HEIGHTS = {0, 4.2, 7.8, 11.4, 15, 18.6};
    private static final double[] COLUMN_FORCES = {0, -1050, -820, -600, -390, -190};
    private static final int STOREYS = 5;
    private static final int FIRST_SETBACK_FLOOR = 4;

    private static final double SLAB = 4.2;
    private static final double LIVE = 3;
    private static final double CLADDING = 3.6;
    private static final double ARCHIVE = 7.5;

    private final ModelBuilder builder = new ModelBuilder("quay-house", "Quay House, Port Veldrin", "kN-m-t", """
            Demonstration model; place and project are invented. Five-storey steel frame of offices with composite slabs: L-shaped plan, \
            set-back at floor 4, braces along X in two lines, along Y in line A and, below the archive \
            on floor 1, in three lines more; a lattice mast on the roof and an entrance canopy in the inner corner. Seismic mass: own mass \
            and dead load, cladding, 0.3 of the live load, 0.8 of the archive. The corner of the \
            canopy was meant to hang on the building: the audit finds that it does not.""");
    private final Material steel = builder.material("S355 steel", 210e6, 0.3, 7.85);
    private final FrameSection column = builder.iSection("column I 360x360", 0.36, 0.36, 0.014, 0.024);
    private final FrameSection upperColumn = builder.iSection("column I 300x300", 0.3, 0.3, 0.011, 0.019);
    private final FrameSection girder = builder.iSection("girder I 450x190", 0.45, 0.19, 0.0095, 0.0145);
    private final FrameSection beam = builder.iSection("beam I 360x170", 0.36, 0.17, 0.008, 0.0125);
    private final FrameSection secondary = builder.iSection("secondary I 300x150", 0.3, 0.15, 0.007, 0.0105);
    private final FrameSection braceX = builder.tube("brace tube 193.7x8", 0.1937, 0.008);
    private final FrameSection braceY = builder.tube("brace tube 168.3x6.3", 0.1683, 0.0063);
    private final FrameSection braceGround = builder.tube("brace tube 273x12.5", 0.273, 0.0125);
    private final FrameSection mastLeg = builder.tube("mast leg tube 60.3x4", 0.0603, 0.004);
    private final FrameSection mastLattice = builder.tube("mast lattice tube 33.7x3", 0.0337, 0.003);
    private final FrameSection canopyPost = builder.tube("canopy post tube 88.9x5", 0.0889, 0.005);
    private final FrameSection canopyBeam = builder.iSection("canopy beam I 160x80", 0.16, 0.08, 0.005, 0.0074);

    static StructuralModel create() {
        return new DemoModel().build();
    }

    private StructuralModel build() {
        builder.pattern("dead", 1);
        builder.pattern("cladding", 1);
        builder.pattern("live", 0.3);
        builder.pattern("archive", 0.8);
        builder.level("ground", HEIGHTS[0]);
        for (int floor = 1; floor <= STOREYS; floor++) {
            builder.level("floor " + floor, HEIGHTS[floor]);
        }
        nodes();
        columns();
        for (int floor = 1; floor <= STOREYS; floor++) {
            beamsX(floor);
            beamsY(floor);
            floorPlate(floor);
        }
        braces();
        mast();
        canopy();
        builder.mass(grid(0, 3, STOREYS), 6, 6, 6);
        builder.mass(grid(1, 3, STOREYS), 6, 6, 6);
        return builder.model();
    }

    private static boolean exists(int i, int j, int floor) {
        boolean inPlan = i >= 0 && j >= 0 && i < LINES_X.length && j < LINES_Y.length;
        boolean innerCorner = i >= 4 && j >= 2;
        boolean setBack = floor >= FIRST_SETBACK_FLOOR && i >= 4;
        return inPlan && !innerCorner && !setBack;
    }

    private static String letter(int i) {
        return String.valueOf((char) ('A' + i));
    }

    private static String grid(int i, int j, int floor) {
        return letter(i) + (j + 1) + "-" + floor;
    }

    /** The node half way between two lines of X, where a secondary beam meets the girder. */
    private static String middle(int i, int j, int floor) {
        return letter(i) + letter(i + 1) + (j + 1) + "-" + floor;
    }

    private void nodes() {
        for (int floor = 0; floor <= STOREYS; floor++) {
            for (int j = 0; j < LINES_Y.length; j++) {
                for (int i = 0; i < LINES_X.length; i++) {
                    if (exists(i, j, floor)) {
                        builder.node(grid(i, j, floor), LINES_X[i], LINES_Y[j], HEIGHTS[floor]);
                        if (floor > 0 && exists(i + 1, j, floor)) {
                            builder.node(middle(i, j, floor), (LINES_X[i] + LINES_X[i + 1]) / 2, LINES_Y[j], HEIGHTS[floor]);
                        }
                    }
                }
            }
        }
    }

    private void columns() {
        for (int floor = 1; floor <= STOREYS; floor++) {
            for (int j = 0; j < LINES_Y.length; j++) {
                for (int i = 0; i < LINES_X.length; i++) {
                    if (exists(i, j, floor)) {
                        Member member = builder.member("C-" + letter(i) + (j + 1) + "-" + floor, grid(i, j, floor - 1), grid(i, j, floor),
                                floor < FIRST_SETBACK_FLOOR ? column : upperColumn, steel, "columns");
                        member.setAxialForce(COLUMN_FORCES[floor]);
                        member.setRoll((i + j) % 2 == 0 ? 0 : 90);
                        if (floor == 1) {
                            builder.support(grid(i, j, 0), "ux uy uz rx ry rz");
                        }
                    }
                }
            }
        }
    }

    private void beamsX(int floor) {
        for (int j = 0; j < LINES_Y.length; j++) {
            for (int i = 0; i + 1 < LINES_X.length; i++) {
                if (exists(i, j, floor) && exists(i + 1, j, floor)) {
                    String name = "GX-" + letter(i) + letter(i + 1) + (j + 1) + "-" + floor;
                    Member first = builder.member(name + "a", grid(i, j, floor), middle(i, j, floor), girder, steel, "girders X");
                    Member second = builder.member(name + "b", middle(i, j, floor), grid(i + 1, j, floor), girder, steel, "girders X");
                    boolean edge = !bay(i, j, floor) || !bay(i, j - 1, floor);
                    if (edge) {
                        builder.lineLoad("cladding", first, CLADDING);
                        builder.lineLoad("cladding", second, CLADDING);
                    }
                }
            }
        }
    }

    /** Whether there is a slab between lines i and i + 1, j and j + 1. */
    private static boolean bay(int i, int j, int floor) {
        return exists(i, j, floor) && exists(i + 1, j, floor) && exists(i, j + 1, floor) && exists(i + 1, j + 1, floor);
    }

    private void beamsY(int floor) {
        for (int j = 0; j + 1 < LINES_Y.length; j++) {
            for (int i = 0; i < LINES_X.length; i++) {
                if (exists(i, j, floor) && exists(i, j + 1, floor)) {
                    Member member = builder.member("BY-" + letter(i) + (j + 1) + (j + 2) + "-" + floor, grid(i, j, floor),
                            grid(i, j + 1, floor), beam, steel, "beams Y");
                    int bays = (bay(i, j, floor) ? 1 : 0) + (bay(i - 1, j, floor) ? 1 : 0);
                    slab(member, 1.5 * bays, floor);
                    if (bays == 1) {
                        builder.lineLoad("cladding", member, CLADDING);
                    }
                }
                if (bay(i, j, floor)) {
                    secondary(i, j, floor);
                }
            }
        }
    }

    private void secondary(int i, int j, int floor) {
        Member member = builder.member("S-" + letter(i) + letter(i + 1) + (j + 1) + (j + 2) + "-" + floor, middle(i, j, floor),
                middle(i, j + 1, floor), secondary, steel, "secondary beams");
        member.getStartFree().addAll(List.of(Component.RY, Component.RZ));
        member.getEndFree().addAll(List.of(Component.RY, Component.RZ));
        slab(member, 3, floor);
    }

    private void slab(Member member, double width, int floor) {
        builder.lineLoad("dead", member, SLAB * width);
        builder.lineLoad(floor == 1 ? "archive" : "live", member, (floor == 1 ? ARCHIVE : LIVE) * width);
    }

    private void floorPlate(int floor) {
        List<Node> plate = new ArrayList<>();
        for (int j = 0; j < LINES_Y.length; j++) {
            for (int i = 0; i < LINES_X.length; i++) {
                if (exists(i, j, floor)) {
                    plate.add(builder.node(grid(i, j, floor)));
                    if (exists(i + 1, j, floor)) {
                        plate.add(builder.node(middle(i, j, floor)));
                    }
                }
            }
        }
        builder.floor("floor " + floor, plate);
    }

    private void braces() {
        for (int floor = 1; floor <= STOREYS; floor++) {
            chevron(1, 0, floor);
            chevron(1, 3, floor);
            cross(0, 1, floor, floor == 1 ? braceGround : braceY);
        }
        cross(0, 0, 1, braceGround);
        cross(2, 1, 1, braceGround);
        cross(5, 0, 1, braceGround);
    }

    /** Two braces that meet under the middle of a girder along X. */
    private void chevron(int i, int j, int floor) {
        String name = "BRX-" + letter(i) + letter(i + 1) + (j + 1) + "-" + floor;
        builder.bar(name + "a", grid(i, j, floor - 1), middle(i, j, floor), braceX, steel, "braces X");
        builder.bar(name + "b", grid(i + 1, j, floor - 1), middle(i, j, floor), braceX, steel, "braces X");
    }

    /** Two crossing braces along Y. */
    private void cross(int i, int j, int floor, FrameSection section) {
        String name = "BRY-" + letter(i) + (j + 1) + (j + 2) + "-" + floor;
        builder.bar(name + "a", grid(i, j, floor - 1), grid(i, j + 1, floor), section, steel, "braces Y");
        builder.bar(name + "b", grid(i, j + 1, floor - 1), grid(i, j, floor), section, steel, "braces Y");
    }

    private void mast() {
        double half = 0.5;
        double panel = 2;
        int panels = 5;
        double[][] corners = {{-half, -half}, {half, -half}, {half, half}, {-half, half}};
        double x = LINES_X[2];
        double y = LINES_Y[2];
        for (int level = 0; level <= panels; level++) {
            for (int corner = 0; corner < 4; corner++) {
                builder.node(mastNode(level, corner), x + corners[corner][0], y + corners[corner][1], HEIGHTS[STOREYS] + level * panel);
            }
        }
        for (int corner = 0; corner < 4; corner++) {
            builder.link("mast base " + (corner + 1), grid(2, 2, STOREYS), mastNode(0, corner));
            builder.mass(mastNode(panels, corner), 0.12, 0.12, 0.12);
        }
        for (int level = 1; level <= panels; level++) {
            for (int corner = 0; corner < 4; corner++) {
                int next = (corner + 1) % 4;
                String name = "-" + level + (corner + 1);
                builder.member("ML" + name, mastNode(level - 1, corner), mastNode(level, corner), mastLeg, steel, "roof mast");
                builder.member("MH" + name, mastNode(level, corner), mastNode(level, next), mastLattice, steel, "roof mast");
                builder.member("MD" + name, mastNode(level - 1, corner), mastNode(level, next), mastLattice, steel, "roof mast");
            }
            builder.member("MX-" + level, mastNode(level, 0), mastNode(level, 2), mastLattice, steel, "roof mast");
        }
    }

    private static String mastNode(int level, int corner) {
        return "mast-" + level + (corner + 1);
    }

    /** Stands in the inner corner of the plan; K1 was meant to be the node D2-1 of the building, 21 mm away. */
    private void canopy() {
        double top = HEIGHTS[1];
        builder.node("K1", 18.015, 5.515, top);
        builder.node("K2", 22, 6.5, top);
        builder.node("K3", 22.5, 10.5, top);
        builder.node("K4", 18.9, 10, top);
        builder.node("K5", 20.25, 8, top);
        for (String post : List.of("K2", "K3", "K4")) {
            Node head = builder.node(post);
            builder.node(post + "-0", head.getX(), head.getY(), 0);
            builder.support(post + "-0", "ux uy uz rx ry rz");
            builder.member("KP-" + post, post + "-0", post, canopyPost, steel, "entrance canopy");
        }
        String[][] beams = {{"K1", "K2"}, {"K2", "K3"}, {"K3", "K4"}, {"K4", "K1"}, {"K1", "K5"}, {"K2", "K5"}, {"K3", "K5"}, {"K4", "K5"}};
        for (String[] ends : beams) {
            Member member = builder.member("KB-" + ends[0] + ends[1], ends[0], ends[1], canopyBeam, steel, "entrance canopy");
            builder.lineLoad("dead", member, 0.9);
        }
    }
}
