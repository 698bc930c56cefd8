package org.modewright.render;

/** Arithmetic on 0xAARRGGBB colours. */
public final class Argb {

    private Argb() {
    }

    /** Linear mix of all four channels: {@code from} at share 0, {@code to} at share 1. */
    public static int mix(int from, int to, double share) {
        return mix256(from, to, (int) Math.round(Math.max(0, Math.min(1, share)) * 256));
    }

    /** Mix with a weight of 0 to 256, two channels at a time; opaque stays opaque. */
    static int mix256(int from, int to, int weight) {
        int rest = 256 - weight;
        int redBlue = ((from & 0xFF00FF) * rest + (to & 0xFF00FF) * weight + 0x800080) >>> 8 & 0xFF00FF;
        int alphaGreen = (from >>> 8 & 0xFF00FF) * rest + (to >>> 8 & 0xFF00FF) * weight + 0x800080 & 0xFF00FF00;
        return alphaGreen | redBlue;
    }

    /** The colour with another opacity, 0 to 255. */
    public static int withAlpha(int argb, int alpha) {
        return argb & 0xFFFFFF | alpha << 24;
    }

    public static int alpha(int argb) {
        return argb >>> 24;
    }

    /** The colour with its red, green and blue multiplied by a factor of 0 to 1. */
    static int shade(int argb, double factor) {
        int weight = (int) Math.round(Math.max(0, Math.min(1, factor)) * 256);
        int redBlue = (argb & 0xFF00FF) * weight >>> 8 & 0xFF00FF;
        int green = (argb & 0xFF00) * weight >>> 8 & 0xFF00;
        return argb & 0xFF000000 | redBlue | green;
    }
}
