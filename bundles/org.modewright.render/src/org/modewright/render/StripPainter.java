package org.modewright.render;

/** Draws all layers of a frame into the rows of one strip. */
final class StripPainter {

    private final Frame frame;
    private final Raster raster;
    private final int width;
    private final int height;
    private final int firstRow;
    private final int endRow;
    private final MemberPainter members;
    private final PanelPainter panels;
    private final MarkerPainter markers;
    private final TextPainter texts;

    StripPainter(Frame frame, Raster raster, int firstRow, int endRow, StrokeFont font) {
        this.frame = frame;
        this.raster = raster;
        this.firstRow = firstRow;
        this.endRow = endRow;
        width = raster.width();
        height = raster.height();
        Strip strip = new Strip(raster, firstRow, endRow);
        members = new MemberPainter(frame, strip);
        panels = new PanelPainter(frame, strip);
        markers = new MarkerPainter(frame, strip);
        texts = new TextPainter(frame, strip, font);
    }

    boolean covers(int rasterWidth, int rasterHeight) {
        return width == rasterWidth && height == rasterHeight;
    }

    /** The ghost is a layer of its own: the depth is cleared after it, so that the structure always stands before it. */
    void paint() {
        paintBackdrop();
        panels.paintOpaque();
        members.paint();
        if (frame.options.markers()) {
            markers.paint();
        }
        panels.paintTranslucent();
        members.paintHiddenSelection();
        if (frame.options.labels()) {
            texts.paintLabels();
        }
        if (frame.options.tripod()) {
            texts.paintTripod();
        }
    }

    private void paintBackdrop() {
        raster.clearDepthRows(firstRow, endRow);
        if (frame.ghostShown && frame.backdrop.drawn()) {
            frame.backdrop.restore(raster, firstRow, endRow);
            return;
        }
        raster.fillGradientRows(frame.theme.backgroundTop(), frame.theme.backgroundBottom(), firstRow, endRow);
        if (frame.ghostShown) {
            members.paintGhost();
            raster.clearDepthRows(firstRow, endRow);
            frame.backdrop.save(raster, firstRow, endRow);
        }
    }
}
