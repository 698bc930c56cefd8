package org.modewright.ui.canvas;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Scale;
import org.modewright.ui.AnimationPreferences;
import org.modewright.ui.UiIds;

/** Amplitude, speed and phase of the moving shape. */
final class ShapeControls {

    private static final int STEPS = 100;
    private static final double LEAST_AMPLITUDE = 0.01;
    private static final double MOST_AMPLITUDE = 0.5;
    private static final double LEAST_SPEED = 0.1;
    private static final double MOST_SPEED = 5;

    private final Scale amplitude;
    private final Scale speed;
    private final Scale phase;
    private boolean phaseHeld;

    ShapeControls(Composite parent, Runnable whenMoved) {
        Composite bar = new Composite(parent, SWT.NONE);
        bar.setLayoutData(new GridData(SWT.FILL, SWT.BOTTOM, true, false));
        GridLayout layout = new GridLayout(6, false);
        layout.marginHeight = 0;
        layout.marginWidth = 8;
        bar.setLayout(layout);
        amplitude = scale(bar, Messages.Shape_amplitude, "shape.amplitude",
                position(AnimationPreferences.amplitude(), LEAST_AMPLITUDE, MOST_AMPLITUDE));
        speed = scale(bar, Messages.Shape_speed, "shape.speed", position(AnimationPreferences.speed(), LEAST_SPEED, MOST_SPEED));
        phase = scale(bar, Messages.Shape_phase, "shape.phase", 0);
        amplitude.addListener(SWT.Selection, event -> whenMoved.run());
        speed.addListener(SWT.Selection, event -> whenMoved.run());
        phase.addListener(SWT.Selection, event -> {
            phaseHeld = true;
            try {
                whenMoved.run();
            } finally {
                phaseHeld = false;
            }
        });
    }

    private static Scale scale(Composite bar, String name, String id, int selection) {
        new Label(bar, SWT.NONE).setText(name);
        Scale scale = new Scale(bar, SWT.HORIZONTAL);
        scale.setMaximum(STEPS);
        scale.setPageIncrement(10);
        scale.setSelection(selection);
        scale.setToolTipText(name);
        scale.setData(UiIds.WIDGET_ID, id);
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false);
        data.widthHint = 48;
        scale.setLayoutData(data);
        return scale;
    }

    /** Even steps of the slider are even factors. */
    private static int position(double value, double least, double most) {
        return (int) Math.round(STEPS * Math.log(value / least) / Math.log(most / least));
    }

    private static double value(Scale scale, double least, double most) {
        return least * Math.pow(most / least, scale.getSelection() / (double) STEPS);
    }

    /** Largest drawn displacement as a share of the structure's size. */
    double amplitude() {
        return value(amplitude, LEAST_AMPLITUDE, MOST_AMPLITUDE);
    }

    /** Cycles a second. */
    double speed() {
        return value(speed, LEAST_SPEED, MOST_SPEED);
    }

    /** Phase that the user has set, rad. */
    double phase() {
        return 2 * Math.PI * phase.getSelection() / STEPS;
    }

    /** Whether the user moves the phase just now. */
    boolean isPhaseHeld() {
        return phaseHeld;
    }

    void showPhase(double radians) {
        int selection = (int) Math.round(radians / (2 * Math.PI) * STEPS);
        if (!phaseHeld && phase.getSelection() != selection) {
            phase.setSelection(selection);
        }
    }
}
