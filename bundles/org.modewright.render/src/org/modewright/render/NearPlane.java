package org.modewright.render;

import java.util.Arrays;

/** Cuts what reaches behind the viewer; needed in perspective only. */
final class NearPlane {

    private final double[] a = new double[3];
    private final double[] b = new double[3];
    private final double[] screenA = new double[3];
    private final double[] screenB = new double[3];

    /**
     * Draws the visible part of the edge between two vertices of which at least one is behind the near plane.
     */
    void line(ProjectedScene projected, int v0, int v1, LinePlotter lines, double width, int argb) {
        if (!projected.visible(v0) && !projected.visible(v1)) {
            return;
        }
        Projection p = projected.projection;
        projected.world(v0, a);
        projected.world(v1, b);
        if (projected.visible(v0)) {
            cut(p, b, a);
        } else {
            cut(p, a, b);
        }
        if (p.project(a[0], a[1], a[2], screenA) && p.project(b[0], b[1], b[2], screenB)) {
            lines.line(screenA[0], screenA[1], (float) screenA[2], screenB[0], screenB[1], (float) screenB[2], width, argb);
        }
    }

    /** Moves the hidden point along the edge onto the near plane (a hair before it, so that it is seen). */
    private static void cut(Projection p, double[] hidden, double[] seen) {
        double wHidden = p.w(hidden[0], hidden[1], hidden[2]);
        double wSeen = p.w(seen[0], seen[1], seen[2]);
        double limit = Math.min(wSeen, p.nearest() * (1 + 1e-9));
        double t = wSeen > wHidden ? (limit - wHidden) / (wSeen - wHidden) : 1;
        for (int k = 0; k < 3; k++) {
            hidden[k] += t * (seen[k] - hidden[k]);
        }
    }

    /** Cuts a triangle given by its world corners; answers the corners of what is left, projected, three numbers each. */
    static double[] triangle(Projection p, double[][] corner) {
        double[] result = new double[12];
        int count = 0;
        double[] screen = new double[3];
        for (int i = 0; i < 3; i++) {
            double[] here = corner[i];
            double[] next = corner[(i + 1) % 3];
            boolean seen = p.project(here[0], here[1], here[2], screen);
            if (seen) {
                System.arraycopy(screen, 0, result, 3 * count++, 3);
            }
            boolean nextSeen = p.w(next[0], next[1], next[2]) >= p.nearest();
            if (seen != nextSeen) {
                double[] cut = seen ? next.clone() : here.clone();
                cut(p, cut, seen ? here : next);
                if (p.project(cut[0], cut[1], cut[2], screen)) {
                    System.arraycopy(screen, 0, result, 3 * count++, 3);
                }
            }
        }
        return Arrays.copyOf(result, 3 * count);
    }
}
