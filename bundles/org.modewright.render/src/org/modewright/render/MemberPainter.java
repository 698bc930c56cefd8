package org.modewright.render;

/** Draws members and plain lines: the ghost at rest, outlines of what is selected, and the members themselves. */
final class MemberPainter {

    /** Sections narrower than this on the screen are drawn as lines of their width. */
    private static final double SECTION_FROM_PIXELS = 5;
    private static final double OUTLINE_PIXELS = 2.4;
    private static final double EMPHASIS = 1.9;
    private static final double MUTED_SHARE = 0.72;
    private static final double COLOURED = 1.4;
    private static final double HIDDEN_PIXELS = 2;
    private static final int HIDDEN_ALPHA = 150;
    private static final float STRAIGHT_PIXELS = 0.15f;

    private final Frame frame;
    private final Strip strip;
    private final LinePlotter lines;
    private final ShapePlotter shapes;
    private final SectionPainter sections;
    private final NearPlane nearPlane = new NearPlane();

    MemberPainter(Frame frame, Strip strip) {
        this.frame = frame;
        this.strip = strip;
        lines = new LinePlotter(strip);
        shapes = new ShapePlotter(strip);
        sections = new SectionPainter(frame, strip);
    }

    void paintGhost() {
        byte[] marks = frame.scene.marks(PrimitiveKind.MEMBER);
        double width = frame.pixels(Math.min(1.2, frame.options.lineWidth()));
        for (int member = 0; member < marks.length; member++) {
            if ((marks[member] & Mark.HIDDEN.bit()) == 0) {
                chain(frame.ghost, member, width, frame.theme.ghost(), false);
            }
        }
    }

    void paint() {
        byte[] marks = frame.scene.marks(PrimitiveKind.MEMBER);
        int[] colours = frame.scene.colours(PrimitiveKind.MEMBER);
        for (int member = 0; member < marks.length; member++) {
            if ((marks[member] & Mark.HIDDEN.bit()) == 0) {
                paint(member, marks[member], colours[member]);
            }
        }
    }

    private void paint(int member, int marks, int own) {
        ProjectedScene p = frame.deformed;
        int first = frame.scene.firstVertex[member];
        int middle = first + frame.scene.segments[member] / 2;
        double thickness = p.visible(middle) ? thickness(member, p.z[middle]) : 0;
        int outline = outline(marks);
        if (sectionShown(thickness)) {
            int body = own != 0 ? own : frame.faded(frame.theme.section(), p.z[middle]);
            if (sections.paint(member, colour(body, marks, p.z[middle]), outline)) {
                return;
            }
        }
        double width = lineWidth(own != 0, marks, thickness);
        if (outline != 0) {
            chain(p, member, width + 2 * frame.pixels(OUTLINE_PIXELS), outline, true);
        }
        int[] vertexColours = frame.scene.vertexColours();
        if (vertexColours != null) {
            shadedChain(member, width, marks, vertexColours);
        } else if (own != 0 || marks != 0) {
            chain(p, member, width, colour(own, marks, p.z[middle]), false);
        } else {
            fadedChain(p, member, width);
        }
    }

    private double thickness(int member, float depth) {
        return Math.max(frame.scene.sizeY[member], frame.scene.sizeZ[member]) * frame.projection.pixelsPerLength(depth);
    }

    private boolean sectionShown(double thickness) {
        return switch (frame.options.thickness()) {
            case LINES -> false;
            case SECTIONS -> thickness >= frame.pixels(1.5);
            case AUTOMATIC -> thickness >= frame.pixels(SECTION_FROM_PIXELS);
        };
    }

    private double lineWidth(boolean coloured, int marks, double thickness) {
        double line = frame.pixels(frame.options.lineWidth()) * (coloured || frame.scene.vertexColours() != null ? COLOURED : 1);
        double emphasised = (marks & Mark.EMPHASISED.bit()) != 0 ? EMPHASIS * line : line;
        if (frame.options.thickness() == Thickness.LINES) {
            return emphasised;
        }
        return Math.max(emphasised, Math.min(thickness, frame.pixels(SECTION_FROM_PIXELS)));
    }

    private int outline(int marks) {
        if ((marks & Mark.SELECTED.bit()) != 0) {
            return frame.theme.selection();
        }
        return (marks & Mark.HOVERED.bit()) != 0 ? frame.theme.hover() : 0;
    }

    private int colour(int own, int marks, float depth) {
        int base = own != 0 ? own : frame.faded(depth);
        return (marks & Mark.MUTED.bit()) != 0 ? Argb.mix(base, frame.background, MUTED_SHARE) : base;
    }

    private void fadedChain(ProjectedScene p, int member, double width) {
        int first = frame.scene.firstVertex[member];
        int end = first + frame.scene.segments[member];
        if (flat(p, member)) {
            segment(p, first, end, width, frame.faded(p.z[(first + end) / 2]), 0);
            return;
        }
        for (int v = first; v < end; v++) {
            segment(p, v, v + 1, width, frame.faded(p.z[v]), 0);
        }
    }

    /** An outline lies a little behind its member and is round where it turns and ends; the rounds lie behind the line in turn. */
    private void chain(ProjectedScene p, int member, double width, int argb, boolean outline) {
        int first = frame.scene.firstVertex[member];
        int end = first + frame.scene.segments[member];
        double bias = outline ? -frame.pixels(2) : 0;
        int step = flat(p, member) ? end - first : 1;
        for (int v = first; v < end; v += step) {
            segment(p, v, v + step, width, argb, bias);
            if (outline) {
                joint(p, v, width, argb, bias - width / 2);
            }
        }
        if (outline) {
            joint(p, end, width, argb, bias - width / 2);
        }
    }

    private void joint(ProjectedScene p, int v, double width, int argb, double bias) {
        if (p.visible(v)) {
            shapes.disc(p.x[v], p.y[v], frame.nearer(p.z[v], bias), width / 2, argb);
        }
    }

    /** Whether a member looks like one straight line in this frame: no vertex is off its chord by a visible amount. */
    private boolean flat(ProjectedScene p, int member) {
        int count = frame.scene.segments[member];
        int first = frame.scene.firstVertex[member];
        int end = first + count;
        if (p == frame.ghost || frame.atRest) {
            return frame.scene.straight[member] == 1 && p.visible(first) && p.visible(end);
        }
        float x0 = p.x[first];
        float y0 = p.y[first];
        float dx = p.x[end] - x0;
        float dy = p.y[end] - y0;
        float dz = p.z[end] - p.z[first];
        for (int i = 1; i < count; i++) {
            float t = i / (float) count;
            float offX = p.x[first + i] - x0 - t * dx;
            float offY = p.y[first + i] - y0 - t * dy;
            float offZ = p.z[first + i] - p.z[first] - t * dz;
            if (!(offX * offX + offY * offY < STRAIGHT_PIXELS * STRAIGHT_PIXELS && Math.abs(offZ) < frame.flatDepth)) {
                return false;
            }
        }
        return p.visible(first) && p.visible(end);
    }

    private void segment(ProjectedScene p, int v, int w, double width, int argb, double bias) {
        if (!p.visible(v) || !p.visible(w)) {
            nearPlane.line(p, v, w, lines, width, argb);
        } else if (bias == 0) {
            lines.line(p.x[v], p.y[v], p.z[v], p.x[w], p.y[w], p.z[w], width, argb);
        } else {
            lines.line(p.x[v], p.y[v], frame.nearer(p.z[v], bias), p.x[w], p.y[w], frame.nearer(p.z[w], bias), width, argb);
        }
    }

    private void shadedChain(int member, double width, int marks, int[] colours) {
        ProjectedScene p = frame.deformed;
        int first = frame.scene.firstVertex[member];
        int end = first + frame.scene.segments[member];
        for (int v = first; v < end; v++) {
            if (p.visible(v) && p.visible(v + 1)) {
                lines.line(p.x[v], p.y[v], p.z[v], colour(colours[v], marks, p.z[v]), p.x[v + 1], p.y[v + 1], p.z[v + 1],
                    colour(colours[v + 1], marks, p.z[v + 1]), width);
            } else {
                nearPlane.line(p, v, v + 1, lines, width, colours[v] != 0 ? colours[v] : frame.theme.member());
            }
        }
    }

    /** Lets selected members shine through whatever hides them. */
    void paintHiddenSelection() {
        byte[] marks = frame.scene.marks(PrimitiveKind.MEMBER);
        strip.behindOnly(true);
        for (int member = 0; member < marks.length; member++) {
            if ((marks[member] & (Mark.HIDDEN.bit() | Mark.SELECTED.bit())) == Mark.SELECTED.bit()) {
                paintHidden(member);
            }
        }
        strip.behindOnly(false);
    }

    private void paintHidden(int member) {
        ProjectedScene p = frame.deformed;
        int first = frame.scene.firstVertex[member];
        int end = first + frame.scene.segments[member];
        int argb = Argb.withAlpha(frame.theme.selection(), HIDDEN_ALPHA);
        for (int v = first; v < end; v++) {
            double bias = p.visible(v) ? thickness(member, p.z[v]) + frame.pixels(3) : 0;
            segment(p, v, v + 1, frame.pixels(HIDDEN_PIXELS), argb, bias);
        }
    }
}
