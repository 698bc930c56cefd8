package org.modewright.render;

/** Draws labels and the tripod of axes, in front of everything. */
final class TextPainter {

    private static final double CAP_PIXELS = 9;
    private static final double STROKE_PIXELS = 1.25;
    private static final double HALO_PIXELS = 3.6;
    private static final int HALO_ALPHA = 215;
    private static final double LABEL_OFFSET = 7;
    private static final double TRIPOD_PLACE = 46;
    private static final double TRIPOD_ARM = 26;

    private final Frame frame;
    private final LinePlotter lines;
    private final ShapePlotter shapes;
    private final StrokeFont font;
    private final LabelGrid grid = new LabelGrid();

    TextPainter(Frame frame, Strip strip, StrokeFont font) {
        this.frame = frame;
        this.font = font;
        lines = new LinePlotter(strip);
        shapes = new ShapePlotter(strip);
    }

    /** Labels that would lie on earlier ones are left out; one that would run out on the right stands on the left of its vertex. */
    void paintLabels() {
        grid.begin(frame.projection.width(), frame.projection.height());
        byte[] marks = frame.scene.marks(PrimitiveKind.LABEL);
        for (int i = 0; i < marks.length; i++) {
            if ((marks[i] & Mark.HIDDEN.bit()) == 0 && frame.deformed.visible(frame.scene.labelVertex[i])) {
                label(i, (marks[i] & Mark.SELECTED.bit()) != 0);
            }
        }
    }

    private void label(int label, boolean selected) {
        int vertex = frame.scene.labelVertex[label];
        String text = frame.scene.labelText[label];
        double offset = frame.pixels(LABEL_OFFSET);
        double cap = frame.pixels(CAP_PIXELS);
        double width = font.width(text) * cap / StrokeFont.CAP;
        double left = frame.deformed.x[vertex] + offset;
        if (left + width > frame.projection.width() && left - 2 * offset - width >= 0) {
            left -= 2 * offset + width;
        }
        double baseline = frame.deformed.y[vertex] - offset;
        boolean outside = left > frame.projection.width() || left + width < 0 || baseline < 0 || baseline - cap > frame.projection.height();
        if (outside || !grid.take(left, baseline - cap, left + width, baseline)) {
            return;
        }
        int own = frame.scene.colours(PrimitiveKind.LABEL)[label];
        text(text, left, baseline, selected ? frame.theme.selection() : own != 0 ? own : frame.theme.text());
    }

    /** Draws a text whose baseline starts at the given place, on a halo of the background's colour. */
    void text(String text, double x, double baseline, int argb) {
        strokes(text, x, baseline, frame.pixels(HALO_PIXELS), Argb.withAlpha(frame.background, HALO_ALPHA));
        strokes(text, x, baseline, frame.pixels(STROKE_PIXELS), argb);
    }

    private void strokes(String text, double x, double baseline, double width, int argb) {
        double unit = frame.pixels(CAP_PIXELS) / StrokeFont.CAP;
        double left = Math.rint(x) + 0.5;
        double base = Math.rint(baseline) - 0.5;
        font.trace(text, (x0, y0, x1, y1) -> lines.line(left + x0 * unit, base - y0 * unit, Strip.IN_FRONT, left + x1 * unit,
            base - y1 * unit, Strip.IN_FRONT, width, argb));
    }

    /** Draws the directions of the axes in the lower left corner, the farthest first. */
    void paintTripod() {
        Projection p = frame.projection;
        double cx = frame.pixels(TRIPOD_PLACE);
        double cy = p.height() - frame.pixels(TRIPOD_PLACE);
        double[][] axes = {{1, 0, 0}, {0, 1, 0}, {0, 0, 1}};
        int[] colours = {DirectionColours.X, DirectionColours.Y, DirectionColours.Z};
        boolean[] drawn = new boolean[3];
        for (int n = 0; n < 3; n++) {
            int farthest = farthest(p, axes, drawn);
            drawn[farthest] = true;
            double[] a = axes[farthest];
            String name = "XYZ".substring(farthest, farthest + 1);
            arm(cx, cy, p.alongRight(a[0], a[1], a[2]), p.alongUp(a[0], a[1], a[2]), name, colours[farthest]);
        }
        shapes.disc(cx, cy, Strip.IN_FRONT, frame.pixels(2.2), frame.theme.member());
    }

    private static int farthest(Projection p, double[][] axes, boolean[] drawn) {
        int best = -1;
        double behind = 0;
        for (int i = 0; i < 3; i++) {
            double d = p.alongForward(axes[i][0], axes[i][1], axes[i][2]);
            if (!drawn[i] && (best < 0 || d > behind)) {
                best = i;
                behind = d;
            }
        }
        return best;
    }

    private void arm(double cx, double cy, double right, double up, String name, int argb) {
        double arm = frame.pixels(TRIPOD_ARM);
        double tipX = cx + arm * right;
        double tipY = cy - arm * up;
        double length = Math.hypot(right, up);
        if (length > 0.12) {
            lines.line(cx, cy, Strip.IN_FRONT, tipX, tipY, Strip.IN_FRONT, frame.pixels(2.2), argb);
            double head = frame.pixels(6);
            for (int side = -1; side <= 1; side += 2) {
                double bx = tipX - head * (right - side * 0.5 * up) / length;
                double by = tipY + head * (up + side * 0.5 * right) / length;
                lines.line(tipX, tipY, Strip.IN_FRONT, bx, by, Strip.IN_FRONT, frame.pixels(2), argb);
            }
            double away = frame.pixels(11) / length;
            double half = frame.pixels(CAP_PIXELS) / 2;
            double width = font.width(name) * frame.pixels(CAP_PIXELS) / StrokeFont.CAP;
            text(name, tipX + away * right - width / 2 - 0.5, tipY - away * up + half, argb);
        } else {
            shapes.disc(cx, cy, Strip.IN_FRONT, frame.pixels(4), argb);
        }
    }
}
