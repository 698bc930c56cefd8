package org.modewright.render;

/** A rectangle on the screen. */
record ScreenBox(double left, double top, double right, double bottom) {

    boolean holds(ProjectedScene p, int v) {
        return p.visible(v) && p.x[v] >= left && p.x[v] <= right && p.y[v] >= top && p.y[v] <= bottom;
    }

    /** Whether the edge between two visible vertices has a point inside (Liang and Barsky's clipping). */
    boolean crosses(ProjectedScene p, int v0, int v1) {
        if (!p.visible(v0) || !p.visible(v1)) {
            return false;
        }
        double dx = p.x[v1] - p.x[v0];
        double dy = p.y[v1] - p.y[v0];
        double[] step = {-dx, dx, -dy, dy};
        double[] room = {p.x[v0] - left, right - p.x[v0], p.y[v0] - top, bottom - p.y[v0]};
        double enter = 0;
        double leave = 1;
        for (int i = 0; i < 4; i++) {
            if (step[i] == 0 && room[i] < 0) {
                return false;
            }
            if (step[i] < 0) {
                enter = Math.max(enter, room[i] / step[i]);
            } else if (step[i] > 0) {
                leave = Math.min(leave, room[i] / step[i]);
            }
        }
        return enter <= leave;
    }
}
