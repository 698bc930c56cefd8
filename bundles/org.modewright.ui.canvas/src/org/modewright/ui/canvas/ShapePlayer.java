package org.modewright.ui.canvas;

import org.eclipse.swt.widgets.Composite;
import org.modewright.render.Deformation;
import org.modewright.render.ModeAnimator;
import org.modewright.ui.AnimationPreferences;

/** Plays a shape on a canvas, with the controls of its amplitude, speed and phase. */
final class ShapePlayer {

    private static final int FRAME_MILLISECONDS = 16;
    private static final int HIDDEN_MILLISECONDS = 250;
    private static final double STEP = 1.0 / 24;

    /** Told when playing begins or pauses. */
    @FunctionalInterface
    interface Listener {
        void playing(boolean plays);
    }

    private final StructureCanvas canvas;
    private final ShapeControls controls;
    private final Listener listener;
    private Deformation shape;
    private ModeAnimator animator;
    private boolean playing = AnimationPreferences.plays();
    private boolean ticking;
    private long lastTick;

    /**
     * @param canvas where the shape moves
     * @param parent where the controls stand
     * @param listener told when playing begins or pauses
     */
    ShapePlayer(StructureCanvas canvas, Composite parent, Listener listener) {
        this.canvas = canvas;
        this.listener = listener;
        controls = new ShapeControls(parent, this::controlsMoved);
    }

    /** Shows a shape of the structure on the canvas, moving or at its largest; null: none. */
    void show(Deformation newShape) {
        shape = newShape;
        if (newShape == null) {
            animator = null;
            return;
        }
        animator = new ModeAnimator(canvas.drawing().scene().bounds().diagonal(), newShape.largest());
        controlsMoved();
        play(playing);
    }

    boolean isPlaying() {
        return playing && animator != null;
    }

    /** Phase of the movement, rad; 0 without a shape. */
    double phase() {
        return animator == null ? 0 : animator.phase();
    }

    void toggle() {
        play(!playing);
    }

    void stepForward() {
        step(STEP);
    }

    void stepBack() {
        step(-STEP);
    }

    private void play(boolean plays) {
        playing = plays;
        listener.playing(plays);
        if (animator == null) {
            return;
        }
        if (plays) {
            animator.play();
            startTicking();
        } else {
            animator.pause();
        }
    }

    private void step(double cycles) {
        if (animator != null) {
            play(false);
            animator.step(cycles);
            present();
        }
    }

    private void controlsMoved() {
        if (animator == null) {
            return;
        }
        animator.amplitude(controls.amplitude());
        animator.speed(controls.speed());
        if (controls.isPhaseHeld()) {
            play(false);
            animator.phase(controls.phase());
        }
        present();
    }

    private void present() {
        canvas.shape(shape, animator.factor());
        controls.showPhase(animator.phase());
    }

    /** One chain of timers runs while something plays; it ends by itself. */
    private void startTicking() {
        if (!ticking) {
            ticking = true;
            lastTick = System.nanoTime();
            canvas.getDisplay().timerExec(FRAME_MILLISECONDS, this::tick);
        }
    }

    private void tick() {
        ticking = false;
        if (canvas.isDisposed() || animator == null || !animator.playing()) {
            return;
        }
        long now = System.nanoTime();
        boolean seen = canvas.isVisible();
        if (seen) {
            animator.advance((now - lastTick) / 1e9);
            present();
            canvas.update();
        }
        lastTick = now;
        ticking = true;
        int spent = (int) ((System.nanoTime() - now) / 1_000_000);
        canvas.getDisplay().timerExec(seen ? Math.max(1, FRAME_MILLISECONDS - spent) : HIDDEN_MILLISECONDS, this::tick);
    }
}
