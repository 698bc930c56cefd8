package org.modewright.render;

/**
 * Some rows of a raster to draw into, with the rule of how a pixel is written: only where nothing nearer was drawn; a pixel that is
 * covered by half or more takes the depth as well, so that thin fringes do not hide what lies behind them.
 *
 * <p>Whatever is drawn computes each pixel from its own place alone, so that the picture does not depend on how it is cut into strips.
 */
final class Strip {

    static final float IN_FRONT = Float.NEGATIVE_INFINITY;

    private static final int HALF = 128;
    private static final int FULL = 255;

    final int width;
    final int firstRow;
    final int endRow;
    final int[] colour;
    final float[] depth;
    private boolean behindOnly;

    Strip(Raster raster, int firstRow, int endRow) {
        width = raster.width();
        colour = raster.colour();
        depth = raster.depth();
        this.firstRow = firstRow;
        this.endRow = endRow;
    }

    /** @param cover share of the pixel that is covered, 0 to 1 */
    void plot(int index, float z, int argb, double cover) {
        blend(index, z, argb, (int) (cover * 256 + 0.5));
    }

    /** @param weight share of the pixel that is covered, 0 to 256 */
    void blend(int index, float z, int argb, int weight) {
        if (z > depth[index] == behindOnly) {
            write(index, z, argb, weight);
        }
    }

    private void write(int index, float z, int argb, int weight) {
        int alpha = argb >>> 24;
        int share = alpha == FULL ? weight : weight * alpha / FULL;
        if (share >= FULL) {
            colour[index] = argb;
            depth[index] = z;
            return;
        }
        colour[index] = Argb.mix256(colour[index], argb | 0xFF000000, share);
        if (share >= HALF && !behindOnly) {
            depth[index] = z;
        }
    }

    /**
     * Turns the rule round: what is drawn next shows, blended, only where something nearer hides it, and leaves the depth alone. Use
     * translucent colours.
     */
    void behindOnly(boolean on) {
        behindOnly = on;
    }
}
