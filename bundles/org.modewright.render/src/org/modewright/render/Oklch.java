package org.modewright.render;

/**
 * The perceptual colour space OKLCH (B. Ottosson, A perceptual color space for image processing, 2020): lightness 0 to 1, chroma, hue in
 * degrees.
 */
public record Oklch(double lightness, double chroma, double hue) {

    /** The opaque sRGB colour; chroma is reduced until the colour exists on the screen. */
    public int argb() {
        double c = chroma;
        double[] rgb = linear(c);
        while (!displayable(rgb) && c > 1e-4) {
            c *= 0.98;
            rgb = linear(c);
        }
        return 0xFF000000 | encoded(rgb[0]) << 16 | encoded(rgb[1]) << 8 | encoded(rgb[2]);
    }

    /** Lightness, a, b of an sRGB colour in OKLab. */
    public static double[] lab(int argb) {
        double r = decoded(argb >> 16 & 255);
        double g = decoded(argb >> 8 & 255);
        double b = decoded(argb & 255);
        double l = Math.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b);
        double m = Math.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b);
        double s = Math.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b);
        return new double[] {
            0.2104542553 * l + 0.7936177850 * m - 0.0040720468 * s,
            1.9779984951 * l - 2.4285922050 * m + 0.4505937099 * s,
            0.0259040371 * l + 0.7827717662 * m - 0.8086757660 * s};
    }

    double[] lab() {
        double angle = Math.toRadians(hue);
        return new double[] {lightness, chroma * Math.cos(angle), chroma * Math.sin(angle)};
    }

    private double[] linear(double c) {
        double angle = Math.toRadians(hue);
        double a = c * Math.cos(angle);
        double b = c * Math.sin(angle);
        double l = cube(lightness + 0.3963377774 * a + 0.2158037573 * b);
        double m = cube(lightness - 0.1055613458 * a - 0.0638541728 * b);
        double s = cube(lightness - 0.0894841775 * a - 1.2914855480 * b);
        return new double[] {
            4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s,
            -1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s,
            -0.0041960863 * l - 0.7034186147 * m + 1.7076147010 * s};
    }

    private static boolean displayable(double[] rgb) {
        for (double channel : rgb) {
            if (channel < -1e-4 || channel > 1 + 1e-4) {
                return false;
            }
        }
        return true;
    }

    private static int encoded(double linear) {
        double v = Math.max(0, Math.min(1, linear));
        double curve = v <= 0.0031308 ? 12.92 * v : 1.055 * Math.pow(v, 1 / 2.4) - 0.055;
        return (int) Math.round(255 * curve);
    }

    private static double decoded(int channel) {
        double v = channel / 255.0;
        return v <= 0.04045 ? v / 12.92 : Math.pow((v + 0.055) / 1.055, 2.4);
    }

    private static double cube(double value) {
        return value * value * value;
    }
}
