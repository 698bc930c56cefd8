package org.modewright.render;

/**
 * The layer behind a moving structure, kept from frame to frame while the camera and the scene's state stay: background and ghost do not
 * change while a shape swings.
 */
final class Backdrop {

    /** All that the layer depends on. */
    record Key(Scene scene, int version, Camera camera, Theme theme, double lineWidth, double scale, int width, int height) {
    }

    private int[] colour = new int[0];
    private Key key;
    private boolean drawn;

    /** Says what the next frame needs; answers whether the kept layer is that. */
    boolean begin(Key wanted) {
        drawn = wanted.equals(key) && colour.length >= wanted.width() * wanted.height();
        if (!drawn) {
            key = wanted;
            int pixels = wanted.width() * wanted.height();
            if (colour.length < pixels) {
                colour = new int[pixels];
            }
        }
        return drawn;
    }

    boolean drawn() {
        return drawn;
    }

    void save(Raster raster, int firstRow, int endRow) {
        int from = firstRow * raster.width();
        System.arraycopy(raster.colour(), from, colour, from, endRow * raster.width() - from);
    }

    void restore(Raster raster, int firstRow, int endRow) {
        int from = firstRow * raster.width();
        System.arraycopy(colour, from, raster.colour(), from, endRow * raster.width() - from);
    }
}
