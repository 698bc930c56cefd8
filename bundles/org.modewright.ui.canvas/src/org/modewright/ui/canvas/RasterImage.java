package org.modewright.ui.canvas;

import org.eclipse.swt.graphics.Device;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageDataProvider;
import org.eclipse.swt.graphics.PaletteData;
import org.eclipse.swt.graphics.Rectangle;
import org.modewright.render.Raster;

/** Copies a raster to the screen; keeps its buffer from frame to frame. */
final class RasterImage {

    private static final PaletteData DIRECT = new PaletteData(0xFF0000, 0xFF00, 0xFF);

    private final Device device;
    private ImageData data;

    RasterImage(Device device) {
        this.device = device;
    }

    /** Draws the raster so that it fills an area, whatever the zoom of the screen. */
    void draw(GC gc, Raster raster, Rectangle area) {
        ImageData copy = copy(raster);
        ImageDataProvider provider = zoom -> zoom == 100 && copy.width != area.width ? copy.scaledTo(area.width, area.height) : copy;
        Image image = new Image(device, provider);
        try {
            Rectangle bounds = image.getBounds();
            gc.drawImage(image, 0, 0, bounds.width, bounds.height, 0, 0, area.width, area.height);
        } finally {
            image.dispose();
        }
    }

    /** The raster as image data, valid until the next call. */
    ImageData copy(Raster raster) {
        if (data == null || data.width != raster.width() || data.height != raster.height()) {
            data = new ImageData(raster.width(), raster.height(), 32, DIRECT);
        }
        int[] colours = raster.colour();
        byte[] bytes = data.data;
        int count = raster.width() * raster.height();
        for (int i = 0, at = 0; i < count; i++, at += 4) {
            int colour = colours[i];
            bytes[at + 1] = (byte) (colour >> 16);
            bytes[at + 2] = (byte) (colour >> 8);
            bytes[at + 3] = (byte) colour;
        }
        return data;
    }
}
