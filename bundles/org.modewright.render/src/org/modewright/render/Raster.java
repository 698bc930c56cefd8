package org.modewright.render;

import java.util.Arrays;

/**
 * A colour and depth image. Pixels lie row by row, row length = {@link #width()}; the arrays may be longer than the image, so that
 * resizing a window does not allocate at every step.
 */
public final class Raster {

    private int width;
    private int height;
    private int[] colour = new int[0];
    private float[] depth = new float[0];

    /**
     * @param width  pixels, at least 1
     * @param height pixels, at least 1
     * @throws IllegalArgumentException if a size is below 1
     */
    public Raster(int width, int height) {
        resize(width, height);
    }

    /** Changes the size; the content is undefined until the next clear. Arrays are kept while they are large enough. */
    public void resize(int newWidth, int newHeight) {
        if (newWidth < 1 || newHeight < 1) {
            throw new IllegalArgumentException("A raster needs at least 1 x 1 pixels, not " + newWidth + " x " + newHeight + ".");
        }
        int pixels = Math.multiplyExact(newWidth, newHeight);
        if (colour.length < pixels) {
            colour = new int[pixels];
            depth = new float[pixels];
        }
        width = newWidth;
        height = newHeight;
    }

    public int width() {
        return width;
    }

    public int height() {
        return height;
    }

    /** The live colour array, 0xAARRGGBB. */
    public int[] colour() {
        return colour;
    }

    /** The live depth array; smaller is nearer, positive infinity where nothing was drawn. */
    public float[] depth() {
        return depth;
    }

    public int pixel(int x, int y) {
        return colour[y * width + x];
    }

    /** Fills with one colour and clears the depth. */
    public void clear(int argb) {
        Arrays.fill(colour, 0, width * height, argb);
        clearDepth();
    }

    /** Fills with a vertical gradient and clears the depth. */
    public void clearGradient(int top, int bottom) {
        fillGradientRows(top, bottom, 0, height);
        clearDepth();
    }

    public void clearDepth() {
        clearDepthRows(0, height);
    }

    void fillGradientRows(int top, int bottom, int firstRow, int endRow) {
        for (int y = firstRow; y < endRow; y++) {
            double share = height == 1 ? 0 : y / (double) (height - 1);
            Arrays.fill(colour, y * width, (y + 1) * width, Argb.mix(top, bottom, share));
        }
    }

    void clearDepthRows(int firstRow, int endRow) {
        Arrays.fill(depth, firstRow * width, endRow * width, Float.POSITIVE_INFINITY);
    }

    /**
     * The image at half size, each pixel the mean of 2 x 2 (an odd last row or column is dropped): turns an image drawn at double
     * size into a smooth one.
     */
    public Raster halved() {
        Raster half = new Raster(Math.max(1, width / 2), Math.max(1, height / 2));
        for (int y = 0; y < height / 2; y++) {
            for (int x = 0; x < width / 2; x++) {
                half.colour[y * half.width + x] = meanOfFour(2 * x, 2 * y);
            }
        }
        return half;
    }

    private int meanOfFour(int x, int y) {
        int a = pixel(x, y);
        int b = pixel(x + 1, y);
        int c = pixel(x, y + 1);
        int d = pixel(x + 1, y + 1);
        int mean = 0;
        for (int shift = 0; shift < 32; shift += 8) {
            int sum = (a >>> shift & 255) + (b >>> shift & 255) + (c >>> shift & 255) + (d >>> shift & 255);
            mean |= (sum + 2 >> 2) << shift;
        }
        return mean;
    }
}
