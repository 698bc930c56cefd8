package org.modewright.ui.internal.start;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.LineAttributes;
import org.eclipse.swt.graphics.Path;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;
import org.modewright.modal.Direction;
import org.modewright.ui.widgets.DirectionColours;
import org.modewright.ui.widgets.ThemeColours;

/** The product's picture: a frame at rest and the same frame in its first mode. */
final class SwayingFrame extends Canvas {

    private static final int STOREYS = 5;
    private static final int BAYS = 3;
    private static final int STEPS = 6;
    private static final double SWAY = 0.26;

    SwayingFrame(Composite parent) {
        super(parent, SWT.DOUBLE_BUFFERED);
        addListener(SWT.Paint, event -> paint(event.gc));
    }

    private void paint(GC gc) {
        gc.setAntialias(SWT.ON);
        draw(gc, 0, ThemeColours.rule(this), 1.2f);
        draw(gc, 1, DirectionColours.of(Direction.X), 2.4f);
        gc.setForeground(ThemeColours.secondaryText(this));
        gc.setLineWidth(2);
        int ground = (int) y(0);
        gc.drawLine((int) x(-0.12, 0, 0), ground, (int) x(1.12, 0, 0), ground);
    }

    private void draw(GC gc, double factor, Color colour, float width) {
        gc.setForeground(colour);
        gc.setLineAttributes(new LineAttributes(width, SWT.CAP_ROUND, SWT.JOIN_ROUND));
        Path path = new Path(getDisplay());
        for (int bay = 0; bay <= BAYS; bay++) {
            column(path, (double) bay / BAYS, factor);
        }
        for (int storey = 1; storey <= STOREYS; storey++) {
            double height = (double) storey / STOREYS;
            path.moveTo((float) x(0, height, factor), (float) y(height));
            path.lineTo((float) x(1, height, factor), (float) y(height));
        }
        gc.drawPath(path);
        path.dispose();
    }

    private void column(Path path, double across, double factor) {
        path.moveTo((float) x(across, 0, factor), (float) y(0));
        for (int i = 1; i <= STOREYS * STEPS; i++) {
            double height = (double) i / (STOREYS * STEPS);
            path.lineTo((float) x(across, height, factor), (float) y(height));
        }
    }

    /** First mode of a uniform shear cantilever: a quarter of a sine wave. */
    private double x(double across, double height, double factor) {
        Rectangle area = getClientArea();
        double sway = factor * SWAY * Math.sin(Math.PI / 2 * height);
        return area.width * (0.12 + 0.5 * across + sway);
    }

    private double y(double height) {
        Rectangle area = getClientArea();
        return area.height * (0.94 - 0.86 * height);
    }
}
