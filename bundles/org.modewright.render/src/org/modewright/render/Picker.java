package org.modewright.render;

import java.util.Arrays;

/**
 * Finds primitives in the last frame drawn. A marker within reach of the pointer wins over members; of members that lie right under the
 * pointer the nearest to the viewer wins, else the one closest to the pointer; a triangle is found where nothing else is. What an opaque
 * triangle under the pointer
 * hides is not found.
 */
final class Picker {

    private static final double RIGHT_UNDER = 1.0;
    private static final double TIE = 0.25;

    private final Frame frame;
    private double along;
    private double depth;

    Picker(Frame frame) {
        this.frame = frame;
    }

    Pick pick(double x, double y, double tolerance) {
        Pick triangle = triangle(x, y);
        double hidden = triangle != null && opaque(triangle.index())
            ? triangle.depth() + frame.pixels(3) / frame.projection.pixelsPerLength(triangle.depth())
                * frame.projection.depthPerLength(triangle.depth())
            : Double.POSITIVE_INFINITY;
        if (frame.options.markers()) {
            Pick marker = marker(x, y, tolerance, hidden);
            if (marker != null) {
                return marker;
            }
        }
        Pick member = member(x, y, tolerance, hidden);
        return member != null ? member : triangle;
    }

    private boolean opaque(int triangle) {
        int own = frame.scene.colours(PrimitiveKind.TRIANGLE)[triangle];
        return Argb.alpha(own != 0 ? own : frame.theme.panel()) == 255;
    }

    private Pick marker(double x, double y, double tolerance, double hidden) {
        Pick best = null;
        for (int i = 0; i < frame.scene.markerCount(); i++) {
            int v = frame.scene.markerVertex[i];
            if (pickable(PrimitiveKind.MARKER, i) && frame.deformed.visible(v) && frame.deformed.z[v] <= hidden) {
                double distance = Math.hypot(frame.deformed.x[v] - x, frame.deformed.y[v] - y);
                if (distance <= tolerance + size(i, v) && closer(distance, frame.deformed.z[v], best)) {
                    best = new Pick(PrimitiveKind.MARKER, i, frame.scene.id(PrimitiveKind.MARKER, i), frame.deformed.z[v], distance, 0);
                }
            }
        }
        return best;
    }

    private double size(int marker, int vertex) {
        return frame.scene.markerShape[marker] == MarkerShape.NODE ? MarkerPainter.halfNode(frame, vertex) : frame.pixels(4);
    }

    private static boolean closer(double distance, double depth, Pick best) {
        if (best == null || distance < best.distance() - TIE) {
            return true;
        }
        return distance <= best.distance() + TIE && depth < best.depth();
    }

    private Pick member(double x, double y, double tolerance, double hidden) {
        Pick best = null;
        for (int m = 0; m < frame.scene.memberCount(); m++) {
            if (pickable(PrimitiveKind.MEMBER, m)) {
                double distance = distance(m, x, y, tolerance);
                if (distance <= tolerance && depth <= hidden && better(distance, best)) {
                    best = new Pick(PrimitiveKind.MEMBER, m, frame.scene.id(PrimitiveKind.MEMBER, m), depth, distance, along);
                }
            }
        }
        return best;
    }

    private boolean better(double distance, Pick best) {
        if (best == null) {
            return true;
        }
        boolean under = distance <= RIGHT_UNDER;
        boolean bestUnder = best.distance() <= RIGHT_UNDER;
        if (under && bestUnder) {
            return depth < best.depth();
        }
        return under || !bestUnder && closer(distance, depth, best);
    }

    /** Pixels from the pointer to the drawn member; sets where along it and how deep. */
    private double distance(int member, double x, double y, double tolerance) {
        ProjectedScene p = frame.deformed;
        int first = frame.scene.firstVertex[member];
        int count = frame.scene.segments[member];
        double best = Double.POSITIVE_INFINITY;
        for (int i = 0; i < count; i++) {
            int v = first + i;
            if (!p.visible(v) || !p.visible(v + 1)) {
                continue;
            }
            double t = nearest(p.x[v], p.y[v], p.x[v + 1], p.y[v + 1], x, y);
            double z = p.z[v] + t * (p.z[v + 1] - p.z[v]);
            double off = Math.hypot(p.x[v] + t * (p.x[v + 1] - p.x[v]) - x, p.y[v] + t * (p.y[v + 1] - p.y[v]) - y);
            double distance = Math.max(0, off - halfWidth(member, z));
            if (distance < best) {
                best = distance;
                along = (i + t) / count;
                depth = z;
            }
        }
        return best;
    }

    private double halfWidth(int member, double z) {
        double line = frame.pixels(frame.options.lineWidth()) / 2;
        if (frame.options.thickness() == Thickness.LINES) {
            return line;
        }
        return Math.max(line, Math.max(frame.scene.sizeY[member], frame.scene.sizeZ[member]) * frame.projection.pixelsPerLength(z) / 2);
    }

    private static double nearest(double x0, double y0, double x1, double y1, double x, double y) {
        double dx = x1 - x0;
        double dy = y1 - y0;
        double square = dx * dx + dy * dy;
        return square > 0 ? Math.max(0, Math.min(1, ((x - x0) * dx + (y - y0) * dy) / square)) : 0;
    }

    private Pick triangle(double x, double y) {
        Pick best = null;
        for (int i = 0; i < frame.scene.triangleCount(); i++) {
            if (pickable(PrimitiveKind.TRIANGLE, i)) {
                double z = depthAt(i, x, y);
                if (!Double.isNaN(z) && (best == null || z < best.depth())) {
                    best = new Pick(PrimitiveKind.TRIANGLE, i, frame.scene.id(PrimitiveKind.TRIANGLE, i), z, 0, 0);
                }
            }
        }
        return best;
    }

    private double depthAt(int triangle, double x, double y) {
        ProjectedScene p = frame.deformed;
        int a = frame.scene.corners[3 * triangle];
        int b = frame.scene.corners[3 * triangle + 1];
        int c = frame.scene.corners[3 * triangle + 2];
        double wa = (p.x[c] - p.x[b]) * (y - p.y[b]) - (p.y[c] - p.y[b]) * (x - p.x[b]);
        double wb = (p.x[a] - p.x[c]) * (y - p.y[c]) - (p.y[a] - p.y[c]) * (x - p.x[c]);
        double wc = (p.x[b] - p.x[a]) * (y - p.y[a]) - (p.y[b] - p.y[a]) * (x - p.x[a]);
        double area = wa + wb + wc;
        boolean inside = wa >= 0 && wb >= 0 && wc >= 0 || wa <= 0 && wb <= 0 && wc <= 0;
        return inside && area != 0 ? (wa * p.z[a] + wb * p.z[b] + wc * p.z[c]) / area : Double.NaN;
    }

    private boolean pickable(PrimitiveKind kind, int index) {
        return frame.scene.id(kind, index) >= 0 && !frame.scene.marked(kind, index, Mark.HIDDEN);
    }

    int[] rectangle(PrimitiveKind kind, double x0, double y0, double x1, double y1, boolean crossing) {
        ScreenBox box = new ScreenBox(Math.min(x0, x1), Math.min(y0, y1), Math.max(x0, x1), Math.max(y0, y1));
        Integers found = new Integers();
        for (int i = 0; i < frame.scene.count(kind); i++) {
            if (pickable(kind, i) && inside(kind, i, box, crossing)) {
                found.add(frame.scene.id(kind, i));
            }
        }
        return Arrays.stream(found.toArray()).sorted().distinct().toArray();
    }

    private boolean inside(PrimitiveKind kind, int index, ScreenBox box, boolean crossing) {
        return switch (kind) {
            case MEMBER -> {
                int first = frame.scene.firstVertex[index];
                yield chain(first, first + frame.scene.segments[index], box, crossing);
            }
            case TRIANGLE -> corners(index, box, crossing);
            case MARKER -> box.holds(frame.deformed, frame.scene.markerVertex[index]);
            case LABEL -> box.holds(frame.deformed, frame.scene.labelVertex[index]);
        };
    }

    private boolean chain(int first, int last, ScreenBox box, boolean crossing) {
        for (int v = first; v <= last; v++) {
            if (!crossing && !box.holds(frame.deformed, v)) {
                return false;
            }
            if (crossing && v < last && box.crosses(frame.deformed, v, v + 1)) {
                return true;
            }
        }
        return !crossing;
    }

    private boolean corners(int triangle, ScreenBox box, boolean crossing) {
        int[] c = {frame.scene.corners[3 * triangle], frame.scene.corners[3 * triangle + 1], frame.scene.corners[3 * triangle + 2]};
        if (!crossing) {
            return box.holds(frame.deformed, c[0]) && box.holds(frame.deformed, c[1]) && box.holds(frame.deformed, c[2]);
        }
        return box.crosses(frame.deformed, c[0], c[1]) || box.crosses(frame.deformed, c[1], c[2]) || box.crosses(frame.deformed, c[2], c[0])
            || !Double.isNaN(depthAt(triangle, box.left(), box.top()));
    }
}
