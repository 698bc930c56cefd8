package org.modewright.render;

/**
 * Draws a member with the outer sizes of its section: a box that follows the bent and twisted axis, flat shaded by a light at the viewer's
 * upper left, with its edges traced so that its outline is smooth.
 */
final class SectionPainter {

    private static final double[] SIDE_Y = {1, -1, -1, 1};
    private static final double[] SIDE_Z = {1, 1, -1, -1};
    private static final double EDGE_SHADE = 0.55;
    private static final double EDGE_BIAS = 2.5;
    private static final double EDGE_PIXELS = 1.1;
    private static final double OUTLINE_PIXELS = 2.6;

    private final Frame frame;
    private final LinePlotter lines;
    private final TrianglePlotter triangles;
    private final double[] normal = new double[3];
    private double[] world = new double[0];
    private double[] screen = new double[0];
    private int stations;

    SectionPainter(Frame frame, Strip strip) {
        this.frame = frame;
        lines = new LinePlotter(strip);
        triangles = new TrianglePlotter(strip);
    }

    /**
     * @param outline colour of the edges, 0 for a darker shade of the member's own
     * @return false if the member reaches behind the viewer and was not drawn
     */
    boolean paint(int member, int argb, int outline) {
        int segments = frame.scene.segments[member];
        if (!place(member, segments)) {
            return false;
        }
        int edge = outline != 0 ? outline : Argb.shade(argb, EDGE_SHADE);
        double width = frame.pixels(outline != 0 ? OUTLINE_PIXELS : EDGE_PIXELS);
        int[] vertexColours = frame.scene.vertexColours();
        int first = frame.scene.firstVertex[member];
        boolean startSeen = quad(3, 2, 1, 0, argb);
        int e = 4 * segments;
        boolean endSeen = quad(e, e + 1, e + 2, e + 3, argb);
        for (int i = 0; i < segments; i++) {
            int fill = vertexColours != null && vertexColours[first + i] != 0 ? vertexColours[first + i] : argb;
            body(4 * i, fill, edge, width, startSeen && i == 0, endSeen && i == segments - 1);
        }
        return true;
    }

    private void body(int base, int argb, int edge, double width, boolean startSeen, boolean endSeen) {
        boolean previous = facing(base + 3, base, base + 4, base + 7);
        for (int c = 0; c < 4; c++) {
            int n = (c + 1) % 4;
            boolean seen = quad(base + c, base + n, base + 4 + n, base + 4 + c, argb);
            if (seen || previous) {
                edge(base + c, base + 4 + c, edge, width);
            }
            if (base == 0 && (seen || startSeen)) {
                edge(base + c, base + n, edge, width);
            }
            if (base + 8 == 4 * stations && (seen || endSeen)) {
                edge(base + 4 + c, base + 4 + n, edge, width);
            }
            previous = seen;
        }
    }

    private boolean place(int member, int segments) {
        stations = segments + 1;
        if (world.length < 12 * stations) {
            world = new double[12 * stations];
            screen = new double[12 * stations];
        }
        int first = frame.scene.firstVertex[member];
        double[] before = new double[3];
        double[] here = new double[3];
        double[] after = new double[3];
        for (int i = 0; i < stations; i++) {
            frame.deformed.world(first + Math.max(0, i - 1), before);
            frame.deformed.world(first + i, here);
            frame.deformed.world(first + Math.min(segments, i + 1), after);
            if (!station(member, i, before, here, after, frame.deformed.twist(first + i))) {
                return false;
            }
        }
        return true;
    }

    private boolean station(int member, int i, double[] before, double[] here, double[] after, double twist) {
        double[] x = unit(after[0] - before[0], after[1] - before[1], after[2] - before[2]);
        float[] axis = frame.scene.axisY;
        double along = axis[3 * member] * x[0] + axis[3 * member + 1] * x[1] + axis[3 * member + 2] * x[2];
        double[] y0 = unit(axis[3 * member] - along * x[0], axis[3 * member + 1] - along * x[1], axis[3 * member + 2] - along * x[2]);
        double[] z0 = cross(x, y0);
        double cos = Math.cos(twist);
        double sin = Math.sin(twist);
        double halfY = frame.scene.sizeY[member] / 2;
        double halfZ = frame.scene.sizeZ[member] / 2;
        double[] out = new double[3];
        for (int c = 0; c < 4; c++) {
            double y = SIDE_Y[c] * halfY * cos - SIDE_Z[c] * halfZ * sin;
            double z = SIDE_Y[c] * halfY * sin + SIDE_Z[c] * halfZ * cos;
            int at = 12 * i + 3 * c;
            for (int k = 0; k < 3; k++) {
                world[at + k] = here[k] + y * y0[k] + z * z0[k];
            }
            if (!frame.projection.project(world[at], world[at + 1], world[at + 2], out)) {
                return false;
            }
            System.arraycopy(out, 0, screen, at, 3);
        }
        return true;
    }

    private boolean facing(int a, int b, int c, int d) {
        double ux = screen[3 * c] - screen[3 * a];
        double uy = screen[3 * c + 1] - screen[3 * a + 1];
        double vx = screen[3 * d] - screen[3 * b];
        double vy = screen[3 * d + 1] - screen[3 * b + 1];
        return ux * vy - uy * vx < 0;
    }

    private boolean quad(int a, int b, int c, int d, int argb) {
        if (!facing(a, b, c, d)) {
            return false;
        }
        for (int k = 0; k < 3; k++) {
            int k1 = (k + 1) % 3;
            int k2 = (k + 2) % 3;
            normal[k] = (world[3 * c + k1] - world[3 * a + k1]) * (world[3 * d + k2] - world[3 * b + k2])
                - (world[3 * c + k2] - world[3 * a + k2]) * (world[3 * d + k1] - world[3 * b + k1]);
        }
        int shaded = Light.shade(frame.projection, argb, normal[0], normal[1], normal[2]);
        triangle(a, b, c, shaded);
        triangle(a, c, d, shaded);
        return true;
    }

    private void triangle(int a, int b, int c, int argb) {
        triangles.triangle(screen[3 * a], screen[3 * a + 1], screen[3 * a + 2], screen[3 * b], screen[3 * b + 1], screen[3 * b + 2],
            screen[3 * c], screen[3 * c + 1], screen[3 * c + 2], argb);
    }

    private void edge(int a, int b, int argb, double width) {
        lines.line(screen[3 * a], screen[3 * a + 1], frame.nearer((float) screen[3 * a + 2], EDGE_BIAS), screen[3 * b], screen[3 * b + 1],
            frame.nearer((float) screen[3 * b + 2], EDGE_BIAS), width, argb);
    }

    private static double[] unit(double x, double y, double z) {
        double length = Math.sqrt(x * x + y * y + z * z);
        return length > 0 ? new double[] {x / length, y / length, z / length} : new double[] {0, 0, 1};
    }

    private static double[] cross(double[] a, double[] b) {
        return new double[] {a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]};
    }
}
