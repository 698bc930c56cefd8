package org.modewright.render;

/**
 * The clock of a moving shape. It knows no real time: the caller says how many seconds have passed, so that a frame can be repeated
 * exactly.
 *
 * <p>factor = amplitude × model size / largest displacement × sin(phase).
 */
public final class ModeAnimator {

    private final double fullScale;
    private double amplitude = 0.06;
    private double speed = 0.6;
    private double phase = Math.PI / 2;
    private boolean playing;

    /**
     * @param modelSize           a length of the structure, such as its bounds' diagonal
     * @param largestDisplacement of the shape; 0 keeps the structure still
     */
    public ModeAnimator(double modelSize, double largestDisplacement) {
        fullScale = largestDisplacement > 0 ? modelSize / largestDisplacement : 0;
    }

    /** Sets the largest drawn displacement as a share of the model size. */
    public void amplitude(double share) {
        amplitude = share;
    }

    public double amplitude() {
        return amplitude;
    }

    /** Sets how many cycles are shown in a second. */
    public void speed(double cyclesPerSecond) {
        speed = cyclesPerSecond;
    }

    public double speed() {
        return speed;
    }

    public void play() {
        playing = true;
    }

    public void pause() {
        playing = false;
    }

    public boolean playing() {
        return playing;
    }

    /** Moves on by a share of a cycle; negative steps back. */
    public void step(double cycles) {
        phase(phase + 2 * Math.PI * cycles);
    }

    /** Lets time pass while playing. */
    public void advance(double seconds) {
        if (playing) {
            step(speed * seconds);
        }
    }

    /** Radians, 0 to 2π; the shape is at rest at 0 and at its full amplitude at π/2. */
    public double phase() {
        return phase;
    }

    public void phase(double radians) {
        phase = radians - 2 * Math.PI * Math.floor(radians / (2 * Math.PI));
    }

    /** What the shape's displacements are multiplied by now. */
    public double factor() {
        return fullScale * amplitude * Math.sin(phase);
    }
}
