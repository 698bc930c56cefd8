package org.modewright.testsupport;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageLoader;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;

/** Pictures of the screen and of single controls. For the user interface's thread. */
final class Screenshots {

    private Screenshots() {
    }

    /** Saves a picture of the whole screen in the folder target/screenshots of the test's project. */
    static Path save(Display display, String name) throws IOException {
        Path folder = Path.of(System.getProperty("modewright.screenshots", "target/screenshots")).toAbsolutePath();
        Files.createDirectories(folder);
        Rectangle bounds = display.getBounds();
        Image image = new Image(display, bounds.width, bounds.height);
        GC gc = new GC(display);
        gc.copyArea(image, 0, 0);
        gc.dispose();
        ImageLoader loader = new ImageLoader();
        loader.data = new ImageData[] {image.getImageData()};
        image.dispose();
        Path file = folder.resolve(name.replaceAll("[^A-Za-z0-9._-]+", "_") + ".png");
        loader.save(file.toString(), SWT.IMAGE_PNG);
        return file;
    }

    /** What a control shows, pixel by pixel. */
    static ImageData of(Control control) {
        Rectangle area = control.getBounds();
        Image image = new Image(control.getDisplay(), Math.max(1, area.width), Math.max(1, area.height));
        GC gc = new GC(control);
        gc.copyArea(image, 0, 0);
        gc.dispose();
        ImageData data = image.getImageData();
        image.dispose();
        return data;
    }
}
