package org.modewright.ui.canvas;

import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Control;
import org.modewright.render.Bounds;
import org.modewright.render.Camera;
import org.modewright.render.Projection;

/**
 * The part of a canvas that a moving structure can touch: only this is copied to the screen from frame to frame. Copying is the dearest
 * part of a frame in a large window.
 */
final class TouchedArea {

    /** Room for signs, outlines and labels. */
    private static final int MARGIN = 48;

    /** Room for the thickness of members, as a share of the structure's size. */
    private static final double THICKNESS = 0.05;

    private Camera seenBy;
    private Rectangle area;
    private boolean whole = true;

    /** Begins anew: all of the canvas is drawn once. */
    void forget() {
        area = null;
        whole = true;
    }

    /**
     * Includes what the structure touches at a displacement; begins anew with another camera.
     *
     * @param camera who looks
     * @param bounds the structure at rest
     * @param displacement the largest displacement drawn, in the structure's unit
     * @param projection onto the raster
     * @param scale pixels of the raster for a point of the canvas
     */
    void include(Camera camera, Bounds bounds, double displacement, Projection projection, double scale) {
        if (camera != seenBy) {
            seenBy = camera;
            forget();
        }
        Rectangle now = of(bounds, displacement, projection, scale);
        if (now == null) {
            forget();
        } else {
            area = area == null ? now : area.union(now);
        }
    }

    /** Has the area drawn anew. */
    void redraw(Control canvas) {
        if (whole || area == null) {
            whole = false;
            canvas.redraw();
        } else {
            canvas.redraw(area.x, area.y, area.width, area.height, false);
        }
    }

    /** The area in points; null where the structure reaches behind the viewer, so that anything can be touched. */
    private static Rectangle of(Bounds bounds, double displacement, Projection projection, double scale) {
        double reach = displacement + THICKNESS * bounds.diagonal();
        double[] low = {bounds.minX() - reach, bounds.minY() - reach, bounds.minZ() - reach};
        double[] high = {bounds.maxX() + reach, bounds.maxY() + reach, bounds.maxZ() + reach};
        double[] at = new double[3];
        double left = Double.POSITIVE_INFINITY;
        double top = Double.POSITIVE_INFINITY;
        double right = Double.NEGATIVE_INFINITY;
        double bottom = Double.NEGATIVE_INFINITY;
        for (int corner = 0; corner < 8; corner++) {
            boolean seen = projection.project((corner & 1) == 0 ? low[0] : high[0], (corner & 2) == 0 ? low[1] : high[1],
                    (corner & 4) == 0 ? low[2] : high[2], at);
            if (!seen) {
                return null;
            }
            left = Math.min(left, at[0]);
            top = Math.min(top, at[1]);
            right = Math.max(right, at[0]);
            bottom = Math.max(bottom, at[1]);
        }
        int x = (int) Math.floor(left / scale) - MARGIN;
        int y = (int) Math.floor(top / scale) - MARGIN;
        return new Rectangle(x, y, (int) Math.ceil(right / scale) + MARGIN - x, (int) Math.ceil(bottom / scale) + MARGIN - y);
    }
}
