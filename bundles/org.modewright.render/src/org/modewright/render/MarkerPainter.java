package org.modewright.render;

/** Draws the signs at vertices, at a constant size on the screen but never larger than a share of a typical member. */
final class MarkerPainter {

    private static final double NODE_PIXELS = 2.4;
    private static final double MASS_PIXELS = 5;
    private static final double SUPPORT_PIXELS = 15;
    private static final double SMALLEST_NODE = 0.9;
    private static final double NODE_SHARE = 0.035;
    private static final double SUPPORT_SHARE = 0.28;
    private static final double RING_PIXELS = 2;

    private final Frame frame;
    private final ShapePlotter shapes;
    private final SupportSigns supports;

    MarkerPainter(Frame frame, Strip strip) {
        this.frame = frame;
        shapes = new ShapePlotter(strip);
        supports = new SupportSigns(frame, strip);
    }

    void paint() {
        byte[] marks = frame.scene.marks(PrimitiveKind.MARKER);
        for (int i = 0; i < marks.length; i++) {
            int vertex = frame.scene.markerVertex[i];
            if ((marks[i] & Mark.HIDDEN.bit()) == 0 && frame.deformed.visible(vertex)) {
                paint(i, vertex, marks[i]);
            }
        }
    }

    private void paint(int marker, int vertex, int marks) {
        MarkerShape shape = frame.scene.markerShape[marker];
        int own = frame.scene.colours(PrimitiveKind.MARKER)[marker];
        int ring = ring(marks);
        switch (shape) {
            case NODE -> node(vertex, own != 0 ? own : frame.theme.node(), ring, (marks & Mark.EMPHASISED.bit()) != 0);
            case MASS -> mass(vertex, own != 0 ? own : frame.theme.node(), ring);
            default -> supports.paint(shape, vertex, supportLength(vertex), ring != 0 ? ring : own != 0 ? own : frame.theme.support());
        }
    }

    private int ring(int marks) {
        if ((marks & Mark.SELECTED.bit()) != 0) {
            return frame.theme.selection();
        }
        return (marks & Mark.HOVERED.bit()) != 0 ? frame.theme.hover() : 0;
    }

    private void node(int vertex, int argb, int ring, boolean emphasised) {
        ProjectedScene p = frame.deformed;
        double half = halfNode(frame, vertex);
        float z = frame.nearer(p.z[vertex], frame.pixels(3) + frame.bodyThickness * frame.projection.pixelsPerLength(p.z[vertex]));
        if (ring != 0) {
            half = Math.max(half, frame.pixels(NODE_PIXELS));
            shapes.square(p.x[vertex], p.y[vertex], z, half + frame.pixels(RING_PIXELS), ring);
        } else if (emphasised) {
            half = frame.pixels(NODE_PIXELS) * 1.5;
        }
        if (half >= frame.pixels(SMALLEST_NODE)) {
            shapes.square(p.x[vertex], p.y[vertex], frame.nearer(z, 1), half, argb);
        }
    }

    /** Half the side of a node's square in pixels. */
    static double halfNode(Frame frame, int vertex) {
        double share = NODE_SHARE * frame.memberLength * frame.projection.pixelsPerLength(frame.deformed.z[vertex]);
        return Math.min(frame.pixels(NODE_PIXELS), share);
    }

    private void mass(int vertex, int argb, int ring) {
        ProjectedScene p = frame.deformed;
        double radius = frame.pixels(MASS_PIXELS);
        float z = frame.nearer(p.z[vertex], frame.pixels(4));
        shapes.disc(p.x[vertex], p.y[vertex], z, radius + frame.pixels(ring != 0 ? RING_PIXELS : 1), ring != 0 ? ring : frame.background);
        shapes.disc(p.x[vertex], p.y[vertex], frame.nearer(z, 1), radius, argb);
    }

    private double supportLength(int vertex) {
        double pixels = frame.pixels(SUPPORT_PIXELS) / frame.projection.pixelsPerLength(frame.deformed.z[vertex]);
        return Math.min(pixels, SUPPORT_SHARE * frame.memberLength);
    }
}
