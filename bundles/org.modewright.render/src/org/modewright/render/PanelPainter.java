package org.modewright.render;

import java.util.Arrays;

/** Draws the triangles of a scene: first those that hide, later those that shine through, farthest first. */
final class PanelPainter {

    private static final double MUTED_SHARE = 0.72;
    private static final double SELECTED_SHARE = 0.55;

    private final Frame frame;
    private final TrianglePlotter plotter;
    private final double[][] corner = new double[3][3];

    PanelPainter(Frame frame, Strip strip) {
        this.frame = frame;
        plotter = new TrianglePlotter(strip);
    }

    void paintOpaque() {
        for (int i = 0; i < frame.scene.triangleCount(); i++) {
            int argb = colour(i);
            if (Argb.alpha(argb) == 255) {
                paint(i, argb);
            }
        }
    }

    void paintTranslucent() {
        int count = 0;
        for (int i = 0; i < frame.scene.triangleCount(); i++) {
            int alpha = Argb.alpha(colour(i));
            count += alpha > 0 && alpha < 255 ? 1 : 0;
        }
        if (count == 0) {
            return;
        }
        long[] order = new long[count];
        int n = 0;
        for (int i = 0; i < frame.scene.triangleCount(); i++) {
            int alpha = Argb.alpha(colour(i));
            if (alpha > 0 && alpha < 255) {
                order[n++] = sortKey(i);
            }
        }
        Arrays.sort(order);
        for (int i = count - 1; i >= 0; i--) {
            int triangle = (int) order[i];
            paint(triangle, colour(triangle));
        }
    }

    /** Depth in the upper half, ordered as a signed number; index in the lower half. */
    private long sortKey(int triangle) {
        float depth = 0;
        for (int k = 0; k < 3; k++) {
            depth += frame.deformed.z[frame.scene.corners[3 * triangle + k]];
        }
        int bits = Float.floatToIntBits(Float.isNaN(depth) ? Float.NEGATIVE_INFINITY : depth);
        int ordered = bits < 0 ? bits ^ 0x7FFFFFFF : bits;
        return (long) ordered << 32 | triangle;
    }

    /** 0 for a hidden triangle. */
    private int colour(int triangle) {
        int marks = frame.scene.marks(PrimitiveKind.TRIANGLE)[triangle];
        if ((marks & Mark.HIDDEN.bit()) != 0) {
            return 0;
        }
        int own = frame.scene.colours(PrimitiveKind.TRIANGLE)[triangle];
        int argb = own != 0 ? own : frame.theme.panel();
        if ((marks & Mark.SELECTED.bit()) != 0) {
            return Argb.mix(argb, frame.theme.selection(), SELECTED_SHARE);
        }
        if ((marks & Mark.HOVERED.bit()) != 0) {
            return Argb.mix(argb, frame.theme.hover(), SELECTED_SHARE);
        }
        return (marks & Mark.MUTED.bit()) != 0 ? Argb.mix(argb, Argb.withAlpha(frame.background, Argb.alpha(argb)), MUTED_SHARE) : argb;
    }

    private void paint(int triangle, int argb) {
        ProjectedScene p = frame.deformed;
        int a = frame.scene.corners[3 * triangle];
        int b = frame.scene.corners[3 * triangle + 1];
        int c = frame.scene.corners[3 * triangle + 2];
        p.world(a, corner[0]);
        p.world(b, corner[1]);
        p.world(c, corner[2]);
        int shaded = shaded(argb);
        if (p.visible(a) && p.visible(b) && p.visible(c)) {
            plotter.triangle(p.x[a], p.y[a], p.z[a], p.x[b], p.y[b], p.z[b], p.x[c], p.y[c], p.z[c], shaded);
            return;
        }
        double[] cut = NearPlane.triangle(p.projection, corner);
        for (int i = 3; i + 5 < cut.length; i += 3) {
            plotter.triangle(cut[0], cut[1], cut[2], cut[i], cut[i + 1], cut[i + 2], cut[i + 3], cut[i + 4], cut[i + 5], shaded);
        }
    }

    private int shaded(int argb) {
        double[] a = corner[0];
        double ux = corner[1][0] - a[0];
        double uy = corner[1][1] - a[1];
        double uz = corner[1][2] - a[2];
        double vx = corner[2][0] - a[0];
        double vy = corner[2][1] - a[1];
        double vz = corner[2][2] - a[2];
        return Light.shade(frame.projection, argb, uy * vz - uz * vy, uz * vx - ux * vz, ux * vy - uy * vx);
    }
}
