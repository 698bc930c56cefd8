package org.modewright.render;

/** Upright squares and discs of constant depth, smooth at their edges. */
final class ShapePlotter {

    private final Strip strip;

    ShapePlotter(Strip strip) {
        this.strip = strip;
    }

    /** A square about a centre; {@code half} is half its side in pixels. */
    void square(double cx, double cy, float z, double half, int argb) {
        int last = Math.min(strip.endRow, (int) Math.ceil(cy + half));
        int end = Math.min(strip.width, (int) Math.ceil(cx + half));
        for (int y = Math.max(strip.firstRow, (int) Math.floor(cy - half)); y < last; y++) {
            double high = Math.min(cy + half, y + 1) - Math.max(cy - half, y);
            for (int x = Math.max(0, (int) Math.floor(cx - half)); x < end; x++) {
                strip.plot(y * strip.width + x, z, argb, high * (Math.min(cx + half, x + 1) - Math.max(cx - half, x)));
            }
        }
    }

    /** A disc; pixels at the rim are covered by their centre's distance from it. */
    void disc(double cx, double cy, float z, double radius, int argb) {
        int last = Math.min(strip.endRow, (int) Math.ceil(cy + radius + 1));
        int end = Math.min(strip.width, (int) Math.ceil(cx + radius + 1));
        for (int y = Math.max(strip.firstRow, (int) Math.floor(cy - radius - 1)); y < last; y++) {
            for (int x = Math.max(0, (int) Math.floor(cx - radius - 1)); x < end; x++) {
                double cover = radius + 0.5 - Math.hypot(x + 0.5 - cx, y + 0.5 - cy);
                if (cover > 0) {
                    strip.plot(y * strip.width + x, z, argb, Math.min(1, cover));
                }
            }
        }
    }
}
