package org.modewright.ui.canvas;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.IntBuffer;
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

    /** Blue, green, red, unused: the bytes of a raster's colour in little-endian order, so that a frame is copied in one piece. */
    private static final PaletteData LITTLE_ENDIAN = new PaletteData(0xFF00, 0xFF0000, 0xFF000000);

    private final Device device;
    private ImageData data;
    private IntBuffer pixels;

    RasterImage(Device device) {
        this.device = device;
    }

    /**
     * Draws the raster so that it fills an area, whatever the zoom of the screen.
     *
     * @param area the canvas
     * @param damaged the part of it that is to be drawn; where pixels are points nothing else is copied
     */
    void draw(GC gc, Raster raster, Rectangle area, Rectangle damaged) {
        Rectangle part = area.intersection(damaged);
        if (raster.width() == area.width && raster.height() == area.height && !part.isEmpty()) {
            drawPart(gc, raster, part);
        } else {
            drawWhole(gc, raster, area);
        }
    }

    private void drawPart(GC gc, Raster raster, Rectangle part) {
        prepare(part.width, part.height);
        for (int row = 0; row < part.height; row++) {
            pixels.put(row * part.width, raster.colour(), (part.y + row) * raster.width() + part.x, part.width);
        }
        Image image = new Image(device, data);
        try {
            gc.drawImage(image, part.x, part.y);
        } finally {
            image.dispose();
        }
    }

    private void drawWhole(GC gc, Raster raster, Rectangle area) {
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
        prepare(raster.width(), raster.height());
        pixels.put(0, raster.colour(), 0, raster.width() * raster.height());
        return data;
    }

    private void prepare(int width, int height) {
        if (data == null || data.width != width || data.height != height) {
            data = new ImageData(width, height, 32, LITTLE_ENDIAN);
            pixels = ByteBuffer.wrap(data.data).order(ByteOrder.LITTLE_ENDIAN).asIntBuffer();
        }
    }
}
