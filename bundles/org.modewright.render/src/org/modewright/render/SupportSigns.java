package org.modewright.render;

/** Small solids under a supported node: a block (held), a pyramid (pinned), a pyramid above a plate (guided), a zigzag (spring). */
final class SupportSigns {

    private static final double[][] PYRAMID = {
        {0, 0, 0}, {-0.5, -0.5, -0.85}, {0.5, -0.5, -0.85}, {0.5, 0.5, -0.85}, {-0.5, 0.5, -0.85}};
    private static final int[][] PYRAMID_FACES = {{0, 1, 2}, {0, 2, 3}, {0, 3, 4}, {0, 4, 1}, {1, 2, 3, 4}};
    private static final int[][] BOX_FACES = {{0, 1, 2, 3}, {4, 5, 6, 7}, {0, 1, 5, 4}, {1, 2, 6, 5}, {2, 3, 7, 6}, {3, 0, 4, 7}};
    private static final double[][] BLOCK = box(0.5, 0, -0.5);
    private static final double[][] PLATE = box(0.55, -0.98, -1.1);
    private static final double[][] ZIGZAG = {
        {0, 0, 0}, {0, 0, -0.15}, {-0.3, 0, -0.25}, {0.3, 0, -0.42}, {-0.3, 0, -0.59}, {0.3, 0, -0.76}, {0, 0, -0.86}, {0, 0, -1}};
    private static final double EDGE_SHADE = 0.62;

    private final Frame frame;
    private final LinePlotter lines;
    private final TrianglePlotter triangles;
    private final double[] node = new double[3];
    private final double[][] screen = new double[8][3];
    private final double[][] world = new double[8][3];

    SupportSigns(Frame frame, Strip strip) {
        this.frame = frame;
        lines = new LinePlotter(strip);
        triangles = new TrianglePlotter(strip);
    }

    void paint(MarkerShape shape, int vertex, double length, int argb) {
        frame.deformed.world(vertex, node);
        switch (shape) {
            case HELD -> solid(BLOCK, BOX_FACES, length, argb);
            case PINNED -> solid(PYRAMID, PYRAMID_FACES, length, argb);
            case GUIDED -> {
                solid(PYRAMID, PYRAMID_FACES, length, argb);
                solid(PLATE, BOX_FACES, length, argb);
            }
            case SPRING -> zigzag(length, argb);
            default -> throw new IllegalArgumentException(shape + " is no support.");
        }
    }

    private void zigzag(double length, int argb) {
        if (!place(ZIGZAG, length)) {
            return;
        }
        for (int i = 0; i + 1 < ZIGZAG.length; i++) {
            edge(i, i + 1, frame.pixels(1.5), argb);
        }
        if (place(PLATE, length)) {
            solid(PLATE, BOX_FACES, length, argb);
        }
    }

    private void solid(double[][] corners, int[][] faces, double length, int argb) {
        if (!place(corners, length)) {
            return;
        }
        for (int[] face : faces) {
            int shaded = shaded(face, argb);
            for (int i = 1; i + 1 < face.length; i++) {
                triangle(face[0], face[i], face[i + 1], shaded);
            }
        }
        int edge = Argb.shade(argb, EDGE_SHADE);
        for (int[] face : faces) {
            for (int i = 0; i < face.length; i++) {
                edge(face[i], face[(i + 1) % face.length], frame.pixels(0.9), edge);
            }
        }
    }

    private boolean place(double[][] corners, double length) {
        for (int i = 0; i < corners.length; i++) {
            for (int k = 0; k < 3; k++) {
                world[i][k] = node[k] + length * corners[i][k];
            }
            if (!frame.projection.project(world[i][0], world[i][1], world[i][2], screen[i])) {
                return false;
            }
        }
        return true;
    }

    private int shaded(int[] face, int argb) {
        double[] a = world[face[0]];
        double[] b = world[face[1]];
        double[] c = world[face[2]];
        double[] n = new double[3];
        for (int k = 0; k < 3; k++) {
            int i = (k + 1) % 3;
            int j = (k + 2) % 3;
            n[k] = (b[i] - a[i]) * (c[j] - a[j]) - (b[j] - a[j]) * (c[i] - a[i]);
        }
        return Light.shade(frame.projection, argb, n[0], n[1], n[2]);
    }

    private void triangle(int a, int b, int c, int argb) {
        triangles.triangle(screen[a][0], screen[a][1], screen[a][2], screen[b][0], screen[b][1], screen[b][2], screen[c][0], screen[c][1],
            screen[c][2], argb);
    }

    private void edge(int a, int b, double width, int argb) {
        lines.line(screen[a][0], screen[a][1], frame.nearer((float) screen[a][2], 0.7), screen[b][0], screen[b][1],
            frame.nearer((float) screen[b][2], 0.7), width, argb);
    }

    private static double[][] box(double half, double top, double bottom) {
        return new double[][] {
            {-half, -half, top}, {half, -half, top}, {half, half, top}, {-half, half, top},
            {-half, -half, bottom}, {half, -half, bottom}, {half, half, bottom}, {-half, half, bottom}};
    }
}
