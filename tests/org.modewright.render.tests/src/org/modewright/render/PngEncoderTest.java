package org.modewright.render;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;

import javax.imageio.ImageIO;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PngEncoderTest {

    @TempDir
    Path folder;

    private static Raster noise(int width, int height) {
        Raster raster = new Raster(width, height);
        Random random = new Random(3);
        for (int i = 0; i < width * height; i++) {
            raster.colour()[i] = random.nextInt();
        }
        return raster;
    }

    @Test
    void anotherDecoderReadsTheSamePixels() throws IOException {
        for (int[] size : new int[][] {{1, 1}, {7, 3}, {200, 133}}) {
            Raster raster = noise(size[0], size[1]);
            check(raster, ImageIO.read(new ByteArrayInputStream(PngEncoder.encode(raster))));
        }
    }

    @Test
    void aFileHoldsTheSame() throws IOException {
        Raster raster = noise(20, 10);
        Path file = folder.resolve("shape.png");
        PngEncoder.write(raster, file);
        check(raster, ImageIO.read(new ByteArrayInputStream(Files.readAllBytes(file))));
    }

    private static void check(Raster raster, BufferedImage image) {
        assertEquals(raster.width(), image.getWidth());
        assertEquals(raster.height(), image.getHeight());
        for (int y = 0; y < raster.height(); y++) {
            for (int x = 0; x < raster.width(); x++) {
                assertEquals(raster.pixel(x, y), image.getRGB(x, y), x + ", " + y);
            }
        }
    }
}
