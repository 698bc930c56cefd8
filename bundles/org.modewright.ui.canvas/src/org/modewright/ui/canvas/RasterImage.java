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
            data = new ImageData(raster.width(), raster.height(), 32, LITTLE_ENDIAN);
            pixels = ByteBuffer.wrap(data.data).order(ByteOrder.LITTLE_ENDIAN).asIntBuffer();
        }
        pixels.put(0, raster.colour(), 0, raster.width() * raster.height());
        return data;
    }
}
