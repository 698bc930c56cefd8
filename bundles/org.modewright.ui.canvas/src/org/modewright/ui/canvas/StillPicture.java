package org.modewright.ui.canvas;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Device;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageLoader;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Transform;

/** What a canvas shows just now, drawn anew with smooth edges and with its legend, for a file or the clipboard. */
final class StillPicture {

    private static final int WIDTH = 1920;

    /** Pixels of the picture for one of text, lines and signs. */
    private static final int SCALE = 2;

    private StillPicture() {
    }

    /** The picture, {@value #WIDTH} pixels wide, as high as the canvas is in proportion. */
    static ImageData of(StructureCanvas canvas, EnergyLegend legend) {
        Point size = canvas.getSize();
        int height = Math.max(1, (int) Math.round(size.y * WIDTH / (double) Math.max(1, size.x)));
        Device device = canvas.getDisplay();
        Image image = new Image(device, new RasterImage(device).copy(canvas.still(WIDTH, height, SCALE)));
        GC gc = new GC(image);
        Transform larger = new Transform(device);
        try {
            larger.scale(SCALE, SCALE);
            gc.setTransform(larger);
            gc.setFont(canvas.getFont());
            legend.paint(gc, WIDTH / SCALE, height / SCALE);
            gc.setTransform(null);
            return image.getImageData();
        } finally {
            larger.dispose();
            gc.dispose();
            image.dispose();
        }
    }

    /** Writes a picture as PNG. */
    static void write(ImageData picture, Path file) throws IOException {
        ImageLoader loader = new ImageLoader();
        loader.data = new ImageData[] {picture};
        try (var out = Files.newOutputStream(file)) {
            loader.save(out, SWT.IMAGE_PNG);
        }
    }
}
