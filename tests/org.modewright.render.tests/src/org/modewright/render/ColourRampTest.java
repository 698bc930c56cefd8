package org.modewright.render;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class ColourRampTest {

    private final ColourRamp ramp = ColourRamp.energy();

    @Test
    void lightnessFallsAllAlong() {
        double before = 1;
        for (int i = 0; i < 256; i++) {
            double lightness = Oklch.lab(ramp.argb(i / 255.0))[0];
            // Eight-bit channels step by about 0.003 in lightness.
            assertTrue(lightness < before + 0.002, "step " + i);
            before = lightness;
        }
    }

    @Test
    void equalStepsLookEqual() {
        double least = 1;
        double most = 0;
        for (int i = 0; i < 16; i++) {
            double[] a = Oklch.lab(ramp.argb(i / 16.0));
            double[] b = Oklch.lab(ramp.argb((i + 1) / 16.0));
            double step = Math.sqrt(Math.pow(a[0] - b[0], 2) + Math.pow(a[1] - b[1], 2) + Math.pow(a[2] - b[2], 2));
            least = Math.min(least, step);
            most = Math.max(most, step);
        }
        // The table's 256 places and the channels' rounding leave a few per cent; chords of a bent path a little more.
        assertTrue(most < 1.25 * least, least + " to " + most);
    }

    @Test
    void bothEndsStandOutFromBothBackgrounds() {
        for (Theme theme : new Theme[] {Theme.light(), Theme.dark()}) {
            for (double t : new double[] {0, 0.5, 1}) {
                double[] colour = Oklch.lab(ramp.argb(t));
                double[] ground = Oklch.lab(theme.backgroundMiddle());
                double difference = Math.sqrt(Math.pow(colour[0] - ground[0], 2) + Math.pow(colour[1] - ground[1], 2)
                    + Math.pow(colour[2] - ground[2], 2));
                // 0.02 is about the least visible difference in OKLab; marks need several times that.
                assertTrue(difference > 0.13, "at " + t + " only " + difference);
            }
        }
    }

    @Test
    void valuesOutsideAreTakenToTheEnds() {
        assertEquals(ramp.argb(0), ramp.argb(-3));
        assertEquals(ramp.argb(1), ramp.argb(7));
        assertEquals(ramp.argb(0), ramp.argb(Double.NaN));
    }

    @Test
    void whiteAndAPrimaryHaveTheirPublishedCoordinates() {
        // B. Ottosson, A perceptual color space for image processing (2020), from memory: white has L = 1, a = b = 0; sRGB red L = 0.628,
        // a = 0.225, b = 0.126.
        double[] white = Oklch.lab(0xFFFFFFFF);
        assertEquals(1, white[0], 1e-3);
        assertEquals(0, Math.hypot(white[1], white[2]), 1e-3);
        double[] red = Oklch.lab(0xFFFF0000);
        assertEquals(0.628, red[0], 1e-3);
        assertEquals(0.225, red[1], 1e-3);
        assertEquals(0.126, red[2], 1e-3);
    }

    @Test
    void conversionBackGivesTheSameColour() {
        for (int argb : new int[] {0xFF0072B2, 0xFFE69F00, 0xFF009E73, 0xFF123456}) {
            double[] lab = Oklch.lab(argb);
            Oklch colour = new Oklch(lab[0], Math.hypot(lab[1], lab[2]), Math.toDegrees(Math.atan2(lab[2], lab[1])));
            for (int shift = 0; shift <= 16; shift += 8) {
                assertEquals(argb >> shift & 255, colour.argb() >> shift & 255, 1);
            }
        }
    }
}
