package org.modewright.ui.canvas;

import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.modewright.modal.Dominance.Energy;
import org.modewright.render.ColourRamp;
import org.modewright.ui.widgets.Numbers;
import org.modewright.ui.widgets.ThemeColours;

/** The ramp of the energy colours with its numbers, at the top right of the canvas. */
final class EnergyLegend {

    private static final int MARGIN = 8;
    private static final int STRIP_WIDTH = 12;
    private static final int TALLEST = 112;
    private static final int LEAST = 24;

    private final StructureCanvas canvas;
    private final ColourRamp ramp;
    private Energy energy;
    private double largest;

    EnergyLegend(StructureCanvas canvas, ColourRamp ramp) {
        this.canvas = canvas;
        this.ramp = ramp;
    }

    /** Says what the colours stand for; without energy nothing is drawn. */
    void show(Energy newEnergy, double newLargest) {
        energy = newLargest > 0 ? newEnergy : null;
        largest = newLargest;
    }

    void paint(GC gc) {
        Rectangle area = canvas.getClientArea();
        paint(gc, area.width, area.height);
    }

    /** Draws into a picture of another size. */
    void paint(GC gc, int width, int height) {
        if (energy == null) {
            return;
        }
        String title = energy == Energy.STRAIN ? Messages.Legend_strain : Messages.Legend_kinetic;
        Point size = gc.textExtent(title);
        gc.setForeground(ThemeColours.isDark(canvas) ? new Color(0xE6, 0xE6, 0xE6) : new Color(0x30, 0x30, 0x30));
        gc.drawText(title, width - MARGIN - size.x, MARGIN, true);
        int top = MARGIN + size.y + MARGIN;
        int left = width - MARGIN - STRIP_WIDTH;
        int tall = Math.min(TALLEST, height - top - MARGIN);
        if (tall < LEAST) {
            return;
        }
        paintStrip(gc, left, top, tall);
        int parts = tall < 3 * size.y ? 1 : 2;
        for (int part = 0; part <= parts; part++) {
            String text = Numbers.percent(largest * part / parts);
            Point extent = gc.textExtent(text);
            int y = top + tall - part * tall / parts;
            gc.drawText(text, left - MARGIN / 2 - extent.x, Math.max(top, Math.min(y - extent.y / 2, top + tall - extent.y)), true);
        }
    }

    private void paintStrip(GC gc, int left, int top, int height) {
        for (int row = 0; row < height; row++) {
            int argb = ramp.argb(1 - row / (double) (height - 1));
            gc.setBackground(new Color(argb >> 16 & 0xFF, argb >> 8 & 0xFF, argb & 0xFF));
            gc.fillRectangle(left, top + row, STRIP_WIDTH, 1);
        }
        gc.drawRectangle(left, top, STRIP_WIDTH, height);
    }
}
