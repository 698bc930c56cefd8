package org.modewright.render;

import java.util.List;

/**
 * A ramp from light to dark: straight lines between anchors in OKLCH, walked at an even pace of perceived difference (length in OKLab),
 * so that equal steps of the value look equally large.
 */
public final class ColourRamp {

    private static final int STEPS = 256;
    private static final int FINE = 2048;

    private final int[] colours = new int[STEPS];

    private ColourRamp(List<Oklch> anchors) {
        double[] length = new double[FINE + 1];
        double[] last = between(anchors, 0).lab();
        for (int i = 1; i <= FINE; i++) {
            double[] next = between(anchors, i / (double) FINE).lab();
            length[i] = length[i - 1] + difference(last, next);
            last = next;
        }
        int at = 0;
        for (int i = 0; i < STEPS; i++) {
            double wanted = length[FINE] * i / (STEPS - 1);
            while (at < FINE && length[at] < wanted) {
                at++;
            }
            colours[i] = between(anchors, at / (double) FINE).argb();
        }
    }

    /**
     * The ramp for energies and other shares: pale apricot through terracotta to deep mulberry, the same on light and on dark
     * backgrounds.
     */
    public static ColourRamp energy() {
        return new ColourRamp(List.of(new Oklch(0.86, 0.095, 82), new Oklch(0.70, 0.15, 44), new Oklch(0.54, 0.17, 18),
            new Oklch(0.38, 0.13, -14)));
    }

    /** @param t 0 light to 1 dark; values outside, and NaN as 0, are taken to the ends */
    public int argb(double t) {
        return colours[(int) Math.round(Math.max(0, Math.min(1, t)) * (STEPS - 1))];
    }

    private static Oklch between(List<Oklch> anchors, double t) {
        double place = t * (anchors.size() - 1);
        int i = Math.min((int) place, anchors.size() - 2);
        double s = place - i;
        Oklch a = anchors.get(i);
        Oklch b = anchors.get(i + 1);
        return new Oklch(a.lightness() + s * (b.lightness() - a.lightness()), a.chroma() + s * (b.chroma() - a.chroma()),
            a.hue() + s * (b.hue() - a.hue()));
    }

    private static double difference(double[] a, double[] b) {
        return Math.sqrt((a[0] - b[0]) * (a[0] - b[0]) + (a[1] - b[1]) * (a[1] - b[1]) + (a[2] - b[2]) * (a[2] - b[2]));
    }
}
